/** Fixes for a checked file: made by the fixers, each tried on the text and checked again before it is offered. */
import type { Understood } from '../analyze.ts';
import type { Detected } from '../findings/collect.ts';
import type { HostStyle, TextEdit } from '../frontends/frontend.ts';
import { applyEdits, bareChange } from '../repairs/apply.ts';
import type { Fix } from '../repairs/fix.ts';
import { fixers } from '../repairs/registry.ts';
import { Scene } from '../repairs/scene.ts';
import { absolute, type Anchor, type Span } from '../text/span.ts';
import { fixTitle } from '../wording/fix-words.ts';
import type { OfferedFix } from './contract.ts';
import type { Trial } from './trial.ts';

/** A text and what was found in it. */
export interface Look {
  readonly understood: Understood;
  readonly detected: readonly Detected[];
}

/** Of one kind for one finding; the repairs that are worth reading. */
const mostOfAKind = 5;
/** Tries that one finding is worth: each is a check of the file, of which little has changed. */
const mostTries = 24;

/**
 * `trial` checks a change inside one function by itself; where it cannot, `look` checks the changed text, and then the text itself
 * again: it moves the anchors that everything here counts from.
 */
export function fixesOf(now: Look, style: HostStyle, span: Span | undefined, trial: (edits: readonly TextEdit[]) => Trial | undefined, look: (text: string) => Look): readonly OfferedFix[] {
  const { parsed, lines, notes, solver } = now.understood;
  const scene = new Scene({ file: parsed.program.file, program: parsed.program, lines, notes, solver, style });
  const before = keysOf(now.detected);
  const problems = problemsOf(now);
  // Everything is made before anything is tried: a try moves the anchors that offsets count from.
  const asked = now.detected.filter((each) => !span || touches(absolute(each.place), span)).map((detected): Asked => ({
    key: keyOf(detected),
    finding: { code: detected.code, span: absolute(detected.place) },
    eitherSide: isComparison(detected),
    made: fixers.flatMap((fixer) => [...(fixer.forFinding?.(detected, scene) ?? [])].sort((a, b) => a.cost - b.cost)),
  }));
  if (span) asked.push({ key: undefined, finding: undefined, eitherSide: false, made: fixers.flatMap((fixer) => fixer.forPlace?.(span, scene) ?? []) });
  const attempt = (fix: Fix, key: Key | undefined): Tried | undefined => {
    const alone = trial(fix.edits);
    if (alone) return alone.problemsAfter > alone.problemsBefore ? undefined : compare(keysOf(alone.before, alone.anchors), keysOf(alone.after, alone.anchors), fix.edits, key);
    const after = look(applyEdits(parsed.text, fix.edits));
    const found = problemsOf(after) > problems ? undefined : compare(before, keysOf(after.detected), fix.edits, key);
    look(parsed.text);
    return found;
  };
  return asked.flatMap((each) => choose(each, parsed.text, attempt));
}

/** The fixes made for one finding, or for a place. */
interface Asked {
  readonly key: Key | undefined;
  readonly finding: OfferedFix['finding'];
  /** Of two ways that are both right either will do. */
  readonly eitherSide: boolean;
  readonly made: readonly Fix[];
}

interface Tried {
  /** Findings that went with it. */
  readonly others: number;
}

/** The fixes that hold, best first. */
function choose({ key, finding, eitherSide, made }: Asked, before: string, attempt: (fix: Fix, key: Key | undefined) => Tried | undefined): readonly OfferedFix[] {
  const results: { readonly fix: Fix; readonly others: number }[] = [];
  const counts = new Map<string, number>();
  const seen = new Set<string>();
  let tries = 0;
  for (const fix of made) {
    const count = counts.get(fix.kind) ?? 0;
    const change = bareChange(before, fix.edits);
    const plain = fix.unchecked || fix.edits.length === 0;
    if (count >= mostOfAKind || (fix.edits.length > 0 && seen.has(change)) || (!plain && tries >= mostTries)) continue;
    seen.add(change);
    if (!plain) tries++;
    const result = plain ? { others: 0 } : attempt(fix, key);
    if (!result) continue;
    counts.set(fix.kind, count + 1);
    results.push({ fix, others: result.others });
  }
  const severalProven = results.filter(({ fix }) => fix.confidence === 'proven').length > 1 && !eitherSide;
  const rank = ({ fix, others }: { readonly fix: Fix; readonly others: number }): number => fix.cost - Math.min(others, 3) / 2;
  return results
    .filter(({ fix }) => fix.kind !== 'missing' || !results.some((each) => each.fix.kind === 'repair'))
    .sort((a, b) => rank(a) - rank(b))
    .map(({ fix, others }) => ({
      kind: fix.kind, finding, title: fixTitle(fix), edits: fix.edits, alsoSettles: others,
      // Two ways that are both right leave the choice to the author.
      confidence: severalProven && fix.confidence === 'proven' ? 'likely' : fix.confidence,
      ...(fix.fill ? { fill: fix.fill } : {}),
    }));
}

function isComparison({ cause }: Detected): boolean {
  return cause.kind === 'fault' && cause.fault.kind === 'scale' && cause.fault.constraint.reason.kind === 'comparison';
}

interface Key {
  readonly code: string;
  readonly start: number;
  readonly grave: boolean;
  /** Its place does not move with the edits. */
  readonly still: boolean;
}

function keyOf({ code, severity, place }: Detected): Key {
  return { code, start: absolute(place).start, grave: severity !== 'hint', still: false };
}

/** With the anchors of the part that was tried by itself, everything else stands still. */
function keysOf(detected: readonly Detected[], anchors?: ReadonlySet<Anchor>): readonly Key[] {
  return detected.map((each) => ({ ...keyOf(each), still: anchors !== undefined && !anchors.has(each.place.anchor) }));
}

/** What an edit did: undefined where the finding is still there or another one came. */
function compare(before: readonly Key[], after: readonly Key[], edits: readonly TextEdit[], settled: Key | undefined): Tried | undefined {
  const left = [...after];
  let gone = 0;
  for (const each of before) {
    const at = left.findIndex((other) => other.code === each.code && other.still === each.still && (each.still ? other.start === each.start : isAt(each.start, other.start, edits)));
    if (at >= 0) {
      if (settled && each.code === settled.code && each.start === settled.start) return undefined;
      left.splice(at, 1);
    } else if (each.grave) gone++;
  }
  return left.some((each) => each.grave) ? undefined : { others: Math.max(gone - (settled?.grave ? 1 : 0), 0) };
}

/** Whether an offset of the old text is this one in the new: moved by what the edits before it added, within an edit anywhere inside. */
function isAt(old: number, now: number, edits: readonly TextEdit[]): boolean {
  let low = old;
  let high = old;
  for (const edit of edits) {
    const grown = edit.text.length - (edit.end - edit.start);
    if (edit.end < old || (edit.end === old && edit.start < old)) {
      low += grown;
      high += grown;
    } else if (edit.start <= old) {
      low += Math.min(0, edit.start - old);
      high += Math.max(0, grown);
    }
  }
  return low <= now && now <= high;
}

function problemsOf({ understood }: Look): number {
  return understood.parsed.program.chunks.reduce((sum, chunk) => sum + chunk.problems.length, 0);
}

function touches(a: Span, b: Span): boolean {
  return a.start <= b.end && b.start <= a.end;
}
