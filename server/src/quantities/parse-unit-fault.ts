/** What to say of a text that could not be read: where, why, whether it tries to be a unit, and the nearest spelling. */
import { otherCase } from './unit-case.ts';
import { findSymbol, knownNames, knownSymbols } from './lookup.ts';
import { distance } from './nearest.ts';
import { isKnownWord } from './parse-unit-symbol.ts';
import type { UnitFault, UnitResult, UnitUnread } from './unit-result.ts';
import type { Span } from '../text/span.ts';

type Parse = (text: string) => UnitResult;

/** The result for a text whose reading ended at `span`. A remark in brackets does not try to be a unit. */
export function unread(text: string, span: Span, reason: UnitFault, plain: string, parse: Parse): UnitUnread {
  const suggestion = looksLikeUnit(plain, reason) ? suggest(text, span, reason, parse) : undefined;
  return { ok: false, span, reason, triesToBeUnit: suggestion !== undefined, ...(suggestion === undefined ? {} : { suggestion }) };
}

/** A few words, most of them units, with a slash, a power or a product sign between them. */
function looksLikeUnit(plain: string, reason: UnitFault): boolean {
  if (!/[/^*·]|\p{L}-\d/u.test(plain) || /\p{L}\(/u.test(plain.replace(/\bsqrt\(/g, '')) || plain.length > 50) return false;
  if (reason.kind === 'unexpected' && !/^[)(/*^.·]$/.test(reason.found)) return false;
  const words = plain.match(/[\p{L}°%]+/gu) ?? [];
  const spaces = plain.trim().split(/\s+/).length - 1;
  if (words.length === 0 || words.length > 6 || spaces > 4) return false;
  const known = words.filter((word) => isKnownWord(word) || word === 'per').length;
  const longer = words.some((word) => word.length > 1 && isKnownWord(word));
  if (reason.kind === 'unknown-symbol') return known * 2 >= words.length && known > 0;
  return known === words.length && (longer || words.length > 1);
}

/** The whole text with the smallest change that makes it a unit beyond doubt. */
function suggest(text: string, span: Span, reason: UnitFault, parse: Parse): string | undefined {
  const tries = [...candidates(text.trim(), { start: span.start - (text.length - text.trimStart().length), end: span.end - (text.length - text.trimStart().length) }, reason)];
  return tries.find((each) => {
    const result = parse(each);
    return result.ok && result.beyondDoubt && result.unit.scale !== undefined;
  });
}

function* candidates(text: string, span: Span, reason: UnitFault): Iterable<string> {
  const before = text.slice(0, span.start);
  const after = text.slice(span.end);
  if (reason.kind === 'unknown-symbol') {
    for (const nearest of nearestUnits(text.slice(span.start, span.end))) yield before + nearest + after;
    return;
  }
  if (reason.kind === 'missing-bracket') yield `${text})`;
  yield before + after;
  if (before.endsWith('^')) yield before.slice(0, -1) + after;
  yield before.slice(0, -1) + text.slice(span.start);
  yield before.replace(/[-*/^·.\s]+$/, '');
}

/** Names and symbols within a letter or two: neighbours exchanged, one missing, one too many. The best first. */
function nearestUnits(typed: string): readonly string[] {
  const word = typed.replace(/\d+$/, '');
  if (word.length < 3 || !/^\p{L}+$/u.test(word)) return [];
  const most = word.length >= 7 ? 2 : 1;
  const found: { readonly text: string; readonly far: number }[] = [];
  if (word.length < 5) return [...slips(word)].map((each) => each + typed.slice(word.length));
  for (const each of [...knownNames(), ...knownSymbols()]) {
    if (Math.abs(each.length - word.length) > most || each.length < 2 || each[0]?.toLowerCase() !== word[0]?.toLowerCase()) continue;
    const far = distance(word.toLowerCase(), each.toLowerCase());
    if (far > most || far === 0) continue;
    found.push({ text: each, far: far + (each.at(-1) === word.at(-1) ? 0 : 0.5) + (each.length > 3 ? 0 : 0.2) });
  }
  const cased = otherCase(word);
  const sorted = found.sort((a, b) => a.far - b.far).map((each) => each.text + typed.slice(word.length));
  return [...(cased ? [cased] : []), ...sorted].slice(0, 6);
}

/** In short symbols only a doubled letter or two exchanged ones count. */
function* slips(typed: string): Iterable<string> {
  const cased = otherCase(typed);
  if (cased) yield cased;
  for (let at = 0; at + 1 < typed.length; at++) {
    const [a, b] = [typed[at] as string, typed[at + 1] as string];
    const other = a === b ? typed.slice(0, at) + typed.slice(at + 1) : typed.slice(0, at) + b + a + typed.slice(at + 2);
    if (findSymbol(other)?.weak === false && other.length > 1) yield other;
  }
}
