import type { Fault } from '../solver/fault.ts';
import type { Check } from './check.ts';
import { ambiguousUnit } from './checks/ambiguous-unit.ts';
import { bareAddend } from './checks/bare-addend.ts';
import { conflictingNotes } from './checks/conflicting-notes.ts';
import { dimensionedArgument } from './checks/dimensioned-argument.ts';
import { dimensionedExponent } from './checks/dimensioned-exponent.ts';
import { hiddenUnit } from './checks/hidden-unit.ts';
import { offsetMisuse } from './checks/offset-misuse.ts';
import { scaleMismatch } from './checks/scale-mismatch.ts';
import { unlikeResult } from './checks/unlike-result.ts';
import { unlikeTerms } from './checks/unlike-terms.ts';
import { unreadableUnit } from './checks/unreadable-unit.ts';

/** Every check, in the order of the documentation. */
export const checks: readonly Check[] = [
  unlikeTerms, unlikeResult, dimensionedExponent, dimensionedArgument, scaleMismatch, offsetMisuse,
  hiddenUnit, conflictingNotes, unreadableUnit, ambiguousUnit, bareAddend,
];

/** The check that a fault belongs to; a note's fault belongs where the first thing it explains does. */
export function checkOf(fault: Fault): Check | undefined {
  const telling = fault.kind === 'note' ? fault.faults[0] : fault;
  return telling && checks.find((check) => check.claims(telling));
}
