/** For every code: something is offered beside silence, and what is offered settles it. */
import { expect, test } from 'vitest';
import type { FindingCode } from '../../server/src/findings/finding.ts';
import { codesOf, fixed, offers } from './offers.ts';

const given = 'from math import exp, sin\np = 2.0e5  # [Pa]\nh = 3.0  # [m]\nD = 0.2  # [m]\nV = 2.0  # [m/s]\nT = 20.0  # [degC]\na = 30.0  # [deg]\nn = 3  # [-]\n';

const cases: readonly (readonly [FindingCode, string])[] = [
  ['unlike-terms', 'x = V + h'],
  ['unlike-result', 'A = h*D*D  # [m^2]'],
  ['dimensioned-exponent', 'x = n**h'],
  ['dimensioned-argument', 'x = exp(h)'],
  ['scale-mismatch', 'x = sin(a)'],
  ['offset-misuse', 'x = T**2'],
  ['hidden-unit', 'q = 4.71*V  # [W/m^2]'],
  ['conflicting-notes', '# w [m]\nw = 3.0  # [s]'],
  ['unreadable-unit', 'k = 1.0  # [metrs/s]'],
  ['ambiguous-unit', 'k = 1.0  # [W/m K]'],
];

test.each(cases)('%s', (code, line) => {
  const text = given + line;
  const before = codesOf(text);
  expect(before).toContain(code);
  const fixes = offers(text).filter((fix) => fix.finding?.code === code && fix.edits.length > 0);
  expect(fixes.length).toBeGreaterThan(0);
  for (const fix of fixes) {
    const after = codesOf(fixed(text, fix));
    expect([fix.title, after.filter((each) => each === code).length]).toEqual([fix.title, before.filter((each) => each === code).length - 1]);
  }
});

test.each(cases)('%s can be allowed with a reason', (code, line) => {
  const text = given + line;
  const silent = offers(text, ['allow']).filter((fix) => fix.finding?.code === code);
  for (const fix of silent) expect(codesOf(fixed(text, fix))).not.toContain(code);
  expect(silent.length).toBe(1);
});
