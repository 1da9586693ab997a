/** The codes of findings, which directives in comments name too. */
export const findingCodes = [
  'unlike-terms', 'unlike-result', 'dimensioned-exponent', 'dimensioned-argument', 'scale-mismatch', 'offset-misuse',
  'hidden-unit', 'conflicting-notes', 'unreadable-unit', 'ambiguous-unit', 'bare-addend',
] as const;
export type FindingCode = (typeof findingCodes)[number];
