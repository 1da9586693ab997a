/** Functions that most languages have under one name, and ways around those they lack. */
import type { Expr } from '../../../server/src/program/nodes.ts';
import type { Said } from './host.ts';
import { binary, call, name, number } from './make.ts';

const shared = ['sqrt', 'exp', 'log', 'log10', 'sin', 'cos', 'tan', 'asin', 'acos', 'atan', 'atan2', 'sinh', 'cosh', 'tanh'];

/** The functions of the list under their own names with something before them. */
export function alike(prefix: string, ...more: readonly string[]): Readonly<Record<string, Said>> {
  return Object.fromEntries([...shared, ...more].map((each) => [each, prefix + each]));
}

/** The argument alone: `np.array([1, 2])` is the list. */
export function itself([only, ...others]: readonly Expr[]): Expr | undefined {
  return others.length === 0 ? only : undefined;
}

/** Degrees and radians by the factor. */
export function byFactor(pi: string): Readonly<Record<string, Said>> {
  const over = (top: Expr, bottom: Expr) => ([angle]: readonly Expr[]): Expr | undefined => angle && binary('/', binary('*', angle, top), bottom);
  return {
    radians: over(name(pi), number(180)), deg2rad: over(name(pi), number(180)),
    degrees: over(number(180), name(pi)), rad2deg: over(number(180), name(pi)),
  };
}

/** min and max of two values at a time. */
export function inPairs(callee: string): Said {
  return (args) => (args.length < 2 ? undefined : args.slice(1).reduce<Expr>((left, right) => call(callee, left, right), args[0] as Expr));
}

/** A function whose arguments stand in another order. */
export function ordered(callee: string, ...order: readonly number[]): Said {
  return (args) => (args.length === order.length ? call(callee, ...order.map((at) => args[at] as Expr)) : undefined);
}

/** A function with so many arguments. */
export function taking(callee: string, ...counts: readonly number[]): Said {
  return (args) => (counts.includes(args.length) ? call(callee, ...args) : undefined);
}

/** `float("inf")` and `float(x)`; `np.float64` alike. */
export function numberOf(infinity: string | Expr): Said {
  return ([only]) => (only?.kind === 'text' ? (/^[+]?inf/i.test(only.value) ? (typeof infinity === 'string' ? name(infinity) : infinity) : undefined) : only);
}
