/** One line of a nomenclature file; never throws, and a line that cannot be read does not disturb the next. */
import type { Expr } from '../../program/nodes.ts';
import { looksLikeSignature, readSignature, withoutComment } from '../../signatures/notation.ts';
import { parseUnit } from '../../quantities/parse-unit.ts';
import { sameUnit } from '../../quantities/unit.ts';
import type { Vocabulary } from '../../quantities/unit-result.ts';
import { rangeIn } from '../ranges.ts';
import { readExpression } from './expression.ts';
import type { Line, SymbolLine } from './model.ts';
import { type NomenclatureProblem, problemAt } from './problem.ts';
import { readRelation } from './relation-line.ts';
import { readUnit } from './unit-line.ts';

const symbol = /^(\s*)([\p{L}_][\p{L}\p{N}_]*(?:\.[\p{L}_][\p{L}\p{N}_]*)*)\s*(?:\[([^\]]*)\])?/u;

/** Reads a line without its line break. The vocabulary is needed for the units in signatures only. */
export function readLine(raw: string, vocabulary?: Vocabulary): Line {
  const text = withoutComment(raw);
  if (text.trim() === '') return { kind: 'blank', problems: [] };
  if (looksLikeSignature(text)) return { kind: 'signature', ...readSignature(text, 0, vocabulary), span: { start: text.length - text.trimStart().length, end: text.length } };
  return readRelation(text) ?? readUnit(text) ?? readSymbol(text);
}

type Head = Pick<SymbolLine, 'kind' | 'name' | 'nameSpan' | 'unitText' | 'unitSpan'>;

function readSymbol(text: string): Line {
  const match = symbol.exec(text);
  const first = text.length - text.trimStart().length;
  if (!match) return { kind: 'blank', problems: [problemAt('no-symbol', first, text.length)] };
  const [whole, blank = '', name = '', unitText] = match;
  const nameSpan = { start: blank.length, end: blank.length + name.length };
  const unitStart = unitText === undefined ? whole.length : whole.length - 1 - unitText.length;
  const head: Head = { kind: 'symbol', name, nameSpan, unitText, unitSpan: { start: unitStart, end: unitStart + (unitText?.length ?? 0) } };
  const rest = text.slice(whole.length);
  const equals = /^\s*=\s*/.exec(rest);
  if (equals) return withValue(text, whole.length + equals[0].length, head);
  if (unitText !== undefined) return withRange(text, whole.length, head);
  const open = text.indexOf('[', whole.length);
  const kind = open >= 0 && !text.includes(']', open) ? 'square-not-closed' : 'needs-unit';
  return { kind: 'blank', problems: [kind === 'needs-unit' ? problemAt(kind, nameSpan.start, nameSpan.end, name) : problemAt(kind, open, text.length)] };
}

const lonelyNumber = /^\s*([-+]?\d+(?:\.\d*)?(?:[eE][-+]?\d+)?)\s*$/;
const anyRange = /^\s*,?\s*([-+]?\d[\d.eE+-]*?)\s*(?:\.{2,3}|…)\s*(\S*)/;

function withRange(text: string, from: number, head: Head): Line {
  const rest = text.slice(from);
  const range = rangeIn(rest);
  const plain = { ...head, value: undefined, range: range && { low: range.low, high: range.high }, description: rest.slice(range?.length ?? 0).trim() };
  if (range) return { ...plain, problems: [] };
  const start = from + rest.length - rest.trimStart().length;
  const tried = anyRange.exec(rest);
  const end = tried ? from + tried[0].length : text.length;
  const problems: NomenclatureProblem[] = [];
  if (tried && /^[-+]?\d/.test(tried[2] as string)) problems.push(problemAt('range-reversed', start, end, text.slice(start, end)));
  else if (tried) problems.push(problemAt('range-breaks-off', start, end));
  else if (lonelyNumber.test(rest)) problems.push(problemAt('value-without-equals', start, text.length, rest.trim()));
  return problems.length > 0 ? { ...plain, description: text.slice(end).trim(), problems } : { ...plain, problems };
}

function withValue(text: string, from: number, head: Head): Line {
  const { expr, end } = readExpression(text, from);
  const behind = text.slice(end);
  const at = end + behind.length - behind.trimStart().length;
  const valued = { ...head, value: expr, range: undefined, description: behind.trim() };
  if (!expr) return { ...valued, description: '', problems: [problemAt(at >= text.length ? 'no-value' : 'formula-breaks-off', Math.min(at, text.length), text.length)] };
  if (/^[-+*/^()[\]=·.]/.test(behind.trimStart()) || !/^(?:\s|,|;|$)/.test(behind)) return { ...valued, value: undefined, description: '', problems: [problemAt('formula-breaks-off', at, text.length)] };
  const description = behind.replace(/^[\s,;]+/, '').trim();
  const again = isNumber(expr) ? unitBehind(description, head.unitText) : undefined;
  if (again === 'same') return { ...valued, description: '', problems: [] };
  if (again === 'other') return { ...valued, description: '', problems: [problemAt('unit-behind-value', at, text.length, description)] };
  if (setOff(behind) || (isNumber(expr) && !likeFactor.test(description))) return { ...valued, description, problems: [] };
  return { ...valued, value: undefined, description: '', problems: [problemAt('two-symbols', at, text.length, behind.trim())] };
}

/** A description behind a formula is set off, so that a forgotten `*` does not pass for one. */
function setOff(behind: string): boolean {
  return behind.trim() === '' || /^(?:\s\s|\t|\s*[,;–—])/.test(behind);
}

/** `2 r`, `0.5 rho*v^2`: a product without its sign rather than a description. */
const likeFactor = /^(?:[\p{L}_][\p{L}\p{N}_]?$|[\p{L}_][\p{L}\p{N}_.]*\s*[*^])/u;

/** `p [Pa] = 5 bar`: one word behind the value that is a unit, the symbol's own or another one. */
function unitBehind(description: string, unitText: string | undefined): 'same' | 'other' | undefined {
  if (unitText === undefined || description === '' || /\s/.test(description)) return undefined;
  const [other, own] = [parseUnit(description), parseUnit(unitText)];
  if (!other.ok || !own.ok || other.unit.dimension.isOne) return undefined;
  if (sameUnit(other.unit, own.unit)) return 'same';
  return other.beyondDoubt || other.unit.dimension === own.unit.dimension ? 'other' : undefined;
}

/** A plain number, with its sign. */
export function isNumber(expr: Expr): boolean {
  return expr.kind === 'number' || (expr.kind === 'unary' && (expr.op === '-' || expr.op === '+') && expr.operand.kind === 'number');
}
