/** All proven fixes of a file at once, for the terminal and for the editor on save. */
import type { FindingCode } from '../program/codes.ts';
import type { LanguageId } from '../program/nodes.ts';
import type { OfferedFix, Workspace } from './contract.ts';
import type { TextEdit } from '../frontends/frontend.ts';
import { applyEdits } from '../repairs/apply.ts';

export interface Repaired {
  readonly text: string;
  /** How many fixes went in, by the code of their finding. */
  readonly fixed: Readonly<Partial<Record<FindingCode, number>>>;
}

/** A fix may lay bare another; a text that goes on changing is left as it is after this many rounds. */
const mostRounds = 10;

/** Where a text is kept that is not the file itself: the cells of a notebook. */
export interface Keeper {
  /** Whether changes of the text can be made where it is kept. */
  can(edits: readonly TextEdit[]): boolean;
  /** Makes them; the answer is the text as it is then. */
  write(edits: readonly TextEdit[]): string;
}

/** The text with every proven fix; of one code only, where one is given. The workspace is left with the new text. */
export function applyProven(workspace: Workspace, file: string, text: string, language?: LanguageId, code?: FindingCode, keeper?: Keeper): Repaired {
  const fixed: Partial<Record<FindingCode, number>> = {};
  let now = text;
  for (let round = 0; round < mostRounds; round++) {
    workspace.check(file, now, language);
    const chosen = together(workspace.fixes(file).filter((fix) => fix.confidence === 'proven' && fix.finding && (code === undefined || fix.finding.code === code) && (keeper?.can(fix.edits) ?? true)));
    if (chosen.length === 0) break;
    const edits = chosen.flatMap((fix) => fix.edits);
    now = keeper ? keeper.write(edits) : applyEdits(now, edits);
    for (const { finding } of chosen) if (finding) fixed[finding.code] = (fixed[finding.code] ?? 0) + 1;
  }
  workspace.check(file, now, language);
  return { text: now, fixed };
}

/** One fix for each finding, and none that touches what another one changes: those wait for the next round. */
export function together(fixes: readonly OfferedFix[]): readonly OfferedFix[] {
  const chosen: OfferedFix[] = [];
  const settled = new Set<string>();
  for (const fix of fixes) {
    const key = `${fix.finding?.code} ${fix.finding?.span.start} ${fix.finding?.span.end}`;
    if (settled.has(key) || chosen.some((other) => overlap(fix, other))) continue;
    settled.add(key);
    chosen.push(fix);
  }
  return chosen;
}

function overlap(a: OfferedFix, b: OfferedFix): boolean {
  return a.edits.some((one) => b.edits.some((other) => one.start <= other.end && other.start <= one.end));
}
