import { Dimension } from './dimension.ts';
import { Rational } from './rational.ts';
import { Scale } from './scale.ts';

const pieces = /([*/]?)\s*(pi|[\d.]+(?:e[+-]?\d+)?)(?:\^(-?\d+))?/giy;

/**
 * The exact scale that a product of decimal numbers and `pi` stands for: `0.45359237*9.80665`, `pi/180`.
 * Throws SyntaxError for anything else: catalogue entries are checked by a test, not by their readers.
 */
export function parseFactor(text: string): Scale {
  let result = Scale.one;
  let at = 0;
  const source = text.replace(/\s+/g, '');
  while (at < source.length) {
    pieces.lastIndex = at;
    const match = pieces.exec(source);
    if (!match) throw new SyntaxError(`factor cannot be read: ${text}`);
    const [whole, operator, number, power] = match;
    const value = (number as string).toLowerCase() === 'pi' ? Scale.pi : Scale.of(Rational.parse(number as string) as Rational);
    const raised = value.pow(Rational.of(Number(power ?? '1')));
    result = operator === '/' ? result.div(raised) : result.mul(raised);
    at += whole.length;
  }
  return result;
}

const bases: Record<string, string> = { m: 'L', kg: 'M', s: 'T', A: 'I', K: 'Θ', mol: 'N', cd: 'J' };

/** The dimension of a coherent unit written as powers of base units: `kg m^-1 s^-2`, or `1`. */
export function parseBaseProduct(text: string): Dimension {
  const entries = text.trim().split(/\s+/).filter((part) => part !== '1' && part !== '').map((part): [string, Rational] => {
    const [symbol, power = '1'] = part.split('^');
    const base = bases[symbol as string];
    const exponent = Rational.parse(power);
    if (!base || !exponent) throw new SyntaxError(`base units cannot be read: ${text}`);
    return [base, exponent];
  });
  return Dimension.from(entries);
}
