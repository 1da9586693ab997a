/** Expressions of the common form in Python's syntax, with no more parentheses than it needs. */
import type { BinaryExpr, CallExpr, Expr, Param, SequenceExpr } from '../../program/nodes.ts';

/** How tightly an expression binds, as section 6.17 of the Python language reference orders it; higher is tighter. */
const level = { bind: 0, lambda: 2, choose: 3, or: 4, and: 5, not: 6, compare: 7, operand: 8, sum: 11, product: 12, sign: 13, power: 14, primary: 15, atom: 20 } as const;

const levels: Partial<Record<BinaryExpr['op'], number>> = { '+': level.sum, '-': level.sum, '*': level.product, '/': level.product, '//': level.product, '%': level.product, '@': level.product, '**': level.power };

/** What stands for a part that the common form does not keep: formatted texts, bit operations, spread arguments. */
const dropped: Printed = ['...', level.atom];

type Printed = readonly [text: string, level: number];

/** Prints an expression; parts that the common form dropped give `...`. */
export function printPython(expr: Expr): string {
  return print(expr, level.bind + 1);
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
      return [expr.value ? 'True' : 'False', level.atom];
    case 'nothing':
      return ['None', level.atom];
    case 'name':
      return [expr.name, level.atom];
    case 'member':
      return [`${primary(expr.object)}.${expr.name}`, level.atom];
    case 'index':
      return [`${primary(expr.object)}[${expr.keys.map(key).join(', ')}]`, level.atom];
    case 'call':
      return call(expr);
    case 'unary':
      return unary(expr.op, expr.operand);
    case 'binary':
      return binary(expr);
    case 'compare':
      return [expr.operands.map((operand, at) => (at === 0 ? '' : ` ${expr.ops[at - 1]} `) + print(operand, level.operand)).join(''), level.compare];
    case 'logic':
      return [expr.operands.map((operand, at) => print(operand, level[expr.op] + (at === 0 && operand.kind !== 'logic' ? 0 : 1))).join(` ${expr.op} `), level[expr.op]];
    case 'choose':
      return [`${print(expr.then, level.or)} if ${print(expr.condition, level.or)} else ${print(expr.otherwise, level.lambda)}`, level.choose];
    case 'sequence':
      return [sequence(expr), level.atom];
    case 'record':
      return expr.others.length > 0 ? dropped : [`{${expr.entries.map((entry) => `${quoted(entry.key)}: ${item(entry.value)}`).join(', ')}}`, level.atom];
    case 'lambda':
      return [`lambda${expr.params.length === 0 ? '' : ' '}${parameters(expr.params)}: ${print(expr.body, level.lambda)}`, level.lambda];
    case 'comprehension':
      return comprehension(expr);
    case 'slice':
      return [expr.parts.map((part) => (part.kind === 'nothing' ? '' : print(part, level.lambda))).join(':'), level.lambda];
    case 'bind':
      return [`${print(expr.target, level.atom)} := ${print(expr.value, level.lambda)}`, level.bind];
    case 'opaque':
      return dropped;
  }
}

function item(expr: Expr): string {
  return print(expr, level.lambda);
}

/** A subscript; a slice stands bare there. */
function key(expr: Expr): string {
  return expr.kind === 'slice' ? parts(expr)[0] : item(expr);
}

/** What may stand before a dot or a bracket; digits before a dot would be read on as a number. */
function primary(expr: Expr): string {
  return expr.kind === 'number' ? `(${expr.text})` : print(expr, level.atom);
}

function call(expr: CallExpr): Printed {
  if (expr.args.some((arg) => arg.spread)) return dropped;
  const args = expr.args.map((arg) => (arg.name === undefined ? '' : `${arg.name}=`) + item(arg.value));
  return [`${primary(expr.callee)}(${args.join(', ')})`, level.atom];
}

function unary(op: Extract<Expr, { kind: 'unary' }>['op'], operand: Expr): Printed {
  if (op === 'transpose') return [`${primary(operand)}.T`, level.atom];
  if (op === 'not') return [`not ${print(operand, level.not)}`, level.not];
  return [`${op === 'bits' ? '~' : op}${print(operand, level.sign)}`, level.sign];
}

function binary(expr: BinaryExpr): Printed {
  const own = levels[expr.op];
  if (own === undefined) return dropped;
  const space = own === level.sum ? ' ' : '';
  const [left, right] = own === level.power ? [level.primary, level.sign] : [own, own + 1];
  return [`${print(expr.left, left)}${space}${expr.op}${space}${print(expr.right, right)}`, own];
}

function sequence({ form, items }: SequenceExpr): string {
  const inside = items.map(item).join(', ');
  if (form === 'tuple') return `(${inside}${items.length === 1 ? ',' : ''})`;
  if (form === 'set') return items.length === 0 ? 'set()' : `{${inside}}`;
  return `[${inside}]`;
}

/** The common form does not tell a list from a generator: a list is right wherever either is. */
function comprehension(expr: Extract<Expr, { kind: 'comprehension' }>): Printed {
  const clauses = expr.clauses.map((clause) => ` for ${print(clause.target, level.operand)} in ${print(clause.iterable, level.or)}`).join('');
  const inside = `${item(expr.element)}${clauses}${expr.conditions.map((each) => ` if ${print(each, level.or)}`).join('')}`;
  return [expr.key ? `{${item(expr.key)}: ${inside}}` : `[${inside}]`, level.atom];
}

function parameters(params: readonly Param[]): string {
  const printed: string[] = [];
  let keywords = false;
  for (const param of params) {
    if (param.mode === 'keyword' && !keywords) printed.push('*');
    keywords ||= param.mode !== 'plain';
    const mark = param.mode === 'rest' ? '*' : param.mode === 'rest-named' ? '**' : '';
    printed.push(`${mark}${param.name}${param.default ? `=${item(param.default)}` : ''}`);
    if (param.mode === 'rest') keywords = true;
  }
  return printed.join(', ');
}

/** A text as it stood between its quotes, escapes and all, in quotes that fit it. */
function quoted(value: string): string {
  const line = !/[\r\n]/.test(value);
  const quote = ['"', "'", '"""', "'''"].find((each) => (each.length === 3 || line) && !new RegExp(`(?<!\\\\)(?:\\\\\\\\)*${each}`).test(value) && !value.endsWith(each.charAt(0)));
  return quote ? quote + value + quote : JSON.stringify(value);
}
