/** Whether the repairs that are offered for a fault put into a script bring its text back. */
import { applyEdits } from '../../server/src/repairs/apply.ts';
import type { PlacedFinding, Workspace } from '../../server/src/service/contract.ts';

/** What an engineer is shown of them. */
const mostShown = 5;

export interface Restored {
  /** Any repair was offered. */
  readonly offered: boolean;
  /** Place from one of the repair that gives exactly the text before the fault, the best over its findings; undefined where none does. */
  readonly rank: number | undefined;
  /** Milliseconds for all the fixes of the slowest finding. */
  readonly time: number;
}

/** For a file that was just checked with `edited`; `findings` are those that the fault brought. */
export function restored(workspace: Workspace, file: string, edited: string, original: string, findings: readonly PlacedFinding[]): Restored {
  let [offered, time] = [false, 0];
  const ranks: number[] = [];
  for (const finding of findings) {
    const start = performance.now();
    const fixes = workspace.fixes(file, finding.span).filter((fix) => fix.kind === 'repair' && fix.finding?.code === finding.code && fix.finding.span.start === finding.span.start);
    time = Math.max(time, performance.now() - start);
    offered ||= fixes.length > 0;
    const at = fixes.slice(0, mostShown).findIndex((fix) => applyEdits(edited, fix.edits) === original);
    if (at >= 0) ranks.push(at + 1);
  }
  return { offered, rank: ranks.length > 0 ? Math.min(...ranks) : undefined, time };
}

/** One line: how often the original came back, and at which rank. */
export function restoredLine(all: readonly Restored[]): string {
  const ranks = all.flatMap((each) => each.rank ?? []).sort((a, b) => a - b);
  const times = all.map((each) => each.time).sort((a, b) => a - b);
  const share = all.length === 0 ? 0 : (100 * ranks.length) / all.length;
  const median = ranks[Math.floor((ranks.length - 1) / 2)];
  return `${all.filter((each) => each.offered).length} of ${all.length} reported have a repair; in ${ranks.length} (${share.toFixed(1)} %) one of five is the original text, median rank ${median ?? '-'}; ${(times[Math.floor(times.length / 2)] ?? 0).toFixed(0)} ms median, ${(times.at(-1) ?? 0).toFixed(0)} ms slowest`;
}
