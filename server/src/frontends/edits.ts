/** Edits of a text: whether they are true, and what to take in their place. */
import type { TextEdit } from './frontend.ts';

/** One edit that turns a text into another: what lies between their common beginning and their common end. */
export function differenceOf(before: string, after: string): readonly TextEdit[] {
  if (before === after) return [];
  const most = Math.min(before.length, after.length);
  let start = 0;
  while (start < most && before.charCodeAt(start) === after.charCodeAt(start)) start++;
  let tail = 0;
  while (tail < most - start && before.charCodeAt(before.length - 1 - tail) === after.charCodeAt(after.length - 1 - tail)) tail++;
  return [{ start, end: before.length - tail, text: after.slice(start, after.length - tail) }];
}

/** The text after one edit. */
export function applyEdit(text: string, edit: TextEdit): string {
  return text.slice(0, edit.start) + edit.text + text.slice(edit.end);
}

/** The edits where they do turn `before` into `after`, else the difference: a tree told a wrong edit would be silently wrong. */
export function trueEdits(before: string, after: string, edits: readonly TextEdit[] | undefined): readonly TextEdit[] {
  if (!edits) return differenceOf(before, after);
  let text = before;
  for (const edit of edits) {
    if (edit.start < 0 || edit.end < edit.start || edit.end > text.length) return differenceOf(before, after);
    text = applyEdit(text, edit);
  }
  return text === after ? edits : differenceOf(before, after);
}
