/** From faults and note problems to what is reported: classified, one per cause, without what is allowed. */
import type { Directive, Note, NoteProblem } from '../notes/types.ts';
import type { UnitHint } from '../quantities/unit-result.ts';
import type { Constraint } from '../constraints/problem.ts';
import type { Fault } from '../solver/fault.ts';
import { evidenceOf } from '../solver/root-cause.ts';
import type { Anchor, Place, Span } from '../text/span.ts';
import { placeAt } from '../text/span.ts';
import type { FindingCode, Severity } from './finding.ts';
import { checkOf, checks } from './registry.ts';

/** Something to report, not yet in words. */
export interface Detected {
  readonly code: FindingCode;
  readonly severity: Severity;
  readonly place: Place;
  readonly cause: Cause;
}

export type Cause =
  /** `alike`: further faults of the same function that this finding stands for. */
  | { readonly kind: 'fault'; readonly fault: Fault; readonly alike: readonly Fault[] }
  | { readonly kind: 'unreadable'; readonly problem: NoteProblem }
  | { readonly kind: 'ambiguous'; readonly note: Note; readonly hint: UnitHint }
  | { readonly kind: 'directive'; readonly problem: string };

/** The findings of one function's faults. Several hidden units in one function are one finding: it is an empirical relation. */
export function detectFaults(faults: readonly Fault[], oneHidden = true): readonly Detected[] {
  const found: Detected[] = [];
  const hidden: Fault[] = [];
  const seen = new Set<string>();
  const blamed = new Set<Constraint>();
  for (const fault of faults) {
    const check = checkOf(fault);
    if (!check || (needsNote(fault) && evidenceOf(fault).length === 0)) continue;
    // What rests on an inference that a reported contradiction rests on too has the same cause.
    const rows = 'involved' in fault ? fault.involved.map((each) => each.by) : [];
    if (rows.some((row) => blamed.has(row))) continue;
    for (const row of rows) blamed.add(row);
    if (check.code === 'hidden-unit' && oneHidden) {
      hidden.push(fault);
      continue;
    }
    const place = placeOf(fault);
    const key = `${check.code} ${place.start} ${place.end} ${place.anchor.start} ${edgeOf(fault)}`;
    if (seen.has(key)) continue;
    seen.add(key);
    found.push({ code: check.code, severity: check.milder?.(fault) ?? check.severity, place, cause: { kind: 'fault', fault, alike: [] } });
  }
  const first = hidden[0];
  if (first) found.push({ code: 'hidden-unit', severity: severityOf('hidden-unit'), place: placeOf(first), cause: { kind: 'fault', fault: first, alike: hidden.slice(1) } });
  return found;
}

export function detectUnreadable(problems: readonly NoteProblem[], anchor: Anchor): readonly Detected[] {
  return problems.map((problem) => {
    const { span } = problem.fault;
    const inside = span.end > span.start && problem.span.start + span.end <= problem.span.end;
    const place = inside ? { start: problem.span.start + span.start, end: problem.span.start + span.end } : problem.span;
    return { code: 'unreadable-unit', severity: severityOf('unreadable-unit'), place: placeAt(anchor, place), cause: { kind: 'unreadable', problem } };
  });
}

export function detectAmbiguous(notes: readonly Note[], anchor: Anchor): readonly Detected[] {
  const seen = new Set<number>();
  return notes.flatMap((note) => note.hints.flatMap((hint): Detected[] => {
    if (seen.has(note.span.start)) return [];
    seen.add(note.span.start);
    return [{ code: 'ambiguous-unit', severity: severityOf('ambiguous-unit'), place: placeAt(anchor, note.span), cause: { kind: 'ambiguous', note, hint } }];
  }));
}

/** A directive that cannot be followed is a note that cannot be read. */
export function detectDirectives(directives: readonly Directive[], anchor: Anchor): readonly Detected[] {
  return directives.flatMap((directive): Detected[] =>
    directive.kind === 'malformed'
      ? [{ code: 'unreadable-unit', severity: severityOf('unreadable-unit'), place: placeAt(anchor, directive.span), cause: { kind: 'directive', problem: directive.problem } }]
      : [],
  );
}

/** An empirical relation has as many edges as it names symbols, all at one place. */
function edgeOf(fault: Fault): string {
  return (fault.kind === 'scale' || fault.kind === 'dimension') && fault.constraint.reason.kind === 'conversion-edge' ? fault.constraint.reason.path : '';
}

/** Where a fault is shown. */
export function placeOf(fault: Fault): Place {
  if (fault.kind === 'note') return placeAt(fault.note.anchor, fault.note.note.span);
  return placeAt(fault.constraint.anchor, spanOf(fault));
}

function spanOf(fault: Exclude<Fault, { kind: 'note' }>): Span {
  return { start: fault.constraint.span.start, end: fault.constraint.span.end };
}

function severityOf(code: FindingCode): Severity {
  return checks.find((check) => check.code === code)?.severity ?? 'warning';
}

/** A contradiction among library constants alone is nobody's unit note. */
function needsNote(fault: Fault): boolean {
  return fault.kind !== 'notes' && fault.kind !== 'note' && fault.kind !== 'point';
}
