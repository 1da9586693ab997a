/** What differs between the places a server runs in: a process with a disk, or a worker of a browser. */
import type { FindingCode } from '../program/codes.ts';
import type { Configuration } from '../service/configuration.ts';
import type { Assets, FileSource } from '../service/contract.ts';

export interface Host {
  readonly version: string;
  readonly assets: Assets;
  /** Files that are not open; `forget` drops what is known of folders. */
  readonly files: FileSource & { forget(): void };
  /** The scripts of folders, as a search of the command would find them, no more than is sensible. */
  scripts(folders: readonly string[], configurationAt: (folder: string) => Configuration): Iterable<string>;
  /** The address of the page that explains a code; undefined where there is none to open. */
  pageUri(code: FindingCode): string | undefined;
}
