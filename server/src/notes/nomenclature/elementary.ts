/** The elementary functions of formulas, evaluated by mathjs. Loaded only where formulas are evaluated. */
import { acos, add, asin, atan, atan2, cbrt, cos, cosh, divide, erf, exp, log, log10, log2, multiply, pow, sin, sinh, sqrt, subtract, tan, tanh } from 'mathjs/number';

/** A real result; complex ones and infinities are not a number. */
function real(value: unknown): number {
  return typeof value === 'number' && Number.isFinite(value) ? value : Number.NaN;
}

/** Point evaluation: real numbers in, a real number or NaN out. */
export const elementary = {
  add: (a: number, b: number): number => real(add(a, b)),
  subtract: (a: number, b: number): number => real(subtract(a, b)),
  multiply: (a: number, b: number): number => real(multiply(a, b)),
  divide: (a: number, b: number): number => real(divide(a, b)),
  power: (a: number, b: number): number => real(pow(a, b)),
  atan2: (y: number, x: number): number => real(atan2(y, x)),
  of: {
    sqrt: (x: number) => real(sqrt(x)),
    cbrt: (x: number) => real(cbrt(x)),
    exp: (x: number) => real(exp(x)),
    ln: (x: number) => real(log(x)),
    lg: (x: number) => real(log10(x)),
    lb: (x: number) => real(log2(x)),
    sin: (x: number) => real(sin(x)),
    cos: (x: number) => real(cos(x)),
    tan: (x: number) => real(tan(x)),
    asin: (x: number) => real(asin(x)),
    acos: (x: number) => real(acos(x)),
    atan: (x: number) => real(atan(x)),
    sinh: (x: number) => real(sinh(x)),
    cosh: (x: number) => real(cosh(x)),
    tanh: (x: number) => real(tanh(x)),
    erf: (x: number) => real(erf(x)),
  },
};

export type Elementary = typeof elementary;
export type ElementaryName = keyof Elementary['of'];
