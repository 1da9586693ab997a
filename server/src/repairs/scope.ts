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
  const parameters = new Set(piece?.fn.params.map((param) => param.nameSpan as Span) ?? []);
  for (const [span, value] of sightings.values) {
    const own = value.version?.anchor === anchor || !piece;
    const read = isExpr(span) ? pathOf(span) : undefined;
    if (read !== undefined && value.version?.span !== span) uses.set(read, (uses.get(read) ?? 0) + 1);
    const path = value.version?.path;
    if (!path || !own || (span.end > place.start && value.version?.anchor === anchor && !parameters.has(span)) || value.version?.span !== span) continue;
    note(path, value, parameters.has(span));
  }
  if (piece) {
    for (const [span, value] of sightings.values) {
      const path = isExpr(span) && span.kind === 'name' ? span.name : undefined;
      if (path && value.version?.anchor !== anchor && value.version?.note) note(path, value, false);
    }
    for (const name of scene.inputs.solver.variables()) {
      const value = found.has(name) ? undefined : scene.inputs.solver.global(name);
      if (value?.form) note(name, value, false);
    }
  }
  return [...found.values()].map((symbol) => ({ ...symbol, uses: uses.get(symbol.path) ?? 0 }));

  function note(path: string, value: Value, isParameter: boolean): void {
    const dimension = value.fits ? undefined : dimensionOf(value, sightings);
    if (dimension) found.set(path, { path, dimension, note: value.version?.note, isParameter, uses: 0, value });
    else found.delete(path);
  }
}

function isExpr(span: Span): span is Expr {
  return 'kind' in span;
}
