/** What fixes are made from: the text, its program and notes, and what the solver knows of every expression. */
import type { Value } from '../constraints/value.ts';
import type { HostStyle } from '../frontends/frontend.ts';
import type { ChunkNotes } from '../notes/types.ts';
import type { Chunk, DocText, Program, Stmt } from '../program/nodes.ts';
import type { Piece } from '../solver/definitions.ts';
import type { FileSolver } from '../solver/file-solver.ts';
import type { Sightings } from '../solver/pieces.ts';
import type { LineIndex } from '../text/line-index.ts';
import type { Anchor, Span } from '../text/span.ts';
import { Dimension } from '../quantities/dimension.ts';

export interface SceneInputs {
  readonly file: string;
  readonly lines: LineIndex;
  readonly program: Program;
  readonly style: HostStyle;
  readonly notes: ReadonlyMap<Chunk, ChunkNotes>;
  readonly solver: FileSolver;
}

/** One file, for all the fixes of one request; what was seen of a function is kept. */
export class Scene {
  private readonly seen = new Map<Piece | undefined, Sightings>();

  constructor(readonly inputs: SceneInputs) {}

  get text(): string {
    return this.inputs.lines.text;
  }

  /** The innermost function around a place of a chunk; undefined for the top level. */
  pieceAt(anchor: Anchor, span: Span): Piece | undefined {
    let found: Piece | undefined;
    for (const piece of this.inputs.solver.pieces()) {
      if (piece.chunk.anchor !== anchor || span.start < piece.fn.start || span.end > piece.fn.end) continue;
      if (!found || piece.fn.start >= found.fn.start) found = piece;
    }
    return found;
  }

  sightings(piece: Piece | undefined): Sightings {
    let seen = this.seen.get(piece);
    if (!seen) {
      seen = this.inputs.solver.sightings(piece);
      this.seen.set(piece, seen);
    }
    return seen;
  }

  chunkOf(anchor: Anchor): Chunk | undefined {
    return this.inputs.program.chunks.find((chunk) => chunk.anchor === anchor);
  }

  /** The innermost statement around a place. */
  statementAt(anchor: Anchor, span: Span): Stmt | undefined {
    let found: Stmt | undefined;
    let block: readonly Stmt[] = this.chunkOf(anchor)?.statements ?? [];
    for (;;) {
      const inner = block.find((each) => each.start <= span.start && span.end <= each.end);
      if (!inner) return found;
      found = inner;
      block = blocksOf(inner);
    }
  }

  /** The characters of a span of a chunk. */
  code(anchor: Anchor, span: Span): string {
    return this.text.slice(anchor.start + span.start, anchor.start + span.end);
  }

  /** Whether a comment stands on a line. */
  hasCommentOn(line: number): boolean {
    const { program, lines } = this.inputs;
    return program.chunks.some((chunk) => chunk.comments.some((comment) => lines.lineAt(chunk.anchor.start + comment.start) === line));
  }

  /** Whether an offset lies inside documentation, where a comment would be text. */
  isInText(offset: number): boolean {
    const inside = (doc: DocText | undefined, start: number): boolean => doc !== undefined && start + doc.start <= offset && offset <= start + doc.end;
    const holds = (statement: Stmt, start: number): boolean => {
      if (statement.kind !== 'function' && statement.kind !== 'class') return false;
      return inside(statement.doc, start) || statement.body.some((each) => holds(each, start));
    };
    return this.inputs.program.chunks.some((chunk) => inside(chunk.doc, chunk.anchor.start) || chunk.statements.some((each) => holds(each, chunk.anchor.start)));
  }

  /** Whether a place lies in this file. */
  isHere(anchor: Anchor): boolean {
    return anchor.file === this.inputs.file;
  }
}

/** The dimension of a value as far as everything around decides it; undefined where that is open. */
export function dimensionOf(value: Value | undefined, sightings: Sightings): Dimension | undefined {
  if (value?.literal) return Dimension.one;
  const form = value?.form && sightings.reduce(value.form);
  return form && form.terms.length === 0 ? form.dimension : undefined;
}

/** The statements inside a statement. */
export function blocksOf(statement: Stmt): readonly Stmt[] {
  switch (statement.kind) {
    case 'if':
      return [...statement.arms.flatMap((arm) => arm.body), ...statement.otherwise];
    case 'loop':
      return [...statement.body, ...statement.otherwise];
    case 'attempt':
      return [...statement.body, ...statement.handlers.flat(), ...statement.otherwise, ...statement.finally];
    case 'match':
      return statement.cases.flatMap((each) => each.body);
    case 'scope':
    case 'function':
    case 'class':
      return statement.body;
    default:
      return [];
  }
}
