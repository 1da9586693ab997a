/** Turns offsets into lines and columns and back; `\n`, `\r\n` and a lone `\r` end a line. */
export class LineIndex {
  private readonly starts: number[] = [0];

  constructor(readonly text: string) {
    for (let at = 0; at < text.length; at++) {
      const code = text.charCodeAt(at);
      if (code === 10 || (code === 13 && text.charCodeAt(at + 1) !== 10)) this.starts.push(at + 1);
    }
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
