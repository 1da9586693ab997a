/** Groups for a report: LaTeX and Markdown. */
import { Rational } from '../quantities/rational.ts';
import { solvedFor } from './express.ts';
import { groupNames } from './names.ts';
import type { Exponents, Group, GroupsResult } from './types.ts';

/** A group in LaTeX mathematics: `\frac{\rho\,N\,D^{2}}{\mu}`. */
export function latexProduct(exponents: Exponents, order: readonly string[] = []): string {
  const names = [...order.filter((name) => exponents.has(name)), ...[...exponents.keys()].filter((name) => !order.includes(name))];
  const side = (sign: 1 | -1) =>
    names.flatMap((name) => {
      const power = exponents.get(name) as Rational;
      return power.sign === sign ? [latexPower(name, power.abs())] : [];
    });
  const above = side(1).join('\\,') || '1';
  const below = side(-1).join('\\,');
  return below ? `\\frac{${above}}{${below}}` : above;
}

/** The groups as an `align*` environment with their names, and the equation for the dependent symbol. */
export function latexReport(result: GroupsResult): string {
  const rows = result.groups.map((group, at) => `  \\Pi_{${at + 1}} &= ${latexProduct(group.exponents, group.order)}${latexName(group)}`);
  const solved = latexEquation(result);
  if (rows.length === 0) return '';
  return ['\\begin{align*}', [...rows, ...(solved ? [`  ${solved}`] : [])].join(' \\\\\n'), '\\end{align*}', ''].join('\n');
}

/** A Markdown section: the rank and the repeating symbols, a table of groups with their names, the equation. */
export function markdownReport(result: GroupsResult): string {
  if (result.groups.length === 0) return '';
  const dependent = result.relation.dependent;
  const head = `${result.columns.length} symbols, rank ${result.rank}: ${result.groups.length} dimensionless ${result.groups.length === 1 ? 'group' : 'groups'}.`;
  const repeating = result.repeating.length > 0 ? [`Repeating symbols: ${result.repeating.map((name) => `$${latexSymbol(name)}$`).join(', ')}.`] : [];
  const rows = result.groups.map((group, at) => `| $\\Pi_{${at + 1}}$ | $${latexProduct(group.exponents, group.order)}$ | ${groupNames(group).join('; ')} |`);
  const solved = dependent === undefined ? undefined : latexEquation(result);
  return [[head, ...repeating].join(' '), '', '| group | product | known as |', '| --- | --- | --- |', ...rows, ...(solved ? ['', `$$${solved.replace('&', '')}$$`] : []), ''].join('\n');
}

/** `y &= product \, \varphi(\Pi_2, …)`; undefined where the dependent symbol is in no group. */
export function latexEquation(result: GroupsResult): string | undefined {
  const first = result.groups[0];
  const dependent = result.relation.dependent;
  if (first?.role !== 'dependent' || dependent === undefined) return undefined;
  const scale = solvedFor(first.exponents, dependent);
  const others = result.groups.slice(1).map((_group, at) => `\\Pi_{${at + 2}}`);
  const unknown = others.length > 0 ? `\\varphi\\left(${others.join(', ')}\\right)` : 'C';
  return `${latexSymbol(dependent)} &= ${scale.size > 0 ? `${latexProduct(scale, first.order)}\\,` : ''}${unknown}`;
}

const greekLetters = new Set(
  'alpha beta gamma delta epsilon zeta eta theta iota kappa lambda mu nu xi pi rho sigma tau upsilon phi chi psi omega Gamma Delta Theta Lambda Xi Pi Sigma Upsilon Phi Psi Omega'.split(' '),
);

/** A symbol in LaTeX: Greek names as letters, what follows an underscore as a subscript, longer names upright. */
export function latexSymbol(name: string): string {
  const plain = name.split('.').at(-1) ?? name;
  const [stem = '', ...rest] = plain.split('_').filter(Boolean);
  const numbered = /^([A-Za-z]+?)(\d+)$/.exec(stem);
  const base = letter(numbered?.[1] ?? stem);
  const subscripts = [...(numbered ? [numbered[2] as string] : []), ...rest].map((part) => (part.length > 1 && !/^\d+$/.test(part) ? letter(part) : part));
  return subscripts.length > 0 ? `${base}_{${subscripts.join(',')}}` : base;
}

function letter(word: string): string {
  if (greekLetters.has(word)) return `\\${word}`;
  return [...word].length > 1 ? `\\mathrm{${word.replace(/[&%$#{}~^\\]/g, '')}}` : word;
}

function latexPower(name: string, power: Rational): string {
  const base = latexSymbol(name);
  if (power.isOne) return base;
  if (power.equals(Rational.of(1, 2))) return `\\sqrt{${base}}`;
  return `${base.includes('_') ? `{${base}}` : base}^{${power}}`;
}

function latexName(group: Group): string {
  const names = groupNames(group);
  return names.length > 0 ? ` && \\text{${names.join('; ').replace(/[&%$#_{}~^\\]/g, (mark) => (mark === '^' ? '\\^{}' : `\\${mark}`))}}` : '';
}
