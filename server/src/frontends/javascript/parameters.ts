/** Parameters of functions, and what a pattern among them takes apart. */
import type { Comment, Expr, Param, Stmt } from '../../program/nodes.ts';
import { spanOf, textOf } from '../tree-sitter/lowering.ts';
import { fieldOf, type Syntax } from '../tree-sitter/syntax.ts';
import { lowerExpression } from './lower-expression.ts';
import { takeApart } from './patterns.ts';
import { type Script, unknownAt } from './script.ts';

export interface Parameters {
  readonly params: readonly Param[];
  /** What the head of the function assigns: the names in patterns, fields that parameters declare. */
  readonly opening: readonly Stmt[];
}

/** All parameters; a pattern gets a name that no script can write. */
export function lowerParameters(script: Script, fn: Syntax): Parameters {
  const params: Param[] = [];
  const opening: Stmt[] = [];
  for (const node of nodesOf(fn)) {
    const { target, value, type } = piecesOf(node);
    const span = spanOf(script, node);
    if (!target || target.type === 'this') continue;
    const comment = commentOf(script, node);
    const rest = { ...(comment ? { comment } : {}), ...(type ? { annotation: textOf(script, type).replace(/^:\s*/, '') } : {}), ...span };
    if (target.type === 'rest_pattern') {
      const name = target.parts[0] ?? target;
      params.push({ name: textOf(script, name), nameSpan: spanOf(script, name), mode: 'rest', ...rest });
      continue;
    }
    const name = textOf(script, target);
    const fallback: { default?: Expr } = value ? { default: lowerExpression(script, value) } : node.type === 'optional_parameter' ? { default: unknownAt({ start: span.end, end: span.end }) } : {};
    params.push({ name, nameSpan: spanOf(script, target), mode: 'plain', ...fallback, ...rest });
    if (target.type.endsWith('_pattern')) opening.push(...takeApart(script, target, { kind: 'name', name, ...spanOf(script, target) }, spanOf(script, target)));
    if (node.parts.some((each) => each.type === 'accessibility_modifier') || node.children.some((each) => each.type === 'readonly')) opening.push(fieldOfParameter(script, target, name));
  }
  return { params, opening };
}

/** The parameters where all of them are plain names. */
export function plainParams(script: Script, fn: Syntax): readonly Param[] | undefined {
  const nodes = nodesOf(fn);
  const plain = nodes.every((node) => ['identifier', undefined].includes(piecesOf(node).target?.type));
  return plain ? lowerParameters(script, fn).params : undefined;
}

function nodesOf(fn: Syntax): readonly Syntax[] {
  const single = fieldOf(fn, 'parameter');
  return single ? [single] : (fieldOf(fn, 'parameters')?.parts ?? []);
}

function piecesOf(node: Syntax): { readonly target: Syntax | undefined; readonly value?: Syntax | undefined; readonly type?: Syntax | undefined } {
  if (node.type === 'assignment_pattern') return { target: fieldOf(node, 'left'), value: fieldOf(node, 'right') };
  if (node.type === 'required_parameter' || node.type === 'optional_parameter') {
    const pattern = fieldOf(node, 'pattern') ?? node.parts.find((each) => each.type !== 'accessibility_modifier' && each.type !== 'decorator');
    return { target: pattern, value: fieldOf(node, 'value'), type: fieldOf(node, 'type') };
  }
  return { target: node };
}

/** Behind the parameter, where no other stands on its line. */
function commentOf(script: Script, node: Syntax): Comment | undefined {
  const comment = script.comments.beside(spanOf(script, node));
  if (!comment) return undefined;
  const between = script.text.slice(node.end, comment.start + script.base);
  return /^\s*,?\s*\)?[^\w]*$/.test(between) ? comment : undefined;
}

/** `constructor(readonly D: number)` makes a field of it. */
function fieldOfParameter(script: Script, target: Syntax, name: string): Stmt {
  const span = spanOf(script, target);
  const here = { kind: 'name', name: 'this', start: span.start, end: span.start } as const;
  return { kind: 'assign', targets: [{ kind: 'member', object: here, name, nameSpan: span, ...span }], value: { kind: 'name', name, ...span }, ...span };
}
