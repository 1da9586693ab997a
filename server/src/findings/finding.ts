import type { FindingCode } from '../program/codes.ts';
import type { Place } from '../text/span.ts';

export type Severity = 'error' | 'warning' | 'information' | 'hint';

export { type FindingCode, findingCodes } from '../program/codes.ts';

/** A finding in sentences, ready to show; offsets through places. */
export interface Finding {
  readonly code: FindingCode;
  readonly severity: Severity;
  readonly place: Place;
  readonly message: string;
  readonly related: readonly { readonly place: Place; readonly message: string }[];
}
