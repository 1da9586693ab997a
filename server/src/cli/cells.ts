/** Places in the program of a notebook, as a person finds them: cell, line in the cell, and the line of the file behind it. */
import type { CellSpan, Notebook } from '../frontends/notebook/index.ts';
import { LineIndex } from '../text/line-index.ts';
import type { Span } from '../text/span.ts';
import { type Region, regionOf } from './report.ts';

export interface CellRegion extends Region {
  /** All cells counted from 1, those of text as well. */
  readonly cell: number;
  /** The same in the file as it is stored. */
  readonly stored: Region;
  /** The first line of the region. */
  readonly source: string;
}

/** Finds the places of one notebook. */
export function cellRegions(notebook: Notebook): (span: Span) => CellRegion {
  const file = new LineIndex(notebook.file);
  const indexes = new Map<number, LineIndex>();
  const indexOf = (cell: number): LineIndex => {
    const index = indexes.get(cell) ?? new LineIndex(notebook.cells[cell]?.text ?? '');
    indexes.set(cell, index);
    return index;
  };
  return (span) => {
    const inCell: CellSpan = notebook.program.toCell(span) ?? { cell: 0, start: 0, end: 0 };
    const index = indexOf(inCell.cell);
    const region = regionOf(index, inCell);
    return { ...region, cell: inCell.cell + 1, stored: regionOf(file, notebook.toFile(inCell)), source: index.lineText(region.line - 1) };
  };
}
