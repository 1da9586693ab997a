/**
 * Reads plain text as a product of unit symbols with powers. A space, a dot, a hyphen and nothing at all bind tighter than
 * a slash; `*` and `/` go left to right. Never throws; the first fault ends the reading.
 */
import { symbolAt, isSubstance, type SymbolContext, type SymbolFound, wordAt } from './parse-unit-symbol.ts';
import { Dimension } from './dimension.ts';
import { Rational } from './rational.ts';
import { Scale } from './scale.ts';
import { type Factor, invert, raiseAll } from './unit-factor.ts';
import { isLabel } from './unit-labels.ts';
import { pureNumber, type Unit } from './unit.ts';
import type { UnitFault, Vocabulary } from './unit-result.ts';

/** What was read, or where it failed; offsets are those of the plain text. */
export interface Reading {
  readonly factors: readonly Factor[];
  readonly fault: { readonly start: number; readonly end: number; readonly reason: UnitFault } | undefined;
  readonly marks: Marks;
}

/** Signs of a unit in the text. */
export interface Marks {
  /** Slashes, `per` and `*`. */
  operators: number;
  /** Powers that are written as such: with a caret, raised, or signed. */
  powers: number;
  /** A product behind a slash that a reader may take either way. */
  unclear: boolean;
  /** Words of a substance were skipped. */
  labels: number;
  /** Reference marks, square, cubic. */
  words: number;
}

const deepest = 8;
const longestProduct = 14;
const number = /(?:\d+(?:\.\d+)?|\.\d+)(?:[eE][-+]?\d+)?/y;
const per = /per(?![\p{L}\d])/iuy;
const root = /√|sqrt(?=\s*\()/y;
const power = /\s*\^\s*(?:\(\s*([-+]?)\s*((?:\d+(?:\.\d+)?|\.\d+)(?:\s*\/\s*\d+(?:\.\d+)?)?)\s*\)|([-+]?)(\d+(?:\.\d+)?(?:\/\d+(?:\.\d+)?(?![\d.]*[\p{L}°(%]))?|\.\d+))/uy;
const gluedPower = /([-+])(\d+(?:\.\d+)?(?:\/\d+(?![\d.]*[\p{L}°(%]))?)|(\d+(?:\.\d+)?(?:\/[23](?![\d.]*[\p{L}°(%^]))?)/uy;
const dimensional = /(square|sq\.?|cubic|cu\.?)\s+(?=\p{L})/iuy;
const dimensionalBehind = /\s+(squared|cubed)(?!\p{L})/iuy;
const labelWord = /[\s_]*(?:of\s+)?([\p{L}][\p{L}\d]*(?:-eq)?)/uy;
const labelInBrackets = /\s?\(\s*([\p{L}][\p{L}\d]*(?:\s+[\p{L}][\p{L}\d]*)?)\s*\)/uy;
const reference = /\s?\((g|a|abs|gauge|gage|absolute|G|A|B|C|rms|DC|AC)\)|\s+(gauge|gage|abs\.?|absolute)(?!\p{L})/uy;

/** The product that a plain text stands for. */
export function readProduct(text: string, vocabulary: Vocabulary | undefined): Reading {
  return new Reader(text, vocabulary).read();
}

class Reader {
  private at = 0;
  private count = 0;
  private fault: Reading['fault'];
  private readonly marks: Marks = { operators: 0, powers: 0, unclear: false, labels: 0, words: 0 };

  constructor(
    private readonly text: string,
    private readonly vocabulary: Vocabulary | undefined,
  ) {}

  read(): Reading {
    const factors = this.expression(0, false);
    this.skip();
    if (!this.fault && this.at < this.text.length) this.unexpected();
    return { factors: factors ?? [], fault: this.fault, marks: this.marks };
  }

  /** product (('*' | '/' | 'per') product)* */
  private expression(depth: number, below: boolean): readonly Factor[] | undefined {
    if (depth > deepest) return this.fail(this.at, this.at + 1, { kind: 'missing-bracket' });
    const all: Factor[] = [];
    let divided = below;
    let slashed = false;
    this.skip();
    if (!this.startsWithSlash()) {
      const first = this.product(depth, below);
      if (!first) return undefined;
      all.push(...first);
    }
    while (!this.fault) {
      this.skip();
      const from = this.at;
      if (this.take('*')) {
        this.marks.operators++;
        if (slashed) this.marks.unclear = true;
        const next = this.product(depth, divided && below);
        if (next) all.push(...next);
      } else if (this.take('/') || this.takePer()) {
        this.marks.operators++;
        slashed = divided = true;
        const sign = this.text[from] === '/';
        const bracket = /^\s*\(/.test(this.text.slice(this.at));
        const next = this.product(depth, true);
        if (next && sign && !bracket && symbolsIn(next) > 1) this.marks.unclear = true;
        if (next) all.push(...invert(next));
      } else break;
    }
    return this.fault ? undefined : all;
  }

  private startsWithSlash(): boolean {
    per.lastIndex = this.at;
    return this.text[this.at] === '/' || per.test(this.text);
  }

  /** factor ((' ' | '.' | '-' | nothing) factor)* */
  private product(depth: number, below: boolean): readonly Factor[] | undefined {
    this.skip();
    const all: Factor[] = [];
    const first = this.factor(depth, below);
    if (!first) return undefined;
    all.push(...first);
    while (!this.fault) {
      const mark = this.at;
      this.joint();
      if (!this.beginsFactor()) {
        this.at = mark;
        break;
      }
      const next = this.factor(depth, below);
      if (!next) return undefined;
      all.push(...next);
    }
    return this.fault ? undefined : all;
  }

  /** Passes a space, a dot or a hyphen between two factors. A hyphen with spaces around it is a dash. */
  private joint(): void {
    const spaced = /^\s/.test(this.text[this.at] ?? '');
    this.skip();
    const mark = this.text[this.at];
    if (mark === '·' || mark === '.' || (mark === '-' && !spaced)) {
      this.at++;
      if (mark !== '-') this.skip();
    }
  }

  private beginsFactor(): boolean {
    const next = this.text[this.at];
    if (next === undefined) return false;
    per.lastIndex = this.at;
    if (/\d/.test(next)) return /^\d+(?:\.\d+)?\s*\^/.test(this.text.slice(this.at, this.at + 12));
    return /[\p{L}(√°º%‰#′″☉$€£℃℉]/u.test(next) && !per.test(this.text);
  }

  private factor(depth: number, below: boolean): readonly Factor[] | undefined {
    if (++this.count > longestProduct) return this.unexpected();
    const start = this.at;
    const next = this.text[start];
    if (next === '(') return this.bracket(depth, below);
    const square = this.match(dimensional);
    if (square) {
      this.marks.words++;
      return this.symbol(start, below, Rational.of(/^s/i.test(square[1] as string) ? 2 : 3));
    }
    if (this.match(root)) {
      this.skip();
      const under = this.factor(depth + 1, below);
      this.marks.powers++;
      return under && raiseAll(under, Rational.of(1, 2));
    }
    if (next !== undefined && /[\d.]/.test(next)) return this.number(start, below);
    return this.symbol(start, below, undefined);
  }

  private bracket(depth: number, below: boolean): readonly Factor[] | undefined {
    const open = this.at++;
    const inner = this.expression(depth + 1, below);
    if (this.fault) return undefined;
    this.skip();
    if (!this.take(')')) return this.at < this.text.length ? this.unexpected() : this.fail(open, open + 1, { kind: 'missing-bracket' });
    const raised = this.power(false);
    return inner && raised && raiseAll(inner, raised);
  }

  /** A factor of the size: `10^3`, `1e-6`, `1000`, and `1` before a slash. */
  private number(start: number, below: boolean): readonly Factor[] | undefined {
    const digits = this.match(number)?.[0];
    const value = digits === undefined ? undefined : Rational.parse(digits);
    if (!value || value.sign <= 0) return this.fail(start, start + (digits?.length ?? 1), { kind: 'unexpected', found: digits ?? this.text[start] ?? '' });
    const raised = this.text[this.at] === '^' || /^\s+\^/.test(this.text.slice(this.at)) ? this.power(false) : Rational.one;
    if (!raised?.isInteger) return this.fault ? undefined : this.badPower(start);
    const unit: Unit = { ...pureNumber, scale: Scale.of(value) };
    return [{ unit, text: digits as string, power: raised, start, end: this.at, sure: 'number', below }];
  }

  private symbol(start: number, below: boolean, given: Rational | undefined): readonly Factor[] | undefined {
    const context: SymbolContext = { vocabulary: this.vocabulary, below, first: start === 0 };
    const found = symbolAt(this.text, this.at, context);
    if (!found) return this.unknown();
    const from = this.at;
    this.at = found.end;
    const gauge = this.reference(found);
    const raised = this.power(true);
    if (!raised) return undefined;
    const last = found.parts.length - 1;
    const whole = given ? raised.mul(given) : raised;
    const factors = found.parts.map((part, i): Factor => {
      const marked = gauge && i === last;
      return { unit: marked ? gauge : part.unit, text: part.text, sure: marked ? 'sure' : part.sure, power: i === last ? whole : Rational.one, start: given ? start : from, end: found.end, below, open: part.open, hint: part.hint };
    });
    this.labels(factors[last] as Factor, below);
    return factors;
  }

  private unknown(): undefined {
    const word = wordAt(this.text, this.at);
    return /^[\p{L}_]/u.test(word) ? this.fail(this.at, this.at + word.length, { kind: 'unknown-symbol', symbol: word }) : this.unexpected();
  }

  /** `kPa(g)`, `bar(a)`, `psi gauge`, `dB(A)`: the unit with its reference. */
  private reference(found: SymbolFound): Unit | undefined {
    const unit = found.parts.at(-1)?.unit;
    const mark = this.at;
    const match = unit && this.match(reference);
    if (!unit || !match) return undefined;
    const word = (match[1] ?? match[2] ?? '').toLowerCase();
    if (unit.dimension === pressure && /^(?:g|a)/.test(word) && !(word === 'ac')) {
      this.marks.words++;
      return word[0] === 'g' ? { ...unit, offset: { kind: 'gauge', zero: standardAtmosphere } } : unit;
    }
    if (unit.level || (unit.dimension === voltage && /^(?:rms|dc|ac)$/.test(word))) return unit;
    this.at = mark;
    return undefined;
  }

  /** The power behind a factor, 1 where there is none. Behind a symbol, digits count without a caret: `m3`, `s-1`. */
  private power(glued: boolean): Rational | undefined {
    const from = this.at;
    if (/^\s*\^/.test(this.text.slice(from, from + 4))) {
      const match = this.match(power);
      const value = match && ratio(match[2] ?? match[4] ?? '');
      if (!match || !value || value.compare(largest) > 0) return this.badPower(this.text.indexOf('^', from));
      this.marks.powers++;
      return (match[1] ?? match[3]) === '-' ? value.neg() : value;
    }
    const word = this.match(dimensionalBehind);
    if (word) {
      this.marks.words++;
      return Rational.of(word[1]?.toLowerCase() === 'squared' ? 2 : 3);
    }
    const match = glued ? this.match(gluedPower) : undefined;
    if (!match) return Rational.one;
    const value = ratio(match[2] ?? match[3] ?? '');
    if (!value || value.isZero || value.compare(largest) > 0) return this.badPower(from);
    if (match[1] === undefined && (value.isOne || value.compare(largestDigit) > 0)) return this.badPower(from);
    if (match[1] !== undefined) this.marks.powers++;
    return match[1] === '-' ? value.neg() : value;
  }

  private badPower(from: number): undefined {
    const caret = this.text[from] === '^';
    const start = caret ? from + 1 + (/^\s*/.exec(this.text.slice(from + 1))?.[0].length ?? 0) : from;
    const found = /^(?:[-+]?[\p{L}\d./]+|.)/u.exec(this.text.slice(start))?.[0] ?? '';
    return found === '' ? this.fail(from, from + 1, { kind: 'bad-exponent', found: '^' }) : this.fail(start, start + found.length, { kind: 'bad-exponent', found });
  }

  /** Passes the words of a substance: `umol CO2`, `kg dry air`, `kg_Air⁻¹`, `m3(gas)`. */
  private labels(factor: Factor, below: boolean): void {
    for (;;) {
      const mark = this.at;
      const bracketed = this.match(labelInBrackets);
      const words = bracketed ? (bracketed[1] as string).split(/\s+/) : [this.match(labelWord)?.[1] ?? ''];
      const glued = !bracketed && mark > 0 && /[\p{L}\d]/u.test(this.text[mark] ?? '');
      if (glued || !words.every((each) => each !== '' && this.isLabel(each, factor, below))) {
        this.at = mark;
        return;
      }
      this.marks.labels++;
    }
  }

  private isLabel(word: string, factor: Factor, below: boolean): boolean {
    if (!isLabel(word) || (word === 'water' && factor.unit.dimension === base('L') && factor.power.isOne)) return false;
    if (!/^(?:[CNPSHO]|dm|da|DA|std|cat|Fe|ac|AC|dc|DC|th|eq|wb|TN|TP)$/.test(word)) return true;
    const powerNext = /^(?:\s*\^|-\d)/.test(this.text.slice(this.at));
    if (/^[A-Za-z]$/.test(word)) return isSubstance(factor.unit) && !powerNext && !(below && word === 'C');
    return !powerNext;
  }

  private skip(): void {
    while (this.text.charCodeAt(this.at) === 32 || this.text.charCodeAt(this.at) === 9) this.at++;
  }

  private take(character: string): boolean {
    if (this.text[this.at] !== character) return false;
    this.at++;
    return true;
  }

  private takePer(): boolean {
    return this.match(per) !== undefined;
  }

  private match(pattern: RegExp): RegExpExecArray | undefined {
    pattern.lastIndex = this.at;
    const found = pattern.exec(this.text);
    if (!found) return undefined;
    this.at += found[0].length;
    return found;
  }

  private unexpected(): undefined {
    const found = this.text[this.at];
    if (found === undefined) return this.fail(Math.max(this.at - 1, 0), this.at, { kind: 'unexpected', found: this.text.slice(-1) });
    return this.fail(this.at, this.at + 1, { kind: 'unexpected', found });
  }

  private fail(start: number, end: number, reason: UnitFault): undefined {
    this.fault ??= { start, end, reason };
    return undefined;
  }
}

const base = (name: string): Dimension => Dimension.base(name);
const pressure = base('M').div(base('L')).div(base('T').pow(Rational.of(2)));
const voltage = base('M').mul(base('L').pow(Rational.of(2))).div(base('T').pow(Rational.of(3))).div(base('I'));
const largest = Rational.of(20);
/** Digits behind a symbol without a caret: beyond this they number a name. */
const largestDigit = Rational.of(12);
/** The standard atmosphere in pascal: the zero of gauge pressures. */
const standardAtmosphere = Rational.of(101325);

function ratio(text: string): Rational | undefined {
  const [above = '', below] = text.replace(/\s/g, '').split('/');
  const value = Rational.parse(above);
  const divisor = below === undefined ? Rational.one : Rational.parse(below);
  return value && divisor && !divisor.isZero ? value.div(divisor) : undefined;
}

/** Symbols that stand apart; run-together ones count once. */
function symbolsIn(factors: readonly Factor[]): number {
  return new Set(factors.filter((factor) => factor.sure !== 'number').map((factor) => factor.start)).size;
}
