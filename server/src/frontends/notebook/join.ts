/** Cells as one program, and the way from each to the other. For files and for editors that send the cells one by one. */
import type { LanguageId } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import type { TextEdit } from '../frontend.ts';
import { blankCommands } from './magics.ts';

export interface CellText {
  readonly text: string;
  /** Undefined for text cells, raw cells, and code in a language that is not read. */
  readonly language: LanguageId | undefined;
  /** A text cell: a line in it that says `y depends on a, b` of names in the code is read, and nothing else. */
  readonly isProse?: boolean;
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
  /** Offset in the cell of what stands at `start`; below zero by the comment's marker for a line of a text cell. */
  readonly from: number;
  readonly isProse: boolean;
  /** In offsets of the program. */
  readonly blanked: readonly Span[];
}

/** A blank line between cells: a comment at the end of one does not stand above the next one's first statement. */
const between = '\n\n';

/** Joins the cells of a language. Never throws for any text. */
export function joinCells(cells: readonly CellText[], language: LanguageId): JoinedCells {
  const parts: Part[] = [];
  let text = '';
  const add = (cell: number, from: number, put: string, blanked: readonly Span[], isProse = false): void => {
    if (parts.length > 0) text += between;
    const start = text.length;
    text += put;
    parts.push({ cell, from, isProse, start, end: text.length, blanked: blanked.map((span) => ({ start: start + span.start, end: start + span.end })) });
  };
  const code = cells.map((each) => (each.language === language && !each.isProse ? blankCommands(each.text, language) : undefined));
  const names = new Set(code.flatMap((each) => each?.text.match(/[\p{L}_][\p{L}\p{N}_]*/gu) ?? []));
  cells.forEach((each, cell) => {
    const own = code[cell];
    if (own) add(cell, 0, own.text, own.spans);
    const marker = `${language === 'matlab' ? '%' : '#'} `;
    if (each.isProse) for (const line of relationsIn(each.text, names)) add(cell, line.start - marker.length, marker + each.text.slice(line.start, line.end), [], true);
  });
  const cellOffset = (part: Part, offset: number): number => Math.max(Math.min(offset, part.end) - part.start + part.from, 0);
  return {
    language,
    text,
    toCell(span) {
      const part = partAt(parts, span.start);
      if (!part) return undefined;
      const start = cellOffset(part, span.start);
      return { cell: part.cell, start, end: Math.max(cellOffset(part, span.end), start) };
    },
    lineName(offset) {
      const part = partAt(parts, offset);
      return part ? `cell ${part.cell + 1}, line ${cells[part.cell]?.text.slice(0, cellOffset(part, offset)).split(/\r\n|\r|\n/).length}` : 'line 1';
    },
    toProgram({ cell, offset }) {
      const part = parts.find((each) => each.cell === cell && (!each.isProse || (offset >= each.from && offset <= each.from + each.end - each.start)));
      return part && Math.min(part.start + Math.max(offset - part.from, 0), part.end);
    },
    toCellEdits(edits) {
      const made = edits.map((edit): CellEdit | undefined => {
        const part = partAt(parts, edit.start);
        if (!part || part.isProse || edit.end > part.end || part.blanked.some((each) => edit.start < each.end && each.start < edit.end)) return undefined;
        return { cell: part.cell, start: edit.start - part.start, end: edit.end - part.start, text: edit.text };
      });
      return made.every((each) => each !== undefined) ? made : undefined;
    },
  };
}

/** Lines of prose that state a relation between names of the code. */
function relationsIn(prose: string, names: ReadonlySet<string>): readonly Span[] {
  return [...prose.matchAll(/^[ \t]*([\p{L}_][\p{L}\p{N}_]*\s+depends\s+on\s+[\p{L}_][\p{L}\p{N}_,\t ]*?)\.?[ \t]*$/gmu)].flatMap((found) => {
    const sentence = found[1] as string;
    const start = found.index + found[0].indexOf(sentence);
    const words = sentence.replace(/\bdepends\s+on\b|\band\b/g, ' ').match(/[\p{L}_][\p{L}\p{N}_]*/gu) ?? [];
    return words.every((word) => names.has(word)) ? [{ start, end: start + sentence.length }] : [];
  });
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
