/** Paths as they are shown. */
import { relative, sep } from 'node:path';
import { pathToFileURL } from 'node:url';

/** A path with slashes, as the engine keeps it. */
export function slashed(path: string): string {
  return sep === '/' ? path : path.split(sep).join('/');
}

/** Relative to the working folder where the file lies in it, else absolute; with slashes. */
export function displayName(file: string, workingFolder: string): string {
  const name = slashed(relative(workingFolder, file));
  return name === '' || name.startsWith('../') || name === '..' || /^[A-Za-z]:/.test(name) ? slashed(file) : name;
}

export function folderUri(folder: string): string {
  const uri = pathToFileURL(folder).href;
  return uri.endsWith('/') ? uri : `${uri}/`;
}
