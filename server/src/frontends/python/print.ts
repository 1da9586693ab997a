/** Expressions of the common form in Python's syntax, with no more parentheses than it needs. */
import type { Expr } from '../../program/nodes.ts';

const levels: Record<string, number> = { '+': 11, '-': 11, '*': 12, '/': 12, '//': 12, '%': 12, '@': 12, bits: 9, '\\': 12, '**': 14 };
const atom = 20;

/** Prints an expression; parts that the common form dropped cannot be printed and give `...`. */
export function printPython(expr: Expr): string {
  return print(expr, 0);
}

function print(expr: Expr, outer: number): string {
  const [text, level] = parts(expr);
  return level < outer ? `(${text})` : text;
}

function parts(expr: Expr): readonly [string, number] {
  switch (expr.kind) {
    case 'number':
      return [expr.text, atom];
    case 'text':
      return [JSON.stringify(expr.value), atom];
    case 'truth':
      return [expr.value ? 'True' : 'False', atom];
    case 'nothing':
      return ['None', atom];
    case 'name':
      return [expr.name, atom];
    case 'member':
      return [`${print(expr.object, atom)}.${expr.name}`, atom];
    case 'index':
      return [`${print(expr.object, atom)}[${expr.keys.map((key) => print(key, 0)).join(', ')}]`, atom];
    case 'call':
      return [`${print(expr.callee, atom)}(${expr.args.map((arg) => `${arg.name === undefined ? (arg.spread ? '*' : '') : `${arg.name}=`}${print(arg.value, 1)}`).join(', ')})`, atom];
    case 'unary':
      return expr.op === 'not' ? [`not ${print(expr.operand, 6)}`, 6] : [`${expr.op === 'bits' ? '~' : expr.op}${print(expr.operand, 13)}`, 13];
    case 'binary':
      return binary(expr);
    case 'compare':
      return [expr.operands.map((operand, at) => (at === 0 ? '' : ` ${expr.ops[at - 1]} `) + print(operand, 8)).join(''), 7];
    case 'logic':
      return [expr.operands.map((operand) => print(operand, expr.op === 'and' ? 6 : 5)).join(` ${expr.op} `), expr.op === 'and' ? 5 : 4];
    case 'choose':
      return [`${print(expr.then, 4)} if ${print(expr.condition, 4)} else ${print(expr.otherwise, 3)}`, 3];
    case 'sequence':
      return sequence(expr.form, expr.items.map((item) => print(item, 1)));
    case 'record':
      return [`{${expr.entries.map((entry) => `${JSON.stringify(entry.key)}: ${print(entry.value, 1)}`).join(', ')}}`, atom];
    case 'lambda':
      return [`lambda ${expr.params.map((param) => param.name).join(', ')}: ${print(expr.body, 2)}`, 2];
    case 'slice':
      return [expr.parts.map((part) => print(part, 1)).join(':'), 1];
    case 'bind':
      return [`${print(expr.target, atom)} := ${print(expr.value, 1)}`, 0];
    default:
      return ['...', atom];
  }
}

function binary(expr: Extract<Expr, { kind: 'binary' }>): readonly [string, number] {
  const level = levels[expr.op] ?? 9;
  const right = expr.op === '**';
  const space = level === 11 ? ' ' : '';
  return [`${print(expr.left, right ? level + 1 : level)}${space}${expr.op === 'bits' ? '&' : expr.op}${space}${print(expr.right, right ? 13 : level + 1)}`, level];
}

function sequence(form: string, items: readonly string[]): readonly [string, number] {
  if (form === 'tuple') return [`(${items.join(', ')}${items.length === 1 ? ',' : ''})`, atom];
  return form === 'set' ? [`{${items.join(', ')}}`, atom] : [`[${items.join(', ')}]`, atom];
}
