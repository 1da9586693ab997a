/** One chunk per top-level statement: with the comments directly above it and what stands on its lines. */
import type { Node as TreeNode } from 'web-tree-sitter';
import type { Chunk, DocText, Stmt } from '../../program/nodes.ts';
import type { LineIndex } from '../../text/line-index.ts';
import { reuseChunks } from '../reuse.ts';
import { type CommentMarkers, Comments } from './comments.ts';
import type { Lowering } from './lowering.ts';
import type { Found, Syntax, TreeCopier, TreeShape } from './syntax.ts';

/** What a host language adds to the walk over its tree. */
export interface TreeHost {
  readonly shape: TreeShape;
  readonly markers: CommentMarkers;
  /** Whether a top-level node of this type is whole: a statement, a comment, or what stands between statements. */
  isStatement(type: string): boolean;
  lowerStatements(low: Lowering, nodes: readonly Syntax[]): readonly Stmt[];
  /** The file's documentation, from the nodes of its first chunk with a statement; left out where the language has none. */
  fileDoc?(low: Lowering, nodes: readonly Syntax[]): DocText | undefined;
  /** The text with what the grammar does not know blanked out, of the same length. */
  readable?(text: string): string;
  /** Whether a node of this type may belong to what stands on the line below it: documentation above a definition. */
  precedes?(type: string): boolean;
  /** Whether a chunk would give the file's documentation if it stood first. */
  mayDocument?(chunk: Chunk): boolean;
}

interface Piece {
  start: number;
  end: number;
  readonly nodes: TreeNode[];
  /** Holds a syntax error, or fragments that the parser could not join to statements. */
  broken: boolean;
  commentsOnly: boolean;
  /** What stands on the line below belongs to it. */
  open: boolean;
}

/** The chunks of a syntax tree; those of `previous` that did not change come back without being lowered again. */
export function chunksOf(root: TreeNode, host: TreeHost, copier: TreeCopier, lines: LineIndex, file: string, previous: readonly Chunk[]): readonly Chunk[] {
  const pieces = piecesOf(root, lines, host);
  const first = pieces.findIndex((piece) => !piece.commentsOnly);
  const fits = (chunk: Chunk, at: number): boolean => {
    if (pieces[at]?.broken || chunk.problems.length > 0) return false;
    return at === first ? chunk.doc !== undefined || !host.mayDocument?.(chunk) : chunk.doc === undefined;
  };
  const kept = reuseChunks(previous, lines.text, pieces, fits);
  return pieces.map((piece, at) => kept[at] ?? lower(piece, host, copier, lines, file, at === first));
}

function piecesOf(root: TreeNode, lines: LineIndex, host: TreeHost): readonly Piece[] {
  const pieces: Piece[] = [];
  let lastLine = -1;
  for (const node of root.children) {
    if (!node) continue;
    const { type, startIndex, endIndex } = node;
    const line = lines.lineAt(startIndex);
    const comment = host.shape.comments.has(type);
    const broken = !host.isStatement(type) || (!comment && node.hasError);
    const piece = pieces.at(-1);
    if (piece && (line === lastLine || ((piece.commentsOnly || piece.open) && line === lastLine + 1))) {
      piece.nodes.push(node);
      piece.end = Math.max(piece.end, endIndex);
      piece.broken ||= broken;
      piece.commentsOnly &&= comment;
      piece.open = host.precedes?.(type) ?? false;
    } else {
      pieces.push({ start: startIndex, end: endIndex, nodes: [node], broken, commentsOnly: comment, open: host.precedes?.(type) ?? false });
    }
    lastLine = lines.lineAt(Math.max(endIndex - (lines.text[endIndex - 1] === '\n' ? 1 : 0), startIndex));
  }
  return pieces;
}

function lower(piece: Piece, host: TreeHost, copier: TreeCopier, lines: LineIndex, file: string, first: boolean): Chunk {
  const found: Found = { comments: [], problems: [] };
  const nodes: Syntax[] = [];
  for (const node of piece.nodes) {
    if (host.shape.comments.has(node.type)) found.comments.push({ start: node.startIndex, end: node.endIndex });
    else nodes.push(copier.copy(node, piece.broken, found));
  }
  const comments = new Comments(found.comments, lines, piece.start, host.markers);
  const low: Lowering = { text: lines.text, base: piece.start, comments, depth: 0 };
  const doc = first ? host.fileDoc?.(low, nodes) : undefined;
  if (piece.broken && found.problems.length === 0) found.problems.push({ start: piece.start, end: piece.end, message: 'cannot be parsed' });
  return {
    anchor: { file, start: piece.start },
    text: lines.text.slice(piece.start, piece.end),
    statements: host.lowerStatements(low, nodes),
    problems: found.problems.map((each) => ({ start: each.start - piece.start, end: each.end - piece.start, message: each.message })),
    comments: comments.all, ...(doc ? { doc } : {}),
  };
}
