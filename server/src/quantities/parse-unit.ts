/** Unit expressions as people write them, to units; never throws. */
import { readAlternatives } from './parse-unit-alternatives.ts';
import { readDimension } from './parse-unit-dimension.ts';
import { unread } from './parse-unit-fault.ts';
import { type Reading, readProduct } from './parse-unit-reader.ts';
import { pureNumber, type Unit } from './unit.ts';
import { worthOf } from './unit-doubt.ts';
import { type Factor, productOf } from './unit-factor.ts';
import { describesMinimum, hintsOf } from './unit-hints.ts';
import { describesTemperature, isBareR, settleLetters } from './unit-letters.ts';
import type { ReadOptions, UnitFault, UnitRead, UnitResult, UnitUnread } from './unit-result.ts';
import { originalSpan, type PlainText, plainText } from './unit-text.ts';

export { describesTemperature } from './unit-letters.ts';

/** Spellings of a number without a unit; common practice. */
const nothings = new Set(['', '-', '--', '---', '–', '—', '1', 'dimensionless', 'unitless', 'fraction', 'fractional', 'ratio', 'nondimensional', 'non-dimensional', 'non dimensional', 'adimensional', 'no units', 'no unit', 'no dimension', 'none', 'n/a', 'decimal', 'decimal fraction', 'dimension-less', 'unit-less', '(-)', 'dimless']);
const longest = 90;
/** No unit has these outside of TeX and HTML: quoted strings, lists, code. */
const unlikely = /["?!@;=><|\n]|\.\.|,|:|^'|'$|^[-+\d.\s]+$|^\d[\d.]*\s*[-–]\s*\d/;
const cache = new Map<string, UnitResult>();

/** Reads a unit expression; spans are relative to `text`. */
export function parseUnit(text: string, options: ReadOptions = {}): UnitResult {
  const key = `${options.vocabulary?.fingerprint ?? ''}|${describesTemperature(options.describes) ? 't' : ''}${describesMinimum(options.describes) ? 'm' : ''}|${text}`;
  const known = cache.get(key);
  if (known) return known;
  const result = readAny(text, options, true);
  if (cache.size > 20000) cache.clear();
  cache.set(key, result);
  return result;
}

/** The unit that a comment begins with, before a comma, a dash or a description; `end` is where it ends. */
export function readLeadingUnit(text: string, options: ReadOptions = {}): (UnitRead & { readonly end: number }) | undefined {
  const whole = parseUnit(text, options);
  if (whole.ok) return { ...whole, end: text.length };
  const ends = [...text.slice(0, longest).matchAll(/[,;:]| [-–—=(]|\s/g)].map((match) => match.index);
  for (const end of ends.slice(0, 6).reverse()) {
    const part = text.slice(0, end).replace(/[\s,;:]+$/, '');
    const rest = text.slice(end);
    if (/^\d/.test(part) && !/^1\s*\/|^10\s*(?:\^|\*\*|[⁻⁰-⁹])/.test(part)) continue;
    const result = parseUnit(part, options);
    if (!result.ok || !result.beyondDoubt || endsInWord(part, rest)) continue;
    return goesOn(rest, options) ? undefined : { ...result, end: part.length };
  }
  return undefined;
}

/** `m2 a wall`, `m/s in pipe`: the last word belongs to the description. */
function endsInWord(part: string, rest: string): boolean {
  return /^\s*\p{L}/u.test(rest) && !/(?:deg(?:ree)?s?\.?|°)\s?[CFKR]$/.test(part) && /[\s.](?:a|in|at|h|d|t|u|r|y|S|T|H|A|L|G|P|C|F|N|g|l|per|of|for|or|to|air|water|gas|steam|fuel|ice|snow|soil|wet|dry)$/.test(part) && !/^\S+$/.test(part);
}

/** `mm to m`, `kB * T / q`, `ft [IP] or m [SI]`: what follows says that more than one unit is meant, or none. */
function goesOn(rest: string, options: ReadOptions): boolean {
  if (/^\s*(?:[/*+=^<>→]|->)/.test(rest) || /^\s*,\s*\p{L}+ or\s/u.test(rest) || /^\s*-\s*\w+\s*=/.test(rest)) return true;
  const other = /^\s*(?:\[\w+\]\s*)?(?:or|to)\s+(?:in\s+)?(\S+)/.exec(rest)?.[1];
  const next = other === undefined ? undefined : parseUnit(other, options);
  return next?.ok === true && (next.beyondDoubt || (other as string).length < 4);
}

/** `in` before a unit that makes no inch of it: `in metres`, but `in lbf` and `in Hg`. */
const preposition = /^in\s+(?=[\p{L}°%(])(?!(?:lbf?|oz|ozf|kip|kips|hg|h2o|wg|wc|w\.?[cg]|of|water|per|ton|ft|kgf|tonf)(?!\p{L}))/iu;

/** `nearest`: look for the nearest spelling where the text cannot be read. */
function readAny(text: string, options: ReadOptions, nearest: boolean): UnitResult {
  const trimmed = withoutStop(text.trim());
  if (trimmed !== 'None' && nothings.has(trimmed.toLowerCase())) return read({ ...pureNumber, text: text.trim() }, [], /less|dimension/i.test(trimmed));
  if (trimmed.length > longest) return refusal(text, { kind: 'unexpected', found: trimmed.slice(0, 10) });
  if (/^dim(?:ension)?\s/.test(trimmed)) return readDimension(text) ?? refusal(text, { kind: 'unexpected', found: trimmed.slice(0, 10) });
  if (/\\(?:left|right)(?![a-z])/.test(trimmed) && !/\\(?:text|mathrm|rm|unit|si)(?![a-z])/.test(trimmed)) return refusal(text, { kind: 'unexpected', found: '\\' });
  const body = trimmed.replace(preposition, '').replace(/^per\s?mill?e?$/i, '‰');
  const plain = plainText(body);
  const alternatives = readAlternatives(trimmed, options, parseUnit);
  if (alternatives) return alternatives;
  const odd = /[\\{}]/.exec(plain.text) ?? unlikely.exec(plain.text);
  if (odd) return refusal(text, { kind: 'unexpected', found: odd[0] });
  return readPlain(text, plain, text.indexOf(trimmed) + trimmed.length - body.length, options, nearest);
}

/** Text without a stop at its end; `in.` keeps its point. */
function withoutStop(text: string): string {
  const stopped = /^(.*[^.\s])[.,;:]$/s.exec(text)?.[1];
  return stopped === undefined || (text.endsWith('.') && /(?:^|\W)(?:in|ft|sq|cu|lbs?|yd|abs)$/.test(stopped)) ? text : stopped;
}

function readPlain(text: string, plain: PlainText, shift: number, options: ReadOptions, nearest: boolean): UnitResult {
  const temperature = describesTemperature(options.describes);
  const reading = readProduct(plain.text, options.vocabulary);
  const place = (start: number, end: number): { start: number; end: number } => {
    const span = originalSpan(plain, start, end);
    return { start: span.start + shift, end: span.end + shift };
  };
  if (reading.fault) {
    const span = place(reading.fault.start, reading.fault.end);
    return nearest ? unread(text, span, reading.fault.reason, plain.text, (other) => readAny(other, options, false)) : { ok: false, span, reason: reading.fault.reason, triesToBeUnit: false };
  }
  if (isBareR(reading.factors, temperature)) return refusal(text, { kind: 'unknown-symbol', symbol: 'R' });
  return judged(text, plain, reading, settleLetters(reading.factors, temperature), place, options);
}

function judged(text: string, plain: PlainText, reading: Reading, factors: readonly Factor[], place: (start: number, end: number) => { start: number; end: number }, options: ReadOptions): UnitResult {
  const worth = worthOf(plain.text, factors, reading.marks);
  if (worth === 'nothing') return refusal(text, { kind: 'unexpected', found: text.trim().slice(0, 10) });
  const hints = hintsOf(text, plain.text, factors, reading.marks, place, options.describes);
  return read(productOf(factors, withoutStop(text.trim()).replace(preposition, '')), hints, worth === 'beyond doubt');
}

function read(unit: Unit, hints: UnitRead['hints'], beyondDoubt: boolean): UnitRead {
  return { ok: true, unit, hints, beyondDoubt };
}

/** A text that is no unit and does not try to be one. */
function refusal(text: string, reason: UnitFault): UnitUnread {
  return { ok: false, span: { start: 0, end: text.length }, reason, triesToBeUnit: false };
}
