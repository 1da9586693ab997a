import type { Check } from '../check.ts';

export const hiddenUnit: Check = {
  code: 'hidden-unit',
  severity: 'warning',
  summary: 'The formula would be right only if a bare number in it carried a unit.',
  claims: (fault) => (fault.kind === 'dimension' || fault.kind === 'pure' || fault.kind === 'varying-power') && fault.hidden,
};
