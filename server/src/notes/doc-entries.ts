/** What a documentation text says of which name: entries of sections, `:param x:` fields, and lines of plain lists. */
import { isBlank, type Line, linesOf } from './doc-lines.ts';
import { type Role, type Section, sectionsOf } from './doc-sections.ts';
import { firstTag, hasTags, tagEntries } from './doc-tags.ts';
import { type Piece, partOf, trimmed } from './piece.ts';

export interface DocEntry {
  readonly role: Role;
  /** None for a result without a name. */
  readonly names: readonly string[];
  /** What stands where a type would: `float, m/s`. */
  readonly type: Piece | undefined;
  readonly body: Piece | undefined;
  /** The lines of the body, for the lists in it. */
  readonly lines?: readonly Line[];
}

export interface Documentation {
  readonly text: Piece;
  readonly entries: readonly DocEntry[];
  /** The text lists numbered references, so that `[1]` in it is a citation. */
  readonly citations: boolean;
  /** The lines before the first section. */
  readonly opening: Piece;
}

const name = '\\\\?\\*{0,2}[\\p{L}_][\\p{L}\\p{N}_]*';
const names = `${name}(?:\\s*,\\s*${name})*`;
const underlinedHead = new RegExp(`^[\`]{0,2}(${names})[\`]{0,2}\\s*(?::(?!:)\\s*(.*))?$`, 'su');
const colonHead = new RegExp(`^(?:[-*•]\\s+)?[\`]{0,2}(${names})[\`]{0,2}\\s*(?:\\(([^()]*(?:\\([^()]*\\)[^()]*)*)\\)|\\[([^\\]]*)\\])?\\s*(?::(?!:)|\\s[-–—]+\\s|\\s=\\s)\\s*(.*)$`, 'su');
const sphinxHead = /^:(param|parameter|arg|argument|key|keyword|ivar|cvar|var|returns?|yields?|type|rtype)\b\s*([^:]*):\s*/;
const anySphinx = /(?:^|\n)[ \t]*[:@](?:param|arg|key|ivar|cvar|var|return|yield|type|rtype)/;
const plainHead = new RegExp(`^(?:[-*•+]\\s+|[@\\\\]param\\s+)?[\`]{0,2}(${names})[\`]{0,2}(?:\\s*:\\s*|\\s*=\\s*|\\s+[-–—]+\\s+|\\s+(?=\\[)|\\s{2,}|\\t+)(\\S.*)$`, 'su');

/** All entries of a documentation text. */
export function readDocumentation(doc: Piece): Documentation {
  const lines = linesOf(doc.text);
  if (hasTags(lines)) return { text: doc, entries: tagEntries(doc, lines), citations: false, opening: partOf(doc, 0, lines[firstTag(lines)]?.start ?? doc.text.length) };
  const sections = sectionsOf(lines);
  const entries: DocEntry[] = [];
  for (const section of sections) if (section.role !== 'skip') entries.push(...sectionEntries(doc, lines, section));
  const first = sections[0] ? firstLineOf(sections[0]) : lines.length;
  const limit = sections.some((section) => section.role !== 'skip') ? first : lines.length;
  if (anySphinx.test(doc.text)) entries.push(...sphinxEntries(doc, lines));
  if (entries.length === 0) entries.push(...plainEntries(doc, lines.slice(0, Math.min(first, limit))));
  return { text: doc, entries, citations: /^\s*\.\.\s+\[\d+\]/m.test(doc.text), opening: partOf(doc, 0, lines[first]?.start ?? doc.text.length) };
}

function firstLineOf(section: Section): number {
  return section.from - (section.style === 'underlined' ? 2 : 1);
}

function sectionEntries(doc: Piece, lines: readonly Line[], section: Section): readonly DocEntry[] {
  const body = lines.slice(section.from, section.to);
  if (section.style === 'markdown') return plainEntries(doc, body).map((entry) => ({ ...entry, role: section.role as Role }));
  const base = body.reduce((least, line) => Math.min(least, line.indent), Number.POSITIVE_INFINITY);
  const starts = body.flatMap((line, at) => (line.indent === base && !isBlank(line) ? [at] : []));
  if (section.role === 'result' && isProse(body, starts, section)) return [{ role: 'result', names: [], type: undefined, body: textOf(doc, body, 0, body.length) }];
  return starts.flatMap((at, index): DocEntry[] => {
    const entry = section.style === 'underlined' ? underlinedEntry(doc, body, at, starts[index + 1] ?? body.length, section.role as Role) : colonEntry(doc, body, at, starts[index + 1] ?? body.length, section.role as Role);
    return entry ? [entry] : [];
  });
}

/** Several lines at one depth without any name are one text. */
function isProse(body: readonly Line[], starts: readonly number[], section: Section): boolean {
  const head = section.style === 'underlined' ? underlinedHead : colonHead;
  const deeper = body.some((line, at) => !isBlank(line) && !starts.includes(at));
  if (section.style === 'underlined') return starts.length > 1 && !deeper && !starts.some((at) => head.exec((body[at] as Line).text)?.[2] !== undefined);
  return !starts.some((at) => head.test((body[at] as Line).text));
}

function underlinedEntry(doc: Piece, body: readonly Line[], at: number, to: number, role: Role): DocEntry | undefined {
  const line = body[at] as Line;
  const match = underlinedHead.exec(line.text);
  const below = textOf(doc, body, at + 1, to);
  const lines = body.slice(at + 1, to);
  const named = match && (match[2] !== undefined || role !== 'result') && !isType(match[1] as string);
  if (!named) {
    if (role === 'result') return { role, names: [], type: pieceOf(doc, line, line.text), body: below, lines };
    const spaced = plainHead.exec(line.text);
    return spaced ? { role, names: namesIn(spaced[1] as string), type: pieceOf(doc, line, spaced[2] as string), body: below } : undefined;
  }
  return { role, names: namesIn(match[1] as string), type: match[2] ? pieceOf(doc, line, match[2]) : undefined, body: below, lines };
}

function colonEntry(doc: Piece, body: readonly Line[], at: number, to: number, role: Role): DocEntry | undefined {
  const line = body[at] as Line;
  const match = colonHead.exec(line.text);
  if (!match) return role === 'result' ? { role, names: [], type: undefined, body: textOf(doc, body, at, to) } : undefined;
  const rest = match[4] as string;
  const type = match[2] ?? match[3];
  const typeAt = type === undefined ? -1 : line.text.indexOf(type, (match[1] as string).length);
  const start = line.start + line.indent + line.text.length - rest.length;
  const anonymous = isType(match[1] as string) && role === 'result';
  return {
    role, names: anonymous ? [] : namesIn(match[1] as string),
    type: type === undefined || type === '' ? undefined : partOf(doc, line.start + line.indent + typeAt - (match[3] === undefined ? 0 : 1), line.start + line.indent + typeAt + type.length + (match[3] === undefined ? 0 : 1)),
    body: rest === '' ? textOf(doc, body, at + 1, to) : trimmed(partOf(doc, start, lastEnd(body, at, to))),
  };
}

/** `float`, `array_like`: a type where a name could stand. */
function isType(text: string): boolean {
  return /^(?:float|int|array|array_like|arraylike|ndarray|numeric|number|scalar|list|tuple|bool|str|string|dict|Series|DataFrame|None)$/.test(text);
}

function sphinxEntries(doc: Piece, lines: readonly Line[]): readonly DocEntry[] {
  const entries: DocEntry[] = [];
  lines.forEach((line, at) => {
    const match = line.text.startsWith(':') || line.text.startsWith('@') ? sphinxHead.exec(line.text.replace(/^@/, ':')) : null;
    if (!match) return;
    const [whole, field = '', between = ''] = match;
    let to = at + 1;
    while (to < lines.length && (lines[to] as Line).indent > line.indent && !isBlank(lines[to] as Line)) to++;
    const body = trimmed(partOf(doc, line.start + line.indent + whole.length, Math.max(lastEnd(lines, at, to), line.start + line.indent + whole.length)));
    const words = between.trim().split(/\s+/).filter((word) => word !== '');
    const role: Role = /^(?:return|yield|rtype)/.test(field) ? 'result' : /var$/.test(field) ? 'field' : 'parameter';
    const typed = field === 'type' || field === 'rtype';
    entries.push({ role, names: role === 'result' ? [] : namesIn(words.at(-1) ?? ''), type: typed ? body : undefined, body: typed ? undefined : body });
  });
  return entries;
}

/** Entries such as `V [m/s] velocity`, `V: velocity [m/s]` among lines of `doc`; whoever asks drops the names that are none. */
export function plainEntries(doc: Piece, lines: readonly Line[]): readonly DocEntry[] {
  return lines.flatMap((line, at): DocEntry[] => {
    const match = line.text.length < 400 ? plainHead.exec(line.text) : null;
    if (!match || isUsage(line.text, match[2] as string)) return [];
    let to = at + 1;
    while (to < lines.length && (lines[to] as Line).indent > line.indent && !isBlank(lines[to] as Line)) to++;
    const start = line.start + line.indent + line.text.length - (match[2] as string).length;
    return [{ role: 'parameter', names: namesIn(match[1] as string), type: undefined, body: partOf(doc, start, lastEnd(lines, at, to)) }];
  });
}

/** `E = photon(lambda)`: how a function is called, and no description. */
function isUsage(line: string, body: string): boolean {
  return /^\s*[\p{L}_][\p{L}\p{N}_.]*\(/u.test(body) && /=\s*$/.test(line.slice(0, line.length - body.length));
}

function namesIn(text: string): readonly string[] {
  return text.split(',').map((each) => each.replace(/[\\*`\s]/g, '')).filter((each) => each !== '');
}

function pieceOf(doc: Piece, line: Line, rest: string): Piece {
  const end = line.start + line.indent + line.text.length;
  return partOf(doc, end - rest.length, end);
}

/** The text of some lines, without the blanks around it. */
function textOf(doc: Piece, lines: readonly Line[], from: number, to: number): Piece | undefined {
  const first = lines.slice(from, to).find((line) => !isBlank(line));
  return first && partOf(doc, first.start + first.indent, lastEnd(lines, from, to));
}

function lastEnd(lines: readonly Line[], from: number, to: number): number {
  for (let at = to - 1; at >= from; at--) if (!isBlank(lines[at] as Line)) return (lines[at] as Line).end;
  return lines[from]?.end ?? 0;
}
