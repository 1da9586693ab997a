/** Files that scripts rest on: modules they import, and nomenclature files. */
import { DidChangeWatchedFilesNotification, type DidChangeWatchedFilesParams } from 'vscode-languageserver/node.js';
import { frontEndEntries } from '../../frontends/registry.ts';
import { configurationName } from '../../service/configuration.ts';
import { fileOf } from '../paths.ts';
import type { Session } from '../session.ts';

const patterns = [...frontEndEntries.map(({ endings }) => `**/*{${endings.join(',')}}`), `**/${configurationName}`];

export async function watchFiles({ connection, capabilities }: Session): Promise<void> {
  if (!capabilities.workspace?.didChangeWatchedFiles?.dynamicRegistration) return;
  await connection.client.register(DidChangeWatchedFilesNotification.type, { watchers: patterns.map((globPattern) => ({ globPattern })) });
}

/** The files that changed and are not open: of an open one the editor itself tells what it holds. */
export function changedFiles(session: Session, { changes }: DidChangeWatchedFilesParams): readonly string[] {
  return changes.map(({ uri }) => fileOf(uri)).filter((file) => !session.documents.at(file));
}
