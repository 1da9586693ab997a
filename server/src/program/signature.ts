/** What a function does to units, as the nomenclature notation writes it: `trapezoid(y [?a], x [?b]) [?a ?b]`. */
import type { Rational } from '../quantities/rational.ts';
import type { Unit } from '../quantities/unit.ts';
import type { Span } from '../text/span.ts';

export interface Signature {
  /** Full dotted name as the host writes it, `numpy.trapezoid`; a method begins with a dot, `.mean`, and its first parameter is the object. */
  readonly name: string;
  readonly params: readonly SignatureParam[];
  /** Units of the results; empty: no claim. Several: a tuple. */
  readonly results: readonly UnitClaim[];
  readonly span: Span;
  readonly description?: string;
}

export interface SignatureParam {
  readonly name: string;
  readonly claim: UnitClaim;
  readonly optional: boolean;
  /** Takes all further positional arguments. */
  readonly rest: boolean;
}

/** What a signature says of one argument or result. */
export type UnitClaim =
  /** No bracket: nothing is claimed and nothing follows. */
  | { readonly kind: 'any' }
  /**
   * `[?a^2 m]`: a constant unit times powers of unit variables. `difference`: of two points on a scale, without a zero of its own.
   * `sum`: of as many members as there are, so that points on a scale leave it open which zero the result counts from.
   */
  | { readonly kind: 'unit'; readonly unit: Unit; readonly powers: readonly { readonly variable: string; readonly power: Rational }[]; readonly difference: boolean; readonly sum?: true }
  /** An argument that is itself a function: `f(x [?a]) [?b]`. */
  | { readonly kind: 'function'; readonly params: readonly UnitClaim[]; readonly results: readonly UnitClaim[] };

/** A library constant: `scipy.constants.g [m/s^2] = 9.80665`; `math.pi = pi`. */
export interface NamedConstant {
  readonly name: string;
  readonly unit: Unit | undefined;
  readonly value: Rational | undefined;
  /** Power of π that multiplies the value. */
  readonly pi: number;
  readonly span: Span;
}
