/** Changes of a cell, written into the JSON strings that hold its text. */
import type { TextEdit } from '../frontend.ts';
import { pieceAt, rawSpan, type SourceText } from './source-string.ts';

/** The change in the file. New lines become members of the list where the cell is one, as Jupyter would write them. */
export function rawEdits(file: string, source: SourceText, { start, end, text }: TextEdit): readonly TextEdit[] {
  if (source.pieces.length === 0) return [];
  const span = rawSpan(file, source, { start, end });
  const lines = source.isList ? text.split(/(?<=\n)/) : [text];
  if (source.isList && text.endsWith('\n') && file[span.end] !== '"') lines.push('');
  const ascii = isEscaped(file);
  return [{ ...span, text: lines.map((line) => escaped(line, ascii)).join(`"${separator(file, source, start)}"`) }];
}

/** What stands between two members: a comma and the line break and indentation before this one. */
function separator(file: string, source: SourceText, offset: number): string {
  const piece = pieceAt(source, offset);
  if (!piece) return ', ';
  const quote = piece.raw - 1;
  const blanks = /[ \t\r\n]*$/.exec(file.slice(Math.max(quote - 200, 0), quote))?.[0] ?? '';
  return `,${blanks === '' ? ' ' : blanks}`;
}

/** A file that has escapes in place of every letter beyond ASCII goes on so. */
function isEscaped(file: string): boolean {
  return /\\u(?!00[01])[0-9a-fA-F]{4}/.test(file) && !/[^\u0000-\u007F]/.test(file);
}

/** The inside of a JSON string (RFC 8259, 7). */
function escaped(text: string, ascii: boolean): string {
  const inside = JSON.stringify(text).slice(1, -1);
  return ascii ? inside.replace(/[^\u0000-\u007F]/g, (unit) => `\\u${unit.charCodeAt(0).toString(16).padStart(4, '0')}`) : inside;
}
