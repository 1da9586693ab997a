/**
 * The syntax tree as plain objects, copied from the parser in one walk: every question to its own nodes or cursor is a call
 * across WASM, so as few as possible are asked. Tokens without a name carry a span only where lowering uses it.
 */
import type { Language, Node as TreeNode, TreeCursor } from 'web-tree-sitter';

export interface Syntax {
  readonly type: string;
  readonly field: string | undefined;
  readonly named: boolean;
  readonly missing: boolean;
  readonly start: number;
  readonly end: number;
  readonly children: readonly Syntax[];
}

const deepest = 900;
const none: readonly Syntax[] = [];
/** Node types without children worth a look. */
const leaves = new Set(['identifier', 'integer', 'float', 'true', 'false', 'none', 'comment', 'string_start', 'string_content', 'string_end', 'ellipsis', 'pass_statement', 'break_statement', 'continue_statement']);
/** Tokens whose place matters: the colon of a compound statement, operators. */
const placed = /^(?::|\W{1,3}=?|and|or|not|in|is)$/;

interface Kind {
  readonly type: string;
  readonly named: boolean;
  readonly leaf: boolean;
  readonly placed: boolean;
}

/** Copies trees of one grammar. */
export class TreeCopier {
  private readonly kinds: (Kind | undefined)[] = [];
  private readonly fields: (string | undefined)[] = [];

  constructor(private readonly language: Language) {}

  /** A node and everything below it; `broken` where it holds a syntax error, so that missing tokens are looked for. */
  copy(node: TreeNode, broken: boolean): Syntax {
    const cursor = node.walk();
    const copy = this.copyAt(cursor, 0, broken);
    cursor.delete();
    return copy;
  }

  private copyAt(cursor: TreeCursor, depth: number, broken: boolean): Syntax {
    const kind = this.kindOf(cursor);
    const fieldId = cursor.currentFieldId;
    const field = fieldId === 0 ? undefined : this.fieldOf(fieldId);
    const place = kind.named || kind.placed || broken;
    const start = place ? cursor.startIndex : 0;
    const end = place ? cursor.endIndex : 0;
    const missing = broken && cursor.nodeIsMissing;
    if (kind.leaf || depth >= deepest || !cursor.gotoFirstChild()) return { type: kind.type, field, named: kind.named, missing, start, end, children: none };
    const children: Syntax[] = [];
    do children.push(this.copyAt(cursor, depth + 1, broken));
    while (cursor.gotoNextSibling());
    cursor.gotoParent();
    return { type: kind.type, field, named: kind.named, missing, start, end, children };
  }

  private kindOf(cursor: TreeCursor): Kind {
    const id = cursor.nodeTypeId;
    const known = this.kinds[id];
    if (known) return known;
    const type = cursor.nodeType;
    const named = cursor.nodeIsNamed;
    const kind = { type, named, leaf: !named || leaves.has(type), placed: placed.test(type) };
    if (type !== 'ERROR') this.kinds[id] = kind;
    return kind;
  }

  private fieldOf(id: number): string | undefined {
    const known = this.fields[id];
    if (known !== undefined) return known;
    const name = this.language.fieldNameForId(id) ?? undefined;
    this.fields[id] = name;
    return name;
  }
}

export function fieldOf(node: Syntax, name: string): Syntax | undefined {
  for (const child of node.children) if (child.field === name) return child;
  return undefined;
}

export function fieldsOf(node: Syntax, name: string): readonly Syntax[] {
  return node.children.filter((child) => child.field === name && child.named && child.type !== 'comment');
}

/** Named children that are no comments. */
export function partsOf(node: Syntax): readonly Syntax[] {
  return node.children.filter((child) => child.named && child.type !== 'comment');
}
