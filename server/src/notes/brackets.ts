/** Finds the brackets of a text in one pass, without what stands in code marks. */

/** A bracket with what is in it; offsets are those of the text, the marks included. */
export interface Bracketed {
  readonly open: '[' | '(';
  readonly start: number;
  readonly end: number;
  readonly inner: string;
  /** Stands directly behind a name, a number or another bracket: an index or a call. */
  readonly glued: boolean;
}

const longest = 90;
const word = /[\p{L}\p{N}_)\]}"'\\]/u;

/** All square and round brackets outside of backticks; square ones hold no others, round ones may overlap. */
export function bracketsIn(text: string): readonly Bracketed[] {
  const found: Bracketed[] = [];
  for (let at = 0; at < text.length; at++) {
    const code = text.charCodeAt(at);
    if (code === 96) at = pastCode(text, at);
    else if (code === 91 || code === 40) {
      const end = closing(text, at, code);
      if (end < 0) continue;
      found.push({ open: code === 91 ? '[' : '(', start: at, end, inner: text.slice(at + 1, end - 1), glued: at > 0 && word.test(text[at - 1] as string) });
      if (code === 91) at = end - 1;
    }
  }
  return found;
}

/** Last offset of a stretch in backticks, or the opening one where it is not closed. */
function pastCode(text: string, at: number): number {
  const double = text.charCodeAt(at + 1) === 96;
  const close = double ? text.indexOf('``', at + 2) : text.indexOf('`', at + 1);
  return close < 0 ? at : close + (double ? 1 : 0);
}

/** Offset behind the bracket that closes the one at `at`; -1 where it is far, or a blank line comes first. */
function closing(text: string, at: number, open: number): number {
  const close = open === 91 ? 93 : 41;
  const limit = Math.min(text.length, at + longest);
  let depth = 0;
  for (let i = at; i < limit; i++) {
    const code = text.charCodeAt(i);
    if (code === open) depth++;
    else if (code === close && --depth === 0) return i + 1;
    else if (code === 10 && /^\n[ \t]*\r?\n/.test(text.slice(i, i + 40))) return -1;
  }
  return -1;
}
