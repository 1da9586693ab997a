/** The words and marks of MATLAB and Octave that the splitter, the lexer and the parser share. */

export type TokenKind =
  | 'name' | 'number' | 'text' | 'keyword' | 'op'
  /** The end of a statement: a line break, a semicolon or a comma outside of brackets. */
  | 'break'
  /** A whole statement in command syntax: `hold on`. */
  | 'command';

/** Offsets are relative to the text that was lexed. */
export interface Token {
  readonly kind: TokenKind;
  readonly text: string;
  readonly start: number;
  readonly end: number;
  /** Closes the parameters of an anonymous function, so that what follows is its body. */
  readonly closesParams?: true;
}

/** Keywords that open a block which an `end` closes; `function` and `classdef` are counted apart. */
export const blockOpeners: ReadonlySet<string> = new Set(['if', 'for', 'parfor', 'while', 'switch', 'try', 'unwind_protect', 'do', 'spmd']);

/** Keywords that close a block: MATLAB's `end`, those of Octave, and `until` of a `do`. */
export const blockClosers: ReadonlySet<string> = new Set([
  'end', 'endif', 'endfor', 'endparfor', 'endwhile', 'endswitch', 'end_try_catch', 'end_unwind_protect', 'endfunction', 'endclassdef', 'endspmd',
  'endproperties', 'endmethods', 'endevents', 'endenumeration', 'endarguments', 'until',
]);

const others = ['else', 'elseif', 'case', 'otherwise', 'catch', 'unwind_protect_cleanup', 'return', 'break', 'continue', 'global', 'persistent', 'function', 'classdef'];

export const keywords: ReadonlySet<string> = new Set([...blockOpeners, ...blockClosers, ...others]);

/** Blocks of classes and of functions whose words are names anywhere else. */
export const declarationBlocks: ReadonlySet<string> = new Set(['properties', 'methods', 'events', 'enumeration', 'arguments']);

/** Keywords behind which a statement may stand on the same line. */
export const beforeStatement: ReadonlySet<string> = new Set(['else', 'try', 'do', 'otherwise', 'unwind_protect', 'unwind_protect_cleanup', ...blockClosers]);

const statementHead = new RegExp(
  `[ \\t]*(?:(?:${[...keywords].join('|')})\\b(?![ \\t]*[-+*/,)\\]}'.:=])|[A-Za-z_]\\w*(?:\\.[A-Za-z_]\\w*)*(?:\\([^()\\n]*\\))?[ \\t]*=(?!=))`, 'y',
);

/** Whether the line at an offset begins a statement beyond doubt: a bracket that is open there was never closed. */
export function opensStatement(text: string, lineStart: number): boolean {
  statementHead.lastIndex = lineStart;
  return statementHead.test(text);
}

const blockMark = /[ \t]*[%#]([{}])[ \t]*(?=[\r\n]|$)/y;

/** `{` or `}` where the line at an offset holds nothing but the mark that opens or closes a block comment. */
export function blockCommentMark(text: string, lineStart: number): '{' | '}' | undefined {
  blockMark.lastIndex = lineStart;
  return blockMark.exec(text)?.[1] as '{' | '}' | undefined;
}

/** The offset of a line's end. */
export function lineEnd(text: string, from: number): number {
  const feed = text.indexOf('\n', from);
  const end = feed < 0 ? text.length : feed;
  const line = text.slice(from, end).indexOf('\r');
  return line < 0 ? end : from + line;
}

/** The offset behind a line break that starts at `at`. */
export function nextLine(text: string, at: number): number {
  return at >= text.length ? at : text.charCodeAt(at) === 13 && text.charCodeAt(at + 1) === 10 ? at + 2 : at + 1;
}

/** The offset behind a block comment that opens on the line at `lineStart`; blocks nest. The text's end where it is not closed. */
export function blockCommentEnd(text: string, lineStart: number): number {
  let depth = 0;
  for (let at = lineStart; at < text.length; ) {
    const mark = blockCommentMark(text, at);
    const end = lineEnd(text, at);
    if (mark) depth += mark === '{' ? 1 : -1;
    if (depth === 0) return end;
    at = nextLine(text, end);
  }
  return text.length;
}

/** The offset behind a quoted text that opens at `at`; `closed` is false where the line ends first. Octave's `"` takes escapes. */
export function quotedEnd(text: string, at: number): { readonly end: number; readonly closed: boolean } {
  const quote = text[at] as string;
  const limit = lineEnd(text, at);
  const escapes = quote === '"' ? closingQuote(text, at, limit, true) : undefined;
  const end = escapes ?? closingQuote(text, at, limit, false);
  return { end: end ?? limit, closed: end !== undefined };
}

function closingQuote(text: string, at: number, limit: number, escapes: boolean): number | undefined {
  const quote = text[at];
  for (let next = at + 1; next < limit; next++) {
    if (escapes && text[next] === '\\') next++;
    else if (text[next] === quote) {
      if (text[next + 1] !== quote) return next + 1;
      next++;
    }
  }
  return undefined;
}
