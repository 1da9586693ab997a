/** One chunk per top-level statement: with the comments directly above it and what stands on its lines. */
import type { Node as TreeNode } from 'web-tree-sitter';
import type { Chunk, DocText } from '../../program/nodes.ts';
import type { LineIndex } from '../../text/line-index.ts';
import { reuseChunks } from '../reuse.ts';
import { Comments } from './comments.ts';
import { docText } from './documentation.ts';
import type { Lowering } from './lowering.ts';
import { isStatement, lowerStatements } from './lower-statement.ts';
import type { Found, Syntax, TreeCopier } from './syntax.ts';

interface Piece {
  start: number;
  end: number;
  readonly nodes: TreeNode[];
  /** Holds a syntax error, or fragments that the parser could not join to statements. */
  broken: boolean;
  commentsOnly: boolean;
}

/** The chunks of a syntax tree; those of `previous` that did not change come back without being lowered again. */
export function chunksOf(root: TreeNode, copier: TreeCopier, lines: LineIndex, file: string, previous: readonly Chunk[]): readonly Chunk[] {
  const pieces = piecesOf(root, lines);
  const first = pieces.findIndex((piece) => !piece.commentsOnly);
  const fits = (chunk: Chunk, at: number): boolean => {
    if (pieces[at]?.broken || chunk.problems.length > 0) return false;
    return at === first ? chunk.doc !== undefined || !mayDocument(chunk) : chunk.doc === undefined;
  };
  const kept = reuseChunks(previous, lines.text, pieces, fits);
  return pieces.map((piece, at) => kept[at] ?? lower(piece, copier, lines, file, at === first));
}

function piecesOf(root: TreeNode, lines: LineIndex): readonly Piece[] {
  const pieces: Piece[] = [];
  let lastLine = -1;
  for (const node of root.children) {
    if (!node) continue;
    const { type, startIndex, endIndex } = node;
    const line = lines.lineAt(startIndex);
    const comment = type === 'comment';
    const broken = !isStatement(type) || (!comment && node.hasError);
    const piece = pieces.at(-1);
    if (piece && (line === lastLine || (piece.commentsOnly && line === lastLine + 1))) {
      piece.nodes.push(node);
      piece.end = Math.max(piece.end, endIndex);
      piece.broken ||= broken;
      piece.commentsOnly &&= comment;
    } else {
      pieces.push({ start: startIndex, end: endIndex, nodes: [node], broken, commentsOnly: comment });
    }
    lastLine = lines.lineAt(Math.max(endIndex - (lines.text[endIndex - 1] === '\n' ? 1 : 0), startIndex));
  }
  return pieces;
}

/** Whether a chunk would be the file's documentation if it stood first. */
function mayDocument(chunk: Chunk): boolean {
  const [statement] = chunk.statements;
  return statement?.kind === 'evaluate' && statement.value.kind === 'text';
}

function lower(piece: Piece, copier: TreeCopier, lines: LineIndex, file: string, first: boolean): Chunk {
  const found: Found = { comments: [], problems: [] };
  const nodes: Syntax[] = [];
  for (const node of piece.nodes) {
    if (node.type === 'comment') found.comments.push({ start: node.startIndex, end: node.endIndex });
    else nodes.push(copier.copy(node, piece.broken, found));
  }
  const comments = new Comments(found.comments, lines, piece.start);
  const low: Lowering = { text: lines.text, base: piece.start, comments, depth: 0 };
  const doc = first ? docOf(low, nodes[0]) : undefined;
  if (piece.broken && found.problems.length === 0) found.problems.push({ start: piece.start, end: piece.end, message: 'cannot be parsed' });
  return {
    anchor: { file, start: piece.start },
    text: lines.text.slice(piece.start, piece.end),
    statements: lowerStatements(low, nodes),
    problems: found.problems.map((each) => ({ start: each.start - piece.start, end: each.end - piece.start, message: each.message })),
    comments: comments.all, ...(doc ? { doc } : {}),
  };
}

function docOf(low: Lowering, node: Syntax | undefined): DocText | undefined {
  const text = node?.type === 'expression_statement' ? node.parts[0] : undefined;
  return text && docText(low, text);
}
