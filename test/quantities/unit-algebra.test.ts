import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Dimension } from '../../server/src/quantities/dimension.ts';
import { parseUnit } from '../../server/src/quantities/parse-unit.ts';
import { gcd, Rational } from '../../server/src/quantities/rational.ts';
import { Scale } from '../../server/src/quantities/scale.ts';
import { differenceOf, multiply, pureNumber, raise, sameUnit, scaledBy, type Unit } from '../../server/src/quantities/unit.ts';
import { dimensions, exponents, rationals, scales, symbols } from './arbitrary.ts';

const nonZero = rationals.filter((value) => !value.isZero);

describe('rationals are a field', () => {
  it('with sums and products that commute, associate and distribute', () => {
    fc.assert(fc.property(rationals, rationals, rationals, (a, b, c) => {
      expect(a.add(b).equals(b.add(a)) && a.mul(b).equals(b.mul(a))).toBe(true);
      expect(a.add(b).add(c).equals(a.add(b.add(c))) && a.mul(b).mul(c).equals(a.mul(b.mul(c)))).toBe(true);
      expect(a.mul(b.add(c)).equals(a.mul(b).add(a.mul(c)))).toBe(true);
      expect(a.sub(b).equals(b.sub(a).neg())).toBe(true);
      expect(a.compare(b)).toBe(a.sub(b).sign);
    }));
  });

  it('with inverses, reduced, positive below', () => {
    fc.assert(fc.property(nonZero, rationals, (a, b) => {
      expect(a.mul(a.inv()).isOne && b.div(a).mul(a).equals(b)).toBe(true);
      expect(a.den > 0n && gcd(a.num, a.den) === 1n).toBe(true);
      expect(Rational.parse(a.toString())?.equals(a)).toBe(true);
    }));
  });

  it('whose powers and roots undo each other', () => {
    fc.assert(fc.property(nonZero, fc.integer({ min: 1, max: 5 }), (a, n) => {
      const base = a.abs();
      expect(base.pow(n).root(n)?.equals(base)).toBe(true);
      expect(base.pow(-n).mul(base.pow(n)).isOne).toBe(true);
    }));
    expect(Rational.of(2).root(2)).toBeUndefined();
  });

  it.each([['12', '12'], ['-0.5', '-1/2'], ['1.5e-3', '3/2000'], ['3/4', '3/4'], ['.5', '1/2'], ['1e3', '1000']])('%s is read as %s', (text, wanted) => {
    expect(Rational.parse(text)?.toString()).toBe(wanted);
  });

  it.each(['', '-', '.', '1/0', '1e', 'x', '1 2', '0x10', '1e9999'])('%j is refused', (text) => {
    expect(Rational.parse(text)).toBeUndefined();
  });
});

describe('dimensions are a group, one object each', () => {
  it('with product, inverse and rational powers', () => {
    fc.assert(fc.property(dimensions, dimensions, dimensions, exponents, (a, b, c, power) => {
      expect(a.mul(b) === b.mul(a)).toBe(true);
      expect(a.mul(b).mul(c) === a.mul(b.mul(c))).toBe(true);
      expect(a.div(a) === Dimension.one).toBe(true);
      expect(a.mul(b).div(b) === a).toBe(true);
      expect(a.mul(b).pow(power) === a.pow(power).mul(b.pow(power))).toBe(true);
      expect(a.pow(power).pow(power.inv()) === a).toBe(true);
    }));
  });

  it('printed with mass first: pressure is M L⁻¹ T⁻²', () => {
    const pressure = parseUnit('Pa');
    expect(pressure.ok && pressure.unit.dimension.toString()).toBe('M L⁻¹ T⁻²');
    expect(Dimension.base('L').pow(Rational.of(1, 2)).toString()).toBe('L¹ᐟ²');
    expect(Dimension.one.toString()).toBe('1');
  });
});

describe('scales are a group, exactly', () => {
  it('with roots that are undone by powers', () => {
    fc.assert(fc.property(scales, scales, exponents, (a, b, power) => {
      expect(a.mul(b).equals(b.mul(a)) && a.mul(b).div(b).equals(a) && a.div(a).isOne).toBe(true);
      expect(a.pow(power).pow(power.inv()).equals(a)).toBe(true);
      expect(a.mul(b).pow(power).equals(a.pow(power).mul(b.pow(power)))).toBe(true);
      expect(Math.abs(a.pow(power).toNumber() / a.toNumber() ** power.toNumber() - 1)).toBeLessThan(1e-12);
    }));
  });

  it('tell apart what floating point would not', () => {
    const close = Scale.of(Rational.of(10n ** 20n + 1n, 10n ** 20n));
    expect(close.toNumber()).toBe(1);
    expect(close.isOne).toBe(false);
    expect(Scale.measuredAs(1.0000001, 1e-6).equals(Scale.one)).toBe(true);
    expect(() => Scale.of(Rational.zero)).toThrow(RangeError);
  });
});

describe('units are a group but for zeros and levels', () => {
  const units = symbols.map((symbol) => unitOf(symbol));

  it('with product and powers', () => {
    fc.assert(fc.property(units, units, exponents, (a, b, power) => {
      expect(sameUnit(multiply(a, b, ''), multiply(b, a, ''))).toBe(true);
      expect(sameUnit(multiply(multiply(a, b, ''), raise(b, Rational.minusOne, ''), ''), a)).toBe(true);
      expect(sameUnit(multiply(a, pureNumber, ''), a)).toBe(true);
      expect(sameUnit(raise(raise(a, power, ''), power.inv(), ''), a)).toBe(true);
      expect(sameUnit(raise(multiply(a, b, ''), power, ''), multiply(raise(a, power, ''), raise(b, power, ''), ''))).toBe(true);
    }));
  });

  it('a product has no zero and counts degrees instead', () => {
    const product = multiply(unitOf('degC'), unitOf('m'), '');
    expect(product.offset).toBeUndefined();
    expect(product.degrees?.isOne).toBe(true);
    expect(multiply(product, unitOf('1/degC'), '').degrees).toBeUndefined();
    expect(raise(unitOf('degC'), Rational.one, '').offset).toBeDefined();
    expect(sameUnit(multiply(unitOf('barg'), unitOf('m'), ''), multiply(unitOf('bar'), unitOf('m'), ''))).toBe(true);
  });

  it('the difference of two points is no point', () => {
    expect(differenceOf(unitOf('degF')).degrees?.isOne).toBe(true);
    expect(differenceOf(unitOf('degF')).offset).toBeUndefined();
    expect(differenceOf(unitOf('psig')).degrees).toBeUndefined();
    expect(differenceOf(unitOf('m')) === unitOf('m')).toBe(true);
  });

  it('a factor in front changes the scale only', () => {
    expect(sameUnit(scaledBy(unitOf('Pa'), Scale.of(Rational.of(1000)), ''), unitOf('kPa'))).toBe(true);
    expect(sameUnit(unitOf('rpm'), unitOf('1/min'))).toBe(false);
    expect(sameUnit(unitOf('degC'), unitOf('K'))).toBe(false);
    expect(sameUnit(unitOf('dim L'), unitOf('m'))).toBe(false);
  });
});

function unitOf(text: string): Unit {
  const result = parseUnit(text);
  if (!result.ok) throw new Error(`unread: '${text}'`);
  return result.unit;
}
