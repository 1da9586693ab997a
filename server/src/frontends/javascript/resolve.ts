/** Which file an import means. */
import type { ImportStmt } from '../../program/nodes.ts';
import { join, parent } from '../../text/paths.ts';
import type { FileSource } from '../frontend.ts';

const endings = ['.ts', '.tsx', '.mts', '.cts', '.js', '.jsx', '.mjs', '.cjs'];
/** Endings of the output that a source may be named by. */
const made: Readonly<Record<string, readonly string[]>> = { '.js': ['.ts', '.tsx'], '.jsx': ['.tsx'], '.mjs': ['.mts'], '.cjs': ['.cts'] };

/**
 * The file of a relative import: as it is named, with an ending, as the source that the named file is made from, or the `index` of a
 * folder. Packages are libraries; a name of an import is never a file.
 */
export function resolveImport(file: string, statement: ImportStmt, name: string | undefined, source: FileSource): string | undefined {
  if (name !== undefined || !/^\.{1,2}(?:\/|$)/.test(statement.module)) return undefined;
  let folder = parent(file);
  const steps = statement.module.split('/').filter((step) => step !== '' && step !== '.');
  const last = steps.at(-1);
  const ends = last === undefined || last === '..';
  for (const step of ends ? steps : steps.slice(0, -1)) {
    if (step !== '..' && !source.list(folder).includes(step)) return undefined;
    folder = step === '..' ? parent(folder) : join(folder, step);
  }
  return ends ? indexOf(folder, source) : (named(folder, last, source) ?? (source.list(folder).includes(last) ? indexOf(join(folder, last), source) : undefined));
}

function named(folder: string, name: string, source: FileSource): string | undefined {
  const names = source.list(folder);
  const ending = /\.[cm]?jsx?$/.exec(name)?.[0];
  const stem = ending === undefined ? name : name.slice(0, -ending.length);
  const candidates = [...(/\.[cm]?[jt]sx?$/.test(name) ? [name] : []), ...(ending === undefined ? [] : (made[ending] ?? []).map((each) => stem + each)), ...endings.map((each) => name + each)];
  const found = candidates.find((each) => names.includes(each));
  return found === undefined ? undefined : join(folder, found);
}

function indexOf(folder: string, source: FileSource): string | undefined {
  return named(folder, 'index', source);
}
