import type { Line } from './model.ts';
import { type NomenclatureProblem, problemAt } from './problem.ts';

const relation = /^(\s*)([\p{L}_][\p{L}\p{N}_.]*)\s+depends(?:\s+on)?(?=\s|$)/u;
const symbolName = /^[\p{L}_][\p{L}\p{N}_]*(?:\.[\p{L}_][\p{L}\p{N}_]*)*$/u;

/** `P depends on N, D, rho`; undefined for a line of another form. Names that are no symbols are reported and left out. */
export function readRelation(text: string): Line | undefined {
  const match = relation.exec(text);
  if (!match) return undefined;
  const [whole, blank = '', dependent = ''] = match;
  const problems: NomenclatureProblem[] = [];
  const on: string[] = [];
  let at = whole.length;
  for (const part of text.slice(whole.length).split(',')) {
    const name = part.trim();
    const start = at + part.length - part.trimStart().length;
    const fault = name === '' ? undefined : !symbolName.test(name) ? 'relation-symbol' : name === dependent ? 'relation-of-itself' : on.includes(name) ? 'relation-repeats' : 'none';
    if (fault === 'none') on.push(name);
    else if (fault) problems.push(problemAt(fault, start, start + name.length, name));
    at += part.length + 1;
  }
  if (on.length === 0 && problems.length === 0) problems.push(problemAt('relation-empty', blank.length, text.length));
  return { kind: 'relation', dependent, on, span: { start: blank.length, end: text.length }, problems };
}
