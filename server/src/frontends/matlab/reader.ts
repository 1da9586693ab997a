/** Where the parser stands in the tokens of a piece, and what it knows around. */
import type { Expr, SyntaxProblem } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import type { Comments } from '../tree-sitter/comments.ts';
import type { Scopes } from './scopes.ts';
import type { Token } from './tokens.ts';

const deepest = 200;
const end: Token = { kind: 'break', text: '', start: 0, end: 0 };

export class Reader {
  at = 0;
  readonly problems: SyntaxProblem[] = [];
  /** Names that the scope being read assigns. */
  private variables: ReadonlySet<string>;
  /** Parameters of the anonymous functions around. */
  readonly params: string[] = [];
  /** Methods of the class being read. */
  methods: ReadonlySet<string> = new Set();
  /** How the statements outside of functions read a name that brackets follow: as a variable or not. */
  readonly consulted = new Map<string, boolean>();
  private inFunction = false;
  private depth = 0;

  constructor(
    readonly text: string, readonly tokens: readonly Token[], readonly comments: Comments, readonly functionsEnd: boolean, variables: ReadonlySet<string>, private readonly scopes: Scopes,
  ) {
    this.variables = variables;
  }

  /** Reads a function whose keyword stands at this token; an outermost one brings its own scope. */
  within<T>(keyword: number, run: () => T): T {
    const outside = { variables: this.variables, inFunction: this.inFunction };
    this.variables = this.scopes.functions.get(keyword) ?? this.variables;
    this.inFunction = true;
    const made = run();
    this.variables = outside.variables;
    this.inFunction = outside.inFunction;
    return made;
  }

  get token(): Token {
    return this.tokens[this.at] ?? { ...end, start: this.text.length, end: this.text.length };
  }

  get done(): boolean {
    return this.at >= this.tokens.length;
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

  isOp(text: string): boolean {
    const token = this.tokens[this.at];
    return token?.kind === 'op' && token.text === text;
  }

  isKeyword(text: string): boolean {
    const token = this.tokens[this.at];
    return token?.kind === 'keyword' && token.text === text;
  }

  takeOp(text: string): boolean {
    const found = this.isOp(text);
    if (found) this.at++;
    return found;
  }

  /** The span from a token to the last one taken. */
  since(start: number): Span {
    return { start, end: Math.max(start, this.lastEnd) };
  }

  problem(message: string, span: Span = this.token): void {
    const last = this.problems.at(-1);
    if (last && last.start === span.start) return;
    this.problems.push({ start: span.start, end: span.end, message });
  }

  unknown(span: Span, parts: readonly Expr[] = []): Expr {
    return { kind: 'opaque', parts, start: span.start, end: span.end };
  }

  /** Passes over what is left of a statement. */
  skipStatement(): void {
    while (!this.done && this.token.kind !== 'break' && this.token.kind !== 'keyword') this.at++;
  }

  isVariable(name: string): boolean {
    if (this.params.includes(name)) return true;
    const known = this.variables.has(name);
    if (!this.inFunction) this.consulted.set(name, known);
    return known;
  }

  /** Runs something one level deeper; `instead` where that is too deep. */
  deeper<T>(run: () => T, instead: () => T): T {
    if (this.depth >= deepest) return instead();
    this.depth++;
    try {
      return run();
    } finally {
      this.depth--;
    }
  }
}
