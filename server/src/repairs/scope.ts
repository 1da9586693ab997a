/** The symbols that an expression could use, with what is known of them. */
import type { NoteInForce, Value } from '../constraints/value.ts';
import { pathOf } from '../program/path.ts';
import type { Expr } from '../program/nodes.ts';
import type { Dimension } from '../quantities/dimension.ts';
import type { Anchor, Span } from '../text/span.ts';
import { dimensionOf, type Scene } from './scene.ts';

export interface ScopeSymbol {
  readonly path: string;
  readonly dimension: Dimension;
  readonly note: NoteInForce | undefined;
  readonly isParameter: boolean;
  /** Of the file's top level, seen from a function. */
  readonly isOutside: boolean;
  /** How often the code around reads it. */
  readonly uses: number;
  readonly value: Value;
}

/** Symbols with a known dimension that have been assigned before a place, or are parameters, or noted for the whole file. */
export function symbolsAt(scene: Scene, anchor: Anchor, place: Span): readonly ScopeSymbol[] {
  const piece = scene.pieceAt(anchor, place);
  const sightings = scene.sightings(piece);
  const found = new Map<string, ScopeSymbol>();
  const uses = new Map<string, number>();
  const limit = limitAt(scene, anchor, place);
  const parameters = new Set(piece?.fn.params.map((param) => param.nameSpan as Span) ?? []);
  for (const [span, value] of sightings.values) {
    const own = value.version?.anchor === anchor || !piece;
    const read = isExpr(span) ? pathOf(span) : undefined;
    if (read !== undefined && value.version?.span !== span) uses.set(read, (uses.get(read) ?? 0) + 1);
    const path = value.version?.path;
    if (!path || !own || value.version?.span !== span) continue;
    note(path, value, parameters.has(span), false);
  }
  if (piece) {
    for (const [span, value] of sightings.values) {
      const path = isExpr(span) && span.kind === 'name' ? span.name : undefined;
      if (path && value.version?.anchor !== anchor && value.version?.note) note(path, value, false, true);
    }
    for (const name of scene.inputs.style.closedFunctions ? [] : scene.inputs.solver.variables()) {
      const value = found.has(name) ? undefined : scene.inputs.solver.global(name);
      if (value?.form) note(name, value, false, true);
    }
  }
  return [...found.values()].map((symbol) => ({ ...symbol, uses: uses.get(symbol.path) ?? 0 }));

  function note(path: string, value: Value, isParameter: boolean, isOutside: boolean): void {
    if (!isBefore({ value, isParameter, isOutside }, limit)) return;
    const dimension = value.fits ? undefined : dimensionOf(value, sightings);
    if (dimension) found.set(path, { path, dimension, note: value.version?.note, isParameter, isOutside, uses: 0, value });
    else found.delete(path);
  }
}

/** Where the statement at a place begins, in the file: what is assigned before it has its value there. */
export function limitAt(scene: Scene, anchor: Anchor, place: Span): number {
  return anchor.start + (scene.statementAt(anchor, place)?.start ?? place.start);
}

/** Whether a symbol has its value before the statement that begins at the limit is run. */
export function isBefore({ value, isParameter, isOutside }: Pick<ScopeSymbol, 'value' | 'isParameter' | 'isOutside'>, limit: number): boolean {
  return isParameter || isOutside || !value.version || value.version.anchor.start + value.version.span.end <= limit;
}

function isExpr(span: Span): span is Expr {
  return 'kind' in span;
}
