/** Paths with slashes, as the engine has them. */

/** The folder of a path. */
export function parent(path: string): string {
  const at = Math.max(path.lastIndexOf('/'), path.lastIndexOf('\\'));
  return at <= 0 ? (at === 0 ? path.slice(0, 1) : '.') : path.slice(0, at);
}

/** A name in a folder. */
export function join(folder: string, name: string): string {
  return folder === '.' ? name : folder.endsWith('/') ? folder + name : `${folder}/${name}`;
}
