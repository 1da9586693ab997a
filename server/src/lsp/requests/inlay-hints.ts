/** Units and values shown in the text. */
import { type CancellationToken, type InlayHint, InlayHintKind, type InlayHintParams } from 'vscode-languageserver/node.js';
import { LineIndex } from '../../text/line-index.ts';
import { offsetOf, positionOf, rangeOf } from '../positions.ts';
import type { Session } from '../session.ts';

export async function inlayHints(session: Session, { textDocument, range }: InlayHintParams, token: CancellationToken): Promise<InlayHint[]> {
  const { encoding } = session.target;
  const found = await session.ask(textDocument.uri, token, ({ file, text }, workspace) => {
    const lines = LineIndex.of(text);
    const span = { start: offsetOf(lines, range.start, encoding), end: offsetOf(lines, range.end, encoding) };
    return workspace.hints(file, span, session.settings.hints).map(({ at, text: label, kind, tip, edits }): InlayHint => ({
      position: positionOf(lines, at, encoding), label, paddingLeft: true,
      ...(kind === 'argument' ? { kind: InlayHintKind.Parameter } : kind === 'inferred' ? { kind: InlayHintKind.Type } : {}),
      ...(tip === undefined ? {} : { tooltip: tip }),
      ...(edits.length > 0 ? { textEdits: edits.map((edit) => ({ range: rangeOf(lines, edit, encoding), newText: edit.text })) } : {}),
    }));
  });
  return found ?? [];
}
