import type { CancellationToken, Hover, HoverParams } from 'vscode-languageserver/node.js';
import { LineIndex } from '../../text/line-index.ts';
import { offsetOf } from '../positions.ts';
import type { Session } from '../session.ts';
import { toHover } from '../to-protocol.ts';

export async function hover(session: Session, { textDocument, position }: HoverParams, token: CancellationToken): Promise<Hover | null> {
  const found = await session.ask(textDocument.uri, token, ({ file, text }, workspace) => {
    const info = workspace.hover(file, offsetOf(LineIndex.of(text), position, session.target.encoding));
    return info && toHover(info, text, session.target);
  });
  return found ?? null;
}
