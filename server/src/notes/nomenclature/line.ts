/** One line of a nomenclature file; never throws, and a line that cannot be read does not disturb the next. */
import { looksLikeSignature, readSignature } from '../../signatures/notation.ts';
import type { Vocabulary } from '../../quantities/unit-result.ts';
import { rangeIn } from '../ranges.ts';
import { readExpression } from './expression.ts';
import type { Line, NomenclatureProblem } from './model.ts';

const relation = /^\s*([A-Za-z_][\w.]*)\s+depends\s+on\s+(.+?)\s*$/;
const unit = /^\s*unit\s+([A-Za-z_%°µ]\w*)\s*(?:=\s*([-+]?[\d.]+(?:e[+-]?\d+)?)?\s*(.*?))?\s*$/;
const symbol = /^\s*([A-Za-z_Α-Ωα-ω][\w.Α-Ωα-ω]*)\s*(?:\[([^\]]*)\])?/;

/** Reads a line without its line break. */
export function readLine(raw: string, vocabulary?: Vocabulary): Line {
  const text = raw.replace(/(?:^|\s)#.*$/, '').trimEnd();
  if (text.trim() === '') return { kind: 'blank' };
  if (looksLikeSignature(text)) {
    const read = readSignature(text, 0, vocabulary);
    return read.ok ? { kind: 'signature', signatures: read.value, span: spanOf(text) } : { kind: 'problem', problem: read.problem };
  }
  return readRelation(text) ?? readUnit(text) ?? readSymbol(text);
}

function readRelation(text: string): Line | undefined {
  const match = relation.exec(text);
  if (!match) return undefined;
  const on = (match[2] as string).split(/\s*,\s*/);
  const bad = on.find((name) => !/^[A-Za-z_Α-Ωα-ω][\w.Α-Ωα-ω]*$/.test(name));
  if (bad !== undefined) return problem(text, text.indexOf(bad, text.indexOf(' on ') + 4), bad.length, `\`${bad}\` is no symbol; write the symbols with commas between them.`);
  return { kind: 'relation', dependent: match[1] as string, on, span: spanOf(text) };
}

function readUnit(text: string): Line | undefined {
  const match = /^\s*unit\s+[^\s[]+\s*(?:=|$)/.test(text) ? unit.exec(text) : null;
  if (!match) return undefined;
  const [, name = '', factor, of] = match;
  if (of === undefined) return { kind: 'base', name, span: spanOf(text) };
  if (of === '' && factor === undefined) return problem(text, text.length, 0, 'A unit needs a value: `unit crate = 18.5 kg`.');
  const start = text.length - of.length;
  return { kind: 'unit', name, factor: factor ?? '1', of, span: spanOf(text), ofSpan: { start, end: text.length } };
}

function readSymbol(text: string): Line {
  const match = symbol.exec(text);
  if (!match) return problem(text, 0, text.length, 'A line begins with a symbol: `D [m] = 0.085 impeller diameter`.');
  const [whole, name = '', unitText] = match;
  const nameStart = text.indexOf(name);
  const unitStart = unitText === undefined ? whole.length : whole.indexOf('[') + 1;
  const common = { kind: 'symbol' as const, name, nameSpan: { start: nameStart, end: nameStart + name.length }, unitText, unitSpan: { start: unitStart, end: unitStart + (unitText?.length ?? 0) } };
  const rest = text.slice(whole.length);
  const equals = /^\s*=\s*/.exec(rest);
  if (equals) return withValue(text, whole.length + equals[0].length, common);
  if (unitText === undefined) return unclosed(text, whole.length) ?? problem(text, nameStart, text.length - nameStart, `\`${name}\` needs a unit in square brackets, or a value: \`${name} [m] …\`.`);
  const range = rangeIn(rest);
  return { ...common, value: undefined, range: range && { low: range.low, high: range.high }, description: rest.slice(range?.length ?? 0).trim() };
}

function withValue(text: string, from: number, common: Omit<Extract<Line, { kind: 'symbol' }>, 'value' | 'range' | 'description'>): Line {
  const read = readExpression(text, from);
  if (!read) return { ...common, value: undefined, range: undefined, description: '', rest: { span: { start: from, end: text.length }, message: 'A value or a formula was expected here.' } };
  const behind = text.slice(read.end);
  const broken = /^\s*[-+*/^()=]/.test(behind) ? { rest: { span: { start: read.end, end: text.length }, message: 'This formula cannot be read from here on.' } } : {};
  return { ...common, value: read.expr, range: undefined, description: behind.trim(), ...broken };
}

function unclosed(text: string, at: number): Line | undefined {
  const open = text.indexOf('[', at);
  return open >= 0 && !text.includes(']', open) ? problem(text, open, text.length - open, 'This square bracket is not closed.') : undefined;
}

function problem(text: string, start: number, length: number, message: string): Line {
  const from = Math.min(Math.max(start, 0), text.length);
  const found: NomenclatureProblem = { span: { start: from, end: Math.min(from + length, text.length) }, message };
  return { kind: 'problem', problem: found };
}

function spanOf(text: string): { start: number; end: number } {
  return { start: text.length - text.trimStart().length, end: text.length };
}
