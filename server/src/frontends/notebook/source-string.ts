/** The text of a cell as a notebook file holds it: JSON strings, whose pieces are joined. */
import { type Node, type ParseError, parseTree } from 'jsonc-parser';
import type { Span } from '../../text/span.ts';

/** One JSON string. `start` counts in the cell's text; `raw` is the offset in the file of the first character behind the quote. */
export interface Piece {
  readonly start: number;
  readonly length: number;
  readonly raw: number;
}

export interface SourceText {
  readonly text: string;
  readonly pieces: readonly Piece[];
  /** The pieces are members of an array, a line each, as Jupyter writes them. */
  readonly isList: boolean;
}

/** The JSON of a file; undefined where it is not JSON from end to end, or nested beyond what the parser's stack holds. */
export function readJson(file: string): Node | undefined {
  const errors: ParseError[] = [];
  try {
    const node = parseTree(file, errors, { disallowComments: true, allowTrailingComma: false, allowEmptyContent: false });
    return errors.length === 0 ? node : undefined;
  } catch {
    return undefined;
  }
}

/** The member of an object; undefined where there is none, or no object. */
export function member(node: Node | undefined, key: string): Node | undefined {
  if (node?.type !== 'object') return undefined;
  return node.children?.findLast((property) => property.children?.[0]?.value === key)?.children?.[1];
}

/** The text of a `source`: a string or an array of strings; undefined for anything else. */
export function sourceText(node: Node | undefined): SourceText | undefined {
  const isList = node?.type === 'array';
  const strings = isList ? (node.children ?? []) : node ? [node] : [];
  if (!node || strings.some((each) => each.type !== 'string')) return undefined;
  const pieces: Piece[] = [];
  let text = '';
  for (const each of strings) {
    const value = String(each.value);
    pieces.push({ start: text.length, length: value.length, raw: each.offset + 1 });
    text += value;
  }
  return { text, pieces, isList };
}

/** Where a part of the text stands in the file. */
export function rawSpan(file: string, source: SourceText, span: Span): Span {
  const start = rawOffset(file, source, span.start);
  return { start, end: span.end > span.start ? behind(file, rawOffset(file, source, span.end - 1)) : start };
}

/** The piece that holds an offset; behind the last character, the last one. */
export function pieceAt(source: SourceText, offset: number): Piece | undefined {
  return source.pieces.find((piece) => offset < piece.start + piece.length) ?? source.pieces.at(-1);
}

/** Where a character of the text begins in the file. */
function rawOffset(file: string, source: SourceText, offset: number): number {
  const piece = pieceAt(source, offset);
  if (!piece) return 0;
  let raw = piece.raw;
  for (let at = piece.start; at < offset && at < piece.start + piece.length; at++) raw = behind(file, raw);
  return raw;
}

/** Behind the character that begins at an offset of the file: one character, or an escape (RFC 8259, 7). */
function behind(file: string, raw: number): number {
  if (file[raw] !== '\\') return raw + 1;
  return raw + (file[raw + 1] === 'u' ? 6 : 2);
}
