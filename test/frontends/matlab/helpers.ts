/** MATLAB text in, the common form out. */
import type { Program } from '../../../server/src/program/nodes.ts';
import { loadFrontEnd } from '../../harness/front-ends.ts';
import { showProgram } from '../../harness/show-program.ts';

export const matlab = await loadFrontEnd('matlab');

export const parse = (text: string): Program => matlab.parse(text, 'script.m').program;

/** All statements of a text as lines. */
export const shown = (text: string): string => showProgram(parse(text));

/** The value of the last statement, `v = …`, of a script; `x`, `A`, `c` and `s` are variables there. */
export function valueOf(text: string): string {
  const line = shown(`x = 1; A = 2; c = 3; s = 4;\nv = ${text}`).split('\n').at(-1) as string;
  return /^\(= v (.*)\)((?: # .*)?)$/.exec(line)?.slice(1).join('') ?? line;
}
