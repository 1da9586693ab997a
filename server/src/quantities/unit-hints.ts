/** Hints on readings that depend on convention, each with the spelling that leaves no doubt. */
import type { Marks } from './parse-unit-reader.ts';
import { Dimension } from './dimension.ts';
import { Rational } from './rational.ts';
import { type Factor, spelledOut } from './unit-factor.ts';
import type { UnitHint } from './unit-result.ts';

type Place = (start: number, end: number) => { readonly start: number; readonly end: number };

/** The hints of a product that was read from `text`; `plain` is its plain form. */
export function hintsOf(text: string, plain: string, factors: readonly Factor[], marks: Marks, place: Place, describes: string | undefined): readonly UnitHint[] {
  const marked = factors.filter((factor) => factor.hint !== undefined);
  const pound = poundIn(factors);
  const minute = factors.length === 1 && factors[0]?.text === 'min' && describesMinimum(describes);
  if (marked.length === 0 && !marks.unclear && !pound && !minute) return [];
  const respelled = marks.unclear || marked.some((factor) => factor.hint === 'prefix-or-product');
  const readAs = respelled ? spelledOut(factors) : replaced(text, marked, place);
  const hints: UnitHint[] = [];
  if (marks.unclear) hints.push({ span: place(0, plain.length), kind: 'product-after-slash', readAs });
  for (const factor of marked) {
    if (factor.hint === 'prefix-or-product' && hints.some((hint) => hint.kind === 'prefix-or-product')) continue;
    hints.push({ span: place(factor.start, factor.end), kind: factor.hint as UnitHint['kind'], readAs });
  }
  if (pound) hints.push({ span: place(pound.start, pound.end), kind: 'pound-mass-or-force', readAs: spelledOut(factors.map((factor) => (factor === pound ? { ...factor, text: 'lbm' } : factor))) });
  if (minute) hints.push({ span: place(0, plain.length), kind: 'minute-or-minimum', readAs: 'minute' });
  return hints;
}

/** Whether a description speaks of a minimum. */
export function describesMinimum(describes: string | undefined): boolean {
  return describes !== undefined && /minim|(?:^|[\s_])min(?:_|\d)|_min\b/i.test(describes);
}

/** The author's text with the doubtful symbols replaced. */
function replaced(text: string, marked: readonly Factor[], place: Place): string {
  let out = text;
  for (const factor of [...marked].sort((a, b) => b.start - a.start)) {
    const span = place(factor.start, factor.end);
    out = out.slice(0, span.start) + factor.text + out.slice(span.end);
  }
  return out.trim();
}

const perArea = Dimension.base('M').div(Dimension.base('L').pow(Rational.of(2)));
const perLength = Dimension.base('M').div(Dimension.base('L'));

/** Pounds per area or length, where many houses mean the force. */
function poundIn(factors: readonly Factor[]): Factor | undefined {
  const pound = factors.find((factor) => /^(?:lbs?|pounds?)$/.test(factor.text) && factor.power.isOne);
  if (!pound || !factors.every((factor) => factor === pound || /^(?:in|ft|inch|inches|foot|feet|yd)$/.test(factor.text))) return undefined;
  let dimension = Dimension.one;
  for (const factor of factors) dimension = dimension.mul(factor.unit.dimension.pow(factor.power));
  return dimension === perArea || dimension === perLength ? pound : undefined;
}
