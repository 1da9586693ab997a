/** The signature notation: `trapezoid(y [?a], x [?b]) [?a ?b]`, `scipy.constants.g [m/s^2] = 9.80665`. */
import type { NamedConstant, Signature, SignatureParam, UnitClaim } from '../program/signature.ts';
import { parseUnit } from '../quantities/parse-unit.ts';
import { Rational } from '../quantities/rational.ts';
import type { Vocabulary } from '../quantities/unit-result.ts';
import { anyClaim, readClaim } from './claim.ts';
import { type NotationProblem, notationProblem, unknownUnit } from './problem.ts';

/** What was read of a line; with problems, the parts they are about claim nothing. */
export interface SignatureLine {
  readonly signatures: readonly Signature[];
  readonly problems: readonly NotationProblem[];
}

/** Whether a line has the form of a signature: qualified names and a parenthesis right behind the last. */
export function looksLikeSignature(line: string): boolean {
  return /^\s*\.?[\p{L}_][\p{L}\p{N}_.]*(?:\s*,\s*\.?[\p{L}_][\p{L}\p{N}_.]*)*\(/u.test(line);
}

/** A line without its comment: `#` at the start or behind a blank. */
export function withoutComment(line: string): string {
  return line.replace(/(?:^|\s)#.*$/, '').trimEnd();
}

/** Reads a signature line; one signature per name in front of the parenthesis. Spans are those of the line plus `base`. */
export function readSignature(line: string, base: number, vocabulary?: Vocabulary): SignatureLine {
  const reader = new SignatureReader(line, base, vocabulary);
  const signatures = reader.signatures();
  return { signatures, problems: reader.problems };
}

const constant = /^(\s*)([\p{L}_][\p{L}\p{N}_.]*)\s*(?:\[([^\]]*)\])?\s*=\s*(?:(-?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?)(\s*\*\s*pi)?|(pi)|inf|nan)(?:\s\s.*)?\s*$/iu;

/** Reads a library constant: a dotted name with its unit and its value. Undefined where the line has another form. */
export function readConstant(line: string, base: number, vocabulary?: Vocabulary): { readonly constant: NamedConstant; readonly problems: readonly NotationProblem[] } | undefined {
  const match = constant.exec(line);
  if (!match) return undefined;
  const [, blank = '', name = '', unitText, number, timesPi, pi] = match;
  const unit = unitText === undefined ? undefined : parseUnit(unitText, vocabulary ? { vocabulary } : {});
  const problems = unit && !unit.ok ? [unknownUnit(unitText as string, base + line.indexOf('[') + 1, unit)] : [];
  const value = pi === undefined ? (number === undefined ? undefined : Rational.parse(number)) : Rational.one;
  const start = base + blank.length;
  return { constant: { name, unit: unit?.ok ? unit.unit : undefined, value, pi: timesPi !== undefined || pi !== undefined ? 1 : 0, span: { start, end: start + name.length } }, problems };
}

const deepest = 8;

class SignatureReader {
  readonly problems: NotationProblem[] = [];
  private at = 0;
  /** Where the parameters being read end. */
  private limit = Infinity;

  constructor(
    private readonly line: string,
    private readonly base: number,
    private readonly vocabulary: Vocabulary | undefined,
  ) {}

  signatures(): readonly Signature[] {
    const names = this.names();
    const params = this.params(0);
    if (!params) return [];
    const results = this.claims();
    const description = this.line.slice(this.at).trim();
    return names.map(({ name, start }) => ({
      name, params, results, span: { start: this.base + start, end: this.base + start + name.length }, ...(description === '' ? {} : { description }),
    }));
  }

  private names(): readonly { readonly name: string; readonly start: number }[] {
    const open = this.line.indexOf('(');
    const names: { name: string; start: number }[] = [];
    for (const match of this.line.slice(0, open).matchAll(/[^\s,]+/g)) {
      const name = match[0];
      if (/^\.?[\p{L}_][\p{L}\p{N}_]*(?:\.[\p{L}_][\p{L}\p{N}_]*)*$/u.test(name)) names.push({ name, start: match.index });
      else this.report('not-a-name', match.index, match.index + name.length, name);
    }
    this.at = open;
    return names;
  }

  /** Everything between a round bracket and its partner; undefined where it is not closed. */
  private params(depth: number): SignatureParam[] | undefined {
    const open = this.at;
    const close = depth > deepest ? -1 : matching(this.line, open);
    if (close < 0) {
      this.report('bracket-not-closed', open, this.line.trimEnd().length);
      return undefined;
    }
    const params: SignatureParam[] = [];
    const outer = this.limit;
    this.limit = close;
    this.at = open + 1;
    while (this.at < close) {
      const param = this.param(close, depth);
      if (param) {
        this.checkOrder(params, param.value, param.start);
        params.push(param.value);
      }
    }
    this.limit = outer;
    this.at = close + 1;
    return params;
  }

  /** One parameter up to the comma behind it; a malformed one is reported and claims nothing, so that the positions stay right. */
  private param(close: number, depth: number): { readonly value: SignatureParam; readonly start: number } | undefined {
    this.skip();
    const start = this.at;
    const end = nextComma(this.line, start, close);
    const text = this.line.slice(start, end).trim();
    const name = /^\*?([\p{L}_][\p{L}\p{N}_]*)/u.exec(text);
    if (!name) {
      this.at = end + 1;
      if (end === close && text === '') return undefined;
      this.report('not-a-parameter', start, start + Math.max(text.length, 1), text);
      return { value: { name: '', claim: anyClaim, optional: true, rest: false }, start };
    }
    this.at = start + name[0].length;
    this.skip();
    const claim = this.line[this.at] === '(' ? this.functionClaim(depth) : this.singleClaim();
    const tail = /^\s*(\.\.\.)?\s*(=[^,]*)?\s*$/.exec(this.line.slice(this.at, Math.max(nextComma(this.line, this.at, close), this.at)));
    const behind = nextComma(this.line, this.at, close);
    if (!tail) this.report('not-a-parameter', start, behind, this.line.slice(start, behind).trim());
    this.at = behind + 1;
    return { value: { name: name[1] as string, claim, optional: tail?.[2] !== undefined, rest: tail?.[1] !== undefined }, start };
  }

  private checkOrder(before: readonly SignatureParam[], param: SignatureParam, start: number): void {
    if (param.name !== '' && before.some((each) => each.name === param.name)) this.report('repeated-parameter', start, start + param.name.length, param.name);
    if (before.some((each) => each.rest) && !param.optional) this.report('parameter-behind-rest', start, start + param.name.length);
  }

  private functionClaim(depth: number): UnitClaim {
    const params = this.params(depth + 1);
    if (!params) {
      this.at = this.line.length;
      return anyClaim;
    }
    return { kind: 'function', params: params.map((each) => each.claim), results: this.claims() };
  }

  private singleClaim(): UnitClaim {
    this.skip();
    return this.line[this.at] === '[' ? this.claim() : anyClaim;
  }

  /** `[?a], [?b]`: as many claims as have brackets. */
  private claims(): UnitClaim[] {
    const claims: UnitClaim[] = [];
    for (;;) {
      const mark = /^\s*(,?)\s*(?=\[)/.exec(this.line.slice(this.at));
      if (!mark || (claims.length > 0) !== (mark[1] === ',')) return claims;
      this.at += mark[0].length;
      claims.push(this.claim());
    }
  }

  private claim(): UnitClaim {
    const open = this.at;
    const close = this.line.indexOf(']', open);
    if (close < 0 || close > this.limit || this.line.slice(open + 1, close).includes('[')) {
      const end = Math.min(this.limit, this.line.length);
      this.report('bracket-not-closed', open, end);
      this.at = end;
      return anyClaim;
    }
    this.at = close + 1;
    return readClaim(this.line.slice(open + 1, close), this.base + open + 1, this.vocabulary, this.problems);
  }

  private report(kind: NotationProblem['kind'], start: number, end: number, found = ''): void {
    this.problems.push(notationProblem(kind, this.base + start, this.base + end, found));
  }

  private skip(): void {
    while (this.line[this.at] === ' ' || this.line[this.at] === '\t') this.at++;
  }
}

/** The next comma outside of brackets, or `close`. */
function nextComma(line: string, from: number, close: number): number {
  let depth = 0;
  for (let at = from; at < close; at++) {
    const character = line[at];
    if (character === '(' || character === '[') depth++;
    else if (character === ')' || character === ']') depth--;
    else if (character === ',' && depth <= 0) return at;
  }
  return close;
}

function matching(line: string, open: number): number {
  let depth = 0;
  for (let at = open; at < line.length; at++) {
    if (line[at] === '(') depth++;
    if (line[at] === ')' && --depth === 0) return at;
  }
  return -1;
}
