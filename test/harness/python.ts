/** The Python front end for tests, and Python text to the shown common form. */
import type { FrontEnd } from '../../server/src/frontends/frontend.ts';
import { createPythonFrontEnd } from '../../server/src/frontends/python/index.ts';
import { nodeAssets } from '../../server/src/platform/node-assets.ts';
import type { Program } from '../../server/src/program/nodes.ts';
import { showProgram } from './show-program.ts';

const { runtime, grammar } = nodeAssets();
export const python: FrontEnd = await createPythonFrontEnd(runtime, grammar('python') as Uint8Array);

export function parsePython(text: string): Program {
  const parsed = python.parse(text, 'script.py');
  parsed.release();
  return parsed.program;
}

/** The form of a text; lines of several statements are joined by ` / `, blocks keep their indentation. */
export function formOf(text: string): string {
  return showProgram(parsePython(text)).split('\n').join(' / ');
}
