/** Fixes as text: what is offered for a script, and what a script becomes. */
import { applyEdits } from '../../server/src/repairs/apply.ts';
import type { OfferedFix, Workspace } from '../../server/src/service/contract.ts';
import type { FindingCode } from '../../server/src/findings/finding.ts';
import { engine } from '../harness/engine.ts';

const workspace: Workspace = await engine();
const file = '/scripts/script.py';

/** The fixes of one kind or more for a text, without those that only silence. */
export function offers(text: string, kinds?: readonly OfferedFix['kind'][]): readonly OfferedFix[] {
  workspace.check(file, text);
  return workspace.fixes(file).filter((fix) => (kinds ? kinds.includes(fix.kind) : fix.kind !== 'allow'));
}

/** The first line that each fix changes, as it becomes, with its confidence: `proven: x = a*1000`. */
export function becomes(text: string, kinds?: readonly OfferedFix['kind'][]): readonly string[] {
  return offers(text, kinds).map((fix) => `${fix.confidence}: ${changed(text, applyEdits(text, fix.edits))}`);
}

/** The fixes that are offered for a place alone: the first occurrence of `code`. */
export function offersAt(text: string, code: string): readonly OfferedFix[] {
  workspace.check(file, text);
  const start = text.indexOf(code);
  return workspace.fixes(file, { start, end: start + code.length }).filter((fix) => fix.finding === undefined);
}

/** Codes found in a text, hints too. */
export function codesOf(text: string): readonly FindingCode[] {
  return workspace.check(file, text).findings.map((finding) => finding.code);
}

/** A text after its n-th fix. */
export function fixed(text: string, fix: OfferedFix): string {
  return applyEdits(text, fix.edits);
}

function changed(before: string, after: string): string {
  const old = before.split('\n');
  const lines = after.split('\n');
  const at = lines.findIndex((line, index) => line !== old[index]);
  return (lines[at] ?? '').trim();
}
