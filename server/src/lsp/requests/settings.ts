/** Settings: asked for where the client answers, else taken as they are sent. */
import { DidChangeConfigurationNotification, type DidChangeConfigurationParams } from 'vscode-languageserver/node.js';
import type { Session } from '../session.ts';
import { section } from '../settings.ts';

/** Asks to be told of changes, and for the settings as they are; true where they differ from those in force. */
export async function askForSettings(session: Session): Promise<boolean> {
  const { connection, capabilities } = session;
  if (capabilities.workspace?.didChangeConfiguration?.dynamicRegistration) await connection.client.register(DidChangeConfigurationNotification.type, { section });
  return capabilities.workspace?.configuration ? session.configure(await connection.workspace.getConfiguration(section)) : false;
}

/** True where the settings differ from those in force. */
export async function settingsChanged(session: Session, { settings }: DidChangeConfigurationParams): Promise<boolean> {
  if (session.capabilities.workspace?.configuration) return session.configure(await session.connection.workspace.getConfiguration(section));
  return typeof settings === 'object' && settings !== null && section in settings ? session.configure((settings as Record<string, unknown>)[section]) : false;
}
