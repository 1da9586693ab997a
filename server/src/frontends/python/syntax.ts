/** The syntax tree as plain objects, copied from the parser in one walk: its own nodes cost a call across WASM for every question. */
import type { Node as TreeNode, TreeCursor } from 'web-tree-sitter';

export interface Syntax {
  readonly type: string;
  readonly field: string | undefined;
  readonly named: boolean;
  readonly missing: boolean;
  readonly start: number;
  readonly end: number;
  readonly children: readonly Syntax[];
}

/** Copies a node and everything below it. Deeper than `deepest`, children are left out. */
export function copyTree(node: TreeNode): Syntax {
  const cursor = node.walk();
  const copy = copyAt(cursor, 0);
  cursor.delete();
  return copy;
}

const deepest = 900;

function copyAt(cursor: TreeCursor, depth: number): Syntax {
  const children: Syntax[] = [];
  const type = cursor.nodeType;
  const start = cursor.startIndex;
  const end = cursor.endIndex;
  const field = cursor.currentFieldName ?? undefined;
  const named = cursor.nodeIsNamed;
  const missing = cursor.nodeIsMissing;
  if (depth < deepest && cursor.gotoFirstChild()) {
    do children.push(copyAt(cursor, depth + 1));
    while (cursor.gotoNextSibling());
    cursor.gotoParent();
  }
  return { type, field, named, missing, start, end, children };
}

export function fieldOf(node: Syntax, name: string): Syntax | undefined {
  return node.children.find((child) => child.field === name);
}

export function fieldsOf(node: Syntax, name: string): readonly Syntax[] {
  return node.children.filter((child) => child.field === name && child.named && child.type !== 'comment');
}

/** Named children that are no comments. */
export function partsOf(node: Syntax): readonly Syntax[] {
  return node.children.filter((child) => child.named && child.type !== 'comment');
}
