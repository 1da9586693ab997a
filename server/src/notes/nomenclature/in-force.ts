import type { Unit } from '../../quantities/unit.ts';
import type { Anchor } from '../../text/span.ts';
import type { Note } from '../types.ts';
import type { Nomenclature, NomenclatureSymbol } from './model.ts';

/** A nomenclature symbol's note with the place it stands at. */
export interface NomenclatureNote {
  readonly note: Note;
  readonly unit: Unit;
  readonly anchor: Anchor;
}

/** The symbols of a file as notes; the first line of a symbol counts. */
export function nomenclatureNotesInForce(nomenclature: Nomenclature, file: string): ReadonlyMap<string, NomenclatureNote> {
  const notes = new Map<string, NomenclatureNote>();
  const anchor: Anchor = { file, start: 0 };
  for (const symbol of nomenclature.symbols.values()) {
    if (symbol.unit) notes.set(symbol.name, { note: noteOf(symbol, symbol.unit), unit: symbol.unit, anchor });
  }
  return notes;
}

function noteOf(symbol: NomenclatureSymbol, unit: Unit): Note {
  return {
    target: { kind: 'symbol', owner: undefined, name: symbol.name }, unit, span: symbol.unitSpan, form: 'nomenclature', hints: symbol.hints,
    ...(symbol.description === '' ? {} : { description: symbol.description }), ...(symbol.range ? { range: symbol.range } : {}),
  };
}
