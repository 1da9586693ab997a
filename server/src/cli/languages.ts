import type { LanguageId } from '../program/nodes.ts';

/** Endings of the files that a folder is searched for, by language. A test holds them against the front ends. */
export const languageEndings: readonly (readonly [LanguageId, readonly string[]])[] = [
  ['python', ['.py', '.pyw']],
  ['nomenclature', ['.nomen']],
];

/** Languages that `--language` takes. */
export const languageNames: readonly LanguageId[] = languageEndings.map(([language]) => language);

/** The language of a file by its ending. */
export function languageOf(file: string): LanguageId | undefined {
  const lower = file.toLowerCase();
  return languageEndings.find(([, endings]) => endings.some((ending) => lower.endsWith(ending)))?.[0];
}
