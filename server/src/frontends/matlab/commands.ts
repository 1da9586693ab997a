/** Command syntax: `hold on`, `format long`, `close all` — a name and words without brackets. */
import { lineEnd, quotedEnd } from './tokens.ts';

const assigns = /(?:[-+*/^|&]|\.[*/^])?=(?!=)/y;
const binary = /(?:==|~=|!=|<=|>=|&&|\|\||\.\*|\.\/|\.\^|\.\\|\.'|\+\+|--|[-+*/\\^<>&|:])/y;

/**
 * Whether the name that begins a statement and ends at `end` is a command. The rule of both languages: a blank stands behind it, and then no
 * operator with a blank behind, no assignment and no bracket.
 */
export function isCommand(text: string, end: number): boolean {
  let at = end;
  while (text[at] === ' ' || text[at] === '\t') at++;
  if (at === end || at >= text.length || text.startsWith('...', at)) return false;
  const next = text[at] as string;
  if (/[\r\n,;%#(){}]/.test(next) || matchEnd(assigns, text, at) !== undefined) return false;
  if (/[\p{L}\p{N}_'"[~!.$]/u.test(next) && matchEnd(binary, text, at) === undefined) return true;
  const behind = matchEnd(binary, text, at);
  return behind !== undefined && behind < text.length && !/\s/.test(text[behind] as string);
}

/** Where a command that reaches `at` ends: at a semicolon, a comma or a comment outside of quotes, or with its line. */
export function commandEnd(text: string, at: number): number {
  const limit = lineEnd(text, at);
  let end = at;
  for (let next = at; next < limit; next++) {
    const character = text[next] as string;
    if (character === ';' || character === ',' || ((character === '%' || character === '#') && /\s/.test(text[next - 1] ?? ' '))) break;
    if (character === "'" || character === '"') next = quotedEnd(text, next).end - 1;
    if (!/\s/.test(character)) end = next + 1;
  }
  return end;
}

function matchEnd(pattern: RegExp, text: string, at: number): number | undefined {
  pattern.lastIndex = at;
  return pattern.test(text) ? pattern.lastIndex : undefined;
}
