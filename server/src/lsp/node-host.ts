/** A process with a disk. */
import { diskFiles } from '../platform/disk.ts';
import { nodeAssets } from '../platform/node-assets.ts';
import { pageFile } from '../platform/pages.ts';
import { walk } from '../platform/walk.ts';
import type { Host } from './host.ts';
import { isPath, uriOf } from './paths.ts';

/** Past so many files a search ends: what was found until then is shown. */
const most = 5000;

export function nodeHost(version: string): Host {
  const disk = diskFiles();
  return {
    version,
    assets: nodeAssets(),
    // What was never saved has no folder: the server's own must not pass for it.
    files: { read: (file) => (isPath(file) ? disk.read(file) : undefined), list: (folder) => (isPath(folder) ? disk.list(folder) : []), forget: () => disk.forget() },
    *scripts(folders, configurationAt) {
      let count = 0;
      for (const found of walk(folders.filter(isPath), (folder) => configurationAt(folder.replaceAll('\\', '/')))) {
        if (found.kind !== 'file') continue;
        if (++count > most) return;
        yield found.path.replaceAll('\\', '/');
      }
    },
    pageUri: (code) => uriOf(pageFile(code).replaceAll('\\', '/')),
  };
}
