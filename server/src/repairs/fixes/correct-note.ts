/** Notes that cannot be read, can be read in two ways, contradict each other, or contradict what the formulas need. */
import { noteLeaves, sidesOf } from '../../solver/root-cause.ts';
import type { NoteInForce } from '../../constraints/value.ts';
import type { Detected } from '../../findings/collect.ts';
import type { Dimension } from '../../quantities/dimension.ts';
import { kindsOf } from '../../quantities/kinds.ts';
import { parseUnit } from '../../quantities/parse-unit.ts';
import { coherentUnit } from '../../quantities/print-unit.ts';
import type { UnitHint } from '../../quantities/unit-result.ts';
import { sameUnit } from '../../quantities/unit.ts';
import { absolute, type Anchor, placeAt, type Span } from '../../text/span.ts';
import type { Confidence, Fix, Fixer } from '../fix.ts';
import { type Contradiction, contradictionsOf, goalsOf } from '../goals.ts';
import { positionsOf } from '../positions.ts';
import type { Scene } from '../scene.ts';

export const correctNote: Fixer = { kind: 'note', forFinding: corrections };

/** Notes of one contradiction that are offered to be corrected. */
const mostNotes = 4;

/** Readings by convention alone: nothing else in the note tells which was meant. */
const unsettled: ReadonlySet<UnitHint['kind']> = new Set(['product-after-slash', 'pound-mass-or-force', 'prefix-or-product']);

function corrections(detected: Detected, scene: Scene): readonly Fix[] {
  const { cause, place } = detected;
  switch (cause.kind) {
    case 'unreadable': {
      const to = cause.problem.fault.suggestion;
      return to === undefined ? [] : [correction(scene, place.anchor, cause.problem.span, to, 'likely', 1)];
    }
    case 'ambiguous': {
      const read = parseUnit(cause.hint.readAs);
      const same = read.ok && read.hints.length === 0 && sameUnit(read.unit, cause.note.unit) && !unsettled.has(cause.hint.kind);
      return [correction(scene, place.anchor, cause.note.span, cause.hint.readAs, same ? 'proven' : 'likely', 1)];
    }
    case 'fault':
      if (cause.fault.kind === 'notes') return either(cause.fault.constraint.first, cause.fault.constraint.second, scene);
      return [...rootNote(detected, scene), ...sideNotes(detected, scene)];
    default:
      return [];
  }
}

/** Of two notes that disagree one is right; only the author knows which. */
function either(first: NoteInForce, second: NoteInForce, scene: Scene): readonly Fix[] {
  const put = (held: NoteInForce, like: NoteInForce): readonly Fix[] => (scene.isHere(held.anchor) ? [correction(scene, held.anchor, held.note.span, like.unit.text, 'choice', 2)] : []);
  return [...put(second, first), ...put(first, second)];
}

/** The note that explains several contradictions, corrected to what most of them need. */
function rootNote(detected: Detected, scene: Scene): readonly Fix[] {
  const fault = detected.cause.kind === 'fault' && detected.cause.fault.kind === 'note' ? detected.cause.fault : undefined;
  if (!fault || !scene.isHere(fault.note.anchor)) return [];
  const faults = contradictionsOf(detected);
  const votes = new Map<Dimension, number>();
  for (const each of faults) for (const dimension of new Set(neededBy(each, fault.note, scene))) votes.set(dimension, (votes.get(dimension) ?? 0) + 1);
  const ranked = [...votes].sort((a, b) => b[1] - a[1]);
  return ranked.slice(0, 2).map(([dimension, count], at) => ({
    ...correction(scene, fault.note.anchor, fault.note.note.span, coherentUnit(dimension), at === 0 && count > 1 ? 'likely' : 'choice', at === 0 ? 0.2 : 4),
    says: { what: 'correct-note', symbol: fault.path, from: fault.note.unit.text, to: coherentUnit(dimension), uses: [count, faults.length] },
  }));
}

/** The notes that a single contradiction rests on, where another unit with a name of its own would settle it. */
function sideNotes(detected: Detected, scene: Scene): readonly Fix[] {
  if (detected.cause.kind !== 'fault' || detected.cause.fault.kind === 'note') return [];
  const [fault] = contradictionsOf(detected);
  if (!fault) return [];
  return [...targetNote(fault, scene), ...noteLeaves(...sidesOf(fault.constraint)).flatMap((leaf): readonly Fix[] => {
    const held = leaf.version?.note;
    if (!held || !scene.isHere(held.anchor)) return [];
    const needed = [...new Set(neededBy(fault, held, scene))].filter((dimension) => !dimension.isOne && kindsOf(dimension).length > 0);
    return needed.slice(0, 1).map((dimension) => ({
      ...correction(scene, held.anchor, held.note.span, coherentUnit(dimension), 'choice', 4),
      says: { what: 'correct-note', symbol: leaf.version?.path ?? '', from: held.unit.text, to: coherentUnit(dimension) },
    }));
  }).slice(0, mostNotes)];
}

/** What is noted on the target, where the formula is right. */
function targetNote(fault: Contradiction, scene: Scene): readonly Fix[] {
  if (fault.kind !== 'dimension') return [];
  const { reason } = fault.constraint;
  if (reason.kind !== 'target' && reason.kind !== 'result') return [];
  const held = reason.note;
  const to = fault.left.isOne ? '-' : coherentUnit(fault.left);
  return scene.isHere(held.anchor) ? [correction(scene, held.anchor, held.note.span, to, 'choice', 3.5)] : [];
}

/** What a contradiction needs the symbol of a note to be, at each of its places. */
function neededBy(fault: Contradiction, held: NoteInForce, scene: Scene): readonly Dimension[] {
  return goalsOf(fault).filter((goal) => goal.distance === 0).flatMap((goal) => {
    const sightings = scene.sightings(scene.pieceAt(goal.anchor, goal.roots[0]?.expr ?? fault.constraint.span));
    return positionsOf(goal, sightings).flatMap(({ expr, dimension, ratio }) => {
      const note = sightings.values.get(expr)?.version?.note;
      return dimension && note && note.note === held.note ? [dimension.mul(ratio)] : [];
    });
  });
}

function correction(scene: Scene, anchor: Anchor, span: Span, to: string, confidence: Confidence, cost: number): Fix {
  const at = absolute(placeAt(anchor, span));
  return { kind: 'note', confidence, edits: [{ ...at, text: to }], says: { what: 'correct-note', from: scene.text.slice(at.start, at.end), to }, cost };
}
