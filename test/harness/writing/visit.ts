/** Walks over statements and expressions of the common form. */
import type { Expr, Stmt } from '../../../server/src/program/nodes.ts';

type Node = { readonly kind?: unknown } & Readonly<Record<string, unknown>>;

/** A statement and all below it, in the order of the text. */
export function* nestedIn(stmt: Stmt): Generator<Stmt> {
  yield stmt;
  for (const block of blocksOf(stmt)) for (const each of block) yield* nestedIn(each);
}

/** The blocks of a statement. */
export function blocksOf(stmt: Stmt): readonly (readonly Stmt[])[] {
  switch (stmt.kind) {
    case 'if':
      return [...stmt.arms.map((arm) => arm.body), stmt.otherwise];
    case 'loop':
      return [stmt.body, stmt.otherwise];
    case 'attempt':
      return [stmt.body, ...stmt.handlers, stmt.otherwise, stmt.finally];
    case 'match':
      return stmt.cases.map((each) => each.body);
    case 'function': case 'class': case 'scope':
      return [stmt.body];
    default:
      return [];
  }
}

/** The expressions of a statement itself, without those of the blocks in it. */
export function expressionsOf(stmt: Stmt): readonly Expr[] {
  switch (stmt.kind) {
    case 'assign':
      return [...stmt.targets, stmt.value];
    case 'declare':
      return [stmt.target];
    case 'evaluate':
      return [stmt.value];
    case 'return':
      return stmt.value ? [stmt.value] : [];
    case 'if':
      return stmt.arms.map((arm) => arm.condition);
    case 'loop':
      return [stmt.target, stmt.iterable, stmt.condition].filter((each) => each !== undefined);
    case 'function':
      return stmt.params.flatMap((param) => param.default ?? []);
    case 'leave':
      return stmt.values;
    default:
      return [];
  }
}

/** Every expression below one, itself first. */
export function* within(expr: Expr): Generator<Expr> {
  yield expr;
  for (const part of Object.values(expr as unknown as Node)) yield* below(part);
}

/** The names that an expression reads or sets. */
export function* namesIn(expr: Expr): Generator<string> {
  for (const each of within(expr)) {
    if (each.kind === 'name') yield each.name;
    if (each.kind === 'lambda') for (const param of each.params) yield param.name;
  }
}

function* below(part: unknown): Generator<Expr> {
  if (Array.isArray(part)) for (const each of part) yield* below(each);
  else if (typeof part === 'object' && part !== null && Object.getPrototypeOf(part) === Object.prototype) {
    const node = part as Node;
    if (typeof node.kind === 'string') yield* within(node as unknown as Expr);
    else for (const each of Object.values(node)) yield* below(each);
  }
}
