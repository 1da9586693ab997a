import type { Place } from '../text/span.ts';

export type Severity = 'error' | 'warning' | 'information' | 'hint';

export const findingCodes = [
  'unlike-terms', 'unlike-result', 'dimensioned-exponent', 'dimensioned-argument', 'scale-mismatch', 'offset-misuse',
  'hidden-unit', 'conflicting-notes', 'unreadable-unit', 'ambiguous-unit', 'bare-addend',
] as const;
export type FindingCode = (typeof findingCodes)[number];

/** A finding in sentences, ready to show; offsets through places. */
export interface Finding {
  readonly code: FindingCode;
  readonly severity: Severity;
  readonly place: Place;
  readonly message: string;
  readonly related: readonly { readonly place: Place; readonly message: string }[];
}
