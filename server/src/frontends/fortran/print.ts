/** Expressions of the common form in the syntax of Fortran, with no more parentheses than it needs. */
import type { BinaryExpr, CallExpr, CompareOp, Expr, SequenceExpr } from '../../program/nodes.ts';
import { isInteger } from './literals.ts';

/** How tightly an expression binds; higher is tighter. Source: ISO/IEC 1539-1, 10.1. */
const level = { loosest: 0, equivalence: 2, or: 3, and: 4, not: 5, relation: 6, sum: 8, product: 9, power: 10, atom: 20 } as const;

const operators: Partial<Record<BinaryExpr['op'], readonly [mark: string, level: number]>> = {
  '+': [' + ', level.sum], '-': [' - ', level.sum], '*': ['*', level.product], '/': ['/', level.product], '**': ['**', level.power],
};

const comparisons: Partial<Record<CompareOp, string>> = { '<': '<', '<=': '<=', '>': '>', '>=': '>=', '==': '==', '!=': '/=', is: '==', 'is not': '/=' };

type Printed = readonly [text: string, level: number];

/** What stands for a part that the common form does not keep, or that Fortran cannot say in one expression. */
const dropped: Printed = ['null()', level.atom];

/** Prints an expression; parts that the common form dropped give `null()`. */
export function printFortran(expr: Expr): string {
  return print(expr, level.loosest);
}

/** An expression where nothing looser than `outer` may stand. */
function print(expr: Expr, outer: number): string {
  const [text, own] = parts(expr);
  return own < outer ? `(${text})` : text;
}

function parts(expr: Expr): Printed {
  switch (expr.kind) {
    case 'number':
      return [number(expr.text), /^[-+]/.test(expr.text) ? level.sum : expr.text.includes('/') ? level.product : level.atom];
    case 'text':
      return [`'${expr.value.replaceAll("'", "''")}'`, level.atom];
    case 'truth':
      return [expr.value ? '.true.' : '.false.', level.atom];
    case 'name':
      return [expr.name, level.atom];
    case 'member':
      return [`${primary(expr.object)}%${expr.name}`, level.atom];
    case 'index':
      return index(expr);
    case 'call':
      return call(expr);
    case 'unary':
      return unary(expr.op, expr.operand);
    case 'binary':
      return binary(expr);
    case 'compare':
      return compare(expr.operands, expr.ops);
    case 'logic': {
      const own = level[expr.op];
      return [expr.operands.map((operand, at) => print(operand, at === 0 && operand.kind !== 'logic' ? own : own + 1)).join(expr.op === 'and' ? ' .and. ' : ' .or. '), own];
    }
    case 'choose':
      return [`merge(${item(expr.then)}, ${item(expr.otherwise)}, ${item(expr.condition)})`, level.atom];
    case 'sequence':
      return sequence(expr);
    case 'slice':
      return [expr.parts.map((part) => (part.kind === 'nothing' ? '' : print(part, level.sum))).join(':'), level.loosest];
    default:
      return dropped;
  }
}

/** Underlines between digits and other bases are not of this language. */
function number(text: string): string {
  const plain = /^[-+]?[\d._]+(?:[eEdD][-+]?\d+)?$/.test(text) ? text.replace(/(?<=\d)_(?=\d)/g, '') : text;
  return /^0[xXbBoO]/.test(plain) ? `${Number(plain)}` : plain;
}

function item(expr: Expr): string {
  return print(expr, level.loosest + 1);
}

/** What may stand before a component or a bracket. */
function primary(expr: Expr): string {
  return ['name', 'member', 'index', 'call'].includes(expr.kind) ? print(expr, level.atom) : `(${parts(expr)[0]})`;
}

/** An index; a key that is a text is a component. */
function index(expr: Extract<Expr, { kind: 'index' }>): Printed {
  const [key] = expr.keys;
  if (key?.kind === 'text' && /^[A-Za-z]\w*$/.test(key.value)) return [`${primary(expr.object)}%${key.value}`, level.atom];
  return [`${primary(expr.object)}(${expr.keys.map((each) => print(each, level.loosest)).join(', ')})`, level.atom];
}

function call(expr: CallExpr): Printed {
  if (expr.args.some((arg) => arg.spread)) return dropped;
  const args = expr.args.map((arg) => (arg.name === undefined ? print(arg.value, level.loosest) : `${arg.name}=${item(arg.value)}`));
  return [`${primary(expr.callee)}(${args.join(', ')})`, level.atom];
}

function unary(op: Extract<Expr, { kind: 'unary' }>['op'], operand: Expr): Printed {
  if (op === 'transpose') return [`transpose(${item(operand)})`, level.atom];
  if (op === 'bits') return [`not(${item(operand)})`, level.atom];
  if (op === 'not') return [`.not. ${print(operand, level.relation)}`, level.not];
  return [`${op}${print(operand, level.product)}`, level.sum];
}

function binary(expr: BinaryExpr): Printed {
  const whole = isWhole(expr.left) && isWhole(expr.right);
  if (expr.op === '//') return whole ? [`${print(expr.left, level.product)}/${print(expr.right, level.power)}`, level.product] : [`floor(${print(expr.left, level.product)}/${print(expr.right, level.power)})`, level.atom];
  if (expr.op === '%') return [`modulo(${item(expr.left)}, ${item(expr.right)})`, level.atom];
  if (expr.op === '@') return [`matmul(${item(expr.left)}, ${item(expr.right)})`, level.atom];
  const operator = operators[expr.op];
  if (!operator) return dropped;
  const [mark, own] = operator;
  if (own === level.power) return [`${print(expr.left, own + 1)}**${print(expr.right, own)}`, own];
  // A quotient of two integers would be cut off.
  if (expr.op === '/' && whole) return [`${print(expr.left, own)}.0/${print(expr.right, own + 1)}`, own];
  return [`${print(expr.left, own)}${mark}${print(expr.right, own + 1)}`, own];
}

function isWhole(expr: Expr): boolean {
  return expr.kind === 'number' && isInteger(number(expr.text));
}

/** A chain of comparisons is a conjunction here. */
function compare(operands: readonly Expr[], ops: readonly CompareOp[]): Printed {
  const marks = ops.map((op) => comparisons[op]);
  if (marks.some((mark) => mark === undefined)) return dropped;
  const pairs = marks.map((mark, at) => `${print(operands[at] as Expr, level.relation + 1)} ${mark} ${print(operands[at + 1] as Expr, level.relation + 1)}`);
  return pairs.length === 1 ? [pairs[0] as string, level.relation] : [pairs.join(' .and. '), level.and];
}

/** The rows of a matrix stand one behind the other in a constructor: only a list can be said. */
function sequence({ form, items }: SequenceExpr): Printed {
  return form === 'matrix' || form === 'set' ? dropped : [`[${items.map(item).join(', ')}]`, level.atom];
}
