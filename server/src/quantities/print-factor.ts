/** Scale factors as a person writes them in a script. */
import { Rational } from './rational.ts';
import type { Scale } from './scale.ts';

/** `1000`, `0.3048`, `2*pi/60`, `5/9`; about twelve digits where neither a short decimal nor a short fraction is exact. */
export function printFactor(scale: Scale): string {
  const { rational, pi } = scale;
  if (!scale.isExact || scale.roots.length > 0 || !pi.abs().isInteger || pi.abs().compare(Rational.one) > 0) return decimal(scale.toNumber());
  if (pi.isZero) return short(rational) ?? decimal(rational.toNumber());
  return pi.isOne ? (timesPi(rational) ?? decimal(scale.toNumber())) : overPi(rational, scale);
}

/** Per minute, per hour and per second turn by whole revolutions, which read best as `2*pi`. */
function timesPi(value: Rational): string | undefined {
  const turns = value.div(Rational.of(2));
  if (turns.num === 1n && turnsPer.has(turns.den)) return turns.den === 1n ? '2*pi' : `2*pi/${turns.den}`;
  if (value.num === 1n) return value.den === 1n ? 'pi' : `pi/${value.den}`;
  const text = short(value);
  if (text === undefined) return undefined;
  return text.includes('/') ? `${value.num}*pi/${value.den}` : `${text}*pi`;
}

function overPi(value: Rational, scale: Scale): string {
  const turns = value.mul(Rational.of(2));
  if (turnsPer.has(turns.num) && turns.den === 1n) return `${turns.num}/(2*pi)`;
  return value.isInteger && value.num < 100000n ? `${value.num}/pi` : decimal(scale.toNumber());
}

const turnsPer: ReadonlySet<bigint> = new Set([1n, 60n, 3600n]);

/** A whole number, a decimal of few digits, or a fraction of small numbers. */
function short(value: Rational): string | undefined {
  const digits = decimal(value.toNumber());
  const exact = Rational.parse(digits)?.equals(value) === true;
  const isShort = digits.replace(/e.*$/, '').replace(/[^\d]/g, '').replace(/^0+/, '').length <= 8;
  if (exact && isShort) return digits;
  if (value.den > 1n && value.num < 10000n && value.den < 1000000n) return `${value.num}/${value.den}`;
  return exact ? digits : undefined;
}

/** Up to twelve significant digits; very large and small ones with an exponent. */
function decimal(value: number): string {
  const rounded = Number(value.toPrecision(12));
  const text = String(rounded);
  if (rounded !== 0 && Math.abs(rounded) < 1e-3 && !text.includes('e')) return rounded.toExponential();
  return text.replace('e+', 'e');
}
