/** Reads the notation in which kinds of quantity and characteristic numbers are written down as data. */
import { Dimension } from '../quantities/dimension.ts';
import { Rational } from '../quantities/rational.ts';
import { Scale } from '../quantities/scale.ts';

/** A dimension such as `M L^-1 T^-2`; `1` for none. Throws RangeError, since it reads the project's own data only. */
export function dimensionOf(text: string): Dimension {
  if (text === '1') return Dimension.one;
  return Dimension.from(
    text.split(' ').map((part) => {
      const [base, power] = part.split('^') as [string, string | undefined];
      return [base, rational(power ?? '1')] as const;
    }),
  );
}

/** Kinds and exponents of a product such as `density * velocity^2 / surface tension`. Every `/` divides by one factor. */
export function productOf(text: string): { kind: string; exponent: Rational }[] {
  const parts = text.split(/ ([*/]) /);
  return parts.flatMap((part, at) => {
    if (at % 2 === 1) return [];
    const [kind, power] = part.split('^') as [string, string | undefined];
    const exponent = rational(power ?? '1');
    return [{ kind, exponent: parts[at - 1] === '/' ? exponent.neg() : exponent }];
  });
}

/** A numerical factor such as `1/18`, `4/pi`, `pi^2/4`, `2^1/2` (the root of two). */
export function factorOf(text: string): Scale {
  const root = /^(\d+)\^(-?\d+\/\d+)$/.exec(text);
  if (root) return Scale.of(rational(root[1] as string)).pow(rational(root[2] as string));
  const [above = '1', below = '1'] = text.split('/');
  return partOf(above).div(partOf(below));
}

function partOf(text: string): Scale {
  return text.split('*').reduce((product, part) => {
    const [base, power = '1'] = part.split('^') as [string, string | undefined];
    const scale = base === 'pi' ? Scale.pi : Scale.of(rational(base));
    return product.mul(scale.pow(rational(power)));
  }, Scale.one);
}

function rational(text: string): Rational {
  const value = Rational.parse(text);
  if (!value) throw new RangeError(`not a rational number: ${text}`);
  return value;
}
