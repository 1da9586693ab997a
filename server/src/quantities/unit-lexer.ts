/** Unit text to tokens: TeX, HTML and Unicode spellings are brought to one form, with the offsets of the original kept. */
import { Rational } from './rational.ts';

export type Token =
  | { readonly kind: 'symbol'; readonly text: string; readonly start: number; readonly end: number }
  | { readonly kind: 'number'; readonly text: string; readonly start: number; readonly end: number }
  | { readonly kind: 'power'; readonly value: Rational; readonly start: number; readonly end: number }
  | { readonly kind: 'mark'; readonly text: '*' | '/' | '.' | '-' | '^' | '(' | ')' | ' ' | '+' | ','; readonly start: number; readonly end: number }
  | { readonly kind: 'other'; readonly text: string; readonly start: number; readonly end: number };

interface Source {
  readonly text: string;
  /** Original offset of each character, and of the end. */
  readonly at: readonly number[];
}

const rewrites: readonly (readonly [RegExp, (match: RegExpExecArray) => string])[] = [
  [/:math:`|[`$]|\\[,;! ]|~|\\left|\\right/g, (match) => (/^\\[,;! ]|~/.test(match[0]) ? ' ' : '')],
  [/\\d?frac\{([^{}]*)\}\{([^{}]*)\}/g, (match) => `(${match[1]})/(${match[2]})`],
  [/\^\{?\\circ\}?/g, () => '°'],
  [/\\(?:text|mathrm|rm|unit|mathit|operatorname)\s*\{([^{}]*)\}/g, (match) => match[1] as string],
  [/\\cdot|\\times|&middot;|&sdot;|×|⋅|·|∙|•|‧/g, () => '·'],
  [/\\degree|&deg;/g, () => '°'],
  [/\\mu|&mu;|&micro;/g, () => 'µ'],
  [/\\Omega/g, () => 'Ω'],
  [/\\%/g, () => '%'],
  [/\^\{([^{}]*)\}/g, (match) => `^(${match[1]})`],
  [/<sup>([^<]*)<\/sup>/gi, (match) => `^(${match[1]})`],
  [/&minus;|−|–/g, () => '-'],
  [/\*\*/g, () => '^'],
];

const raised: Record<string, string> = { '⁰': '0', '¹': '1', '²': '2', '³': '3', '⁴': '4', '⁵': '5', '⁶': '6', '⁷': '7', '⁸': '8', '⁹': '9', '⁻': '-', '⁺': '+', 'ᐟ': '/', '⸍': '/' };
const vulgar: Record<string, string> = { '½': '1/2', '⅓': '1/3', '⅔': '2/3', '¼': '1/4', '¾': '3/4', '⅕': '1/5', '⅙': '1/6', '⅛': '1/8' };

/** Tokens of a unit expression; offsets are those of the original text. */
export function tokenize(text: string): readonly Token[] {
  const source = normalise(text);
  const tokens: Token[] = [];
  let at = 0;
  while (at < source.text.length) {
    const [token, next] = read(source, at);
    tokens.push(token);
    at = next;
  }
  return tokens;
}

function normalise(text: string): Source {
  let source: Source = { text, at: Array.from({ length: text.length + 1 }, (_, at) => at) };
  if (!/[\\$`^*&<~:×⋅·∙•‧−–]/.test(text)) return source;
  for (const [pattern, replace] of rewrites) source = rewrite(source, pattern, replace);
  return source;
}

function rewrite(source: Source, pattern: RegExp, replace: (match: RegExpExecArray) => string): Source {
  pattern.lastIndex = 0;
  let out = '';
  const at: number[] = [];
  let from = 0;
  for (let match = pattern.exec(source.text); match; match = pattern.exec(source.text)) {
    out += source.text.slice(from, match.index);
    at.push(...source.at.slice(from, match.index));
    const put = replace(match);
    const inner = match[1] !== undefined && match[2] === undefined ? match[0].indexOf(match[1]) : -1;
    const shift = put.indexOf(match[1] ?? '');
    for (let i = 0; i < put.length; i++) {
      const position = inner >= 0 ? Math.min(Math.max(inner + i - shift, 0), match[0].length - 1) : 0;
      at.push(source.at[match.index + position] as number);
    }
    out += put;
    from = match.index + match[0].length;
    if (match[0] === '') pattern.lastIndex++;
  }
  if (from === 0) return source;
  out += source.text.slice(from);
  at.push(...source.at.slice(from));
  return { text: out, at };
}

const numberPattern = /\d+(?:\.\d+)?(?:[eE][+-]?\d+)?|\.\d+(?:[eE][+-]?\d+)?/y;
const symbolPattern = /[°º'′″"℃℉%‰µμΩΩÅ$€£#\p{L}_]+/uy;
const raisedPattern = /[⁰¹²³⁴⁵⁶⁷⁸⁹⁻⁺ᐟ⸍½⅓⅔¼¾⅕⅙⅛]+/y;

function read(source: Source, at: number): [Token, number] {
  const { text } = source;
  const span = (end: number): { start: number; end: number } => ({ start: source.at[at] as number, end: (source.at[end - 1] as number) + 1 });
  const power = match(raisedPattern, text, at);
  if (power !== undefined) {
    const value = Rational.parse(readRaised(power));
    return [value ? { kind: 'power', value, ...span(at + power.length) } : { kind: 'other', text: power, ...span(at + power.length) }, at + power.length];
  }
  const symbol = match(symbolPattern, text, at);
  if (symbol !== undefined) return [{ kind: 'symbol', text: symbol, ...span(at + symbol.length) }, at + symbol.length];
  const number = match(numberPattern, text, at);
  if (number !== undefined) return [{ kind: 'number', text: number, ...span(at + number.length) }, at + number.length];
  const character = text[at] as string;
  if (/\s/.test(character)) {
    let end = at + 1;
    while (end < text.length && /\s/.test(text[end] as string)) end++;
    return [{ kind: 'mark', text: ' ', ...span(end) }, end];
  }
  const mark = character === '·' ? '.' : character === '[' || character === '{' ? '(' : character === ']' || character === '}' ? ')' : character;
  if ('*/.-^()+,'.includes(mark)) return [{ kind: 'mark', text: mark as '*', ...span(at + 1) }, at + 1];
  return [{ kind: 'other', text: character, ...span(at + 1) }, at + 1];
}

function readRaised(text: string): string {
  let out = '';
  for (const character of text) out += vulgar[character] ?? raised[character] ?? character;
  return out.replace(/^\+/, '');
}

function match(pattern: RegExp, text: string, at: number): string | undefined {
  pattern.lastIndex = at;
  return pattern.exec(text)?.[0];
}
