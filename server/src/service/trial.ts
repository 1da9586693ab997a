/**
 * A change inside one function or class, checked without the rest of the file: only what stands in the chunk, and what reads
 * the names it defines, can come out differently.
 */
import type { Understood } from '../analyze.ts';
import { indexNotes } from '../constraints/note-index.ts';
import { allowed } from '../findings/allow.ts';
import { type Detected, detectAmbiguous, detectDirectives, detectFaults, detectUnreadable } from '../findings/collect.ts';
import type { FrontEnd, TextEdit } from '../frontends/frontend.ts';
import type { ChunkNotes } from '../notes/types.ts';
import type { Chunk } from '../program/nodes.ts';
import { definitionsOf, type Piece } from '../solver/definitions.ts';
import { FileSolver } from '../solver/file-solver.ts';
import { applyEdits } from '../repairs/apply.ts';
import { LineIndex } from '../text/line-index.ts';
import type { Anchor } from '../text/span.ts';

/** What was found in the part of the file that a change can reach, before it and after it. */
export interface Trial {
  /** Of the chunk that holds all the edits, before and after; places with other anchors do not move. */
  readonly anchors: ReadonlySet<Anchor>;
  readonly before: readonly Detected[];
  readonly after: readonly Detected[];
  readonly problemsBefore: number;
  readonly problemsAfter: number;
}

/** Undefined where the edits are not all in one function or class. */
export function tryInChunk(now: Understood, edits: readonly TextEdit[], frontEnd: FrontEnd, readNotes: (chunk: Chunk) => ChunkNotes): Trial | undefined {
  const { program } = now.parsed;
  const chunk = program.chunks.find(({ anchor, text }) => edits.every((edit) => anchor.start < edit.start && edit.end <= anchor.start + text.length));
  if (!chunk || definitionsOf(chunk).runs) return undefined;
  const made = parseAlone(chunk, edits, frontEnd);
  if (made.some((each) => definitionsOf(each).runs)) return undefined;
  const notes = new Map(made.map((each) => [each, readNotes(each)]));
  const indexes = new Map(made.map((each) => [each, indexNotes(each, notes.get(each) as ChunkNotes)]));
  const { inputs } = now.solver;
  const at = program.chunks.indexOf(chunk);
  const chunks = [...program.chunks.slice(0, at), ...made, ...program.chunks.slice(at + 1)];
  const solver = new FileSolver({ ...inputs, program: { ...program, chunks }, indexOf: (each) => indexes.get(each) ?? inputs.indexOf(each) });
  const readers = readersOf(now.solver, chunk);
  const find = (from: FileSolver, own: readonly Chunk[], noted: ReadonlyMap<Chunk, ChunkNotes>, lines: LineIndex): readonly Detected[] => {
    const pieces = [...own.flatMap((each) => definitionsOf(each).pieces), ...readers.pieces];
    const found = pieces.flatMap((piece) => detectFaults(from.piece(piece)?.faults ?? []));
    const top = readers.top ? detectFaults(from.topLevel()?.faults ?? [], false) : [];
    const words = own.flatMap((each) => {
      const read = noted.get(each);
      return read ? [...detectUnreadable(read.problems, each.anchor), ...detectAmbiguous(read.notes, each.anchor), ...detectDirectives(read.directives, each.anchor)] : [];
    });
    return allowed([...top, ...found, ...words], noted, lines);
  };
  const rest = new Map([...now.notes].filter(([each]) => each !== chunk));
  return {
    anchors: new Set([chunk, ...made].map((each) => each.anchor)),
    before: find(now.solver, [chunk], now.notes, now.lines),
    after: find(solver, made, new Map([...rest, ...notes]), hasAllowances(notes.values()) ? new LineIndex(applyEdits(now.parsed.text, edits)) : now.lines),
    problemsBefore: chunk.problems.length,
    problemsAfter: made.reduce((sum, each) => sum + each.problems.length, 0),
  };
}

/** Only what is allowed on a line needs the lines of the new text. */
function hasAllowances(notes: Iterable<ChunkNotes>): boolean {
  return [...notes].some((each) => each.directives.some((directive) => directive.kind === 'allow'));
}

/** The chunk's text after the edits, parsed by itself and put in its place. */
function parseAlone(chunk: Chunk, edits: readonly TextEdit[], frontEnd: FrontEnd): readonly Chunk[] {
  const { start, file } = chunk.anchor;
  const text = applyEdits(chunk.text, edits.map((edit) => ({ ...edit, start: edit.start - start, end: edit.end - start })));
  const parsed = frontEnd.parse(text, file);
  for (const each of parsed.program.chunks) each.anchor.start += start;
  parsed.release();
  return parsed.program.chunks;
}

/** Everything outside a chunk that reads a name it defines, directly or through others. */
function readersOf(solver: FileSolver, chunk: Chunk): { readonly pieces: readonly Piece[]; readonly top: boolean } {
  const names = new Set(definitionsOf(chunk).names.map(([name]) => name));
  const others = [...solver.pieces()].filter((piece) => piece.chunk !== chunk);
  const pieces = new Set<Piece>();
  for (let size = -1; size !== pieces.size; ) {
    size = pieces.size;
    for (const piece of others) {
      const reads = pieces.has(piece) ? undefined : solver.piece(piece)?.reads;
      if (!reads || ![...names].some((name) => reads.has(name))) continue;
      pieces.add(piece);
      names.add(piece.owner?.name ?? piece.fn.name);
    }
  }
  const top = solver.topLevel()?.reads;
  return { pieces: [...pieces], top: top !== undefined && [...names].some((name) => top.has(name)) };
}
