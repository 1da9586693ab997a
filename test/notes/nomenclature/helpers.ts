/** Nomenclature text in, lines out. */
import { readNomenclature } from '../../../server/src/notes/nomenclature/read.ts';
import { type Evaluated, evaluateFormulas } from '../../../server/src/notes/nomenclature/evaluate.ts';
import type { Nomenclature } from '../../../server/src/notes/nomenclature/model.ts';
import { printUnit } from '../../../server/src/quantities/print-unit.ts';

export function read(text: string): Nomenclature {
  return readNomenclature(text, 'test.nomen');
}

/** `D [m] = 0.085 "impeller diameter"`, one line per symbol. */
export function symbolsOf(text: string): readonly string[] {
  const { symbols, formulas } = read(text);
  return [...symbols.values()].map((symbol) => {
    const unit = symbol.unit ? ` [${symbol.unit.text}]` : '';
    const value = symbol.value ? ` = ${symbol.value}` : formulas.has(symbol.name) ? ' = …' : '';
    const range = symbol.range ? ` ${symbol.range.low} .. ${symbol.range.high}` : '';
    return `${symbol.name}${unit}${value}${range}${symbol.description === '' ? '' : ` "${symbol.description}"`}`;
  });
}

/** `kind: the characters it is about`, one line per problem. */
export function problemsOf(text: string): readonly string[] {
  return read(text).problems.map(({ kind, span }) => `${kind}: ${text.slice(span.start, span.end)}`);
}

/** What a formula comes to, as text with six digits: `9010.73 1`, `12 .. 15 kW`, `none: unlike at …`. */
export async function valueOf(text: string, name = 'y'): Promise<string> {
  const result = (await evaluateFormulas(read(text))).get(name);
  return result ? printed(result, text) : 'no formula';
}

function printed(result: Evaluated, text: string): string {
  const digits = (value: number): string => String(Number(value.toPrecision(6)));
  switch (result.kind) {
    case 'value':
      return `${digits(result.value)} ${printUnit(result.unit)}`;
    case 'range':
      return `${digits(result.low)} .. ${digits(result.high)} ${printUnit(result.unit)}${result.sharp ? '' : ' (at most)'}`;
    case 'none':
      return `none: ${result.reason.kind} at ${text.slice(result.reason.span.start, result.reason.span.end)}`;
  }
}
