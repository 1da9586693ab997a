/**
 * Notebooks. A file: `readNotebook(text)` gives cells, program and the ways between. An editor that sends the cells itself:
 * `joinCells(cells, language)`, with `notebookLanguage` for the names it calls languages by.
 */
export { type CellEdit, type CellPlace, type CellSpan, type CellText, type JoinedCells, joinCells } from './join.ts';
export { notebookLanguage } from './kernels.ts';
export { isNotebook, type Notebook, notebookEnding, type NotebookRead, readNotebook } from './read.ts';
