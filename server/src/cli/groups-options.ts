/** The command line of `groups`, read into plain options. */
import { parseArgs } from 'node:util';
import { didYouMean } from '../service/suggest.ts';

export type GroupsForm = 'text' | 'json' | 'latex' | 'markdown';

export interface GroupsRequest {
  readonly paths: readonly string[];
  readonly form: GroupsForm;
  readonly functions: boolean;
  /** Lists the groups of the other sets of repeating symbols. */
  readonly alternatives: boolean;
  readonly repeating: readonly string[] | undefined;
  /** Groups to keep, as written. */
  readonly keep: readonly string[];
}

const optionTypes = {
  format: { type: 'string' },
  latex: { type: 'boolean' },
  markdown: { type: 'boolean' },
  functions: { type: 'boolean' },
  alternatives: { type: 'boolean' },
  repeating: { type: 'string' },
  keep: { type: 'string', multiple: true },
  help: { type: 'boolean', short: 'h' },
} as const;

export const groupsHelp = `Finds the dimensionless groups of relations between quantities.

Usage
  termwise groups <files…> [options]

  Relations are sentences such as \`P depends on N, D, rho, mu\` in a comment, in documentation or in a nomenclature
  file. The units of the symbols are those of the file's notes and of the nomenclature files beside and above it.

Options
  --functions            functions count as relations too: the result depends on the parameters
  --repeating a,b,c      uses these repeating symbols
  --keep expression      keeps this group, as in --keep "rho*N*D**2/mu" (repeatable)
  --alternatives         lists the groups of the other sets of repeating symbols
  --format text|json     form of the output (text)
  --latex, --markdown    for a report
  -h, --help             this text

Exit status: 0 groups were found for every relation, 1 a relation has none (a unit is missing, or a request cannot be met),
2 bad usage or input that cannot be read.
`;

/** Reads the arguments after `groups`; a sentence says what is wrong with them. Never throws. */
export function readGroupsArguments(args: readonly string[]): GroupsRequest | { readonly problem: string } | 'help' {
  const { tokens } = parseArgs({ args: [...args], options: optionTypes, strict: false, allowPositionals: true, tokens: true });
  const paths: string[] = [];
  const given = new Map<string, string[]>();
  for (const token of tokens) {
    if (token.kind === 'positional') paths.push(token.value);
    if (token.kind !== 'option') continue;
    const problem = optionProblem(token.name, token.rawName, token.value, token.inlineValue);
    if (problem) return { problem };
    given.set(token.name, [...(given.get(token.name) ?? []), token.value ?? '']);
  }
  if (given.has('help')) return 'help';
  const format = given.get('format')?.at(-1) ?? 'text';
  if (format !== 'text' && format !== 'json') return { problem: `Unknown format ${format}: it is one of text, json.${didYouMean(format, ['text', 'json'])}` };
  const forms: GroupsForm[] = [...(given.has('format') ? [format as GroupsForm] : []), ...(given.has('latex') ? ['latex' as const] : []), ...(given.has('markdown') ? ['markdown' as const] : [])];
  if (forms.length > 1) return { problem: `Only one form of output at a time: ${forms.join(', ')}.` };
  if (paths.length === 0) return { problem: 'No file given.' };
  const repeating = given.get('repeating')?.at(-1)?.split(/[\s,]+/).filter((name) => name !== '');
  return { paths, form: forms[0] ?? 'text', functions: given.has('functions'), alternatives: given.has('alternatives'), repeating, keep: given.get('keep') ?? [] };
}

function optionProblem(name: string, rawName: string, value: string | undefined, inline: boolean | undefined): string | undefined {
  if (!Object.hasOwn(optionTypes, name)) return `Unknown option ${rawName}.${didYouMean(rawName, Object.keys(optionTypes).map((each) => `--${each}`))}`;
  const takesValue = optionTypes[name as keyof typeof optionTypes].type === 'string';
  if (!takesValue) return inline ? `${rawName} takes no value.` : undefined;
  return value === undefined || value === '' ? `${rawName} needs a value.` : undefined;
}
