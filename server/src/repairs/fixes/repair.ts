/** Repairs by dimension algebra: the small edits that make a formula homogeneous, or what it lacks where none does. */
import type { Detected } from '../../findings/collect.ts';
import { familiarity, kindsOf } from '../../quantities/kinds.ts';
import { Dimension } from '../../quantities/dimension.ts';
import { coherentUnit } from '../../quantities/print-unit.ts';
import type { Expr } from '../../program/nodes.ts';
import type { Fix, Fixer } from '../fix.ts';
import { type Contradiction, contradictionsOf, type Goal, goalsOf, ratioOfSides } from '../goals.ts';
import { positionsOf } from '../positions.ts';
import { dimensionOf, type Scene } from '../scene.ts';
import { symbolsAt } from '../scope.ts';
import { bracketsIn, editsAt, type SmallEdit } from '../small-edits.ts';

export const repair: Fixer = { kind: 'repair', forFinding: repairs };

/** Faults of one finding that are looked at. */
const mostFaults = 3;

function repairs(detected: Detected, scene: Scene): readonly Fix[] {
  const faults = contradictionsOf(detected).filter((fault) => scene.isHere(fault.constraint.anchor)).slice(0, mostFaults);
  const [first] = faults;
  if (!first) return [];
  const made = faults.flatMap((fault) => [...bracketed(fault, scene), ...goalsOf(fault).flatMap((goal) => reaching(goal, scene))]);
  return [...made, ...lacking(first)];
}

function reaching(goal: Goal, scene: Scene): readonly Fix[] {
  const place = (goal.roots[0] as Goal['roots'][number]).expr;
  const sightings = scene.sightings(scene.pieceAt(goal.anchor, place));
  const workshop = { scene, sightings, symbols: symbolsAt(scene, goal.anchor, place) };
  return positionsOf(goal, sightings).flatMap((position) => editsAt(position, workshop).map((edit) => fixOf(edit, scene, position.unit)));
}

function bracketed(fault: Contradiction, scene: Scene): readonly Fix[] {
  const { constraint } = fault;
  const sum = constraint.span as Partial<Expr>;
  if (constraint.kind !== 'same' || constraint.reason.kind !== 'sum' || sum.kind !== 'binary') return [];
  const sightings = scene.sightings(scene.pieceAt(constraint.anchor, constraint.span));
  const edits = bracketsIn(sum as Extract<Expr, { kind: 'binary' }>, constraint.anchor, (expr) => dimensionOf(sightings.values.get(expr), sightings), scene);
  return edits.map((edit) => fixOf(edit, scene, ''));
}

function fixOf({ start, end, text, cost }: SmallEdit, scene: Scene, unit: string): Fix {
  return { kind: 'repair', confidence: 'choice', edits: [{ start, end, text }], says: { what: 'rewrite', from: scene.text.slice(start, end), to: text, ...(unit ? { unit } : {}) }, cost };
}

/** What is missing, by its unit and its kinds, for where nothing in scope has it. */
function lacking(fault: Contradiction): readonly Fix[] {
  const ratio = ratioOfSides(fault);
  const inverse = Dimension.one.div(ratio);
  const needed = familiarity(ratio) <= familiarity(inverse) ? ratio : inverse;
  return [{ kind: 'missing', confidence: 'choice', edits: [], says: { what: 'missing', unit: coherentUnit(needed), kinds: kindsOf(needed).slice(0, 3) }, cost: 8 }];
}
