/** What a number's text says of it: exactly meant or rounded, pure or perhaps carrying a unit. */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { addLiterals, exactLiteral, invertLiteral, literalNumber, multiplyLiterals, raiseLiteral, readLiteral, simpleExponent } from '../../server/src/constraints/literal.ts';
import { Rational } from '../../server/src/quantities/rational.ts';

const read = (text: string) => readLiteral(Rational.parse(text) as Rational, text);

describe('numbers that are pure', () => {
  test.each(['1', '2', '4', '12', '16', '0.5', '0.25', '1.5', '2.0', '0.8', '1.2', '2.5', '3.6', '3.14159', '0.7854'])('%s', (text) => expect(read(text).pure).toBe(true));
  test.each(['17', '1000', '998.2', '9.81', '0.0018', '10.67', '10.2', '6.2', '6.5', '4.5', '1.486', '0.62', '287.05'])('%s may carry a unit', (text) => expect(read(text).pure).toBe(false));
});

describe('how exactly a number is meant', () => {
  test.each([['1000', 0], ['60', 0], ['3600', 0], ['0.001', 0], ['1e5', 0], ['12.0', 0.5 / 120], ['3412', 0.5 / 3412], ['9550', 0.5 / 955], ['0.3048', 0.5 / 3048], ['32.2', 0.5 / 322], ['745.7', 0.5 / 7457]] as const)('%s within %d', (text, tolerance) => {
    expect(read(text).tolerance).toBeCloseTo(tolerance, 12);
  });
});

describe('pi in digits', () => {
  // π to 30 digits: ISO 80000-2
  test.each([['3.14159', 1, 1], ['3.1416', 1, 1], ['6.2832', 2, 1], ['0.7854', 0.25, 1], ['57.2958', 180, -1], ['0.0174533', 1 / 180, 1]] as const)('%s', (text, size, pi) => {
    expect([read(text).value.toNumber(), read(text).pi]).toEqual([size, pi]);
  });
  test.each(['3.2', '3', '22', '3.15'])('%s is none', (text) => expect(read(text).pi).toBe(0));
});

describe('exponents', () => {
  test.each([['0.333', '1/3'], ['0.6667', '2/3'], ['0.5', '1/2'], ['0.8', '4/5'], ['0.38', '19/50'], ['1.852', '463/250']])('%s is %s', (text, exponent) => {
    expect(String(simpleExponent(read(text)))).toBe(exponent);
  });
});

describe('arithmetic is exact', () => {
  const number = fc.tuple(fc.integer({ min: -500, max: 500 }).filter((n) => n !== 0), fc.integer({ min: 1, max: 60 })).map(([above, below]) => exactLiteral(Rational.of(above, below)));

  test('a product over a factor is the other', () => {
    fc.assert(fc.property(number, number, (a, b) => {
      const inverse = invertLiteral(b);
      expect(inverse && multiplyLiterals(multiplyLiterals(a, b), inverse).value.equals(a.value)).toBe(true);
    }));
  });

  test('sums commute', () => {
    fc.assert(fc.property(number, number, (a, b) => {
      expect(addLiterals(a, b)?.value.equals((addLiterals(b, a) as typeof a).value)).toBe(true);
    }));
  });

  test('a root of a square is the size', () => {
    fc.assert(fc.property(number, (a) => {
      const square = raiseLiteral(a, Rational.of(2));
      const root = square && raiseLiteral(square, Rational.of(1, 2));
      expect(root && literalNumber(root)).toBeCloseTo(Math.abs(literalNumber(a)), 9);
    }));
  });

  test('zero has no inverse, and two has no rational root', () => {
    expect(invertLiteral(exactLiteral(Rational.zero))).toBeUndefined();
    expect(raiseLiteral(exactLiteral(Rational.of(2)), Rational.of(1, 2))).toBeUndefined();
  });
});
