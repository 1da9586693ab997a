/** Julia text in, the common form out. */
import type { Program } from '../../../server/src/program/nodes.ts';
import { loadFrontEnd } from '../../harness/front-ends.ts';
import { showProgram } from '../../harness/show-program.ts';

export const julia = await loadFrontEnd('julia');

export const parse = (text: string): Program => julia.parse(text, 'script.jl').program;

/** All statements of a text as lines. */
export const shown = (text: string): string => showProgram(parse(text));

/** The form of the value in `v = …`. */
export function valueOf(text: string): string {
  const line = shown(`v = ${text}`);
  return /^\(= v ([\s\S]*)\)((?: # .*)?)$/.exec(line)?.slice(1).join('') ?? line;
}
