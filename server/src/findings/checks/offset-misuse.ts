import type { Check } from '../check.ts';

export const offsetMisuse: Check = {
  code: 'offset-misuse',
  severity: 'error',
  summary: 'A temperature in °C or °F, or a gauge pressure, stands where only a difference or an absolute value makes sense.',
  claims: (fault) => fault.kind === 'point' || fault.kind === 'weight',
};
