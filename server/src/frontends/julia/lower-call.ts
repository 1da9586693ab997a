/** Calls, indices, anonymous functions and macros in the common form. */
import type { Argument, Expr } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { type Lowering, spanOf, textOf } from '../tree-sitter/lowering.ts';
import type { Syntax } from '../tree-sitter/syntax.ts';
import { comprehension, listOf, lowerExpression, opaque } from './lower-expression.ts';
import { passesValue } from './macros.ts';
import { arithmetic, root, rootPower } from './operators.ts';
import { lowerParams } from './parameters.ts';

export function lowerCall(low: Lowering, node: Syntax, span: Span): Expr {
  const callee = node.parts[0];
  const list = node.parts.find((part) => part.type === 'argument_list');
  if (!callee || !list) return opaque(low, node, span);
  const body = node.parts.find((part) => part.type === 'do_clause');
  const args = [...(body ? [doBlock(low, body)] : []), ...lowerArguments(low, list)];
  if (callee.type === 'operator') return operatorCall(low, callee, args, span);
  if (textOf(low, callee) === 'Dict') return dictionary(low, list, args, span);
  return { kind: 'call', callee: lowerExpression(low, callee), args, ...span };
}

/** `f.(x)` works on each element as `f(x)` does. */
export function lowerBroadcast(low: Lowering, node: Syntax, span: Span): Expr {
  return lowerCall(low, node, span);
}

/** Arguments; behind a semicolon a lone name is passed under its own name. */
export function lowerArguments(low: Lowering, list: Syntax): readonly Argument[] {
  const generator = comprehension(low, list.parts.filter((part) => part.type !== 'named_argument'), spanOf(low, list));
  if (generator) return [{ value: { ...generator, start: (list.parts[0] as Syntax).start - low.base, end: (list.parts.at(-1) as Syntax).end - low.base }, start: (list.parts[0] as Syntax).start - low.base, end: (list.parts.at(-1) as Syntax).end - low.base }];
  let keyword = false;
  return list.children.flatMap((part): Argument[] => {
    if (part.type === ';') keyword = true;
    if (!part.named) return [];
    return [argument(low, part, keyword)];
  });
}

function argument(low: Lowering, part: Syntax, keyword: boolean): Argument {
  const span = spanOf(low, part);
  const [first] = part.parts;
  if (part.type === 'named_argument' && first?.type === 'identifier' && part.parts.length > 1) return { name: textOf(low, first), value: lowerExpression(low, part.parts.at(-1) as Syntax), ...span };
  if (part.type === 'splat_expression' && first) return { value: lowerExpression(low, first), spread: true, ...span };
  const value = lowerExpression(low, part);
  return keyword && part.type === 'identifier' ? { name: textOf(low, part), value, ...span } : { value, ...span };
}

/** The function in a `do` block comes first; one of several statements is unknown. */
function doBlock(low: Lowering, node: Syntax): Argument {
  const span = spanOf(low, node);
  const [params, ...body] = node.parts;
  const only = body.length === 1 ? body[0] : undefined;
  const value: Expr = params && only ? { kind: 'lambda', params: lowerParams(low, params), body: lowerExpression(low, only), ...span } : { kind: 'opaque', parts: [], ...span };
  return { value, ...span };
}

/** `+(a, b)` is a sum. */
function operatorCall(low: Lowering, sign: Syntax, args: readonly Argument[], span: Span): Expr {
  const text = textOf(low, sign);
  const op = arithmetic[text];
  const [left, right] = args;
  const plain = args.every((each) => !each.spread && each.name === undefined);
  const exponent = rootPower(text, spanOf(low, sign));
  if (exponent && plain && args.length === 1 && left) return root(exponent, left.value, span);
  if (op && plain && args.length === 2 && left && right) return { kind: 'binary', op, opSpan: spanOf(low, sign), left: left.value, right: right.value, ...span };
  if ((text === '-' || text === '+') && plain && args.length === 1 && left) return { kind: 'unary', op: text, operand: left.value, ...span };
  return { kind: 'opaque', parts: args.map((each) => each.value), ...span };
}

/** `Dict("rho" => 998, "mu" => 1e-3)`: entries with constant keys have units of their own. */
function dictionary(low: Lowering, list: Syntax, args: readonly Argument[], span: Span): Expr {
  const pairs = args.map(({ value }) => (value.kind === 'sequence' && value.form === 'tuple' && value.items.length === 2 ? value.items : undefined));
  if (pairs.length === 0 || !pairs.every((pair) => pair?.[0]?.kind === 'text')) return { kind: 'opaque', parts: args.map((each) => each.value), ...span };
  const entries = pairs.flatMap((pair, at) => {
    const [key, value] = pair ?? [];
    const part = list.parts[at];
    const comment = part && low.comments.beside(spanOf(low, part));
    return key?.kind === 'text' && value && part ? [{ key: key.value, keySpan: { start: key.end - key.value.length - (low.text[low.base + key.start] === ':' ? 0 : 1), end: key.end - (low.text[low.base + key.start] === ':' ? 0 : 1) }, value, ...(comment ? { comment } : {}), ...spanOf(low, part) }] : [];
  });
  return { kind: 'record', entries, others: [], ...span };
}

/** Types before a bracket make a list of it: `Float64[1, 2]`. */
const elementTypes = /^(?:Float(?:16|32|64)|U?Int(?:8|16|32|64|128)?|Bool|Real|Number|Any|String|FT|T|Complex\w*|Rational\w*)$/;

export function lowerIndex(low: Lowering, node: Syntax, span: Span): Expr {
  const [object, keys] = node.parts;
  if (!object || !keys) return opaque(low, node, span);
  if (elementTypes.test(textOf(low, object))) return keys.type === 'vector_expression' ? listOf(low, keys.parts, span) : lowerExpression(low, keys);
  const lowered = lowerExpression(low, object);
  if (keys.parts.length === 0) return { kind: 'opaque', parts: [lowered], ...span };
  if (keys.type !== 'vector_expression') return { kind: 'opaque', parts: [lowered, lowerExpression(low, keys)], ...span };
  return { kind: 'index', object: lowered, keys: keys.parts.map((part) => lowerExpression(low, part)), ...span };
}

export function lowerLambda(low: Lowering, node: Syntax, span: Span): Expr {
  const [params, body] = node.parts;
  if (!params || !body) return opaque(low, node, span);
  return { kind: 'lambda', params: lowerParams(low, params), body: lowerExpression(low, body), ...span };
}

/** A macro that gives the value of its last argument back is passed over; of any other the parts are walked. */
export function lowerMacro(low: Lowering, node: Syntax, span: Span): Expr {
  const args = macroArguments(node);
  const last = args.at(-1);
  if (last && passesValue(macroName(low, node))) return lowerExpression(low, last);
  return { kind: 'opaque', parts: args.filter((arg) => arg.type !== 'assignment').map((arg) => lowerExpression(low, arg)), ...span };
}

/** The name behind `@`, without the module before it. */
export function macroName(low: Lowering, node: Syntax): string {
  const name = node.parts.find((part) => part.type === 'macro_identifier');
  const text = name ? textOf(low, name).slice(1) : '';
  return text === '.' ? text : text.slice(text.lastIndexOf('.') + 1);
}

export function macroArguments(node: Syntax): readonly Syntax[] {
  const list = node.parts.find((part) => part.type === 'macro_argument_list' || part.type === 'argument_list');
  return list ? list.parts : node.parts.filter((part) => part.type.endsWith('_expression') && !part.broken).slice(-1);
}
