/** Short names of groups: what a table cell or a hover's first line says. */
import { Rational } from '../quantities/rational.ts';
import type { Scale } from '../quantities/scale.ts';
import type { CompositePart, Group, Recognition } from './types.ts';

/** `Reynolds number`, `Froude number squared`, `reciprocal of Weber number`, `1/2 of drag coefficient`. */
export function recognitionText({ number, power, coefficient }: Recognition): string {
  const powered = poweredText(number, power);
  return coefficient.isOne ? powered : `${factorText(coefficient)} ${powered}`;
}

/** `Re·Pr`, `We/Re`. */
export function compositeText(parts: readonly CompositePart[]): string {
  const above = parts.filter(({ power }) => power.sign > 0).map((part) => symbolPower(part.symbol, part.power));
  const below = parts.filter(({ power }) => power.sign < 0).map((part) => symbolPower(part.symbol, part.power.neg()));
  const bottom = below.length > 1 ? `(${below.join('·')})` : below.join('');
  return `${above.join('·') || '1'}${bottom && `/${bottom}`}`;
}

/** All that a group is known as, best first; empty for one without a name. */
export function groupNames(group: Group): string[] {
  const names = group.recognised.map(recognitionText);
  return names.length > 0 ? names : group.composites.map(compositeText);
}

/** An exact factor in words where it is a simple fraction: `1/2 of`, `2 times`, `4/pi times`; decimals otherwise. */
export function factorText(scale: Scale): string {
  const { rational, pi, roots, isExact } = scale;
  if (!isExact || roots.length > 0 || !pi.isInteger) return `${Number(scale.toNumber().toPrecision(4))} times`;
  if (pi.isZero && rational.num === 1n) return `${rational} of`;
  const power = Number(pi.num);
  const circle = Math.abs(power) === 1 ? 'pi' : `pi^${Math.abs(power)}`;
  const above = [rational.num === 1n && power > 0 ? '' : rational.num.toString(), power > 0 ? circle : ''].filter(Boolean).join('*');
  const below = [rational.den === 1n ? '' : rational.den.toString(), power < 0 ? circle : ''].filter(Boolean);
  return `${above}${below.length > 1 ? `/(${below.join('*')})` : below.length === 1 ? `/${below[0]}` : ''} times`;
}

function poweredText(name: string, power: Rational): string {
  if (power.sign < 0) return `reciprocal of ${poweredText(name, power.neg())}`;
  if (power.isOne) return name;
  if (power.equals(Rational.of(2))) return `${name} squared`;
  if (power.equals(Rational.of(3))) return `${name} cubed`;
  if (power.equals(Rational.of(1, 2))) return `square root of ${name}`;
  return `${name} to the power ${power}`;
}

function symbolPower(symbol: string, power: Rational): string {
  return power.isOne ? symbol : `${symbol}^${power}`;
}
