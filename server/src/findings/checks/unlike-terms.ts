import { type Check, plain } from '../check.ts';

const reasons = new Set(['sum', 'comparison', 'choice', 'alike']);

export const unlikeTerms: Check = {
  code: 'unlike-terms',
  severity: 'error',
  summary: 'Terms that are added, subtracted, compared or chosen between differ in dimension.',
  claims: (fault) => fault.kind === 'dimension' && plain(fault) && reasons.has(fault.constraint.reason.kind),
};
