/**
 * The syntax tree as plain objects, copied from the parser in one walk: every question to its own nodes or cursor is a call
 * across WASM, so as few as possible are asked. Punctuation is left out, and comments and syntax errors are gathered on the way.
 */
import type { Language, Node as TreeNode, TreeCursor } from 'web-tree-sitter';
import type { SyntaxProblem } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';

export interface Syntax extends Span {
  readonly type: string;
  readonly field: string | undefined;
  readonly named: boolean;
  /** A syntax error stands in it: what it says cannot be trusted. */
  readonly broken: boolean;
  /** Everything below but punctuation and comments. */
  readonly children: readonly Syntax[];
  /** The children that are no tokens. */
  readonly parts: readonly Syntax[];
}

/** What a walk meets besides nodes; offsets in the file. */
export interface Found {
  readonly comments: Span[];
  readonly problems: SyntaxProblem[];
}

const deepest = 900;
const none: readonly Syntax[] = [];
/** Which nodes of a grammar are copied, and how. */
export interface TreeShape {
  /** Node types of comments. */
  readonly comments: ReadonlySet<string>;
  /** Node types without children worth a look. */
  readonly leaves: ReadonlySet<string>;
  /** Node types whose children carry no field that lowering asks for. */
  readonly fieldless: ReadonlySet<string>;
  /** Named nodes that may stand anywhere and are part of nothing, comments among them. */
  readonly extras: ReadonlySet<string>;
  /** Tokens that lowering looks at; all others are punctuation. */
  readonly tokens: RegExp;
}

interface Kind {
  readonly type: string;
  readonly named: boolean;
  readonly leaf: boolean;
  readonly kept: boolean;
  readonly fieldless: boolean;
  readonly comment: boolean;
}

/** Copies trees of one grammar. */
export class TreeCopier {
  private readonly kinds: (Kind | undefined)[] = [];
  private readonly fields: (string | undefined)[] = [];

  constructor(private readonly language: Language, private readonly shape: TreeShape) {}

  /** A node and everything below it; `broken` where it holds a syntax error, so that missing tokens are looked for. */
  copy(node: TreeNode, broken: boolean, found: Found): Syntax {
    const cursor = node.walk();
    const kind = this.kindOf(cursor);
    if (broken) note(cursor, kind, found);
    const copy = this.copyAt(cursor, kind, false, 0, broken, found);
    cursor.delete();
    return copy;
  }

  private copyAt(cursor: TreeCursor, kind: Kind, fieldable: boolean, depth: number, broken: boolean, found: Found): Syntax {
    const field = fieldable ? this.fieldOf(cursor.currentFieldId) : undefined;
    const start = cursor.startIndex;
    const end = kind.named || broken ? cursor.endIndex : start + kind.type.length;
    let faulty = broken && (kind.type === 'ERROR' || cursor.nodeIsMissing);
    if (kind.leaf || depth >= deepest || !cursor.gotoFirstChild()) return { type: kind.type, field, named: kind.named, broken: faulty, start, end, children: none, parts: none };
    const children: Syntax[] = [];
    let tokens = 0;
    do {
      const below = this.kindOf(cursor);
      if (broken && note(cursor, below, found)) faulty = true;
      if (below.comment) found.comments.push({ start: cursor.startIndex, end: cursor.endIndex });
      if (!below.kept) continue;
      if (!below.named) tokens++;
      const child = this.copyAt(cursor, below, !kind.fieldless, depth + 1, broken, found);
      faulty ||= child.broken;
      children.push(child);
    } while (cursor.gotoNextSibling());
    cursor.gotoParent();
    const parts = tokens === 0 ? children : children.filter((each) => each.named);
    return { type: kind.type, field, named: kind.named, broken: faulty, start, end, children, parts };
  }

  private kindOf(cursor: TreeCursor): Kind {
    const id = cursor.nodeTypeId;
    const known = this.kinds[id];
    if (known) return known;
    const type = cursor.nodeType;
    const named = cursor.nodeIsNamed;
    const { comments, leaves, fieldless, extras, tokens } = this.shape;
    const kind = { type, named, leaf: !named || leaves.has(type), kept: named ? !extras.has(type) : tokens.test(type), fieldless: fieldless.has(type), comment: comments.has(type) };
    if (type !== 'ERROR') this.kinds[id] = kind;
    return kind;
  }

  private fieldOf(id: number): string | undefined {
    if (id === 0) return undefined;
    const name = this.fields[id] ?? this.language.fieldNameForId(id) ?? undefined;
    this.fields[id] = name;
    return name;
  }
}

/** Whether this is a syntax error; it is written down unless it lies in one that is. */
function note(cursor: TreeCursor, kind: Kind, found: Found): boolean {
  const error = kind.type === 'ERROR';
  if (!error && !cursor.nodeIsMissing) return false;
  const { startIndex: start, endIndex: end } = cursor;
  const last = found.problems.at(-1);
  if (!last || end > last.end) found.problems.push({ start, end, message: error ? 'cannot be parsed' : `missing ${kind.type}` });
  return true;
}

export function fieldOf(node: Syntax, name: string): Syntax | undefined {
  for (const child of node.children) if (child.field === name) return child;
  return undefined;
}

export function fieldsOf(node: Syntax, name: string): readonly Syntax[] {
  return node.parts.filter((child) => child.field === name);
}

/** Named children that are no comments. */
export function partsOf(node: Syntax): readonly Syntax[] {
  return node.parts;
}
