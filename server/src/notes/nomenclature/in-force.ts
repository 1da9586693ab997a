import { parseUnit } from '../../quantities/parse-unit.ts';
import type { Unit } from '../../quantities/unit.ts';
import type { Anchor } from '../../text/span.ts';
import type { Note } from '../types.ts';
import type { Nomenclature } from './model.ts';

/** A nomenclature symbol's note with the place it stands at. */
export interface NomenclatureNote {
  readonly note: Note;
  readonly unit: Unit;
  readonly anchor: Anchor;
}

/** The symbols of a file as notes; the first line of a symbol counts. */
export function nomenclatureNotesInForce(nomenclature: Nomenclature, file: string): ReadonlyMap<string, NomenclatureNote> {
  const notes = new Map<string, NomenclatureNote>();
  const { vocabulary } = nomenclature;
  for (const { start, line } of nomenclature.lines) {
    if (line.kind !== 'symbol' || line.unitText === undefined || notes.has(line.name)) continue;
    const result = parseUnit(line.unitText, { vocabulary, describes: `${line.name} ${line.description}` });
    if (!result.ok) continue;
    const note: Note = {
      target: { kind: 'symbol', owner: undefined, name: line.name }, unit: result.unit, span: line.unitSpan, form: 'nomenclature', hints: result.hints,
      ...(line.description === '' ? {} : { description: line.description }), ...(line.range ? { range: line.range } : {}),
    };
    notes.set(line.name, { note, unit: result.unit, anchor: { file, start } });
  }
  return notes;
}
