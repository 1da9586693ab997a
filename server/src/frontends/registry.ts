/** The host languages: one line each. */
import type { LanguageId } from '../program/nodes.ts';
import type { FrontEndEntry } from './frontend.ts';
import { fortranEntry } from './fortran/index.ts';
import { javascriptEntry, typescriptEntry } from './javascript/index.ts';
import { juliaEntry } from './julia/index.ts';
import { isNotebook } from './notebook/read.ts';
import { matlabEntry } from './matlab/index.ts';
import { nomenclatureEntry } from './nomenclature/index.ts';
import { pythonEntry } from './python/index.ts';

export const frontEndEntries: readonly FrontEndEntry[] = [
  pythonEntry,
  matlabEntry,
  javascriptEntry,
  typescriptEntry,
  juliaEntry,
  fortranEntry,
  nomenclatureEntry,
];

/** Every language served. */
export const languages: readonly LanguageId[] = frontEndEntries.map(({ language }) => language);

/** Whether a folder is searched for a file of this name: a script of a language served, or a notebook, whose language stands in it. */
export function isServed(file: string): boolean {
  return languageOf(file) !== undefined || isNotebook(file);
}

/** The language of a file by its ending. */
export function languageOf(file: string): LanguageId | undefined {
  const lower = file.toLowerCase();
  return frontEndEntries.find(({ endings }) => endings.some((ending) => lower.endsWith(ending)))?.language;
}
