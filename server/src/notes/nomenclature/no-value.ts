import type { Span } from '../../text/span.ts';

/** Why a formula has no value: what stands in the way, and where in the file. */
export type NoValue = { readonly span: Span } & (
  /** A symbol that the file does not hold. */
  | { readonly kind: 'unknown-symbol'; readonly symbol: string }
  /** A symbol without a value or a range. */
  | { readonly kind: 'no-value'; readonly symbol: string }
  /** A symbol without a unit, with one that cannot be read, or one whose size is not known (levels, alternatives). */
  | { readonly kind: 'no-unit'; readonly symbol: string }
  /** The formula leads back to itself. */
  | { readonly kind: 'circle'; readonly symbol: string }
  | { readonly kind: 'too-long' }
  | { readonly kind: 'unlike' }
  | { readonly kind: 'exponent' }
  /** A temperature on a scale of its own or a gauge pressure is used as if it counted from zero. */
  | { readonly kind: 'offset' }
  /** Revolutions against radians. */
  | { readonly kind: 'rotation' }
  | { readonly kind: 'unknown-function'; readonly name: string }
  /** A division by zero, a root or a logarithm without a real value, for some value of the symbols. */
  | { readonly kind: 'undefined' }
);

/** Thrown inside the evaluation and caught at its edge. */
export class Refusal extends Error {
  constructor(readonly reason: NoValue) {
    super(reason.kind);
  }
}

/** Ends the evaluation of one formula. */
export function refuse(reason: NoValue): never {
  throw new Refusal(reason);
}
