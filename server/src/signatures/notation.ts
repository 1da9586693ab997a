/** The signature notation: `trapezoid(y [?a], x [?b]) [?a ?b]`, `scipy.constants.g [m/s^2] = 9.80665`. */
import { parseUnit } from '../quantities/parse-unit.ts';
import { Rational } from '../quantities/rational.ts';
import type { Vocabulary } from '../quantities/unit-result.ts';
import { pureNumber } from '../quantities/unit.ts';
import type { NamedConstant, Signature, SignatureParam, UnitClaim } from '../program/signature.ts';
import type { Span } from '../text/span.ts';

export interface NotationProblem {
  readonly span: Span;
  readonly message: string;
}

type Read<T> = { readonly ok: true; readonly value: T } | { readonly ok: false; readonly problem: NotationProblem };

const any: UnitClaim = { kind: 'any' };

/** Whether a line has the form of a signature: qualified names and a parenthesis right behind the last. */
export function looksLikeSignature(line: string): boolean {
  return /^\s*\.?[A-Za-z_][\w.]*(?:\s*,\s*\.?[A-Za-z_][\w.]*)*\(/.test(line);
}

/** Reads a signature line; one signature per name in front of the parenthesis. Offsets are those of the line plus `base`. */
export function readSignature(line: string, base: number, vocabulary?: Vocabulary): Read<readonly Signature[]> {
  const open = line.indexOf('(');
  const close = matching(line, open);
  if (close < 0) return fault(line, open, base, 'The bracket of this signature is not closed.');
  const params: SignatureParam[] = [];
  for (const part of splitTop(line, open + 1, close)) {
    const param = readParam(part.text, part.start, base, vocabulary);
    if (!param.ok) return param;
    params.push(param.value);
  }
  const results = readResults(line, close + 1, base, vocabulary);
  if (!results.ok) return results;
  const span = { start: base, end: base + line.length };
  const names = line.slice(0, open).split(',').map((name) => name.trim());
  const description = results.value.rest;
  return { ok: true, value: names.map((name) => ({ name, params, results: results.value.claims, span, ...(description === '' ? {} : { description }) })) };
}

const constant = /^\s*([A-Za-z_][\w.]*)\s*(?:\[([^\]]*)\])?\s*=\s*(-?[\d.]+(?:e[+-]?\d+)?|pi|inf|nan)\s*(?:\*\s*pi)?\s*$/i;

/** Reads a library constant: a dotted name with its value. */
export function readConstant(line: string, base: number, vocabulary?: Vocabulary): Read<NamedConstant> | undefined {
  const match = constant.exec(line);
  if (!match) return undefined;
  const [, name = '', unitText, valueText = ''] = match;
  const unit = unitText === undefined ? undefined : parseUnit(unitText, vocabulary ? { vocabulary } : {});
  if (unit && !unit.ok) return fault(line, line.indexOf('['), base, `\`${unitText}\` is not a unit known here.`);
  const pi = /pi/.test(line.slice(line.indexOf('=')));
  const value = valueText === 'pi' ? Rational.one : Rational.parse(valueText);
  return { ok: true, value: { name, unit: unit?.ok ? unit.unit : undefined, value, pi: pi ? 1 : 0, span: { start: base, end: base + line.length } } };
}

function readParam(text: string, start: number, base: number, vocabulary: Vocabulary | undefined): Read<SignatureParam> {
  const match = /^\s*(\*?[A-Za-z_]\w*)\s*(\(.*\))?\s*((?:\[[^\]]*\]\s*,?\s*)*)\s*(\.\.\.)?\s*(=.*)?$/.exec(text);
  if (!match) return { ok: false, problem: { span: { start: base + start, end: base + start + text.length }, message: `\`${text.trim()}\` is no parameter.` } };
  const [, name = '', inner, bracket = '', dots, preset] = match;
  const claim = inner ? readFunctionClaim(inner, bracket, base + start, vocabulary) : readClaim(bracket, base + start, vocabulary);
  if (!claim.ok) return claim;
  return { ok: true, value: { name, claim: claim.value, optional: preset !== undefined, rest: dots !== undefined } };
}

function readFunctionClaim(inner: string, bracket: string, base: number, vocabulary: Vocabulary | undefined): Read<UnitClaim> {
  const params: UnitClaim[] = [];
  for (const part of splitTop(inner, 1, inner.length - 1)) {
    const claim = readClaim(/\[[^\]]*\]/.exec(part.text)?.[0] ?? '', base, vocabulary);
    if (!claim.ok) return claim;
    params.push(claim.value);
  }
  const results = readResults(bracket, 0, base, vocabulary);
  return results.ok ? { ok: true, value: { kind: 'function', params, results: results.value.claims } } : results;
}

function readResults(line: string, from: number, base: number, vocabulary: Vocabulary | undefined): Read<{ claims: readonly UnitClaim[]; rest: string }> {
  const claims: UnitClaim[] = [];
  let at = from;
  for (;;) {
    const match = /^\s*,?\s*(\[[^\]]*\])/.exec(line.slice(at));
    if (!match || (claims.length > 0 && !/^\s*,/.test(match[0]))) break;
    const claim = readClaim(match[1] as string, base + at, vocabulary);
    if (!claim.ok) return claim;
    claims.push(claim.value);
    at += match[0].length;
  }
  return { ok: true, value: { claims, rest: line.slice(at).trim() } };
}

/** `[?a^2 m]`, `[difference ?a]`, `[rad]`; no bracket or `[]` claims nothing. */
function readClaim(bracket: string, base: number, vocabulary: Vocabulary | undefined): Read<UnitClaim> {
  const text = bracket.trim().replace(/^\[|\]$/g, '').trim();
  if (text === '') return { ok: true, value: any };
  const difference = text.startsWith('difference ');
  const powers: { variable: string; power: Rational }[] = [];
  let bad: string | undefined;
  const rest = text.replace(/^difference\s+/, '').replace(/(\/?)\s*\?([a-z])(?:\^(\(?-?[\d./]+\)?))?/g, (whole, slash: string, variable: string, exponent?: string) => {
    const power = Rational.parse((exponent ?? '1').replace(/[()]/g, ''));
    if (power) powers.push({ variable, power: slash ? power.neg() : power });
    else bad = whole;
    return ' ';
  }).trim();
  const unit = rest === '' || rest === '1' ? undefined : parseUnit(rest, vocabulary ? { vocabulary } : {});
  if (bad !== undefined || (unit && !unit.ok)) return { ok: false, problem: { span: { start: base, end: base + bracket.length }, message: `\`${bad ?? rest}\` is not a unit known here.` } };
  return { ok: true, value: { kind: 'unit', unit: unit?.ok ? unit.unit : pureNumber, powers, difference } };
}

function splitTop(line: string, from: number, to: number): readonly { readonly text: string; readonly start: number }[] {
  const parts: { text: string; start: number }[] = [];
  let depth = 0;
  let start = from;
  for (let at = from; at <= to; at++) {
    const character = line[at];
    if (at === to || (character === ',' && depth === 0)) {
      const text = line.slice(start, at);
      if (text.trim() !== '') parts.push({ text, start });
      start = at + 1;
    } else if (character === '(' || character === '[') depth++;
    else if (character === ')' || character === ']') depth--;
  }
  return parts;
}

function matching(line: string, open: number): number {
  let depth = 0;
  for (let at = open; at < line.length; at++) {
    if (line[at] === '(') depth++;
    if (line[at] === ')' && --depth === 0) return at;
  }
  return -1;
}

function fault<T>(line: string, at: number, base: number, message: string): Read<T> {
  const start = Math.max(at, 0);
  return { ok: false, problem: { span: { start: base + start, end: base + line.length }, message } };
}
