/** Where MATLAB finds the function of a name: in a file of that name. */
import { join, parent } from '../../text/paths.ts';
import type { FileSource } from '../frontend.ts';
import { keywords } from './tokens.ts';

/**
 * The file that defines a function: beside the script, in `private`, for `pkg.f` in the folder `+pkg`; then in the folders beside and below that a
 * project puts on its path, where only one of them has it. Undefined where there is none.
 */
export function neighbourOf(file: string, name: string, source: FileSource): string | undefined {
  if (keywords.has(name)) return undefined;
  const folder = parent(file);
  const parts = name.split('.');
  const wanted = `${parts.at(-1)}.m`;
  const packages = parts.slice(0, -1).map((part) => `+${part}`);
  const own = [folder, join(folder, 'private')].map((each) => fileIn(each, packages, wanted, source)).find((each) => each !== undefined && each !== file);
  if (own) return own;
  const root = projectFolder(folder, source);
  const found = [root, ...foldersIn(root, source), ...foldersIn(folder, source)].flatMap((each) => fileIn(each, packages, wanted, source) ?? []);
  const others = new Set(found.filter((each) => each !== file));
  return others.size === 1 ? [...others][0] : undefined;
}

function fileIn(folder: string, packages: readonly string[], wanted: string, source: FileSource): string | undefined {
  let at = folder;
  for (const each of packages) {
    if (!source.list(at).includes(each)) return undefined;
    at = join(at, each);
  }
  return source.list(at).includes(wanted) ? join(at, wanted) : undefined;
}

/** The folder above, where it holds scripts too or folders of the usual names. */
function projectFolder(folder: string, source: FileSource): string {
  const above = parent(folder);
  return source.list(above).some((name) => name.endsWith('.m')) ? above : folder;
}

/** Folders by their looks: names without a dot that are no packages, classes or private folders. */
function foldersIn(folder: string, source: FileSource): readonly string[] {
  return source.list(folder).filter((name) => /^[A-Za-z]\w*$/.test(name) && name !== 'private').map((name) => join(folder, name));
}
