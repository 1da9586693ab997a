/** The symbols of a document with their units, under the functions that they belong to. */
import { type CancellationToken, type DocumentSymbol, type DocumentSymbolParams, SymbolKind } from 'vscode-languageserver/node.js';
import type { SymbolGroup, SymbolInfo } from '../../service/contract.ts';
import { LineIndex } from '../../text/line-index.ts';
import { type Encoding, rangeOf } from '../positions.ts';
import type { Session } from '../session.ts';

export async function documentSymbols(session: Session, { textDocument }: DocumentSymbolParams, token: CancellationToken): Promise<DocumentSymbol[]> {
  const found = await session.ask(textDocument.uri, token, ({ file, text }, workspace) => {
    const lines = LineIndex.of(text);
    return workspace.symbols(file).flatMap((group) => toSymbols(group, lines, session.target.encoding));
  });
  return found ?? [];
}

/** `[kPa]`, `dimensionless`, `unit not known`. */
export function unitLabel({ unit, dimension, origin }: Pick<SymbolInfo, 'unit' | 'dimension' | 'origin'>): string {
  if (origin === 'unknown') return 'unit not known';
  if (dimension === '1' && (unit === undefined || /^(?:1|-+|dimensionless)?$/.test(unit))) return 'dimensionless';
  return unit === undefined || unit === '' ? `dimension ${dimension}` : `[${unit}]`;
}

function toSymbols({ owner, nameSpan, span, symbols }: SymbolGroup, lines: LineIndex, encoding: Encoding): readonly DocumentSymbol[] {
  const children = symbols.map((symbol): DocumentSymbol => {
    const range = rangeOf(lines, symbol.span, encoding);
    return { name: symbol.name, detail: unitLabel(symbol), kind: symbol.kind === 'parameter' ? SymbolKind.Property : SymbolKind.Variable, range, selectionRange: range };
  });
  if (owner === undefined) return children;
  return [{ name: owner, detail: '', kind: SymbolKind.Function, range: rangeOf(lines, span, encoding), selectionRange: rangeOf(lines, nameSpan, encoding), children }];
}
