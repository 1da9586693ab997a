/** Sentences for numbers that would have to carry a unit. */
import { literalNumber, readLiteral } from '../constraints/literal.ts';
import type { Constraint } from '../constraints/problem.ts';
import type { Value } from '../constraints/value.ts';
import type { Expr } from '../program/nodes.ts';
import { knownConstant } from '../quantities/known-constants.ts';
import { coherentUnit } from '../quantities/print-unit.ts';
import type { Dimension } from '../quantities/dimension.ts';
import type { Fault } from '../solver/fault.ts';
import { sidesOf } from '../solver/root-cause.ts';
import { chainOf, sideWords } from './sides.ts';
import { capital } from './dimension-words.ts';
import { unitWithKinds, type Voice, type Words } from './voice.ts';

type HiddenFault = Extract<Fault, { kind: 'dimension' | 'pure' | 'varying-power' }>;

export function hiddenWords(voice: Voice, fault: HiddenFault, alike: number): Words {
  const { constraint } = fault;
  const found = hiddenNumbers(constraint, fault);
  const names = [...new Set(found.map((each) => each.text))].slice(0, 3);
  const need = neededUnit(fault, found);
  const number = names.length > 0 ? names.map((name) => `\`${name}\``).join(' or ') : 'a number in it';
  const known = found[0] && need ? knownConstant(found[0].size, need) : undefined;
  const what = need ? ` carried ${unitWithKinds(need)}` : ' carried a unit';
  const constant = known && need ? ` That is ${known.name} (${known.value} ${known.unit}): name it and note its unit.` : '';
  const sides = sideText(voice, fault);
  const more = alike > 0 ? ` ${alike === 1 ? 'One more place' : `${alike} more places`} in this function ${alike === 1 ? 'is' : 'are'} of the same kind.` : '';
  const advice = known ? '' : ' Note that unit on a named constant, or declare the relation with `empirical:` and the units its symbols are counted in.';
  return { message: `This would be right only if ${number}${what}. ${sides}${constant}${advice}${more}`, related: chainOf(voice, constraint, fault.involved) };
}

interface HiddenNumber {
  readonly text: string;
  readonly size: number;
  readonly below: boolean;
  readonly side: 'left' | 'right' | 'value';
}

function sideText(voice: Voice, fault: HiddenFault): string {
  const { anchor } = fault.constraint;
  if (fault.kind !== 'dimension') {
    const value = fault.kind === 'pure' ? fault.constraint.value : fault.constraint.base;
    return `${capital(sideWords(voice, anchor, value, fault.dimension))}.`;
  }
  const { constraint, left, right } = fault;
  return `As it stands, ${sideWords(voice, anchor, constraint.left, left)}; ${sideWords(voice, anchor, constraint.right, right)}.`;
}

function neededUnit(fault: HiddenFault, found: readonly HiddenNumber[]): Dimension | undefined {
  const first = found[0];
  if (!first) return fault.kind === 'dimension' ? fault.right.div(fault.left) : undefined;
  const raw = fault.kind === 'dimension' ? (first.side === 'right' ? fault.left.div(fault.right) : fault.right.div(fault.left)) : inverse(fault.dimension);
  return first.below ? inverse(raw) : raw;
}

function inverse(dimension: Dimension): Dimension {
  return dimension.div(dimension).div(dimension);
}

function hiddenNumbers(constraint: Constraint, fault: HiddenFault): readonly HiddenNumber[] {
  const found: HiddenNumber[] = [];
  const [first, second] = sidesOf(constraint);
  collect(first, fault.kind === 'dimension' ? 'left' : 'value', found);
  if (fault.kind === 'dimension') collect(second, 'right', found);
  for (const each of fault.involved) {
    if (each.unknown.origin === 'constant' && each.unknown.name !== '') found.push({ text: each.unknown.name, size: Number.NaN, below: false, side: 'left' });
  }
  return found.sort((a, b) => Number(Number.isNaN(a.size)) - Number(Number.isNaN(b.size)));
}

/** The impure literal factors of a value, through the symbols without notes that it was computed from. */
function collect(value: Value | undefined, side: HiddenNumber['side'], found: HiddenNumber[], depth = 0): void {
  if (!value || depth > 12 || found.length > 4) return;
  if (value.tainted && value.expr) collectFrom(value.expr, false, side, found);
  if (found.length > 0) return;
  collect(value.version?.note ? undefined : value.version?.assigned, side, found, depth + 1);
  for (const part of value.from) if (part.tainted) collect(part, side, found, depth + 1);
}

function collectFrom(expr: Expr, below: boolean, side: HiddenNumber['side'], found: HiddenNumber[]): void {
  if (expr.kind === 'number' && expr.value) {
    const literal = readLiteral(expr.value, expr.text);
    if (!literal.pure) found.push({ text: expr.text, size: literalNumber(literal), below, side });
  } else if (expr.kind === 'binary' && (expr.op === '*' || expr.op === '/' || expr.op === '//')) {
    collectFrom(expr.left, below, side, found);
    collectFrom(expr.right, expr.op === '*' ? below : !below, side, found);
  } else if (expr.kind === 'unary') collectFrom(expr.operand, below, side, found);
  else if (expr.kind === 'binary' && (expr.op === '+' || expr.op === '-')) collectFrom(expr.left, below, side, found);
  else if (expr.kind === 'binary' && expr.op === '**') collectFrom(expr.left, below, side, found);
}

/** For tests of the sentence: the coherent unit that a number would have to carry. */
export function unitNeeded(fault: HiddenFault): string | undefined {
  const need = neededUnit(fault, hiddenNumbers(fault.constraint, fault));
  return need && coherentUnit(need);
}
