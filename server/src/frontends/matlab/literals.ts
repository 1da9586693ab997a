/** Literals of MATLAB and Octave. */
import { Rational } from '../../quantities/rational.ts';

const known = new Map<string, Rational | undefined>();

/** The exact value of a number; undefined for an imaginary one. */
export function numberOf(text: string): Rational | undefined {
  if (!known.has(text)) {
    if (known.size > 5000) known.clear();
    known.set(text, read(text));
  }
  return known.get(text);
}

function read(text: string): Rational | undefined {
  const plain = text.replaceAll('_', '');
  if (/^0[xXbB]/.test(plain)) {
    try {
      return Rational.of(BigInt(plain.replace(/[us](?:8|16|32|64)$/, '')));
    } catch {
      return undefined;
    }
  }
  return /[ijIJ]$/.test(plain) ? undefined : Rational.parse(plain);
}

/** What stands between the quotes, a doubled quote as one; escapes are left as they are. */
export function textOf(source: string): string {
  const quote = source[0] as string;
  const inside = source.slice(1, source.length > 1 && source.endsWith(quote) ? -1 : undefined);
  return inside.replaceAll(quote + quote, quote);
}
