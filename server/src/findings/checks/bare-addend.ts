import type { Check } from '../check.ts';

export const bareAddend: Check = {
  code: 'bare-addend',
  severity: 'hint',
  summary: 'A bare number is added to a quantity and is read in its unit.',
  claims: (fault) => fault.kind === 'bare',
};
