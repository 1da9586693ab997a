/** Random rationals, dimensions and units for property tests. */
import fc from 'fast-check';
import { baseDimensions, Dimension } from '../../server/src/quantities/dimension.ts';
import { Rational } from '../../server/src/quantities/rational.ts';
import { Scale } from '../../server/src/quantities/scale.ts';

export const rationals = fc.tuple(fc.bigInt(-1000n, 1000n), fc.bigInt(1n, 60n)).map(([num, den]) => Rational.of(num, den));

/** Exponents as they occur: whole ones and small fractions. */
export const exponents = fc.constantFrom(...[-4, -3, -2, -1, 1, 2, 3, 4].map((power) => Rational.of(power)), Rational.of(1, 2), Rational.of(-1, 2), Rational.of(1, 3), Rational.of(-2, 3));

export const dimensions = fc.uniqueArray(fc.tuple(fc.constantFrom(...baseDimensions), exponents), { maxLength: 4, selector: ([base]) => base }).map((entries) => Dimension.from(entries));

export const scales = fc.tuple(fc.bigInt(1n, 5000n), fc.bigInt(1n, 5000n), fc.integer({ min: -2, max: 2 })).map(([num, den, pi]) => Scale.of(Rational.of(num, den), Rational.of(pi)));

/** Symbols of units without a zero of their own. */
export const symbols = fc.constantFrom('m', 'kg', 's', 'K', 'Pa', 'kPa', 'N', 'W', 'J', 'ft', 'lb', 'lbf', 'h', 'BTU', 'L', 'mol', 'A', 'V', 'psi', 'mm', 'g', 'gal', 'hp', 'bar', 'min');
