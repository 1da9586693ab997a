/** The unit that a text states in brackets, and the brackets that state none. */
import { parseUnit } from '../quantities/parse-unit.ts';
import type { ReadOptions, UnitHint, UnitUnread } from '../quantities/unit-result.ts';
import type { Unit } from '../quantities/unit.ts';
import type { Span } from '../text/span.ts';
import { type Bracketed, bracketsIn } from './brackets.ts';
import { isNoUnit, type Surroundings } from './not-units.ts';
import type { Piece } from './piece.ts';

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
  for (const bracket of bracketsIn(text)) {
    if (bracket.start < taken) continue;
    const span = { start: bracket.start + 1, end: bracket.end - 1 };
    const outer = { start: bracket.start, end: bracket.end };
    const unread = { text: bracket.inner, span };
    if (bracket.open === '(') {
      const found = parentheses && !bracket.glued ? readParenthesis(bracket, span, outer, options) : undefined;
      if (found) {
        looked.parentheses.push(found);
        taken = bracket.end;
      } else if (!bracket.glued && bracket.inner.length < 30) looked.unread.push(unread);
    } else if (bracket.glued && !gluedUnit.test(bracket.inner)) looked.unread.push(unread);
    else if (isNoUnit(text, bracket, around)) looked.unread.push(unread);
    else {
      const lead = unitLabel.exec(bracket.inner)?.[0].length ?? 0;
      const result = parseUnit(bracket.inner.slice(lead), options);
      if (result.ok && (!bracket.glued || result.beyondDoubt)) looked.brackets.push({ unit: result.unit, hints: result.hints, span: { start: span.start + lead, end: span.end }, outer, by: 'bracket' });
      else {
        looked.unread.push(unread);
        if (!result.ok && result.triesToBeUnit && !bracket.glued) looked.problems.push({ text: bracket.inner.slice(lead), span: { start: span.start + lead, end: span.end }, fault: result });
      }
    }
  }
  return looked;
}

/** `[units: m/s]`, `[unit = m]`. */
const unitLabel = /^\s*(?:units?|in)\s*[:=]\s*/i;
/** `velocity[m/s]`: glued, and no index. */
const gluedUnit = /[\p{L})]\s*\/\s*[\p{L}(]|\^|°|[²³⁻]/u;
/** Symbols of two letters that are seldom names, in `(Pa)`; common practice. */
const plainInParentheses = new Set(['Pa', 'Hz', 'ft', 'kg', '°', '%']);

function readParenthesis(bracket: Bracketed, span: Span, outer: Span, options: ReadOptions): Found | undefined {
  const inner = bracket.inner.trim();
  if (inner === '' || /[:=,;'"]/.test(inner.replace(/:math:/g, '')) || doubtful.test(inner)) return undefined;
  const result = parseUnit(bracket.inner, options);
  if (!result.ok || !(result.beyondDoubt || plainInParentheses.has(inner)) || isNumberOnly(inner)) return undefined;
  return { unit: result.unit, hints: result.hints, span, outer, by: 'parenthesis' };
}

/** Words in parentheses that read as units and are others: `(min)`, `(max)`, `(sec)`, `(s)`. */
const doubtful = /^(?:min|max|sec|rev|mil|met|var|none|total|dim|fraction|ratio|decimal|dimensionless units?)$/i;

function isNumberOnly(text: string): boolean {
  return /^[\d\s.,+\-*/^eE·×%]*$/.test(text) && /\d/.test(text);
}

/**
 * The bracket that counts among several: side by side, the last (a symbol stands before its unit); alternatives of one
 * dimension give the dimension without a scale; of several, nothing; otherwise the first.
 */
export function choose(text: string, found: readonly Found[]): Found | undefined {
  const telling = found.length > 1 ? found.filter((each) => !followsNumber(text, each.outer.start)) : found;
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

/** `25 [degC]`: a value and its unit, in prose. */
export function followsNumber(text: string, at: number): boolean {
  return /\d\s*$/.test(text.slice(Math.max(at - 8, 0), at)) && !/[\p{L}_]\d+\s*$/u.test(text.slice(Math.max(at - 20, 0), at));
}
