import type { Span } from '../text/span.ts';

/** A stretch of comment or documentation text; `start` is its offset in the chunk, and offsets map one to one. */
export interface Piece {
  readonly text: string;
  readonly start: number;
}

/** The part of a piece between two offsets of its text. */
export function partOf(piece: Piece, start: number, end = piece.text.length): Piece {
  return { text: piece.text.slice(start, end), start: piece.start + start };
}

/** A part without the blanks around it. */
export function trimmed(piece: Piece): Piece {
  const text = piece.text.trim();
  return text === piece.text ? piece : { text, start: piece.start + piece.text.length - piece.text.trimStart().length };
}

/** The chunk's offsets of a range in a piece. */
export function spanIn(piece: Piece, start: number, end: number): Span {
  return { start: piece.start + start, end: piece.start + end };
}
