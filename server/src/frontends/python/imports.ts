import type { ImportStmt } from '../../program/nodes.ts';
import { join, parent } from '../../text/paths.ts';
import type { FileSource } from '../frontend.ts';

/** How far above a script its packages are looked for. */
const levelsUp = 4;

/**
 * The file that an import of `file` means, or undefined for libraries. Looks beside the script and in the folders above it, as
 * scripts find their modules; a package is a folder with `__init__.py`.
 */
export function resolveImport(file: string, statement: ImportStmt, name: string | undefined, source: FileSource): string | undefined {
  const parts = [...statement.module.split('.'), ...(name === undefined ? [] : [name])].filter((part) => part !== '');
  let folder = parent(file);
  if (statement.level > 0) {
    for (let level = 1; level < statement.level; level++) folder = parent(folder);
    return moduleFile(folder, parts, source);
  }
  for (let level = 0; level <= levelsUp; level++) {
    const found = moduleFile(folder, parts, source);
    if (found && found !== file) return found;
    const above = parent(folder);
    if (above === folder) return undefined;
    folder = above;
  }
  return undefined;
}

function moduleFile(folder: string, parts: readonly string[], source: FileSource): string | undefined {
  let at = folder;
  for (const part of parts.slice(0, -1)) {
    if (!source.list(at).includes(part)) return undefined;
    at = join(at, part);
  }
  const last = parts.at(-1);
  const names = source.list(at);
  if (last === undefined) return names.includes('__init__.py') ? join(at, '__init__.py') : undefined;
  if (names.includes(`${last}.py`)) return join(at, `${last}.py`);
  if (!names.includes(last)) return undefined;
  const inside = join(at, last);
  return source.list(inside).includes('__init__.py') ? join(inside, '__init__.py') : undefined;
}
