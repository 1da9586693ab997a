import { Rational } from '../../quantities/rational.ts';
import type { Span } from '../../text/span.ts';
import type { ElementaryName } from './elementary.ts';
import type { Node } from './formula-node.ts';
import type { Interval, IntervalArithmetic } from './interval.ts';
import { type Box, valueOf } from './natural.ts';

const zero: Interval = { low: 0, high: 0 };
const one: Interval = { low: 1, high: 1 };

/** Encloses the derivative of a formula by one of its symbols over a box; undefined where it cannot be bounded. */
export function slopeOf(root: Node, name: string, box: Box, arithmetic: IntervalArithmetic): Interval | undefined {
  return new Slope(name, box, arithmetic).of(root);
}

class Slope {
  private readonly values = new Map<Node, Interval>();
  private readonly slopes = new Map<Node, Interval>();
  private readonly failed: { at?: Span } = {};

  constructor(
    private readonly name: string,
    private readonly box: Box,
    private readonly by: IntervalArithmetic,
  ) {}

  of(node: Node): Interval | undefined {
    const known = this.slopes.get(node);
    if (known) return known;
    const slope = this.compute(node);
    if (slope) this.slopes.set(node, slope);
    return slope;
  }

  private value(node: Node): Interval | undefined {
    return valueOf(node, this.box, this.by, this.values, this.failed);
  }

  private compute(node: Node): Interval | undefined {
    switch (node.kind) {
      case 'number':
        return zero;
      case 'variable':
        return node.name === this.name ? one : zero;
      case 'sum':
        return pair(this.of(node.left), this.of(node.right), (a, b) => (node.sign === 1 ? this.by.add(a, b) : this.by.subtract(a, b)));
      case 'product':
        return this.plus(this.times(this.of(node.left), this.value(node.right)), this.times(this.value(node.left), this.of(node.right)));
      case 'quotient':
        return this.quotient(node.left, node.right, node);
      case 'power':
        return this.powerSlope(node.base, node.exponent);
      case 'exponential':
        return this.exponentialSlope(node, node.base, node.exponent);
      case 'function':
        return this.chain(node.argument, (x) => this.derivative(node.name, x, this.value(node)));
      case 'abs':
        return this.chain(node.argument, (x) => (x.low >= 0 ? one : x.high <= 0 ? { low: -1, high: -1 } : { low: -1, high: 1 }));
      case 'extreme': {
        const all = node.args.map((each) => this.of(each));
        return all.every((each) => each !== undefined) ? { low: Math.min(...all.map((each) => each.low)), high: Math.max(...all.map((each) => each.high)) } : undefined;
      }
      case 'atan2':
        return this.angleSlope(node.y, node.x);
    }
  }

  private times(a: Interval | undefined, b: Interval | undefined): Interval | undefined {
    return a === zero || b === zero ? zero : pair(a, b, (x, y) => this.by.multiply(x, y));
  }

  private plus(a: Interval | undefined, b: Interval | undefined): Interval | undefined {
    return a === zero ? b : b === zero ? a : pair(a, b, (x, y) => this.by.add(x, y));
  }

  private over(a: Interval | undefined, b: Interval | undefined): Interval | undefined {
    return pair(a, b, (x, y) => this.by.divide(x, y));
  }

  /** `(a/b)' = (a' - (a/b)·b')/b`. */
  private quotient(left: Node, right: Node, node: Node): Interval | undefined {
    const carried = this.times(this.value(node), this.of(right));
    return this.over(pair(this.of(left), carried, (a, b) => this.by.subtract(a, b)), this.value(right));
  }

  private powerSlope(base: Node, exponent: Rational): Interval | undefined {
    return this.chain(base, (x) => {
      const lowered = this.by.power(x, exponent.sub(Rational.one));
      const factor = exponent.toNumber();
      return this.times({ low: factor, high: factor }, lowered);
    });
  }

  /** `(a^b)' = a^b·(b'·ln a + b·a'/a)`. */
  private exponentialSlope(node: Node, base: Node, exponent: Node): Interval | undefined {
    const [a, b] = [this.value(base), this.value(exponent)];
    const logarithm = a && this.by.function('ln', a);
    return this.times(this.value(node), this.plus(this.times(this.of(exponent), logarithm), this.times(b, this.over(this.of(base), a))));
  }

  /** `atan2(y, x)' = (x·y' - y·x')/(x² + y²)`. */
  private angleSlope(y: Node, x: Node): Interval | undefined {
    const [top, side] = [this.value(y), this.value(x)];
    const two = Rational.of(2);
    const above = pair(this.times(side, this.of(y)), this.times(top, this.of(x)), (a, b) => this.by.subtract(a, b));
    return this.over(above, this.plus(side && this.by.power(side, two), top && this.by.power(top, two)));
  }

  private chain(argument: Node, outer: (x: Interval) => Interval | undefined): Interval | undefined {
    const inner = this.of(argument);
    if (inner === zero) return zero;
    const x = this.value(argument);
    return this.times(x && outer(x), inner);
  }

  /** The derivative of an elementary function over an interval; `y` is its value there. */
  private derivative(name: ElementaryName, x: Interval, y: Interval | undefined): Interval | undefined {
    const { by } = this;
    const inverse = (a: Interval | undefined): Interval | undefined => this.over(one, a);
    const square = (a: Interval): Interval | undefined => by.power(a, Rational.of(2));
    const scaled = (a: Interval | undefined, factor: number): Interval | undefined => this.times(a, { low: factor, high: factor });
    const less = (a: Interval | undefined): Interval | undefined => pair(one, a, (p, q) => by.subtract(p, q));
    switch (name) {
      case 'sqrt':
        return scaled(inverse(y), 0.5);
      case 'cbrt':
        return scaled(inverse(y && square(y)), 1 / 3);
      case 'exp':
        return y;
      case 'ln':
        return inverse(x);
      case 'lg':
        return scaled(inverse(x), 1 / Math.LN10);
      case 'lb':
        return scaled(inverse(x), 1 / Math.LN2);
      case 'sin':
        return by.function('cos', x);
      case 'cos':
        return scaled(by.function('sin', x), -1);
      case 'tan':
        return this.plus(one, y && square(y));
      case 'asin':
      case 'acos': {
        const below = less(square(x));
        const root = below && below.low > 0 ? by.function('sqrt', below) : undefined;
        return scaled(inverse(root), name === 'asin' ? 1 : -1);
      }
      case 'atan':
        return inverse(this.plus(one, square(x)));
      case 'sinh':
        return by.function('cosh', x);
      case 'cosh':
        return by.function('sinh', x);
      case 'tanh':
        return less(y && square(y));
      case 'erf': {
        const squared = square(x);
        return squared && scaled(by.function('exp', { low: -squared.high, high: -squared.low }), 2 / Math.sqrt(Math.PI));
      }
    }
  }
}

function pair(a: Interval | undefined, b: Interval | undefined, combine: (a: Interval, b: Interval) => Interval | undefined): Interval | undefined {
  return a && b && combine(a, b);
}
