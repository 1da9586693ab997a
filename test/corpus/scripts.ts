/** The scripts of a corpus, as the command would find and read them. */
import { resolve } from 'node:path';
import { defaultConfiguration } from '../../server/src/service/configuration.ts';
import { openDocument } from '../../server/src/cli/document.ts';
import { readText } from '../../server/src/cli/input.ts';
import { languageOf } from '../../server/src/cli/languages.ts';
import type { LanguageId } from '../../server/src/program/nodes.ts';
import { walk } from '../../server/src/platform/walk.ts';

export interface Script {
  readonly file: string;
  /** Of a notebook: the program that its cells make. */
  readonly text: string;
  readonly language: LanguageId;
  /** What the line of an offset is called, where the text is not the file's own. */
  readonly lineName?: ((offset: number) => string) | undefined;
}

/** Scripts below a folder, in one language or in any, or the one that is named; what cannot be read is told to `unreadable`. */
export function* scriptsIn(folder: string, only: LanguageId | undefined, unreadable: (file: string, problem: string) => void): Generator<Script> {
  for (const walked of walk([resolve(folder)], () => defaultConfiguration)) {
    if (walked.kind === 'unreadable') unreadable(walked.path, walked.problem);
    else {
      const byEnding = languageOf(walked.path);
      if (byEnding === 'nomenclature' || (only && byEnding && byEnding !== only)) continue;
      const read = readText(walked.path);
      const opened = read.ok ? openDocument(walked.path, read.text, undefined) : { ...read, otherLanguage: false };
      if (!opened.ok) {
        if (!opened.otherLanguage) unreadable(walked.path, opened.problem);
        continue;
      }
      const { text, language, notebook } = opened.document;
      if (!only || language === only) yield { file: walked.path, text, language, lineName: notebook?.program.lineName };
    }
  }
}
