import { parseArgs } from 'node:util';
import { languages } from '../../server/src/frontends/registry.ts';
import type { LanguageId } from '../../server/src/program/nodes.ts';

export interface CorpusOptions {
  readonly folder: string;
  /** Only scripts in this language; every language where undefined. */
  readonly language: LanguageId | undefined;
  readonly seedEdits: boolean;
  readonly missed: boolean;
  /** Tries the repairs of each reported edit. */
  readonly repairs: boolean;
  readonly list: readonly string[];
  /** How many of the commonest unread spellings are printed. */
  readonly unread: number;
}

/** Reads the arguments of the corpus run; an answer of a string says what is wrong with them. */
export function readCorpusArguments(args: readonly string[]): CorpusOptions | string {
  const usage = 'usage: npm run corpus -- <folder> [--language name] [--list code|all] [--unread count] [--seed-edits [--missed] [--repairs]]';
  try {
    const { values, positionals } = parseArgs({
      args: [...args],
      allowPositionals: true,
      options: { language: { type: 'string' }, 'seed-edits': { type: 'boolean' }, missed: { type: 'boolean' }, repairs: { type: 'boolean' }, list: { type: 'string', multiple: true }, unread: { type: 'string', default: '40' } },
    });
    const [folder] = positionals;
    if (folder === undefined || positionals.length > 1) return usage;
    const language = languages.find((each) => each === values.language);
    if (values.language !== undefined && !language) return `--language takes ${languages.join(', ')}\n${usage}`;
    return { folder, language, seedEdits: values['seed-edits'] ?? false, missed: values.missed ?? false, repairs: values.repairs ?? false, list: values.list ?? [], unread: Number(values.unread) };
  } catch (error) {
    return `${error instanceof Error ? error.message : String(error)}\n${usage}`;
  }
}
