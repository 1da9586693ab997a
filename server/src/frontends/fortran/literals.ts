/** Literals of Fortran. */
import { Rational } from '../../quantities/rational.ts';

const known = new Map<string, Rational | undefined>();

/** The exact value of a number: `1.5d0`, `2._r8`, `3_int64`. */
export function numberOf(text: string): Rational | undefined {
  if (!known.has(text)) {
    if (known.size > 5000) known.clear();
    known.set(text, Rational.parse(text.replace(/_\w+$/, '').replace(/[dD]/, 'e')));
  }
  return known.get(text);
}

/** Whether a literal is an integer, so that a quotient of two is one. */
export function isInteger(text: string): boolean {
  return /^\d+(?:_\w+)?$/.test(text);
}

/** What stands between the quotes, a doubled quote as one. */
export function textOf(source: string): string {
  const open = source.search(/['"]/);
  if (open < 0) return source.replace(/^\d+[hH]/, '');
  const quote = source[open] as string;
  const inside = source.slice(open + 1, source.length > open + 1 && source.endsWith(quote) ? -1 : undefined);
  return inside.replaceAll(quote + quote, quote).replace(/&[ \t]*\r?\n[ \t]*&?/g, '');
}
