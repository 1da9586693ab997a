import type { TextEdit } from '../frontend.ts';

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
