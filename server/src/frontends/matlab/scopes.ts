/** Which names are variables: what a script or a function assigns, so that `f(x)` is read as an index or as a call. */
import type { Token } from './tokens.ts';
import { blockClosers, blockOpeners, declarationBlocks } from './tokens.ts';

export interface Scopes {
  /** Names that the statements outside of functions assign. */
  readonly top: ReadonlySet<string>;
  /** Of each outermost function, by the index of its keyword; nested functions share the scope around them. */
  readonly functions: ReadonlyMap<number, ReadonlySet<string>>;
}

const assignments = new Set(['=', '+=', '-=', '*=', '/=', '^=', '.*=', './=', '.^=', '|=', '&=', '++', '--']);

/** `functionsEnd`: an `end` closes each function of the file. */
export function scopesOf(tokens: readonly Token[], functionsEnd: boolean): Scopes {
  const top = new Set<string>();
  const functions = new Map<number, ReadonlySet<string>>();
  let scope = top;
  /** What is open: functions and other blocks. */
  const open: boolean[] = [];
  let starts = true;
  for (let at = 0; at < tokens.length; at++) {
    const token = tokens[at] as Token;
    if (token.kind === 'keyword') {
      if (token.text === 'function') {
        if (!open.includes(true) || !functionsEnd) scope = new Set();
        functions.set(at, scope);
        header(tokens, at + 1, scope);
        if (functionsEnd) open.push(true);
      } else if (blockOpeners.has(token.text) || declarationBlocks.has(token.text) || token.text === 'classdef') open.push(false);
      else if (blockClosers.has(token.text) && open.pop() && !open.includes(true)) scope = top;
      bound(tokens, at, scope);
      starts = true;
    } else if (token.kind === 'break') starts = true;
    else {
      if (starts) targets(tokens, at, scope);
      starts = token.closesParams === undefined && token.text === ')';
    }
  }
  return { top, functions };
}

/** Outputs and parameters; the function's own name is none. */
function header(tokens: readonly Token[], from: number, scope: Set<string>): void {
  const end = tokens.findIndex((token, at) => at >= from && token.kind === 'break');
  const names = tokens.slice(from, end < 0 ? tokens.length : end);
  const equals = names.findIndex((token) => token.text === '=');
  const open = names.findIndex((token, at) => token.text === '(' && at > equals);
  names.forEach((token, at) => {
    if (token.kind === 'name' && (at < equals || (open >= 0 && at > open))) scope.add(token.text);
  });
}

/** Names that a keyword binds: a loop's, those of `global` and `persistent`, the error of a `catch`. */
function bound(tokens: readonly Token[], at: number, scope: Set<string>): void {
  const word = (tokens[at] as Token).text;
  if (word === 'for' || word === 'parfor') {
    const name = tokens[at + 1]?.text === '(' ? tokens[at + 2] : tokens[at + 1];
    if (name?.kind === 'name') scope.add(name.text);
  } else if (word === 'global' || word === 'persistent' || word === 'catch') {
    for (let next = at + 1; tokens[next]?.kind === 'name'; next++) scope.add((tokens[next] as Token).text);
  }
}

/** The names that a statement beginning here assigns. */
function targets(tokens: readonly Token[], at: number, scope: Set<string>): void {
  const first = tokens[at] as Token;
  if (first.text === '[') {
    const close = matching(tokens, at);
    if (tokens[close + 1]?.text === '=') elements(tokens, at, close, scope);
    return;
  }
  for (let next = at; tokens[next]?.kind === 'name'; ) {
    const name = tokens[next] as Token;
    const behind = pathEnd(tokens, next + 1);
    if (!assignments.has(tokens[behind]?.text ?? '')) return;
    scope.add(name.text);
    next = behind + 1;
  }
}

function elements(tokens: readonly Token[], open: number, close: number, scope: Set<string>): void {
  for (let at = open + 1; at < close; ) {
    const token = tokens[at] as Token;
    if (token.kind === 'name') scope.add(token.text);
    at = token.kind === 'name' ? pathEnd(tokens, at + 1) : at + 1;
  }
}

/** The index behind fields and subscripts. */
function pathEnd(tokens: readonly Token[], from: number): number {
  let at = from;
  for (;;) {
    const mark = tokens[at]?.kind === 'op' ? tokens[at]?.text : undefined;
    if (mark === '(' || mark === '{') at = matching(tokens, at) + 1;
    else if (mark === '.') at += tokens[at + 1]?.text === '(' ? 1 : 2;
    else return at;
  }
}

function matching(tokens: readonly Token[], open: number): number {
  let depth = 0;
  for (let at = open; at < tokens.length; at++) {
    const token = tokens[at] as Token;
    if (token.kind === 'break') return at - 1;
    if (token.kind !== 'op') continue;
    if (token.text === '(' || token.text === '[' || token.text === '{') depth++;
    else if ((token.text === ')' || token.text === ']' || token.text === '}') && --depth === 0) return at;
  }
  return tokens.length - 1;
}
