/** Cells as one program, and the way from each to the other. For files and for editors that send the cells one by one. */
import type { LanguageId } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import type { TextEdit } from '../frontend.ts';
import { blankCommands } from './magics.ts';

export interface CellText {
  readonly text: string;
  /** Undefined for text cells, raw cells, and code in a language that is not read. */
  readonly language: LanguageId | undefined;
}

/** A place in a cell; cells count from 0 in the list that was joined, offsets from the start of the cell's text. */
export interface CellPlace {
  readonly cell: number;
  readonly offset: number;
}

export interface CellSpan extends Span {
  readonly cell: number;
}

/** A change of one cell's text. */
export interface CellEdit extends TextEdit {
  readonly cell: number;
}

/** The program that the cells of one language make, in their order, commands to the kernel blanked. */
export interface JoinedCells {
  readonly language: LanguageId;
  readonly text: string;
  /** The part of a cell that a span of the program stands for: up to the end of the cell in which it starts. Undefined where no cell is in the program. */
  toCell(span: Span): CellSpan | undefined;
  /** The line of an offset of the program as a person counts it: `cell 3, line 2`, all cells counted. */
  lineName(offset: number): string;
  /** The offset in the program of a place in a cell; undefined for a cell that is not in it. */
  toProgram(place: CellPlace): number | undefined;
  /** Changes of the program as changes of cells; undefined where one goes beyond a cell or changes a command to the kernel. */
  toCellEdits(edits: readonly TextEdit[]): readonly CellEdit[] | undefined;
}

/** Where a cell stands in the program. */
interface Part extends Span {
  readonly cell: number;
  /** In offsets of the program. */
  readonly blanked: readonly Span[];
}

/** A blank line between cells: a comment at the end of one does not stand above the next one's first statement. */
const between = '\n\n';

/** Joins the cells of a language. Never throws for any text. */
export function joinCells(cells: readonly CellText[], language: LanguageId): JoinedCells {
  const parts: Part[] = [];
  let text = '';
  cells.forEach((each, cell) => {
    const code = each.language === language ? blankCommands(each.text, language) : undefined;
    if (!code) return;
    if (parts.length > 0) text += between;
    const start = text.length;
    text += code.text;
    parts.push({ cell, start, end: text.length, blanked: code.spans.map((span) => ({ start: start + span.start, end: start + span.end })) });
  });
  const byCell = new Map(parts.map((part) => [part.cell, part]));
  return {
    language,
    text,
    toCell(span) {
      const part = partAt(parts, span.start);
      if (!part) return undefined;
      const start = Math.min(span.start, part.end) - part.start;
      return { cell: part.cell, start, end: Math.max(Math.min(span.end, part.end) - part.start, start) };
    },
    lineName(offset) {
      const part = partAt(parts, offset);
      return part ? `cell ${part.cell + 1}, line ${text.slice(part.start, Math.min(offset, part.end)).split(/\r\n|\r|\n/).length}` : 'line 1';
    },
    toProgram({ cell, offset }) {
      const part = byCell.get(cell);
      return part && Math.min(part.start + Math.max(offset, 0), part.end);
    },
    toCellEdits(edits) {
      const made = edits.map((edit): CellEdit | undefined => {
        const part = partAt(parts, edit.start);
        if (!part || edit.end > part.end || part.blanked.some((each) => edit.start < each.end && each.start < edit.end)) return undefined;
        return { cell: part.cell, start: edit.start - part.start, end: edit.end - part.start, text: edit.text };
      });
      return made.every((each) => each !== undefined) ? made : undefined;
    },
  };
}

/** The last part that starts at or before an offset, else the first one. */
function partAt(parts: readonly Part[], offset: number): Part | undefined {
  let [low, high] = [0, parts.length - 1];
  while (low < high) {
    const middle = (low + high + 1) >> 1;
    if ((parts[middle] as Part).start <= offset) low = middle;
    else high = middle - 1;
  }
  return parts[low];
}
