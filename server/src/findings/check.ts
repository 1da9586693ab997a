import type { Fault } from '../solver/fault.ts';
import type { FindingCode, Severity } from './finding.ts';

/** One check: which faults are its own. The page beside it (`<code>.md`) explains it to the reader. */
export interface Check {
  readonly code: FindingCode;
  readonly severity: Severity;
  /** One line, for the settings and the list of checks. */
  readonly summary: string;
  readonly claims: (fault: Fault) => boolean;
  /** Where a fault of this check is milder than the default. */
  readonly milder?: (fault: Fault) => Severity | undefined;
}

/** A fault between dimensions that no literal explains. */
export function plain(fault: Fault): boolean {
  return (fault.kind === 'dimension' || fault.kind === 'pure' || fault.kind === 'varying-power') && !fault.hidden;
}
