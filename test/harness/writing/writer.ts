/** Statements of a Python text, written in a host language; knows for each line which lines of the original it stands for. */
import type { HostStyle } from '../../../server/src/frontends/frontend.ts';
import type { Note } from '../../../server/src/notes/types.ts';
import type { AssignStmt, Chunk, Comment, Expr, FunctionStmt, IfStmt, LoopStmt, ReturnStmt, Stmt } from '../../../server/src/program/nodes.ts';
import type { LineIndex } from '../../../server/src/text/line-index.ts';
import type { FunctionWords, Host, Line, Local } from '../hosts/host.ts';
import { binary, name as named, number } from '../hosts/make.ts';
import { documentedBy } from './documented.ts';
import type { Names } from './names.ts';
import { arraysIn, localsOf, typeOf, walked } from './scope.ts';
import { Speaker } from './speak.ts';
import { unsayable } from './unsayable.ts';
import { expressionsOf, namesIn, nestedIn } from './visit.ts';

interface Scope {
  readonly locals: ReadonlyMap<string, Local>;
  readonly declared: Set<string>;
  /** The variables that hold what is returned. */
  readonly results: readonly string[];
  /** The statement that the body ends with. */
  readonly last: Stmt | undefined;
}

export class Writer {
  private readonly speaker: Speaker;
  private chunk: Chunk | undefined;
  private pending: Comment[] = [];

  constructor(private readonly host: Host, style: HostStyle, private readonly names: Names, private readonly index: LineIndex, private readonly notesOf: (chunk: Chunk) => readonly Note[]) {
    this.speaker = new Speaker(host, style, names);
  }

  /** The variables of a block, under the names that they have in the host. */
  locals(block: readonly Stmt[], params: readonly string[] = []): readonly Local[] {
    return localsOf(block, params, (expr) => this.speaker.list(expr), (name) => this.names.of(name), (stmt) => this.lineAt(stmt.start), !this.host.each);
  }

  /** A block of the script itself. */
  script(locals: readonly Local[], declared: Set<string>): (chunk: Chunk, stmt: Stmt) => readonly Line[] {
    const scope: Scope = { locals: new Map(locals.map((each) => [each.name, each])), declared, results: [], last: undefined };
    return (chunk, stmt) => {
      this.enter(chunk);
      return this.statement(stmt, scope);
    };
  }

  /** A function of the script. */
  function(chunk: Chunk, fn: FunctionStmt): readonly Line[] {
    this.enter(chunk);
    if (fn.decorators.length > 0 || fn.params.some((param) => param.mode !== 'plain' && param.mode !== 'keyword')) return unsayable('rare kinds of parameters');
    const { params, results: notedResults, places, summary, remarks } = documentedBy(fn, this.notesOf(chunk));
    const arrays = arraysIn(fn.body);
    const given = fn.params.map((param) => param.name);
    const locals = this.locals(fn.body, given);
    const count = resultsOf(fn.body);
    if (count > 1 && !this.host.says.has('several results')) return unsayable('several results');
    const taken = [...given, ...locals.map((each) => each.name)];
    const results = Array.from({ length: count }, (_, at) => ({ name: freshName(count > 1 ? `result${at + 1}` : 'result', taken), isArray: false, ...(notedResults.get(at) ?? { unit: undefined, words: '' }) }));
    if ([...notedResults.keys()].some((at) => at >= count)) return unsayable('notes on a result that is none');
    const words: FunctionWords = {
      name: this.names.of(fn.name), locals, summary, remarks, results, isRecursive: fn.body.flatMap((each) => [...nestedIn(each)]).some((each) => expressionsOf(each).some((expr) => [...namesIn(expr)].includes(fn.name))),
      params: fn.params.map((param) => ({
        name: this.names.of(param.name), isArray: arrays.has(param.name), ...(params.get(param.name) ?? { unit: undefined, words: '' }),
        default: param.default && this.host.says.has('defaults') ? this.speaker.print(param.default) : undefined,
      })),
    };
    const noted = (name: string): readonly number[] => {
      const param = fn.params.find((each) => this.names.of(each.name) === name);
      const place = places.get(param?.name ?? results.findIndex((each) => each.name === name));
      return place === undefined ? [] : [this.lineAt(place)];
    };
    const above = this.above(fn.start, fn);
    const frame = this.host.frame(words, noted);
    const scope: Scope = { locals: new Map(locals.map((each) => [each.name, each])), declared: new Set(), results: results.map((each) => each.name), last: fn.body.at(-1) };
    const body = fn.body.filter((each) => !isText(each));
    const inside = [...frame.after, ...this.hoisted(locals), ...body.flatMap((each) => this.statement(each, scope)), ...this.above(fn.end + (fn.loose?.length ?? 0), undefined)];
    const heading = { text: frame.open, covers: [this.lineAt(fn.nameSpan.start)] };
    return [...above, ...frame.before, heading, ...indent(inside), { text: frame.close }];
  }

  /** Declarations of variables that no assignment of the outermost block declares. */
  hoisted(locals: readonly Local[]): readonly Line[] {
    const { declare } = this.host;
    return declare ? locals.filter((each) => !each.declaredByAssignment && !each.isCounter).map((each) => ({ text: declare(each) })) : [];
  }

  private enter(chunk: Chunk): void {
    if (this.chunk === chunk) return;
    this.chunk = chunk;
    this.pending = [...chunk.comments];
  }

  private lineAt(offset: number): number {
    return this.index.lineAt((this.chunk?.anchor.start ?? 0) + offset);
  }

  private linesOf(start: number, end: number): readonly number[] {
    const first = this.lineAt(start);
    return Array.from({ length: this.lineAt(Math.max(end - 1, start)) - first + 1 }, (_, at) => first + at);
  }

  /** Comments that stand before an offset and on no statement's own line; a blank line behind those that do not stand directly above. */
  private above(offset: number, stmt: Stmt | undefined): readonly Line[] {
    const lines: Line[] = [];
    const here = this.pending.filter((each) => each.start < offset);
    this.pending = this.pending.filter((each) => each.start >= offset);
    for (const comment of here) {
      if (!this.standsAlone(comment)) continue;
      const attached = stmt?.above?.some((each) => each.start === comment.start);
      lines.push({ text: this.host.comment(comment.text), covers: [this.lineAt(comment.start)] });
      if (!attached) lines.push({ text: '' });
    }
    return lines;
  }

  private standsAlone(comment: Comment): boolean {
    const at = (this.chunk?.anchor.start ?? 0) + comment.start;
    return /^\s*#*:?\s*$/.test(this.index.text.slice(this.index.lineStart(this.index.lineAt(at)), at));
  }

  private statement(stmt: Stmt, scope: Scope): readonly Line[] {
    const above = this.above(stmt.start, stmt);
    return [...above, ...this.bare(stmt, scope)];
  }

  private bare(stmt: Stmt, scope: Scope): readonly Line[] {
    switch (stmt.kind) {
      case 'assign':
        return this.assign(stmt, scope);
      case 'evaluate':
        return isText(stmt) ? [] : [this.line(stmt, this.evaluated(stmt.value))];
      case 'if':
        return this.branches(stmt, scope);
      case 'loop':
        return this.loop(stmt, scope);
      case 'return':
        return this.gives(stmt, scope);
      case 'leave':
        return stmt.flow === 'none' ? (stmt.values.length === 0 ? [] : unsayable('assert or del')) : [this.line(stmt, this.host.leave[stmt.flow])];
      case 'import':
        return [];
      default:
        return unsayable(`statement ${stmt.kind}`);
    }
  }

  /** A statement on one line, with its trailing comment. */
  private line(stmt: Stmt, text: string): Line {
    return { text: stmt.trailing ? `${text}  ${this.host.comment(stmt.trailing.text)}` : text, covers: this.linesOf(stmt.start, stmt.end) };
  }

  private assign(stmt: AssignStmt, scope: Scope): readonly Line[] {
    if (stmt.targets.length > 1) return unsayable('chained targets');
    const [target] = stmt.targets as [Expr];
    if (target.kind === 'sequence' && !this.host.says.has('tuple')) {
      if (stmt.value.kind !== 'call' || !this.host.targets) return this.oneByOne(stmt, target.items, scope);
      return [this.line(stmt, this.host.assign(this.host.targets(target.items.map((item) => this.speaker.print(item))), this.speaker.print(stmt.value), undefined))];
    }
    if (target.kind !== 'name' && target.kind !== 'sequence' && target.kind !== 'index') return unsayable(`assignment to ${target.kind}`);
    const left = this.speaker.print(target);
    if (stmt.value.kind === 'record' && target.kind === 'name') return this.record(stmt, stmt.value, left, scope);
    if (stmt.op && this.host.says.has('updates')) return [this.line(stmt, this.host.evaluate(`${left} ${stmt.op}= ${this.speaker.print(stmt.value)}`))];
    const local = scope.locals.get(left);
    if (this.host.isTyped && local && !stmt.op && typeOf(stmt.value) !== local.type) return unsayable('a variable of several types');
    const first = local?.declaredByAssignment && !scope.declared.has(left);
    const value = first && local.size !== undefined && this.host.initial ? this.host.initial((this.speaker.list(stmt.value) ?? []).map((item) => this.speaker.print(item))) : this.speaker.print(stmt.op ? binary(stmt.op, target, stmt.value) : stmt.value);
    scope.declared.add(left);
    const text = this.host.assign(left, value, first ? local : undefined);
    return [this.host.declaresNotes && local?.note !== undefined ? { text, covers: this.linesOf(stmt.start, stmt.end) } : this.line(stmt, text)];
  }

  private record(stmt: AssignStmt, value: Extract<Expr, { kind: 'record' }>, target: string, scope: Scope): readonly Line[] {
    const form = this.host.record?.(target, scope.declared.has(target) ? undefined : scope.locals.get(target)) ?? unsayable('records');
    if (value.others.length > 0 || value.entries.some((entry) => !/^[A-Za-z]\w*$/.test(entry.key))) return unsayable('records with other keys');
    scope.declared.add(target);
    const entries = value.entries.map((entry): Line => {
      const text = form.entry(entry.key, this.speaker.print(entry.value));
      return { text: entry.comment ? `${text}  ${this.host.comment(entry.comment.text)}` : text, covers: [this.lineAt(entry.start)] };
    });
    return [...(form.open ? [this.line({ ...stmt, end: stmt.start + 1 }, form.open)] : []), ...entries, ...(form.close ? [{ text: form.close }] : [])];
  }

  /** `a, b = x, y` as two statements, where y does not read a. */
  private oneByOne(stmt: AssignStmt, targets: readonly Expr[], scope: Scope): readonly Line[] {
    const values = stmt.value.kind === 'sequence' ? stmt.value.items : [];
    if (values.length !== targets.length) return unsayable('tuple');
    return targets.flatMap((target, at) => {
      const before = targets.slice(0, at).flatMap((each) => (each.kind === 'name' ? [each.name] : []));
      const value = values[at] as Expr;
      if ([...namesIn(value)].some((each) => before.includes(each))) return unsayable('exchange');
      return this.assign({ ...stmt, targets: [target], value }, scope);
    });
  }

  private evaluated(expr: Expr): string {
    if (expr.kind !== 'call') return this.host.evaluate(this.speaker.print(expr));
    if (expr.callee.kind === 'name' && expr.callee.name === 'print') return this.host.show(expr.args.map((arg) => this.speaker.print(arg.value)));
    const { callee } = expr;
    const [only] = expr.args;
    if (callee.kind === 'member' && callee.name === 'append' && only) return this.host.append?.(this.speaker.print(callee.object), this.speaker.print(only.value)) ?? unsayable('growing lists');
    return this.host.evaluate(this.speaker.print(expr));
  }

  private branches(stmt: IfStmt, scope: Scope): readonly Line[] {
    const lines = stmt.arms.flatMap((arm, at): readonly Line[] => {
      const condition = this.speaker.print(arm.condition);
      const head = at === 0 ? this.host.if(condition) : this.host.elseIf(condition);
      return [{ text: head, covers: this.linesOf(arm.condition.start, arm.condition.end) }, ...this.block(arm.body, scope)];
    });
    const otherwise = stmt.otherwise.length > 0 ? [{ text: this.host.else }, ...this.block(stmt.otherwise, scope)] : [];
    return [...lines, ...otherwise, { text: this.host.end('if') }];
  }

  private block(block: readonly Stmt[], scope: Scope): readonly Line[] {
    return indent(block.flatMap((each) => this.statement(each, scope)));
  }

  private loop(stmt: LoopStmt, scope: Scope): readonly Line[] {
    if (stmt.otherwise.length > 0) return unsayable('else of a loop');
    const close = { text: this.host.end('loop') };
    if (stmt.condition) return [this.head(stmt, this.host.while(this.speaker.print(stmt.condition)), stmt.condition), ...this.block(stmt.body, scope), close];
    const { target, iterable } = stmt;
    if (!target || !iterable) return unsayable('endless loop');
    if (target.kind !== 'name' || (!this.host.each && iterable.kind !== 'call')) return this.byIndex(stmt, target, iterable, scope);
    const name = this.names.of(target.name);
    if (iterable.kind === 'call' && this.names.library(iterable.callee) === 'range') {
      const [first, end] = iterable.args.length === 1 ? [number(0), iterable.args[0]?.value] : iterable.args.map((arg) => arg.value);
      if (!first || !end || iterable.args.length > 2) return unsayable('range with a step');
      const last = end.kind === 'number' ? number(Number(end.text) - 1) : binary('-', end, number(1));
      return [this.head(stmt, this.host.count(name, this.speaker.print(first), this.speaker.print(end), this.speaker.print(last)), iterable), ...this.block(stmt.body, scope), close];
    }
    const list = this.speaker.list(iterable) ? undefined : scope.locals.get(this.speaker.print(iterable))?.size;
    const opened = this.host.each?.(name, this.speaker.print(iterable), list ?? this.speaker.list(iterable)?.length) ?? unsayable('loop over a list');
    const [head = '', ...more] = opened;
    return [this.head(stmt, head, iterable), ...indent(more.map((text) => ({ text, covers: [this.lineAt(stmt.start)] }))), ...this.block(stmt.body, scope), close];
  }

  /** A loop over one list or several by the index. */
  private byIndex(stmt: LoopStmt, target: Expr, iterable: Expr, scope: Scope): readonly Line[] {
    const { counter, pairs } = walked(stmt, target, iterable);
    const lists = pairs.map(([, list]) => (list.kind === 'name' ? list : unsayable('loop over an expression')));
    const at = this.names.of(counter);
    const size = scope.locals.get(this.names.of(lists[0]?.name ?? ''))?.size;
    const { firstIndex } = this.host;
    const length = size !== undefined ? number(size + firstIndex) : lists[0] && this.speaker.lengthOf(lists[0]);
    if (!length) return unsayable('loop over an expression');
    const print = (expr: Expr): string => this.speaker.printTurned(expr);
    const last = size !== undefined ? number(size + firstIndex - 1) : firstIndex === 1 ? length : binary('-', length, number(1));
    const taken = pairs.map(([name, list]): Line => ({ text: this.host.assign(this.names.of(name), `${print(this.speaker.itemAt(list, named(at)))}`, undefined), covers: [this.lineAt(stmt.start)] }));
    return [this.head(stmt, this.host.count(at, String(firstIndex), print(length), print(last)), iterable), ...indent(taken), ...this.block(stmt.body, scope), { text: this.host.end('loop') }];
  }

  private head(stmt: LoopStmt, text: string, last: Expr): Line {
    return { text: stmt.trailing ? `${text}  ${this.host.comment(stmt.trailing.text)}` : text, covers: this.linesOf(stmt.start, last.end) };
  }

  private gives(stmt: ReturnStmt, scope: Scope): readonly Line[] {
    if (stmt.yields) return unsayable('yield');
    if (!stmt.value || stmt.value.kind === 'nothing') return [{ text: this.host.giveNothing }];
    const values = scope.results.length > 1 && stmt.value.kind === 'sequence' ? stmt.value.items : [stmt.value];
    if (values.length !== scope.results.length) return unsayable('a call that gives several results');
    const texts = this.host.give(values.map((value) => this.speaker.print(value)), scope.results, stmt === scope.last);
    return texts.map((text, at) => (at === 0 ? this.line(stmt, text) : { text }));
  }
}

/** Text as a statement: documentation, which is written from its notes. */
function isText(stmt: Stmt): boolean {
  return stmt.kind === 'evaluate' && (stmt.value.kind === 'text' || stmt.value.kind === 'opaque');
}

/** How many values a body gives back at the most. */
function resultsOf(block: readonly Stmt[]): number {
  const given = block.flatMap((each) => [...nestedIn(each)]).map((each) => (each.kind !== 'return' || !each.value || each.value.kind === 'nothing' ? 0 : each.value.kind === 'sequence' && each.value.form === 'tuple' ? each.value.items.length : 1));
  return Math.max(0, ...given);
}

function freshName(wanted: string, taken: readonly string[]): string {
  return taken.some((each) => each.toLowerCase() === wanted) ? freshName(`${wanted}_`, taken) : wanted;
}

function indent(lines: readonly Line[]): readonly Line[] {
  return lines.map((line) => ({ ...line, text: line.text === '' ? '' : `    ${line.text}` }));
}
