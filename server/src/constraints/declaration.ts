/** Declarations: names with a note that holds for all their values, with a class, or with nothing known. */
import { pathOf } from '../program/path.ts';
import type { DeclareStmt, Expr } from '../program/nodes.ts';
import type { Context } from './context.ts';
import { namedClass, objectOf } from './scheme.ts';
import { notedValue, reportDisagreement } from './targets.ts';

/** What a declaration says of its names; without a note, a name hides the one of the same spelling around it. */
export function declaration(context: Context, statement: DeclareStmt): void {
  for (const target of statement.target.kind === 'sequence' ? statement.target.items : [statement.target]) declare(context, statement, target);
}

function declare(context: Context, statement: DeclareStmt, target: Expr): void {
  const path = pathOf(target);
  if (path === undefined || context.owner?.params.some((param) => param.name === path)) return;
  const notes = context.surroundings.notes.statement(statement, path, context.owner);
  reportDisagreement(context, path, notes);
  const [note] = notes;
  context.declare(path, note);
  const info = note ? undefined : namedClass(statement.annotation, (name) => context.surroundings.global(name));
  if (note) context.bindings.set(path, notedValue(path, note, context.anchor, target));
  else context.bindings.set(path, info ? objectOf(info) : { expr: undefined, form: undefined, fits: true, from: [] });
}
