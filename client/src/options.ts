/** What the server is told at its start, wherever it runs. */
import { workspace } from 'vscode';

/** The settings as they are, and that this client can select what a fix leaves to be filled in. */
export function initializationOptions(): object {
  // The editor's object has functions, which do not go through to a worker.
  return { ...(JSON.parse(JSON.stringify(workspace.getConfiguration('termwise'))) as object), select: true };
}
