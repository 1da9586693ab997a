import { parseFactor } from '../../quantities/factor.ts';
import type { Scale } from '../../quantities/scale.ts';
import type { Line } from './model.ts';
import { problemAt } from './problem.ts';

const declaration = /^(\s*unit\s+)([^\s=[]+)(\s*)(=\s*)?/;
const factorForm = /^(?:pi|\d+\.?\d*(?:e[-+]?\d+)?|\.\d+(?:e[-+]?\d+)?)(?:\s*[*/]\s*(?:pi|\d+\.?\d*(?:e[-+]?\d+)?|\.\d+(?:e[-+]?\d+)?))*(?=\s|$)/i;

/** `unit crate = 18.5 kg` or `unit item`; undefined for a line of another form, such as a symbol named `unit`. */
export function readUnit(text: string): Line | undefined {
  const match = declaration.exec(text);
  if (!match || (match[4] === undefined && match[0].length < text.length)) return undefined;
  const [whole, word = '', name = '', , equals] = match;
  const nameSpan = { start: word.length, end: word.length + name.length };
  if (!/^[\p{L}%°µ_][\p{L}\p{N}_]*$/u.test(name)) return { kind: 'blank', problems: [problemAt('unit-name', nameSpan.start, nameSpan.end, name)] };
  if (equals === undefined) return { kind: 'base', name, nameSpan, problems: [] };
  const rest = text.slice(whole.length);
  if (rest === '') return { kind: 'blank', problems: [problemAt('unit-value', nameSpan.start, text.length)] };
  const factor = factorForm.exec(rest)?.[0] ?? '';
  const of = rest.slice(factor.length).trimStart();
  const ofSpan = { start: text.length - of.length, end: text.length };
  const bad = factor === '' ? /^[-+.\d]\S*/.exec(rest)?.[0] : factorOf(factor) ? undefined : factor;
  if (bad !== undefined) return { kind: 'blank', problems: [problemAt('unit-factor', whole.length, whole.length + bad.length, bad)] };
  return { kind: 'unit', name, nameSpan, factor: factor === '' ? '1' : factor, of, ofSpan, problems: [] };
}

/** The exact factor; undefined where it is zero or divides by zero. */
export function factorOf(text: string): Scale | undefined {
  try {
    return parseFactor(text);
  } catch {
    return undefined;
  }
}
