/** Entries by tag: `@param {number} V - speed [m/s]` of JSDoc, `\param[in] V speed [m/s]` of Doxygen. */
import type { DocEntry } from './doc-entries.ts';
import { isBlank, type Line } from './doc-lines.ts';
import type { Role } from './doc-sections.ts';
import { type Piece, partOf, trimmed } from './piece.ts';

/** Tag, direction, type and what follows. */
const tag = /^[@\\](param|arg|argument|prop|property|returns?|result|yields?)(?:\[[a-z, ]*\])?(?=[\s{]|$)\s*(\{(?:[^{}]|\{[^{}]*\})*\})?\s*/;
const anyTag = /^[@\\][a-zA-Z]+/;
/** `@param x: …` of Epytext has a reader of its own. */
const epytext = /^@(?:param|arg|argument)\s+\w+\s*:|^@returns?\s*:/;
const named = /^(?:\[\s*)?([\p{L}_$][\p{L}\p{N}_$.]*)(?:\s*=(?:[^\][]|\[[^\]]*\])*)?(?:\s*\])?(?:\s+[-–—:]+\s*|\s*[-–—:]\s+|\s+|$)/u;
const numberless = /^\{[\s?!]*(?:string|boolean|bool|object|Object|Function|function|Date|Promise|Map|Set|RegExp|void|symbol|HTML\w*|["'(`]|\{)/;
const numeric = /\b(?:number|Number|float|int|any|bigint|Float\d+Array)\b|\*/;

/** Whether the lines hold tags of this form. */
export function hasTags(lines: readonly Line[]): boolean {
  return lines.some(({ text }) => tag.test(text) && !epytext.test(text));
}

/** The line of the first tag of any kind. */
export function firstTag(lines: readonly Line[]): number {
  const at = lines.findIndex(({ text }) => anyTag.test(text));
  return at < 0 ? lines.length : at;
}

/** One entry a tag; what is said of texts, flags and objects is left out. */
export function tagEntries(doc: Piece, lines: readonly Line[]): readonly DocEntry[] {
  return lines.flatMap((line, at): readonly DocEntry[] => {
    const match = tag.exec(line.text);
    if (!match) return [];
    const [whole, word = '', type] = match;
    const role = roleOf(word);
    if (type !== undefined && (role === 'result' ? !numeric.test(type) || numberless.test(type) : numberless.test(type) && !numeric.test(type))) return [];
    const rest = line.text.slice(whole.length);
    const name = role === 'result' ? undefined : named.exec(rest);
    if (role !== 'result' && !name?.[1]) return [];
    const start = line.start + line.indent + whole.length + (role === 'result' ? (/^[-–—:]\s*/.exec(rest)?.[0].length ?? 0) : (name?.[0].length ?? 0));
    const body = trimmed(partOf(doc, start, Math.max(endOf(lines, at), start)));
    return [{ role, names: name?.[1] ? [name[1]] : [], type: undefined, body: body.text === '' ? undefined : body }];
  });
}

function roleOf(word: string): Role {
  return /^(?:return|result|yield)/.test(word) ? 'result' : word.startsWith('prop') ? 'field' : 'parameter';
}

/** The end of the paragraph that a tag opens. */
function endOf(lines: readonly Line[], at: number): number {
  let last = at;
  while (last + 1 < lines.length && !isBlank(lines[last + 1] as Line) && !anyTag.test((lines[last + 1] as Line).text)) last++;
  return (lines[last] as Line).end;
}
