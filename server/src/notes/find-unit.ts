/** The unit that a text states in brackets, and the brackets that state none. */
import { parseUnit } from '../quantities/parse-unit.ts';
import type { ReadOptions, UnitHint, UnitUnread } from '../quantities/unit-result.ts';
import type { Unit } from '../quantities/unit.ts';
import type { Span } from '../text/span.ts';
import { type Bracketed, bracketsIn } from './brackets.ts';
import { isNoUnit, isSeries, type Surroundings } from './not-units.ts';
import type { Piece } from './piece.ts';
import { mayStandAlone } from './plain-words.ts';

/** A unit read from a text. */
export interface Found {
  readonly unit: Unit;
  readonly hints: readonly UnitHint[];
  /** The unit's characters; offsets are those of the piece. */
  readonly span: Span;
  /** With the brackets or the words that introduce it. */
  readonly outer: Span;
  readonly by: 'bracket' | 'parenthesis' | 'words' | 'bare';
}

/** Everything bracketed in a text, sorted into units, failed units and others; offsets are those of the piece. */
export interface Looked {
  readonly brackets: readonly Found[];
  readonly parentheses: readonly Found[];
  readonly problems: readonly { readonly text: string; readonly span: Span; readonly fault: UnitUnread }[];
  readonly unread: readonly { readonly text: string; readonly span: Span }[];
}

const nothing: Looked = { brackets: [], parentheses: [], problems: [], unread: [] };

/** Sorts the brackets of a piece. Round ones count where `parentheses` is set and the unit is beyond doubt. */
export function lookForUnits(piece: Piece, around: Surroundings, parentheses: boolean, options: ReadOptions): Looked {
  const { text } = piece;
  if (!text.includes('[') && !text.includes('(')) return nothing;
  const looked = { brackets: [] as Found[], parentheses: [] as Found[], problems: [] as Looked['problems'][number][], unread: [] as Looked['unread'][number][] };
  let taken = 0;
  let round = 0;
  for (const bracket of bracketsIn(text)) {
    if (bracket.start < taken) continue;
    const blank = bracket.inner.length - bracket.inner.trimStart().length;
    const inner = bracket.inner.trim();
    const span = { start: bracket.start + 1 + blank, end: bracket.start + 1 + blank + inner.length };
    const outer = { start: bracket.start, end: bracket.end };
    const unread = { text: inner, span };
    if (bracket.open === '(') {
      if (bracket.start < round) continue;
      const found = parentheses && standsFree(text, bracket) ? readParenthesis(text, bracket, span, outer, options) : undefined;
      if (found) {
        looked.parentheses.push(found);
        taken = bracket.end;
      } else if (inExpression(text, bracket)) round = Math.max(round, bracket.end);
      else if (!bracket.glued && bracket.inner.length < 30) looked.unread.push(unread);
    } else if (bracket.glued && !gluedUnit.test(bracket.inner)) looked.unread.push(unread);
    else if (isNoUnit(text, bracket, around)) looked.unread.push(unread);
    else {
      const lead = unitLabel.exec(inner)?.[0].length ?? 0;
      const result = parseUnit(inner.slice(lead).replace(/\s+/g, ' '), options);
      if (result.ok && (!bracket.glued || result.beyondDoubt || inner === '-')) looked.brackets.push({ unit: result.unit, hints: result.hints, span: { start: span.start + lead, end: span.end }, outer, by: 'bracket' });
      else {
        looked.unread.push(unread);
        if (!result.ok && result.triesToBeUnit && !bracket.glued) looked.problems.push({ text: inner.slice(lead), span: { start: span.start + lead, end: span.end }, fault: result });
      }
    }
  }
  return looked;
}

/** A parenthesis in running text: not part of an expression such as `K/((g/kg)^2)`. */
function standsFree(text: string, bracket: Bracketed): boolean {
  return !inExpression(text, bracket) && (bracket.start === 0 || /\s/.test(text[bracket.start - 1] as string)) && /^(?:[\s.,;:]|$)/.test(text.slice(bracket.end, bracket.end + 1));
}

function inExpression(text: string, { start, glued }: Bracketed): boolean {
  return glued || /[/*^·⋅=+(-]\s*$/.test(text.slice(Math.max(start - 3, 0), start));
}

/** `[units: m/s]`, `[unit = m]`. */
const unitLabel = /^\s*(?:units?|in)\s*[:=]\s*/i;
/** `velocity[m/s]`: glued, and no index. */
const gluedUnit = /^-$|[\p{L})]\s*\/\s*[\p{L}(]|\^|°|[²³⁻]/u;
/** Symbols of two letters that are seldom names, in `(Pa)`; common practice. */
const plainInParentheses = new Set(['Pa', 'Hz', 'ft', 'kg', '°', '%']);

function readParenthesis(text: string, bracket: Bracketed, span: Span, outer: Span, options: ReadOptions): Found | undefined {
  const inner = bracket.inner.trim();
  if (inner === '' || /[:=,;'"]/.test(inner.replace(/:math:/g, '')) || isSeries(inner) || !mayStandAlone(inner) || doubtful.test(inner) || /[.!?]$|(?:\S+\s+){5}/.test(inner) || /^\d(?!\/|0\^|0?e)/.test(inner)) return undefined;
  const lead = /^in\s+/i.exec(inner)?.[0].length ?? 0;
  if (lead > 0 && !/^\s*(?:[.;,]?\s*$|\.\s)/.test(text.slice(bracket.end))) return undefined;
  const result = parseUnit(inner.slice(lead), options);
  if (!result.ok || !(result.beyondDoubt || plainInParentheses.has(inner) || weakCounts(text, bracket, inner))) return undefined;
  return { unit: result.unit, hints: result.hints, span: { start: span.start + lead, end: span.end }, outer, by: 'parenthesis' };
}

/** Letters in parentheses count at the head of a text, `(m) perimeter`, and the most usual at its end, `outer diameter (m)`. */
const atHead = new Set(['m', 's', 'K', 'W', 'N', 'J', 'V', 'A', '-', '--', '1', 'h', 'g', 'L', 'bar', 'psi', 'rpm', 'deg', 'rad', 'sec']);
const atEnd = new Set(['m', 's', 'K', '-', '--']);

function weakCounts(text: string, bracket: Bracketed, inner: string): boolean {
  if (text.slice(0, bracket.start).trim() === '') return atHead.has(inner) && inner !== '1';
  if (!atEnd.has(inner) || !/^[\s.,;]*$/.test(text.slice(bracket.end))) return false;
  const before = /([\p{L}_]+)\s*$/u.exec(text.slice(0, bracket.start))?.[1] ?? '';
  return before.length > 2 && (before[0]?.toLowerCase() !== inner.toLowerCase() || /^(?:seconds|met(?:re|er)s|kelvins?)$/i.test(before));
}

/** Words in parentheses that read as units and are others: `(min)`, `(max)`, `(sec)`, `(s)`. */
const doubtful = /^(?:min|max|rev|mil|met|var|none|total|dim|fraction|ratio|decimal|dimensionless units?|[A-Z]{2,}-\d+)$/i;

/**
 * The bracket that counts among several: side by side, the last (a symbol stands before its unit); alternatives of one
 * dimension give the dimension without a scale; of several, nothing; otherwise the first.
 */
export function choose(text: string, found: readonly Found[]): Found | undefined {
  const telling = found.length > 1 ? found.filter((each) => !isValue(text, each)) : found;
  let [chosen, ...rest] = telling.length > 0 ? telling : found;
  for (const next of rest) {
    if (!chosen) return undefined;
    const between = text.slice(chosen.outer.end, next.outer.start);
    if (/^\s*(?:to|into|-+>|→|=>)\s*$/.test(between)) return undefined;
    if (between.trim() === '') chosen = next;
    else if (/^\s*(?:or|\/|,?\s*or|,)\s+(?:in\s+)?$/i.test(between) || /^[^.]*\bor\b[^.]*$/.test(between)) {
      const joined = alternatives(chosen, next);
      if (!joined) return undefined;
      chosen = joined;
    } else return chosen;
  }
  return chosen;
}

/** Two units of one quantity: the same unit, or the dimension that both have. */
export function alternatives(first: Found, second: Found): Found | undefined {
  if (first.unit.dimension !== second.unit.dimension) return undefined;
  const same = first.unit.scale !== undefined && second.unit.scale !== undefined && first.unit.scale.equals(second.unit.scale) && first.unit.offset?.kind === second.unit.offset?.kind;
  if (same) return first;
  const span = { start: first.span.start, end: second.span.end };
  const written = `${first.unit.text} or ${second.unit.text}`;
  return { unit: { dimension: first.unit.dimension, scale: undefined, text: written }, hints: [], span, outer: { start: first.outer.start, end: second.outer.end }, by: first.by };
}

const value = /(?:^|[=<>≤≥~±,(]|\b(?:at|of|to|than|by|from|above|below|over|under|is|are|was|about|around|approximately|and|between|until|or|only|up|minus|plus|equals?|be|with|in|every|within|exceeds?|defaults?|default:))\s*[-+]?\d[\d.,]*(?:[eE][-+]?\d+)?\s*$/i;

/** A value with its unit; a plain number carries none. */
export function isValue(text: string, found: Found): boolean {
  return (!found.unit.dimension.isOne || found.unit.scale?.isOne === false) && followsNumber(text, found.outer.start);
}

/** `at 25 [degC]`: a value and its unit, in prose; `stream 1 [K]` is none. */
function followsNumber(text: string, at: number): boolean {
  return /\d\s*$/.test(text.slice(Math.max(at - 4, 0), at)) && value.test(text.slice(Math.max(at - 40, 0), at));
}
