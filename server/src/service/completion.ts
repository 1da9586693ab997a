/** What may be written inside a unit note, and in a nomenclature file: units first of the kind that is needed, and the symbols at hand. */
import type { Understood } from '../analyze.ts';
import type { Chunk, FunctionStmt, Stmt } from '../program/nodes.ts';
import type { Dimension } from '../quantities/dimension.ts';
import { kindsOf } from '../quantities/kinds.ts';
import { parseUnit } from '../quantities/parse-unit.ts';
import { coherentUnit } from '../quantities/print-unit.ts';
import type { Unit } from '../quantities/unit.ts';
import type { Vocabulary } from '../quantities/unit-result.ts';
import { usualUnits, usualUnitsOf } from '../quantities/usual-units.ts';
import { inferredUnit } from '../repairs/open-symbols.ts';
import { blocksOf, dimensionOf } from '../repairs/scene.ts';
import type { Piece } from '../solver/definitions.ts';
import type { Span } from '../text/span.ts';
import type { CompletionChoice } from './contract.ts';
import { type FileSymbol, symbolsOf } from './file-symbols.ts';

/** What is completed at an offset, best first; empty where no note is being written. */
export function completionsAt(understood: Understood, offset: number, vocabulary: Vocabulary): readonly CompletionChoice[] {
  const { parsed, lines } = understood;
  const line = lines.lineAt(offset);
  const start = lines.lineStart(line);
  const before = parsed.text.slice(start, offset);
  const opened = before.lastIndexOf('[');
  if (opened >= 0 && !before.includes(']', opened) && isNote(understood, start + opened)) {
    const after = /^[^[\]\r\n]*(?=\])/.exec(parsed.text.slice(offset, lines.lineEnd(line)))?.[0] ?? '';
    return units(understood, { start: start + opened + 1, end: offset + after.length }, before.slice(0, opened), vocabulary);
  }
  return parsed.program.language === 'nomenclature' ? symbolsInFormula(understood, before, offset) : [];
}

/** Whether a bracket stands in a comment, in documentation, or in a nomenclature file. */
function isNote({ parsed }: Understood, at: number): boolean {
  if (parsed.program.language === 'nomenclature') return true;
  return parsed.program.chunks.some((chunk) => {
    const inside = ({ start, end }: Span): boolean => chunk.anchor.start + start - 3 <= at && at <= chunk.anchor.start + end + 1;
    return chunk.comments.some(inside) || (chunk.doc !== undefined && inside(chunk.doc)) || chunk.statements.some((each) => (each.kind === 'function' || each.kind === 'class') && documents(each, inside));
  });
}

function documents(statement: Extract<Chunk['statements'][number], { kind: 'function' | 'class' }>, inside: (span: Span) => boolean): boolean {
  return (statement.doc !== undefined && inside(statement.doc)) || statement.body.some((each) => (each.kind === 'function' || each.kind === 'class') && documents(each, inside));
}

function units(understood: Understood, replaces: Span, before: string, vocabulary: Vocabulary): readonly CompletionChoice[] {
  const needed = neededAt(understood, replaces.start, before);
  const choices = new Map<string, CompletionChoice>();
  const add = (text: string, rank: CompletionChoice['rank']): void => {
    const read = parseUnit(text, { vocabulary, describes: needed?.path ?? '' });
    if (read.ok && !choices.has(text)) choices.set(text, { label: text, replaces, rank, kind: 'unit', ...describe(read.unit) });
  };
  if (needed?.unit !== undefined && needed.origin === 'inferred') add(needed.unit === '' ? '1' : needed.unit, 'inferred');
  if (needed?.dimension) for (const text of usualUnitsOf(needed.dimension)) add(text, 'kind');
  for (const text of ownUnits(understood)) add(text, 'used');
  for (const name of vocabulary.units.keys()) add(name, 'used');
  for (const text of usualUnits.flat()) add(text, 'other');
  return [...choices.values()];
}

/** The symbol that the note is about: the one assigned on the line, or the parameter that the line or the one above names. */
function neededAt(understood: Understood, offset: number, before: string): FileSymbol | undefined {
  const { parsed, lines, solver } = understood;
  const chunk = parsed.program.chunks.find(({ anchor, text }) => anchor.start <= offset && offset <= anchor.start + text.length);
  if (!chunk) return undefined;
  const at = offset - chunk.anchor.start;
  const pieces: (Piece | undefined)[] = [...solver.pieces()].filter((piece) => piece.chunk === chunk && piece.fn.start <= at && at <= endOf(piece.fn)).reverse();
  const line = lines.lineAt(offset);
  const named = [before, lines.lineText(line - 1)].flatMap((text) => (text.replace(/^\s*(?::param\b|@param\b|\\param\b)?(?:\s*\[[^\]]*\])?(?:\s*\{[^}]*\})?/, '').match(/[\p{L}_][\p{L}\p{N}_.]*/gu) ?? []));
  for (const piece of [...pieces, undefined]) {
    const { symbols } = symbolsOf(understood, piece);
    const here = symbols.find((symbol) => symbol.chunk === chunk && symbol.kind === 'variable' && lines.lineAt(chunk.anchor.start + symbol.span.start) === line);
    const found = here ?? named.map((name) => symbols.find((symbol) => symbol.kind === 'parameter' && symbol.path === name)).find((each) => each !== undefined);
    if (found) return found.origin === 'declared' ? { ...found, ...assignedTo(found, understood, piece) } : found;
  }
  return undefined;
}

/** What is assigned to a symbol, whatever its note says: the note is being written. */
function assignedTo({ chunk, span }: FileSymbol, { solver }: Understood, piece: Piece | undefined): Partial<FileSymbol> {
  const sightings = solver.sightings(piece);
  const find = (block: readonly Stmt[]): Stmt | undefined => block.find((each) => each.start <= span.start && span.end <= each.end);
  let statement = find(piece ? piece.fn.body : chunk.statements);
  while (statement && statement.kind !== 'assign') statement = find(blocksOf(statement));
  const value = statement && sightings.values.get(statement.value);
  const dimension = value && !value.fits && !value.literal ? dimensionOf(value, sightings) : undefined;
  if (!value || !dimension) return { origin: 'unknown', unit: undefined, dimension: undefined };
  return { origin: 'inferred', dimension, unit: dimension.isOne ? '' : inferredUnit(value, sightings) };
}

/** A trailing comment may stand behind the last statement. */
function endOf(fn: FunctionStmt): number {
  return Math.max(fn.end, ...blocksOf(fn).map((each) => each.trailing?.end ?? each.end));
}

/** Units that the file's own notes have, the commonest first. */
function ownUnits({ notes }: Understood): readonly string[] {
  const counts = new Map<string, number>();
  for (const read of notes.values()) for (const { unit } of read.notes) if (unit.scale && unit.text !== '') counts.set(unit.text, (counts.get(unit.text) ?? 0) + 1);
  return [...counts].sort((a, b) => b[1] - a[1]).map(([text]) => text);
}

/** `pressure; 1 psi = 6895 Pa`. */
function describe(unit: Unit): Pick<CompletionChoice, 'detail' | 'documentation'> {
  const kinds = kindsOf(unit.dimension).slice(0, 3).join(', ');
  return { detail: kinds === '' ? dimensionWords(unit.dimension) : kinds, documentation: conversion(unit) };
}

function dimensionWords(dimension: Dimension): string {
  return dimension.isOne ? 'dimensionless' : dimension.toString();
}

function conversion({ scale, offset, dimension, text }: Unit): string | undefined {
  if (!scale || (scale.isOne && !offset)) return undefined;
  const si = dimension.isOne ? '' : ` ${coherentUnit(dimension)}`;
  const size = Number(scale.toNumber().toPrecision(7));
  if (!offset) return `1 ${text} = ${size}${si}`;
  return offset.kind === 'gauge' ? `counted from atmospheric pressure; 1 ${text} = ${size}${si}` : `a point on its scale: 0 ${text} = ${Number(offset.zero.toNumber().toPrecision(7))}${si}, a step is ${size}${si}`;
}

/** Symbols of the file behind a relation or inside a formula. */
function symbolsInFormula(understood: Understood, before: string, offset: number): readonly CompletionChoice[] {
  const word = /[\p{L}_][\p{L}\p{N}_]*$/u.exec(before)?.[0] ?? '';
  const head = before.slice(0, before.length - word.length);
  const replaces = { start: offset - word.length, end: offset };
  const relation = /\bdepends\s+on\s/.test(head);
  if (!relation && !/=\s*(?:.*[-+*/^(,\s])?$/.test(head)) return /^\s*[\p{L}_][\p{L}\p{N}_]*\s+$/u.test(head) ? [{ label: 'depends on', replaces, rank: 'other', kind: 'phrase', detail: 'a relation whose dimensionless groups are wanted', documentation: undefined }] : [];
  const own = /^\s*([\p{L}_][\p{L}\p{N}_]*)/u.exec(before)?.[1];
  return understood.parsed.program.chunks.flatMap(({ statements: [statement], anchor }): readonly CompletionChoice[] => {
    const target = statement?.kind === 'assign' ? statement.targets[0] : statement?.kind === 'declare' ? statement.target : undefined;
    if (target?.kind !== 'name' || target.name === own || (anchor.start <= offset && offset <= anchor.start + (statement?.end ?? 0) && target.name === word)) return [];
    const note = [...(understood.notes.values())].flatMap(({ notes }) => notes).find((each) => (each.target.kind === 'symbol' && each.target.name === target.name) || (each.target.kind === 'statement' && each.target.statement === statement));
    return [{ label: target.name, replaces, rank: 'other', kind: 'symbol', detail: note ? `[${note.unit.text}]` : '', documentation: note?.description }];
  });
}
