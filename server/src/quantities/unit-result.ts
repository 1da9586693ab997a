import type { Span } from '../text/span.ts';
import type { Unit } from './unit.ts';

/** What came of reading a unit expression. Spans are relative to the text that was read. */
export type UnitResult = UnitRead | UnitUnread;

export interface UnitRead {
  readonly ok: true;
  readonly unit: Unit;
  /** Readings that depend on convention, with the unambiguous spelling. */
  readonly hints: readonly UnitHint[];
  /** True where the text has a mark of a unit (an operator, a power, a symbol that is no English word): for bare and parenthesised notes. */
  readonly beyondDoubt: boolean;
}

export interface UnitUnread {
  readonly ok: false;
  /** The characters that could not be read. */
  readonly span: Span;
  readonly reason: UnitFault;
  /** The nearest spelling that can be read, for the whole text. */
  readonly suggestion?: string;
  /** True where most of the text reads as a unit, so that this is a unit with a mistake and not a remark. */
  readonly triesToBeUnit: boolean;
}

/** Closed list of what can be wrong with a unit expression; wording turns it into a sentence. */
export type UnitFault =
  | { readonly kind: 'unknown-symbol'; readonly symbol: string }
  | { readonly kind: 'unexpected'; readonly found: string }
  | { readonly kind: 'missing-bracket' }
  | { readonly kind: 'bad-exponent'; readonly found: string }
  | { readonly kind: 'empty' };

export interface UnitHint {
  readonly span: Span;
  readonly kind: 'product-after-slash' | 'celsius-or-coulomb' | 'fahrenheit-or-farad' | 'rankine-or-gas' | 'prefix-or-product' | 'pound-mass-or-force' | 'case' | 'minute-or-minimum';
  /** How it was read, in unambiguous spelling. */
  readonly readAs: string;
}

/** Units and base dimensions that a project declares itself, on top of the catalogue. */
export interface Vocabulary {
  readonly units: ReadonlyMap<string, Unit>;
  /** Changes whenever the contents do; part of cache keys. */
  readonly fingerprint: string;
}

export const emptyVocabulary: Vocabulary = { units: new Map(), fingerprint: '' };

export interface ReadOptions {
  readonly vocabulary?: Vocabulary;
  /** The symbol and its description, which decide between °C and coulomb and the like. */
  readonly describes?: string;
}
