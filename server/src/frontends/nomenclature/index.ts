/** The nomenclature language as a program: each symbol with a value is an assignment, so that formulas are checked like scripts. */
import { readLine } from '../../notes/nomenclature/line.ts';
import type { Line } from '../../notes/nomenclature/model.ts';
import { splitLines } from '../../notes/nomenclature/read.ts';
import type { Chunk, NameExpr, Stmt } from '../../program/nodes.ts';
import { withoutComment } from '../../signatures/notation.ts';
import type { FrontEnd, FrontEndEntry, Parsed } from '../frontend.ts';
import { reuseChunks } from '../reuse.ts';
import { printFormula } from './print.ts';

const nomenclatureFrontEnd: FrontEnd = {
  language: 'nomenclature',
  endings: ['.nomen'],
  style: { comment: '#', power: '^', pi: 'pi', print: printFormula, toRadians: [], toDegrees: [], piNames: [], define: (name, value, note) => `${name} = ${value}  # ${note}` },
  parse,
};

export const nomenclatureEntry: FrontEndEntry = { language: 'nomenclature', endings: nomenclatureFrontEnd.endings, create: () => nomenclatureFrontEnd };

/** One chunk per line; a line that did not change keeps its chunk, wherever it stands now. */
function parse(text: string, file: string, previous?: Parsed): Parsed {
  const lines = splitLines(text).filter((line) => line.text.trim() !== '');
  const kept = reuseChunks(previous?.program.chunks ?? [], text, lines.map(({ start, text: { length } }) => ({ start, end: start + length })), () => true);
  const chunks = lines.map((line, at) => kept[at] ?? chunkOf(line.text, line.start, file));
  return { text, program: { language: 'nomenclature', file, chunks }, tree: undefined, release: () => undefined };
}

function chunkOf(text: string, start: number, file: string): Chunk {
  const statement = statementOf(readLine(text), text);
  return { anchor: { file, start }, text, statements: statement ? [statement] : [], problems: [], comments: commentOf(text) };
}

function statementOf(line: Line, text: string): Stmt | undefined {
  if (line.kind !== 'symbol') return undefined;
  const target: NameExpr = { kind: 'name', name: line.name, ...line.nameSpan };
  const span = { start: line.nameSpan.start, end: line.value?.end ?? withoutComment(text).length };
  return line.value ? { kind: 'assign', targets: [target], value: line.value, ...span } : { kind: 'declare', target, ...span };
}

function commentOf(text: string): Chunk['comments'] {
  const match = /(?:^|(?<=\s))#\s*(.*)$/.exec(text);
  if (!match) return [];
  const words = (match[1] as string).trimEnd();
  const start = match.index + match[0].length - (match[1] as string).length;
  return [{ text: words, start, end: start + words.length }];
}
