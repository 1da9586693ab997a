import type { Anchor, Span } from '../text/span.ts';
import type { Literal } from './literal.ts';
import type { Misuse, NoteInForce, Value } from './value.ts';

/** Why two units have to agree: a closed union that wording turns into words. */
export type Reason =
  | { readonly kind: 'sum'; readonly op: '+' | '-' | '%' }
  | { readonly kind: 'comparison'; readonly op: string }
  | { readonly kind: 'choice'; readonly of: string }
  | { readonly kind: 'target'; readonly path: string; readonly note: NoteInForce }
  | { readonly kind: 'result'; readonly function: string; readonly note: NoteInForce }
  | { readonly kind: 'parameter'; readonly function: string; readonly name: string; readonly note: NoteInForce }
  | { readonly kind: 'inferred-parameter'; readonly function: string; readonly name: string }
  | { readonly kind: 'argument'; readonly function: string; readonly position: number; readonly name: string; readonly claim: string }
  | { readonly kind: 'alike'; readonly function: string; readonly positions: readonly [number, number] }
  | { readonly kind: 'exponent' }
  | { readonly kind: 'pure-argument'; readonly function: string; readonly gentle: boolean }
  | { readonly kind: 'conversion-edge'; readonly path: string; readonly note: NoteInForce };

/** Everything that must hold, in program order, each with its place and reason. */
export type Constraint =
  /** Both sides are counted in the same unit. */
  | { readonly kind: 'same'; readonly anchor: Anchor; readonly span: Span; readonly reason: Reason; readonly left: Value; readonly right: Value }
  /** Dimensionless. */
  | { readonly kind: 'pure'; readonly anchor: Anchor; readonly span: Span; readonly reason: Reason; readonly value: Value }
  /** A base under an exponent that is not constant. */
  | { readonly kind: 'varying-power'; readonly anchor: Anchor; readonly span: Span; readonly base: Value; readonly exponent: Value }
  /** A point on a scale where only a difference or an absolute value makes sense. */
  | { readonly kind: 'point'; readonly anchor: Anchor; readonly span: Span; readonly value: Value; readonly use: Misuse['use'] }
  /** A literal read in the unit of the term beside it. */
  | { readonly kind: 'bare'; readonly anchor: Anchor; readonly span: Span; readonly literal: Literal; readonly text: string; readonly beside: Value }
  /** Two notes on one symbol. */
  | { readonly kind: 'notes'; readonly anchor: Anchor; readonly span: Span; readonly path: string; readonly first: NoteInForce; readonly second: NoteInForce };

