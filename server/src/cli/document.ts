/** What is checked of a file: its text, or the program that the cells of a notebook make. */
import { languages } from '../frontends/registry.ts';
import { isNotebook, type Notebook, readNotebook } from '../frontends/notebook/index.ts';
import type { LanguageId } from '../program/nodes.ts';
import { languageNames, languageOf } from './languages.ts';

export interface Document {
  readonly text: string;
  readonly language: LanguageId;
  readonly notebook?: Notebook;
}

export type Opened =
  | { readonly ok: true; readonly document: Document }
  /** `otherLanguage`: nothing is wrong with the file, it only is none of ours. */
  | { readonly ok: false; readonly problem: string; readonly otherLanguage: boolean };

/** The document in a text that has the name of `file`; `language` where it was given. */
export function openDocument(file: string, text: string, language: LanguageId | undefined): Opened {
  if (!isNotebook(file)) return plain(text, language ?? languageOf(file));
  const read = readNotebook(text, language);
  if (!read.ok) return read;
  const { notebook } = read;
  if (!languages.includes(notebook.language)) return { ok: false, problem: `its kernel's language, ${notebook.language}, is not read`, otherLanguage: true };
  return { ok: true, document: { text: notebook.program.text, language: notebook.language, notebook } };
}

function plain(text: string, language: LanguageId | undefined): Opened {
  if (language) return { ok: true, document: { text, language } };
  return { ok: false, problem: `its ending names no language; --language says which it is (${languageNames.join(', ')})`, otherLanguage: true };
}
