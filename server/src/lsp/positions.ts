/** Positions of the protocol to offsets and back, in the encoding that was agreed on. */
import type { Position, Range } from 'vscode-languageserver/node.js';
import type { LineIndex } from '../text/line-index.ts';
import type { Span } from '../text/span.ts';

/** What a column counts: UTF-8 bytes, UTF-16 units or code points. */
export type Encoding = 'utf-8' | 'utf-16' | 'utf-32';

const known: readonly Encoding[] = ['utf-8', 'utf-16', 'utf-32'];

/** The first encoding of the client's list that is known here; UTF-16 where it names none, as the protocol has it. */
export function agreeOn(offered: readonly string[] | undefined): Encoding {
  return offered?.map((name) => known.find((each) => each === name)).find((each) => each !== undefined) ?? 'utf-16';
}

/** Offset of a position, clipped to the end of its line and of the text. */
export function offsetOf(lines: LineIndex, { line, character }: Position, encoding: Encoding): number {
  if (encoding === 'utf-16' || line >= lines.lineCount) return lines.offset(line, character);
  const start = lines.lineStart(line);
  let [at, column] = [start, 0];
  for (const point of lines.lineText(line)) {
    if (column >= character) break;
    column += widthOf(point, encoding);
    at += point.length;
  }
  return at;
}

export function positionOf(lines: LineIndex, offset: number, encoding: Encoding): Position {
  const { line, column } = lines.position(offset);
  if (encoding === 'utf-16') return { line, character: column };
  let character = 0;
  for (const point of lines.lineText(line).slice(0, column)) character += widthOf(point, encoding);
  return { line, character };
}

export function rangeOf(lines: LineIndex, span: Span, encoding: Encoding): Range {
  return { start: positionOf(lines, span.start, encoding), end: positionOf(lines, span.end, encoding) };
}

function widthOf(point: string, encoding: 'utf-8' | 'utf-32'): number {
  if (encoding === 'utf-32') return 1;
  const code = point.codePointAt(0) ?? 0;
  return code < 0x80 ? 1 : code < 0x800 ? 2 : code < 0x10000 ? 3 : 4;
}
