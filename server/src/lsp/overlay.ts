/** Files as the editor sees them: an open document wins over the disk. */
import { diskFiles } from '../platform/disk.ts';
import type { FileSource } from '../service/contract.ts';
import { join, parent } from '../text/paths.ts';
import type { Documents } from './documents.ts';
import { isPath } from './paths.ts';

/** `forget` drops what is known of the folders on disk. */
export function overlay(documents: Documents): FileSource & { forget(): void } {
  const disk = diskFiles();
  return {
    read: (file) => documents.at(file)?.text ?? (isPath(file) ? disk.read(file) : undefined),
    list(folder) {
      if (!isPath(folder)) return [];
      const names = disk.list(folder);
      const unsaved = documents.all().filter(({ file }) => isPath(file) && parent(file) === folder).map(({ file }) => file.slice(join(folder, '').length));
      const more = unsaved.filter((name) => !names.includes(name));
      return more.length === 0 ? names : [...names, ...more];
    },
    forget: () => disk.forget(),
  };
}
