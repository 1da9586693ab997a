/** Expressions of a Python text, turned so that the host's own printer can print them. */
import type { HostStyle } from '../../../server/src/frontends/frontend.ts';
import type { Argument, CallExpr, CompareExpr, Expr, NumberExpr } from '../../../server/src/program/nodes.ts';
import type { Feature, Host } from '../hosts/host.ts';
import { and, call, compare, member, name, number } from '../hosts/make.ts';
import type { Names } from './names.ts';
import { unsayable } from './unsayable.ts';

export class Speaker {
  constructor(private readonly host: Host, private readonly style: HostStyle, private readonly names: Names) {}

  print(expr: Expr): string {
    return this.style.print(this.turn(expr));
  }

  printTurned(expr: Expr): string {
    return this.style.print(expr);
  }

  /** How many members a list has; undefined where the host cannot say. */
  lengthOf(list: Expr): Expr | undefined {
    const said = this.host.library.len;
    return typeof said === 'string' ? call(said, this.turn(list)) : said?.([this.turn(list)]);
  }

  /** A member by a counter that begins where the host does. */
  itemAt(list: Expr, counter: Expr): Expr {
    return { kind: 'index', object: this.turn(list), keys: [counter], start: 0, end: 0 };
  }

  /** A literal list, whichever way Python wrote it. */
  list(expr: Expr): readonly Expr[] | undefined {
    const inner = expr.kind === 'call' && this.names.library(expr.callee) === 'array' && expr.args.length === 1 ? (expr.args[0] as Argument).value : expr;
    return inner.kind === 'sequence' && (inner.form === 'list' || inner.form === 'tuple') ? inner.items : undefined;
  }

  turn(expr: Expr): Expr {
    switch (expr.kind) {
      case 'number':
        return this.number(expr);
      case 'text': case 'truth':
        return expr;
      case 'nothing':
        return this.needs('nothing', expr);
      case 'name':
        return this.constant(expr) ?? { ...expr, name: this.names.of(expr.name) };
      case 'member':
        return this.constant(expr) ?? { ...this.needs('fields', expr), object: this.turn(expr.object) };
      case 'index':
        return this.index(expr);
      case 'call':
        return this.call(expr);
      case 'unary':
        return expr.op === 'bits' || expr.op === 'transpose' ? unsayable(`operator ${expr.op}`) : { ...expr, operand: this.turn(expr.operand) };
      case 'binary':
        return this.binary(expr);
      case 'compare':
        return this.compare(expr);
      case 'logic':
        return { ...expr, operands: expr.operands.map((each) => this.turn(each)) };
      case 'choose':
        return this.choose(expr);
      case 'sequence':
        return this.sequence(expr);
      case 'lambda':
        this.needs('lambda', expr);
        return { ...expr, params: expr.params.map((param) => ({ ...param, name: this.names.of(param.name) })), body: this.turn(expr.body) };
      case 'comprehension':
        this.needs('comprehension', expr);
        if (expr.clauses.length !== 1 || expr.key) unsayable('nested comprehension');
        return { ...expr, element: this.turn(expr.element), clauses: expr.clauses.map(({ target, iterable }) => ({ target: this.turn(target), iterable: this.turn(iterable) })), conditions: expr.conditions.map((each) => this.turn(each)) };
      default:
        return unsayable(`expression ${expr.kind}`);
    }
  }

  private needs<T extends Expr>(feature: Feature, expr: T): T {
    return this.host.says.has(feature) ? expr : unsayable(feature);
  }

  private number(expr: NumberExpr): NumberExpr {
    if (!expr.value) return unsayable('complex numbers');
    const text = expr.text.replaceAll('_', '').replace(/^\./, '0.').replace(/\.(?=$|[eE])/, '.0');
    return /^0[xob]/i.test(text) ? unsayable('numbers to another base') : { ...expr, text };
  }

  private constant(expr: Expr): Expr | undefined {
    const own = this.names.library(expr);
    if (own === undefined) return undefined;
    const said = this.host.library[own];
    return typeof said === 'string' ? name(said) : unsayable(`library ${own}`);
  }

  private index(expr: Extract<Expr, { kind: 'index' }>): Expr {
    const object = this.turn(expr.object);
    const [only] = expr.keys;
    if (only?.kind === 'text' && expr.keys.length === 1 && this.host.keyed) return this.host.keyed === 'member' ? member(object, only.value) : expr;
    const keys = expr.keys.map((key) => {
      if (key.kind === 'unary' && key.op === '-' && key.operand.kind === 'number') return key.operand.text === '1' && this.host.last ? this.host.last(object) : unsayable('counting from the end');
      if (key.kind === 'number') return number(Number(key.text) + this.host.firstIndex);
      return ['text', 'slice', 'sequence', 'compare'].includes(key.kind) ? unsayable(`index by ${key.kind}`) : this.turn(key);
    });
    return { ...expr, object, keys };
  }

  private call(expr: CallExpr): Expr {
    if (expr.args.some((arg) => arg.spread)) return unsayable('spread arguments');
    if (expr.callee.kind === 'name' && this.names.functions.has(expr.callee.name)) {
      return { ...expr, callee: this.turn(expr.callee), args: this.ownArguments(expr).map((arg) => ({ ...arg, ...(arg.name && { name: this.names.of(arg.name) }), value: this.turn(arg.value) })) };
    }
    const own = this.names.library(expr.callee);
    if (own === undefined) return expr.callee.kind === 'name' ? { ...expr, callee: this.turn(expr.callee), args: this.plain(expr, expr.callee.name) } : unsayable('methods');
    const said = Object.hasOwn(this.host.library, own) ? this.host.library[own] : undefined;
    const args = this.plain(expr, own).map((arg) => this.real(arg.value));
    const made = typeof said === 'string' ? call(said, ...args) : said?.(args);
    return made ?? unsayable(`library ${own}`);
  }

  private plain(expr: CallExpr, callee: string): readonly Argument[] {
    if (expr.args.some((arg) => arg.name !== undefined)) return unsayable(`named arguments of ${callee}`);
    return expr.args.map((arg) => ({ ...arg, value: this.turn(arg.value) }));
  }

  /** The arguments of a function of the text, in its order where the host has no names for them. */
  private ownArguments(expr: CallExpr): readonly Argument[] {
    const fn = this.names.functions.get((expr.callee as Extract<Expr, { kind: 'name' }>).name);
    const params = fn?.params ?? [];
    const given = params.map((param, at) => expr.args.find((arg) => arg.name === param.name) ?? (expr.args[at]?.name === undefined ? expr.args[at] : undefined));
    const count = given.findLastIndex((each) => each !== undefined) + 1;
    const { says } = this.host;
    if (says.has('named arguments') && given.slice(0, count).some((each) => each === undefined)) return expr.args;
    return params.slice(0, says.has('defaults') ? count : params.length).map((param, at): Argument => {
      const { name: _name, ...arg } = given[at] ?? { value: param.default ?? unsayable('missing arguments'), start: 0, end: 0 };
      return { ...arg, value: this.real(arg.value) };
    });
  }

  private binary(expr: Extract<Expr, { kind: 'binary' }>): Expr {
    if (['@', '\\', 'bits', '//'].includes(expr.op) || (expr.op === '%' && expr.left.kind === 'text')) return unsayable(`operator ${expr.op}`);
    const { mod } = this.host.library;
    if (expr.op === '%' && typeof mod === 'string') return call(mod, this.turn(expr.left), this.real(this.turn(expr.right)));
    const [left, right] = [this.turn(expr.left), this.turn(expr.right)];
    return { ...expr, left, right: expr.op === '/' ? this.real(right) : right };
  }

  /** A whole number as a real one, where the language tells them apart. */
  private real(expr: Expr): Expr {
    return this.host.isTyped && expr.kind === 'number' && /^\d+$/.test(expr.text) ? { ...expr, text: `${expr.text}.0` } : expr;
  }

  private compare({ operands, ops }: CompareExpr): Expr {
    if (ops.some((op) => op === 'in' || op === 'not in')) return unsayable('membership');
    if (this.host.isTyped && operands.some((each) => each.kind === 'text')) return unsayable('texts compared');
    const turned = operands.map((each) => this.turn(each));
    const plain = ops.map((op) => (op === 'is' ? '==' : op === 'is not' ? '!=' : op));
    return and(plain.map((op, at) => compare(turned[at] as Expr, op, turned[at + 1] as Expr)));
  }

  private choose({ condition, then, otherwise, ...span }: Extract<Expr, { kind: 'choose' }>): Expr {
    const parts = [then, otherwise, condition].map((each) => this.turn(each));
    const said = this.host.library['choose'];
    if (typeof said === 'function') return said(parts) ?? unsayable('choose');
    const [first, second, third] = parts as [Expr, Expr, Expr];
    return this.needs('choose', { ...span, condition: third, then: first, otherwise: second });
  }

  private sequence(expr: Extract<Expr, { kind: 'sequence' }>): Expr {
    if (expr.comments?.some((each) => each !== undefined)) return unsayable('comments in lists');
    if (this.host.isTyped && expr.items.length === 0) return unsayable('empty lists');
    if (expr.form === 'set' || expr.form === 'matrix') return unsayable(expr.form);
    const isMatrix = expr.items.some((item) => item.kind === 'sequence');
    this.needs(isMatrix ? 'matrix' : expr.form === 'tuple' ? 'tuple' : 'list', expr);
    return { ...expr, items: expr.items.map((item) => this.turn(item)) };
  }
}

