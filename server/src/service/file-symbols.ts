/** The symbols of a file with their units: where each is defined, what is known of it, and how often it is read. */
import type { Understood } from '../analyze.ts';
import type { Value } from '../constraints/value.ts';
import type { Chunk, Expr } from '../program/nodes.ts';
import { pathOf } from '../program/path.ts';
import type { Dimension } from '../quantities/dimension.ts';
import { inferredUnit } from '../repairs/open-symbols.ts';
import { dimensionOf } from '../repairs/scene.ts';
import type { Piece } from '../solver/definitions.ts';
import type { Sightings, Solved } from '../solver/pieces.ts';
import type { Span } from '../text/span.ts';
import type { SymbolGroup } from './contract.ts';

export interface FileSymbol {
  /** As `pathOf` prints it: `rho`, `self.p`, `df["p"]`. */
  readonly path: string;
  readonly kind: 'parameter' | 'variable';
  readonly chunk: Chunk;
  /** Where it first gets a value, relative to the chunk. */
  readonly span: Span;
  readonly origin: 'declared' | 'inferred' | 'unknown';
  /** As its author wrote it, or as it follows; empty for a pure number; undefined where it is not known or the scale is open. */
  readonly unit: string | undefined;
  readonly dimension: Dimension | undefined;
  readonly description: string | undefined;
  /** How often the function reads it. */
  readonly uses: number;
}

/** The symbols of one function; undefined function: the file's top level. */
export interface PieceSymbols {
  readonly piece: Piece | undefined;
  readonly symbols: readonly FileSymbol[];
}

const kept = new WeakMap<Solved, PieceSymbols>();

/** The symbols of every function of a file and of its top level, one after the other; what did not change is not made again. */
export function* symbolsOfFile(understood: Understood): Generator<PieceSymbols> {
  const { solver } = understood;
  if (solver.topLevel()) yield symbolsOf(understood, undefined);
  for (const piece of solver.pieces()) yield symbolsOf(understood, piece);
}

export function symbolsOf(understood: Understood, piece: Piece | undefined): PieceSymbols {
  const { solver } = understood;
  const solved = piece ? solver.piece(piece) : solver.topLevel();
  const known = solved && kept.get(solved);
  if (known) return known;
  const made = { piece, symbols: collect(solver.sightings(piece), understood, piece) };
  if (solved) kept.set(solved, made);
  return made;
}

/** The same as plain data in offsets of the file. */
export function* symbolGroups(understood: Understood): Generator<SymbolGroup> {
  for (const { piece, symbols } of symbolsOfFile(understood)) {
    const base = piece?.chunk.anchor.start ?? 0;
    const moved = ({ start, end }: Span, by: number): Span => ({ start: start + by, end: end + by });
    const whole = { start: 0, end: understood.parsed.text.length };
    yield {
      owner: piece && (piece.owner ? `${piece.owner.name}.${piece.fn.name}` : piece.fn.name),
      nameSpan: piece ? moved(piece.fn.nameSpan, base) : { start: 0, end: 0 },
      span: piece ? moved(piece.fn, base) : whole,
      symbols: symbols.map(({ path, kind, chunk, span, origin, unit, dimension, description, uses }) => ({
        name: path, kind, span: moved(span, chunk.anchor.start), origin, unit, dimension: dimension?.toString(), description, uses,
      })),
    };
  }
}

/** Known and all: a symbol counts where it takes part in arithmetic. */
export interface Coverage {
  readonly known: number;
  readonly all: number;
}

export function coverageOf(symbols: readonly FileSymbol[]): Coverage {
  return { known: symbols.filter(({ origin }) => origin !== 'unknown').length, all: symbols.length };
}

function collect(sightings: Sightings, { parsed }: Understood, piece: Piece | undefined): readonly FileSymbol[] {
  const defined = new Map<string, { readonly value: Value; readonly chunk: Chunk; readonly span: Span }>();
  const uses = new Map<string, number>();
  const reckoned = new Set<string>();
  const chunkOf = new Map(parsed.program.chunks.map((chunk) => [chunk.anchor, chunk]));
  for (const [span, value] of sightings.values) {
    if (isExpr(span)) for (const part of reckonedWith(span)) reckoned.add(part);
    const { version } = value;
    if (version?.span === span) {
      const chunk = chunkOf.get(version.anchor);
      const better = !defined.has(version.path) || (version.note && !defined.get(version.path)?.value.version?.note);
      if (chunk && better) defined.set(version.path, { value, chunk, span });
    } else {
      const read = isExpr(span) ? pathOf(span) : undefined;
      if (read !== undefined) uses.set(read, (uses.get(read) ?? 0) + 1);
    }
  }
  const parameters = new Set<Span>(piece?.fn.params.map(({ nameSpan }) => nameSpan));
  return [...defined].flatMap(([path, { value, chunk, span }]): readonly FileSymbol[] => {
    if (!counts(value, sightings) || (parameters.has(span) && !value.version?.note && !reckoned.has(path) && dimensionOf(value, sightings) === undefined)) return [];
    const note = value.version?.note;
    const dimension = note ? note.unit.dimension : dimensionOf(value, sightings);
    const unit = note ? (note.unit.scale ? note.unit.text : undefined) : dimension?.isOne ? '' : inferredUnit(value, sightings);
    return [{
      path, kind: parameters.has(span) ? 'parameter' : 'variable', chunk, span, uses: uses.get(path) ?? 0, dimension, unit,
      origin: note ? 'declared' : dimension ? 'inferred' : 'unknown', description: note?.note.description,
    }];
  });
}

/** Symbols that an expression adds, multiplies or compares: a path that is only handed on is a number to nobody. */
function reckonedWith(expr: Expr): readonly string[] {
  const parts = expr.kind === 'binary' ? [expr.left, expr.right] : expr.kind === 'unary' ? [expr.operand] : expr.kind === 'compare' ? expr.operands : [];
  return parts.flatMap((part) => pathOf(part) ?? []);
}

/** Texts, functions, tables and bare counts carry no unit. */
function counts(value: Value, sightings: Sightings): boolean {
  if (value.version?.note) return true;
  if (value.callable || value.items || value.fields || value.module || value.fits || !value.form) return false;
  const { assigned } = value.version ?? {};
  return !(assigned?.literal?.pure && dimensionOf(value, sightings) === undefined);
}

function isExpr(span: Span): span is Expr {
  return 'kind' in span;
}
