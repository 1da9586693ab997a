/** Turns offsets into lines and columns and back; `\n`, `\r\n` and a lone `\r` end a line. */
export class LineIndex {
  private readonly starts: readonly number[];

  constructor(readonly text: string) {
    this.starts = text.includes('\r') ? startsWithReturns(text) : startsOf(text);
  }

  /** The index of a text, kept for the texts asked for last: every stage of a check wants the same one. */
  static of(text: string): LineIndex {
    const known = recent.find((each) => each.text === text);
    if (known) return known;
    const made = new LineIndex(text);
    recent.unshift(made);
    if (recent.length > 4) recent.pop();
    return made;
  }

  get lineCount(): number {
    return this.starts.length;
  }

  /** Zero-based line that holds the offset. */
  lineAt(offset: number): number {
    let low = 0;
    let high = this.starts.length - 1;
    while (low < high) {
      const middle = (low + high + 1) >> 1;
      if ((this.starts[middle] as number) <= offset) low = middle;
      else high = middle - 1;
    }
    return low;
  }

  /** Zero-based line and column, in UTF-16 units. */
  position(offset: number): { line: number; column: number } {
    const line = this.lineAt(offset);
    return { line, column: offset - (this.starts[line] as number) };
  }

  /** Offset of a zero-based line and column, clipped to the line's end. */
  offset(line: number, column: number): number {
    if (line >= this.starts.length) return this.text.length;
    const start = this.starts[Math.max(line, 0)] as number;
    return Math.min(start + Math.max(column, 0), this.lineEnd(line));
  }

  lineStart(line: number): number {
    return this.starts[line] ?? this.text.length;
  }

  /** Offset of the line's end, before its line break. */
  lineEnd(line: number): number {
    let end = this.starts[line + 1] ?? this.text.length;
    while (end > this.lineStart(line) && /[\r\n]/.test(this.text[end - 1] as string)) end--;
    return end;
  }

  lineText(line: number): string {
    return this.text.slice(this.lineStart(line), this.lineEnd(line));
  }
}

const recent: LineIndex[] = [];

function startsOf(text: string): readonly number[] {
  const starts = [0];
  for (let at = text.indexOf('\n'); at >= 0; at = text.indexOf('\n', at + 1)) starts.push(at + 1);
  return starts;
}

function startsWithReturns(text: string): readonly number[] {
  const starts = [0];
  for (let at = 0; at < text.length; at++) {
    const code = text.charCodeAt(at);
    if (code === 10 || (code === 13 && text.charCodeAt(at + 1) !== 10)) starts.push(at + 1);
  }
  return starts;
}
