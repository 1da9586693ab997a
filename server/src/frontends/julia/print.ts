/** Expressions of the common form in Julia's syntax, with no more parentheses than it needs. */
import type { BinaryExpr, CallExpr, CompareOp, Expr, Param, SequenceExpr } from '../../program/nodes.ts';

/** How tightly an expression binds; higher is tighter. Source: Julia manual, Operator Precedence and Associativity. */
const level = { bind: 0, lambda: 1, choose: 2, or: 3, and: 4, compare: 5, range: 7, sum: 8, product: 9, rational: 10, sign: 12, power: 13, postfix: 14, atom: 20 } as const;

const operators: Partial<Record<BinaryExpr['op'], readonly [mark: string, level: number]>> = {
  '+': [' + ', level.sum], '-': [' - ', level.sum], '*': ['*', level.product], '/': ['/', level.product], '@': ['*', level.product], '\\': ['\\', level.product], '//': [' ÷ ', level.product], '%': [' % ', level.product], '**': ['^', level.power],
};

const comparisons: Partial<Record<CompareOp, string>> = { in: 'in', 'not in': '∉', is: '===', 'is not': '!==' };

type Printed = readonly [text: string, level: number];

/** What stands for a part that the common form does not keep. */
const dropped: Printed = ['nothing', level.atom];

/** Prints an expression; parts that the common form dropped give `nothing`. */
export function printJulia(expr: Expr): string {
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
      return [expr.text, expr.text.includes('/') ? level.product : /^[-+]/.test(expr.text) ? level.sign : level.atom];
    case 'text':
      return [quoted(expr.value), level.atom];
    case 'truth':
      return [String(expr.value), level.atom];
    case 'nothing':
      return dropped;
    case 'name':
      return [expr.name, level.atom];
    case 'member':
      return [`${primary(expr.object)}.${expr.name}`, level.atom];
    case 'index':
      return [`${primary(expr.object)}[${expr.keys.map(item).join(', ')}]`, level.atom];
    case 'call':
      return call(expr);
    case 'unary':
      return unary(expr.op, expr.operand);
    case 'binary':
      return binary(expr);
    case 'compare':
      return [expr.operands.map((operand, at) => (at === 0 ? '' : ` ${comparisons[expr.ops[at - 1] as CompareOp] ?? expr.ops[at - 1]} `) + print(operand, level.range)).join(''), level.compare];
    case 'logic':
      return [expr.operands.map((operand) => print(operand, level[expr.op] + 1)).join(expr.op === 'and' ? ' && ' : ' || '), level[expr.op]];
    case 'choose':
      return [`${print(expr.condition, level.or)} ? ${print(expr.then, level.or)} : ${print(expr.otherwise, level.choose)}`, level.choose];
    case 'sequence':
      return [sequence(expr), level.atom];
    case 'record':
      return expr.others.length > 0 ? dropped : [record(expr.entries), level.atom];
    case 'lambda':
      return [`${parameters(expr.params)} -> ${print(expr.body, level.lambda)}`, level.lambda];
    case 'comprehension':
      return expr.key ? dropped : [`[${item(expr.element)}${expr.clauses.map((each) => ` for ${item(each.target)} in ${item(each.iterable)}`).join('')}${expr.conditions.map((each) => ` if ${item(each)}`).join('')}]`, level.atom];
    case 'slice':
      return slice(expr.parts);
    case 'bind':
      return [`${print(expr.target, level.atom)} = ${print(expr.value, level.lambda)}`, level.bind];
    case 'opaque':
      return dropped;
  }
}

function item(expr: Expr): string {
  return print(expr, level.lambda);
}

/** What may stand before a dot or a bracket. */
function primary(expr: Expr): string {
  return expr.kind === 'number' ? `(${expr.text})` : print(expr, level.atom);
}

function call(expr: CallExpr): Printed {
  if (expr.args.some((arg) => arg.spread)) return dropped;
  return [`${primary(expr.callee)}(${expr.args.map((arg) => (arg.name === undefined ? '' : `${arg.name}=`) + item(arg.value)).join(', ')})`, level.atom];
}

function unary(op: Extract<Expr, { kind: 'unary' }>['op'], operand: Expr): Printed {
  if (op === 'transpose') return [`${operand.kind === 'number' ? `(${operand.text})` : print(operand, level.postfix)}'`, level.postfix];
  const inner = print(operand, level.sign);
  const mark = op === 'not' ? '!' : op === 'bits' ? '~' : op;
  return [`${mark}${inner.startsWith(mark) ? `(${inner})` : inner}`, level.sign];
}

/** A power whose exponent was a root sign becomes that sign again. */
function binary(expr: BinaryExpr): Printed {
  const operator = operators[expr.op];
  if (!operator) return dropped;
  if (expr.op === '**' && expr.right.kind === 'number' && /^\.?[√∛∜]$/.test(expr.right.text)) return [`${expr.right.text.replace('.', '')}${print(expr.left, level.power)}`, level.sign];
  const [mark, own] = operator;
  const [left, right] = own === level.power ? [level.postfix, level.sign] : [own, own + 1];
  return [`${print(expr.left, left)}${mark}${print(expr.right, right)}`, own];
}

/** Rows of a matrix are parted by semicolons. */
function sequence({ form, items }: SequenceExpr): string {
  if (form === 'tuple') return `(${items.map(item).join(', ')}${items.length === 1 ? ',' : ''})`;
  if (form === 'set') return `Set([${items.map(item).join(', ')}])`;
  if (form === 'list') return `[${items.map(item).join(', ')}]`;
  const rows = items.map((each) => (each.kind === 'sequence' && each.form === 'list' ? each.items.map((entry) => print(entry, level.postfix)).join(' ') : print(each, level.postfix)));
  return items.some((each) => each.kind === 'sequence') ? `[${rows.join('; ')}]` : `[${rows.join(' ')}]`;
}

function record(entries: Extract<Expr, { kind: 'record' }>['entries']): string {
  const named = entries.length > 0 && entries.every((entry) => /^[\p{L}_][\p{L}\p{N}_]*$/u.test(entry.key));
  if (named) return `(${entries.map((entry) => `${entry.key} = ${item(entry.value)}`).join(', ')}${entries.length === 1 ? ',' : ''})`;
  return `Dict(${entries.map((entry) => `${quoted(entry.key)} => ${print(entry.value, level.or)}`).join(', ')})`;
}

function parameters(params: readonly Param[]): string {
  const [only] = params;
  return params.length === 1 && only?.mode === 'plain' && !only.default ? only.name : `(${params.map((each) => `${each.name}${each.mode.startsWith('rest') ? '...' : ''}${each.default ? `=${item(each.default)}` : ''}`).join(', ')})`;
}

/** Start, end and step; a whole dimension is a lone colon. */
function slice(all: readonly Expr[]): Printed {
  const [first, last, step] = all;
  if (!first || !last || all.every((part) => part.kind === 'nothing')) return [':', level.atom];
  const [from, to] = [first.kind === 'nothing' ? 'begin' : print(first, level.sum), last.kind === 'nothing' ? 'end' : print(last, level.sum)];
  return [step && step.kind !== 'nothing' ? `${from}:${print(step, level.sum)}:${to}` : `${from}:${to}`, level.range];
}

/** A text as it stood between its quotes, escapes and all. */
function quoted(value: string): string {
  if (/[\r\n]/.test(value)) return `"""${value}"""`;
  return /(?<!\\)(?:\\\\)*"/.test(value) || /(?<!\\)(?:\\\\)*\\$/.test(value) ? JSON.stringify(value) : `"${value}"`;
}
