/**
 * What the formulas of a nomenclature file come to. Symbols are taken in their units, so nothing is to be converted by hand:
 * every number goes to its coherent SI unit, the arithmetic is done there (by mathjs), and the result comes back in the unit
 * of the formula's own note. A symbol with a range gives a range (enclosure.ts says how).
 */
import { parseUnit } from '../../quantities/parse-unit.ts';
import { coherentUnit } from '../../quantities/print-unit.ts';
import { pureNumber, type Unit } from '../../quantities/unit.ts';
import type { Span } from '../../text/span.ts';
import type { Elementary } from './elementary.ts';
import { enclose } from './enclosure.ts';
import { FormulaLowering } from './formula-lowering.ts';
import { zeroFor } from './formula-result.ts';
import type { Term } from './formula-term.ts';
import { IntervalArithmetic, pointAt } from './interval.ts';
import type { Nomenclature, NomenclatureFormula } from './model.ts';
import type { Box } from './natural.ts';
import { type NoValue, Refusal, refuse } from './no-value.ts';

export type { NoValue } from './no-value.ts';

/** A formula's value or range, counted in `unit`. */
export type Evaluated =
  | { readonly kind: 'value'; readonly value: number; readonly unit: Unit }
  /** `sharp`: both ends are reached; otherwise the true range may be narrower. */
  | { readonly kind: 'range'; readonly low: number; readonly high: number; readonly sharp: boolean; readonly unit: Unit }
  | { readonly kind: 'none'; readonly reason: NoValue };

/** Evaluates every formula. Loads the arithmetic at the first formula met; never throws for any file. */
export async function evaluateFormulas(nomenclature: Nomenclature): Promise<ReadonlyMap<string, Evaluated>> {
  if (nomenclature.formulas.size === 0) return new Map();
  const { elementary } = await import('./elementary.ts');
  return evaluateWith(elementary, nomenclature);
}

/** The same where the arithmetic is loaded already. */
export function evaluateWith(elementary: Elementary, nomenclature: Nomenclature): ReadonlyMap<string, Evaluated> {
  const lowering = new FormulaLowering(nomenclature);
  const results = new Map<string, Evaluated>();
  for (const formula of nomenclature.formulas.values()) results.set(formula.name, evaluated(formula, lowering, elementary));
  return results;
}

function evaluated(formula: NomenclatureFormula, lowering: FormulaLowering, elementary: Elementary): Evaluated {
  try {
    const term = lowering.formula(formula.name, formula.formula);
    const unit = resultUnit(formula, term, lowering.vocabulary);
    return counted(term, unit, lowering.box, elementary, formula.formula);
  } catch (error) {
    if (error instanceof Refusal) return { kind: 'none', reason: error.reason };
    throw error;
  }
}

/** The formula's own unit, or the coherent one where its line has none. */
function resultUnit(formula: NomenclatureFormula, term: Term, vocabulary: Nomenclature['vocabulary']): Unit {
  if (formula.unit) return formula.unit;
  if (formula.unitSpan.end > formula.unitSpan.start) refuse({ kind: 'no-unit', symbol: formula.name, span: formula.unitSpan });
  if (term.dimension.isOne) return pureNumber;
  const coherent = parseUnit(coherentUnit(term.dimension), { vocabulary });
  return coherent.ok ? coherent.unit : refuse({ kind: 'no-unit', symbol: formula.name, span: formula.nameSpan });
}

function counted(term: Term, unit: Unit, box: Box, elementary: Elementary, span: Span): Evaluated {
  if (!unit.scale || unit.level) return refuse({ kind: 'no-unit', symbol: unit.text, span });
  const zero = zeroFor(term, unit, span);
  const enclosed = enclose(term.node, box, elementary);
  if ('undefinedAt' in enclosed) return refuse({ kind: 'undefined', span: enclosed.undefinedAt ?? span });
  const plain = enclosed.low === enclosed.high;
  const back = new IntervalArithmetic(elementary, !plain);
  const above = zero === 0 ? enclosed : back.subtract(enclosed, pointAt(zero));
  const result = above && back.divide(above, pointAt(unit.scale.toNumber()));
  if (!result) return refuse({ kind: 'undefined', span });
  return plain ? { kind: 'value', value: result.low, unit } : { kind: 'range', ...result, sharp: enclosed.sharp, unit };
}
