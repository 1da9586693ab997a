/** Which names of a chunk hold texts, and which expressions give one. */
import type { Lowering } from '../tree-sitter/lowering.ts';
import { textOf } from '../tree-sitter/lowering.ts';
import { fieldOf, type Syntax } from '../tree-sitter/syntax.ts';
import { bare } from './script.ts';

const givers = new Set(['toFixed', 'toPrecision', 'toExponential', 'toString', 'toLocaleString', 'toISOString', 'toLowerCase', 'toUpperCase', 'trim', 'join', 'padStart', 'padEnd', 'substring', 'substr', 'replace', 'replaceAll', 'repeat', 'charAt']);
const makers = new Set(['String', 'JSON.stringify', 'Date', 'Symbol', 'prompt', 'encodeURIComponent']);

/** The names that are given a text, or declared as one, anywhere below these nodes. */
export function textNames(low: Lowering, nodes: readonly Syntax[]): ReadonlySet<string> {
  const names = new Set<string>();
  for (let found = -1; found !== names.size && found < 200; ) {
    found = names.size;
    for (const node of nodes) collect(low, node, names, 0);
  }
  return names;
}

function collect(low: Lowering, node: Syntax, names: Set<string>, depth: number): void {
  if (depth > 400) return;
  const left = fieldOf(node, 'name') ?? fieldOf(node, 'left') ?? fieldOf(node, 'pattern');
  if (left?.type === 'identifier') {
    const value = fieldOf(node, 'value') ?? fieldOf(node, 'right');
    const type = fieldOf(node, 'type');
    if ((value && isText(low, value, names)) || (type && /^:\s*(?:string|Date|HTML\w*|[A-Z]\w*Element)\b/.test(textOf(low, type)))) names.add(textOf(low, left));
  }
  for (const child of node.parts) collect(low, child, names, depth + 1);
}

/** Whether `+` beside this joins texts. */
export function isText(low: Lowering, expression: Syntax | undefined, names: ReadonlySet<string>): boolean {
  const node = bare(expression);
  switch (node?.type) {
    case 'string':
    case 'template_string':
      return true;
    case 'identifier':
      return names.has(textOf(low, node));
    case 'binary_expression':
      return fieldOf(node, 'operator')?.type === '+' && (isText(low, fieldOf(node, 'left'), names) || isText(low, fieldOf(node, 'right'), names));
    case 'ternary_expression':
      return isText(low, fieldOf(node, 'consequence'), names) || isText(low, fieldOf(node, 'alternative'), names);
    case 'new_expression':
      return textOf(low, fieldOf(node, 'constructor') ?? node) === 'Date';
    case 'call_expression': {
      const callee = fieldOf(node, 'function');
      const method = callee?.type === 'member_expression' ? fieldOf(callee, 'property') : undefined;
      return (method !== undefined && givers.has(textOf(low, method))) || (callee !== undefined && makers.has(textOf(low, callee)));
    }
    default:
      return false;
  }
}
