import type { Span } from '../../text/span.ts';
import type { Node } from './formula-node.ts';
import { type Interval, type IntervalArithmetic, pointAt } from './interval.ts';

/** What each symbol ranges over, in its coherent SI unit. */
export type Box = ReadonlyMap<string, Interval>;

/** A part of the formula that has no value for some values of its symbols. */
export interface Undefined {
  readonly undefinedAt: Span | undefined;
}

/** The natural interval extension: every operation on the intervals of its operands. */
export function evaluate(root: Node, box: Box, arithmetic: IntervalArithmetic): Interval | Undefined {
  const known = new Map<Node, Interval>();
  const failed: { at?: Span } = {};
  const value = valueOf(root, box, arithmetic, known, failed);
  return value ?? { undefinedAt: failed.at };
}

type Known = Map<Node, Interval>;

/** The value of a node, kept in `known`; the first node without one leaves its span in `failed`. */
export function valueOf(node: Node, box: Box, arithmetic: IntervalArithmetic, known: Known, failed: { at?: Span }): Interval | undefined {
  const before = known.get(node);
  if (before) return before;
  const value = compute(node, box, arithmetic, (below) => valueOf(below, box, arithmetic, known, failed));
  if (value) known.set(node, value);
  else if (!failed.at && 'span' in node) failed.at = node.span;
  return value;
}

function compute(node: Node, box: Box, arithmetic: IntervalArithmetic, of: (node: Node) => Interval | undefined): Interval | undefined {
  const both = (left: Node, right: Node, combine: (a: Interval, b: Interval) => Interval | undefined): Interval | undefined => {
    const [a, b] = [of(left), of(right)];
    return a && b && combine(a, b);
  };
  const one = (below: Node, apply: (a: Interval) => Interval | undefined): Interval | undefined => {
    const a = of(below);
    return a && apply(a);
  };
  switch (node.kind) {
    case 'number':
      return pointAt(node.value);
    case 'variable':
      return box.get(node.name);
    case 'sum':
      return both(node.left, node.right, (a, b) => (node.sign === 1 ? arithmetic.add(a, b) : arithmetic.subtract(a, b)));
    case 'product':
      return both(node.left, node.right, (a, b) => arithmetic.multiply(a, b));
    case 'quotient':
      return both(node.left, node.right, (a, b) => arithmetic.divide(a, b));
    case 'power':
      return one(node.base, (a) => arithmetic.power(a, node.exponent));
    case 'exponential':
      return both(node.base, node.exponent, (a, b) => arithmetic.exponential(a, b));
    case 'function':
      return one(node.argument, (a) => arithmetic.function(node.name, a));
    case 'abs':
      return one(node.argument, (a) => arithmetic.abs(a));
    case 'extreme': {
      const all = node.args.map(of);
      return all.every((each) => each !== undefined) ? arithmetic.extreme(node.which, all) : undefined;
    }
    case 'atan2':
      return both(node.y, node.x, (y, x) => arithmetic.atan2(y, x));
  }
}
