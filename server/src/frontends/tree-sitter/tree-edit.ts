import { Edit, type Point, type Tree } from 'web-tree-sitter';
import { applyEdit } from '../edits.ts';
import type { TextEdit } from '../frontend.ts';

/** Tells a syntax tree how its text changed, edit after edit. `before`: the text that it was parsed from. */
export function tellEdits(tree: Tree, before: string, edits: readonly TextEdit[]): void {
  let text = before;
  for (const edit of edits) {
    const after = applyEdit(text, edit);
    const newEndIndex = edit.start + edit.text.length;
    tree.edit(new Edit({
      startIndex: edit.start, oldEndIndex: edit.end, newEndIndex,
      startPosition: pointAt(text, edit.start), oldEndPosition: pointAt(text, edit.end), newEndPosition: pointAt(after, newEndIndex),
    }));
    text = after;
  }
}

/** Row and column as the parser counts them: only `\n` ends a row. */
function pointAt(text: string, offset: number): Point {
  let row = 0;
  let start = 0;
  for (let at = text.indexOf('\n'); at >= 0 && at < offset; at = text.indexOf('\n', start)) {
    row++;
    start = at + 1;
  }
  return { row, column: offset - start };
}
