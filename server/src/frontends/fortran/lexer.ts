/** A piece of Fortran as tokens, comments beside them: lines that go on are joined, lines for the preprocessor passed over. */
import type { SyntaxProblem } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { fixedField, isDigit, isFixedComment, isLetter, lineEnd, nextLine, type SourceForm, type Token, type TokenKind } from './tokens.ts';

export interface Lexed {
  readonly tokens: readonly Token[];
  /** Markers included. */
  readonly comments: readonly Span[];
  readonly problems: readonly SyntaxProblem[];
}

/** Lexes a piece. Never throws. */
export function lex(text: string, form: SourceForm): Lexed {
  const lexer = new Lexer(text, form);
  lexer.run();
  return lexer;
}

const number = /(?:\d+(?:\.(?!\s*[a-z]+\s*\.)\d*)?|\.\d+)(?:[ed][+-]?\d+)?(?:_[a-z]\w*|_\d+)?/iy;
const dotted = /\.\s*([a-z]+)\s*\./iy;
const operator = /\*\*|\/\/|\/=|==|<=|>=|=>|::|\(\/(?![/=])|\/\)|[-+*/=<>(),:%[\];&@?]/y;
const operators: Readonly<Record<string, string>> = { lt: '<', le: '<=', gt: '>', ge: '>=', eq: '==', ne: '/=' };
const directive = /^[!cC*](?:\$|dir\$|dec\$|gcc\$|pgi\$|ibm\*)/i;

class Lexer implements Lexed {
  readonly tokens: Token[] = [];
  readonly comments: Span[] = [];
  readonly problems: SyntaxProblem[] = [];
  private at = 0;
  /** Where the statement field of the current line ends. */
  private limit = 0;
  private end = 0;

  constructor(private readonly text: string, private readonly form: SourceForm) {}

  run(): void {
    let skipping = 0;
    let branch: boolean[] = [];
    while (this.at < this.text.length) {
      const start = this.at;
      this.end = lineEnd(this.text, start);
      if (this.text.charCodeAt(start) === 35) {
        ({ skipping, branch } = this.preprocessor(skipping, branch));
        continue;
      }
      if (skipping > 0) this.at = nextLine(this.text, this.end);
      else if (this.form === 'fixed') this.fixedLine(start);
      else this.freeLine();
    }
  }

  /** `#else` parts are left out, so that what is left opens and closes its blocks once. */
  private preprocessor(skipping: number, branch: boolean[]): { skipping: number; branch: boolean[] } {
    const word = /^#\s*(\w+)\s*(\w*)/.exec(this.text.slice(this.at, this.end));
    let end = this.end;
    while (this.text[end - 1] === '\\' && end < this.text.length) end = lineEnd(this.text, nextLine(this.text, end));
    this.at = nextLine(this.text, end);
    const now = skipping;
    if (word?.[1]?.startsWith('if')) {
      const off = word[1] === 'if' && word[2] === '0';
      return { skipping: now + (now > 0 || off ? 1 : 0), branch: [...branch, off] };
    }
    if (word?.[1] === 'endif') return { skipping: Math.max(0, now - 1), branch: branch.slice(0, -1) };
    if (word?.[1] !== 'else' && word?.[1] !== 'elif') return { skipping: now, branch };
    const off = branch.at(-1);
    if (now > 1 || (now === 1 && !off)) return { skipping: now, branch };
    return { skipping: now === 1 ? 0 : 1, branch: [...branch.slice(0, -1), now !== 0 ? false : (off ?? false)] };
  }

  private freeLine(): void {
    this.limit = this.end;
    this.tokensOfLine();
    if (this.tokens.at(-1)?.text === '&' && this.tokens.at(-1)?.kind === 'op') {
      this.tokens.pop();
      this.joinFree();
      return;
    }
    this.lineBreak();
  }

  /** The lines behind an ampersand: blank ones and comments do not end the statement. */
  private joinFree(): void {
    let at = nextLine(this.text, this.end);
    while (at < this.text.length) {
      const end = lineEnd(this.text, at);
      const line = this.text.slice(at, end);
      const trimmed = line.trimStart();
      if (trimmed !== '' && !trimmed.startsWith('!') && !line.startsWith('#')) break;
      if (trimmed.startsWith('!')) this.comment(at + line.length - trimmed.length, end);
      if (line.startsWith('#') && /^#\s*(?:el|end|if)/.test(line)) break;
      at = nextLine(this.text, end);
    }
    this.at = at;
    const lead = /^[ \t]*&/.exec(this.text.slice(at, at + 200));
    if (lead) this.at += lead[0].length;
  }

  private fixedLine(start: number): void {
    if (isFixedComment(this.text, start, this.end)) {
      const at = start + (/^[ \t]*/.exec(this.text.slice(start, this.end))?.[0].length ?? 0);
      this.comment(at, this.end);
      this.at = nextLine(this.text, this.end);
      return;
    }
    const field = fixedField(this.text, start, this.end);
    const tabbed = this.text.slice(start, Math.min(start + 6, this.end)).includes('\t');
    this.limit = tabbed ? this.end : Math.min(this.end, start + 72);
    this.at = field.continues ? field.start : start;
    if (!field.continues) this.label(start, Math.min(field.start, this.limit));
    this.tokensOfLine();
    if (this.fixedGoesOn()) this.at = nextLine(this.text, this.end);
    else this.lineBreak();
  }

  private label(start: number, end: number): void {
    const found = /^\s*(\d+)\s*$/.exec(this.text.slice(start, end));
    if (found) this.push('number', start + found[0].indexOf(found[1] as string), start + found[0].indexOf(found[1] as string) + (found[1] as string).length);
    if (found || this.text.slice(start, end).trim() === '') this.at = end;
  }

  /** Whether the next line that is no comment continues this one. */
  private fixedGoesOn(): boolean {
    for (let at = nextLine(this.text, this.end); at < this.text.length; ) {
      const end = lineEnd(this.text, at);
      if (this.text.slice(at, end).trim() !== '' && this.text[at] !== '#' && !isFixedComment(this.text, at, end)) return fixedField(this.text, at, end).continues;
      at = nextLine(this.text, end);
    }
    return false;
  }

  private lineBreak(): void {
    const next = nextLine(this.text, this.end);
    if (this.tokens.at(-1)?.kind !== 'break' && this.tokens.length > 0) this.tokens.push({ kind: 'break', text: '\n', start: this.end, end: next });
    this.at = next;
  }

  private tokensOfLine(): void {
    const { text } = this;
    while (this.at < this.limit) {
      const code = text.charCodeAt(this.at);
      if (code === 32 || code === 9) this.at++;
      else if (isLetter(code)) this.word();
      else if (isDigit(code)) this.number();
      else if (code === 33) return this.comment(this.at, this.end);
      else if (code === 39 || code === 34) this.quote();
      else if (code === 38 && this.form === 'free' && this.endsWithAmpersand()) this.ampersand();
      else if (code === 46) this.dot();
      else this.mark();
    }
  }

  private endsWithAmpersand(): boolean {
    return /^&[ \t]*(?:!|$)/.test(text80(this.text, this.at, this.end));
  }

  private ampersand(): void {
    const at = this.at;
    this.at++;
    while (this.at < this.end && this.text.charCodeAt(this.at) !== 33) this.at++;
    if (this.at < this.end) this.comment(this.at, this.end);
    this.tokens.push({ kind: 'op', text: '&', start: at, end: at + 1 });
    this.at = this.end;
    this.limit = this.end;
  }

  private push(kind: TokenKind, start: number, end: number, text = this.text.slice(start, end)): void {
    this.tokens.push({ kind, text, start, end });
    this.at = end;
  }

  private comment(start: number, end: number): void {
    this.at = end;
    if (!directive.test(this.text.slice(start, start + 6))) this.comments.push({ start, end: start + this.text.slice(start, end).trimEnd().length });
  }

  private word(): void {
    let end = this.at;
    while (end < this.limit && (isLetter(this.text.charCodeAt(end)) || isDigit(this.text.charCodeAt(end)))) end++;
    const quote = this.text[end];
    if ((quote === "'" || quote === '"') && (/^[boxz]$/i.test(this.text.slice(this.at, end)) || this.text[end - 1] === '_')) {
      const start = this.at;
      this.at = end;
      this.quote(start);
    } else this.push('name', this.at, end, this.text.slice(this.at, end).toLowerCase());
  }

  private number(): void {
    const hollerith = this.form === 'fixed' ? /^(\d+)[hH]/.exec(this.text.slice(this.at, this.at + 4)) : null;
    if (hollerith) return this.push('text', this.at, Math.min(this.limit, this.at + hollerith[0].length + Number(hollerith[1])));
    number.lastIndex = this.at;
    const end = number.test(this.text) ? Math.min(number.lastIndex, this.limit) : this.at + 1;
    this.push('number', this.at, end);
  }

  /** A number that begins with its point, or an operator between points. */
  private dot(): void {
    if (isDigit(this.text.charCodeAt(this.at + 1))) return this.number();
    dotted.lastIndex = this.at;
    const found = dotted.exec(this.text);
    if (found && dotted.lastIndex <= this.limit) {
      const word = (found[1] as string).toLowerCase();
      this.push('op', this.at, this.at + found[0].length, operators[word] ?? `.${word}.`);
    } else this.push('op', this.at, this.at + 1);
  }

  private mark(): void {
    operator.lastIndex = this.at;
    const mark = operator.test(this.text) ? this.text.slice(this.at, Math.min(operator.lastIndex, this.limit)) : (this.text[this.at] as string);
    if (mark === ';') return this.push('break', this.at, this.at + 1);
    if (/^\s$/.test(mark) || mark === '\uFEFF') {
      this.at++;
      return;
    }
    this.push('op', this.at, this.at + mark.length);
  }

  /** A text, doubled quotes in it; in free form it may go on behind an ampersand at the line's end. */
  private quote(start = this.at): void {
    const mark = this.text[this.at];
    let at = this.at + 1;
    for (;;) {
      if (at >= this.limit) {
        const next = this.textGoesOn();
        if (next === undefined) break;
        at = next;
      }
      if (this.text[at] === mark) {
        if (this.text[at + 1] !== mark || at + 1 >= this.limit) return this.push('text', start, at + 1);
        at++;
      }
      at++;
    }
    this.problems.push({ start, end: this.limit, message: `${mark} is not closed` });
    this.push('text', start, this.limit);
  }

  /** Where a text goes on that its line does not close; undefined where it does not. */
  private textGoesOn(): number | undefined {
    const next = nextLine(this.text, this.end);
    if (next >= this.text.length) return undefined;
    const end = lineEnd(this.text, next);
    if (this.form === 'fixed') {
      const field = fixedField(this.text, next, end);
      if (!field.continues || isFixedComment(this.text, next, end)) return undefined;
      this.end = end;
      this.limit = Math.min(end, next + 72);
      return Math.min(field.start, this.limit);
    }
    if (!/&[ \t]*$/.test(this.text.slice(Math.max(this.at, this.end - 40), this.end))) return undefined;
    this.end = end;
    this.limit = end;
    return next + (/^[ \t]*&/.exec(this.text.slice(next, end))?.[0].length ?? 0);
  }
}

function text80(text: string, start: number, end: number): string {
  return text.slice(start, Math.min(end, start + 80));
}
