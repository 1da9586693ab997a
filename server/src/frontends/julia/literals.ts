/** Numbers of Julia. Source: Julia manual, Integers and Floating-Point Numbers. */
import { Rational } from '../../quantities/rational.ts';

/** The exact value: `1_000`, `0x1f`, `0b101`, `0o17`, `1.5e-3`, `2f0`; undefined for hexadecimal fractions. */
export function numberValue(text: string): Rational | undefined {
  const plain = text.replaceAll('_', '');
  if (/^0[xob]/.test(plain)) {
    try {
      return Rational.of(BigInt(plain));
    } catch {
      return undefined;
    }
  }
  return Rational.parse(plain.replace(/f/i, 'e').replace(/^\./, '0.').replace(/\.(?=e|$)/, ''));
}
