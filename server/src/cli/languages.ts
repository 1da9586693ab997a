import { frontEndEntries, languages } from '../frontends/registry.ts';
import type { LanguageId } from '../program/nodes.ts';

export { languageOf } from '../frontends/registry.ts';

/** Languages that `--language` takes. */
export const languageNames: readonly LanguageId[] = languages;

/** Endings of the files that a folder is searched for, by language. */
export const languageEndings: readonly (readonly [LanguageId, readonly string[]])[] = frontEndEntries.map(({ language, endings }) => [language, endings]);
