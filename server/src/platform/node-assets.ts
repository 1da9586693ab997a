/** What ships with the engine, read from disk: beside the bundle, or from the sources and their packages. */
import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { frontEndEntries } from '../frontends/registry.ts';
import { builtName, runtimeFile } from './grammar-files.ts';
import type { LanguageId } from '../program/nodes.ts';
import type { Assets, SignatureFiles } from '../service/contract.ts';

const here = dirname(fileURLToPath(import.meta.url));

/** All of it is at hand at once. */
export interface NodeAssets extends Assets {
  runtime(): Uint8Array;
  grammar(language: LanguageId): Uint8Array | undefined;
  signatures(language: LanguageId): SignatureFiles;
}

/** The assets of this installation. Throws where it is incomplete: that is a fault of the installation, not of any script. */
export function nodeAssets(): NodeAssets {
  const bundled = existsSync(join(here, 'grammars'));
  const signatures = bundled ? join(here, 'signatures') : join(here, '..', 'signatures');
  const grammarFile = (path: string): string => (bundled ? join(here, 'grammars', builtName(path)) : fromPackage(path));
  return {
    runtime: () => readFileSync(grammarFile(runtimeFile)),
    grammar: (language) => {
      const path = frontEndEntries.find((entry) => entry.language === language)?.grammar;
      return path === undefined ? undefined : readFileSync(grammarFile(path));
    },
    signatures: (language) => {
      const folder = join(signatures, language);
      if (!existsSync(folder)) return [];
      return readdirSync(folder).filter((name) => name.endsWith('.nomen')).sort().map((name) => ({ file: join(folder, name), text: readFileSync(join(folder, name), 'utf8') }));
    },
  };
}

/** A file of a package, found in the node_modules folders above: package maps may not export it. */
function fromPackage(path: string): string {
  for (let folder = here; ; folder = dirname(folder)) {
    const file = join(folder, 'node_modules', path);
    if (existsSync(file)) return file;
    if (dirname(folder) === folder) throw new Error(`${path} is missing: this installation is incomplete (npm ci).`);
  }
}
