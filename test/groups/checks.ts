/** Independent checks of groups: mathjs decides whether they are dimensionless, floating-point elimination whether they are independent. */
import { type MathType, multiply, pow, type Unit as MathUnit, unit } from 'mathjs';
import type { Exponents, GroupsResult } from '../../server/src/groups/types.ts';
import type { Dimension } from '../../server/src/quantities/dimension.ts';
import { Rational } from '../../server/src/quantities/rational.ts';

const baseUnits: Readonly<Record<string, string>> = { L: 'm', M: 'kg', T: 's', I: 'A', Θ: 'K', N: 'mol', J: 'cd' };

/** Powers of each base unit that mathjs finds in a product of units; nothing is left of a dimensionless one. */
export function leftover(exponents: Exponents, dimensions: ReadonlyMap<string, Dimension>): string {
  let product: MathType = unit(1, 'm/m');
  for (const [name, power] of exponents) product = multiply(product, pow(mathUnit(dimensions.get(name) as Dimension), power.toNumber()) as MathUnit);
  const left = product as unknown as number | (MathUnit & { dimensions: number[] });
  if (typeof left === 'number') return '';
  return left.dimensions.some((power) => Math.abs(power) > 1e-9) ? left.toString() : '';
}

function mathUnit(dimension: Dimension): MathUnit {
  let product: MathType = unit(1, 'm/m');
  for (const [base, power] of dimension.exponents) {
    product = multiply(product, pow(unit(1, baseUnits[base] as string), power.toNumber()) as MathUnit);
  }
  return product as MathUnit;
}

/** Rank by floating-point elimination with full pivoting: no code in common with the exact one. */
export function floatRank(rows: readonly (readonly number[])[]): number {
  const table = rows.map((row) => [...row]);
  let rank = 0;
  for (;;) {
    let best: [number, number] | undefined;
    for (let i = rank; i < table.length; i++) {
      for (let j = 0; j < (table[i] as number[]).length; j++) {
        if (!best || Math.abs(at(table, i, j)) > Math.abs(at(table, ...best))) best = [i, j];
      }
    }
    if (!best || Math.abs(at(table, ...best)) < 1e-9) return rank;
    const [row, column] = best;
    [table[rank], table[row]] = [table[row] as number[], table[rank] as number[]];
    const lead = table[rank] as number[];
    for (let i = rank + 1; i < table.length; i++) {
      const times = at(table, i, column) / (lead[column] as number);
      table[i] = (table[i] as number[]).map((value, j) => value - times * (lead[j] as number));
    }
    rank++;
  }
}

function at(table: readonly (readonly number[])[], i: number, j: number): number {
  return table[i]?.[j] ?? 0;
}

/** Everything that holds for every solved relation; returns what is wrong. */
export function faults(result: GroupsResult): string[] {
  const names = result.columns;
  const dimensions = new Map(result.relation.symbols.flatMap(({ name, dimension }) => (dimension ? [[name, dimension] as const] : [])));
  const found: string[] = [];
  for (const { exponents } of result.groups) {
    const left = leftover(exponents, dimensions);
    if (left) found.push(`${text(exponents)} leaves ${left}`);
    if ([...exponents.values()].some((power) => !power.isInteger)) found.push(`${text(exponents)} has a fractional exponent`);
    if (common([...exponents.values()]) !== 1) found.push(`${text(exponents)} is a power of a smaller group`);
  }
  const rows = result.groups.map(({ exponents }) => names.map((name) => exponents.get(name)?.toNumber() ?? 0));
  const matrix = names.map((name) => result.bases.map((base) => dimensions.get(name)?.exponent(base).toNumber() ?? 0));
  const rank = floatRank(matrix);
  if (rank !== result.rank) found.push(`rank ${result.rank}, by elimination in floating point ${rank}`);
  if (floatRank(rows) !== rows.length) found.push('the groups depend on each other');
  if (rows.length !== names.length - rank) found.push(`${rows.length} groups of ${names.length} symbols with rank ${rank}`);
  const dependent = result.relation.dependent;
  const holding = result.groups.filter(({ exponents }) => dependent !== undefined && exponents.has(dependent));
  if (holding.length > 1 || (holding.length === 1 && result.groups[0] !== holding[0])) found.push('the dependent symbol is not in the first group only');
  return found;
}

/** Whether two lists of groups span the same products: equivalence of complete sets. */
export function equivalent(a: readonly Exponents[], b: readonly Exponents[], names: readonly string[]): boolean {
  const rows = (groups: readonly Exponents[]) => groups.map((group) => names.map((name) => group.get(name)?.toNumber() ?? 0));
  const together = floatRank([...rows(a), ...rows(b)]);
  return together === floatRank(rows(a)) && together === floatRank(rows(b));
}

/** Reads `rho N D^2 / mu`: everything behind the slash divides. */
export function product(source: string): Map<string, Rational> {
  const [above = '', below = ''] = source.split(' / ');
  const side = (part: string, sign: Rational) =>
    part.split(' ').filter((word) => word && word !== '1').map((word) => {
      const [name, power = '1'] = word.split('^');
      return [name as string, (Rational.parse(power) as Rational).mul(sign)] as const;
    });
  return new Map([...side(above, Rational.one), ...side(below, Rational.minusOne)]);
}

/** `rho N D^2 mu^-1`. */
export function text(exponents: Exponents): string {
  return [...exponents].map(([name, power]) => (power.isOne ? name : `${name}^${power}`)).join(' ');
}

function common(powers: readonly Rational[]): number {
  const divisor = (a: number, b: number): number => (b === 0 ? Math.abs(a) : divisor(b, a % b));
  return powers.reduce((sum, power) => divisor(sum, power.toNumber()), 0);
}
