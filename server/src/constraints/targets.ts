/** Assignments: which version of which symbol they make, and what a note on the target asks of the value. */
import { pathOf } from '../program/path.ts';
import type { Expr, Stmt } from '../program/nodes.ts';
import type { Anchor, Span } from '../text/span.ts';
import { Dimension } from '../quantities/dimension.ts';
import { agree } from './arithmetic.ts';
import type { Context } from './context.ts';
import { constantForm, unknownForm } from './form.ts';
import type { Literal } from './literal.ts';
import { type Measure, measureOf } from './measure.ts';
import { Scale } from '../quantities/scale.ts';
import { type NoteInForce, type Value, type Version, unknown } from './value.ts';

const temperature = Dimension.base('Θ');

/** Assigns a value to a target of any shape. */
export function assign(context: Context, target: Expr, value: Value, statement: Stmt): void {
  if (target.kind === 'sequence') {
    target.items.forEach((item, at) => assign(context, item, value.items?.[at] ?? positionOf(value, item), statement));
    return;
  }
  const path = pathOf(target);
  if (path === undefined) return;
  if (target.kind === 'index' && target.keys[0]?.kind !== 'text') return assignMember(context, path, target, value, statement);
  const notes = notesOn(context, statement, path);
  reportDisagreement(context, path, notes);
  const note = notes[0];
  if (!note) {
    if (value.misuse) reportMisuse(context, value);
    return bind(context, path, target, value.misuse ? { ...value, misuse: undefined } : value);
  }
  const noted = notedValue(path, note, context.anchor, target, namesDifference(path, note) || isDifference(value));
  checkTarget(context, path, target, value, noted, note);
  const held: Value = (value.fits && !value.literal) || value.blank ? { ...noted, blank: true } : noted;
  context.bindings.set(path, held);
  context.sightings?.set(target, held);
}

/** The notes that an assigned value has to fit, that of the symbol's declaration behind those of the statement. */
function notesOn(context: Context, statement: Stmt, path: string): readonly NoteInForce[] {
  const notes = context.surroundings.notes.statement(statement, path, context.owner);
  const declared = context.declared.get(path);
  return declared && !notes.includes(declared) ? [...notes, declared] : notes;
}

/** A new version of a symbol without a note. A bare number becomes a constant whose unit its uses decide. */
export function bind(context: Context, path: string, target: Span, value: Value): void {
  context.bindings.dropParts(path);
  const version = { path, anchor: context.anchor, span: target, assigned: value };
  const bound: Value = value.literal && !value.fits ? constantValue(context, path, target, value.literal, version) : { ...value, version: { ...version, origin: 'assigned' } };
  context.bindings.set(path, bound);
  context.sightings?.set(target, bound);
}

/** A constant without a note: its unit is open; it converts like its number only if it turns out to be a pure one. */
function constantValue(context: Context, path: string, target: Span, literal: Literal, version: Omit<Version, 'origin'>): Value {
  const unit = context.fresh(path, target, 'constant');
  const size = literal.value.sign < 0 ? { ...literal, value: literal.value.neg() } : literal;
  const measure: Measure = { readings: [{ scale: Scale.one, weight: 0, zero: 0, nature: 'ratio' }], factors: [{ literal: size, unless: unit }], radian: 0, cycle: 0, degrees: 0 };
  return { expr: undefined, form: unknownForm(unit), measure, from: [], version: { ...version, origin: 'constant' } };
}

/** The value of a symbol whose note decides its unit. */
export function notedValue(path: string, note: NoteInForce, anchor: Anchor, target: Span | undefined, difference = namesDifference(path, note)): Value {
  const span = target ?? note.note.span;
  return {
    expr: undefined, form: constantForm(note.unit.dimension), measure: measureOf(note.unit, difference), from: [],
    version: { path, anchor: target ? anchor : note.anchor, span, origin: 'note', note },
  };
}

/** Names and descriptions that engineers give to differences: `dT`, `delta_p`, `LMTD`, "temperature rise". */
export function namesDifference(path: string, note: NoteInForce): boolean {
  if (note.unit.dimension !== temperature) return false;
  const name = path.slice(path.lastIndexOf('.') + 1);
  return /^(?:d[A-Z_]|d[Tt]|[dD]elta|Δ|[Ll]mtd|LMTD|[Dd]iff)/.test(name) || /(?:^|_)(?:diff|rise|drop|delta|dT|superheat|subcool\w*|lmtd|approach|pinch)(?:_|$)/i.test(name)
    || /\b(?:difference|rise|drop|superheat|subcooling|approach|change|gradient|increment|lmtd|uncertainty|tolerance)\b/i.test(note.note.description ?? '');
}

/** Requires of an assigned value what the note on its target says. */
export function checkTarget(context: Context, path: string, target: Span, value: Value, noted: Value, note: NoteInForce): void {
  const sure = value.form === noted.form;
  if (value.misuse && (sure || !value.tainted)) return reportMisuse(context, value, sure);
  if (!value.form || value.fits || value.blank || value.literal) return;
  agreeWithNote(context, value, noted, value.expr ?? target, { kind: 'target', path, note });
}

export function agreeWithNote(context: Context, value: Value, noted: Value, span: Span, reason: Parameters<typeof agree>[4]): void {
  if (!value.form || value.fits || value.literal) return;
  agree(context, value.expr as Expr, value, noted, reason, value.expr ?? span);
}

/** `sure`: the dimensions come out right, so no literal hides a unit. */
export function reportMisuse(context: Context, value: Value, sure = false): void {
  const misuse = value.misuse;
  if (misuse && (sure || !value.tainted)) context.add({ kind: 'point', anchor: context.anchor, span: misuse.span, value: misuse.value, use: misuse.use });
}

export function reportDisagreement(context: Context, path: string, notes: readonly NoteInForce[]): void {
  const first = notes[0];
  const other = first && notes.find((note) => note !== first && note.note.form !== 'nomenclature' && disagrees(first, note));
  if (first && other) context.add({ kind: 'notes', anchor: context.anchor, span: first.note.span, path, first, second: other });
}

function disagrees(a: NoteInForce, b: NoteInForce): boolean {
  if (a.unit.dimension !== b.unit.dimension) return true;
  return a.unit.scale !== undefined && b.unit.scale !== undefined && !a.unit.scale.equals(b.unit.scale);
}

/** Storing into an element keeps the container's unit and has to agree with it. */
function assignMember(context: Context, path: string, target: Expr, value: Value, statement: Stmt): void {
  const notes = notesOn(context, statement, path);
  const current = context.bindings.get(path);
  const note = notes[0];
  if (note) {
    const noted = notedValue(path, note, context.anchor, target);
    checkTarget(context, path, target, value, noted, note);
    context.bindings.set(path, noted);
    return;
  }
  if (value.misuse) reportMisuse(context, value);
  const held = current?.version?.note;
  if (current && held && current.form && !current.items) return checkTarget(context, path, target, value, current, held);
  if (!current || current.fits || !current.form) {
    const first = current?.fits === true || current?.version?.origin === 'constant';
    context.bindings.set(path, first && value.form && !value.literal ? { ...value, version: { path, anchor: context.anchor, span: target, origin: 'assigned', assigned: value } } : (current ?? unknown(target)));
    return;
  }
  if (value.form && !value.literal && !value.fits && current.form !== value.form) context.bindings.set(path, { expr: target, form: undefined, from: [] });
}

function isDifference(value: Value): boolean {
  return value.measure?.readings.every((reading) => reading.nature === 'difference') === true;
}

/** Unpacking what is not a tuple: an array's rows are alike, anything else is unknown. */
function positionOf(value: Value, item: Expr): Value {
  return value.form && !value.callable && !value.literal ? { ...value, expr: undefined, from: [value] } : unknown(item);
}
