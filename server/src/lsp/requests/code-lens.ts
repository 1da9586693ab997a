/** Above functions: how many of their units are known. Above relations: their groups. */
import type { CancellationToken, CodeLens, CodeLensParams } from 'vscode-languageserver/node.js';
import { solveGroups } from '../../groups/index.ts';
import { LineIndex } from '../../text/line-index.ts';
import { rangeOf } from '../positions.ts';
import type { Session } from '../session.ts';

/** A command of the editor's side; without it a lens is words alone. */
const showActions = 'termwise.showActions';

export async function codeLenses(session: Session, { textDocument }: CodeLensParams, token: CancellationToken): Promise<CodeLens[]> {
  const { encoding } = session.target;
  const found = await session.ask(textDocument.uri, token, ({ file, text }, workspace) => {
    const lines = LineIndex.of(text);
    const lens = (span: { readonly start: number; readonly end: number }, title: string): CodeLens => {
      const range = rangeOf(lines, span, encoding);
      return { range, command: { title, command: session.client.select ? showActions : '', ...(session.client.select ? { arguments: [textDocument.uri, range.start] } : {}) } };
    };
    const units = session.settings.lenses ? workspace.symbols(file).flatMap(({ owner, nameSpan, symbols }) => {
      const known = symbols.filter(({ origin }) => origin !== 'unknown').length;
      return owner === undefined || symbols.length === 0 ? [] : [lens(nameSpan, `units known ${known}/${symbols.length}`)];
    }) : [];
    const groups = session.settings.lenses ? workspace.groups.relations(file).flatMap(({ relation, span }) => {
      const { groups: solved } = solveGroups(relation);
      return solved.length === 0 ? [] : [lens(span, solved.length === 1 ? '1 group' : `${solved.length} groups`)];
    }) : [];
    return [...units, ...groups];
  });
  return found ?? [];
}
