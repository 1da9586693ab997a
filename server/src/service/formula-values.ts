/** What the formulas of a nomenclature file come to, in words. */
import type { Elementary } from '../notes/nomenclature/elementary.ts';
import { type Evaluated, evaluateWith } from '../notes/nomenclature/evaluate.ts';
import { readNomenclature } from '../notes/nomenclature/read.ts';
import type { Vocabulary } from '../quantities/unit-result.ts';

/** `5894 .. 70730` by the formula's name; formulas without a value are left out. */
export type FormulaValues = ReadonlyMap<string, string>;

/** The values of all formulas of a text, counted in their own units. */
export function formulaValues(text: string, file: string, vocabulary: Vocabulary, elementary: Elementary): FormulaValues {
  const results = evaluateWith(elementary, readNomenclature(text, file, vocabulary));
  return new Map([...results].flatMap(([name, result]) => {
    const words = valueWords(result);
    return words === undefined ? [] : [[name, words] as const];
  }));
}

function valueWords(result: Evaluated): string | undefined {
  if (result.kind === 'none') return undefined;
  const { text } = result.unit;
  const unit = text === '' || result.unit.dimension.isOne ? '' : ` ${text}`;
  return result.kind === 'value' ? `${short(result.value)}${unit}` : `${short(result.low)} .. ${short(result.high)}${unit}`;
}

/** Four significant digits. */
function short(value: number): string {
  return String(Number(value.toPrecision(4)));
}
