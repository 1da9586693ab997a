/** Formulas of the nomenclature language: numbers, symbols, + - * / ^, brackets and calls; read as far as they go. */
import type { Argument, BinaryExpr, Expr } from '../../program/nodes.ts';
import { Rational } from '../../quantities/rational.ts';

/** Reads an expression from an offset of a line, as far as it goes; `end` is where it stops, `from` where none begins. */
export function readExpression(line: string, from: number): { readonly expr: Expr | undefined; readonly end: number } {
  const reader = new Reader(line, from);
  const expr = reader.sum(0);
  return { expr, end: expr ? reader.at : from };
}

const deepest = 60;
/** Operators of one formula; longer ones are read so far and reported. */
const mostOperators = 300;
const numberForm = /(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?/y;
const nameForm = /[\p{L}_][\p{L}\p{N}_]*(?:\.[\p{L}_][\p{L}\p{N}_]*)*/uy;

class Reader {
  private operators = 0;

  constructor(private readonly line: string, public at: number) {}

  sum(depth: number): Expr | undefined {
    return this.chain(depth, ['+', '-'], () => this.product(depth));
  }

  private product(depth: number): Expr | undefined {
    return this.chain(depth, ['*', '/', '·'], () => this.unary(depth));
  }

  private chain(depth: number, ops: readonly string[], next: () => Expr | undefined): Expr | undefined {
    if (depth > deepest) return undefined;
    this.skip();
    const first = this.at;
    let left = next();
    while (left) {
      const start = this.at;
      this.skip();
      const op = this.line[this.at];
      const power = op === '*' && this.line[this.at + 1] === '*';
      if (op === undefined || power || !ops.includes(op)) {
        this.at = start;
        break;
      }
      if (++this.operators > mostOperators) {
        this.at = start;
        break;
      }
      const opSpan = { start: this.at, end: this.at + 1 };
      this.at++;
      const right = next();
      if (!right) {
        this.at = start;
        break;
      }
      left = { kind: 'binary', op: (op === '·' ? '*' : op) as BinaryExpr['op'], opSpan, left, right, start: first, end: this.at };
    }
    return left;
  }

  private unary(depth: number): Expr | undefined {
    this.skip();
    const start = this.at;
    if (this.line[this.at] === '-' || this.line[this.at] === '+') {
      const op = this.line[this.at] as '-' | '+';
      this.at++;
      const operand = depth > deepest ? undefined : this.unary(depth + 1);
      if (!operand) this.at = start;
      return operand && { kind: 'unary', op, operand, start, end: this.at };
    }
    return this.powered(depth);
  }

  private powered(depth: number): Expr | undefined {
    this.skip();
    const first = this.at;
    const base = this.atom(depth);
    if (!base) return undefined;
    const start = this.at;
    this.skip();
    const mark = this.line.startsWith('**', this.at) ? 2 : this.line[this.at] === '^' ? 1 : 0;
    if (mark === 0) {
      this.at = start;
      return base;
    }
    const opSpan = { start: this.at, end: this.at + mark };
    this.at += mark;
    const exponent = depth > deepest ? undefined : this.unary(depth + 1);
    if (!exponent) {
      this.at = start;
      return base;
    }
    return { kind: 'binary', op: '**', opSpan, left: base, right: exponent, start: first, end: this.at };
  }

  private atom(depth: number): Expr | undefined {
    this.skip();
    const start = this.at;
    const number = this.match(numberForm);
    if (number !== undefined) return { kind: 'number', value: Rational.parse(number), text: number, start, end: this.at };
    const name = this.match(nameForm);
    if (name !== undefined) {
      const plain: Expr = { kind: 'name', name, start, end: this.at };
      const called = this.line[this.at] === '(' ? this.call(plain, depth) : undefined;
      if (!called) this.at = plain.end;
      return called ?? plain;
    }
    if (this.line[this.at] !== '(') return undefined;
    this.at++;
    const inner = this.sum(depth + 1);
    this.skip();
    if (!inner || this.line[this.at] !== ')') {
      this.at = start;
      return undefined;
    }
    this.at++;
    return inner;
  }

  private call(callee: Expr, depth: number): Expr | undefined {
    this.at++;
    const args: Argument[] = [];
    for (;;) {
      this.skip();
      if (this.line[this.at] === ')') break;
      const value = this.sum(depth + 1);
      if (!value) return undefined;
      args.push({ value, start: value.start, end: value.end });
      this.skip();
      if (this.line[this.at] === ',') this.at++;
      else if (this.line[this.at] !== ')') return undefined;
    }
    this.at++;
    return { kind: 'call', callee, args, start: callee.start, end: this.at };
  }

  private match(pattern: RegExp): string | undefined {
    pattern.lastIndex = this.at;
    const found = pattern.exec(this.line)?.[0];
    if (found !== undefined) this.at += found.length;
    return found;
  }

  private skip(): void {
    while (this.line[this.at] === ' ' || this.line[this.at] === '\t') this.at++;
  }
}
