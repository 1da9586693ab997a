import type { CancellationToken, Hover, HoverParams } from 'vscode-languageserver/node.js';
import { LineIndex } from '../../text/line-index.ts';
import { offsetOf } from '../positions.ts';
import type { Session } from '../session.ts';
import { toHover } from '../to-protocol.ts';
import { turn } from '../turn.ts';

export async function hover(session: Session, { textDocument, position }: HoverParams, token: CancellationToken): Promise<Hover | null> {
  await turn(token);
  const document = session.documents.get(textDocument.uri);
  if (!document) return null;
  await session.check(document);
  const workspace = await session.workspace;
  await turn(token);
  if (session.documents.get(textDocument.uri) !== document) return null;
  const info = workspace.hover(document.file, offsetOf(LineIndex.of(document.text), position, session.target.encoding));
  return info ? toHover(info, document.text, session.target) : null;
}
