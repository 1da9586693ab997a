/** Which files and folders a search leaves out. */
import { existsSync, readFileSync } from 'node:fs';
import { dirname, join, relative, sep } from 'node:path';
import ignore, { type Ignore } from 'ignore';

/** Ignore files in force in a folder, the nearest first. */
export interface IgnoreChain {
  readonly folder: string;
  readonly rules: Ignore;
  readonly outer: IgnoreChain | undefined;
}

/** The chain of a folder where a search begins: its own ignore file and those above it, up to the root of its repository. */
export function chainAt(folder: string): IgnoreChain | undefined {
  const above = dirname(folder);
  const atRoot = existsSync(join(folder, '.git')) || above === folder;
  return extend(folder, atRoot ? undefined : insideRepository(above) ? chainAt(above) : undefined);
}

/** The chain inside a folder. */
export function extend(folder: string, outer: IgnoreChain | undefined): IgnoreChain | undefined {
  const text = textOf(join(folder, '.gitignore'));
  return text === undefined ? outer : { folder, rules: ignore().add(text), outer };
}

/** Whether the nearest ignore file that says anything about a path leaves it out. */
export function isIgnored(chain: IgnoreChain | undefined, path: string, isFolder: boolean): boolean {
  for (let link = chain; link; link = link.outer) {
    const { ignored, unignored } = link.rules.test(relativeTo(link.folder, path, isFolder));
    if (ignored) return true;
    if (unignored) return false;
  }
  return false;
}

/** Whether patterns that count from `folder` match a path; a path outside of it is not matched. */
export function matches(patterns: Ignore, folder: string, path: string, isFolder: boolean): boolean {
  const name = relativeTo(folder, path, isFolder);
  return !name.startsWith('..') && patterns.ignores(name);
}

const neverSearched = new Set(['node_modules', '__pycache__', 'site-packages', 'venv', '__pypackages__']);

/** Folders of tools and installed packages: nobody's own scripts. */
export function isToolFolder(path: string, name: string): boolean {
  return name.startsWith('.') || neverSearched.has(name) || existsSync(join(path, 'pyvenv.cfg'));
}

function insideRepository(folder: string): boolean {
  if (existsSync(join(folder, '.git'))) return true;
  const above = dirname(folder);
  return above !== folder && insideRepository(above);
}

function relativeTo(folder: string, path: string, isFolder: boolean): string {
  return relative(folder, path).split(sep).join('/') + (isFolder ? '/' : '');
}

function textOf(file: string): string | undefined {
  try {
    return readFileSync(file, 'utf8');
  } catch {
    return undefined;
  }
}
