import { expect, test } from 'vitest';
import { becomes, codesOf, fixed, offers } from './offers.ts';

const given = 'p = 2.1e5  # [Pa]\nh = 3.0  # [m]\n';

test('at the end of the line, the reason to be filled in', () => {
  const text = `${given}total = p + h\n`;
  expect(becomes(text, ['allow'])).toEqual(['choice: total = p + h  # termwise: allow unlike-terms — state the reason']);
  const [fix] = offers(text, ['allow']);
  const after = fixed(text, fix as NonNullable<typeof fix>);
  expect(after.slice(fix?.fill?.start, fix?.fill?.end)).toBe('state the reason');
  expect(codesOf(after)).toEqual([]);
});

test.each([
  ['a comment in the line', 'total = p + h  # sum of both\n', '# termwise: allow unlike-terms — state the reason'],
  ['several lines', 'total = (p +\n         h)\n', '# termwise: allow unlike-terms — state the reason'],
  ['indented', 'if p > 0:\n    total = p + h  # both\n', '# termwise: allow unlike-terms — state the reason'],
])('above the line: %s', (_, code, expected) => {
  const text = given + code;
  expect(becomes(text, ['allow'])).toEqual([`choice: ${expected}`]);
  expect(codesOf(fixed(text, offers(text, ['allow'])[0] as never))).toEqual([]);
});

test('never in documentation, and not between lines joined by a backslash', () => {
  expect(offers('def f(x):\n    """Twice.\n\n    Parameters\n    ----------\n    x : float\n        Width [metrs/s]\n    """\n    return 2*x\n', ['allow'])).toEqual([]);
  expect(offers(`${given}total = \\\n    p + h \\\n    - h\n`, ['allow']).length).toBe(0);
});
