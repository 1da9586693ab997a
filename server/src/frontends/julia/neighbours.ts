/** Files of one module: `include` joins them, and each sees the names of all. */
import type { ImportStmt } from '../../program/nodes.ts';
import { join, parent } from '../../text/paths.ts';
import type { FileSource } from '../frontend.ts';

const levelsUp = 4;
const most = 400;

interface Outline {
  readonly text: string;
  readonly names: ReadonlySet<string>;
  readonly includes: readonly string[];
}

const outlines = new Map<string, Outline>();

/** Another file of the module of `file` that defines a name; undefined where there is none. */
export function neighbourOf(file: string, name: string, source: FileSource): string | undefined {
  const wanted = name.slice(name.lastIndexOf('.') + 1);
  return moduleFiles(file, source).find((each) => each !== file && outlineOf(each, source)?.names.has(wanted));
}

/** The file that holds a module of this name: one of the same module, or beside the script. */
export function resolveModule(file: string, statement: ImportStmt, _name: string | undefined, source: FileSource): string | undefined {
  const wanted = statement.module.split('.').at(-1) ?? '';
  if (wanted === '') return undefined;
  const own = moduleFiles(file, source).find((each) => each !== file && outlineOf(each, source)?.names.has(`module ${wanted}`));
  if (own) return own;
  const folder = parent(file);
  const beside = [folder, join(folder, 'src')].find((each) => source.list(each).includes(`${wanted}.jl`));
  const found = beside && join(beside, `${wanted}.jl`);
  return found === file ? undefined : found;
}

interface Found {
  readonly root: string;
  readonly text: string | undefined;
  readonly files: readonly string[];
}

const modules = new WeakMap<FileSource, Map<string, Found>>();

/** The files of the module around a file, searched again where the file that joins them changed. */
function moduleFiles(file: string, source: FileSource): readonly string[] {
  const known = modules.get(source) ?? new Map<string, Found>();
  modules.set(source, known);
  const found = known.get(file);
  if (found && source.read(found.root) === found.text) return found.files;
  const files = searched(file, source);
  const root = files[0] ?? file;
  known.set(file, { root, text: source.read(root), files });
  return files;
}

/** The files that the topmost file including this one reads, itself among them; only this file where none does. */
function searched(file: string, source: FileSource): readonly string[] {
  let best = reach(file, source);
  let folder = parent(file);
  for (let up = 0; up < levelsUp; up++) {
    for (const each of source.list(folder).filter((name) => name.endsWith('.jl')).map((name) => join(folder, name))) {
      if (each === file || (outlineOf(each, source)?.includes.length ?? 0) === 0) continue;
      const reached = reach(each, source);
      if (reached.includes(file) && reached.length > best.length) best = reached;
    }
    const above = parent(folder);
    if (above === folder) break;
    folder = above;
  }
  return best;
}

function reach(file: string, source: FileSource): readonly string[] {
  const found = [file];
  for (let at = 0; at < found.length && found.length < most; at++) {
    for (const each of outlineOf(found[at] as string, source)?.includes ?? []) if (!found.includes(each)) found.push(each);
  }
  return found;
}

/** What a file defines and includes, by its lines; read again where its text changed. */
function outlineOf(file: string, source: FileSource): Outline | undefined {
  const text = source.read(file);
  if (text === undefined) return undefined;
  const known = outlines.get(file);
  if (known && known.text === text) return known;
  const outline = { text, names: namesIn(text), includes: includesIn(text, parent(file)) };
  if (outlines.size > 4000) outlines.clear();
  outlines.set(file, outline);
  return outline;
}

const word = '[\\p{L}_][\\p{L}\\p{N}\\p{M}_!′²³₀-₉]*';
const heads = new RegExp(`^[ \\t]*(?:@[\\w.]+[ \\t]+)*(?:(module|baremodule)[ \\t]+(${word})|(?:function|(?:mutable[ \\t]+)?struct)[ \\t]+(${word})|(?:const[ \\t]+)(${word})|(${word})(?:\\{[^}\\n]*\\})?\\([^\\n]*\\)[^\\n=]*=(?!=))`, 'gmu');
const assigned = new RegExp(`^(${word})[ \\t]*=(?!=)`, 'gmu');

function namesIn(text: string): ReadonlySet<string> {
  const names = new Set<string>();
  for (const [, kind, module, fn, constant, short] of text.matchAll(heads)) names.add(kind ? `module ${module}` : (fn ?? constant ?? short ?? ''));
  for (const [, name] of text.matchAll(assigned)) names.add(name as string);
  return names;
}

function includesIn(text: string, folder: string): readonly string[] {
  return [...text.matchAll(/^[ \t]*(?:Base\.)?include\(\s*(?:joinpath\(([^)\n]*)\)|"([^"\n]+)")\s*\)/gm)].flatMap(([, joined, plain]) => {
    const parts = plain ?? [...(joined as string).matchAll(/"([^"]*)"/g)].map(([, part]) => part).join('/');
    return parts.endsWith('.jl') ? [parts.split('/').reduce((at, part) => (part === '..' ? parent(at) : part === '.' || part === '' ? at : join(at, part)), folder)] : [];
  });
}
