/** Unit expressions as people write them, to units; never throws. */
import { Dimension } from './dimension.ts';
import { distance } from './nearest.ts';
import { findName, findSymbol, knownNames, knownSymbols, otherCase } from './lookup.ts';
import { Rational } from './rational.ts';
import { Scale } from './scale.ts';
import { multiply, pureNumber, raise, scaledBy, type Unit } from './unit.ts';
import type { ReadOptions, UnitFault, UnitHint, UnitRead, UnitResult, UnitUnread } from './unit-result.ts';
import { type Token, tokenize } from './unit-lexer.ts';
import { isLabel } from './unit-labels.ts';

const pressureDimension = Dimension.from([['M', Rational.one], ['L', Rational.minusOne], ['T', Rational.of(-2)]]);
const nothings = new Set(['', '-', '--', '---', '–', '—', '1', 'dimensionless', 'unitless', 'fraction', 'fractional', 'ratio', 'nondimensional', 'non-dimensional', 'adimensional', 'no units', 'no unit', 'none', 'n/a', 'N/A', 'decimal']);
const longest = 80;
/** No unit has these outside of TeX and HTML. */
const unlikely = /["?!@]|\.\.|(?<!&\w{2,6});|:(?!math)(?<!:math:)/;
const cache = new Map<string, UnitResult>();

/** Reads a unit expression; spans are relative to `text`. */
export function parseUnit(text: string, options: ReadOptions = {}): UnitResult {
  const key = `${options.vocabulary?.fingerprint ?? ''}|${describesTemperature(options.describes)}|${text}`;
  const known = cache.get(key);
  if (known) return known;
  const result = readAny(text, options);
  if (cache.size > 20000) cache.clear();
  cache.set(key, result);
  return result;
}

/** The unit that a comment begins with, before a comma, a dash or a description; `end` is where it ends. */
export function readLeadingUnit(text: string, options: ReadOptions = {}): (UnitRead & { readonly end: number }) | undefined {
  const whole = parseUnit(text, options);
  if (whole.ok) return { ...whole, end: text.length };
  for (const end of breaks(text)) {
    const result = parseUnit(text.slice(0, end).trimEnd(), options);
    if (result.ok && result.beyondDoubt && !/^\s*(?:[\d(/]|to\b|->|→)/.test(text.slice(end))) return { ...result, end };
  }
  return undefined;
}

/** Where a leading unit may end, the longest first. */
function breaks(text: string): readonly number[] {
  const ends: number[] = [];
  for (const match of text.slice(0, longest).matchAll(/[,;:]| [-–—=(]|\s/g)) ends.push(match.index);
  return ends.slice(0, 4).reverse();
}

function readAny(text: string, options: ReadOptions): UnitResult {
  const trimmed = text.trim();
  if (nothings.has(trimmed) || nothings.has(trimmed.toLowerCase())) return read({ ...pureNumber, text: trimmed }, [], /less|dimension/.test(trimmed));
  if (trimmed.length > longest || unlikely.test(trimmed)) return refusal(text, { kind: 'unexpected', found: trimmed.slice(0, 10) });
  const dimension = /^dim\s+(.*)$/.exec(trimmed);
  if (dimension) return readDimension(text, dimension[1] as string);
  const twice = readTwice(trimmed, options);
  if (twice) return twice;
  const alternatives = readAlternatives(trimmed, options);
  if (alternatives) return alternatives;
  const result = new Reader(text, options).read();
  if (result.ok) return { ...result, unit: { ...result.unit, text: trimmed } };
  const words = readWords(trimmed, options);
  return words ? { ...words, unit: { ...words.unit, text: trimmed } } : result;
}

function read(unit: Unit, hints: readonly UnitHint[], beyondDoubt: boolean): UnitRead {
  return { ok: true, unit, hints, beyondDoubt };
}

function refusal(text: string, reason: UnitFault): UnitUnread {
  return { ok: false, span: { start: 0, end: text.length }, reason, triesToBeUnit: false };
}

/** `dim L T^-1`: a dimension without a unit. */
function readDimension(text: string, body: string): UnitResult {
  let result = Dimension.one;
  for (const part of body.trim().split(/[\s*·]+/)) {
    const match = /^([A-Za-zΘ]+)(?:\^?\(?([-+]?[\d./]+)\)?)?$/.exec(part);
    const power = match && Rational.parse((match[2] ?? '1').replace('+', ''));
    if (!match || !power) return refusal(text, { kind: 'unexpected', found: part });
    result = result.mul(Dimension.base(match[1] === 'Theta' ? 'Θ' : (match[1] as string)).pow(power));
  }
  return read({ dimension: result, scale: undefined, text: text.trim() }, [], true);
}

/** `Kelvin (K)`, `kilopascal (kPa)`: a name and its symbol say one unit. */
function readTwice(text: string, options: ReadOptions): UnitResult | undefined {
  const match = /^([A-Za-z][A-Za-z /]{2,}?)\s*\(([^()]+)\)$/.exec(text);
  if (!match) return undefined;
  const [first, second] = [parseUnit(match[1] as string, options), parseUnit(match[2] as string, options)];
  const same = first.ok && second.ok && first.unit.dimension === second.unit.dimension && first.unit.scale && second.unit.scale?.equals(first.unit.scale);
  return same ? { ...first, unit: { ...first.unit, text } } : undefined;
}

/** `°F or °C`, `in/hr or mm/hr`, `mm/step`: the dimension is known, the scale is not. */
function readAlternatives(text: string, options: ReadOptions): UnitResult | undefined {
  const step = /^(.*\S)\s*\/\s*(?:time\s*)?(?:step|timestep|dt)s?$/i.exec(text);
  if (step) {
    const unit = parseUnit(step[1] as string, options);
    return unit.ok ? read({ dimension: unit.unit.dimension.div(Dimension.base('T')), scale: undefined, text }, [], true) : undefined;
  }
  const parts = text.split(/\s+or\s+|\s*\|\s*/);
  if (parts.length < 2 || parts.length > 3) return undefined;
  const units = parts.map((part) => parseUnit(part.replace(/\s*[[(](?:IP|SI|US|imperial|metric)[\])]\s*$/i, ''), options));
  const first = units[0];
  if (!first?.ok || !units.every((each) => each.ok && each.unit.dimension === first.unit.dimension)) return undefined;
  return read({ dimension: first.unit.dimension, scale: undefined, text }, [], true);
}

export function describesTemperature(describes: string | undefined): boolean {
  return describes !== undefined && (/^\s*(?:self\.)?[tT](?![a-z]{2})/.test(describes) || /^\s*(?:d|delta_?)T/.test(describes) || /temp/i.test(describes) || /(?:^|[\s_])[tT]_/.test(describes));
}

/** A recursive reader over tokens: a space, a dot and a hyphen bind tighter than a slash. */
class Reader {
  private readonly tokens: readonly Token[];
  private at = 0;
  private fault: { readonly token: Token | undefined; readonly reason: UnitFault } | undefined;
  private readonly hints: UnitHint[] = [];
  private known = 0;
  private strong = false;
  private slashes = 0;
  /** The last symbol's unit: said twice, as in `degrees °`, it counts once. */
  private lastUnit: Unit | undefined;
  private weak = false;

  constructor(private readonly text: string, private readonly options: ReadOptions) {
    this.tokens = trimTokens(tokenize(text));
  }

  read(): UnitResult {
    const unit = this.expression(0);
    if (!this.fault && this.at < this.tokens.length) this.fail(this.tokens[this.at], { kind: 'unexpected', found: this.textOf(this.tokens[this.at]) });
    if (!this.fault && unit && !this.onlyLetters() && !this.onlyNumber()) return read({ ...unit, text: this.text.trim() }, this.hints, this.strong || this.isStructured());
    return this.unread();
  }

  private unread(): UnitUnread {
    const fault = this.fault ?? { token: undefined, reason: { kind: 'empty' } as const };
    const span = fault.token ? { start: fault.token.start, end: fault.token.end } : { start: this.text.length, end: this.text.length };
    const symbols = this.tokens.filter((token) => token.kind === 'symbol');
    const structured = this.tokens.some((token) => token.kind === 'mark' && (token.text === '/' || token.text === '^' || token.text === '*'));
    const readable = symbols.filter((token) => this.isUnit(token.text)).length;
    const clean = !this.tokens.some((token) => token.kind === 'other' || (token.kind === 'mark' && token.text === ','));
    const tries = clean && structured && symbols.length <= 5 && readable > 0 && readable * 2 >= symbols.length && this.spaces() <= 1;
    const suggestion = tries ? suggest(this.text, fault.token, fault.reason) : undefined;
    const nearOnly = clean && !tries && symbols.length === 1 && this.tokens.length <= 3;
    void nearOnly;
    return { ok: false, span, reason: fault.reason, triesToBeUnit: tries && (suggestion !== undefined || fault.reason.kind !== 'unknown-symbol'), ...(suggestion ? { suggestion } : {}) };
  }

  private isStructured(words = true): boolean {
    return this.tokens.some((token) => token.kind !== 'symbol' && !(token.kind === 'mark' && token.text === ' ')) || (words && this.words().length > 1);
  }

  /** `a b`, `t h`: single letters side by side are names more often than units. */
  private onlyLetters(): boolean {
    const words = this.words();
    const plain = this.tokens.every((token) => token.kind === 'symbol' || (token.kind === 'mark' && token.text === ' '));
    return plain && words.length > 1 && words.every((word) => word.length === 1) && !/^[NAWPVJ] [msK]$|^Pa s$/.test(this.text.trim());
  }

  /** `2`, `12`: a plain number is no unit; `10^-6` and `1e-3` are factors. */
  private onlyNumber(): boolean {
    return this.tokens.length === 1 && this.tokens[0]?.kind === 'number' && !/^1(?:e|0+$)/i.test(this.tokens[0].text);
  }

  private words(): readonly string[] {
    return this.tokens.flatMap((token) => (token.kind === 'symbol' ? [token.text] : []));
  }

  private spaces(): number {
    return this.tokens.filter((token) => token.kind === 'mark' && token.text === ' ').length;
  }

  private isUnit(symbol: string): boolean {
    return this.options.vocabulary?.units.has(symbol) === true || findSymbol(symbol) !== undefined || findName(symbol) !== undefined;
  }

  /** term (('*' | '/') term)* */
  private expression(depth: number): Unit | undefined {
    if (depth > 12) return this.fail(this.tokens[this.at], { kind: 'missing-bracket' });
    let unit = this.peekMark('/') || this.peekPer() ? pureNumber : this.product(depth);
    let divided = false;
    while (unit && !this.fault) {
      this.skipSpace();
      if (this.takeMark('*')) {
        if (divided) this.ambiguous();
        const next = this.product(depth);
        unit = next && multiply(unit, next, '');
      } else if (this.takeMark('/') || this.takePer()) {
        this.slashes++;
        const from = this.at;
        const next = this.product(depth);
        if (next && this.isProductFrom(from)) this.ambiguous();
        unit = next && multiply(unit, raise(next, Rational.minusOne, ''), '');
        divided = true;
      } else break;
    }
    return unit;
  }

  /** factor ((' ' | '.' | '-') factor)* */
  private product(depth: number): Unit | undefined {
    this.skipSpace();
    let unit = this.factor(depth);
    while (unit && !this.fault) {
      const mark = this.at;
      const token = this.tokens[this.at];
      const joins = token?.kind === 'mark' && (token.text === ' ' || token.text === '.' || token.text === '-');
      if (joins) this.at++;
      this.skipSpace();
      const next = this.tokens[this.at];
      if (!next || !(next.kind === 'symbol' || next.kind === 'number' || (next.kind === 'mark' && next.text === '(')) || (next.kind === 'symbol' && next.text.toLowerCase() === 'per')) {
        this.at = mark;
        break;
      }
      if (this.skipLabel()) continue;
      if (next.kind === 'number') return this.fail(next, { kind: 'unexpected', found: next.text });
      const said = this.lastUnit;
      const factor = this.factor(depth);
      if (factor && factor === said) continue;
      if (this.weak && token?.kind === 'mark' && token.text === ' ' && this.words().length > 1 && !this.isStructured(false)) return this.fail(next, { kind: 'unexpected', found: this.textOf(next) });
      unit = factor && multiply(unit, factor, '');
    }
    return unit;
  }

  private factor(depth: number): Unit | undefined {
    const token = this.tokens[this.at];
    if (!token) return this.fail(undefined, { kind: 'unexpected', found: 'the end' });
    if (token.kind === 'mark' && token.text === '(') {
      this.at++;
      const symbols = this.tokens[this.at]?.kind === 'symbol' || this.tokens[this.at]?.kind === 'mark' || this.tokens[this.at + 2]?.kind === 'symbol';
      const inner = symbols ? this.expression(depth + 1) : undefined;
      if (!symbols) return this.fail(token, { kind: 'unexpected', found: '(' });
      if (!this.takeMark(')')) return this.fail(token, { kind: 'missing-bracket' });
      return inner && this.powered(inner);
    }
    if (token.kind === 'number') return this.number(token);
    if (token.kind === 'other' && token.text === '√') {
      this.at++;
      const under = this.factor(depth + 1);
      return under && raise(under, Rational.of(1, 2), '');
    }
    if (token.kind !== 'symbol') return this.fail(token, { kind: 'unexpected', found: this.textOf(token) });
    this.at++;
    const unit = this.symbol(token);
    this.lastUnit = unit;
    return unit && (this.reference(unit, token) ?? this.powered(unit));
  }

  /** A factor in front: `10^3`, `1e-6`, `1000`, and `1` before a slash. */
  private number(token: Extract<Token, { kind: 'number' }>): Unit | undefined {
    this.at++;
    const value = Rational.parse(token.text);
    if (!value || value.sign <= 0) return this.fail(token, { kind: 'unexpected', found: token.text });
    const power = this.exponent(true);
    if (this.fault) return undefined;
    const scale = Scale.of(value).pow(power ?? Rational.one);
    return scaledBy(pureNumber, scale, '');
  }

  /** `kPa(g)`, `bar(a)`, `dB(A)`: a mark of the reference behind a unit. */
  private reference(unit: Unit, token: Token): Unit | undefined {
    const [open, inner, close] = this.tokens.slice(this.at, this.at + 3);
    if (open?.kind !== 'mark' || open.text !== '(' || open.start !== token.end || inner?.kind !== 'symbol' || close?.kind !== 'mark' || close.text !== ')') return undefined;
    const pressure = unit.dimension === pressureDimension && /^(?:g|a|abs|gauge|G|A)$/.test(inner.text);
    if (!pressure && !(unit.level && /^[A-Z]$/.test(inner.text))) return undefined;
    this.at += 3;
    this.strong = true;
    return pressure && /^g/i.test(inner.text) ? { ...unit, offset: { kind: 'gauge', zero: Rational.of(101325) } } : unit;
  }

  private powered(unit: Unit): Unit | undefined {
    const power = this.exponent(false);
    return this.fault ? undefined : power ? raise(unit, power, '') : unit;
  }

  /** `^2`, `²`, `2`, `-3`, `^(1/3)`, `^0.5`, `-1/3`, `+1`. After a number only an explicit caret counts. */
  private exponent(afterNumber: boolean): Rational | undefined {
    const token = this.tokens[this.at];
    if (token?.kind === 'power') {
      this.at++;
      this.strong = true;
      return token.value;
    }
    if (token?.kind === 'mark' && token.text === '^') {
      this.at++;
      this.strong = true;
      return this.signed(true);
    }
    if (afterNumber || token === undefined) return undefined;
    const next = this.tokens[this.at + 1];
    const sign = token.kind === 'mark' && (token.text === '-' || token.text === '+') && next?.kind === 'number' && next.start === token.end;
    if (token.kind !== 'number' && !sign) return undefined;
    const before = this.tokens[this.at - 1];
    if (before && before.end !== token.start) return undefined;
    this.strong = true;
    return this.signed(false);
  }

  private signed(caret: boolean): Rational | undefined {
    const from = this.tokens[this.at];
    const bracket = this.takeMark('(');
    const minus = this.takeMark('-');
    if (!minus) this.takeMark('+');
    const token = this.tokens[this.at];
    if (token?.kind !== 'number') return this.failPower(token ?? from);
    this.at++;
    let value = Rational.parse(token.text);
    const below = this.tokens[this.at + 1];
    const slash = this.peekMark('/') && below?.kind === 'number' && (bracket || caret || minus) && !this.followsNumber(this.at + 2);
    if (slash && below?.kind === 'number') {
      const divisor = Rational.parse(below.text);
      value = divisor && !divisor.isZero && value ? value.div(divisor) : undefined;
      this.at += 2;
    }
    if (bracket && !this.takeMark(')')) return this.failPower(from);
    if (!value || value.abs().compare(Rational.of(20)) > 0) return this.failPower(token);
    return minus ? value.neg() : value;
  }

  private followsNumber(at: number): boolean {
    const token = this.tokens[at];
    return token?.kind === 'symbol' && this.tokens[at - 1]?.end === token.start;
  }

  private symbol(token: Extract<Token, { kind: 'symbol' }>): Unit | undefined {
    const special = this.specialSymbol(token);
    if (special) return special;
    const unit = this.options.vocabulary?.units.get(token.text) ?? this.numberedSymbol(token) ?? this.joinedSymbol(token) ?? this.afterSlash(token) ?? this.lookUp(token) ?? this.runTogether(token);
    if (unit) {
      this.known++;
      return unit;
    }
    return this.fail(token, { kind: 'unknown-symbol', symbol: token.text });
  }

  /** `inH2O`, `mmH2O`: a digit inside a symbol of the catalogue. */
  private numberedSymbol(token: Token): Unit | undefined {
    const [digit, rest] = [this.tokens[this.at], this.tokens[this.at + 1]];
    if (digit?.kind !== 'number' || rest?.kind !== 'symbol' || digit.start !== token.end || rest.start !== digit.end) return undefined;
    const found = findSymbol(this.text.slice(token.start, rest.end));
    if (found) this.at += 2;
    return found?.unit;
  }

  /** `W/mK`: below a slash, metre kelvin rather than millikelvin. */
  private afterSlash(token: Extract<Token, { kind: 'symbol' }>): Unit | undefined {
    if (this.slashes === 0 || token.text !== 'mK' || this.tokens[this.at]?.kind === 'power') return undefined;
    return this.runTogether(token);
  }

  /** `deg C`, `mm Hg`, `ft-lbf`: symbols of the catalogue that hold a blank or a hyphen. */
  private joinedSymbol(token: Token): Unit | undefined {
    const glued = /^(?:deg|degs|degree|degrees)(C|F|K|R)$/.exec(this.textOf(token));
    if (glued) return findSymbol({ C: 'degC', F: 'degF', K: 'K', R: 'degR' }[glued[1] as string] as string)?.unit;
    const [mark, next] = [this.tokens[this.at], this.tokens[this.at + 1]];
    if (mark?.kind !== 'mark' || next?.kind !== 'symbol' || (mark.text !== ' ' && mark.text !== '-')) return undefined;
    const first = this.textOf(token);
    const degree = /^(?:deg|degs|degree|degrees|°)\.?$/i.test(first) && /^(?:c|f|k|r|celsius|fahrenheit|kelvin|rankine|centigrade)$/i.test(next.text);
    const found = degree ? findSymbol({ c: 'degC', f: 'degF', k: 'K', r: 'degR' }[(next.text[0] as string).toLowerCase()] ?? '') ?? (/^cent/i.test(next.text) ? findSymbol('degC') : undefined) : findSymbol(`${first}${mark.text}${next.text}`) ?? findName(`${first} ${next.text}`);
    if (!found || (found.weak && !degree)) return undefined;
    this.at += 2;
    this.strong = true;
    return found.unit;
  }

  /** C, F and R: coulomb, farad and nothing, or degrees. */
  private specialSymbol(token: Extract<Token, { kind: 'symbol' }>): Unit | undefined {
    const { text } = token;
    if (/^(?:celsius|centigrade|fahrenheit|rankine|kelvins?)$/i.test(text)) {
      const degree = this.tokens[this.at + 1];
      if (degree?.kind === 'symbol' && /^degrees?$/i.test(degree.text)) this.at += 2;
      this.strong = true;
      return findSymbol({ c: 'degC', f: 'degF', r: 'degR', k: 'K' }[(text[0] as string).toLowerCase()] as string)?.unit;
    }
    if (!/^[CFR]$/.test(text)) return undefined;
    const degrees = this.slashes > 0 || describesTemperature(this.options.describes) || (this.at > 2 && text !== 'F');
    if (text === 'R') return degrees ? this.hinted(token, 'rankine-or-gas', 'degR') : undefined;
    if (!degrees) return undefined;
    return text === 'C' ? this.hinted(token, 'celsius-or-coulomb', 'degC') : this.hinted(token, 'fahrenheit-or-farad', 'degF');
  }

  private hinted(token: Token, kind: UnitHint['kind'], symbol: string): Unit | undefined {
    const found = findSymbol(symbol);
    if (!found) return undefined;
    const readAs = this.text.slice(0, token.start) + symbol + this.text.slice(token.end);
    this.hints.push({ span: { start: token.start, end: token.end }, kind, readAs: readAs.trim() });
    return found.unit;
  }

  private lookUp(token: Extract<Token, { kind: 'symbol' }>): Unit | undefined {
    const found = findSymbol(token.text) ?? (token.text.length > 1 ? findName(token.text) : undefined);
    if (found) {
      this.weak ||= found.weak;
      this.strong ||= !found.weak && (found.prefixed || token.text.length > 2 || /[°%Ωµμ]/.test(token.text)) && !commonWords.has(token.text.toLowerCase());
      return found.unit;
    }
    const labelled = this.labelled(token);
    if (labelled) return labelled;
    const cased = otherCase(token.text);
    const unit = cased === undefined ? undefined : findSymbol(cased)?.unit;
    if (!unit || cased === undefined) return undefined;
    this.hints.push({ span: { start: token.start, end: token.end }, kind: 'case', readAs: (this.text.slice(0, token.start) + cased + this.text.slice(token.end)).trim() });
    return unit;
  }

  /** `gC`, `kgN`, `kgCO2`: the substance is a label. */
  private labelled(token: Extract<Token, { kind: 'symbol' }>): Unit | undefined {
    for (let cut = token.text.length - 1; cut > 0; cut--) {
      const found = isLabel(token.text.slice(cut)) ? findSymbol(token.text.slice(0, cut)) : undefined;
      if (!found || found.weak) continue;
      const digits = this.tokens[this.at];
      if (digits?.kind === 'number' && digits.start === token.end && /^[A-Z]/.test(token.text.slice(cut)) && /O$|H$/.test(token.text)) this.at++;
      return found.unit;
    }
    return undefined;
  }

  /** `Wm-2`, `mol m-2s-1`, `W/mK`: symbols run together. */
  private runTogether(token: Extract<Token, { kind: 'symbol' }>): Unit | undefined {
    if (token.text.length > 6) return undefined;
    for (let cut = token.text.length - 1; cut > 0; cut--) {
      const [first, second] = [findSymbol(token.text.slice(0, cut)), findSymbol(token.text.slice(cut))];
      if (!first || !second || first.weak || second.weak) continue;
      const next = this.tokens[this.at];
      const raisedNext = next?.kind === 'power' || next?.kind === 'number' || (next?.kind === 'mark' && (next.text === '^' || next.text === '-'));
      if (!raisedNext && this.slashes === 0) continue;
      if (!raisedNext) {
        const spelled = `(${token.text.slice(0, cut)} ${token.text.slice(cut)})`;
        this.hints.push({ span: { start: token.start, end: token.end }, kind: 'prefix-or-product', readAs: (this.text.slice(0, token.start) + spelled + this.text.slice(token.end)).trim() });
      }
      const power = this.exponent(false);
      if (this.fault) return undefined;
      return multiply(first.unit, power ? raise(second.unit, power, '') : second.unit, '');
    }
    return undefined;
  }

  /** A substance beside the unit, `umol CO2`, `kg water`, `J/kg dry air`: skipped. */
  private skipLabel(): boolean {
    const token = this.tokens[this.at];
    if (token?.kind !== 'symbol' || !isLabel(token.text) || (findSymbol(token.text)?.weak === false && token.text.length < 2 && !/^[CN]$/.test(token.text))) return false;
    if (/^[CN]$/.test(token.text) && !/(?:g|t|Mg|kg|mol)$/.test(this.textOf(this.tokens[this.at - 2]))) return false;
    this.at++;
    const digits = this.tokens[this.at];
    if (digits?.kind === 'number' && digits.start === token.end && /^[A-Z]/.test(token.text)) this.at++;
    return true;
  }

  private isProductFrom(from: number): boolean {
    return this.tokens.slice(from, this.at).filter((token) => token.kind === 'symbol').length > 1 && !(this.tokens[from]?.kind === 'mark') && !this.tokens.slice(from, this.at).some((token) => token.kind === 'mark' && token.text === '(');
  }

  private ambiguous(): void {
    if (this.hints.some((hint) => hint.kind === 'product-after-slash')) return;
    const slash = this.text.indexOf('/');
    const readAs = this.text.includes('*', slash) ? this.text.trim() : `${this.text.slice(0, slash + 1)}(${this.text.slice(slash + 1).trim().replace(/[-.·]/g, ' ')})`;
    this.hints.push({ span: { start: 0, end: this.text.length }, kind: 'product-after-slash', readAs: readAs.trim() });
  }

  private skipSpace(): void {
    while (this.peekMark(' ')) this.at++;
  }

  private peekMark(text: string): boolean {
    const token = this.tokens[this.at];
    return token?.kind === 'mark' && token.text === text;
  }

  private takeMark(text: string): boolean {
    if (!this.peekMark(text)) return false;
    this.at++;
    return true;
  }

  private peekPer(): boolean {
    const token = this.tokens[this.at];
    return token?.kind === 'symbol' && token.text.toLowerCase() === 'per';
  }

  private takePer(): boolean {
    if (!this.peekPer()) return false;
    this.at++;
    return true;
  }

  private textOf(token: Token | undefined): string {
    return token ? this.text.slice(token.start, token.end) : '';
  }

  private fail(token: Token | undefined, reason: UnitFault): undefined {
    this.fault ??= { token, reason };
    return undefined;
  }

  private failPower(token: Token | undefined): undefined {
    return this.fail(token, { kind: 'bad-exponent', found: this.textOf(token) || 'nothing' });
  }
}

const commonWords = new Set(['bar', 'day', 'days', 'point', 'foot', 'second', 'minute', 'hour', 'gross', 'link', 'chain', 'rod', 'hand', 'barn', 'mole', 'candle', 'stone', 'slug', 'cord', 'dash', 'drop', 'pole', 'line', 'cup', 'gram', 'bit', 'byte', 'met', 'are', 'turn', 'cycle', 'grad', 'mil', 'all', 'max', 'grade', 'knot', 'count', 'counts', 'item', 'items', 'each', 'parts', 'part', 'era', 'das', 'tot', 'max', 'rev', 'pt', 'inch', 'gal']);

function trimTokens(tokens: readonly Token[]): readonly Token[] {
  let [from, to] = [0, tokens.length];
  const blank = (token: Token | undefined): boolean => token?.kind === 'mark' && token.text === ' ';
  while (blank(tokens[from])) from++;
  while (to > from && blank(tokens[to - 1])) to--;
  return tokens.slice(from, to);
}

/** `kilograms per cubic metre`, `square feet`, `metres squared`: words brought to symbols and read again. */
function readWords(text: string, options: ReadOptions): UnitRead | undefined {
  if (!/[a-z]{3}/i.test(text)) return undefined;
  const spelled = text.replace(/\b(?:square|sq\.?)\s+([a-z]+)\b/gi, '$1^2').replace(/\b(?:cubic|cu\.?)\s+([a-z]+)\b/gi, '$1^3')
    .replace(/\b([a-z]+)\s+squared\b/gi, '$1^2').replace(/\b([a-z]+)\s+cubed\b/gi, '$1^3').replace(/\s+per\s+/gi, '/').replace(/\s+to the power (?:of )?/gi, '^');
  if (spelled === text || spelled.length > longest) return undefined;
  const result = new Reader(spelled, options).read();
  return result.ok ? { ...result, hints: [], beyondDoubt: true } : undefined;
}

/** The nearest readable spelling of the whole text, by changing the one symbol that failed. */
function suggest(text: string, token: Token | undefined, reason: UnitFault): string | undefined {
  if (reason.kind === 'missing-bracket') {
    const closed = parseUnit(`${text})`);
    return closed.ok ? `${text})` : undefined;
  }
  if (reason.kind === 'bad-exponent' || reason.kind === 'unexpected') {
    const simpler = text.replace(/\^\^+/g, '^').replace(/\/\/+/g, '/').replace(/\^$/, '');
    return simpler !== text && parseUnit(simpler).ok ? simpler : undefined;
  }
  if (!token || token.kind !== 'symbol' || token.text.length < 2) return undefined;
  const nearest = nearestUnit(token.text);
  return nearest === undefined ? undefined : text.slice(0, token.start) + nearest + text.slice(token.end);
}

function nearestUnit(symbol: string): string | undefined {
  const most = symbol.length <= 3 ? 1 : 2;
  let best: { readonly text: string; readonly far: number } | undefined;
  for (const each of symbol.length > 3 ? knownNames() : knownSymbols()) {
    if (Math.abs(each.length - symbol.length) > most) continue;
    const far = distance(symbol.toLowerCase(), each.toLowerCase());
    if (far <= most && (!best || far < best.far)) best = { text: each, far };
  }
  return best?.text;
}
