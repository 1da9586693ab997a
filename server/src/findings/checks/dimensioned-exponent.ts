import { type Check, plain } from '../check.ts';

export const dimensionedExponent: Check = {
  code: 'dimensioned-exponent',
  severity: 'error',
  summary: 'An exponent has a dimension, or a dimensioned base has an exponent that is not constant.',
  claims: (fault) => plain(fault) && (fault.kind === 'varying-power' || (fault.kind === 'pure' && fault.constraint.reason.kind === 'exponent')),
};
