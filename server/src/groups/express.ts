/** Groups written in the syntax of a host language. */
import { Rational } from '../quantities/rational.ts';
import type { Exponents, Group, GroupsResult } from './types.ts';

/** How a host language writes products and powers. */
export interface HostSyntax {
  readonly times: string;
  readonly divide: string;
  /** Between base and exponent; `pow`: a call, `pow(x, 2)`. */
  readonly power: '**' | '^' | '.^' | 'pow';
  /** The call for a square root. */
  readonly root: string;
}

export const hostSyntax = {
  python: { times: '*', divide: '/', power: '**', root: 'sqrt' },
  nomenclature: { times: '*', divide: '/', power: '^', root: 'sqrt' },
  matlab: { times: '.*', divide: './', power: '.^', root: 'sqrt' },
  julia: { times: '*', divide: '/', power: '^', root: 'sqrt' },
  fortran: { times: '*', divide: '/', power: '**', root: 'sqrt' },
  c: { times: '*', divide: '/', power: 'pow', root: 'sqrt' },
  cpp: { times: '*', divide: '/', power: 'pow', root: 'std::sqrt' },
  javascript: { times: '*', divide: '/', power: '**', root: 'Math.sqrt' },
  typescript: { times: '*', divide: '/', power: '**', root: 'Math.sqrt' },
} as const satisfies Readonly<Record<string, HostSyntax>>;

/** A product such as `rho*N*D**2/mu`; `1` for an empty one. `order` lists the symbols; those it leaves out follow. */
export function expression(exponents: Exponents, syntax: HostSyntax, order: readonly string[] = []): string {
  const names = [...order.filter((name) => exponents.has(name)), ...[...exponents.keys()].filter((name) => !order.includes(name))];
  const powers = names.map((name) => [name, exponents.get(name) as Rational] as const);
  const above = powers.filter(([, power]) => power.sign > 0).map(([name, power]) => factor(name, power, syntax));
  const below = powers.filter(([, power]) => power.sign < 0).map(([name, power]) => factor(name, power.neg(), syntax));
  const top = above.length > 0 ? above.join(syntax.times) : '1';
  if (below.length === 0) return top;
  // MATLAB's `1./x` reads as it should; `1.` before `/` would not.
  return `${top}${syntax.divide}${below.length > 1 ? `(${below.join(syntax.times)})` : below[0]}`;
}

/** The expression of a group, in the order in which it is usually written. */
export function groupExpression(group: Group, syntax: HostSyntax): string {
  return expression(group.exponents, syntax, group.order);
}

/** One group ready to be defined in a script. */
export interface Definition {
  /** An identifier that none of the relation's symbols has. */
  readonly name: string;
  readonly expression: string;
  readonly group: Group;
}

/** A name and an expression for every group: `Re = rho*N*D**2/mu`. Groups that are one symbol keep its name. */
export function definitions(result: GroupsResult, syntax: HostSyntax): Definition[] {
  const taken = new Set(result.relation.symbols.map((symbol) => symbol.name));
  return result.groups.map((group, at) => {
    const name = group.role === 'symbol' || group.exponents.size === 1 ? (group.order[0] as string) : unused(identifierOf(group, at + 1), taken);
    taken.add(name);
    return { name, expression: groupExpression(group, syntax), group };
  });
}

/**
 * The dimensional equation solved for the dependent symbol, with an unknown function of the other groups:
 * `P = rho*N**3*D**5 * phi(Re)`. Without other groups the function is an unknown constant `C`. Undefined where the dependent
 * symbol is in no group.
 */
export function equation(result: GroupsResult, syntax: HostSyntax, naming: 'names' | 'expressions' = 'names'): string | undefined {
  const [first, ...others] = definitions(result, syntax);
  const dependent = result.relation.dependent;
  if (!first || dependent === undefined || first.group.role !== 'dependent') return undefined;
  const scale = solvedFor(first.group.exponents, dependent);
  const args = others.map((one) => (naming === 'expressions' || one.group.role === 'ratio' ? one.expression : one.name));
  const taken = new Set(result.relation.symbols.map(({ name }) => name));
  const unknown = args.length > 0 ? `${firstUnused(['phi', 'psi', 'func'], taken)}(${args.join(', ')})` : firstUnused(['C', 'const'], taken);
  const product = scale.size > 0 ? `${scaleExpression(scale, syntax, first.group.order)} ${syntax.times} ` : '';
  return `${dependent} = ${product}${unknown}`;
}

/** The product that has the dimension of the dependent symbol: the rest of its group, moved to the other side. */
export function solvedFor(exponents: Exponents, dependent: string): Map<string, Rational> {
  const own = exponents.get(dependent) ?? Rational.one;
  return new Map([...exponents].filter(([name]) => name !== dependent).map(([name, power]) => [name, power.div(own).neg()]));
}

/** One root over the whole where every symbol is under one: `sqrt(l/g)` rather than `sqrt(l)/sqrt(g)`. */
function scaleExpression(scale: Exponents, syntax: HostSyntax, order: readonly string[]): string {
  const powers = [...scale.values()];
  const den = powers[0]?.den ?? 1n;
  if (den === 1n || scale.size < 2 || powers.some((power) => power.den !== den)) return expression(scale, syntax, order);
  const below = Rational.of(1n, den);
  const inside = expression(new Map([...scale].map(([name, power]) => [name, power.div(below)])), syntax, order);
  return factor(den === 2n || syntax.power === 'pow' ? inside : `(${inside})`, below, syntax);
}

function factor(name: string, power: Rational, syntax: HostSyntax): string {
  if (power.isOne) return name;
  if (power.num === 1n && power.den === 2n) return `${syntax.root}(${name})`;
  const exponent = exponentText(power);
  return syntax.power === 'pow' ? `pow(${name}, ${exponent})` : `${name}${syntax.power}${exponent}`;
}

/** Decimal where it ends, since `1/3` divides integers in several languages: `1.5`, `(1.0/3.0)`. */
function exponentText(power: Rational): string {
  if (power.isInteger) return power.toString();
  const decimal = power.toNumber().toString();
  return Rational.parse(decimal)?.equals(power) ? decimal : `(${power.num}.0/${power.den}.0)`;
}

/** `Re` for a number as it is defined; `L_D` for a ratio; `Pi_2` otherwise. */
function identifierOf(group: Group, place: number): string {
  const [number] = group.recognised;
  const symbol = number?.symbol.replace(/[^\p{L}\p{N}_]/gu, '') ?? '';
  const plain = group.recognised.length === 1 && number?.power.isOne === true && number.coefficient.isOne;
  if (plain && /^[A-Za-z]\w*$/.test(symbol) && symbol === number?.symbol) return symbol;
  if (group.role === 'ratio') return [...group.order].sort((a, b) => signOf(group, b) - signOf(group, a)).map((name) => name.replace(/\W+/g, '_')).join('_');
  return `Pi_${place}`;
}

function signOf(group: Group, name: string): number {
  return group.exponents.get(name)?.sign ?? 0;
}

function firstUnused(names: readonly string[], taken: ReadonlySet<string>): string {
  return names.find((name) => !taken.has(name)) ?? unused(names[0] as string, taken);
}

function unused(name: string, taken: ReadonlySet<string>): string {
  return taken.has(name) ? unused(`${name}_`, taken) : name;
}
