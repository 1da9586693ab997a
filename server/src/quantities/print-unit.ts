/** Units as a person writes them: `W/(m K)`, `kPa`, `m^2/s`. */
import { Dimension } from './dimension.ts';
import { parseBaseProduct } from './factor.ts';
import { Rational } from './rational.ts';
import type { Scale } from './scale.ts';
import type { Unit } from './unit.ts';

/** Coherent spellings that engineers prefer to the shortest product of base units; common practice. */
const preferred: readonly (readonly [string, string])[] = [
  ['kg m s^-2', 'N'], ['kg m^-1 s^-2', 'Pa'], ['kg m^2 s^-2', 'J'], ['kg m^2 s^-3', 'W'], ['A s', 'C'], ['kg m^2 s^-3 A^-1', 'V'], ['kg m^2 s^-3 A^-2', 'ohm'], ['kg^-1 m^-2 s^3 A^2', 'S'], ['kg^-1 m^-2 s^4 A^2', 'F'], ['kg m^2 s^-2 A^-2', 'H'],
  ['kg m^2 s^-2 A^-1', 'Wb'], ['kg s^-2 A^-1', 'T'], ['kg m^-1 s^-1', 'Pa s'], ['kg s^-2', 'N/m'], ['kg m^-2 s^-2', 'Pa/m'], ['kg s^-3', 'W/m^2'], ['kg m^-1 s^-3', 'W/m^3'], ['kg m s^-3', 'W/m'],
  ['kg m s^-3 K^-1', 'W/(m K)'], ['kg s^-3 K^-1', 'W/(m^2 K)'], ['kg^-1 s^3 K', 'm^2 K/W'], ['kg^-1 m^-2 s^3 K', 'K/W'], ['kg m^2 s^-3 K^-1', 'W/K'], ['kg s^-3 K^-4', 'W/(m^2 K^4)'],
  ['m^2 s^-2 K^-1', 'J/(kg K)'], ['kg m^2 s^-2 K^-1', 'J/K'], ['kg m^-1 s^-2 K^-1', 'J/(m^3 K)'], ['kg m^2 s^-2 mol^-1', 'J/mol'], ['kg m^2 s^-2 K^-1 mol^-1', 'J/(mol K)'], ['kg m s^-3 A^-1', 'V/m'], ['kg m^3 s^-3 A^-2', 'ohm m'],
  ['kg^-1 m^-3 s^3 A^2', 'S/m'], ['kg^-1 m^-3 s^4 A^2', 'F/m'], ['kg m s^-2 A^-2', 'H/m'], ['m s^2 kg^-1', '1/Pa'], ['m s kg^-1', '1/(Pa s)'], ['m^3 s^-2 kg^-1', 'N m^2/kg^2'],
];

const bases: Record<string, string> = { L: 'm', M: 'kg', T: 's', I: 'A', Θ: 'K', N: 'mol', J: 'cd' };
let named: Map<Dimension, string> | undefined;
const printed = new Map<Dimension, string>();

/** The coherent SI unit of a dimension: a named one where engineers use it, else a product of base units; `1` for a number. */
export function coherentUnit(dimension: Dimension): string {
  let text = printed.get(dimension);
  if (text === undefined) {
    named ??= new Map(preferred.map(([unit, name]) => [parseBaseProduct(unit), name]));
    text = named.get(dimension) ?? baseProduct(dimension);
    printed.set(dimension, text);
  }
  return text;
}

/** A unit as its author wrote it, else as the coherent unit with a prefix or a factor. */
export function printUnit(unit: Unit): string {
  if (unit.text !== '') return unit.text;
  const coherent = coherentUnit(unit.dimension);
  if (!unit.scale || unit.scale.isOne) return coherent;
  const size = unit.scale.toNumber();
  const familiar = familiarUnit(unit.dimension, size);
  if (familiar) return familiar;
  return coherent === '1' ? printFactor(unit.scale) : `${printFactor(unit.scale)} ${coherent}`;
}

/** A scale as a short number: `1000`, `0.3048`, `pi/180`, about twelve digits where nothing shorter is exact. */
export function printFactor(scale: Scale): string {
  const { rational, pi } = scale;
  const times = pi.isZero ? '' : pi.isOne ? 'pi' : pi.equals(Rational.minusOne) ? '1/pi' : `pi^${pi}`;
  if (scale.isExact && scale.roots.length === 0 && times !== '') {
    return rational.isOne ? times : rational.num === 1n ? `${times}/${rational.den}` : `${printNumber(rational.toNumber())}*${times}`;
  }
  return scale.isExact && rational.num === 1n && rational.den < 100000n && scale.roots.length === 0 && !/^10*$/.test(String(rational.den)) ? `1/${rational.den}` : printNumber(scale.toNumber());
}

function printNumber(value: number): string {
  return String(Number(value.toPrecision(12)));
}

/** Units met in practice that are no coherent ones, by dimension: tried before a bare factor. */
const familiarUnits: readonly (readonly [string, number, string])[] = [
  ['m', 1e-3, 'mm'], ['m', 1e-2, 'cm'], ['m', 1e3, 'km'], ['m', 1e-6, 'um'], ['m', 0.3048, 'ft'], ['m', 0.0254, 'in'], ['m^2', 1e-6, 'mm^2'], ['m^2', 1e-4, 'cm^2'], ['m^3', 1e-3, 'L'], ['m^3', 1e-9, 'mm^3'], ['m^3', 1e-6, 'cm^3'],
  ['kg', 1e-3, 'g'], ['kg', 1e3, 't'], ['s', 60, 'min'], ['s', 3600, 'h'], ['s', 1e-3, 'ms'], ['s', 86400, 'd'], ['kg m^-1 s^-2', 1e3, 'kPa'], ['kg m^-1 s^-2', 1e5, 'bar'], ['kg m^-1 s^-2', 1e6, 'MPa'], ['kg m^-1 s^-2', 100, 'mbar'], ['kg m^-1 s^-2', 1e9, 'GPa'],
  ['kg m s^-2', 1e3, 'kN'], ['kg m^2 s^-2', 1e3, 'kJ'], ['kg m^2 s^-2', 1e6, 'MJ'], ['kg m^2 s^-2', 3.6e6, 'kWh'], ['kg m^2 s^-3', 1e3, 'kW'], ['kg m^2 s^-3', 1e6, 'MW'], ['m s^-1', 1 / 3.6, 'km/h'], ['m s^-1', 1e-3, 'mm/s'],
  ['m^3 s^-1', 1e-3, 'L/s'], ['m^3 s^-1', 1 / 60000, 'L/min'], ['m^3 s^-1', 1 / 3600, 'm^3/h'], ['kg s^-1', 1 / 3600, 'kg/h'], ['m^2 s^-2 K^-1', 1e3, 'kJ/(kg K)'], ['m^2 s^-2', 1e3, 'kJ/kg'], ['kg m^-1 s^-1', 1e-3, 'mPa s'], ['m^2 s^-1', 1e-6, 'mm^2/s'],
  ['kg s^-3', 1e3, 'kW/m^2'], ['s^-1', 1 / 60, '1/min'], ['1', 0.01, '%'], ['1', 1e-6, 'ppm'], ['K', 5 / 9, 'degR'],
];

function familiarUnit(dimension: Dimension, size: number): string | undefined {
  return familiarUnits.find(([unit, factor]) => Math.abs(size / factor - 1) < 1e-12 && parseBaseProduct(unit) === dimension)?.[2];
}

function baseProduct(dimension: Dimension): string {
  const order = ['M', 'L', 'T', 'I', 'Θ', 'N', 'J'];
  const rank = (base: string): number => (order.includes(base) ? order.indexOf(base) : order.length);
  const entries = [...dimension.exponents].sort(([a], [b]) => rank(a) - rank(b));
  const above = entries.filter(([, exponent]) => exponent.sign > 0).map(part);
  const below = entries.filter(([, exponent]) => exponent.sign < 0).map(([base, exponent]) => part([base, exponent.neg()]));
  const top = above.length > 0 ? above.join(' ') : '1';
  if (below.length === 0) return top;
  return `${top}/${below.length > 1 ? `(${below.join(' ')})` : below[0]}`;
}

function part([base, exponent]: readonly [string, Rational]): string {
  const symbol = bases[base] ?? base;
  return exponent.isOne ? symbol : exponent.isInteger ? `${symbol}^${exponent}` : `${symbol}^(${exponent})`;
}
