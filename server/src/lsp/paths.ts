/** Addresses of documents to the names that the engine knows files by, and back. */
import { fileURLToPath, pathToFileURL } from 'node:url';

/** A path with forward slashes for a file; the address itself for what is on no disk (`untitled:…`). */
export function fileOf(uri: string): string {
  if (!uri.startsWith('file:')) return uri;
  try {
    return fileURLToPath(uri).replaceAll('\\', '/');
  } catch {
    return uri;
  }
}

/** Whether a name is a path on this disk. */
export function isPath(file: string): boolean {
  return /^(?:[A-Za-z]:)?[\\/]/.test(file);
}

export function uriOf(file: string): string {
  return isPath(file) ? pathToFileURL(file).href : file;
}
