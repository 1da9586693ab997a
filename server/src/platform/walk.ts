/** The files that the paths of a command line stand for, one after the other, without holding them all. */
import { type Dirent, readdirSync, realpathSync, statSync } from 'node:fs';
import { dirname, join, resolve, sep } from 'node:path';
import type { Configuration } from '../service/configuration.ts';
import { chainAt, extend, type IgnoreChain, isIgnored, isToolFolder, matches } from './ignored.ts';
import { isServed } from '../frontends/registry.ts';

export type Walked =
  /** `named`: given on the command line and not found in a folder. Paths are absolute. */
  | { readonly kind: 'file'; readonly path: string; readonly named: boolean }
  /** `problem` is the end of a sentence that begins with the path. */
  | { readonly kind: 'unreadable'; readonly path: string; readonly problem: string };

/**
 * Walks the paths in their order, the content of folders by name; nothing comes twice. `configurationAt` says what a folder's
 * configuration excludes.
 */
export function* walk(paths: readonly string[], configurationAt: (folder: string) => Configuration): Generator<Walked> {
  const given = paths.map((path) => lookAt(resolve(path)));
  const done = new Set<string>();
  const named = new Set(given.flatMap((each) => (each.kind === 'file' ? [each.real] : [])));
  const areas: string[] = [];
  for (const each of given) {
    if (each.kind === 'unreadable') yield each;
    else if (each.kind === 'file') {
      if (!done.has(each.real)) yield { kind: 'file', path: each.path, named: true };
      done.add(each.real);
    } else if (!areas.some((area) => inside(each.real, area))) {
      const before = new Set([...named, ...areas]);
      areas.push(each.real);
      yield* new FolderWalk(areas, before, configurationAt).folder(each.path, chainAt(each.path));
    }
  }
}

type Given = { readonly kind: 'file' | 'folder'; readonly path: string; readonly real: string } | Extract<Walked, { kind: 'unreadable' }>;

function lookAt(path: string): Given {
  try {
    const real = realpathSync(path);
    const found = statSync(real);
    if (found.isDirectory()) return { kind: 'folder', path, real };
    if (found.isFile()) return { kind: 'file', path, real };
    return { kind: 'unreadable', path, problem: 'it is neither a file nor a folder' };
  } catch (error) {
    return { kind: 'unreadable', path, problem: whyUnreadable(error) };
  }
}

/** A failure of the file system, in words. */
export function whyUnreadable(error: unknown): string {
  const code = (error as { code?: unknown }).code;
  if (code === 'ENOENT') return 'no such file or folder';
  if (code === 'EACCES' || code === 'EPERM') return 'no permission to read it';
  if (code === 'ELOOP') return 'its links lead in a circle';
  if (code === 'EISDIR') return 'it is a folder';
  return error instanceof Error ? error.message : String(error);
}

class FolderWalk {
  /** `areas`: real paths that are walked or will be; a link into one of them, or above one, is not followed. `before`: what comes, or came, by itself. */
  constructor(private readonly areas: string[], private readonly before: ReadonlySet<string>, private readonly configurationAt: (folder: string) => Configuration) {}

  *folder(folder: string, chain: IgnoreChain | undefined): Generator<Walked> {
    let entries: Dirent[];
    try {
      entries = readdirSync(folder, { withFileTypes: true });
    } catch (error) {
      yield { kind: 'unreadable', path: folder, problem: whyUnreadable(error) };
      return;
    }
    entries.sort((a, b) => (a.name < b.name ? -1 : 1));
    for (const entry of entries) yield* this.entry(join(folder, entry.name), entry, folder, chain);
  }

  private *entry(path: string, entry: Dirent, folder: string, chain: IgnoreChain | undefined): Generator<Walked> {
    const kind = entry.isSymbolicLink() ? this.followed(path) : entry.isDirectory() ? 'folder' : entry.isFile() ? 'file' : undefined;
    if (kind === 'folder') {
      if (isToolFolder(path, entry.name) || this.leftOut(path, true, folder, chain) || this.before.has(path)) return;
      yield* this.folder(path, extend(path, chain));
    } else if (kind === 'file' && isServed(entry.name) && !this.leftOut(path, false, folder, chain) && !this.before.has(path)) {
      yield { kind: 'file', path, named: false };
    }
  }

  private leftOut(path: string, isFolder: boolean, folder: string, chain: IgnoreChain | undefined): boolean {
    if (isIgnored(chain, path, isFolder)) return true;
    const configuration = this.configurationAt(folder);
    return configuration.file !== undefined && matches(configuration.exclude, dirname(configuration.file), path, isFolder);
  }

  /** What a link leads to, unless that is walked anyway; broken links lead nowhere. */
  private followed(path: string): 'file' | 'folder' | undefined {
    try {
      const real = realpathSync(path);
      if (this.areas.some((area) => inside(real, area) || inside(area, real))) return undefined;
      const isFolder = statSync(real).isDirectory();
      if (isFolder || isServed(path)) this.areas.push(real);
      return isFolder ? 'folder' : 'file';
    } catch {
      return undefined;
    }
  }
}

function inside(path: string, folder: string): boolean {
  return path === folder || path.startsWith(folder.endsWith(sep) ? folder : folder + sep);
}
