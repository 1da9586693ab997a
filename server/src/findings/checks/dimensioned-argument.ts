import { type Check, plain } from '../check.ts';

export const dimensionedArgument: Check = {
  code: 'dimensioned-argument',
  severity: 'error',
  summary: 'A function of a pure number (exp, sin, log …) is given a dimensioned value.',
  claims: (fault) => plain(fault) && fault.kind === 'pure' && fault.constraint.reason.kind === 'pure-argument',
  milder: (fault) => (fault.kind === 'pure' && fault.constraint.reason.kind === 'pure-argument' && fault.constraint.reason.gentle ? 'warning' : undefined),
};
