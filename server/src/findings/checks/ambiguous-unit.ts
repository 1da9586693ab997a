import type { Check } from '../check.ts';

/** Found by the reader of notes, not by the solver. */
export const ambiguousUnit: Check = {
  code: 'ambiguous-unit',
  severity: 'hint',
  summary: 'A unit note whose reading depends on a convention.',
  claims: () => false,
};
