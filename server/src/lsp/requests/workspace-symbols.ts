/** Symbols of every script that was read, with their units. */
import { type CancellationToken, SymbolKind, type WorkspaceSymbol, type WorkspaceSymbolParams } from 'vscode-languageserver/node.js';
import { LineIndex } from '../../text/line-index.ts';
import { uriOf } from '../paths.ts';
import { rangeOf } from '../positions.ts';
import type { Scan } from '../scan.ts';
import type { Session } from '../session.ts';
import { turn } from '../turn.ts';
import { unitLabel } from './document-symbols.ts';

const most = 500;

export async function workspaceSymbols(session: Session, scan: Scan, { query }: WorkspaceSymbolParams, token: CancellationToken): Promise<WorkspaceSymbol[]> {
  await turn(token);
  const wanted = query.toLowerCase();
  const found: WorkspaceSymbol[] = [];
  for (const [file, { text, groups }] of scan.files) {
    if (found.length >= most) break;
    const lines = LineIndex.of(text);
    for (const { owner, symbols } of groups) {
      for (const symbol of symbols) {
        if (!symbol.name.toLowerCase().includes(wanted) || symbol.origin === 'unknown') continue;
        found.push({
          name: `${symbol.name} ${unitLabel(symbol)}`, kind: SymbolKind.Variable, location: { uri: uriOf(file), range: rangeOf(lines, symbol.span, session.target.encoding) },
          ...(owner === undefined ? {} : { containerName: owner }),
        });
      }
    }
  }
  return found.slice(0, most);
}
