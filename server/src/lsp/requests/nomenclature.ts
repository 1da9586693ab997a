/** Nomenclature files as pages: folding, formatting, colours. */
import { type CancellationToken, type DocumentFormattingParams, type FoldingRange, FoldingRangeKind, type FoldingRangeParams, type SemanticTokens, SemanticTokensBuilder, type SemanticTokensParams, type TextEdit } from 'vscode-languageserver/node.js';
import { alignedColumns, foldedParts, type TokenKind, tokensOf } from '../../service/nomenclature-layout.ts';
import { LineIndex } from '../../text/line-index.ts';
import type { OpenDocument } from '../documents.ts';
import { positionOf, rangeOf } from '../positions.ts';
import type { Session } from '../session.ts';
import { turn } from '../turn.ts';

const types: Readonly<Record<TokenKind, string>> = { symbol: 'variable', unit: 'type', number: 'number', function: 'function', keyword: 'keyword', comment: 'comment' };
const typeNames = [...new Set(Object.values(types))];

export const tokenLegend = { tokenTypes: typeNames, tokenModifiers: ['declaration'] };

export async function foldingRanges(session: Session, { textDocument }: FoldingRangeParams, token: CancellationToken): Promise<FoldingRange[]> {
  const document = await nomenclature(session, textDocument.uri, token);
  return document ? foldedParts(document.text).map(({ first, last, comment }) => ({ startLine: first, endLine: last, ...(comment ? { kind: FoldingRangeKind.Comment } : {}) })) : [];
}

export async function formatting(session: Session, { textDocument }: DocumentFormattingParams, token: CancellationToken): Promise<TextEdit[]> {
  const document = await nomenclature(session, textDocument.uri, token);
  if (!document) return [];
  const lines = LineIndex.of(document.text);
  return alignedColumns(document.text).map((edit) => ({ range: rangeOf(lines, edit, session.target.encoding), newText: edit.text }));
}

export async function semanticTokens(session: Session, { textDocument }: SemanticTokensParams, token: CancellationToken): Promise<SemanticTokens> {
  const document = await nomenclature(session, textDocument.uri, token);
  const builder = new SemanticTokensBuilder();
  if (document) {
    const lines = LineIndex.of(document.text);
    for (const { start, end, kind, declared } of tokensOf(document.text)) {
      const from = positionOf(lines, start, session.target.encoding);
      const to = positionOf(lines, end, session.target.encoding);
      builder.push(from.line, from.character, to.character - from.character, typeNames.indexOf(types[kind]), declared ? 1 : 0);
    }
  }
  return builder.build();
}

async function nomenclature(session: Session, uri: string, token: CancellationToken): Promise<OpenDocument | undefined> {
  await turn(token);
  const document = session.documents.get(uri);
  return document?.language === 'nomenclature' ? document : undefined;
}
