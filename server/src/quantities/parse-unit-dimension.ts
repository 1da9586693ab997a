/** `dim L T^-1`: a dimension without a unit. */
import { baseDimensions, Dimension } from './dimension.ts';
import { Rational } from './rational.ts';
import type { UnitRead } from './unit-result.ts';
import { plainText } from './unit-text.ts';

const part = /([*·\s]*)(\/?)\s*(\()?\s*([A-Za-zΘθ]\w*|1)(?:\^?\(?([-+]?\d+(?:\.\d+)?(?:\/\d+)?)\)?)?\s*(\))?/y;

/** Reads `dim` and powers of base dimensions; names of other letters are a project's own base dimensions. Undefined where it cannot be read. */
export function readDimension(text: string): UnitRead | undefined {
  const body = plainText(text.trim().replace(/^dim(?:ension)?\s+/, '')).text.trim();
  let [dimension, at, below] = [Dimension.one, 0, false];
  while (at < body.length) {
    part.lastIndex = at;
    const match = part.exec(body);
    if (!match) return undefined;
    const [whole, , slash, open, name = '', digits = '1', close] = match;
    const power = Rational.parse(digits.replace('+', ''));
    const base = baseOf(name);
    if (!power || base === undefined) return undefined;
    const raised = base.pow(power);
    dimension = slash || below ? dimension.div(raised) : dimension.mul(raised);
    below = (below || (slash === '/' && open !== undefined)) && !close;
    at += whole.length;
  }
  return { ok: true, unit: { dimension, scale: undefined, text: text.trim() }, hints: [], beyondDoubt: true };
}

function baseOf(name: string): Dimension | undefined {
  if (name === '1') return Dimension.one;
  if (/^(?:Theta|θ|Θ)$/.test(name)) return Dimension.base('Θ');
  return name.length > 1 || (baseDimensions as readonly string[]).includes(name) ? Dimension.base(name) : undefined;
}
