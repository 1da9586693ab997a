/** Which kinds of quantity have a dimension, by the names of ISO 80000. */
import type { Dimension } from './dimension.ts';
import { parseBaseProduct } from './factor.ts';
import { kindsTable } from './kinds-table.ts';

interface Kinds {
  readonly kinds: readonly string[];
  /** Place in the table. */
  readonly place: number;
}

let byDimension: Map<Dimension, Kinds> | undefined;

/** The kinds of quantity that a dimension may belong to; empty where none is known by name. */
export function kindsOf(dimension: Dimension): readonly string[] {
  return load().get(dimension)?.kinds ?? [];
}

/** How familiar a dimension is: its place in the table, for choosing between two ways to say the same. The lower, the more familiar. */
export function familiarity(dimension: Dimension): number {
  const table = load();
  return table.get(dimension)?.place ?? table.size;
}

function load(): Map<Dimension, Kinds> {
  byDimension ??= new Map(kindsTable.flatMap((part) => part.rows).map(([product, kinds], place) => [parseBaseProduct(product), { kinds: kinds.split(', '), place }] as const));
  return byDimension;
}
