/** The inert data of a relation between quantities and of its dimensionless groups. */
import type { Dimension } from '../quantities/dimension.ts';
import type { Rational } from '../quantities/rational.ts';
import type { Scale } from '../quantities/scale.ts';
import type { Unit } from '../quantities/unit.ts';

/** One quantity of a relation. Nothing is guessed: `dimension` undefined means that the unit is not known. */
export interface RelationSymbol {
  readonly name: string;
  readonly dimension: Dimension | undefined;
  /** The words beside the unit; they decide where dimensions cannot. */
  readonly description?: string;
  readonly unit?: Unit;
  /** Counted in `unit`. */
  readonly value?: number;
  readonly range?: { readonly low: number; readonly high: number };
}

/** `dependent` depends on the other symbols; undefined where no symbol is singled out. Names are unique; a repeated name counts once. */
export interface Relation {
  readonly dependent: string | undefined;
  readonly symbols: readonly RelationSymbol[];
}

/** Integer exponents by symbol name, in the order of the relation, zeros left out. */
export type Exponents = ReadonlyMap<string, Rational>;

/** A dimensionless product of symbols with the smallest integer exponents. */
export interface Group {
  readonly exponents: Exponents;
  readonly role: GroupRole;
  /** Every characteristic number that it can be; several where nothing decides between them. */
  readonly recognised: readonly Recognition[];
  /** The group as a product of two known numbers with smaller parts, where that is simple: Péclet = Re·Pr. */
  readonly composites: readonly (readonly CompositePart[])[];
  /** Factors in the order in which an engineer writes them. */
  readonly order: readonly string[];
}

/** `dependent`: holds the dependent symbol; `symbol`: one dimensionless symbol; `ratio`: two quantities of one kind; `product`: the rest. */
export type GroupRole = 'dependent' | 'symbol' | 'ratio' | 'product';

/** The group is `coefficient · number^power`. */
export interface Recognition {
  readonly number: string;
  readonly otherNames: readonly string[];
  readonly symbol: string;
  readonly field: string;
  readonly power: Rational;
  readonly coefficient: Scale;
  /** Which symbol stands for which kind of quantity. */
  readonly kinds: readonly { readonly symbol: string; readonly kind: string }[];
  /** The number as its source writes it. */
  readonly expression: string;
  readonly source: string;
  /** How surely: kinds confirmed by words, less those that only fit by dimension. Comparable within one group. */
  readonly evidence: number;
}

export interface CompositePart {
  readonly number: string;
  readonly symbol: string;
  readonly power: Rational;
}

/** Why a symbol is in no group. */
export type Unmatched =
  | { readonly symbol: string; readonly reason: 'unknown-unit' }
  /** `base` occurs in no other symbol that takes part, so nothing can cancel it. */
  | { readonly symbol: string; readonly reason: 'lone-dimension'; readonly base: string }
  /** The other symbols cannot make up this combination of base dimensions. */
  | { readonly symbol: string; readonly reason: 'lone-combination'; readonly bases: readonly string[] };

/** What a request for repeating symbols or kept groups can have wrong. */
export type GroupsProblem =
  | { readonly kind: 'unknown-dependent'; readonly symbol: string }
  | { readonly kind: 'unknown-symbol'; readonly symbol: string }
  | { readonly kind: 'repeats-dependent'; readonly symbol: string }
  | { readonly kind: 'takes-no-part'; readonly symbol: string }
  | { readonly kind: 'wrong-count'; readonly wanted: number; readonly given: number }
  /** These repeating symbols form a group among themselves. */
  | { readonly kind: 'not-independent'; readonly among: readonly string[] }
  | { readonly kind: 'not-dimensionless'; readonly group: string; readonly left: Dimension }
  | { readonly kind: 'dependent-twice'; readonly group: string }
  | { readonly kind: 'redundant-group'; readonly group: string };

export interface GroupsOptions {
  /** Repeating symbols to use instead of the default choice. */
  readonly repeating?: readonly string[];
  /** Groups to keep; the rest is solved around them. Exponents by symbol name. */
  readonly keep?: readonly Exponents[];
}

export interface GroupsResult {
  readonly relation: Relation;
  /** Base dimensions that occur, in the rows of `matrix`; symbols with a known unit in its columns. */
  readonly bases: readonly string[];
  readonly columns: readonly string[];
  readonly matrix: readonly (readonly Rational[])[];
  readonly rank: number;
  /** Symbols of which every group has exactly one besides; empty where the groups have no common set. */
  readonly repeating: readonly string[];
  /** The dependent symbol's group first. Empty where a unit is missing, or nothing can be made dimensionless. */
  readonly groups: readonly Group[];
  readonly unmatched: readonly Unmatched[];
  readonly problems: readonly GroupsProblem[];
  /** How many sets of repeating symbols are valid. */
  readonly sets: SetCount;
}

/** `exact` false: the count was given up at its bound, and there are at least `count`. */
export interface SetCount {
  readonly count: number;
  readonly exact: boolean;
}
