import type { Check } from '../check.ts';

export const conflictingNotes: Check = {
  code: 'conflicting-notes',
  severity: 'warning',
  summary: 'Two notes on one symbol disagree.',
  claims: (fault) => fault.kind === 'notes',
};
