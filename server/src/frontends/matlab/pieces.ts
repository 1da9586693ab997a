/** Splits a file into its top-level pieces by a scan of its lines, before anything is parsed. */
import type { Span } from '../../text/span.ts';
import { blockClosers, blockCommentEnd, blockCommentMark, blockOpeners, declarationBlocks, lineEnd, nextLine, opensStatement, quotedEnd } from './tokens.ts';

export interface Pieces {
  /** One per top-level statement or definition, with the comments directly above; comments that stand alone are pieces too. */
  readonly spans: readonly Span[];
  /** Functions of this file are closed by `end`; otherwise each runs to the next. */
  readonly functionsEnd: boolean;
}

type Mark = 'open' | 'close' | 'function' | 'class';

/** A line, or the lines of one statement or block comment that goes on. */
interface Line {
  readonly start: number;
  readonly end: number;
  readonly kind: 'blank' | 'comment' | 'code';
  /** The block keywords in it, in order. */
  readonly marks: readonly Mark[];
}

/** The pieces of a text. Never throws; unfinished code gives pieces that end where a later one certainly begins. */
export function splitPieces(text: string): Pieces {
  const lines = new LineScan(text).lines();
  const functionsEnd = closesFunctions(lines, text);
  const first = gather(lines, functionsEnd, text, false);
  return { spans: first.open && functionsEnd ? gather(lines, functionsEnd, text, true).spans : first.spans, functionsEnd };
}

/** In one file either all functions are closed or none: more ends than blocks mean the former. */
function closesFunctions(lines: readonly Line[], text: string): boolean {
  let balance = 0;
  for (const line of lines) {
    for (const mark of line.marks) {
      if (mark === 'class') return true;
      if (mark !== 'function') balance += mark === 'close' ? 1 : -1;
    }
  }
  return balance > 0 || /^[ \t]*endfunction\b/m.test(text);
}

/** `strict`: a function that begins at the margin is never nested, whatever is still open above it. */
function gather(lines: readonly Line[], functionsEnd: boolean, text: string, strict: boolean): { readonly spans: readonly Span[]; readonly open: boolean } {
  const gathering = new Gathering(functionsEnd, text, strict);
  for (const line of lines) gathering.take(line);
  const open = gathering.isOpen;
  return { spans: gathering.finish(), open };
}

/** Joins lines into pieces. */
class Gathering {
  private readonly spans: Span[] = [];
  /** Where the piece being read starts; undefined between pieces. */
  private from: number | undefined;
  private to = 0;
  private depth = 0;
  /** In a function that runs to the next one. */
  private inFunction = false;
  private inClass = false;
  /** Where the comment lines directly above the next line start, and where they end. */
  private comments: number | undefined;
  private commentsEnd = 0;

  constructor(private readonly functionsEnd: boolean, private readonly text: string, private readonly strict: boolean) {}

  get isOpen(): boolean {
    return this.depth > 0;
  }

  take(line: Line): void {
    if (line.kind === 'comment') {
      this.comments ??= line.start;
      this.commentsEnd = line.end;
      return;
    }
    if (line.kind === 'blank') return this.endComments();
    if (this.from !== undefined && line.marks[0] === 'function' && this.startsAnew(line)) this.close();
    this.from ??= this.comments ?? line.start;
    this.comments = undefined;
    for (const mark of line.marks) this.count(mark);
    this.to = line.end;
    if (this.depth === 0 && !this.inFunction) this.close();
  }

  finish(): readonly Span[] {
    this.endComments();
    this.close();
    return this.spans;
  }

  private startsAnew(line: Line): boolean {
    return this.inFunction || (this.strict && !this.inClass && /\S/.test(this.text[line.start] ?? ''));
  }

  private count(mark: Mark): void {
    if (mark === 'class') this.inClass = true;
    if (mark === 'function' && !this.functionsEnd) this.inFunction = true;
    else this.depth = mark === 'close' ? Math.max(this.depth - 1, 0) : this.depth + 1;
  }

  /** Comments with a blank line below belong to the piece around them, or are one. */
  private endComments(): void {
    if (this.comments === undefined) return;
    if (this.from === undefined) this.spans.push({ start: this.comments, end: this.commentsEnd });
    else this.to = this.commentsEnd;
    this.comments = undefined;
  }

  private close(): void {
    if (this.from !== undefined) this.spans.push({ start: this.from, end: this.to });
    this.from = undefined;
    this.depth = 0;
    this.inFunction = false;
    this.inClass = false;
  }
}

const words = /[A-Za-z_]\w*|['"%#()[\]{}]|\.\.\.|[\n\r]/g;
const declares = /[ \t]*(?:\([^)\n]*\))?[ \t]*(?:$|[%#\r\n])/y;
const noOperand = new Set(['case', 'return', 'if', 'elseif', 'while', 'until', 'switch', 'else', 'otherwise', 'disp', 'error', 'warning']);

/** One pass over the text: what each line is, and which block keywords stand in it outside of brackets, texts and comments. */
class LineScan {
  private inClass = false;

  constructor(private readonly text: string) {}

  lines(): readonly Line[] {
    const { text } = this;
    const found: Line[] = [];
    for (let start = 0; start < text.length; ) {
      const first = this.code(start);
      const mark = text[first];
      if (mark === '%' || mark === '#') {
        const end = blockCommentMark(text, start) === '{' ? blockCommentEnd(text, start) : lineEnd(text, first);
        found.push({ start, end, kind: 'comment', marks: none });
        start = nextLine(text, end);
      } else if (first >= text.length || mark === '\n' || mark === '\r') {
        found.push({ start, end: first, kind: 'blank', marks: none });
        start = nextLine(text, first);
      } else start = this.statementLines(start, first, found);
    }
    return found;
  }

  /** The first character of a line that is no blank. */
  private code(from: number): number {
    let at = from;
    while (at < this.text.length && (this.text[at] === ' ' || this.text[at] === '\t')) at++;
    return at;
  }

  /** Adds a line of code and those that continue it; gives the start of the line behind. */
  private statementLines(start: number, first: number, found: Line[]): number {
    const { text } = this;
    const marks: Mark[] = [];
    const brackets: string[] = [];
    words.lastIndex = first;
    for (;;) {
      const match = words.exec(text);
      if (!match) {
        found.push({ start, end: this.trimmedEnd(start, text.length), kind: 'code', marks });
        return text.length;
      }
      const [word] = match;
      const at = match.index;
      switch (word) {
        case '\n':
        case '\r': {
          const next = nextLine(text, at);
          if (brackets.length > 0 && next < text.length && !opensStatement(text, next)) {
            words.lastIndex = blockCommentMark(text, next) === '{' ? blockCommentEnd(text, next) : next;
            break;
          }
          found.push({ start, end: this.trimmedEnd(start, at), kind: 'code', marks });
          return next;
        }
        case '...':
          words.lastIndex = nextLine(text, lineEnd(text, at));
          break;
        case '%':
        case '#':
          words.lastIndex = lineEnd(text, at);
          break;
        case "'":
        case '"':
          words.lastIndex = word === "'" && this.isTranspose(at, first, brackets.at(-1)) ? at + 1 : quotedEnd(text, at).end;
          break;
        case '(':
        case '[':
        case '{':
          brackets.push(word);
          break;
        case ')':
        case ']':
        case '}':
          brackets.pop();
          break;
        default:
          if (brackets.length === 0 && text[at - 1] !== '.') this.mark(word, at, at === first, marks);
      }
    }
  }

  private mark(word: string, at: number, isFirst: boolean, marks: Mark[]): void {
    if (blockOpeners.has(word)) marks.push('open');
    else if (blockClosers.has(word)) marks.push('close');
    else if (word === 'function') marks.push('function');
    else if (word === 'classdef' && isFirst) {
      this.inClass = true;
      marks.push('class');
    } else if (isFirst && declarationBlocks.has(word) && (word === 'arguments' || this.inClass)) {
      declares.lastIndex = at + word.length;
      if (declares.test(this.text)) marks.push('open');
    }
  }

  private isTranspose(at: number, first: number, bracket: string | undefined): boolean {
    const { text } = this;
    if (/[\w)\]}'".]/.test(text[at - 1] ?? '')) return true;
    if (bracket === '[' || bracket === '{') return false;
    let before = at - 1;
    while (before >= first && (text[before] === ' ' || text[before] === '\t')) before--;
    if (!/[\w)\]}'".]/.test(text[before] ?? '')) return false;
    let start = before;
    while (start > first && /\w/.test(text[start - 1] as string)) start--;
    return start > first && !noOperand.has(text.slice(start, before + 1));
  }

  private trimmedEnd(start: number, end: number): number {
    let at = end;
    while (at > start && /\s/.test(this.text[at - 1] as string)) at--;
    return at;
  }
}

const none: readonly Mark[] = [];
