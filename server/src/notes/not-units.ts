/** What stands in brackets without being a unit; the kinds are those counted in real code (citations, shapes, ranges, options …). */
import type { LanguageId } from '../program/nodes.ts';
import type { Bracketed } from './brackets.ts';

/** Where a bracket stands: behind code, or in documentation with or without a numbered list of references. */
export interface Surroundings {
  readonly place: 'comment' | 'documentation';
  readonly language: LanguageId;
  /** The documentation lists `.. [1]`: a `[1]` in it is a citation. */
  readonly citations: boolean;
}

const marks = /^(?:out|in\s*[,/]\s*out|inout|i|o|i\s*[,/]\s*o|opt|optional|option|options|required|SI|IP|US|imperial|metric|default\b.*|None|True|False|see\b.*|ref\b.*|eq\b.*|fig\b.*|e\.g\..*|i\.e\..*)$/i;
/** Digits with marks of lists and ranges only: `0, 1`, `0-1`, `-90 .. 90`, `1:10`, `2`. */
const numbers = /^[\s\d.,:;+\-–~<>=eE]*$/;
const shape = /\d\s*[x×]|[x×]\s*\d|\b[A-Za-z]\w{0,2}\s+x\s+[A-Za-z]\w{0,2}\b|\bby\b/;
const converts = /->|→|=>/;
/** `k1-k6`, `a1, a2`. */
const series = /^([A-Za-z]+)\d+\s*(?:[-–,]|to|and)\s*\1\d+$/;
const textual = /["'=<>!?{}@]|\.\.(?!\.?$)|[^\s.\d]\.{2,}/;

/** `k1-k6`: members of a numbered series. */
export function isSeries(text: string): boolean {
  return series.test(text);
}

/** True where a square bracket cannot hold a unit, whatever its symbols read as. */
export function isNoUnit(text: string, bracket: Bracketed, around: Surroundings): boolean {
  const inner = bracket.inner.trim();
  const next = text[bracket.end] ?? '';
  if (next === '_' || next === '(' || next === '[') return true;
  if (inner === '') return isEmptyList(text, bracket);
  if (inner === '1') return isCitation(text, bracket, around);
  if (inner === 'in') return isDirection(text, bracket, around);
  if (marks.test(inner) || converts.test(inner) || (numbers.test(inner) && /\d/.test(inner))) return true;
  if (/^[A-Za-z]\w*\s*\+\s*\d+$/.test(inner)) return true;
  if (textual.test(inner.replace(/<\/?su[pb]>|\\[a-z]+\{|\{[^{}]*\}/gi, '')) || shape.test(inner) || series.test(inner)) return true;
  return followsCode(text, bracket.start);
}

/** `[nl]` where the code has a count of that name, and `[1]` beside such: the length of a vector. */
export function isLength(inner: string, names: { readonly occurs: (name: string) => boolean; readonly givesLengths: boolean }): boolean {
  return inner === '1' ? names.givesLengths : /^n[a-z]$/.test(inner) && names.occurs(inner);
}

/** True where a bracket stands in a line of code: behind an operator, an opening bracket, a keyword. */
function followsCode(text: string, at: number): boolean {
  let before = at - 1;
  while (before >= 0 && /\s/.test(text[before] as string)) before--;
  const previous = text[before];
  return previous !== undefined && /[=+*/[{\\@<>]/.test(previous) && !/<\/su[pb]>$|->$/.test(text.slice(Math.max(before - 5, 0), before + 1));
}

function isEmptyList(text: string, bracket: Bracketed): boolean {
  const before = text.slice(0, bracket.start).trimEnd();
  return before !== '' && (!/[\p{L}),]$/u.test(before) || /\b(?:means|is|are|to|or|as|an?|of|default|returns?)$/i.test(before) || !/^\s*(?:[.,;]|$)/.test(text.slice(bracket.end)));
}

const cites = /(?:\b(?:see|from|by|in|of|ref|refs|reference|eq|eqn|equation|after|and|table|fig|figure|al|per|source|model|method|paper|also)\.?|[,;&]|\d\))\s*$/i;

/** `[1]` is a number of no unit in some houses and a citation in most. */
function isCitation(text: string, bracket: Bracketed, around: Surroundings): boolean {
  const before = text.slice(0, bracket.start);
  if (around.citations || /\.\.\s*$/.test(before)) return true;
  if (around.place === 'comment') return cites.test(before);
  return /[.:]\s*$/.test(before) || (cites.test(before) && !/,\s*$/.test(before));
}

/** `[in]` is a direction where declarations carry directions, and in front of a description; behind one it is the inch. */
function isDirection(text: string, bracket: Bracketed, around: Surroundings): boolean {
  const host = around.language === 'python' || around.language === 'matlab' || around.language === 'julia';
  if (!host) return true;
  return around.place === 'documentation' && !/[\p{L})]\s*,?\s*$/u.test(text.slice(0, bracket.start));
}

/** A comment that holds code instead of words: an assignment, a call, a statement. */
export function isCode(text: string): boolean {
  return /^[\w.[\]"']+\s*[-+*/]?=(?!=)\s*\S/.test(text) || /^(?:return|if|for|while|print|import|from|def|class|elif|else|plt|assert|raise|try|with)\b.*[(:=[]/.test(text) || /^[\w.]+\([^()]*\)\s*$/.test(text);
}
