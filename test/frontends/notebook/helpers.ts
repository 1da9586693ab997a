/** Notebook files for tests, as Jupyter writes them: one space of indentation, sources as lists of lines. */
import { type Notebook, readNotebook } from '../../../server/src/frontends/notebook/index.ts';

/** A cell: code as text; `md:` in front of it makes it a text cell. */
export function notebookFile(cells: readonly string[], language = 'python'): string {
  const list = cells.map((cell) => {
    const isText = cell.startsWith('md:');
    const source = (isText ? cell.slice(3) : cell).split(/(?<=\n)/);
    return isText ? { cell_type: 'markdown', metadata: {}, source } : { cell_type: 'code', execution_count: null, metadata: {}, outputs: [], source };
  });
  return `${JSON.stringify({ cells: list, metadata: { kernelspec: { name: 'k', language }, language_info: { name: language } }, nbformat: 4, nbformat_minor: 5 }, null, 1)}\n`;
}

/** A notebook that must be readable. */
export function readable(file: string): Notebook {
  const read = readNotebook(file);
  if (!read.ok) throw new Error(read.problem);
  return read.notebook;
}
