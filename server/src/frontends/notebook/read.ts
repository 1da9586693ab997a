/** Notebook files of Jupyter (nbformat 4, and 3 with its worksheets): the cells, the program they make, and the way back into the file. */
import type { Node } from 'jsonc-parser';
import type { LanguageId } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import type { TextEdit } from '../frontend.ts';
import { type CellSpan, type CellText, type JoinedCells, joinCells } from './join.ts';
import { notebookLanguage } from './kernels.ts';
import { member, rawSpan, readJson, type SourceText, sourceText } from './source-string.ts';
import { rawEdits } from './write.ts';

/** The ending of notebook files. */
export const notebookEnding = '.ipynb';

export interface Notebook {
  /** The text of the file. */
  readonly file: string;
  readonly language: LanguageId;
  /** Every cell; a person counts them from 1. */
  readonly cells: readonly CellText[];
  readonly program: JoinedCells;
  /** Where a part of a cell stands in the file. */
  toFile(span: CellSpan): Span;
  /** Changes of the program as changes of the file, which stays as it is everywhere else; undefined where one cannot be made. */
  toFileEdits(edits: readonly TextEdit[]): readonly TextEdit[] | undefined;
}

export type NotebookRead =
  | { readonly ok: true; readonly notebook: Notebook }
  /** `problem` is the end of a sentence that begins with the file's name; `otherLanguage` where all is well but for the kernel's language. */
  | { readonly ok: false; readonly problem: string; readonly otherLanguage: boolean };

export function isNotebook(file: string): boolean {
  return file.toLowerCase().endsWith(notebookEnding);
}

/** Reads a notebook; `language` in place of the one that its kernel names. Never throws for any text. */
export function readNotebook(file: string, language?: LanguageId): NotebookRead {
  const root = readJson(file);
  if (!root) return refuse('it is no notebook: its JSON cannot be read to the end');
  const found = cellNodes(root);
  if (!found) return refuse('it is no notebook: it has no list of cells');
  const kernel = kernelName(root);
  const spoken = language ?? notebookLanguage(kernel);
  if (!spoken) return refuse(`its kernel's language, ${kernel}, is not read`, true);
  const sources = found.map(cellSource);
  const cells = found.map((node, at): CellText => ({ text: sources[at]?.text ?? '', language: cellLanguage(node, spoken), isProse: words(member(node, 'cell_type')) === 'markdown' }));
  const program = joinCells(cells, spoken);
  const sourceOf = (cell: number): SourceText => sources[cell] ?? { text: '', pieces: [], isList: false };
  return {
    ok: true,
    notebook: {
      file, language: spoken, cells, program,
      toFile: (span) => rawSpan(file, sourceOf(span.cell), span),
      toFileEdits: (edits) => program.toCellEdits(edits)?.flatMap((edit) => rawEdits(file, sourceOf(edit.cell), edit)),
    },
  };
}

function refuse(problem: string, otherLanguage = false): NotebookRead {
  return { ok: false, problem, otherLanguage };
}

/** `cells` of nbformat 4; those of all worksheets of nbformat 3. */
function cellNodes(root: Node): readonly Node[] | undefined {
  const cells = member(root, 'cells');
  if (cells?.type === 'array') return cells.children ?? [];
  const sheets = member(root, 'worksheets');
  return sheets?.type === 'array' ? (sheets.children ?? []).flatMap((sheet) => member(sheet, 'cells')?.children ?? []) : undefined;
}

/** A notebook without any metadata is one of Python: the language that the format began with. */
function kernelName(root: Node): string {
  const metadata = member(root, 'metadata');
  const kernel = member(metadata, 'kernelspec');
  const names = [member(member(metadata, 'language_info'), 'name'), member(kernel, 'language'), member(kernel, 'name'), member(metadata, 'language')];
  return names.map(words).find((name) => name !== undefined && name !== '') ?? 'python';
}

/** nbformat 3 has the code of a cell under `input`. */
function cellSource(cell: Node): SourceText | undefined {
  return sourceText(member(cell, 'source') ?? member(cell, 'input'));
}

/** The notebook's language for a code cell, unless the cell says that it is in another one. */
function cellLanguage(cell: Node, language: LanguageId): LanguageId | undefined {
  if (words(member(cell, 'cell_type')) !== 'code') return undefined;
  const own = words(member(member(member(cell, 'metadata'), 'vscode'), 'languageId')) ?? words(member(cell, 'language'));
  return own === undefined || own === '' ? language : notebookLanguage(own);
}

function words(node: Node | undefined): string | undefined {
  return node?.type === 'string' ? String(node.value) : undefined;
}
