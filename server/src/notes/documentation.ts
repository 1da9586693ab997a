/** Entries of a docstring: which name or result each describes, with its text. Numpydoc, Google, Sphinx and plain lists. */

export interface DocEntry {
  readonly kind: 'parameter' | 'result' | 'field';
  readonly names: readonly string[];
  /** What stands on the entry's own line behind the name: the type, or the description. */
  readonly head: Piece;
  /** The lines below it. */
  readonly body: readonly Piece[];
  /** The description begins on the entry's own line (Google, Sphinx). */
  readonly inline: boolean;
}

export interface Piece {
  readonly text: string;
  readonly start: number;
}

interface Line extends Piece {
  readonly indent: number;
}

const sections: Record<string, DocEntry['kind'] | 'skip'> = {
  parameters: 'parameter', 'other parameters': 'parameter', args: 'parameter', arguments: 'parameter', params: 'parameter', inputs: 'parameter', input: 'parameter', 'keyword arguments': 'parameter', 'keyword args': 'parameter',
  returns: 'result', return: 'result', yields: 'result', outputs: 'result', output: 'result',
  attributes: 'field', notes: 'skip', examples: 'skip', example: 'skip', references: 'skip', raises: 'skip', warnings: 'skip', 'see also': 'skip', reference: 'skip', note: 'skip', todo: 'skip', warns: 'skip', methods: 'skip',
};

/** All entries of a documentation text; offsets are relative to the text. */
export function entriesOf(text: string): readonly DocEntry[] {
  const lines = linesOf(text);
  const entries: DocEntry[] = [];
  for (let at = 0; at < lines.length; at++) {
    const line = lines[at] as Line;
    const sphinx = sphinxEntry(lines, at);
    if (sphinx) entries.push(sphinx);
    const kind = sectionAt(lines, at);
    if (!kind) continue;
    const underlined = /^\s*[-=~]{3,}\s*$/.test(lines[at + 1]?.text ?? '');
    const from = at + (underlined ? 2 : 1);
    const to = sectionEnd(lines, from, line.indent, underlined);
    if (kind !== 'skip') entries.push(...sectionEntries(lines.slice(from, to), kind, line.indent, underlined));
    at = to - 1;
  }
  return entries.length > 0 ? entries : plainList(lines);
}

function linesOf(text: string): readonly Line[] {
  const lines: Line[] = [];
  let start = 0;
  for (const raw of text.split('\n')) {
    const line = raw.endsWith('\r') ? raw.slice(0, -1) : raw;
    lines.push({ text: line, start, indent: line.trim() === '' ? Number.POSITIVE_INFINITY : line.length - line.trimStart().length });
    start += raw.length + 1;
  }
  return lines;
}

function sectionAt(lines: readonly Line[], at: number): DocEntry['kind'] | 'skip' | undefined {
  const text = (lines[at]?.text ?? '').trim();
  if (text.length > 24 || text === '') return undefined;
  const underlined = /^\s*[-=~]{3,}\s*$/.test(lines[at + 1]?.text ?? '');
  if (!underlined && !text.endsWith(':')) return undefined;
  const known = sections[text.replace(/:$/, '').trim().toLowerCase()];
  return known ?? (underlined ? 'skip' : undefined);
}

function sectionEnd(lines: readonly Line[], from: number, indent: number, underlined: boolean): number {
  for (let at = from; at < lines.length; at++) {
    const line = lines[at] as Line;
    if (sectionAt(lines, at)) return at;
    if (!underlined && line.indent <= indent && line.text.trim() !== '') return at;
  }
  return lines.length;
}

const numpyHead = /^(\*{0,2}[A-Za-z_]\w*(?:\s*,\s*\*{0,2}[A-Za-z_]\w*)*)\s*(?::\s*(.*))?$/;
const googleHead = /^(\*{0,2}[A-Za-z_]\w*(?:\s*,\s*\*{0,2}[A-Za-z_]\w*)*)\s*(?:\([^)]*\))?\s*(?::|--?|–)\s+(.*)$/;

function sectionEntries(lines: readonly Line[], kind: DocEntry['kind'], indent: number, underlined: boolean): readonly DocEntry[] {
  const base = Math.min(...lines.map((line) => line.indent));
  const entries: DocEntry[] = [];
  if (!Number.isFinite(base)) return entries;
  for (let at = 0; at < lines.length; at++) {
    const line = lines[at] as Line;
    if (line.indent !== base) continue;
    let to = at + 1;
    while (to < lines.length && ((lines[to] as Line).indent > base)) to++;
    const body = lines.slice(at + 1, to).filter((each) => each.text.trim() !== '');
    const entry = underlined ? numpyEntry(line, body, kind) : googleEntry(line, body, kind);
    if (entry) entries.push(entry);
    at = to - 1;
  }
  void indent;
  return entries;
}

function numpyEntry(line: Line, body: readonly Piece[], kind: DocEntry['kind']): DocEntry | undefined {
  const text = line.text.trim();
  const start = line.start + line.indent;
  const match = numpyHead.exec(text);
  const named = match && (match[2] !== undefined || kind !== 'result') && !/\s/.test((match[1] as string).replace(/\s*,\s*/g, ''));
  if (!match || !named) return kind === 'result' ? { kind, names: [], head: { text, start }, body, inline: false } : undefined;
  const names = (match[1] as string).split(/\s*,\s*/).map((name) => name.replace(/^\*+/, ''));
  const head = match[2] ?? '';
  return { kind, names, head: { text: head, start: start + text.length - head.length }, body, inline: body.length === 0 };
}

function googleEntry(line: Line, body: readonly Piece[], kind: DocEntry['kind']): DocEntry | undefined {
  const text = line.text.trim();
  const start = line.start + line.indent;
  const match = googleHead.exec(text);
  if (match) {
    const rest = match[2] as string;
    const names = (match[1] as string).split(/\s*,\s*/).map((name) => name.replace(/^\*+/, ''));
    return { kind, names: kind === 'result' && names.length === 1 && /^(?:float|int|array|ndarray|list|tuple|numeric|Series)$/i.test(names[0] as string) ? [] : names, head: { text: rest, start: start + text.length - rest.length }, body, inline: true };
  }
  return kind === 'result' ? { kind, names: [], head: { text, start }, body, inline: true } : undefined;
}

const sphinxHead = /^:(param|parameter|arg|argument|key|keyword|ivar|var|cvar|return|returns)\s*([^:]*):\s*(.*)$/;

function sphinxEntry(lines: readonly Line[], at: number): DocEntry | undefined {
  const line = lines[at] as Line;
  const match = sphinxHead.exec(line.text.trim());
  if (!match) return undefined;
  const [whole, tag = '', about = '', rest = ''] = match;
  let to = at + 1;
  while (to < lines.length && (lines[to] as Line).indent > line.indent && Number.isFinite((lines[to] as Line).indent)) to++;
  const name = about.trim().split(/\s+/).at(-1) ?? '';
  const kind = tag.startsWith('return') ? 'result' : /var$/.test(tag) ? 'field' : 'parameter';
  return { kind, names: kind === 'result' || name === '' ? [] : [name], head: { text: rest, start: line.start + line.indent + whole.length - rest.length }, body: lines.slice(at + 1, to), inline: true };
}

const listHead = /^[-*•]?\s*([A-Za-z_]\w*)\s*(?:[:=–]|-\s)\s*(\S.*)$/;
const bracketHead = /^[-*•]?\s*([A-Za-z_]\w*)\s+(\[[^\]]*\].*)$/;

/** `V [m/s] velocity` or `V: velocity [m/s]` in free text: only lines that carry a bracket. */
function plainList(lines: readonly Line[]): readonly DocEntry[] {
  return lines.flatMap((line): DocEntry[] => {
    if (!line.text.includes('[')) return [];
    const text = line.text.trim();
    const match = bracketHead.exec(text) ?? listHead.exec(text);
    if (!match) return [];
    const rest = match[2] as string;
    return [{ kind: 'parameter', names: [match[1] as string], head: { text: rest, start: line.start + line.indent + text.length - rest.length }, body: [], inline: true }];
  });
}
