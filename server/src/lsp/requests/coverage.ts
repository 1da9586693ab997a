/** `termwise/coverage`: how many symbols have a known unit, and which have none, most used first. A request of our own; any client may use it. */
import { type CancellationToken, type Range, RequestType } from 'vscode-languageserver/node.js';
import type { SymbolGroup } from '../../service/contract.ts';
import { LineIndex } from '../../text/line-index.ts';
import { uriOf } from '../paths.ts';
import { rangeOf } from '../positions.ts';
import type { Scan } from '../scan.ts';
import type { Session } from '../session.ts';
import { turn } from '../turn.ts';

export interface CoverageParams {
  /** A document; every script that was read where it is left out. */
  readonly textDocument?: { readonly uri: string };
}

export interface CoverageAnswer {
  readonly version: 1;
  readonly files: readonly FileCoverage[];
}

export interface FileCoverage {
  readonly uri: string;
  readonly known: number;
  readonly all: number;
  /** Symbols without a unit, those that are read most often first. */
  readonly open: readonly { readonly name: string; readonly owner?: string; readonly uses: number; readonly range: Range }[];
}

export const coverageRequest = new RequestType<CoverageParams, CoverageAnswer, void>('termwise/coverage');

export async function coverage(session: Session, scan: Scan, { textDocument }: CoverageParams, token: CancellationToken): Promise<CoverageAnswer> {
  if (textDocument) {
    const found = await session.ask(textDocument.uri, token, ({ uri, file, text }, workspace) => ofFile(uri, text, workspace.symbols(file), session));
    return { version: 1, files: found ? [found] : [] };
  }
  await turn(token);
  const open: FileCoverage[] = [];
  for (const { uri } of session.documents.all()) open.push(...(await coverage(session, scan, { textDocument: { uri } }, token)).files);
  const others = [...scan.files].filter(([file]) => !session.documents.at(file)).map(([file, { text, groups }]) => ofFile(uriOf(file), text, groups, session));
  return { version: 1, files: [...open, ...others].filter(({ all }) => all > 0) };
}

function ofFile(uri: string, text: string, groups: readonly SymbolGroup[], { target }: Session): FileCoverage {
  const lines = LineIndex.of(text);
  const symbols = groups.flatMap((group) => group.symbols.map((symbol) => ({ symbol, owner: group.owner })));
  const open = symbols.filter(({ symbol }) => symbol.origin === 'unknown').sort((a, b) => b.symbol.uses - a.symbol.uses || a.symbol.span.start - b.symbol.span.start);
  return {
    uri, known: symbols.length - open.length, all: symbols.length,
    open: open.map(({ symbol, owner }) => ({ name: symbol.name, ...(owner === undefined ? {} : { owner }), uses: symbol.uses, range: rangeOf(lines, symbol.span, target.encoding) })),
  };
}
