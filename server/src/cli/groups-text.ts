/** Groups as people read them on a terminal. */
import { baseName, equation, expression, groupNames, groupValue, type GroupsProblem, type GroupsResult, hostSyntax, repeatingSets, systemOf, unmatchedText } from '../groups/index.ts';
import { valueText } from '../service/groups-at.ts';
import type { SolvedRelation } from './groups.ts';

/** Other sets that are listed; there may be thousands. */
const mostSets = 20;

/** The dimensional matrix, its rank, the groups and what is in none of them. */
export function groupsText(solved: SolvedRelation, alternatives: boolean): string {
  const { found, result } = solved;
  const { dependent, symbols } = found.relation;
  const others = symbols.filter(({ name }) => name !== dependent).map(({ name }) => name);
  const lines = [`${placeOf(solved)}  ${dependent} depends on ${others.join(', ')}`, '', ...matrixLines(result), ''];
  lines.push(`  rank ${result.rank}${result.repeating.length > 0 ? `, repeating symbols ${result.repeating.join(', ')}` : ''}`);
  lines.push(...groupLines(solved, result));
  const solution = equation(result, hostSyntax[found.language]);
  if (solution) lines.push('', `  ${solution}`);
  if (result.unmatched.length > 0 || result.problems.length > 0) lines.push('');
  lines.push(...result.unmatched.map((one) => `  ${one.symbol} is in no group: ${unmatchedText(one)}`), ...result.problems.map((problem) => `  ${problemText(problem)}`));
  if (alternatives) lines.push(...alternativeLines(solved));
  return `${lines.join('\n')}\n`;
}

/** `a.py:12`, in a notebook `a.ipynb: cell 3, line 2`. */
export function placeOf({ file, line, cell }: SolvedRelation): string {
  return cell === undefined ? `${file}:${line}` : `${file}: cell ${cell}, line ${line}`;
}

/** One column for each symbol; a point stands for zero. */
function matrixLines(result: GroupsResult): readonly string[] {
  const rows = result.matrix.map((row) => row.map((exponent) => (exponent.isZero ? '.' : exponent.toString())));
  const widths = result.columns.map((name, at) => Math.max([...name].length, ...rows.map((row) => (row[at] as string).length)));
  const names = result.bases.map(baseName);
  const first = Math.max(0, ...names.map((name) => [...name].length));
  const line = (head: string, cells: readonly string[]): string => `  ${head.padEnd(first)}  ${cells.map((cell, at) => cell.padStart(widths[at] as number)).join('  ')}`.trimEnd();
  return [line('', result.columns), ...rows.map((row, at) => line(names[at] as string, row))];
}

function groupLines({ found }: SolvedRelation, result: GroupsResult): readonly string[] {
  if (result.groups.length === 0) return [];
  const rows = result.groups.map((group) => {
    const value = groupValue(group.exponents, found.relation.symbols);
    return [expression(group.exponents, hostSyntax[found.language], group.order), [groupNames(group).join(' or '), value ? valueText(value) : ''].filter((part) => part !== '').join(', ')] as const;
  });
  const width = Math.max(...rows.map(([product]) => product.length));
  return ['', ...rows.map(([product, words]) => `  ${product.padEnd(width)}   ${words}`.trimEnd())];
}

function alternativeLines(solved: SolvedRelation): readonly string[] {
  const { result, found } = solved;
  const lines: string[] = [];
  let listed = 0;
  for (const set of result.groups.length > 0 ? repeatingSets(systemOf(found.relation)) : []) {
    const names = set.map(({ name }) => name);
    if (names.length === result.repeating.length && names.every((name) => result.repeating.includes(name))) continue;
    if (listed++ === mostSets) {
      lines.push('', `  ${result.sets.exact ? '' : 'at least '}${result.sets.count} sets in all`);
      break;
    }
    lines.push('', `  with ${names.join(', ')} repeating`, ...groupLines(solved, solved.again({ repeating: names })).slice(1));
  }
  return lines;
}

function problemText(problem: GroupsProblem): string {
  switch (problem.kind) {
    case 'unknown-dependent':
    case 'unknown-symbol':
      return `${problem.symbol} is not in this relation`;
    case 'repeats-dependent':
      return `${problem.symbol} is what the relation is for, so it cannot repeat`;
    case 'takes-no-part':
      return `${problem.symbol} cannot repeat: it is dimensionless, or in no group`;
    case 'wrong-count':
      return `${problem.wanted} repeating symbols are needed, ${problem.given} given`;
    case 'not-independent':
      return `${problem.among.join(', ')} form a group among themselves, so they cannot all repeat`;
    case 'not-dimensionless':
      return `${problem.group} is not dimensionless: it is ${problem.left.toString()}`;
    case 'dependent-twice':
      return `${problem.group}: only one group may hold the dependent symbol`;
    case 'redundant-group':
      return `${problem.group} follows from the groups kept before it`;
  }
}
