import type { FindingCode } from '../program/codes.ts';
import type { Place } from '../text/span.ts';

export type Severity = 'error' | 'warning' | 'information' | 'hint';

/** What a check may be set to. */
export type Level = Severity | 'off';

export const levels: readonly Level[] = ['error', 'warning', 'information', 'hint', 'off'];

export { type FindingCode, findingCodes } from '../program/codes.ts';

/** A finding in sentences, ready to show; offsets through places. */
export interface Finding {
  readonly code: FindingCode;
  readonly severity: Severity;
  readonly place: Place;
  readonly message: string;
  readonly related: readonly { readonly place: Place; readonly message: string }[];
}
