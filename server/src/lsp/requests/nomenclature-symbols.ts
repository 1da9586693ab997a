/** A symbol of a nomenclature file in the scripts that use it: all its uses, and its renaming. */
import { type CancellationToken, type Location, type PrepareRenameParams, type Range, type ReferenceParams, type RenameParams, ResponseError, LSPErrorCodes, MessageType, ShowMessageNotification, type TextEdit, type WorkspaceEdit } from 'vscode-languageserver/node.js';
import { languageOf } from '../../frontends/registry.ts';
import { readNomenclature } from '../../notes/nomenclature/read.ts';
import type { SymbolUses } from '../../service/places.ts';
import { LineIndex } from '../../text/line-index.ts';
import { parent } from '../../text/paths.ts';
import { uriOf } from '../paths.ts';
import { offsetOf, rangeOf } from '../positions.ts';
import type { Session } from '../session.ts';
import { turn } from '../turn.ts';
import type { Span } from '../../text/span.ts';

export async function references(session: Session, { textDocument, position }: ReferenceParams, token: CancellationToken): Promise<Location[]> {
  const asked = symbolAt(session, textDocument.uri, position);
  if (!asked) return [];
  const found: Location[] = [];
  for await (const { file, text, uses } of usesEverywhere(session, asked.name, asked.file, token)) {
    const lines = LineIndex.of(text);
    found.push(...uses.map((span) => ({ uri: uriOf(file), range: rangeOf(lines, span, session.target.encoding) })));
  }
  return found;
}

export async function prepareRename(session: Session, { textDocument, position }: PrepareRenameParams, token: CancellationToken): Promise<Range | null> {
  await turn(token);
  const asked = symbolAt(session, textDocument.uri, position);
  const document = session.documents.get(textDocument.uri);
  return asked && document ? rangeOf(LineIndex.of(document.text), asked.span, session.target.encoding) : null;
}

/** Renames in the nomenclature file and in every script in which each occurrence is shown to be the symbol; the others are named to the user. */
export async function rename(session: Session, { textDocument, position, newName }: RenameParams, token: CancellationToken): Promise<WorkspaceEdit | null> {
  const asked = symbolAt(session, textDocument.uri, position);
  if (!asked) return null;
  if (!/^[A-Za-z_][A-Za-z0-9_]*$/.test(newName)) throw new ResponseError(LSPErrorCodes.RequestFailed, `${newName} is no name for a symbol: letters, digits and underscores, a letter first`);
  const changes: Record<string, TextEdit[]> = {};
  const left: string[] = [];
  for await (const { file, text, uses, proven } of usesEverywhere(session, asked.name, asked.file, token)) {
    if (uses.length === 0) continue;
    const taken = new RegExp(`(?<![\\p{L}\\p{N}_])${newName}(?![\\p{L}\\p{N}_])`, 'u').test(text);
    if (!proven || taken) {
      left.push(file.slice(file.lastIndexOf('/') + 1));
      continue;
    }
    const lines = LineIndex.of(text);
    changes[uriOf(file)] = uses.map((span) => ({ range: rangeOf(lines, span, session.target.encoding), newText: newName }));
  }
  if (left.length > 0) await session.connection.sendNotification(ShowMessageNotification.type, { type: MessageType.Warning, message: `${asked.name} is left as it is in ${left.join(', ')}: not every occurrence there is this symbol, or ${newName} is in use.` });
  return { changes };
}

function symbolAt(session: Session, uri: string, position: { readonly line: number; readonly character: number }): { readonly name: string; readonly file: string; readonly span: Span } | undefined {
  const document = session.documents.get(uri);
  if (document?.language !== 'nomenclature') return undefined;
  const at = offsetOf(LineIndex.of(document.text), position, session.target.encoding);
  const { symbols } = readNomenclature(document.text, document.file);
  for (const match of document.text.matchAll(/[\p{L}_][\p{L}\p{N}_]*/gu)) {
    if (match.index <= at && at <= match.index + match[0].length) return symbols.has(match[0]) ? { name: match[0], file: document.file, span: { start: match.index, end: match.index + match[0].length } } : undefined;
  }
  return undefined;
}

/** The nomenclature file first, then the scripts in its folder and below that hold the word. */
async function* usesEverywhere(session: Session, name: string, declaredIn: string, token: CancellationToken): AsyncGenerator<SymbolUses & { readonly file: string; readonly text: string }> {
  for (const file of new Set([declaredIn, ...session.scriptsIn([parent(declaredIn)])])) {
    await turn(token);
    const text = session.source.read(file);
    const language = languageOf(file);
    if (text === undefined || !language || !text.includes(name) || (language === 'nomenclature' && file !== declaredIn)) continue;
    yield { file, text, ...(file === declaredIn ? ownUses(text, file, name) : await scriptUses(session, file, text, name, declaredIn)) };
  }
}

/** In its own file every word is the symbol, but for descriptions and comments. */
function ownUses(text: string, file: string, name: string): SymbolUses {
  const uses: Span[] = [];
  for (const { start, text: raw, line } of readNomenclature(text, file).lines) {
    const from = line.kind === 'symbol' ? raw.length - line.description.length : raw.length;
    const until = line.kind === 'symbol' && line.description !== '' ? raw.lastIndexOf(line.description) : from;
    const code = line.kind === 'symbol' || line.kind === 'relation' ? raw.slice(0, until).replace(/(?:^|\s)#.*$/, '').replace(/\[[^\]]*\]/g, (unit) => ' '.repeat(unit.length)) : '';
    for (const match of code.matchAll(new RegExp(`(?<![\\p{L}\\p{N}_])${name}(?![\\p{L}\\p{N}_])`, 'gu'))) uses.push({ start: start + match.index, end: start + match.index + name.length });
  }
  return { uses, proven: true };
}

function scriptUses(session: Session, file: string, text: string, name: string, declaredIn: string): Promise<SymbolUses> {
  return session.alone(async () => {
    const workspace = await session.engineOf(file);
    const language = session.documents.at(file)?.language ?? languageOf(file);
    if (!language) return { uses: [], proven: false };
    await workspace.prepare(language);
    workspace.check(file, text, language);
    const uses = workspace.uses(file, name, declaredIn);
    if (!session.documents.at(file)) workspace.forget(file);
    return uses;
  });
}
