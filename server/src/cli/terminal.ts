/** How text looks on a terminal: colours, columns that characters take, lines that fit. */

export type Paint = (style: Style, text: string) => string;
export type Style = 'error' | 'warning' | 'information' | 'hint' | 'strong' | 'faint';

const codes: Record<Style, string> = { error: '1;31', warning: '1;33', information: '1;36', hint: '36', strong: '1', faint: '2' };

export function painter(color: boolean): Paint {
  return color ? (style, text) => `\u001B[${codes[style]}m${text}\u001B[0m` : (_style, text) => text;
}

/** Columns that a character takes: none for combining marks, two for wide East Asian ones and pictographs. */
export function columnsOf(character: string): number {
  if (/\p{Mark}|\u200B|\u200D|\uFE0F/u.test(character)) return 0;
  return /[\u1100-\u115F\u2E80-\u303E\u3041-\uA4CF\uAC00-\uD7A3\uF900-\uFAFF\uFE30-\uFE6F\uFF00-\uFF60\uFFE0-\uFFE6]|[\u{1F300}-\u{1FAFF}]|[\u{20000}-\u{3FFFD}]/u.test(character) ? 2 : 1;
}

export function widthOf(text: string): number {
  let width = 0;
  for (const character of text) width += columnsOf(character);
  return width;
}

/** Breaks text at blanks into lines that fit; a word that is longer than a line stays whole. */
export function wrap(text: string, width: number): readonly string[] {
  const lines: string[] = [];
  for (const paragraph of text.split('\n')) {
    let line = '';
    for (const word of paragraph.split(' ')) {
      if (line !== '' && widthOf(line) + 1 + widthOf(word) > width) {
        lines.push(line);
        line = word;
      } else line = line === '' ? word : `${line} ${word}`;
    }
    lines.push(line);
  }
  return lines;
}

const tabStop = 4;

export interface Shown {
  readonly text: string;
  /** The carets that go under it, with the blanks before them. */
  readonly underline: string;
}

/**
 * A source line with the part between two zero-based columns underlined. Tabs become blanks, characters that would steer the
 * terminal become visible, and a line that is longer than the width is cut around the part.
 */
export function showLine(source: string, start: number, end: number, width: number): Shown {
  const cells: { text: string; columns: number; marked: boolean }[] = [];
  let at = 0;
  let column = 0;
  for (const character of source) {
    const text = character === '\t' ? ' '.repeat(tabStop - (column % tabStop)) : visible(character);
    const columns = character === '\t' ? text.length : columnsOf(text);
    cells.push({ text, columns, marked: at >= start && at < end });
    column += columns;
    at += character.length;
  }
  if (start >= at || !cells.some((cell) => cell.marked)) cells.push({ text: ' ', columns: 1, marked: true });
  const { from, to } = cut(cells, width);
  let text = from > 0 ? '…' : '';
  let underline = from > 0 ? ' ' : '';
  for (const cell of cells.slice(from, to)) {
    text += cell.text;
    underline += (cell.marked ? '^' : ' ').repeat(cell.columns);
  }
  return { text: (to < cells.length ? `${text}…` : text).trimEnd(), underline: underline.trimEnd() };
}

/** The cells that are shown: all where they fit, else those around the marked ones. */
function cut(cells: readonly { columns: number; marked: boolean }[], width: number): { from: number; to: number } {
  const total = cells.reduce((sum, cell) => sum + cell.columns, 0);
  if (total <= width) return { from: 0, to: cells.length };
  const first = cells.findIndex((cell) => cell.marked);
  const last = cells.findLastIndex((cell) => cell.marked);
  const room = width - 2;
  let from = first;
  let used = 0;
  const lead = Math.max(Math.floor((room - (last - first + 1)) / 2), Math.floor(room / 4));
  while (from > 0 && used + (cells[from - 1]?.columns ?? 0) <= lead) used += cells[--from]?.columns ?? 0;
  let to = from;
  used = 0;
  while (to < cells.length && used + (cells[to]?.columns ?? 0) <= room) used += cells[to++]?.columns ?? 0;
  while (to === cells.length && from > 0 && used + (cells[from - 1]?.columns ?? 0) <= room) used += cells[--from]?.columns ?? 0;
  return { from, to };
}

/** Control characters and those that change the direction of text, made visible. */
function visible(character: string): string {
  return /[\u0000-\u001F\u007F-\u009F\u200E\u200F\u202A-\u202E\u2066-\u2069\uFEFF]/.test(character) ? '\u00B7' : character;
}
