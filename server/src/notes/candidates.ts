/** Where in a piece of text a unit may stand: brackets, parentheses, "in …", the words before or after a comma. */
import { parseUnit, readLeadingUnit } from '../quantities/parse-unit.ts';
import type { ReadOptions, UnitRead, UnitUnread } from '../quantities/unit-result.ts';
import type { Span } from '../text/span.ts';
import type { NoteSettings } from './types.ts';

/** A unit read from a text; `outer` includes the brackets. */
export interface UnitFound {
  readonly result: UnitRead;
  readonly span: Span;
  readonly outer: Span;
  readonly by: 'bracket' | 'parenthesis' | 'words' | 'bare';
}

export interface Looked {
  readonly found: readonly UnitFound[];
  readonly problems: readonly { readonly span: Span; readonly text: string; readonly fault: UnitUnread }[];
  readonly unread: readonly { readonly span: Span; readonly text: string }[];
}

const bracketed = /\[((?:[^[\]\n]|\[[^[\]\n]*\]){0,80})\]/g;
const parenthesised = /\(((?:[^()\n]|\([^()\n]*\)){1,60})\)/g;

/** Every bracket and parenthesis of a text that reads as a unit, and those that try to be one. */
export function lookForUnits(text: string, settings: NoteSettings, options: ReadOptions): Looked {
  const found: UnitFound[] = [];
  const problems: Looked['problems'][number][] = [];
  const unread: Looked['unread'][number][] = [];
  if (text.includes('[')) {
    for (const match of text.matchAll(bracketed)) {
      const inner = match[1] as string;
      const span = { start: match.index + 1, end: match.index + 1 + inner.length };
      const outer = { start: match.index, end: match.index + match[0].length };
      if (isNoUnit(text, match.index, match[0], inner)) {
        unread.push({ span, text: inner });
        continue;
      }
      const result = parseUnit(inner, options);
      const glued = /[\w)\]]/.test(text[match.index - 1] ?? '');
      if (result.ok && (!glued || result.beyondDoubt)) found.push({ result, span, outer, by: 'bracket' });
      else {
        unread.push({ span, text: inner });
        if (!result.ok && result.triesToBeUnit && !glued) problems.push({ span, text: inner, fault: result });
      }
    }
  }
  if (settings.parentheses && text.includes('(')) {
    for (const match of text.matchAll(parenthesised)) {
      const inner = match[1] as string;
      const glued = /[\w)\]]/.test(text[match.index - 1] ?? '');
      const result = glued || /[:=]/.test(inner) ? undefined : parseUnit(inner, options);
      const span = { start: match.index + 1, end: match.index + 1 + inner.length };
      if (result?.ok && result.beyondDoubt) found.push({ result, span, outer: { start: match.index, end: match.index + match[0].length }, by: 'parenthesis' });
    }
  }
  return { found, problems, unread };
}

const options = /^(?:in|out|in,\s*out|i|o|opt|optional|option|SI|IP|required|default.*)$/i;

/** Citations, directions, options, ranges, shapes, glued indices: `[1]_`, `[in]`, `[0, 1]`, `a[k+1]`. */
function isNoUnit(text: string, at: number, whole: string, inner: string): boolean {
  if (options.test(inner.trim()) && !/^[mK]$/.test(inner)) return true;
  if (text[at + whole.length] === '_' || text[at + whole.length] === '(') return true;
  if (/^\s*\d+(?:\s*[,-]\s*\d+)*\s*$/.test(inner)) return inner.trim() !== '1' || /[\w.)]\s*$/.test(text.slice(0, at)) === false ? inner.trim() !== '1' : false;
  if (/^\s*$/.test(inner)) return /=\s*$/.test(text.slice(0, at));
  return /["'=<>]|\.\.|^\s*-?[\d.]+\s*[,:-]\s*[\d.]/.test(inner);
}

const inWords = /(?:^|[\s,(])(?:in|units?\s*[:=]|units? of|expressed in|measured in)\s+(?=\S)/gi;

/** "temperature in degrees C", "units: kg/m3". */
export function unitInWords(text: string, readOptions: ReadOptions): UnitFound | undefined {
  for (const match of text.matchAll(inWords)) {
    const start = match.index + match[0].length;
    const rest = text.slice(start).split(/[.;](?:\s|$)|\n/)[0] as string;
    const found = leading(rest, start, readOptions);
    if (found) return found;
  }
  return undefined;
}

function leading(rest: string, start: number, readOptions: ReadOptions): UnitFound | undefined {
  const whole = parseUnit(rest.trim(), readOptions);
  const result = whole.ok ? { ...whole, end: rest.trimEnd().length } : readLeadingUnit(rest, readOptions);
  if (!result || result.unit.text === '' || !(result.beyondDoubt || spelledOut(result.unit.text))) return undefined;
  const span = { start, end: start + rest.slice(0, result.end).trimEnd().length };
  return { result, span, outer: span, by: 'words' };
}

/** A unit's full name leaves little doubt where "in" stands before it. */
function spelledOut(text: string): boolean {
  return /^[a-z]{4,}$/i.test(text) || text === '°' || text === '%';
}

/** `numeric, degC`; `Absolute Salinity, g/kg`: what stands behind the last comma. */
export function unitBehindComma(text: string, readOptions: ReadOptions): UnitFound | undefined {
  const line = text.trimEnd().replace(/\.$/, '');
  const at = line.lastIndexOf(', ');
  if (at < 0) return undefined;
  const part = line.slice(at + 2);
  const result = parseUnit(part, readOptions);
  if (!result.ok || !(result.beyondDoubt || spelledOut(part.trim())) || result.unit.text === '') return undefined;
  const span = { start: at + 2, end: line.length };
  return { result, span, outer: span, by: 'words' };
}

/** A comment that is a unit or begins with one: `kg/m^3`, `W/m.K wall`. */
export function bareUnit(text: string, readOptions: ReadOptions): UnitFound | undefined {
  const result = readLeadingUnit(text, readOptions);
  if (!result || result.unit.text === '') return undefined;
  if (!result.beyondDoubt && !(result.end >= text.trimEnd().length && text.trim() !== '1' && !/^-+$/.test(text.trim()))) return undefined;
  if (!result.beyondDoubt && /^[a-z]+$/i.test(text.trim()) && !plainWhole.has(text.trim())) return undefined;
  const span = { start: 0, end: text.slice(0, result.end).trimEnd().length };
  return { result, span, outer: span, by: 'bare' };
}

/** Whole comments of one short symbol that engineers write beside a value; common practice. */
const plainWhole = new Set(['m', 's', 'K', 'kg', 'Pa', 'W', 'N', 'J', 'mm', 'cm', 'km', 'kPa', 'MPa', 'bar', 'V', 'A', 'Hz', 'ft', 'g', 'L', 'rpm', 'psi', 'kW', 'MW', 'kJ', 'C', 'hours', 'seconds', 'metres', 'meters', 'days', 'minutes', 'h', 'mol', 'rad', 'deg', 'degrees', 'radians', 'lb', 'lbf']);
