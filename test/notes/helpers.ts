/** Python text in, notes out as lines. */
import { readChunkNotes } from '../../server/src/notes/read-chunk.ts';
import { type ChunkNotes, defaultNoteSettings, type Note, type NoteSettings } from '../../server/src/notes/types.ts';
import type { Chunk, LanguageId } from '../../server/src/program/nodes.ts';
import { emptyVocabulary } from '../../server/src/quantities/unit-result.ts';
import { python } from '../harness/python.ts';


export interface ReadFile {
  readonly text: string;
  readonly chunks: readonly { readonly chunk: Chunk; readonly notes: ChunkNotes }[];
}

export function readFile(text: string, settings: NoteSettings = defaultNoteSettings, language: LanguageId = 'python'): ReadFile {
  const parsed = python.parse(text, 'test.py');
  const chunks = parsed.program.chunks.map((chunk) => ({ chunk, notes: readChunkNotes(chunk, settings, emptyVocabulary, language) }));
  parsed.release();
  return { text, chunks };
}

/** `D: m (trailing) "inside diameter"`, one line per note, sorted by place. */
export function notesOf(text: string, settings?: NoteSettings): readonly string[] {
  return readFile(text, settings).chunks.flatMap(({ notes }) => [...notes.notes].sort((a, b) => a.span.start - b.span.start).map(printed));
}

/** The first note of a text, with or without its words; `-` for none. */
export function unitsOf(text: string, settings?: NoteSettings): string {
  const units = readFile(text, settings).chunks.flatMap(({ notes }) => [...notes.notes].sort((a, b) => a.span.start - b.span.start).map((note) => `${nameOf(note)} ${unitText(note)}`));
  return units.length === 0 ? 'none' : units.join('; ');
}

/** Texts of the brackets that try to be units and fail. */
export function problemsOf(text: string): readonly string[] {
  return readFile(text).chunks.flatMap(({ notes }) => notes.problems.map((each) => each.text));
}

export function directivesOf(text: string): readonly string[] {
  return readFile(text).chunks.flatMap(({ notes }) => notes.directives.map((each) => {
    switch (each.kind) {
      case 'allow':
        return `allow ${each.code}${each.wholeFile ? ' (file)' : ''}: ${each.reason}`;
      case 'empirical':
        return `empirical ${each.units.map((unit) => `${unit.symbol} ${unit.unit.text}`).join(', ')}`;
      case 'depends':
        return `${each.dependent} <- ${each.on.join(', ')}`;
      case 'malformed':
        return `malformed: ${each.problem}`;
    }
  }));
}

/** The characters that each note's span covers in the file. */
export function spansOf(text: string): readonly string[] {
  return readFile(text).chunks.flatMap(({ chunk, notes }) => [...notes.notes].sort((a, b) => a.span.start - b.span.start).map(({ span }) => text.slice(chunk.anchor.start + span.start, chunk.anchor.start + span.end)));
}

function printed(note: Note): string {
  const range = note.range ? ` ${note.range.low}..${note.range.high}` : '';
  return `${nameOf(note)}: ${unitText(note)}${range} (${note.form})${note.description === undefined ? '' : ` "${note.description}"`}`;
}

function unitText(note: Note): string {
  return note.unit.text === '' ? '1' : note.unit.scale === undefined ? `${note.unit.text} (scale unknown)` : note.unit.text;
}

export function nameOf({ target }: Note): string {
  switch (target.kind) {
    case 'statement':
      return target.path;
    case 'entry':
      return `{${target.entry.key}}`;
    case 'parameter':
      return `${target.owner.name}(${target.param.name})`;
    case 'result':
      return `${target.owner.name} -> ${target.position ?? ''}${target.position === undefined ? '' : ' '}${target.name ?? ''}`.trim();
    case 'field':
      return `${target.owner.name}.${target.name}`;
    case 'symbol':
      return `${target.owner?.name ?? 'file'}:${target.name}`;
  }
}
