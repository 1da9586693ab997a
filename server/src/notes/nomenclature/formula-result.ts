import type { Unit } from '../../quantities/unit.ts';
import type { Span } from '../../text/span.ts';
import type { Term } from './formula-term.ts';
import { refuse } from './no-value.ts';

/**
 * Whether a term may be counted in a unit; returns what is taken away, in SI units, for a unit with a zero of its own.
 * Refuses other dimensions, revolutions against radians, and what leaves it open which zero the number counts from.
 */
export function zeroFor(term: Term, unit: Unit, span: Span): number {
  if (unit.dimension !== term.dimension) return refuse({ kind: 'unlike', span });
  if (turnsOtherwise(term, unit)) return refuse({ kind: 'rotation', span });
  const { points, absolutes, gauges, gaugeOpen, difference } = term;
  if (unit.offset?.kind === 'gauge') return gauges === 1 || gaugeOpen ? 0 : refuse({ kind: 'offset', span });
  if (gauges !== 0) return refuse({ kind: 'offset', span });
  if (!unit.offset) return points === 0 || points === 1 ? 0 : refuse({ kind: 'offset', span });
  if (points === 1 || (points === 0 && absolutes === 1)) return unit.offset.zero.toNumber();
  return points === 0 && difference ? 0 : refuse({ kind: 'offset', span });
}

/** Revolutions in a result that is counted in radians, or the other way. */
function turnsOtherwise({ rotation, pi }: Term, unit: Unit): boolean {
  if (!unit.rotation || pi) return false;
  const { radian, cycle } = unit.rotation;
  return (!radian.isZero && radian.equals(rotation.cycle) && rotation.radian.isZero) || (!cycle.isZero && cycle.equals(rotation.radian) && rotation.cycle.isZero);
}
