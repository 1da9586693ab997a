/** Notes in the documentation of functions and classes. */
import type { ClassStmt, DocText, FunctionStmt } from '../program/nodes.ts';
import type { ReadOptions, Vocabulary } from '../quantities/unit-result.ts';
import { lookForUnits, type UnitFound, unitBehindComma, unitInWords } from './candidates.ts';
import type { Collector } from './collector.ts';
import { type DocEntry, entriesOf, type Piece } from './documentation.ts';
import type { NoteTarget } from './types.ts';

/** Reads a function's documentation: parameters and results; for a constructor's class, its fields go to `owner`. */
export function functionDocs(out: Collector, fn: FunctionStmt, vocabulary: Vocabulary): void {
  if (fn.doc) readDocs(out, fn.doc, vocabulary, (entry) => targetsInFunction(entry, fn));
}

/** A class's documentation describes its fields and its constructor's parameters. */
export function classDocs(out: Collector, cls: ClassStmt, vocabulary: Vocabulary): void {
  if (!cls.doc) return;
  const constructor = cls.body.find((each): each is FunctionStmt => each.kind === 'function' && each.name === '__init__');
  const silent = constructor && !constructor.doc ? constructor : undefined;
  readDocs(out, cls.doc, vocabulary, (entry) => entry.names.flatMap((name): NoteTarget[] => {
    const param = silent?.params.find((each) => each.name === name);
    const field: NoteTarget = { kind: 'field', owner: cls, name };
    return silent && param ? [field, { kind: 'parameter', owner: silent, param }] : [field];
  }));
}

function readDocs(out: Collector, doc: DocText, vocabulary: Vocabulary, targetsOf: (entry: DocEntry) => readonly NoteTarget[]): void {
  const entries = entriesOf(doc.text);
  const results = entries.filter((entry) => entry.kind === 'result');
  for (const entry of entries) {
    const several = entry.kind === 'result' && results.length > 1;
    const targets = targetsOf(entry);
    const found = unitOfEntry(out, entry, doc.start, vocabulary, targets.length > 0);
    if (!found) continue;
    for (const target of several ? targets.map((each) => positioned(each, results.indexOf(entry))) : targets) {
      out.note({ target, unit: found.unit.result.unit, span: found.span, form: 'documentation', hints: found.unit.result.hints, ...(found.description === '' ? {} : { description: found.description }) });
    }
  }
}

function positioned(target: NoteTarget, position: number): NoteTarget {
  return target.kind === 'result' ? { ...target, position } : target;
}

function targetsInFunction(entry: DocEntry, fn: FunctionStmt): readonly NoteTarget[] {
  if (entry.kind === 'result') return [{ kind: 'result', owner: fn, ...(entry.names[0] === undefined ? {} : { name: entry.names[0] }) }];
  return entry.names.flatMap((name): NoteTarget[] => {
    const param = fn.params.find((each) => each.name === name);
    return param ? [{ kind: 'parameter', owner: fn, param }] : [];
  });
}

interface EntryUnit {
  readonly unit: UnitFound;
  readonly span: { readonly start: number; readonly end: number };
  readonly description: string;
}

/** The unit of an entry: a bracket anywhere in it, then parentheses, then words. */
function unitOfEntry(out: Collector, entry: DocEntry, offset: number, vocabulary: Vocabulary, wanted: boolean): EntryUnit | undefined {
  const pieces = [entry.head, ...entry.body].filter((piece) => piece.text.trim() !== '').slice(0, 12);
  const description = pieces.map((piece) => piece.text.trim()).join(' ').slice(0, 200);
  const options: ReadOptions = { vocabulary, describes: `${entry.names[0] ?? ''} ${description}` };
  const at = (piece: Piece, unit: UnitFound): EntryUnit => ({ unit, span: { start: offset + piece.start + unit.span.start, end: offset + piece.start + unit.span.end }, description: without(description, unit) });
  const looked = pieces.map((piece) => ({ piece, ...lookForUnits(piece.text, out.settings, options) }));
  for (const each of looked) {
    out.unread(each.unread.map((one) => ({ text: one.text, span: shift(one.span, offset + each.piece.start) })));
    if (wanted) for (const problem of each.problems) out.problem({ text: problem.text, fault: problem.fault, span: shift(problem.span, offset + each.piece.start) });
  }
  const brackets = looked.flatMap((each) => each.found.filter((one) => one.by === 'bracket').map((unit) => ({ piece: each.piece, unit })));
  const telling = brackets.find((each) => !each.unit.result.unit.dimension.isOne) ?? brackets.at(-1);
  if (telling) return agreeing(brackets.map((each) => each.unit)) ? at(telling.piece, telling.unit) : undefined;
  return unitWithoutBracket(entry, pieces, looked, options, at);
}

function unitWithoutBracket(entry: DocEntry, pieces: readonly Piece[], looked: readonly { piece: Piece; found: readonly UnitFound[] }[], options: ReadOptions, at: (piece: Piece, unit: UnitFound) => EntryUnit): EntryUnit | undefined {
  for (const each of looked) {
    const unit = each.found.find((one) => one.by === 'parenthesis');
    if (unit) return at(each.piece, unit);
  }
  const whole = pieces.slice(0, 3);
  for (const piece of whole) {
    const unit = unitInWords(piece.text, options);
    if (unit) return at(piece, unit);
  }
  const tails = entry.inline ? [entry.head, ...entry.body.slice(-1)] : [entry.head, ...entry.body.slice(0, 1)];
  for (const piece of tails) {
    const unit = unitBehindComma(piece.text, options);
    if (unit) return at(piece, unit);
  }
  return undefined;
}

/** Several brackets of one entry that name different dimensions leave it open which is meant. */
function agreeing(units: readonly UnitFound[]): boolean {
  const dimensioned = units.filter((unit) => !unit.result.unit.dimension.isOne);
  return dimensioned.every((unit) => unit.result.unit.dimension === dimensioned[0]?.result.unit.dimension);
}

function shift(span: { start: number; end: number }, by: number): { start: number; end: number } {
  return { start: span.start + by, end: span.end + by };
}

function without(description: string, unit: UnitFound): string {
  return description.replace(`[${unit.result.unit.text}]`, '').replace(/\s+/g, ' ').replace(/[\s,;]+$/, '').trim();
}
