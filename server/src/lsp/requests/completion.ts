/** Units inside notes, symbols inside formulas. */
import { type CancellationToken, type CompletionItem, CompletionItemKind, type CompletionParams } from 'vscode-languageserver/node.js';
import type { CompletionChoice } from '../../service/contract.ts';
import { LineIndex } from '../../text/line-index.ts';
import { offsetOf, rangeOf } from '../positions.ts';
import type { Session } from '../session.ts';

/** What opens the list by being typed: the bracket of a note, and what stands between units. */
export const completionTriggers: readonly string[] = ['[', '/', '*', '(', ' '];

const kinds: Readonly<Record<CompletionChoice['kind'], CompletionItemKind>> = { unit: CompletionItemKind.Unit, symbol: CompletionItemKind.Variable, phrase: CompletionItemKind.Keyword };

export async function completion(session: Session, { textDocument, position }: CompletionParams, token: CancellationToken): Promise<CompletionItem[]> {
  const { encoding } = session.target;
  const found = await session.ask(textDocument.uri, token, ({ file, text }, workspace) => {
    const lines = LineIndex.of(text);
    return workspace.completions(file, offsetOf(lines, position, encoding)).map(({ label, replaces, rank, kind, detail, documentation }, at): CompletionItem => ({
      label, kind: kinds[kind], detail,
      ...(documentation === undefined ? {} : { documentation }),
      // Editors sort by this text: the order in which the service gives them.
      sortText: String(at).padStart(4, '0'),
      ...(rank === 'inferred' ? { preselect: true } : {}),
      filterText: label,
      textEdit: { range: rangeOf(lines, replaces, encoding), newText: label },
    }));
  });
  return found ?? [];
}
