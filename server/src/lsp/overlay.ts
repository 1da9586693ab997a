/** Files as the editor sees them: an open document wins over what lies beneath. */
import type { FileSource } from '../service/contract.ts';
import { join, parent } from '../text/paths.ts';
import type { Documents } from './documents.ts';

/** `forget` drops what is known of the folders beneath. */
export function overlay(documents: Documents, beneath: FileSource & { forget(): void }): FileSource & { forget(): void } {
  return {
    read: (file) => documents.at(file)?.text ?? beneath.read(file),
    list(folder) {
      // A document that was never saved is in no folder.
      if (folder === '.') return [];
      const names = beneath.list(folder);
      const unsaved = documents.all().filter(({ file }) => parent(file) === folder).map(({ file }) => file.slice(join(folder, '').length));
      const more = unsaved.filter((name) => !names.includes(name));
      return more.length === 0 ? names : [...names, ...more];
    },
    forget: () => beneath.forget(),
  };
}
