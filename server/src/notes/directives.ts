/** What an author tells Termwise in a comment: allow, empirical, depends on. */
import { parseUnit } from '../quantities/parse-unit.ts';
import type { Vocabulary } from '../quantities/unit-result.ts';
import { findingCodes } from '../program/codes.ts';
import type { Directive } from './types.ts';

const allow = /termwise:\s*allow\b\s*([\w-]*)\s*(?:[—–:-]+\s*)?(.*)$/i;
const empirical = /^\s*(?:termwise:\s*)?empirical:\s*(.+)$/i;
const depends = /^\s*([A-Za-z_]\w*)\s+depends\s+on\s+([A-Za-z_]\w*(?:\s*,\s*[A-Za-z_]\w*)*)\s*\.?\s*$/;

/** The directive in one line of text at an offset; undefined for any other line. */
export function directiveIn(line: string, offset: number, wholeFile: boolean, vocabulary: Vocabulary): Directive | undefined {
  if (!/termwise|empirical|depends/i.test(line)) return undefined;
  const allowed = allow.exec(line);
  if (allowed) return allowDirective(line, offset, allowed, wholeFile);
  const relation = depends.exec(line);
  if (relation) return { kind: 'depends', dependent: relation[1] as string, on: (relation[2] as string).split(/\s*,\s*/), span: spanOf(line, offset) };
  const declared = empirical.exec(line);
  return declared ? empiricalDirective(line, offset, declared[1] as string, vocabulary) : undefined;
}

function allowDirective(line: string, offset: number, match: RegExpExecArray, wholeFile: boolean): Directive {
  const [, code = '', reason = ''] = match;
  const span = { start: offset + match.index, end: offset + line.trimEnd().length };
  if (!(findingCodes as readonly string[]).includes(code)) {
    return { kind: 'malformed', problem: `\`allow\` needs the code of a finding, for example \`termwise: allow hidden-unit — published correlation\`${code ? `; \`${code}\` is none` : ''}.`, span };
  }
  if (reason.trim() === '') return { kind: 'malformed', problem: `\`allow ${code}\` needs a reason behind a dash: why is it right here?`, span };
  return { kind: 'allow', code, reason: reason.trim(), span, wholeFile };
}

function empiricalDirective(line: string, offset: number, list: string, vocabulary: Vocabulary): Directive | undefined {
  const units: { symbol: string; unit: NonNullable<ReturnType<typeof readOne>>; span: { start: number; end: number } }[] = [];
  for (const match of list.matchAll(/([A-Za-z_][\w.]*)\s*\[([^\]]*)\]/g)) {
    const unit = readOne(match[2] as string, match[1] as string, vocabulary);
    const start = offset + line.indexOf(list) + match.index + match[0].indexOf('[') + 1;
    if (!unit) return { kind: 'malformed', problem: `\`${match[2]}\` is not a unit known here.`, span: { start, end: start + (match[2] as string).length } };
    units.push({ symbol: match[1] as string, unit, span: { start, end: start + (match[2] as string).length } });
  }
  return units.length > 0 ? { kind: 'empirical', units, span: spanOf(line, offset) } : undefined;
}

function readOne(text: string, symbol: string, vocabulary: Vocabulary) {
  const result = parseUnit(text, { describes: symbol, vocabulary });
  return result.ok ? result.unit : undefined;
}

function spanOf(line: string, offset: number): { start: number; end: number } {
  const start = offset + line.length - line.trimStart().length;
  return { start, end: offset + line.trimEnd().length };
}
