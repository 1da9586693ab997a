/** `termwise.json`: read, checked key by key, with the place of every problem. */
import ignore, { type Ignore } from 'ignore';
import { type Node, type ParseError, parseTree, printParseErrorCode } from 'jsonc-parser';
import { type FindingCode, findingCodes, type Level, levels } from '../findings/finding.ts';
import type { NoteSettings } from '../notes/types.ts';
import { LineIndex } from '../text/line-index.ts';
import { didYouMean } from './suggest.ts';

export const configurationName = 'termwise.json';

export interface Configuration {
  /** The file it was read from; undefined for the defaults. */
  readonly file: string | undefined;
  readonly severities: Readonly<Partial<Record<FindingCode, Level>>>;
  /** What it says of them; the rest is left as it is elsewhere. */
  readonly notes: Partial<NoteSettings>;
  /** Patterns in the notation of .gitignore, relative to the file's folder. */
  readonly exclude: Ignore;
}

export interface ConfigurationProblem {
  /** One-based. */
  readonly line: number;
  readonly column: number;
  readonly message: string;
}

export const defaultConfiguration: Configuration = { file: undefined, severities: {}, notes: {}, exclude: ignore() };

/** What a configuration says. Problems do not stop it: what can be read holds. */
export function readConfiguration(text: string, file: string): { readonly configuration: Configuration; readonly problems: readonly ConfigurationProblem[] } {
  const reader = new Reader(text);
  const configuration = reader.read(file);
  return { configuration, problems: reader.problems };
}

const topKeys = ['severities', 'notes', 'exclude', '$schema'];
const noteKeys = ['parentheses', 'bare'];

class Reader {
  readonly problems: ConfigurationProblem[] = [];
  private readonly lines: LineIndex;

  constructor(private readonly text: string) {
    this.lines = new LineIndex(text);
  }

  read(file: string): Configuration {
    const errors: ParseError[] = [];
    const root = parseTree(this.text, errors, { allowTrailingComma: true });
    for (const error of errors.slice(0, 1)) this.problem(error.offset, `this is not JSON: ${words(printParseErrorCode(error.error))}.`);
    const severities: Partial<Record<FindingCode, Level>> = {};
    let notes: Partial<NoteSettings> = {};
    const exclude = ignore();
    if (root && root.type !== 'object') this.problem(root.offset, 'a configuration is an object: { … }.');
    for (const { key, name, value } of this.entries(root)) {
      if (name === 'severities') this.severities(value, severities);
      else if (name === 'notes') notes = this.notes(value);
      else if (name === 'exclude') this.exclude(value, exclude);
      else if (name !== '$schema') this.unknown(key, name, topKeys);
    }
    return { file, severities, notes, exclude };
  }

  private severities(node: Node, into: Partial<Record<FindingCode, Level>>): void {
    this.object(node, 'severities');
    for (const { key, name, value } of this.entries(node)) {
      const code = findingCodes.find((each) => each === name);
      const level = levels.find((each) => each === value.value);
      if (!code) this.unknown(key, name, findingCodes);
      else if (!level) this.problem(value.offset, `${this.source(value)} is no severity; it is one of ${levels.join(', ')}.`);
      else into[code] = level;
    }
  }

  private notes(node: Node): Partial<NoteSettings> {
    this.object(node, 'notes');
    const read: { parentheses?: boolean; bare?: boolean } = {};
    for (const { key, name, value } of this.entries(node)) {
      if (name !== 'parentheses' && name !== 'bare') this.unknown(key, name, noteKeys);
      else if (typeof value.value !== 'boolean') this.problem(value.offset, `notes.${name} is true or false.`);
      else read[name] = value.value;
    }
    return read;
  }

  private exclude(node: Node, into: Ignore): void {
    if (node.type !== 'array') return this.problem(node.offset, 'exclude is a list of patterns: ["old/", "*_generated.py"].');
    for (const item of node.children ?? []) {
      if (typeof item.value === 'string') into.add(item.value);
      else this.problem(item.offset, 'a pattern of exclude is a text in quotes.');
    }
  }

  private object(node: Node, name: string): void {
    if (node.type !== 'object') this.problem(node.offset, `${name} is an object: { … }.`);
  }

  private entries(node: Node | undefined): readonly { key: Node; name: string; value: Node }[] {
    if (node?.type !== 'object') return [];
    return (node.children ?? []).flatMap((property) => {
      const [key, value] = property.children ?? [];
      return key && value ? [{ key, name: String(key.value), value }] : [];
    });
  }

  private unknown(key: Node, name: string, known: readonly string[]): void {
    const near = didYouMean(name, known);
    this.problem(key.offset, `unknown key "${name}".${near || ` Known are ${known.filter((each) => !each.startsWith('$')).join(', ')}.`}`);
  }

  private source(node: Node): string {
    return this.text.slice(node.offset, node.offset + Math.min(node.length, 40));
  }

  private problem(offset: number, message: string): void {
    const { line, column } = this.lines.position(offset);
    this.problems.push({ line: line + 1, column: column + 1, message });
  }
}

/** `CommaExpected` to `comma expected`. */
function words(name: string): string {
  return name.replace(/([a-z])([A-Z])/g, '$1 $2').toLowerCase();
}
