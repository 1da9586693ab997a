/** One function, or a file's top level: generated, solved, and summed up as a scheme. */
import { Context, type EmpiricalUnit, type Surroundings } from '../constraints/context.ts';
import { type Form, sameForm, unknownForm } from '../constraints/form.ts';
import type { Constraint } from '../constraints/problem.ts';
import { readBody, type ReadParam, readParams } from '../constraints/function-body.ts';
import type { ClassInfo, Scheme, SchemeParam, SchemeResult } from '../constraints/scheme.ts';
import { walk } from '../constraints/statements.ts';
import { notedValue } from '../constraints/targets.ts';
import type { NoteInForce, Value } from '../constraints/value.ts';
import type { Chunk, FunctionStmt } from '../program/nodes.ts';
import { constructorNames, ownField } from '../program/objects.ts';
import type { Span } from '../text/span.ts';
import type { Piece } from './definitions.ts';
import type { Fault } from './fault.ts';
import { schemeFingerprint } from './fingerprint.ts';
import { rootCause } from './root-cause.ts';
import { type Solution, solve } from './solve.ts';

/** What came of one function or of the top level. */
export interface Solved {
  readonly faults: readonly Fault[];
  readonly scheme: Scheme | undefined;
  /** Attributes of `self` that a constructor gave a known unit. */
  readonly fields: ReadonlyMap<string, Value>;
  readonly reads?: ReadonlyMap<string, string>;
  readonly parts?: readonly object[] | undefined;
}

const noFields: ReadonlyMap<string, Value> = new Map();

export function solvePiece(piece: Piece, owner: ClassInfo | undefined, surroundings: Surroundings): Solved {
  const empirical = surroundings.notes.empiricalFunction(piece.fn);
  if (empirical) return { faults: [], scheme: empiricalScheme(piece.fn, piece.chunk, surroundings, empirical), fields: noFields };
  const first = attempt(piece, owner, surroundings, undefined);
  const faults = rootCause(first.faults, (note) => attempt(piece, owner, surroundings, note).faults);
  return { ...first, faults };
}

export function solveTopLevel(chunks: readonly Chunk[], surroundingsOf: (chunk: Chunk) => Surroundings): Solved {
  const run = (ignored?: NoteInForce): readonly Fault[] => {
    const first = chunks[0] as Chunk;
    const context = new Context(first.anchor, surroundingsOf(first), undefined);
    for (const chunk of chunks) {
      context.anchor = chunk.anchor;
      context.surroundings = without(surroundingsOf(chunk), ignored);
      walk(context, chunk.statements);
    }
    return solve(context.constraints).faults;
  };
  return { faults: rootCause(run(), run), scheme: undefined, fields: noFields };
}

/** Values at every expression and definition of a piece of program, and what was solved of the unknowns in them. */
export interface Sightings {
  readonly values: ReadonlyMap<Span, Value>;
  readonly reduce: (form: Form) => Form;
  /** What had to hold. */
  readonly constraints: readonly Constraint[];
}

/** The sightings of a function, for hover and repairs. */
export function sightingsOf(piece: Piece, owner: ClassInfo | undefined, surroundings: Surroundings): Sightings {
  const values = new Map<Span, Value>();
  const context = new Context(piece.chunk.anchor, surroundings, piece.fn, values);
  readBody(context, piece.fn, selfOf(piece, owner));
  return { values, reduce: solve(context.constraints).reduce, constraints: context.constraints };
}

/** The sightings of a file's top level. */
export function topSightings(chunks: readonly Chunk[], surroundingsOf: (chunk: Chunk) => Surroundings): Sightings {
  const values = new Map<Span, Value>();
  const first = chunks[0];
  if (!first) return { values, reduce: (form) => form, constraints: [] };
  const context = new Context(first.anchor, surroundingsOf(first), undefined, values);
  for (const chunk of chunks) {
    context.anchor = chunk.anchor;
    context.surroundings = surroundingsOf(chunk);
    walk(context, chunk.statements);
  }
  return { values, reduce: solve(context.constraints).reduce, constraints: context.constraints };
}

function attempt(piece: Piece, owner: ClassInfo | undefined, surroundings: Surroundings, ignored: NoteInForce | undefined): Solved {
  const context = new Context(piece.chunk.anchor, without(surroundings, ignored), piece.fn);
  const params = readBody(context, piece.fn, selfOf(piece, owner));
  const solution = solve(context.constraints);
  const sound = !solution.faults.some((fault) => fault.kind === 'dimension' || fault.kind === 'pure' || fault.kind === 'varying-power');
  const scheme = schemeOf(piece, params, context.returns, context.surroundings.notes.results(piece.fn), solution, sound);
  return { faults: solution.faults, scheme, fields: fieldsOf(context, solution.reduce) };
}

function selfOf(piece: Piece, owner: ClassInfo | undefined): Value | undefined {
  const plain = !piece.fn.unbound && piece.fn.decorators.every((each) => each.kind !== 'name' || each.name !== 'staticmethod');
  const fields = owner && (constructorNames.includes(piece.fn.name) ? owner.declared() : owner.fields());
  return fields && plain ? { expr: undefined, form: undefined, fields, from: [] } : undefined;
}

/** The same surroundings as if one note had not been written. */
function without(surroundings: Surroundings, ignored: NoteInForce | undefined): Surroundings {
  if (!ignored) return surroundings;
  const keep = (notes: readonly NoteInForce[]): readonly NoteInForce[] => notes.filter((note) => note !== ignored);
  const { notes } = surroundings;
  const drop = (note: NoteInForce | undefined): NoteInForce | undefined => (note === ignored ? undefined : note);
  return {
    ...surroundings,
    notes: {
      ...notes,
      statement: (...args) => keep(notes.statement(...args)),
      parameter: (...args) => keep(notes.parameter(...args)),
      results: (...args) => keep(notes.results(...args)),
      entry: (...args) => drop(notes.entry(...args)),
      symbol: (...args) => drop(notes.symbol(...args)),
    },
  };
}

function schemeOf(piece: Piece, params: readonly ReadParam[], returns: readonly Value[], notes: readonly NoteInForce[], solution: Solution, sound: boolean): Scheme {
  const scheme = {
    name: piece.fn.name,
    params: params.map((each) => schemeParam(each, sound ? solution.reduceSurely : (form) => form)),
    result: notes.length > 0 ? notedResult(notes, returns) : joinedResult(returns, solution),
  };
  return { ...scheme, fingerprint: schemeFingerprint(scheme) };
}

/** A body that contradicts itself says nothing of its parameters: the fault is reported there, not at every call. */
function schemeParam({ param, note, unknown }: ReadParam, reduce: (form: Form) => Form): SchemeParam {
  const open = unknown && reduce(unknownForm(unknown));
  return { name: param.name, mode: param.mode, optional: param.default !== undefined, form: open, unknown, ...(note ? { note } : {}), ...(param.intent ? { intent: param.intent } : {}) };
}

function notedResult(notes: readonly NoteInForce[], returns: readonly Value[]): SchemeResult | undefined {
  const positions = notes.filter((note) => note.note.target.kind === 'result' && note.note.target.position !== undefined);
  if (positions.length === 0) {
    const note = notes[0] as NoteInForce;
    const several = returns.some((value) => value.items !== undefined);
    return several ? undefined : { form: notedValue('', note, note.anchor, undefined).form, measure: undefined, note };
  }
  const items: SchemeResult[] = [];
  for (const note of positions) {
    const target = note.note.target;
    if (target.kind === 'result' && target.position !== undefined) items[target.position] = { form: undefined, measure: undefined, note };
  }
  return { form: undefined, measure: undefined, items: Array.from(items, (item) => item ?? { form: undefined, measure: undefined }) };
}

function joinedResult(returns: readonly Value[], solution: Solution): SchemeResult | undefined {
  const telling = returns.filter((value) => !value.fits);
  const first = telling[0];
  if (!first) return undefined;
  const items = first.items;
  if (items) {
    if (!telling.every((value) => value.items?.length === items.length)) return undefined;
    const columns = items.map((_, at) => joinedResult(telling.map((value) => value.items?.[at] as Value), solution));
    return { form: undefined, measure: undefined, items: columns.map((each) => each ?? { form: undefined, measure: undefined }) };
  }
  if (telling.some((value) => !value.form || value.literal)) return telling.length === 1 && first.fields ? { form: undefined, measure: undefined, fields: first.fields } : undefined;
  // What a body merely infers is no claim on its callers: two inferences in a row are too far from any note.
  if (telling.some((value) => solution.isInferred(value.form as Form))) return undefined;
  const forms = telling.map((value) => solution.reduce(value.form as Form));
  if (!forms.every((form) => sameForm(form, forms[0] as Form))) return undefined;
  const measure = telling.every((value) => value.measure === first.measure) && sameForm(forms[0] as Form, first.form as Form) && !first.misuse ? first.measure : undefined;
  const tainted = telling.some((value) => value.tainted || solution.isDoubtful(value.form as Form));
  return { form: forms[0], measure, ...(tainted ? { tainted } : {}) };
}

function empiricalScheme(fn: FunctionStmt, chunk: Chunk, surroundings: Surroundings, units: readonly EmpiricalUnit[]): Scheme {
  const context = new Context(chunk.anchor, surroundings, fn);
  const named = (name: string): NoteInForce | undefined => units.find((unit) => unit.symbol === name)?.note;
  const params = readParams(context, fn, undefined).map((each): SchemeParam => {
    const note = named(each.param.name) ?? each.note;
    return { name: each.param.name, mode: each.param.mode, optional: each.param.default !== undefined, form: undefined, unknown: undefined, ...(note ? { note } : {}), ...(each.param.intent ? { intent: each.param.intent } : {}) };
  });
  const results = surroundings.notes.results(fn);
  const note = named(fn.name);
  const result = results.length > 0 ? notedResult(results, []) : note && { form: undefined, measure: undefined, note };
  const scheme = { name: fn.name, params, result };
  return { ...scheme, fingerprint: schemeFingerprint(scheme) };
}

function fieldsOf(context: Context, reduce: (form: Form) => Form): ReadonlyMap<string, Value> {
  const fields = new Map<string, Value>();
  for (const [path, value] of context.bindings.all()) {
    const name = ownField(path);
    if (name === undefined) continue;
    const form = value.form && reduce(value.form);
    if (value.fields) fields.set(name, value);
    else if (form && form.terms.length === 0 && value.version?.origin !== 'constant') fields.set(name, { ...value, form });
  }
  return fields;
}
