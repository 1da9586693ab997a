/** Files that a client sends, for a server without a disk. */
import { languageOf } from '../frontends/registry.ts';
import type { FileSource } from '../service/contract.ts';
import { join, parent } from '../text/paths.ts';

export class MemoryFiles implements FileSource {
  private readonly texts = new Map<string, string>();

  read(file: string): string | undefined {
    return this.texts.get(file);
  }

  list(folder: string): readonly string[] {
    const start = join(folder, '');
    return [...new Set([...this.texts.keys()].flatMap((file) => (file.startsWith(start) ? [file.slice(start.length).split('/')[0] as string] : [])))];
  }

  /** A file as it is now; without a text it is gone. */
  set(file: string, text: string | undefined): void {
    if (text === undefined) this.texts.delete(file);
    else this.texts.set(file, text);
  }

  forget(): void {
    // Nothing is known but what the client sent, and it sends what changes.
  }

  *scripts(folders: readonly string[]): Iterable<string> {
    for (const file of [...this.texts.keys()].sort()) if (languageOf(file) && folders.some((folder) => parent(file) === folder || file.startsWith(`${folder}/`))) yield file;
  }
}
