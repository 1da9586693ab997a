import type { Constraint } from '../constraints/problem.ts';
import type { NoteInForce, Value } from '../constraints/value.ts';
import type { Fault } from './fault.ts';

/** A solve costs about as much as the first one; this many notes are tried. */
const mostTries = 6;

/**
 * One cause is one finding: where several contradictions share a note, and without that note everything agrees, the note is
 * the fault.
 */
export function rootCause(faults: readonly Fault[], solveWithout: (note: NoteInForce) => readonly Fault[]): readonly Fault[] {
  const serious = faults.filter(isSerious);
  if (serious.length < 2) return faults;
  const doubtful = faults.filter(isContradiction).length - serious.length;
  const shared = sharedNotes(serious).slice(0, mostTries);
  for (const note of shared) {
    const rest = solveWithout(note).filter(isContradiction);
    if (rest.length <= doubtful && !rest.some(isSerious)) return [{ kind: 'note', note, path: nameOf(note), faults: serious }, ...faults.filter((fault) => !isSerious(fault))];
  }
  return faults;
}

/** The noted symbols that a constraint's sides come from, with their notes. */
export function noteLeaves(...values: readonly (Value | undefined)[]): readonly Value[] {
  const leaves: Value[] = [];
  const seen = new Set<Value>();
  const visit = (value: Value | undefined): void => {
    if (!value || seen.has(value) || seen.size > 400) return;
    seen.add(value);
    if (value.version?.note) {
      if (!leaves.some((leaf) => leaf.version?.note === value.version?.note)) leaves.push(value);
      return;
    }
    visit(value.version?.assigned);
    value.from.forEach(visit);
  };
  values.forEach(visit);
  return leaves;
}

/** The values that a constraint compares. */
export function sidesOf(constraint: Constraint): readonly Value[] {
  switch (constraint.kind) {
    case 'same':
      return [constraint.left, constraint.right];
    case 'varying-power':
      return [constraint.base, constraint.exponent];
    case 'bare':
      return [constraint.beside];
    case 'notes':
      return [];
    default:
      return [constraint.value];
  }
}

/** Everything a fault rests on: its own sides and what solved the unknowns in them. */
export function evidenceOf(fault: Fault): readonly Value[] {
  if (fault.kind === 'note') return fault.faults.flatMap(evidenceOf);
  const involved = 'involved' in fault ? fault.involved.flatMap((each) => sidesOf(each.by)) : [];
  return noteLeaves(...sidesOf(fault.constraint), ...involved);
}

/** A contradiction between dimensions, whatever excuses it. */
function isContradiction(fault: Fault): boolean {
  return fault.kind === 'dimension' || fault.kind === 'pure' || fault.kind === 'varying-power';
}

/** One that no literal excuses and no logarithm softens. */
function isSerious(fault: Fault): boolean {
  if (fault.kind === 'pure' && fault.constraint.reason.kind === 'pure-argument' && fault.constraint.reason.gentle) return false;
  return (fault.kind === 'dimension' || fault.kind === 'pure' || fault.kind === 'varying-power') && !fault.hidden;
}

function sharedNotes(faults: readonly Fault[]): readonly NoteInForce[] {
  const [first, ...others] = faults.map((fault) => new Set(evidenceOf(fault).flatMap((leaf) => leaf.version?.note ?? [])));
  return [...(first ?? [])].filter((note) => others.every((set) => set.has(note)));
}

function nameOf(note: NoteInForce): string {
  const target = note.note.target;
  switch (target.kind) {
    case 'statement':
      return target.path;
    case 'parameter':
      return target.param.name;
    case 'entry':
      return target.entry.key;
    case 'result':
      return target.owner.name;
    default:
      return target.name;
  }
}
