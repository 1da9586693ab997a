/** Unit expressions as people write them, to units; never throws. */
import { readAlternatives } from './parse-unit-alternatives.ts';
import { readDimension } from './parse-unit-dimension.ts';
import { unread } from './parse-unit-fault.ts';
import { type Reading, readProduct } from './parse-unit-reader.ts';
import { pureNumber, type Unit } from './unit.ts';
import { worthOf } from './unit-doubt.ts';
import { type Factor, productOf } from './unit-factor.ts';
import { hintsOf } from './unit-hints.ts';
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
  const key = `${options.vocabulary?.fingerprint ?? ''}|${describesTemperature(options.describes) ? 't' : ''}|${text}`;
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
  const ends = [...text.slice(0, longest).matchAll(/[,;:]| [-–—=(]|\s/g)].map((match) => match.index);
  for (const end of ends.slice(0, 6).reverse()) {
    const part = text.slice(0, end).trimEnd();
    const result = parseUnit(part, options);
    if (result.ok && result.beyondDoubt && !endsInWord(part, text.slice(end))) return { ...result, end: part.length };
  }
  return undefined;
}

/** `m2 a wall`, `m/s in pipe`: the last word belongs to the description. */
function endsInWord(part: string, rest: string): boolean {
  return /^\s*\p{L}/u.test(rest) && /[\s.](?:a|in|at|h|d|t|u|r|y|S|T|H|A|L|G|P|C|F|N|g|l|per|of|for|or|to|air|water|gas|steam|fuel|ice|snow|soil|wet|dry)$/.test(part) && !/^\S+$/.test(part);
}

function readAny(text: string, options: ReadOptions): UnitResult {
  const trimmed = text.trim().replace(/(?<=[^.\s])[.,;:]$/, (mark, at: number, whole: string) => (mark === '.' && /(?:^|\W)(?:in|ft|sq|cu|lbs?|yd|pc|min|abs)$/.test(whole.slice(0, at)) ? mark : ''));
  if (trimmed !== 'None' && nothings.has(trimmed.toLowerCase())) return read({ ...pureNumber, text: text.trim() }, [], /less|dimension/i.test(trimmed));
  if (trimmed.length > longest) return refusal(text, { kind: 'unexpected', found: trimmed.slice(0, 10) });
  if (/^dim(?:ension)?\s/.test(trimmed)) return readDimension(text) ?? refusal(text, { kind: 'unexpected', found: trimmed.slice(0, 10) });
  const plain = plainText(trimmed);
  const alternatives = readAlternatives(trimmed, options, parseUnit);
  if (alternatives) return alternatives;
  const odd = /[\\{}]/.exec(plain.text) ?? unlikely.exec(plain.text);
  if (odd) return refusal(text, { kind: 'unexpected', found: odd[0] });
  return readPlain(text, plain, text.indexOf(trimmed), options);
}

function readPlain(text: string, plain: PlainText, shift: number, options: ReadOptions): UnitResult {
  const temperature = describesTemperature(options.describes);
  const reading = readProduct(plain.text, options.vocabulary);
  const place = (start: number, end: number): { start: number; end: number } => {
    const span = originalSpan(plain, start, end);
    return { start: span.start + shift, end: span.end + shift };
  };
  if (reading.fault) return unread(text, place(reading.fault.start, reading.fault.end), reading.fault.reason, plain.text, (other) => parseUnit(other, options));
  if (isBareR(reading.factors, temperature)) return refusal(text, { kind: 'unknown-symbol', symbol: 'R' });
  return judged(text, plain, reading, settleLetters(reading.factors, temperature), place, options);
}

function judged(text: string, plain: PlainText, reading: Reading, factors: readonly Factor[], place: (start: number, end: number) => { start: number; end: number }, options: ReadOptions): UnitResult {
  const worth = worthOf(plain.text, factors, reading.marks);
  if (worth === 'nothing') return refusal(text, { kind: 'unexpected', found: text.trim().slice(0, 10) });
  const hints = hintsOf(text, plain.text, factors, reading.marks, place, options.describes);
  return read(productOf(factors, text.trim()), hints, worth === 'beyond doubt');
}

function read(unit: Unit, hints: UnitRead['hints'], beyondDoubt: boolean): UnitRead {
  return { ok: true, unit, hints, beyondDoubt };
}

/** A text that is no unit and does not try to be one. */
function refusal(text: string, reason: UnitFault): UnitUnread {
  return { ok: false, span: { start: 0, end: text.length }, reason, triesToBeUnit: false };
}
