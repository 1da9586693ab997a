/** Addresses of documents to the names that the engine knows files by, and back. */

/** A path with forward slashes for a file; the address itself for what is on no disk (`untitled:…`, `vscode-vfs:…`). */
export function fileOf(uri: string): string {
  if (!uri.startsWith('file:')) return uri;
  try {
    const { host, pathname } = new URL(uri);
    const path = decodeURIComponent(pathname);
    if (host !== '') return `//${host}${path}`;
    return /^\/[A-Za-z]:/.test(path) ? path.slice(1) : path;
  } catch {
    return uri;
  }
}

/** Whether a name is a path on this disk. */
export function isPath(file: string): boolean {
  return /^(?:[A-Za-z]:)?[\\/]/.test(file);
}

export function uriOf(file: string): string {
  if (!isPath(file)) return file;
  const [, host, rest] = /^\/\/([^/]+)(\/.*)$/.exec(file) ?? [];
  const url = new URL(host === undefined ? 'file:///' : `file://${host}/`);
  // A setter of a path takes percent signs for escapes; here they are characters.
  url.pathname = (rest ?? file).replaceAll('%', '%25').replaceAll('\\', '%5C');
  return url.href;
}
