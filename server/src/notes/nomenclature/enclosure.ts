/**
 * The range of a formula over ranges of its symbols.
 *
 * Interval arithmetic over the formula encloses the range, and is exact where every ranged symbol is read once. For a symbol read more
 * than once the slope is enclosed too (forward differentiation in intervals): where it keeps its sign, the ends of the
 * range lie at the ends of the symbol, and each end of the result is computed there. What is left undecided is halved a few times
 * and the enclosures of the parts are joined (R. E. Moore, R. B. Kearfott, M. J. Cloud, Introduction to Interval Analysis, SIAM, 2009).
 */
import type { Elementary } from './elementary.ts';
import { type Node, readingsOf } from './formula-node.ts';
import { type Interval, IntervalArithmetic, isPoint, pointAt } from './interval.ts';
import { type Box, evaluate, type Undefined } from './natural.ts';
import { slopeOf } from './slope.ts';

export interface Enclosure extends Interval {
  /** The ends are reached; otherwise the range may be a little narrower than stated. */
  readonly sharp: boolean;
}

const mostHalvings = 7;

/** Encloses the formula over the box; plain values give a plain value. */
export function enclose(root: Node, box: Box, elementary: Elementary): Enclosure | Undefined {
  const ranged = [...box].filter(([, each]) => !isPoint(each)).map(([name]) => name);
  const readings = readingsOf(root);
  const repeated = ranged.filter((name) => (readings.get(name) ?? 0) > 1);
  return part(root, only(box, readings), repeated, new IntervalArithmetic(elementary, ranged.some((name) => readings.has(name))), mostHalvings);
}

/** The symbols that the formula reads. */
function only(box: Box, readings: ReadonlyMap<string, number>): Box {
  return new Map([...box].filter(([name]) => readings.has(name)));
}

function part(root: Node, box: Box, repeated: readonly string[], arithmetic: IntervalArithmetic, halvings: number): Enclosure | Undefined {
  const whole = evaluate(root, box, arithmetic);
  if ('undefinedAt' in whole) return halvings > 0 && repeated.length > 0 ? halved(root, box, repeated, arithmetic, halvings) : whole;
  if (repeated.length === 0) return { ...whole, sharp: true };
  const [low, high] = [towards('low', root, box, arithmetic), towards('high', root, box, arithmetic)];
  const undecided = repeated.filter((name) => [low, high].some((end) => !isPoint(end.get(name) as Interval)));
  if (undecided.length > 0 && halvings > 0) return halved(root, box, undecided, arithmetic, halvings);
  const ends = [evaluate(root, low, arithmetic), evaluate(root, high, arithmetic)] as const;
  if ('undefinedAt' in ends[0] || 'undefinedAt' in ends[1]) return { ...whole, sharp: false };
  return { low: ends[0].low, high: ends[1].high, sharp: undecided.length === 0 };
}

/** The box narrowed to where the least or greatest value lies: one symbol after the other, as its slope keeps its sign in what is left. */
function towards(end: 'low' | 'high', root: Node, box: Box, arithmetic: IntervalArithmetic): Box {
  const left = new Map(box);
  for (let before = -1, decided = 0; before !== decided; ) {
    before = decided;
    for (const [name, given] of left) {
      if (isPoint(given)) continue;
      const slope = slopeOf(root, name, left, arithmetic);
      if (!slope || (slope.low < 0 && slope.high > 0)) continue;
      left.set(name, pointAt((slope.low >= 0) === (end === 'low') ? given.low : given.high));
      decided++;
    }
  }
  return left;
}

/** Halves the widest of the undecided symbols and joins what the halves give. */
function halved(root: Node, box: Box, undecided: readonly string[], arithmetic: IntervalArithmetic, halvings: number): Enclosure | Undefined {
  const widest = undecided.reduce((a, b) => (relativeWidth(box.get(a)) >= relativeWidth(box.get(b)) ? a : b));
  const { low, high } = box.get(widest) as Interval;
  const middle = low + (high - low) / 2;
  const repeated = (half: Interval): readonly string[] => undecided.filter((name) => name !== widest || !isPoint(half));
  const halves = [{ low, high: middle }, { low: middle, high }].map((half) => part(root, new Map(box).set(widest, half), repeated(half), arithmetic, halvings - 1));
  const failed = halves.find((each): each is Undefined => 'undefinedAt' in each);
  if (failed) return failed;
  const [a, b] = halves as [Enclosure, Enclosure];
  const sharpLow = a.low === b.low ? a.sharp || b.sharp : a.low < b.low ? a.sharp : b.sharp;
  const sharpHigh = a.high === b.high ? a.sharp || b.sharp : a.high > b.high ? a.sharp : b.sharp;
  return { low: Math.min(a.low, b.low), high: Math.max(a.high, b.high), sharp: sharpLow && sharpHigh };
}

function relativeWidth(a: Interval | undefined): number {
  return a ? (a.high - a.low) / Math.max(Math.abs(a.low), Math.abs(a.high)) : 0;
}
