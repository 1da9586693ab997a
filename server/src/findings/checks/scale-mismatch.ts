import type { Check } from '../check.ts';

export const scaleMismatch: Check = {
  code: 'scale-mismatch',
  severity: 'error',
  summary: 'Two values of one dimension are counted in different units, with no conversion in between.',
  claims: (fault) => fault.kind === 'scale',
};
