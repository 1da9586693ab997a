/** Unit text as typed, in TeX, HTML or Unicode, brought to one plain form; the offsets of the original are kept. */

/** Plain text with the way back: `at[i]` is where the i-th character came from, `end[i]` the offset behind it. */
export interface PlainText {
  readonly text: string;
  /** Undefined where nothing was changed. */
  readonly at?: readonly number[];
  readonly end?: readonly number[];
}

/** Brings superscripts, TeX, HTML and typographic signs to `^(-2)`, `·`, `/`, `-`. A TeX command that has no place in a unit stays as `\`. */
export function plainText(source: string): PlainText {
  return /[\\$`&<~{]|[^\0-\x7F]|\*\*|:math/.test(source) ? new Rewriter(source).result() : { text: source };
}

/** The original offsets of a stretch of plain text. */
export function originalSpan(plain: PlainText, start: number, end: number): { readonly start: number; readonly end: number } {
  if (!plain.at || !plain.end) return { start, end };
  const behind = plain.end.at(-1) ?? 0;
  const from = plain.at[start] ?? behind;
  return { start: from, end: Math.max(from, end > start ? (plain.end[end - 1] ?? behind) : from) };
}

const raised: Readonly<Record<string, string>> = {
  '⁰': '0', '¹': '1', '²': '2', '³': '3', '⁴': '4', '⁵': '5', '⁶': '6', '⁷': '7', '⁸': '8', '⁹': '9', '⁻': '-', '⁺': '+', '⁽': '', '⁾': '', 'ᐟ': '/', '⸍': '/', '˙': '.', '⋅': '.',
  '½': '1/2', '⅓': '1/3', '⅔': '2/3', '¼': '1/4', '¾': '3/4', '⅕': '1/5', '⅖': '2/5', '⅗': '3/5', '⅘': '4/5', '⅙': '1/6', '⅚': '5/6', '⅛': '1/8', '⅜': '3/8', '⅝': '5/8', '⅞': '7/8',
};
const raisedRun = /[⁻⁺]?[⁰¹²³⁴-⁹½⅓⅔¼¾⅕⅖⅗⅘⅙⅚⅛⅜⅝⅞]+(?:[ᐟ⸍˙][⁰¹²³⁴-⁹]+)?|⁽[⁻⁺]?[⁰¹²³⁴-⁹]+(?:[ᐟ⸍][⁰¹²³⁴-⁹]+)?⁾/y;
const characters: Readonly<Record<string, string>> = {
  '⋅': '·', '∙': '·', '•': '·', '‧': '·', '・': '·', '∗': '*', '×': '*', '✕': '*', '−': '-', '–': '-', '‐': '-', '‑': '-', '⁄': '/', '∕': '/', '÷': '/', '˚': '°', '∘': '°', '\u00a0': ' ', '\u2009': ' ', '\u202f': ' ', '\u2002': ' ', '~': ' ', '`': '', '$': '',
  '₀': '0', '₁': '1', '₂': '2', '₃': '3', '₄': '4', '₅': '5', '₆': '6', '₇': '7', '₈': '8', '₉': '9',
};
const entities: Readonly<Record<string, string>> = { minus: '-', middot: '·', sdot: '·', times: '*', deg: '°', micro: 'µ', mu: 'µ', nbsp: ' ', thinsp: ' ', Omega: 'Ω', sup2: '^(2)', sup3: '^(3)', ndash: '-', permil: '‰' };
/** TeX commands that stand for a sign; those of spacing and size stand for nothing. */
const commands: Readonly<Record<string, string>> = {
  cdot: '·', times: '*', degree: '°', degreeCelsius: '°C', celsius: '°C', circ: '°', mu: 'µ', micro: 'µ', Omega: 'Ω', ohm: 'Ω', '%': '%', ',': ' ', ';': ' ', ':': ' ', ' ': ' ', '!': '', quad: ' ', left: '', right: '', big: '', Big: '', displaystyle: '', rm: '', textdegree: '°', angstrom: 'Å', AA: 'Å', sqrt: '√', over: '/', _: '_',
};
/** TeX commands whose argument is all that counts. */
const wrappers = new Set(['text', 'mathrm', 'textrm', 'mathit', 'mathsf', 'mbox', 'unit', 'si', 'operatorname', 'ensuremath', 'rm']);

class Rewriter {
  private text = '';
  private readonly at: number[] = [];
  private readonly ends: number[] = [];
  private readonly dollarsCount: boolean;

  constructor(private readonly source: string) {
    const dollars = source.split('$').length - 1;
    this.dollarsCount = dollars % 2 === 1;
  }

  result(): PlainText {
    this.run(this.source.startsWith(':math:') ? 6 : 0, this.source.length);
    return { text: this.text, at: this.at, end: this.ends };
  }

  private put(text: string, from: number, to: number): void {
    this.text += text;
    for (let i = 0; i < text.length; i++) {
      this.at.push(from);
      this.ends.push(to);
    }
  }

  private run(from: number, to: number): void {
    for (let at = from; at < to; ) at = this.step(at, to);
  }

  /** Rewrites what begins at an offset; returns where the next begins. */
  private step(at: number, to: number): number {
    const { source } = this;
    const character = source[at] as string;
    if (character === '\\') return this.command(at, to);
    if (character === '{') return this.group(at, to, '(', ')');
    if (character === '^' && source[at + 1] === '{') return this.power(at, to);
    if (character === '^' && source.startsWith('\\circ', at + 1)) return at + 1;
    if (character === '*' && source[at + 1] === '*') return this.sign('^', at, at + 2);
    if (character === '<') return this.tag(at, to);
    if (character === '&') return this.entity(at);
    if (character === '$' && this.dollarsCount) return this.sign('$', at, at + 1);
    raisedRun.lastIndex = at;
    const power = character > '\x7f' ? raisedRun.exec(source)?.[0] : undefined;
    if (power !== undefined) return this.sign(`^(${[...power].map((each) => raised[each] ?? each).join('')})`, at, at + power.length);
    return this.sign(characters[character] ?? character, at, at + 1);
  }

  private sign(text: string, at: number, next: number): number {
    this.put(text, at, next);
    return next;
  }

  /** `\cdot`, `\text{…}`, `\frac{…}{…}`; an unknown command leaves its backslash. */
  private command(at: number, to: number): number {
    const name = /^\\([A-Za-z]+|.)/.exec(this.source.slice(at, at + 24))?.[1] ?? '';
    const next = at + 1 + name.length;
    if (name === 'frac' || name === 'dfrac' || name === 'tfrac') return this.fraction(at, next, to);
    if (wrappers.has(name) && this.source[next] === '{') return this.group(next, to, '', '');
    const sign = commands[name];
    const swallowed = sign !== undefined && /[\p{L}°]$/u.test(sign) ? /^\s*/.exec(this.source.slice(next, to))?.[0].length ?? 0 : 0;
    return this.sign(sign ?? '\\', at, next + swallowed);
  }

  private fraction(at: number, from: number, to: number): number {
    if (this.source[from] !== '{') return this.sign('\\', at, from);
    const middle = this.group(from, to, '(', ')');
    if (this.source[middle] !== '{') return this.sign('\\', at, middle);
    this.put('/', middle, middle + 1);
    return this.group(middle, to, '(', ')');
  }

  private power(at: number, to: number): number {
    if (/^\^\{\\circ\s*\}/.test(this.source.slice(at, at + 12))) return this.sign('°', at, this.source.indexOf('}', at) + 1);
    this.put('^', at, at + 1);
    return this.group(at + 1, to, '(', ')');
  }

  /** The inside of braces, between the given brackets. */
  private group(at: number, to: number, open: string, close: string): number {
    let depth = 0;
    for (let i = at; i < to; i++) {
      if (this.source[i] === '{') depth++;
      else if (this.source[i] === '}' && --depth === 0) {
        this.put(open, at, at + 1);
        this.run(at + 1, i);
        this.put(close, i, i + 1);
        return i + 1;
      }
    }
    return this.sign('{', at, at + 1);
  }

  private tag(at: number, to: number): number {
    const match = /^<(sup|sub)>(.*?)<\/\1>/i.exec(this.source.slice(at, to));
    if (!match) return this.sign('<', at, at + 1);
    const inner = at + 5;
    const lower = (match[1] as string).toLowerCase() === 'sub';
    this.put(lower ? '' : '^(', at, inner);
    this.run(inner, inner + (match[2] as string).length);
    this.put(lower ? '' : ')', at + match[0].length - 6, at + match[0].length);
    return at + match[0].length;
  }

  private entity(at: number): number {
    const match = /^&(\w{2,7});/.exec(this.source.slice(at, at + 9));
    const sign = match && entities[match[1] as string];
    return sign ? this.sign(sign, at, at + (match as RegExpExecArray)[0].length) : this.sign('&', at, at + 1);
  }
}
