/** The command line, read into plain options. */
import { parseArgs } from 'node:util';
import { type FindingCode, findingCodes, type Level, levels } from '../findings/finding.ts';
import type { LanguageId } from '../program/nodes.ts';
import { languageNames } from './languages.ts';
import { didYouMean } from '../service/suggest.ts';

export type FormatName = 'text' | 'json' | 'sarif';
export interface CheckOptions {
  /** Files and folders as given; `-` is standard input. */
  readonly paths: readonly string[];
  readonly format: FormatName;
  readonly severities: Readonly<Partial<Record<FindingCode, Level>>>;
  readonly hints: boolean;
  readonly stats: boolean;
  readonly color: boolean;
  /** Writes the proven fixes into the files; `show` prints them as a diff and writes nothing. */
  readonly fix?: 'write' | 'show';
  readonly language?: LanguageId;
  /** The name under which standard input is checked. */
  readonly stdinFile?: string;
  readonly config?: string;
  /** A file of known findings, which are left out. */
  readonly baseline?: string;
  /** Where the findings are written down as known. */
  readonly writeBaseline?: string;
  /** Only files that differ from this revision are checked. */
  readonly since?: string;
}

export type Request =
  | { readonly kind: 'check'; readonly options: CheckOptions }
  | { readonly kind: 'help'; readonly about?: 'check' | FindingCode }
  | { readonly kind: 'version' }
  /** What is wrong with the command line, in a sentence. */
  | { readonly kind: 'misuse'; readonly problem: string };

export const formatNames: readonly FormatName[] = ['text', 'json', 'sarif'];
const optionTypes = {
  format: { type: 'string' },
  severity: { type: 'string', multiple: true },
  hints: { type: 'boolean' },
  stats: { type: 'boolean' },
  language: { type: 'string' },
  'stdin-file': { type: 'string' },
  config: { type: 'string' },
  'no-color': { type: 'boolean' },
  fix: { type: 'boolean' },
  'dry-run': { type: 'boolean' },
  baseline: { type: 'string' },
  'write-baseline': { type: 'string' },
  changed: { type: 'boolean' },
  since: { type: 'string' },
  help: { type: 'boolean', short: 'h' },
  version: { type: 'boolean', short: 'V' },
} as const;
type OptionName = keyof typeof optionTypes;

const commands = ['check', 'groups', 'help', 'version'];

/** Reads the arguments after the program's name. Never throws. */
export function readArguments(args: readonly string[]): Request {
  const { tokens } = parseArgs({ args: [...args], options: optionTypes, strict: false, allowPositionals: true, tokens: true });
  const positionals: string[] = [];
  const given = new Map<OptionName, string[]>();
  for (const token of tokens) {
    if (token.kind === 'positional') positionals.push(token.value);
    if (token.kind !== 'option') continue;
    const problem = optionProblem(token);
    if (problem) return { kind: 'misuse', problem };
    const name = token.name as OptionName;
    given.set(name, [...(given.get(name) ?? []), token.value ?? '']);
  }
  return requestOf(positionals, given);
}

function optionProblem(token: { name: string; rawName: string; value?: string | undefined; inlineValue?: boolean | undefined }): string | undefined {
  if (!Object.hasOwn(optionTypes, token.name)) return `Unknown option ${token.rawName}.${didYouMean(token.rawName, Object.keys(optionTypes).map((name) => `--${name}`))}`;
  const takesValue = optionTypes[token.name as OptionName].type === 'string';
  if (!takesValue) return token.inlineValue ? `${token.rawName} takes no value.` : undefined;
  const missing = token.value === undefined || token.value === '' || (!token.inlineValue && token.value.startsWith('-') && token.value !== '-');
  return missing ? `${token.rawName} needs a value: ${valueHelp[token.name] ?? 'a name'}.` : undefined;
}

const valueHelp: Record<string, string> = {
  format: formatNames.join(', '),
  severity: 'code=level, as in hidden-unit=error',
  language: languageNames.join(', '),
  'stdin-file': 'a file name',
  config: 'a configuration file',
  baseline: 'a file that --write-baseline wrote',
  'write-baseline': 'the file to write',
  since: 'a revision, as in --since main',
};

function requestOf(positionals: readonly string[], given: ReadonlyMap<OptionName, readonly string[]>): Request {
  const [command, ...rest] = positionals;
  if (given.has('version') || command === 'version') return { kind: 'version' };
  if (given.has('help') || command === 'help') return helpRequest(command === 'help' ? rest[0] : command);
  if (command === undefined) return { kind: 'misuse', problem: 'No command given.' };
  if (command !== 'check') return { kind: 'misuse', problem: unknownCommand(command) };
  return checkRequest(rest, given);
}

function helpRequest(command: string | undefined): Request {
  if (command === undefined || command === 'help') return { kind: 'help' };
  if (command === 'check' || isOneOf(findingCodes, command)) return { kind: 'help', about: command };
  return { kind: 'misuse', problem: `No help on ${command}.${didYouMean(command, [...commands, ...findingCodes])}` };
}

function unknownCommand(word: string): string {
  const asFile = /[./\\]/.test(word) || word === '-';
  return asFile ? `"${word}" is no command; to check a file, say termwise check ${word}` : `Unknown command ${word}.${didYouMean(word, commands)}`;
}

function checkRequest(paths: readonly string[], given: ReadonlyMap<OptionName, readonly string[]>): Request {
  const last = (name: OptionName): string | undefined => given.get(name)?.at(-1);
  const misuse = (problem: string): Request => ({ kind: 'misuse', problem });
  if (paths.length === 0) return misuse('Nothing to check: name files or folders, or - for standard input.');
  const format = last('format') ?? 'text';
  if (!isOneOf(formatNames, format)) return misuse(`Unknown format ${format}: it is one of ${formatNames.join(', ')}.${didYouMean(format, formatNames)}`);
  const language = last('language');
  if (language !== undefined && !isOneOf(languageNames, language)) return misuse(`Unknown language ${language}: it is one of ${languageNames.join(', ')}.${didYouMean(language, languageNames)}`);
  const fix = given.has('fix') ? (given.has('dry-run') ? 'show' : 'write') : undefined;
  if (!fix && given.has('dry-run')) return misuse('--dry-run shows what --fix would change; say --fix --dry-run.');
  if (fix && paths.includes('-')) return misuse('--fix writes files; standard input has none.');
  if (fix === 'show' && format !== 'text') return misuse(`--fix --dry-run prints a diff, which has no ${format} form.`);
  const severities: Partial<Record<FindingCode, Level>> = {};
  for (const setting of given.get('severity') ?? []) {
    const read = severitySetting(setting);
    if (typeof read === 'string') return misuse(read);
    severities[read.code] = read.level;
  }
  const [stdinFile, config, baseline, writeBaseline] = [last('stdin-file'), last('config'), last('baseline'), last('write-baseline')];
  const since = last('since') ?? (given.has('changed') ? 'HEAD' : undefined);
  if (baseline !== undefined && writeBaseline !== undefined) return misuse('--baseline leaves known findings out, --write-baseline writes them down: say one of them.');
  if (since !== undefined && paths.includes('-')) return misuse('--changed and --since choose among files; standard input is none.');
  const options: CheckOptions = {
    paths, format, severities, hints: given.has('hints'), stats: given.has('stats'), color: !given.has('no-color'),
    ...(language !== undefined && { language }), ...(stdinFile !== undefined && { stdinFile }), ...(config !== undefined && { config }), ...(fix && { fix }),
    ...(baseline !== undefined && { baseline }), ...(writeBaseline !== undefined && { writeBaseline }), ...(since !== undefined && { since }),
  };
  return { kind: 'check', options };
}

function severitySetting(text: string): { code: FindingCode; level: Level } | string {
  const at = text.indexOf('=');
  if (at < 0) return `--severity ${text}: expected code=level, as in hidden-unit=error.`;
  const [code, level] = [text.slice(0, at), text.slice(at + 1)];
  if (!isOneOf(findingCodes, code)) return `--severity ${text}: unknown code ${code}.${didYouMean(code, findingCodes)}`;
  if (!isOneOf(levels, level)) return `--severity ${text}: unknown level ${level}; it is one of ${levels.join(', ')}.`;
  return { code, level };
}

function isOneOf<T extends string>(known: readonly T[], word: string): word is T {
  return (known as readonly string[]).includes(word);
}
