/** Calls that give values back through their arguments. */
import type { CallExpr, Expr, Stmt } from '../program/nodes.ts';
import { pathOf } from '../program/path.ts';
import type { Passed } from './calls.ts';
import type { Context } from './context.ts';
import { assign } from './targets.ts';
import { type Callable, type Value, unknown } from './value.ts';

/** After a call: the arguments that come back hold what the function gives them; where that is not known, any variable may be changed. */
export function giveBack(context: Context, expr: CallExpr, target: Callable | undefined, passed: readonly Passed[], result: Value): void {
  const statement: Stmt = { kind: 'evaluate', value: expr, start: expr.start, end: expr.end };
  const params = paramsOf(target);
  const given = params?.filter((param) => param.intent !== undefined) ?? [];
  passed.forEach(({ argument }, at) => {
    const name = argument.name ?? params?.[at]?.name;
    const position = given.findIndex((param) => param.name === name);
    if (params && position < 0) return;
    const value = !params ? undefined : given.length === 1 ? result : result.items?.[position];
    receive(context, argument.value, value, statement);
  });
}

interface Given {
  readonly name: string;
  readonly intent?: 'out' | 'inout';
}

function paramsOf(target: Callable | undefined): readonly Given[] | undefined {
  if (target?.kind === 'function') return target.scheme()?.params;
  return target?.kind === 'local' && target.local.definition.kind === 'function' ? target.local.definition.params : undefined;
}

function receive(context: Context, argument: Expr, value: Value | undefined, statement: Stmt): void {
  const path = argument.kind === 'call' ? pathOf(argument.callee) : pathOf(argument);
  if (path === undefined || argument.kind === 'text') return;
  const current = context.bindings.get(path);
  if (current?.fields && !value?.form) return;
  const target: Expr = argument.kind === 'call' ? argument.callee : argument;
  assign(context, target, value?.form || value?.fits ? { ...value, expr: argument } : unknown(argument), statement);
}
