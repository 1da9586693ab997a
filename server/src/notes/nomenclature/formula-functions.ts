import { Dimension } from '../../quantities/dimension.ts';
import { Rational } from '../../quantities/rational.ts';
import type { Span } from '../../text/span.ts';
import type { ElementaryName } from './elementary.ts';
import { sameUnit } from '../../quantities/unit.ts';
import { countable, inUnitOf, isCounted, power, sum, type Term, termOf } from './formula-term.ts';
import { refuse } from './no-value.ts';

const radian = { radian: Rational.one, cycle: Rational.zero };

interface Elementary {
  readonly name: ElementaryName;
  /** The result is an angle. */
  readonly angle?: true;
}

/** Functions of a pure number. Names: ISO 80000-2, and common practice in scripts (`log` is the natural logarithm there). */
const pure: Readonly<Record<string, Elementary>> = {
  exp: { name: 'exp' }, ln: { name: 'ln' }, log: { name: 'ln' }, lg: { name: 'lg' }, log10: { name: 'lg' }, lb: { name: 'lb' }, log2: { name: 'lb' },
  sin: { name: 'sin' }, cos: { name: 'cos' }, tan: { name: 'tan' }, sinh: { name: 'sinh' }, cosh: { name: 'cosh' }, tanh: { name: 'tanh' }, erf: { name: 'erf' },
  asin: { name: 'asin', angle: true }, arcsin: { name: 'asin', angle: true }, acos: { name: 'acos', angle: true }, arccos: { name: 'acos', angle: true },
  atan: { name: 'atan', angle: true }, arctan: { name: 'atan', angle: true },
};

/** The term that a call stands for; refuses functions that have no meaning here. */
export function applied(name: string, args: readonly Term[], span: Span): Term {
  const [first, second] = args;
  const elementary = Object.hasOwn(pure, name) ? pure[name] : undefined;
  if (!first || (elementary && second)) return refuse({ kind: 'unknown-function', name, span });
  if (elementary) {
    if (!first.dimension.isOne) refuse({ kind: 'unlike', span });
    return termOf({ kind: 'function', name: elementary.name, argument: first.node, span }, Dimension.one, elementary.angle ? radian : undefined);
  }
  switch (name) {
    case 'sqrt':
      return { ...power(first, Rational.of(1, 2), span), node: { kind: 'function', name: 'sqrt', argument: first.node, span } };
    case 'cbrt':
      return { ...power(first, Rational.of(1, 3), span), node: { kind: 'function', name: 'cbrt', argument: first.node, span } };
    case 'abs':
      return { ...countable(first, span), literal: undefined, node: { kind: 'abs', argument: first.node } };
    case 'min':
    case 'max':
      return args.slice(1).reduce((most, each) => extreme(name, most, each, span), first);
    case 'hypot': {
      if (!second) break;
      const squares = sum(power(plain(first), Rational.of(2), span), power(plain(second), Rational.of(2), span), 1, span);
      return { ...power(squares, Rational.of(1, 2), span), node: { kind: 'function', name: 'sqrt', argument: squares.node, span } };
    }
    case 'atan2':
      if (!second) break;
      if (first.dimension !== second.dimension) refuse({ kind: 'unlike', span });
      return termOf({ kind: 'atan2', y: countable(first, span).node, x: countable(second, span).node, span }, Dimension.one, radian);
    case 'erfc':
      return sum(termOf({ kind: 'number', value: 1 }, Dimension.one), applied('erf', args, span), -1, span);
  }
  return refuse({ kind: 'unknown-function', name, span });
}

function plain(term: Term): Term {
  return { ...term, literal: undefined };
}

/** The smaller or greater of two like terms; a bare number is read in the unit of the other. */
function extreme(which: 'min' | 'max', left: Term, right: Term, span: Span): Term {
  const [a, b] = [beside(left, right, span), beside(right, left, span)];
  if (a.dimension !== b.dimension) refuse({ kind: 'unlike', span });
  if (a.points !== b.points || a.gauges !== b.gauges) refuse({ kind: 'offset', span });
  return { ...a, literal: undefined, unit: a.unit && b.unit && sameUnit(a.unit, b.unit) ? a.unit : undefined, difference: a.difference && b.difference, node: { kind: 'extreme', which, args: [a.node, b.node] } };
}

function beside(term: Term, other: Term, span: Span): Term {
  return term.literal && !other.literal && isCounted(other) ? inUnitOf(other, term.literal, span) : term;
}
