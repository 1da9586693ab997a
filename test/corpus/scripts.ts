/** The scripts of a corpus, as the command would find and read them. */
import { resolve } from 'node:path';
import { defaultConfiguration } from '../../server/src/service/configuration.ts';
import { readText } from '../../server/src/cli/input.ts';
import { languageOf } from '../../server/src/cli/languages.ts';
import type { LanguageId } from '../../server/src/program/nodes.ts';
import { walk } from '../../server/src/platform/walk.ts';

export interface Script {
  readonly file: string;
  readonly text: string;
  readonly language: LanguageId;
}

/** Scripts below a folder, in one language or in any, or the one that is named; what cannot be read is told to `unreadable`. */
export function* scriptsIn(folder: string, only: LanguageId | undefined, unreadable: (file: string, problem: string) => void): Generator<Script> {
  for (const walked of walk([resolve(folder)], () => defaultConfiguration)) {
    if (walked.kind === 'unreadable') unreadable(walked.path, walked.problem);
    else {
      const language = languageOf(walked.path);
      if (!language || language === 'nomenclature' || (only && language !== only)) continue;
      const read = readText(walked.path);
      if (read.ok) yield { file: walked.path, text: read.text, language };
      else unreadable(walked.path, read.problem);
    }
  }
}
