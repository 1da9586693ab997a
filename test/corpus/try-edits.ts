import type { CheckResult, Workspace } from '../../server/src/service/contract.ts';
import { LineIndex } from '../../server/src/text/line-index.ts';
import type { Span } from '../../server/src/text/span.ts';
import type { SeedEdit } from './edits.ts';
import { type Restored, restored } from './repairs.ts';
import type { Script } from './scripts.ts';

export interface Tried {
  readonly edit: SeedEdit;
  /** An error or warning in the function whose code and message were not there before. */
  readonly reported: boolean;
  /** The stricter count: one whose code and line were not there before, so that a finding that only changed its words does not count. */
  readonly placed: boolean;
  /** Not reported in the function, but in another place of the file. */
  readonly elsewhere: boolean;
  /** One-based. */
  readonly line: number;
  readonly source: string;
  /** Where repairs were asked for and the edit was reported. */
  readonly restored?: Restored;
}

/** Makes one edit after the other in a script and checks it again each time. */
export function tryEdits(workspace: Workspace, { file, text, language }: Script, edits: readonly SeedEdit[], repairs = false): readonly Tried[] {
  const before = workspace.check(file, text, language);
  const lines = new LineIndex(text);
  return edits.map((edit) => {
    const edited = text.slice(0, edit.span.start) + edit.replacement + text.slice(edit.span.end);
    const after = workspace.check(file, edited, language);
    const grown = edited.length - text.length;
    const inside = { start: edit.functionSpan.start, end: edit.functionSpan.end + grown };
    const reported = hasNew(words(before, edit.functionSpan), words(after, inside));
    const line = lines.lineAt(edit.span.start);
    const fresh = repairs && reported ? freshIn(before, after, edit.functionSpan, inside) : [];
    return {
      ...(fresh.length > 0 ? { restored: restored(workspace, file, edited, text, fresh) } : {}),
      edit, reported,
      placed: hasNew(places(before, edit.functionSpan), places(after, inside)),
      elsewhere: !reported && hasNew(words(before), words(after)),
      line: line + 1,
      source: lines.lineText(line).trim(),
    };
  });
}

function hasNew(before: readonly string[], after: readonly string[]): boolean {
  const left = [...before];
  return after.some((each) => {
    const at = left.indexOf(each);
    if (at >= 0) left.splice(at, 1);
    return at < 0;
  });
}

/** The findings whose words were not there before. */
function freshIn(before: CheckResult, after: CheckResult, span: Span, inside: Span): CheckResult['findings'] {
  const left = [...words(before, span)];
  return within(after, inside).filter((each) => {
    const at = left.indexOf(`${each.code} ${each.message}`);
    if (at >= 0) left.splice(at, 1);
    return at < 0;
  });
}

function within(result: CheckResult, span: Span | undefined): CheckResult['findings'] {
  const grave = result.findings.filter((each) => each.severity === 'error' || each.severity === 'warning');
  return span ? grave.filter((each) => span.start <= each.span.start && each.span.start < span.end) : grave;
}

function words(result: CheckResult, span?: Span): readonly string[] {
  return within(result, span).map((each) => `${each.code} ${each.message}`);
}

function places(result: CheckResult, span: Span): readonly string[] {
  const lines = new LineIndex(result.text);
  return within(result, span).map((each) => `${each.code} ${lines.lineAt(each.span.start)}`);
}
