/** Where Fortran finds a module, and a procedure outside of modules. */
import type { ImportStmt } from '../../program/nodes.ts';
import { join, parent } from '../../text/paths.ts';
import type { FileSource } from '../frontend.ts';

const ending = /\.(?:f90|f95|f03|f08|f|for|ftn)$/i;
/** Modules of the language and of libraries whose sources are seldom at hand. */
const foreign = /^(?:iso_fortran_env|iso_c_binding|ieee_\w+|omp_lib\w*|openacc|mpi|mpi_f08|netcdf|hdf5|pio|esmf|f90_unix\w*)$/;
/** Folders with more files are not searched line by line. */
const mostFiles = 200;

/** The file that defines a module: of its name beside the script, in a folder beside or below; else the one in its folder that says so. */
export function resolveModule(file: string, statement: ImportStmt, name: string | undefined, source: FileSource): string | undefined {
  const module = statement.module.toLowerCase();
  if (name !== undefined || foreign.test(module)) return undefined;
  if (defines(source.read(file) ?? '', module)) return undefined;
  const folders = foldersAround(file, source);
  return named(folders, module, file, source) ?? saying(folders.slice(0, 1), module, file, source);
}

/** The file of a procedure that stands in none: one that has its name. */
export function neighbourOf(file: string, name: string, source: FileSource): string | undefined {
  return /^[a-z]\w{2,}$/.test(name) ? named(foldersAround(file, source), name, file, source) : undefined;
}

/** The folder of a file, then those beside it and below it. */
function foldersAround(file: string, source: FileSource): readonly string[] {
  const folder = parent(file);
  const above = parent(folder);
  const inside = (at: string): readonly string[] => source.list(at).filter((name) => /^[A-Za-z]\w*$/.test(name)).map((name) => join(at, name));
  return [...new Set([folder, ...(above === folder ? [] : [above, ...inside(above)]), ...inside(folder)])];
}

function named(folders: readonly string[], name: string, file: string, source: FileSource): string | undefined {
  for (const folder of folders) {
    const found = source.list(folder).find((each) => ending.test(each) && each.replace(ending, '').toLowerCase() === name);
    const path = found === undefined ? undefined : join(folder, found);
    if (path !== undefined && path !== file) return path;
  }
  return undefined;
}

function saying(folders: readonly string[], module: string, file: string, source: FileSource): string | undefined {
  for (const folder of folders) {
    const files = source.list(folder).filter((each) => ending.test(each));
    if (files.length > mostFiles) continue;
    const found = files.map((each) => join(folder, each)).find((path) => path !== file && defines(source.read(path) ?? '', module));
    if (found !== undefined) return found;
  }
  return undefined;
}

function defines(text: string, module: string): boolean {
  return new RegExp(`^[ \\t]*module[ \\t]+${module}[ \\t]*(?:!|;|\\r|$)`, 'im').test(text);
}
