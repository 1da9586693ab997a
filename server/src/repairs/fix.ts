import type { TextEdit } from '../frontends/frontend.ts';
import type { Detected } from '../findings/collect.ts';
import type { FindingCode } from '../program/codes.ts';
import type { Span } from '../text/span.ts';
import type { Scene } from './scene.ts';

/**
 * `proven`: keeps the meaning, or the finding proves it; `likely`: what most authors meant; `choice`: one of several ways that
 * only the author can choose between. Nothing but `proven` is applied without being asked for.
 */
export type Confidence = 'proven' | 'likely' | 'choice';

export type FixKind = 'convert' | 'offset' | 'repair' | 'name-number' | 'empirical' | 'note' | 'allow' | 'regroup' | 'missing';

/** A change of the text that would settle a finding, as plain data. Offsets count in the file's text before any of the edits. */
export interface Fix {
  readonly kind: FixKind;
  readonly confidence: Confidence;
  /** Do not overlap. Empty where there is only something to say. */
  readonly edits: readonly TextEdit[];
  readonly says: Saying;
  /** How much it changes: the lower, the earlier it is offered. */
  readonly cost: number;
  /** Part of the text after the edits that the author has to fill in. */
  readonly fill?: Span;
  /** Silences the finding or states something new, so that checking the edited text proves nothing. */
  readonly unchecked?: true;
}

/** What a fix does, for the wording to put in a sentence. */
export type Saying =
  | { readonly what: 'rewrite'; readonly from: string; readonly to: string; readonly unit?: string }
  | { readonly what: 'note'; readonly symbol: string; readonly unit: string }
  | { readonly what: 'notes'; readonly count: number }
  | { readonly what: 'correct-note'; readonly symbol?: string; readonly from: string; readonly to: string; readonly uses?: readonly [agreeing: number, all: number] }
  | { readonly what: 'allow'; readonly code: FindingCode; readonly wide: boolean }
  | { readonly what: 'name-number'; readonly number: string; readonly name: string; readonly unit: string; readonly constant?: string }
  | { readonly what: 'empirical'; readonly units: string }
  | { readonly what: 'regroup'; readonly from: string; readonly to: string }
  | { readonly what: 'missing'; readonly unit: string; readonly kinds: readonly string[] };

/** One kind of fix. */
export interface Fixer {
  readonly kind: FixKind;
  /** The fixes of a finding, unchecked; the service checks each and drops what does not settle the finding. */
  readonly forFinding?: (detected: Detected, scene: Scene) => readonly Fix[];
  /** What is offered at a place without a finding. */
  readonly forPlace?: (span: Span, scene: Scene) => readonly Fix[];
}
