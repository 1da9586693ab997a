/** Words and marks of a piece of MATLAB: where the language asks what stands before to tell a transpose from a text and one element from two. */
import type { SyntaxProblem } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { commandEnd, isCommand } from './commands.ts';
import { beforeStatement, blockCommentEnd, blockCommentMark, declarationBlocks, keywords, lineEnd, nextLine, opensStatement, quotedEnd, type Token, type TokenKind } from './tokens.ts';

export interface Lexed {
  readonly tokens: readonly Token[];
  /** Markers included. */
  readonly comments: readonly Span[];
  readonly problems: readonly SyntaxProblem[];
}

/** Lexes a piece. Never throws. */
export function lex(text: string): Lexed {
  const lexer = new Lexer(text);
  lexer.run();
  return lexer;
}

const word = /[\p{L}_][\p{L}\p{N}_]*/uy;
const number = /(?:0[xX][\da-fA-F]+|0[bB][01]+)(?:[us](?:8|16|32|64))?|(?:\d[\d_]*(?:\.(?![*/\\^'])\d*)?|\.\d+)(?:[eEdD][+-]?\d+)?[ijIJ]?(?![\p{L}\p{N}_])|\d+(?:\.(?![*/\\^'])\d*)?/uy;
const operator = /\.[*/^\\]=(?!=)|\.\*\*|\.\^|\.\*|\.\/|\.\\|\.'|==|~=|!=|<=|>=|&&|\|\||\+=|-=|\*=|\/=|\^=|\|=|&=|\+\+|--|\*\*|[-+*/\\^<>=~!&|.:@?,;()[\]{}$]/y;
const startsOperand = new Set(['(', '[', '{', '@', '~', '!']);
const alone = /[ \t]*(?:\([^)\n]*\))?[ \t]*(?:$|[%#\r\n])/y;

interface Bracket {
  readonly mark: string;
  readonly start: number;
  /** Holds the parameters of an anonymous function. */
  readonly params: boolean;
}

class Lexer implements Lexed {
  readonly tokens: Token[] = [];
  readonly comments: Span[] = [];
  readonly problems: SyntaxProblem[] = [];
  private at = 0;
  private readonly brackets: Bracket[] = [];
  private spaced = false;
  private startsStatement = true;
  /** In a block that declares properties or arguments, where names stand side by side. */
  private declaring = false;
  private inClass = false;
  private lineStart = 0;

  constructor(private readonly text: string) {}

  run(): void {
    const { text } = this;
    while (this.at < text.length) {
      const code = text.charCodeAt(this.at);
      if (code === 32 || code === 9) {
        this.spaced = true;
        this.at++;
      } else if (isLetter(code)) this.word(wordEnd(text, this.at));
      else if (code === 10 || code === 13) this.lineBreak();
      else if (code === 37 || code === 35) this.comment();
      else if (code === 39 || code === 34) this.quote(text[this.at] as string);
      else if (isDigit(code) || (code === 46 && isDigit(text.charCodeAt(this.at + 1)) && !this.follows())) this.take(number, 'number');
      else if (code === 46 && text.startsWith('...', this.at)) this.continuation();
      else this.wordOrMark(text[this.at] as string);
    }
    if (this.brackets.length > 0) this.unclosed();
  }

  private get bracket(): Bracket | undefined {
    return this.brackets.at(-1);
  }

  private get inMatrix(): boolean {
    const mark = this.bracket?.mark;
    return mark === '[' || mark === '{';
  }

  /** Whether the last token ends an operand and nothing stands between it and here. */
  private follows(): boolean {
    const last = this.tokens.at(-1);
    return last !== undefined && last.end === this.at && endsOperand(last);
  }

  private push(kind: TokenKind, start: number, end: number, text = this.text.slice(start, end), closesParams = false): void {
    this.tokens.push(closesParams ? { kind, text, start, end, closesParams } : { kind, text, start, end });
    this.at = Math.max(end, this.at);
    this.spaced = false;
    this.startsStatement = kind === 'break' || (kind === 'keyword' && beforeStatement.has(text));
  }

  private take(pattern: RegExp, kind: TokenKind): void {
    pattern.lastIndex = this.at;
    const end = pattern.test(this.text) ? pattern.lastIndex : this.at + 1;
    this.separate();
    this.push(kind, this.at, end);
  }

  /** Inside of `[ ]` and `{ }` a blank between two operands parts them. */
  private separate(): void {
    const last = this.tokens.at(-1);
    if (this.inMatrix && this.spaced && last && endsOperand(last)) this.push('op', this.at, this.at, ',');
  }

  private lineBreak(): void {
    const next = nextLine(this.text, this.at);
    if (this.brackets.length > 0 && opensStatement(this.text, next)) this.unclosed();
    if (this.brackets.length === 0) this.push('break', this.at, next, '\n');
    else if (this.inMatrix) this.row();
    this.at = next;
    this.lineStart = next;
    this.spaced = true;
  }

  /** A line break in a matrix ends its row. */
  private row(): void {
    const last = this.tokens.at(-1);
    if (last?.text === ',' && last.kind === 'op') this.tokens.pop();
    if (last && last.text !== ';' && !(last.kind === 'op' && (last.text === '[' || last.text === '{'))) this.push('op', this.at, this.at, ';');
  }

  private unclosed(): void {
    const open = this.bracket as Bracket;
    this.problems.push({ start: open.start, end: open.start + 1, message: `${open.mark} is not closed` });
    this.brackets.length = 0;
  }

  private comment(): void {
    const { text } = this;
    if (text.slice(this.lineStart, this.at).trim() === '' && blockCommentMark(text, this.lineStart) === '{') {
      const end = blockCommentEnd(text, this.lineStart);
      for (let line = nextLine(text, lineEnd(text, this.at)); line < end; line = nextLine(text, lineEnd(text, line))) this.innerLine(line, end);
      this.lineStart = text.lastIndexOf('\n', end - 1) + 1;
      this.at = end;
      return;
    }
    const end = lineEnd(text, this.at);
    if (text[this.at + 1] !== '!') this.comments.push({ start: this.at, end });
    this.at = end;
  }

  /** One line of a block comment. */
  private innerLine(start: number, limit: number): void {
    const end = Math.min(lineEnd(this.text, start), limit);
    const inner = this.text.slice(start, end);
    if (inner.trim() !== '' && !blockCommentMark(this.text, start)) this.comments.push({ start: start + inner.length - inner.trimStart().length, end });
  }

  /** `...`: the rest of the line is a comment, and the statement goes on. */
  private continuation(): void {
    const { text } = this;
    const end = lineEnd(text, this.at);
    let start = this.at + 3;
    while (start < end && /\s/.test(text[start] as string)) start++;
    if (start < end) this.comments.push({ start, end });
    this.at = nextLine(text, end);
    this.lineStart = this.at;
    this.spaced = true;
  }

  private quote(mark: string): void {
    const last = this.tokens.at(-1);
    const operand = last !== undefined && endsOperand(last);
    if (mark === "'" && operand && (last.end === this.at || !this.inMatrix)) {
      this.push('op', this.at, this.at + 1);
      return;
    }
    const { end, closed } = quotedEnd(this.text, this.at);
    if (!closed) this.problems.push({ start: this.at, end, message: `${mark} is not closed` });
    this.separate();
    this.push('text', this.at, end);
  }

  private wordOrMark(character: string): void {
    if (/\s/.test(character) || character === '\uFEFF') {
      this.spaced = true;
      this.at++;
      return;
    }
    const end = wordEnd(this.text, this.at);
    if (end > this.at) return this.word(end);
    if (character === '!' && this.startsStatement && this.text[this.at + 1] !== '=') return this.push('command', this.at, commandEnd(this.text, this.at));
    operator.lastIndex = this.at;
    const mark = operator.test(this.text) ? this.text.slice(this.at, operator.lastIndex) : character;
    this.mark(mark);
  }

  private word(end: number): void {
    const name = this.text.slice(this.at, end);
    const last = this.tokens.at(-1);
    const field = last?.kind === 'op' && last.text === '.' && last.end === this.at;
    if (!field && this.brackets.length === 0 && (keywords.has(name) || this.opensDeclarations(name, end))) return this.keyword(name, end);
    if (!field && this.startsStatement && !this.declaring && this.brackets.length === 0 && isCommand(this.text, end)) return this.push('command', this.at, commandEnd(this.text, end));
    if (!field) this.separate();
    this.push('name', this.at, end);
  }

  private keyword(name: string, end: number): void {
    this.declaring = name === 'properties' || name === 'arguments' || name === 'events' || name === 'enumeration';
    this.inClass ||= name === 'classdef';
    this.push('keyword', this.at, end);
  }

  private opensDeclarations(name: string, end: number): boolean {
    if (!this.startsStatement || !declarationBlocks.has(name) || (name !== 'arguments' && !this.inClass)) return false;
    alone.lastIndex = end;
    return alone.test(this.text);
  }

  private mark(mark: string): void {
    const start = this.at;
    const end = start + mark.length;
    if (this.brackets.length === 0 && (mark === ';' || mark === ',')) return this.push('break', start, end);
    if (this.spaced && this.inMatrix && (startsOperand.has(mark) || ((mark === '-' || mark === '+') && !/\s/.test(this.text[end] ?? ' ')))) this.separate();
    if (mark === '(' || mark === '[' || mark === '{') {
      const last = this.tokens.at(-1);
      this.brackets.push({ mark, start, params: mark === '(' && last?.kind === 'op' && last.text === '@' });
      return this.push('op', start, end);
    }
    const closed = mark === ')' || mark === ']' || mark === '}' ? this.brackets.pop() : undefined;
    if (closed && closed.mark + mark !== '()' && closed.mark + mark !== '[]' && closed.mark + mark !== '{}') this.problems.push({ start, end, message: `${closed.mark} is closed by ${mark}` });
    this.push('op', start, end, mark, closed?.params === true);
  }
}

function isLetter(code: number): boolean {
  return (code >= 97 && code <= 122) || (code >= 65 && code <= 90) || code === 95;
}

function isDigit(code: number): boolean {
  return code >= 48 && code <= 57;
}

/** Where the word at an offset ends; the offset itself where there is none. */
function wordEnd(text: string, at: number): number {
  let end = at;
  for (let code = text.charCodeAt(end); isLetter(code) || (isDigit(code) && end > at); code = text.charCodeAt(end)) end++;
  if (!(text.charCodeAt(end) > 127)) return end;
  word.lastIndex = at;
  return word.test(text) ? word.lastIndex : end;
}

const closers = new Set([')', ']', '}', "'", ".'"]);

function endsOperand(token: Token): boolean {
  return token.kind === 'name' || token.kind === 'number' || token.kind === 'text' || (token.kind === 'op' && closers.has(token.text) && !token.closesParams);
}
