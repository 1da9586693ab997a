/** What stands in the brackets of a signature: `?a^2 m`, `difference ?a`, `sum ?a`, `rad`. */
import type { UnitClaim } from '../program/signature.ts';
import { parseUnit } from '../quantities/parse-unit.ts';
import { Rational } from '../quantities/rational.ts';
import { multiply, pureNumber, raise, type Unit } from '../quantities/unit.ts';
import type { Vocabulary } from '../quantities/unit-result.ts';
import { type NotationProblem, notationProblem, unknownUnit } from './problem.ts';

export const anyClaim: UnitClaim = { kind: 'any' };

interface Operand {
  readonly text: string;
  readonly start: number;
  readonly divides: boolean;
}

type Power = { readonly variable: string; readonly power: Rational };

type Kind = { readonly difference: boolean; readonly sum?: true };

/** Reads the text between brackets that begins at `start`; what cannot be read goes to `problems` and claims nothing. */
export function readClaim(inner: string, start: number, vocabulary: Vocabulary | undefined, problems: NotationProblem[]): UnitClaim {
  const word = /^\s*(difference|sum)(?=[\s?]|$)\s*/.exec(inner);
  const blank = word?.[0].length ?? inner.length - inner.trimStart().length;
  const body = inner.slice(blank).trimEnd();
  const at = start + blank;
  if (body === '') {
    if (word) problems.push(notationProblem('empty-claim', start, start + inner.length, word[1]));
    return anyClaim;
  }
  const kind: Kind = { difference: word?.[1] === 'difference', ...(word?.[1] === 'sum' ? { sum: true } : {}) };
  if (!body.includes('?')) {
    const unit = unitOf(body, at, vocabulary, problems);
    return unit ? { kind: 'unit', unit, powers: [], ...kind } : anyClaim;
  }
  return product(body, at, kind, vocabulary, problems) ?? anyClaim;
}

function product(body: string, start: number, kind: Kind, vocabulary: Vocabulary | undefined, problems: NotationProblem[]): UnitClaim | undefined {
  const operands = operandsOf(body, start);
  const slash = operands.findIndex((each) => each.divides);
  if (slash >= 0 && operands.slice(slash + 1).some((each) => !each.divides)) {
    const at = start + body.indexOf('/');
    problems.push(notationProblem('slash-before-two', at, at + 1));
    return undefined;
  }
  const powers: Power[] = [];
  const texts: string[] = [];
  let unit: Unit = pureNumber;
  for (const operand of operands) {
    const sign = operand.divides ? Rational.minusOne : Rational.one;
    if (operand.text.startsWith('?')) {
      const power = variablePower(operand, problems);
      if (!power) return undefined;
      powers.push({ variable: power.variable, power: power.power.mul(sign) });
    } else if (operand.text !== '1') {
      const factor = unitOf(operand.text, operand.start, vocabulary, problems);
      if (!factor) return undefined;
      texts.push(operand.divides ? `1/${operand.text}` : operand.text);
      unit = multiply(unit, raise(factor, sign, factor.text), texts.join(' '));
    }
  }
  return { kind: 'unit', unit, powers: gathered(powers), ...kind };
}

/** Operands with blanks, `*`, `·` or `/` between them; round brackets keep theirs together. */
function operandsOf(body: string, start: number): Operand[] {
  const operands: Operand[] = [];
  let divides = false;
  for (const match of body.matchAll(/([*/·])|((?:\([^()]*\)|[^\s*/·(])+)/g)) {
    if (match[1] !== undefined) divides = match[1] === '/';
    else {
      operands.push({ text: match[2] as string, start: start + match.index, divides });
      divides = false;
    }
  }
  return operands;
}

function variablePower({ text, start }: Operand, problems: NotationProblem[]): Power | undefined {
  const match = /^\?([A-Za-z]\w*)(?:\^(?:(-?\d+)|\((-?\d+(?:\.\d+)?(?:\/\d+)?)\)))?$/.exec(text);
  const power = match && Rational.parse(match[2] ?? match[3] ?? '1');
  if (!match || !power) {
    problems.push(notationProblem('bad-power', start, start + text.length, text));
    return undefined;
  }
  return { variable: match[1] as string, power };
}

function gathered(powers: readonly Power[]): Power[] {
  const sums = new Map<string, Rational>();
  for (const { variable, power } of powers) sums.set(variable, (sums.get(variable) ?? Rational.zero).add(power));
  return [...sums].filter(([, power]) => !power.isZero).map(([variable, power]) => ({ variable, power }));
}

function unitOf(text: string, start: number, vocabulary: Vocabulary | undefined, problems: NotationProblem[]): Unit | undefined {
  const result = parseUnit(text, vocabulary ? { vocabulary } : {});
  if (result.ok) return result.unit;
  problems.push(unknownUnit(text, start, result));
  return undefined;
}
