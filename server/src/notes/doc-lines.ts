/** A documentation text as lines. */
export interface Line {
  /** Offsets in the text, without the line break. */
  readonly start: number;
  readonly end: number;
  /** Blanks in front; infinite for a blank line. */
  readonly indent: number;
  /** Without the blanks around. */
  readonly text: string;
}

export function linesOf(text: string): readonly Line[] {
  const lines: Line[] = [];
  for (let start = 0; start <= text.length; ) {
    const next = text.indexOf('\n', start);
    const end = next < 0 ? text.length : next;
    const raw = text.slice(start, end);
    const trimmed = raw.trim();
    lines.push({ start, end: start + raw.trimEnd().length, indent: trimmed === '' ? Number.POSITIVE_INFINITY : raw.length - raw.trimStart().length, text: trimmed });
    start = end + 1;
  }
  return lines;
}

export function isBlank(line: Line): boolean {
  return line.text === '';
}
