/** Characteristic numbers with the symbols of a relation put into their places. */
import type { Dimension } from '../quantities/dimension.ts';
import type { Rational } from '../quantities/rational.ts';
import { evidence } from './evidence.ts';
import { type Form, forms } from './forms.ts';
import { likeClasses } from './like.ts';
import type { KnownSymbol } from './system.ts';

/** A characteristic number with symbols in its places: `number = ∏ symbol^power`, factor left out. */
export interface Instance {
  readonly form: Form;
  readonly powers: ReadonlyMap<string, Rational>;
  /** Symbols in the order of the form's places. */
  readonly filled: readonly KnownSymbol[];
  readonly evidence: number;
}

/** Bounds the ways in which one form takes symbols; where several symbols are alike, those that set the scale come first. */
const perForm = 16;

/**
 * Every number that the symbols can form, at most `perForm` ways each: O(forms · places · perForm) for any count of symbols.
 * No symbol stands in two places.
 */
export function instancesOf(symbols: readonly KnownSymbol[]): Instance[] {
  const classes = likeClasses(symbols);
  return forms.flatMap((form) => {
    const found: Instance[] = [];
    if (form.roles.length > 1 && form.roles.every(({ kind }) => classes.has(kind.dimension))) fill(form, classes, [], 0, found);
    return found;
  });
}

function fill(form: Form, classes: ReadonlyMap<Dimension, readonly KnownSymbol[]>, filled: readonly KnownSymbol[], told: number, found: Instance[]): void {
  const role = form.roles[filled.length];
  if (!role) {
    const powers = new Map<string, Rational>(filled.map((symbol, at) => [symbol.name, (form.roles[at] as Form['roles'][number]).exponent]));
    found.push({ form, powers, filled, evidence: told });
    return;
  }
  for (const symbol of classes.get(role.kind.dimension) ?? []) {
    if (found.length >= perForm) return;
    const fit = filled.includes(symbol) ? undefined : evidence(symbol, role.kind);
    if (fit !== undefined) fill(form, classes, [...filled, symbol], told + fit, found);
  }
}
