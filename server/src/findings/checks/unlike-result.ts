import { type Check, plain } from '../check.ts';

const reasons = new Set(['target', 'result', 'parameter', 'inferred-parameter', 'argument', 'conversion-edge']);

export const unlikeResult: Check = {
  code: 'unlike-result',
  severity: 'error',
  summary: 'A value differs in dimension from the note on its target, return or parameter.',
  claims: (fault) => fault.kind === 'dimension' && plain(fault) && reasons.has(fault.constraint.reason.kind),
};
