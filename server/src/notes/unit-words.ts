/** Units without brackets in running text: "in degrees C", "units: m/s", "Sea pressure, dbar", "°F [IP] or °C [SI]". */
import { parseUnit } from '../quantities/parse-unit.ts';
import type { ReadOptions, UnitRead } from '../quantities/unit-result.ts';
import { isLetter } from './bare-unit.ts';
import { alternatives, type Found } from './find-unit.ts';
import type { Piece } from './piece.ts';
import { mayStandAlone } from './plain-words.ts';

/** Any of the forms, the most explicit first. `last`: words behind the last comma count. `taken`: a word is a name of the code around. */
export function unitInWords(piece: Piece, last: boolean, taken: (name: string) => boolean, options: ReadOptions): Found | undefined {
  if (isDual(piece.text)) return dualUnit(piece, options);
  const introduced = introducedUnit(piece, options);
  const behind = last ? unitBehindComma(piece, options) : undefined;
  const found = introduced && behind && behind.span.start < introduced.span.start ? behind : (introduced ?? behind);
  const words = found && piece.text.slice(found.span.start, found.span.end);
  return words !== undefined && isLetter(words) && taken(words) ? undefined : found;
}

const introductions = /(?:^|[\s(,;:])(?:in\s+(?:the\s+)?units?\s+of|in|units?\s*(?:[:=]|is|are|of)|expressed\s+(?:in|as)|measured\s+in)\s+(?=\S)/gi;

/** `in metres`, `in W/m2`, `units: kg/s`, `in units of eV`. */
function introducedUnit(piece: Piece, options: ReadOptions): Found | undefined {
  const { text } = piece;
  if (!/\bin\s|unit|expressed/i.test(text)) return undefined;
  for (const match of text.matchAll(introductions)) {
    const start = match.index + match[0].length;
    const found = leadingWords(text, start, options);
    if (found) return { unit: found.result.unit, hints: found.result.hints, span: { start, end: found.end }, outer: { start: match.index + (/^[\s(,;:]/.test(match[0]) ? 1 : 0), end: found.end }, by: 'words' };
  }
  return undefined;
}

const mostWords = 7;
const segmentEnd = /[;:)!?[]|[.,](?=\s|$)|\n\s*\n|\s[-–—]+\s|(?<![/*·^])\s\(/;

/** The longest run of words from `start` that is a unit. */
function leadingWords(text: string, start: number, options: ReadOptions): { readonly result: UnitRead; readonly end: number } | undefined {
  const rest = text.slice(start, start + 70);
  const stop = rest.search(segmentEnd);
  const segment = bracketAware(rest, stop < 0 ? rest.length : stop);
  const ends = [...segment.matchAll(/\S+/g)].slice(0, mostWords).map((word) => word.index + word[0].length);
  for (let at = ends.length - 1; at >= 0; at--) {
    const words = segment.slice(0, ends[at]).replace(/[.,;:]+$/, '');
    if (notUnits.has(words.toLowerCase()) || /\s(?:fractions?|ratios?|numbers?|of|per|and|in|at|the)$/i.test(words) || /^\d|^(?![msK])[A-Za-z]\*\*\d/.test(words) || !mayStandAlone(words)) continue;
    const result = parseUnit(words.replace(/\s+/g, ' '), options);
    if (!result.ok || isPureNumber(words)) continue;
    const whole = ends[at] === segment.trimEnd().length;
    const sure = result.beyondDoubt || fullNames.test(words);
    if (whole ? sure || symbolAlone(words, rest.slice(ends[at])) : sure && !continues(segment.slice(ends[at]))) return { result, end: start + words.length };
  }
  return undefined;
}

/** A closing parenthesis ends the segment only where none was opened in it: `in W/(m K)`. */
function bracketAware(rest: string, stop: number): string {
  let end = stop;
  while (end < rest.length && rest[end] === ')' && count(rest.slice(0, end), '(') > count(rest.slice(0, end), ')')) {
    const next = rest.slice(end + 1).search(segmentEnd);
    end = next < 0 ? rest.length : end + 1 + next;
  }
  return rest.slice(0, end);
}

function count(text: string, character: string): number {
  return text.split(character).length - 1;
}

/** English words behind "in" that are unit symbols or names too. */
const notUnits = new Set(['a', 'at', 'as', 'an', 'in', 'min', 'mil', 'point', 'line', 'part', 'parts', 'turn', 'all', 'each', 'bar', 'cycle', 'cycles', 'd', 't', 'l', 'u', 'b', 'p', 'x', 'r', 'e', 'i', 'met', 'var', 'link', 'chain', 'total', 'second', 'minute', 'hand', 'items', 'item']);
const fullNames = /^(?:met(?:re|er)s?|seconds|minutes|hours?|days|years?|degrees?|radians?|feet|inch(?:es)?|percent|kelvins?|celsius|fahrenheit|pascals?|watts?|joules?|newtons?|volts?|amp(?:ere)?s?|ohms?|grams?|moles?|bars|litres?|liters?|gallons?|knots)$/i;
/** Nouns behind a unit word that make another quantity of it. */
const nouns = /^\s+(?:fractions?|ratios?|percent|numbers?|mass|balance|charts?|scale|index|axis|angle|(?:of|above)\s+(?:water|mercury|h2o|hg)|per\b|squared|cubed|and\b|symbols?|format)/i;

function continues(behind: string): boolean {
  return nouns.test(behind);
}

/** One symbol alone, as in "in m", unless a list of letters follows. */
function symbolAlone(words: string, behind: string): boolean {
  return /^[A-Za-zµμΩ°%]{1,3}$/.test(words) && !/^\s*,\s*[A-Za-z]\b/.test(behind);
}

function isPureNumber(words: string): boolean {
  return /^(?:1|-+|–|none|n\/a|decimal|fractional|fraction|ratio|no units?|form|dimensionless|unitless)$/i.test(words);
}

/** What stands behind the last comma of the text or of its first sentence: `Absolute Salinity, g/kg`. */
function unitBehindComma(piece: Piece, options: ReadOptions): Found | undefined {
  const { text } = piece;
  if (!text.includes(',')) return undefined;
  const whole = text.trimEnd().length;
  const sentence = /[.;](?=\s)|\n\s*\n/.exec(text)?.index ?? whole;
  return tailOf(text, whole, true, options) ?? (sentence < whole ? tailOf(text, sentence, false, options) : undefined);
}

function tailOf(text: string, to: number, whole: boolean, options: ReadOptions): Found | undefined {
  const end = text[to - 1] === '.' ? to - 1 : to;
  const comma = text.lastIndexOf(',', end - 1);
  if (comma < 0 || end - comma > 40) return undefined;
  const tail = text.slice(comma + 1, end);
  const start = comma + 1 + tail.length - tail.trimStart().length;
  const words = tail.trim();
  if (words === '' || /^\d(?!\/)|^in\s/i.test(words) || /^\w+\s+\/\s|^U\+[\dA-F]{4}/.test(words) || !mayStandAlone(words) || isListed(text.slice(0, comma))) return undefined;
  const result = parseUnit(words, options);
  const dash = whole && /^-{1,2}$/.test(words) && /[A-Za-z]{4}\s*$/.test(text.slice(0, comma));
  if (!result.ok || (!dash && /^(?:1|-+|none|n\/a|ratio|decimal|fraction)$/i.test(words))) return undefined;
  const sure = dash || result.beyondDoubt || fullNames.test(words) || (whole && /^[A-Za-zµΩ]{1,3}$/.test(words) && !notUnits.has(words.toLowerCase()) && /[A-Za-z]{4}/.test(text.slice(0, comma)));
  if (!sure || notUnits.has(words)) return undefined;
  return { unit: result.unit, hints: result.hints, span: { start, end: start + words.length }, outer: { start: comma, end }, by: 'words' };
}

/** A list of letters or of single words: `coefficients a, b, m`, `hour, min, sec`. */
function isListed(before: string): boolean {
  return /(?:^|,)\s*\w+\s*,\s*\w+\s*$/.test(before) || /(?:^|[\s,])[A-Za-z]\s*$/.test(before) || /,\s*[A-Za-z]\w?\s*$/.test(before);
}

const mark = '[[(](?:IP|SI|US|imperial|metric)[\\])]';
const dual = new RegExp(`^(.*?)\\s*${mark}\\s*(?:,?\\s*or|,|/)\\s*(?:in\\s+)?(.{1,40}?)\\s*(?:${mark}|$)`, 'is');

/** Whether a text names a unit in each of two systems. */
function isDual(text: string): boolean {
  return /[[(](?:IP|SI|US|imperial|metric)[\])]\s*(?:,?\s*or|,|\/)\s/i.test(text);
}

/** `°F [IP] or °C [SI]`: one quantity in two systems. */
function dualUnit(piece: Piece, options: ReadOptions): Found | undefined {
  const match = dual.exec(piece.text);
  if (!match) return undefined;
  const [whole, before = '', second = ''] = match;
  const start = whole.lastIndexOf(second);
  const right = parseUnit(second, options);
  if (!right.ok) return undefined;
  for (const word of [...before.matchAll(/\S+/g)].slice(-mostWords)) {
    if (/^in$/i.test(word[0])) continue;
    const left = parseUnit(before.slice(word.index), options);
    if (!left.ok || left.unit.dimension !== right.unit.dimension) continue;
    const first = { start: word.index, end: before.length };
    const other = { start, end: start + second.length };
    return alternatives({ unit: left.unit, hints: [], span: first, outer: first, by: 'words' }, { unit: right.unit, hints: [], span: other, outer: { start: other.start, end: whole.length }, by: 'words' });
  }
  return undefined;
}
