/** The engine as the terminal builds it, over the files that a test gives it. */
import { nodeAssets } from '../../server/src/platform/node-assets.ts';
import { defaultNoteSettings } from '../../server/src/notes/types.ts';
import type { FileSource, Settings, Workspace } from '../../server/src/service/contract.ts';
import { createWorkspace } from '../../server/src/service/workspace.ts';

/** Every check at its default severity, every form of note read. */
export const defaultSettings: Settings = { severities: {}, notes: defaultNoteSettings };

/** A folder without files. */
export const noFiles: FileSource = { read: () => undefined, list: () => [] };

export function engine(source: FileSource = noFiles, settings: Settings = defaultSettings): Promise<Workspace> {
  return createWorkspace(nodeAssets(), source, settings);
}

/** Files held in memory, by path with slashes. */
export function filesOf(texts: Readonly<Record<string, string>>): FileSource {
  const paths = Object.keys(texts);
  return {
    read: (file) => texts[file],
    list: (folder) => [...new Set(paths.flatMap((path) => (path.startsWith(`${folder}/`) ? [path.slice(folder.length + 1).split('/')[0] as string] : [])))],
  };
}
