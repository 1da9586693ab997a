/** Words and marks of Fortran, and what the lexer's parts share. */

export type TokenKind = 'name' | 'number' | 'text' | 'op' | 'break';

export interface Token {
  readonly kind: TokenKind;
  /** As the source has it; names and dotted operators in small letters. */
  readonly text: string;
  readonly start: number;
  readonly end: number;
}

/** How the lines of a file are laid out: by columns (`.f`, `.for`, `.ftn`), or freely. */
export type SourceForm = 'free' | 'fixed';

/** The form that a file's ending stands for. */
export function formOf(file: string): SourceForm {
  return /\.(?:f|for|ftn)$/i.test(file) ? 'fixed' : 'free';
}

/** The offset of the line break at or after an offset, or the text's end. */
export function lineEnd(text: string, at: number): number {
  for (let end = at; end < text.length; end++) {
    const code = text.charCodeAt(end);
    if (code === 10 || code === 13) return end;
  }
  return text.length;
}

/** The start of the next line for the end of one. */
export function nextLine(text: string, end: number): number {
  return Math.min(text.length, end + (text.charCodeAt(end) === 13 && text.charCodeAt(end + 1) === 10 ? 2 : 1));
}

export function isLetter(code: number): boolean {
  return (code >= 97 && code <= 122) || (code >= 65 && code <= 90) || code === 95 || code === 36;
}

export function isDigit(code: number): boolean {
  return code >= 48 && code <= 57;
}

/** Whether a fixed-form line is a comment: by a letter or mark in its first column, or blank up to an exclamation mark. */
export function isFixedComment(text: string, lineStart: number, end: number): boolean {
  return /^[cC*!dD]/.test(text[lineStart] ?? '') || /^[ \t]*!/.test(text.slice(lineStart, Math.min(end, lineStart + 80)).replace(/^ {5}!/, ''));
}

/** Where the statement field of a fixed-form line begins, and whether the line goes on with the one above. */
export function fixedField(text: string, lineStart: number, end: number): { readonly start: number; readonly continues: boolean } {
  const head = text.slice(lineStart, Math.min(end, lineStart + 7));
  const tab = head.indexOf('\t');
  if (tab >= 0 && tab < 6) {
    const continues = /[1-9&]/.test(head[tab + 1] ?? '') && head.slice(0, tab).trim() === '';
    return { start: lineStart + tab + (continues ? 2 : 1), continues };
  }
  const mark = head[5];
  const continues = mark !== undefined && mark !== ' ' && mark !== '0' && head.slice(0, 5).trim() === '';
  return { start: Math.min(end, lineStart + 6), continues };
}
