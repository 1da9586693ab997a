import type { Check } from '../check.ts';

/** Found by the reader of notes, not by the solver. */
export const unreadableUnit: Check = {
  code: 'unreadable-unit',
  severity: 'warning',
  summary: 'A unit note that cannot be read.',
  claims: () => false,
};
