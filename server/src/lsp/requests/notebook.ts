/** Notebooks: findings in their cells, and what stands at a place of a cell. */
import { type CancellationToken, type CodeAction, CodeActionKind, type CodeActionParams, type Connection, type Hover, type HoverParams, type TextEdit } from 'vscode-languageserver/node.js';
import type { PlacedFinding } from '../../service/contract.ts';
import { LineIndex } from '../../text/line-index.ts';
import { hoverText } from '../hover-text.ts';
import type { Notebooks, Program } from '../notebooks.ts';
import { rangeOf } from '../positions.ts';
import type { Session } from '../session.ts';
import { toDiagnostics } from '../to-protocol.ts';
import { turn } from '../turn.ts';

/** What the server asks to be sent. */
export const notebookSelector = [{ notebook: { notebookType: 'jupyter-notebook' }, cells: ['python', 'julia', 'octave', 'matlab', 'markdown'].map((language) => ({ language })) }];

/** Follows the notebooks of a client; every cell gets the findings that stand in it. */
export function followNotebooks(connection: Connection, now: () => { readonly session: Session; readonly notebooks: Notebooks; readonly fail: (error: unknown) => void }): void {
  const { synchronization } = connection.notebooks;
  const follow = (program: Program | undefined): void => {
    if (!program) return;
    const { session, notebooks, fail } = now();
    session.documents.put(program.document);
    void turn().then(() => publishCells(session, notebooks, program)).catch(fail);
  };
  synchronization.onDidOpenNotebookDocument((params) => follow(now().notebooks.open(params)));
  synchronization.onDidChangeNotebookDocument((params) => follow(now().notebooks.change(params)));
  synchronization.onDidCloseNotebookDocument(async (params) => {
    const { session, notebooks } = now();
    const program = notebooks.close(params);
    if (!program) return;
    session.documents.close(program.document.uri);
    for (const { uri } of program.cells) await connection.sendDiagnostics({ uri, diagnostics: [] });
    await session.forget(program.document);
  });
}

/** Tells every cell its findings, as long as the program is the notebook's. */
export async function publishCells(session: Session, notebooks: Notebooks, program: Program): Promise<void> {
  if (notebooks.of(program.document.uri) !== program) return;
  const result = await session.check(program.document, undefined, program.joined.lineName);
  if (notebooks.of(program.document.uri) !== program) return;
  for (const [index, { uri, text }] of program.cells.entries()) {
    const findings = result.findings.flatMap((finding): PlacedFinding[] => {
      const place = program.joined.toCell(finding.span);
      // Related places in other cells are told in the message, by cell and line.
      return place?.cell === index ? [{ ...finding, span: place, related: [] }] : [];
    });
    await session.connection.sendDiagnostics({ uri, diagnostics: toDiagnostics({ ...result, text, findings }, session.target) });
  }
}

export async function cellHover(session: Session, notebooks: Notebooks, program: Program, { textDocument, position }: HoverParams, token: CancellationToken): Promise<Hover | null> {
  const offset = notebooks.offset(program, textDocument.uri, position);
  if (offset === undefined) return null;
  const info = await session.ask(program.document.uri, token, ({ file }, workspace) => workspace.hover(file, offset));
  const place = info && notebooks.place(program, info.span);
  if (!info || !place) return null;
  const { markdown, encoding } = session.target;
  return { contents: { kind: markdown ? 'markdown' : 'plaintext', value: hoverText(info, markdown) }, range: rangeOf(LineIndex.of(place.text), place.span, encoding) };
}

export async function cellActions(session: Session, notebooks: Notebooks, program: Program, { textDocument, range }: CodeActionParams, token: CancellationToken): Promise<CodeAction[]> {
  const [start, end] = [notebooks.offset(program, textDocument.uri, range.start), notebooks.offset(program, textDocument.uri, range.end)];
  if (start === undefined || end === undefined) return [];
  const fixes = await session.ask(program.document.uri, token, ({ file }, workspace) => workspace.fixes(file, { start, end }));
  return (fixes ?? []).flatMap(({ title, edits, confidence, finding }): CodeAction[] => {
    const inCells = edits.length > 0 ? program.joined.toCellEdits(edits) : undefined;
    if (!inCells) return [];
    const changes: Record<string, TextEdit[]> = {};
    for (const edit of inCells) {
      const cell = program.cells[edit.cell];
      if (!cell) return [];
      changes[cell.uri] = [...(changes[cell.uri] ?? []), { range: rangeOf(LineIndex.of(cell.text), edit, session.target.encoding), newText: edit.text }];
    }
    return [{ title, kind: finding ? CodeActionKind.QuickFix : CodeActionKind.RefactorRewrite, edit: { changes }, ...(confidence === 'proven' ? { isPreferred: true } : {}) }];
  });
}
