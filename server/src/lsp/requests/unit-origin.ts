/** Where a unit comes from: a unit is to a number what a type is to a value, so editors ask for it as the type's definition. */
import type { CancellationToken, Location, TypeDefinitionParams } from 'vscode-languageserver/node.js';
import { LineIndex } from '../../text/line-index.ts';
import { uriOf } from '../paths.ts';
import { offsetOf, rangeOf } from '../positions.ts';
import type { Session } from '../session.ts';

export async function unitOrigin(session: Session, { textDocument, position }: TypeDefinitionParams, token: CancellationToken): Promise<Location[]> {
  const { encoding, textOf } = session.target;
  const found = await session.ask(textDocument.uri, token, ({ file, text, uri }, workspace) => {
    const lines = LineIndex.of(text);
    return (workspace.hover(file, offsetOf(lines, position, encoding))?.notes ?? []).map((note): Location => ({
      uri: note.file === undefined ? uri : uriOf(note.file),
      range: rangeOf(note.file === undefined ? lines : LineIndex.of(textOf(note.file)), note.span, encoding),
    }));
  });
  return found ?? [];
}
