/** The Python front end for tests, and Python text to the shown common form. */
import type { FrontEnd } from '../../server/src/frontends/frontend.ts';
import type { Program } from '../../server/src/program/nodes.ts';
import { loadFrontEnd } from './front-ends.ts';
import { showProgram } from './show-program.ts';

export const python: FrontEnd = await loadFrontEnd('python');

export function parsePython(text: string): Program {
  const parsed = python.parse(text, 'script.py');
  parsed.release();
  return parsed.program;
}

/** The form of a text; lines of several statements are joined by ` / `, blocks keep their indentation. */
export function formOf(text: string): string {
  return showProgram(parsePython(text)).split('\n').join(' / ');
}
