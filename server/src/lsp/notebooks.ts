/**
 * Notebooks as an editor sends them: cell by cell. The code cells of the kernel's language are one program in their order, kept as a document of
 * its own; findings and answers go back to the cells.
 */
import type { DidChangeNotebookDocumentParams, DidCloseNotebookDocumentParams, DidOpenNotebookDocumentParams, NotebookCell, Position, TextDocumentItem } from 'vscode-languageserver/node.js';
import { NotebookCellKind } from 'vscode-languageserver/node.js';
import { type CellText, type JoinedCells, joinCells } from '../frontends/notebook/index.ts';
import type { LanguageId } from '../program/nodes.ts';
import { LineIndex } from '../text/line-index.ts';
import type { Span } from '../text/span.ts';
import { applied, languageNamed, type OpenDocument } from './documents.ts';
import { fileOf } from './paths.ts';
import { type Encoding, offsetOf } from './positions.ts';

interface Cell {
  readonly uri: string;
  readonly languageId: string;
  readonly isCode: boolean;
  readonly text: string;
}

interface Kept {
  readonly uri: string;
  readonly version: number;
  readonly cells: readonly Cell[];
}

/** A notebook's program, and the ways between it and the cells. */
export interface Program {
  readonly document: OpenDocument;
  readonly cells: readonly { readonly uri: string; readonly text: string }[];
  readonly joined: JoinedCells;
}

export class Notebooks {
  private readonly kept = new Map<string, Kept>();
  private readonly programs = new Map<string, Program>();
  private readonly owners = new Map<string, string>();

  constructor(private readonly encoding: Encoding) {}

  /** Each gives the notebook's program as it is now; undefined where it has none in a language served. */
  open({ notebookDocument: { uri, version, cells }, cellTextDocuments }: DidOpenNotebookDocumentParams): Program | undefined {
    const texts = new Map(cellTextDocuments.map((each) => [each.uri, each]));
    return this.keep({ uri, version, cells: cells.flatMap((cell) => cellOf(cell, texts) ?? []) });
  }

  change({ notebookDocument: { uri, version }, change: { cells } }: DidChangeNotebookDocumentParams): Program | undefined {
    const before = this.kept.get(uri);
    if (!before) return undefined;
    let list = [...before.cells];
    if (cells?.structure) {
      const { array: { start, deleteCount, cells: added = [] }, didOpen = [] } = cells.structure;
      const texts = new Map(didOpen.map((each) => [each.uri, each]));
      const known = new Map(list.map((each) => [each.uri, each]));
      list.splice(start, deleteCount, ...added.flatMap((cell) => cellOf(cell, texts) ?? known.get(cell.document) ?? []));
    }
    for (const { document, changes } of cells?.textContent ?? []) {
      list = list.map((cell) => (cell.uri === document.uri ? { ...cell, text: changes.reduce((text, each) => applied(text, each, this.encoding), cell.text) } : cell));
    }
    return this.keep({ uri, version, cells: list });
  }

  /** The cells that are gone with it. */
  close({ notebookDocument: { uri } }: DidCloseNotebookDocumentParams): Program | undefined {
    const program = this.programs.get(uri);
    for (const cell of this.kept.get(uri)?.cells ?? []) this.owners.delete(cell.uri);
    this.kept.delete(uri);
    this.programs.delete(uri);
    return program;
  }

  /** The program that a cell, or a notebook itself, belongs to. */
  of(uri: string): Program | undefined {
    return this.programs.get(this.owners.get(uri) ?? uri);
  }

  /** The offset in the program of a position in a cell. */
  offset(program: Program, uri: string, position: Position): number | undefined {
    const cell = program.cells.findIndex((each) => each.uri === uri);
    const text = program.cells[cell]?.text;
    return text === undefined ? undefined : program.joined.toProgram({ cell, offset: offsetOf(LineIndex.of(text), position, this.encoding) });
  }

  /** Where a span of the program lies. */
  place({ cells, joined }: Program, span: Span): { readonly uri: string; readonly text: string; readonly span: Span } | undefined {
    const found = joined.toCell(span);
    const cell = found && cells[found.cell];
    return cell && { ...cell, span: found };
  }

  private keep(notebook: Kept): Program | undefined {
    this.kept.set(notebook.uri, notebook);
    for (const cell of notebook.cells) this.owners.set(cell.uri, notebook.uri);
    const language = languageIn(notebook);
    if (!language) {
      this.programs.delete(notebook.uri);
      return undefined;
    }
    const joined = joinCells(notebook.cells.map((cell): CellText => ({ text: cell.text, language: cell.isCode ? languageNamed(cell.languageId, '', cell.text) : undefined, isProse: !cell.isCode })), language);
    const document = { uri: notebook.uri, file: fileOf(notebook.uri), language, version: notebook.version, text: joined.text, isProgram: true as const };
    const program = { document, cells: notebook.cells, joined };
    this.programs.set(notebook.uri, program);
    return program;
  }
}

function cellOf({ kind, document }: NotebookCell, texts: ReadonlyMap<string, TextDocumentItem>): Cell | undefined {
  const sent = texts.get(document);
  return sent && { uri: document, languageId: sent.languageId, isCode: kind === NotebookCellKind.Code, text: sent.text };
}

/** The language of most code cells that are served. */
function languageIn({ cells }: Kept): LanguageId | undefined {
  const counts = new Map<LanguageId, number>();
  for (const { isCode, languageId, text } of cells) {
    const language = isCode ? languageNamed(languageId, '', text) : undefined;
    if (language) counts.set(language, (counts.get(language) ?? 0) + 1);
  }
  return [...counts].sort((a, b) => b[1] - a[1])[0]?.[0];
}
