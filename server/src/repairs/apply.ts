import type { TextEdit } from '../frontends/frontend.ts';

/** A text after edits that do not overlap; insertions at one place stand in the order they are given. */
export function applyEdits(text: string, edits: readonly TextEdit[]): string {
  let out = text;
  const ordered = edits.map((edit, at) => ({ edit, at })).sort((a, b) => b.edit.start - a.edit.start || b.edit.end - a.edit.end || b.at - a.at);
  for (const { edit } of ordered) out = out.slice(0, edit.start) + edit.text + out.slice(edit.end);
  return out;
}

/** What a single edit changes without what it leaves as it is, so that two ways of writing one change are the same. */
export function bareChange(text: string, edits: readonly TextEdit[]): string {
  return edits.map((edit) => {
    let { start, end, text: put } = edit;
    while (start < end && put !== '' && text[start] === put[0]) {
      start++;
      put = put.slice(1);
    }
    while (start < end && put !== '' && text[end - 1] === put.at(-1)) {
      end--;
      put = put.slice(0, -1);
    }
    return `${start} ${end} ${put}`;
  }).join('\n');
}
