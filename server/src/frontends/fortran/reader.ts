/** Where the parser stands in the tokens of a piece, and what it knows around. */
import type { Expr, SyntaxProblem } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import type { Comments } from '../tree-sitter/comments.ts';
import { Scope } from './scope.ts';
import type { Token } from './tokens.ts';

const deepest = 200;
const end: Token = { kind: 'break', text: '', start: 0, end: 0 };

export class Reader {
  at = 0;
  readonly problems: SyntaxProblem[] = [];
  scope = new Scope();
  /** The return statements of the procedure being read: what they give back is known at its end. */
  returns: { value?: Expr }[] = [];
  /** Blocks that are open around, the innermost last. */
  readonly open: string[] = [];
  /** The label of the last statement taken. */
  label: string | undefined;
  private depth = 0;
  private lenient = 0;

  constructor(readonly text: string, readonly tokens: readonly Token[], readonly comments: Comments) {}

  get token(): Token {
    return this.tokens[this.at] ?? { ...end, start: this.text.length, end: this.text.length };
  }

  get done(): boolean {
    return this.at >= this.tokens.length;
  }

  get atBreak(): boolean {
    return this.token.kind === 'break';
  }

  /** Where the last token taken ends. */
  get lastEnd(): number {
    return this.tokens[this.at - 1]?.end ?? 0;
  }

  /** Where something that is missing would stand. */
  get position(): number {
    const last = this.tokens[this.at - 1];
    return last && last.kind !== 'break' ? last.end : this.token.start;
  }

  peek(by = 1): Token | undefined {
    return this.tokens[this.at + by];
  }

  next(): Token {
    const { token } = this;
    if (!this.done) this.at++;
    return token;
  }

  isOp(text: string, by = 0): boolean {
    const token = this.tokens[this.at + by];
    return token?.kind === 'op' && token.text === text;
  }

  isName(text: string, by = 0): boolean {
    const token = this.tokens[this.at + by];
    return token?.kind === 'name' && token.text === text;
  }

  takeOp(text: string): boolean {
    const found = this.isOp(text);
    if (found) this.at++;
    return found;
  }

  takeName(text: string): boolean {
    const found = this.isName(text);
    if (found) this.at++;
    return found;
  }

  /** The span from an offset to the last token taken. */
  since(start: number): Span {
    return { start, end: Math.max(start, this.lastEnd) };
  }

  problem(message: string, span: Span = this.token): void {
    const last = this.problems.at(-1);
    if (this.lenient > 0 || (last && last.start === span.start)) return;
    this.problems.push({ start: span.start, end: Math.max(span.start, span.end), message });
  }

  unknown(span: Span, parts: readonly Expr[] = []): Expr {
    return { kind: 'opaque', parts, start: span.start, end: span.end };
  }

  /** Passes over what is left of a statement. */
  skipStatement(): void {
    while (!this.done && !this.atBreak) this.at++;
  }

  /** Passes over a bracket that opens here and what is in it. */
  skipBrackets(): void {
    let depth = 0;
    do {
      const token = this.next();
      if (token.kind !== 'op') continue;
      if (opens.has(token.text)) depth++;
      else if (closes.has(token.text)) depth--;
    } while (!this.done && depth > 0 && !this.atBreak);
  }

  /** The index of the token behind the bracket that opens at an index. */
  behindBrackets(from: number): number {
    let depth = 0;
    for (let at = from; at < this.tokens.length; at++) {
      const token = this.tokens[at] as Token;
      if (token.kind === 'break') return at;
      if (token.kind !== 'op') continue;
      if (opens.has(token.text)) depth++;
      else if (closes.has(token.text) && --depth === 0) return at + 1;
    }
    return this.tokens.length;
  }

  /** Runs something at one level deeper; `instead` beyond a depth that no program reaches. */
  deeper<T>(run: () => T, instead: () => T): T {
    if (this.depth >= deepest) return instead();
    this.depth++;
    const made = run();
    this.depth--;
    return made;
  }

  /** Runs something whose problems are nobody's: parts that are passed over. */
  leniently<T>(run: () => T): T {
    this.lenient++;
    const made = run();
    this.lenient--;
    return made;
  }
}

const opens = new Set(['(', '[', '(/']);
const closes = new Set([')', ']', '/)']);
