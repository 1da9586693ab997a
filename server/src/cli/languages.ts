import { notebookEnding } from '../frontends/notebook/index.ts';
import { frontEndEntries, languages } from '../frontends/registry.ts';
import type { LanguageId } from '../program/nodes.ts';

export { languageOf } from '../frontends/registry.ts';

/** Languages that `--language` takes. */
export const languageNames: readonly LanguageId[] = languages;

/** What a folder is searched for, as patterns of names. */
export const searchedFor: readonly string[] = [...frontEndEntries.flatMap(({ endings }) => endings), notebookEnding].map((ending) => `*${ending}`);
