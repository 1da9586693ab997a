/**
 * The path a text takes, stage by stage: parsed and lowered by its front end, its notes read, its functions turned into
 * constraints and solved, the faults classified, and said in words. Nothing here does I/O; everything it needs comes in.
 */
import { type ChunkIndex, indexNotes } from './constraints/note-index.ts';
import type { NoteInForce } from './constraints/value.ts';
import { allowed } from './findings/allow.ts';
import { type Detected, detectAmbiguous, detectDirectives, detectFaults, detectUnreadable } from './findings/collect.ts';
import type { Finding } from './findings/finding.ts';
import type { FrontEnd, Parsed, TextEdit } from './frontends/frontend.ts';
import type { ChunkNotes } from './notes/types.ts';
import type { Chunk, ImportStmt } from './program/nodes.ts';
import { FileSolver } from './solver/file-solver.ts';
import type { Library } from './solver/library.ts';
import type { Solved } from './solver/pieces.ts';
import { LineIndex } from './text/line-index.ts';
import { toFinding } from './wording/words.ts';
import type { Voice } from './wording/voice.ts';

/** What an analysis needs besides the text. */
export interface Engine {
  readonly frontEnd: FrontEnd;
  /** Reads the notes of a chunk; cached by the caller as long as settings and vocabulary hold. */
  readonly readNotes: (chunk: Chunk) => ChunkNotes;
  readonly library: Library;
  readonly nomenclature: (name: string) => NoteInForce | undefined;
  readonly importFile: (statement: ImportStmt, name?: string) => FileSolver | undefined;
  /** The file that defines a name which this one reads without an import. */
  readonly neighbour: (name: string) => FileSolver | undefined;
  readonly cache: WeakMap<object, Solved>;
}

/** A file taken as far as its solver; findings are made only where they are asked for. */
export interface Understood {
  readonly parsed: Parsed;
  readonly lines: LineIndex;
  readonly notes: ReadonlyMap<Chunk, ChunkNotes>;
  readonly solver: FileSolver;
}

/** Text to solver: parse, lower, read notes, index them. */
export function understand(text: string, file: string, engine: Engine, previous?: Parsed, edits?: readonly TextEdit[]): Understood {
  const parsed = engine.frontEnd.parse(text, file, previous, edits);
  const notes = new Map(parsed.program.chunks.map((chunk) => [chunk, engine.readNotes(chunk)]));
  const indexes = new Map<Chunk, ChunkIndex>();
  const indexOf = (chunk: Chunk): ChunkIndex => {
    let index = indexes.get(chunk);
    if (!index) {
      index = indexNotes(chunk, notes.get(chunk) ?? engine.readNotes(chunk));
      indexes.set(chunk, index);
    }
    return index;
  };
  const { library, nomenclature, importFile, neighbour, cache } = engine;
  const solver = new FileSolver({ program: parsed.program, indexOf, library, nomenclature, importFile, neighbour, cache });
  return { parsed, lines: LineIndex.of(text), notes, solver };
}

/** Solver to findings: solve every function, classify, drop what is allowed. */
export function detect(understood: Understood): readonly Detected[] {
  const steps = detectInSteps(understood);
  for (;;) {
    const step = steps.next();
    if (step.done) return step.value;
  }
}

/** The same with a pause after every function, for those who have other things to look after. */
export function* detectInSteps(understood: Understood): Generator<void, readonly Detected[]> {
  const { parsed, solver, notes, lines } = understood;
  const detected: Detected[] = [];
  yield;
  const formulas = parsed.program.language === 'nomenclature';
  const top = solver.topLevel()?.faults ?? [];
  // Formulas of a nomenclature file are evaluated in units: what differs by a factor is converted there.
  detected.push(...detectFaults(formulas ? top.filter((fault) => fault.kind !== 'scale') : top, false));
  for (const piece of solver.pieces()) {
    detected.push(...detectFaults(solver.piece(piece)?.faults ?? []));
    yield;
  }
  for (const [chunk, read] of notes) {
    detected.push(...detectUnreadable(read.problems, chunk.anchor), ...detectAmbiguous(read.notes, chunk.anchor), ...detectDirectives(read.directives, chunk.anchor));
  }
  return allowed(detected, notes, lines);
}

/** Findings in words, in the order of the text. */
export function say(detected: readonly Detected[], voice: Voice): readonly Finding[] {
  const findings = detected.map((each) => toFinding(voice, each));
  return findings.sort((a, b) => a.place.anchor.start + a.place.start - (b.place.anchor.start + b.place.start));
}
