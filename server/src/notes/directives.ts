/** What an author tells Termwise in a comment or in documentation: allow, empirical, depends on. */
import { findingCodes } from '../program/codes.ts';
import { parseUnit } from '../quantities/parse-unit.ts';
import type { Vocabulary } from '../quantities/unit-result.ts';
import type { Span } from '../text/span.ts';
import { type Piece, spanIn, trimmed } from './piece.ts';
import type { Directive } from './types.ts';

const allow = /termwise:\s*allow\b[ \t]*/i;
const code = /^([A-Za-z]+(?:-[A-Za-z]+)*)\s*(?:,\s*)?/;
const empirical = /(?:^|\b(?:termwise:)\s*)\s*empirical:\s*(.+)$/i;
const symbol = '[\\p{L}_][\\p{L}\\p{N}_.]*';
const depends = new RegExp(`^(${symbol})\\s+depends\\s+on\\s+(${symbol}(?:\\s*,\\s*${symbol})*(?:\\s*,?\\s+and\\s+${symbol})?)\\s*\\.?$`, 'u');

/** The directives in one line. `occurs`: whether a name is used in the code around, which tells `y depends on x` from prose. */
export function directivesIn(line: Piece, wholeFile: () => boolean, vocabulary: Vocabulary, occurs: (name: string) => boolean): readonly Directive[] {
  if (!/termwise|empirical|depends/i.test(line.text)) return [];
  const told = allow.exec(line.text);
  if (told) return allowDirectives(line, told.index, told.index + told[0].length, wholeFile);
  const one = relation(line, occurs) ?? empiricalDirective(line, vocabulary) ?? unknownDirective(line);
  return one ? [one] : [];
}

/** The directive in one line of a text at an offset, where every name is known. */
export function directiveIn(line: string, offset: number, wholeFile: boolean, vocabulary: Vocabulary): Directive | undefined {
  return directivesIn({ text: line, start: offset }, () => wholeFile, vocabulary, () => true)[0];
}

function allowDirectives(line: Piece, start: number, from: number, wholeFile: () => boolean): readonly Directive[] {
  const span = spanIn(line, start, line.text.trimEnd().length);
  let rest = line.text.slice(from);
  const codes: string[] = [];
  for (let match = code.exec(rest); match; match = code.exec(rest)) {
    codes.push(match[1] as string);
    rest = rest.slice(match[0].length);
    if (!/,\s*$/.test(match[0])) break;
  }
  const unknown = codes.find((each) => !(findingCodes as readonly string[]).includes(each));
  if (codes.length === 0 || unknown !== undefined) {
    const none = unknown === undefined ? '' : `; \`${unknown}\` is none`;
    return [{ kind: 'malformed', problem: `\`allow\` needs the code of a finding, for example \`termwise: allow hidden-unit — published correlation\`${none}.`, span }];
  }
  const reason = /^(?:[—–:]|-{1,2}(?=\s))\s*(.*\S)/s.exec(rest)?.[1];
  if (reason === undefined) return [{ kind: 'malformed', problem: `\`allow ${codes.join(', ')}\` needs a reason behind a dash: why is it right here?`, span }];
  return codes.map((each) => ({
    kind: 'allow', code: each, reason, span,
    get wholeFile() {
      return wholeFile();
    },
  }));
}

function unknownDirective(line: Piece): Directive | undefined {
  const match = /^\W*termwise:\s*([\w-]*)/i.exec(line.text);
  if (!match) return undefined;
  return { kind: 'malformed', problem: `\`termwise: ${match[1]}\` says nothing that can be followed; \`termwise: allow <code> — reason\` does.`, span: spanOf(line) };
}

/** `P depends on N, D, rho`: identifiers only, and names of the code or a plain list. */
function relation(line: Piece, occurs: (name: string) => boolean): Directive | undefined {
  const match = depends.exec(line.text.trim().replace(/^[-*•]\s+/, ''));
  if (!match) return undefined;
  const on = (match[2] as string).split(/\s*,\s*(?:and\s+)?|\s+and\s+/);
  const dependent = match[1] as string;
  const known = [dependent, ...on].every(occurs);
  if (!known && (on.length < 2 || /\band\b/.test(match[2] as string) || [dependent, ...on].some((each) => each.length > 12))) return undefined;
  return { kind: 'depends', dependent, on, span: spanOf(line) };
}

function empiricalDirective(line: Piece, vocabulary: Vocabulary): Directive | undefined {
  const match = empirical.exec(line.text);
  if (!match) return undefined;
  const list = match[1] as string;
  const from = match.index + match[0].length - list.length;
  const units: Extract<Directive, { kind: 'empirical' }>['units'][number][] = [];
  for (const item of list.matchAll(new RegExp(`(${symbol}(?:\\[["']\\w+["']\\])?)\\s*\\[([^\\]]*)\\]`, 'gu'))) {
    const [whole, name = '', inner = ''] = item;
    const start = from + item.index + whole.length - inner.length - 1;
    const span = spanIn(line, start, start + inner.length);
    const result = parseUnit(inner, { vocabulary, describes: name });
    if (!result.ok) return { kind: 'malformed', problem: `\`${inner}\` is not a unit known here.`, span };
    units.push({ symbol: name, unit: result.unit, span });
  }
  return units.length > 0 ? { kind: 'empirical', units, span: spanOf(line) } : undefined;
}

function spanOf(line: Piece): Span {
  const inner = trimmed(line);
  return spanIn(inner, 0, inner.text.length);
}
