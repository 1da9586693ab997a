/** What each kind of statement does to the versions of symbols, and what it asks of values. */
import { pathOf } from '../program/path.ts';
import type { AssignStmt, Expr, FunctionStmt, Stmt } from '../program/nodes.ts';
import type { Span } from '../text/span.ts';
import { agree, product, quotient, sum, power } from './arithmetic.ts';
import { assignedPaths } from './assigned.ts';
import type { Bindings } from './bindings.ts';
import type { Context } from './context.ts';
import { bindElement, evaluate, range } from './expressions.ts';
import { isConstant, oneForm, sameForm, unknownForm } from './form.ts';
import { assign, notedValue, reportMisuse } from './targets.ts';
import { type Value, unknown } from './value.ts';
import { declaration } from './declaration.ts';

/** Walks a block; false where its end is not reached. */
export function walk(context: Context, block: readonly Stmt[]): boolean {
  for (const statement of block) if (!step(context, statement)) return false;
  return true;
}

function step(context: Context, statement: Stmt): boolean {
  switch (statement.kind) {
    case 'assign':
      assignment(context, statement);
      return true;
    case 'declare':
      declaration(context, statement);
      return true;
    case 'evaluate': {
      const value = evaluate(context, statement.value);
      if (value.misuse) reportMisuse(context, value);
      return true;
    }
    case 'if':
      return branches(context, statement);
    case 'loop':
      loop(context, statement);
      return true;
    case 'return':
      returned(context, statement);
      return statement.yields === true;
    case 'attempt':
      return attempt(context, statement);
    case 'scope':
      for (const item of statement.items) {
        evaluate(context, item.value);
        if (item.target) bindElement(context, item.target, unknown(item.target));
      }
      return walk(context, statement.body);
    case 'match':
      return cases(context, statement);
    case 'function':
      if (context.owner) context.bindings.set(statement.name, localFunction(context, statement));
      return true;
    case 'import':
      if (context.owner) for (const [name, value] of context.surroundings.imported(statement)) context.bindings.set(name, value);
      return true;
    case 'leave':
      for (const value of statement.values) evaluate(context, value);
      return statement.flow === 'none';
    case 'outer':
      for (const name of statement.names) context.outer.add(name);
      return true;
    default:
      return true;
  }
}

function assignment(context: Context, statement: AssignStmt): void {
  const empirical = context.surroundings.notes.empirical(statement);
  if (empirical) return empiricalStatement(context, statement, empirical);
  const value = statement.op ? augmented(context, statement) : evaluate(context, statement.value);
  for (const target of statement.targets) assign(context, target, value, statement);
}

function augmented(context: Context, statement: AssignStmt): Value {
  const target = statement.targets[0] as Expr;
  const left = evaluate(context, target);
  const right = evaluate(context, statement.value);
  const whole = { ...statement.value, start: target.start } as Expr;
  switch (statement.op) {
    case '+':
    case '-':
      return sum(context, whole, left, right, statement.op, { start: target.start, end: statement.value.end });
    case '*':
      context.corrections.set(statement, right);
      return product(whole, left, right);
    case '/':
    case '//':
      context.corrections.set(statement, right);
      return quotient(whole, left, right);
    case '**':
      return power(context, whole, left, right, whole);
    default:
      return unknown(whole);
  }
}


/** At the edge of an empirical relation its symbols must be counted in the units it names; inside, nothing is checked. */
function empiricalStatement(context: Context, statement: AssignStmt, units: NonNullable<ReturnType<Context['surroundings']['notes']['empirical']>>): void {
  const targets = statement.targets.map(pathOf);
  for (const { symbol, note } of units) {
    const current = context.bindings.get(symbol) ?? context.surroundings.global(symbol);
    if (targets.includes(symbol) || !current?.form || current.literal) continue;
    const noted = notedValue(symbol, note, context.anchor, undefined);
    agree(context, statement.value, { ...current, expr: current.expr ?? statement.value }, noted, { kind: 'conversion-edge', path: symbol, note }, statement.value);
  }
  for (const target of statement.targets) {
    const path = pathOf(target);
    const result = units.find((unit) => unit.symbol === path);
    const value = path !== undefined && result ? notedValue(path, result.note, context.anchor, target) : unknown(target);
    assign(context, target, value, statement);
  }
}

function returned(context: Context, statement: Extract<Stmt, { kind: 'return' }>): void {
  if (!statement.value) return;
  const value = evaluate(context, statement.value);
  context.returns.push(value);
  const owner = context.owner;
  const notes = owner ? context.surroundings.notes.results(owner) : [];
  if (value.misuse) reportMisuse(context, value, notes.some((note) => value.form?.terms.length === 0 && note.unit.dimension === value.form.dimension));
  if (!owner) return;
  for (const note of notes) {
    const target = note.note.target;
    const position = target.kind === 'result' ? target.position : undefined;
    const part = position === undefined ? (value.items && notes.length === 1 ? undefined : value) : value.items?.[position];
    if (!part?.form || part.fits || part.literal || part.misuse) continue;
    const noted = notedValue(owner.name, note, context.anchor, undefined);
    agree(context, statement.value, part, noted, { kind: 'result', function: owner.name, note }, assignedSpan(context, owner, part) ?? part.expr ?? statement.value);
  }
}

/** An output is named in the head of its function: a wrong one is told where it got its value. */
function assignedSpan(context: Context, owner: FunctionStmt, part: Value): Span | undefined {
  const version = owner.outputs && part.version?.anchor === context.anchor && part.version.origin === 'assigned' ? part.version : undefined;
  return version?.assigned?.expr ?? version?.span;
}

function branches(context: Context, statement: Extract<Stmt, { kind: 'if' }>): boolean {
  const before = context.bindings;
  const ends: Bindings[] = [];
  for (const arm of statement.arms) {
    evaluate(context, arm.condition);
    context.bindings = before.branch();
    if (walk(context, arm.body)) ends.push(context.bindings);
    context.bindings = before;
  }
  context.bindings = before.branch();
  if (walk(context, statement.otherwise)) ends.push(context.bindings);
  context.bindings = before;
  if (ends.length > 1) for (const arm of statement.arms) for (const inner of arm.body) correction(context, inner, before);
  join(before, ends, false, true);
  return ends.length > 0;
}

/** `if hot: Nu *= (mu/mu_w)**0.14`: a correction that is applied only sometimes must leave the dimension as it is. */
function correction(context: Context, statement: Stmt, before: Bindings): void {
  if (statement.kind !== 'assign' || (statement.op !== '*' && statement.op !== '/')) return;
  const target = statement.targets[0];
  const path = target && pathOf(target);
  const earlier = path === undefined ? undefined : before.get(path);
  const factor = context.corrections.get(statement);
  if (!target || !earlier || earlier.fits || earlier.spoilt || !factor?.form || factor.literal || factor.fits) return;
  const pure: Value = { expr: undefined, form: oneForm, from: [] };
  agree(context, statement.value, { ...factor, measure: undefined }, pure, { kind: 'choice', of: 'correction' }, statement.value);
}

function cases(context: Context, statement: Extract<Stmt, { kind: 'match' }>): boolean {
  evaluate(context, statement.subject);
  const before = context.bindings;
  const ends: Bindings[] = [];
  for (const each of statement.cases) {
    context.bindings = before.branch();
    for (const binding of each.bindings) context.bindings.set(binding.name, unknown(binding));
    if (each.guard) evaluate(context, each.guard);
    if (walk(context, each.body)) ends.push(context.bindings);
  }
  context.bindings = before;
  join(before, ends, true);
  return true;
}

/** The body is read once: what it assigns before it reads it keeps its version from before the loop, bare numbers become open. */
function loop(context: Context, statement: Extract<Stmt, { kind: 'loop' }>): void {
  const iterable = statement.iterable?.kind === 'slice' ? range(context, statement.iterable, true) : statement.iterable && evaluate(context, statement.iterable);
  const before = context.bindings;
  context.bindings = before.branch();
  for (const path of assignedPaths(statement.body)) {
    const value = before.get(path);
    if (value?.version?.origin === 'constant') context.bindings.set(path, { expr: undefined, form: undefined, from: [] });
  }
  if (statement.condition) evaluate(context, statement.condition);
  if (statement.target) bindElement(context, statement.target, iterable ?? unknown(statement.target));
  walk(context, statement.body);
  join(before, [context.bindings], true);
  context.bindings = before;
  walk(context, statement.otherwise);
}

function attempt(context: Context, statement: Extract<Stmt, { kind: 'attempt' }>): boolean {
  const before = context.bindings;
  const body = before.branch();
  context.bindings = body;
  const through = walk(context, statement.body) && walk(context, statement.otherwise);
  const ends = through ? [body] : [];
  for (const handler of statement.handlers) {
    context.bindings = before.branch();
    for (const path of body.changed()) context.bindings.set(path, joinedValue([before.get(path), body.get(path)].filter((value) => value !== undefined), false));
    if (walk(context, handler)) ends.push(context.bindings);
  }
  context.bindings = before;
  join(before, ends);
  return walk(context, statement.finally) && ends.length > 0;
}

/**
 * Versions after several ways: the same everywhere, or alike, or unknown. A bare number gives way to a quantity. Written into
 * what was known before; `passing`: the way that changes nothing is one of them.
 */
function join(before: Bindings, ends: readonly Bindings[], passing = false, chosen = false): void {
  const paths = new Set(ends.flatMap((end) => [...end.changed()]));
  const ways = ends.length + (passing ? 1 : 0);
  for (const path of paths) {
    const values = (passing ? [before, ...ends] : ends).flatMap((end) => end.get(path) ?? []);
    const first = values[0] as Value;
    before.set(path, values.every((value) => value === first) ? first : joinedValue(values, chosen && values.length === ways));
  }
}

function joinedValue(values: readonly Value[], chosen: boolean): Value {
  const telling = values.filter((value) => !value.fits && value.version?.origin !== 'constant');
  const first = telling.find((value) => !value.blank) ?? telling[0] ?? values.find((value) => !value.fits) ?? values[0];
  if (!first) return { expr: undefined, form: undefined, from: [] };
  const alike = telling.every((value) => value === first || (value.form && first.form && sameForm(value.form, first.form) && !value.items));
  if (first.split && telling.every((value) => value.split)) return first;
  if (!alike && chosen) {
    const split = splitOf(telling);
    if (split) return { expr: undefined, form: undefined, from: values, split };
  }
  if (!alike || (telling.length === 0 && values.length > 1 && !values.every((value) => value.fits))) return { expr: undefined, form: undefined, from: values };
  const measured = telling.every((value) => value.measure === first.measure);
  return measured ? first : { ...first, measure: undefined };
}

/** Two ways through an if that leave a symbol in two dimensions: told where it is used. */
function splitOf(values: readonly Value[]): readonly [Value, Value] | undefined {
  const known = values.filter((value) => value.form && isConstant(value.form) && !value.tainted && !value.items && value.version);
  const first = known[0];
  const other = known.find((value) => value.form !== first?.form);
  return first && other && known.length === values.length ? [first, other] : undefined;
}

/** A nested function is read once where it stands, its parameters open. */
function localFunction(context: Context, statement: FunctionStmt): Value {
  const outside = { bindings: context.bindings, returns: context.returns, owner: context.owner, declared: context.declared };
  context.owner = statement;
  context.bindings = outside.bindings.branch();
  context.returns = [];
  const params = statement.params.map((param) => {
    const note = context.surroundings.notes.parameter(statement, param)[0];
    const open = note ? undefined : context.fresh(param.name, param.nameSpan, 'parameter');
    const version = { path: param.name, anchor: context.anchor, span: param.nameSpan, origin: 'parameter' as const };
    const value: Value = note ? notedValue(param.name, note, context.anchor, param.nameSpan) : { expr: undefined, form: open ? unknownForm(open) : undefined, from: [], version };
    context.bindings.set(param.name, param.mode === 'plain' || param.mode === 'keyword' ? value : unknown({ ...param.nameSpan, kind: 'name', name: param.name }));
    return { name: param.name, unknown: open, ...(note ? { note } : {}) };
  });
  walk(context, statement.body);
  const returns = context.returns;
  context.bindings = outside.bindings;
  context.returns = outside.returns;
  context.owner = outside.owner;
  context.declared = outside.declared;
  const first = returns[0];
  const result = first && returns.every((value) => value.form && first.form && sameForm(value.form, first.form)) ? first : returns.length === 1 ? (first as Value) : { expr: undefined, form: undefined, from: [] };
  return { expr: undefined, form: undefined, from: [], callable: { kind: 'local', local: { definition: statement, params, result } } };
}
