/** A function's body as a problem of its own: parameters in, constraints and returned values out. */
import type { FunctionStmt, Param } from '../program/nodes.ts';
import type { Context } from './context.ts';
import { type Unknown, unknownForm } from './form.ts';
import { namedClass, objectOf } from './scheme.ts';
import { walk } from './statements.ts';
import { notedValue, reportDisagreement } from './targets.ts';
import type { NoteInForce, Value } from './value.ts';

export interface ReadParam {
  readonly param: Param;
  readonly note: NoteInForce | undefined;
  readonly unknown: Unknown | undefined;
}

/** Binds the parameters and walks the body; `self` is the object of a method. Returned values are left in the context. */
export function readBody(context: Context, fn: FunctionStmt, self: Value | undefined): readonly ReadParam[] {
  const params = readParams(context, fn, self);
  walk(context, fn.body);
  return params;
}

/** The parameters with their notes; those without one get an unknown of their own. */
export function readParams(context: Context, fn: FunctionStmt, self: Value | undefined): readonly ReadParam[] {
  return fn.params.map((param, at) => {
    if (at === 0 && self) {
      context.bindings.set(param.name, self);
      return { param, note: undefined, unknown: undefined };
    }
    const notes = context.surroundings.notes.parameter(fn, param);
    reportDisagreement(context, param.name, notes);
    return bindParam(context, param, notes[0]);
  });
}

function bindParam(context: Context, param: Param, note: NoteInForce | undefined): ReadParam {
  const version = { path: param.name, anchor: context.anchor, span: param.nameSpan, origin: 'parameter' as const };
  if (param.mode === 'rest' || param.mode === 'rest-named') {
    context.bindings.set(param.name, { expr: undefined, form: undefined, from: [], version });
    return { param, note: undefined, unknown: undefined };
  }
  const info = note ? undefined : namedClass(param.annotation, (name) => context.surroundings.global(name));
  if (info) {
    const object: Value = { ...objectOf(info), version };
    context.bindings.set(param.name, object);
    context.sightings?.set(param.nameSpan, object);
    return { param, note: undefined, unknown: undefined };
  }
  if (param.intent && note) context.declare(param.name, note);
  const unknown = note ? undefined : context.fresh(param.name, param.nameSpan, 'parameter');
  const value: Value = note
    ? notedValue(param.name, note, context.anchor, param.nameSpan)
    : { expr: undefined, form: unknown && unknownForm(unknown), from: [], version };
  context.bindings.set(param.name, value);
  context.sightings?.set(param.nameSpan, value);
  return { param, note, unknown };
}
