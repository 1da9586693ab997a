/** The relations between quantities that a file states: `y depends on a, b, c`, and functions whose parameters and result have units. */
import type { Understood } from '../analyze.ts';
import type { Relation, RelationSymbol } from '../groups/types.ts';
import type { LanguageId } from '../program/nodes.ts';
import type { Piece } from '../solver/definitions.ts';
import type { Span } from '../text/span.ts';
import { describeSymbol, resultName, type TextOf, type Where, whereOf } from './groups-symbols.ts';

export interface RelationOptions {
  /** Functions count as relations as well: the result depends on the parameters. */
  readonly functions?: boolean;
}

/** A relation and where it stands. */
export interface FoundRelation {
  readonly relation: Relation;
  readonly origin: 'statement' | 'function' | 'selection';
  /** Of the sentence, of the function's name, or of the selected statements, in the file. */
  readonly span: Span;
  /** From one. */
  readonly line: number;
  readonly language: LanguageId;
  readonly where: Where;
}

/** All relations of a file, in the order of the text. */
export function relationsOf(understood: Understood, textOf: TextOf, options: RelationOptions = {}): readonly FoundRelation[] {
  const found = [...stated(understood, textOf), ...(options.functions ? functionRelations(understood, textOf) : [])];
  return found.sort((a, b) => a.span.start - b.span.start);
}

function stated(understood: Understood, textOf: TextOf): FoundRelation[] {
  return [...understood.notes].flatMap(([chunk, { directives }]) =>
    directives.flatMap((directive): FoundRelation[] => {
      if (directive.kind !== 'depends') return [];
      const where = whereOf(understood, chunk, directive.span);
      const names = [...new Set([directive.dependent, ...directive.on])];
      const symbols = names.map((name) => describeSymbol(understood, where, name, textOf));
      return [placed(understood, where, { dependent: directive.dependent, symbols }, 'statement', directive.span)];
    }),
  );
}

/** Functions with one noted result, and a unit for every parameter that is no option. */
function functionRelations(understood: Understood, textOf: TextOf): FoundRelation[] {
  return [...understood.solver.pieces()].flatMap((piece): FoundRelation[] => {
    const where = { chunk: piece.chunk, piece };
    const symbols = parametersOf(understood, where, piece, textOf);
    const result = resultOf(understood, piece);
    if (!result || !symbols || symbols.length === 0) return [];
    return [placed(understood, where, { dependent: result.name, symbols: [result, ...symbols.filter(({ name }) => name !== result.name)] }, 'function', piece.fn.nameSpan)];
  });
}

function parametersOf(understood: Understood, where: Where, { fn, owner }: Piece, textOf: TextOf): readonly RelationSymbol[] | undefined {
  const params = fn.params.filter((param, at) => !(owner && at === 0) && !isOption(param.default?.kind));
  if (params.some(({ mode }) => mode === 'rest' || mode === 'rest-named')) return undefined;
  const symbols = params.map(({ name }) => describeSymbol(understood, where, name, textOf));
  return symbols.every(({ dimension }) => dimension !== undefined) ? symbols : undefined;
}

/** A switch or a label, which no quantity is. */
function isOption(kind: string | undefined): boolean {
  return kind === 'truth' || kind === 'text' || kind === 'nothing';
}

function resultOf(understood: Understood, piece: Piece): RelationSymbol | undefined {
  const result = understood.solver.piece(piece)?.scheme?.result;
  const held = result?.note;
  if (!held || result.items) return undefined;
  const { note, unit } = held;
  return { name: resultName(piece.fn, held), dimension: unit.dimension, unit, ...(note.description ? { description: note.description } : {}), ...(note.range ? { range: note.range } : {}) };
}

function placed(understood: Understood, where: Where, relation: Relation, origin: FoundRelation['origin'], inChunk: Span): FoundRelation {
  const start = where.chunk.anchor.start;
  const span = { start: start + inChunk.start, end: start + inChunk.end };
  return { relation, origin, span, line: understood.lines.lineAt(span.start) + 1, language: understood.parsed.program.language, where };
}
