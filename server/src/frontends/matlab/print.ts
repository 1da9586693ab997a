/** Expressions of the common form in the syntax of MATLAB, with no more parentheses than it needs. */
import type { BinaryExpr, CallExpr, CompareOp, Expr, SequenceExpr } from '../../program/nodes.ts';

/** How tightly an expression binds; higher is tighter. Source: MATLAB documentation, Operator Precedence. */
const level = { lambda: 0, or: 3, and: 4, compare: 5, range: 6, sum: 7, product: 8, sign: 9, power: 10, atom: 20 } as const;

const operators: Partial<Record<BinaryExpr['op'], readonly [mark: string, level: number]>> = {
  '+': [' + ', level.sum], '-': [' - ', level.sum], '*': ['*', level.product], '/': ['/', level.product], '@': ['*', level.product], '\\': ['\\', level.product], '**': ['^', level.power],
};

const comparisons: Partial<Record<CompareOp, string>> = { '<': '<', '<=': '<=', '>': '>', '>=': '>=', '==': '==', '!=': '~=', is: '==', 'is not': '~=' };

type Printed = readonly [text: string, level: number];

/** What stands for a part that the common form does not keep, or that MATLAB cannot say in one expression. */
const dropped: Printed = ['[]', level.atom];

/** Prints an expression; parts that the common form dropped give `[]`. */
export function printMatlab(expr: Expr): string {
  return print(expr, level.lambda);
}

/** An expression where nothing looser than `outer` may stand. */
function print(expr: Expr, outer: number): string {
  const [text, own] = parts(expr);
  return own < outer ? `(${text})` : text;
}

function parts(expr: Expr): Printed {
  switch (expr.kind) {
    case 'number':
      return number(expr.text);
    case 'text':
      return [`'${expr.value.replaceAll("'", "''")}'`, level.atom];
    case 'truth':
      return [expr.value ? 'true' : 'false', level.atom];
    case 'nothing':
      return dropped;
    case 'name':
      return [expr.name, level.atom];
    case 'member':
      return [`${primary(expr.object)}.${expr.name}`, level.atom];
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
      return [expr.operands.map((operand, at) => print(operand, at === 0 && operand.kind !== 'logic' ? own : own + 1)).join(expr.op === 'and' ? ' & ' : ' | '), own];
    }
    case 'sequence':
      return [sequence(expr), level.atom];
    case 'record':
      return expr.others.length > 0 ? dropped : [`struct(${expr.entries.map((entry) => `'${entry.key}', ${item(entry.value)}`).join(', ')})`, level.atom];
    case 'lambda':
      return [`@(${expr.params.map((param) => param.name).join(', ')}) ${print(expr.body, level.lambda)}`, level.lambda];
    case 'slice':
      return slice(expr.parts);
    case 'choose':
    case 'comprehension':
    case 'bind':
    case 'opaque':
      return dropped;
  }
}

function number(text: string): Printed {
  return [text, text.includes('/') ? level.product : /^[-+]/.test(text) ? level.sign : level.atom];
}

function item(expr: Expr): string {
  return print(expr, level.lambda + 1);
}

/** What may stand before a dot or a bracket. */
function primary(expr: Expr): string {
  return ['name', 'member', 'index', 'call'].includes(expr.kind) ? print(expr, level.atom) : `(${parts(expr)[0]})`;
}

/** An index; a key that is a text is a field. */
function index(expr: Extract<Expr, { kind: 'index' }>): Printed {
  const [key] = expr.keys;
  if (key?.kind === 'text') return [/^[A-Za-z]\w*$/.test(key.value) ? `${primary(expr.object)}.${key.value}` : `${primary(expr.object)}.(${item(key)})`, level.atom];
  return [`${primary(expr.object)}(${expr.keys.map(item).join(', ')})`, level.atom];
}

function call(expr: CallExpr): Printed {
  if (expr.args.some((arg) => arg.spread)) return dropped;
  const args = expr.args.map((arg) => (arg.name === undefined ? item(arg.value) : `'${arg.name}', ${item(arg.value)}`));
  return [`${primary(expr.callee)}(${args.join(', ')})`, level.atom];
}

function unary(op: Extract<Expr, { kind: 'unary' }>['op'], operand: Expr): Printed {
  if (op === 'transpose') return [`${print(operand, level.power)}'`, level.power];
  if (op === 'bits') return [`bitcmp(${item(operand)})`, level.atom];
  const inner = print(operand, level.sign);
  return [`${op === 'not' ? '~' : op}${inner.startsWith(op) ? `(${inner})` : inner}`, level.sign];
}

function binary(expr: BinaryExpr): Printed {
  if (expr.op === '//') return [`floor(${print(expr.left, level.product)}/${print(expr.right, level.product + 1)})`, level.atom];
  if (expr.op === '%') return [`mod(${item(expr.left)}, ${item(expr.right)})`, level.atom];
  const operator = operators[expr.op];
  if (!operator) return dropped;
  const [mark, own] = operator;
  const right = own === level.power ? exponent(expr.right) : print(expr.right, own + 1);
  return [`${print(expr.left, own)}${mark}${right}`, own];
}

/** A signed exponent needs no brackets unless it holds a power. */
function exponent(expr: Expr): string {
  const isSigned = expr.kind === 'unary' && (expr.op === '-' || expr.op === '+' || expr.op === 'not');
  if (!isSigned) return print(expr, level.power + 1);
  const inner = expr.operand;
  return inner.kind === 'number' || inner.kind === 'name' ? `${expr.op === 'not' ? '~' : expr.op}${print(inner, level.power + 1)}` : `(${parts(expr)[0]})`;
}

/** A chain of comparisons is a conjunction here. */
function compare(operands: readonly Expr[], ops: readonly CompareOp[]): Printed {
  const marks = ops.map((op) => comparisons[op]);
  if (marks.some((mark) => mark === undefined)) return dropped;
  const pairs = marks.map((mark, at) => `${print(operands[at] as Expr, level.compare + (at === 0 && operands[0]?.kind === 'compare' ? 0 : 1))} ${mark} ${print(operands[at + 1] as Expr, level.compare + 1)}`);
  return pairs.length === 1 ? [pairs[0] as string, level.compare] : [pairs.join(' & '), level.and];
}

/** Commas between the entries, since a blank before a sign would part them. */
function sequence({ form, items }: SequenceExpr): string {
  const rows = items.map((each) => (each.kind === 'sequence' && each.form === 'list' && (form === 'matrix' || form === 'set') ? each.items.map(item).join(', ') : item(each)));
  const byRow = (form === 'matrix' || form === 'set') && items.length > 1 && items.every((each) => each.kind === 'sequence' && each.form === 'list');
  return form === 'set' ? `{${rows.join(byRow ? '; ' : ', ')}}` : `[${rows.join(byRow ? '; ' : ', ')}]`;
}

/** Start, end and step; a whole dimension is a lone colon. */
function slice(all: readonly Expr[]): Printed {
  const [first, last, step] = all;
  if (!first || !last || all.every((part) => part.kind === 'nothing')) return [':', level.atom];
  const [from, to] = [first.kind === 'nothing' ? '1' : print(first, level.sum), last.kind === 'nothing' ? 'end' : print(last, level.sum)];
  return [step && step.kind !== 'nothing' ? `${from}:${print(step, level.sum)}:${to}` : `${from}:${to}`, level.range];
}
