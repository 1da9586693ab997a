/** The logical lines of Python: a statement goes on over a line break inside brackets, strings and behind a backslash. */
import type { Span } from '../../text/span.ts';

/**
 * Shows the first line of each statement to `command`, which gives the end of what is no statement of Python, and undefined for one:
 * what a shell command quotes is no string. False where the text breaks off inside a string or a bracket.
 */
export function readLogicalLines(text: string, from: number, command: (line: Span) => number | undefined): boolean {
  let at = from;
  while (at < text.length) {
    const end = endOfLine(text, at);
    const behind = text.slice(at, end).trim() === '' ? end : command({ start: at, end });
    const next = behind === undefined ? endOfStatement(text, at) : behindBreak(text, behind);
    if (next === undefined) return false;
    at = next;
  }
  return true;
}

/** Where the line that holds an offset ends, before its break. */
export function endOfLine(text: string, from: number): number {
  const found = /[\r\n]/g;
  found.lastIndex = from;
  return found.exec(text)?.index ?? text.length;
}

/** Behind the line break at an offset. */
export function behindBreak(text: string, at: number): number {
  return text.startsWith('\r\n', at) ? at + 2 : Math.min(at + 1, text.length);
}

function endOfStatement(text: string, from: number): number | undefined {
  let depth = 0;
  for (let at = from; at < text.length; ) {
    const character = text[at] as string;
    if (character === '\n' || character === '\r') {
      if (depth === 0) return behindBreak(text, at);
      at = behindBreak(text, at);
    } else if (character === '#') at = endOfLine(text, at);
    else if (character === '\\') at = behindBreak(text, at + 1);
    else if (character === '"' || character === "'") {
      const end = endOfString(text, at);
      if (end === undefined) return undefined;
      at = end;
    } else {
      if ('([{'.includes(character)) depth++;
      if (')]}'.includes(character)) depth = Math.max(depth - 1, 0);
      at++;
    }
  }
  return depth === 0 ? text.length : undefined;
}

/** Behind a string; a short one that is not closed ends with its line, a long one that is not closed has no end. */
function endOfString(text: string, from: number): number | undefined {
  const one = text[from] as string;
  const quote = text.startsWith(one.repeat(3), from) ? one.repeat(3) : one;
  for (let at = from + quote.length; at < text.length; at++) {
    if (text.startsWith(quote, at)) return at + quote.length;
    if (quote.length === 1 && /[\r\n]/.test(text[at] as string)) return at;
    if (text[at] === '\\') at++;
  }
  return quote.length === 1 ? text.length : undefined;
}
