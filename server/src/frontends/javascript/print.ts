/** Expressions of the common form in JavaScript's syntax, with no more parentheses than it needs. */
import type { BinaryExpr, CallExpr, Expr, Param } from '../../program/nodes.ts';

/** How tightly an expression binds, as the productions of ECMA-262, chapter 13, nest; higher is tighter. */
const level = { comma: 0, assign: 1, choose: 2, or: 4, and: 5, equal: 9, relate: 10, sum: 12, product: 13, power: 14, sign: 15, primary: 18, atom: 20 } as const;

const levels: Partial<Record<BinaryExpr['op'], number>> = { '+': level.sum, '-': level.sum, '*': level.product, '/': level.product, '%': level.product, '@': level.product, '**': level.power };

type Printed = readonly [text: string, level: number];

/** What stands for a part that the common form does not keep, or that the language has no way to write. */
const dropped: Printed = ['undefined', level.atom];

/** Prints an expression; parts that the common form dropped give `undefined`. */
export function printScript(expr: Expr): string {
  return print(expr, level.assign);
}

function print(expr: Expr, outer: number): string {
  const [text, own] = parts(expr);
  return own < outer ? `(${text})` : text;
}

function item(expr: Expr): string {
  return print(expr, level.assign);
}

function parts(expr: Expr): Printed {
  switch (expr.kind) {
    case 'number':
      return [expr.text, expr.text.includes('/') ? level.product : /^[-+]/.test(expr.text) ? level.sign : level.atom];
    case 'text':
      return [quoted(expr.value), level.atom];
    case 'truth':
      return [String(expr.value), level.atom];
    case 'nothing':
      return ['null', level.atom];
    case 'name':
      return [expr.name, level.atom];
    case 'member':
      return [`${primary(expr.object)}.${expr.name}`, level.atom];
    case 'index':
      return expr.keys.some((key) => key.kind === 'slice') ? dropped : [primary(expr.object) + expr.keys.map((key) => `[${item(key)}]`).join(''), level.atom];
    case 'call':
      return call(expr);
    case 'unary':
      return unary(expr.op, expr.operand);
    case 'binary':
      return binary(expr);
    case 'compare':
      return comparison(expr);
    case 'logic':
      return [expr.operands.map((operand) => print(operand, level[expr.op] + 1)).join(expr.op === 'or' ? ' || ' : ' && '), level[expr.op]];
    case 'choose':
      return [`${print(expr.condition, level.or)} ? ${item(expr.then)} : ${item(expr.otherwise)}`, level.choose];
    case 'sequence':
      return [`[${expr.items.map(item).join(', ')}]`, level.atom];
    case 'record':
      return expr.others.length > 0 ? dropped : [`{ ${expr.entries.map((entry) => `${isName(entry.key) ? entry.key : quoted(entry.key)}: ${item(entry.value)}`).join(', ')} }`, level.atom];
    case 'lambda':
      return [`(${parameters(expr.params)}) => ${expr.body.kind === 'record' ? `(${item(expr.body)})` : item(expr.body)}`, level.assign];
    case 'bind':
      return [`${print(expr.target, level.atom)} = ${item(expr.value)}`, level.assign];
    case 'comprehension':
    case 'slice':
    case 'opaque':
      return dropped;
  }
}

/** What may stand before a dot or a bracket; digits before a dot would be read on as a number. */
function primary(expr: Expr): string {
  return expr.kind === 'number' || expr.kind === 'record' ? `(${parts(expr)[0]})` : print(expr, level.atom);
}

/** Names of arguments are not written: they go by place. */
function call(expr: CallExpr): Printed {
  if (expr.args.some((arg) => arg.spread || arg.name !== undefined)) return dropped;
  return [`${primary(expr.callee)}(${expr.args.map((arg) => item(arg.value)).join(', ')})`, level.atom];
}

function unary(op: Extract<Expr, { kind: 'unary' }>['op'], operand: Expr): Printed {
  if (op === 'transpose') return dropped;
  const sign = op === 'not' ? '!' : op === 'bits' ? '~' : op;
  const text = print(operand, level.sign);
  return [sign + (text.startsWith(sign) ? ` ${text}` : text), level.sign];
}

function binary(expr: BinaryExpr): Printed {
  if (expr.op === '//') return [`Math.floor(${item({ ...expr, op: '/' })})`, level.atom];
  const own = levels[expr.op];
  if (own === undefined) return dropped;
  const sign = expr.op === '@' ? '*' : expr.op;
  const space = own === level.sum ? ' ' : '';
  // A sign in front of the base of a power is no syntax of the language.
  const [left, right] = own === level.power ? [level.primary, level.power] : [own, own + 1];
  return [`${print(expr.left, left)}${space}${sign}${space}${print(expr.right, right)}`, own];
}

const signs: Partial<Record<string, string>> = { '==': '===', '!=': '!==', is: '===', 'is not': '!==' };

/** A chain of comparisons is one after the other here. */
function comparison(expr: Extract<Expr, { kind: 'compare' }>): Printed {
  const pairs = expr.ops.map((op, at): Printed => {
    const own = op === '<' || op === '<=' || op === '>' || op === '>=' ? level.relate : level.equal;
    return [`${print(expr.operands[at] as Expr, level.sum)} ${signs[op] ?? op} ${print(expr.operands[at + 1] as Expr, level.sum)}`, own];
  });
  if (expr.ops.some((op) => op === 'in' || op === 'not in')) return dropped;
  return pairs.length === 1 ? (pairs[0] as Printed) : [pairs.map(([text]) => text).join(' && '), level.and];
}

function parameters(params: readonly Param[]): string {
  return params.map((param) => `${param.mode === 'rest' ? '...' : ''}${param.name}${param.default ? ` = ${item(param.default)}` : ''}`).join(', ');
}

function isName(text: string): boolean {
  return /^[\p{L}_$][\p{L}\p{N}_$]*$/u.test(text);
}

/** A text as it stood between its quotes, escapes and all, in quotes that fit it. */
function quoted(value: string): string {
  const quote = ["'", '"', '`'].find((each) => (each === '`' || !/[\r\n]/.test(value)) && !new RegExp(`(?<!\\\\)(?:\\\\\\\\)*${each}`).test(value));
  return quote ? quote + value + quote : JSON.stringify(value);
}
