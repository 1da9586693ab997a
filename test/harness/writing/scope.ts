/** The variables of a function or of the script, as languages with declarations need them. */
import type { Expr, LoopStmt, Stmt } from '../../../server/src/program/nodes.ts';
import type { Local } from '../hosts/host.ts';
import { blocksOf, expressionsOf, namesIn, nestedIn, within } from './visit.ts';

interface Assigned {
  count: number;
  first: Stmt;
  atTop: boolean;
  isCounter: boolean;
}

/**
 * What the statements assign, in the order of the first assignments; functions inside are scopes of their own. `listOf` finds literal
 * lists; `byIndex`: every loop over a list counts.
 */
export function localsOf(block: readonly Stmt[], params: readonly string[], listOf: (expr: Expr) => readonly Expr[] | undefined, nameOf: (name: string) => string, lineOf: (stmt: Stmt) => number, byIndex: boolean): readonly Local[] {
  const found = new Map<string, Assigned>();
  collect(block, true, found, byIndex);
  return [...found].filter(([name]) => !params.includes(name)).map(([name, { count, first, atTop, isCounter }]) => ({
    name: nameOf(name),
    note: count === 1 ? first.trailing?.text : undefined,
    noteLine: lineOf(first),
    size: first.kind === 'assign' && first.targets[0]?.kind === 'name' ? listOf(first.value)?.length : undefined,
    type: first.kind === 'assign' ? typeOf(first.value) : 'number',
    isConstant: count === 1 && atTop && !isCounter,
    declaredByAssignment: atTop,
    isCounter,
  }));
}

function collect(block: readonly Stmt[], atTop: boolean, found: Map<string, Assigned>, byIndex: boolean): void {
  for (const stmt of block) {
    for (const { name, isCounter } of assignedBy(stmt, byIndex)) {
      const known = found.get(name);
      if (known) known.count++;
      else found.set(name, { count: stmt.kind === 'loop' ? 2 : 1, first: stmt, atTop: atTop && stmt.kind === 'assign', isCounter });
    }
    if (stmt.kind !== 'function' && stmt.kind !== 'class') for (const inner of blocksOf(stmt)) collect(inner, false, found, byIndex);
  }
}

function assignedBy(stmt: Stmt, byIndex = false): readonly { readonly name: string; readonly isCounter: boolean }[] {
  const targets = stmt.kind === 'assign' ? stmt.targets : stmt.kind === 'loop' && stmt.target ? [stmt.target] : [];
  const names = targets.flatMap((target) => (target.kind === 'name' ? [target.name] : target.kind === 'sequence' ? target.items.flatMap((item) => (item.kind === 'name' ? [item.name] : [])) : []));
  const isCounter = stmt.kind === 'loop' && stmt.iterable?.kind === 'call' && stmt.iterable.callee.kind === 'name' && stmt.iterable.callee.name === 'range';
  const counter = stmt.kind === 'loop' && stmt.target && stmt.iterable && (stmt.target.kind === 'sequence' || (byIndex && !isCounter)) ? walked(stmt, stmt.target, stmt.iterable).counter : undefined;
  const found = names.filter((name) => name !== counter).map((name) => ({ name, isCounter }));
  return counter === undefined ? found : [{ name: counter, isCounter: true }, ...found];
}

/** A loop over lists: its counter, and each variable with the list that it walks through. */
export function walked(stmt: LoopStmt, target: Expr, iterable: Expr): { readonly counter: string; readonly pairs: readonly (readonly [name: string, list: Expr])[] } {
  const names = (target.kind === 'sequence' ? target.items : [target]).flatMap((item) => (item.kind === 'name' ? [item.name] : []));
  const lists = iterable.kind === 'call' ? iterable.args.map((arg) => arg.value) : [iterable];
  const callee = iterable.kind === 'call' && iterable.callee.kind === 'name' ? iterable.callee.name : undefined;
  if (callee === 'enumerate' && names.length === 2 && lists.length === 1) return { counter: names[0] as string, pairs: [[names[1] as string, lists[0] as Expr]] };
  if (names.length !== lists.length || (callee !== 'zip' && callee !== undefined)) return { counter: `n${stmt.start}`, pairs: [] };
  return { counter: `n_${names[0]}`, pairs: names.map((name, at) => [name, lists[at] as Expr] as const) };
}

/** The type of a value, as far as it shows. */
export function typeOf(value: Expr): Local['type'] {
  if (value.kind === 'text') return 'text';
  return value.kind === 'truth' || value.kind === 'compare' || value.kind === 'logic' ? 'truth' : 'number';
}

/** Names of the script that its functions read. */
export function readByFunctions(script: readonly Stmt[]): ReadonlySet<string> {
  const read = new Set<string>();
  for (const fn of script) {
    if (fn.kind !== 'function') continue;
    const own = new Set(fn.params.map((param) => param.name));
    for (const stmt of fn.body.flatMap((each) => [...nestedIn(each)])) for (const { name } of assignedBy(stmt)) own.add(name);
    for (const stmt of fn.body.flatMap((each) => [...nestedIn(each)])) for (const expr of expressionsOf(stmt)) for (const name of namesIn(expr)) if (!own.has(name)) read.add(name);
  }
  return read;
}

/** Parameters that a body treats as lists. */
export function arraysIn(body: readonly Stmt[]): ReadonlySet<string> {
  const arrays = new Set<string>();
  for (const stmt of body.flatMap((each) => [...nestedIn(each)])) {
    if (stmt.kind === 'loop' && stmt.iterable?.kind === 'name') arrays.add(stmt.iterable.name);
    for (const expr of expressionsOf(stmt).flatMap((each) => [...within(each)])) {
      if (expr.kind === 'index' && expr.object.kind === 'name') arrays.add(expr.object.name);
      if (expr.kind === 'call' && expr.callee.kind === 'name' && ['len', 'sum'].includes(expr.callee.name) && expr.args[0]?.value.kind === 'name') arrays.add(expr.args[0].value.name);
    }
  }
  return arrays;
}
