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
/** Node types without children worth a look. */
const leaves = new Set(['identifier', 'integer', 'float', 'true', 'false', 'none', 'comment', 'string_start', 'string_content', 'string_end', 'ellipsis', 'pass_statement', 'break_statement', 'continue_statement']);
/** Node types whose children carry no field that lowering asks for. */
const fieldless = new Set([
  'argument_list', 'block', 'comment', 'concatenated_string', 'conditional_expression', 'decorator', 'dictionary', 'dotted_name', 'ERROR', 'expression_list', 'expression_statement',
  'list', 'module', 'parameters', 'lambda_parameters', 'parenthesized_expression', 'pattern_list', 'return_statement', 'set', 'slice', 'string', 'tuple', 'tuple_pattern', 'type', 'with_clause',
]);
/** Nodes that may stand anywhere and are part of nothing. */
const extras = new Set(['comment', 'line_continuation']);
/** Tokens that lowering looks at; all others are punctuation. */
const kept = /^(?::|[+\-*/%@&|^~]|\*\*|\/\/|<<|>>|[+\-*/%@&|^]=|(?:\*\*|\/\/|<<|>>)=|[<>]=?|==|!=|<>|and|or|not|in|is|not in|is not)$/;

interface Kind {
  readonly type: string;
  readonly named: boolean;
  readonly leaf: boolean;
  readonly kept: boolean;
  readonly fieldless: boolean;
}

/** Copies trees of one grammar. */
export class TreeCopier {
  private readonly kinds: (Kind | undefined)[] = [];
  private readonly fields: (string | undefined)[] = [];

  constructor(private readonly language: Language) {}

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
      if (below.type === 'comment') found.comments.push({ start: cursor.startIndex, end: cursor.endIndex });
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
    const kind = { type, named, leaf: !named || leaves.has(type), kept: named ? !extras.has(type) : kept.test(type), fieldless: fieldless.has(type) };
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
