import { nameIn } from '../program/name-case.ts';
import type { LanguageId } from '../program/nodes.ts';
import type { ReadOptions, Vocabulary } from '../quantities/unit-result.ts';
import { besideUnit } from './describe.ts';
import { type Found, type Looked, lookForUnits } from './find-unit.ts';
import type { Names } from './names.ts';
import { isLength, type Surroundings } from './not-units.ts';
import { type Piece, spanIn } from './piece.ts';
import type { ChunkNotes, Directive, Note, NoteForm, NoteProblem, NoteSettings, NoteTarget } from './types.ts';

/** Gathers what the readers find in one chunk, and holds what they all need. */
export class Collector {
  private readonly notes: Note[] = [];
  private readonly problems: NoteProblem[] = [];
  private readonly directives: Directive[] = [];
  private readonly left: ChunkNotes['unread'][number][] = [];
  private readonly places = new Set<number>();

  constructor(readonly settings: NoteSettings, readonly vocabulary: Vocabulary, readonly language: LanguageId, readonly names: Names) {}

  /** A name of a comment as the code's form has it. */
  name(written: string): string {
    return nameIn(this.language, written);
  }

  /** Options for units that stand beside a symbol and these words. */
  options(symbol: string, words: string): ReadOptions {
    return { vocabulary: this.vocabulary, describes: `${symbol} ${words}` };
  }

  /** Looks for brackets in a piece; failed units count as problems where a note would count. */
  look(piece: Piece, place: Surroundings['place'], options: ReadOptions, counts: boolean, citations = false): Looked {
    const looked = lookForUnits(piece, { place, language: this.language, citations }, this.settings.parentheses, options);
    const lengths = new Set(looked.brackets.filter((each) => isLength(piece.text.slice(each.span.start, each.span.end), this.names)));
    if (lengths.size > 0) this.leave(piece, [...lengths]);
    for (const each of looked.unread) this.unread(piece, each.span, each.text);
    if (counts) for (const each of looked.problems) this.problems.push({ span: spanIn(piece, each.span.start, each.span.end), text: each.text, fault: each.fault });
    return lengths.size === 0 ? looked : { ...looked, brackets: looked.brackets.filter((each) => !lengths.has(each)) };
  }

  /** A note on a target by a unit found in a piece. */
  note(target: NoteTarget, piece: Piece, found: Found, form: NoteForm): void {
    this.places.add(piece.start + found.span.start);
    this.notes.push({ target: target.kind === 'symbol' ? { ...target, name: this.name(target.name) } : target, unit: found.unit, span: spanIn(piece, found.span.start, found.span.end), form, hints: found.hints, ...besideUnit(piece.text, found.outer) });
  }

  /** Units found in a piece that nothing could be done with. */
  leave(piece: Piece, found: readonly Found[]): void {
    for (const each of found) this.unread(piece, each.span, piece.text.slice(each.span.start, each.span.end));
  }

  directive(directive: Directive): void {
    const name = (written: string): string => this.name(written);
    if (directive.kind === 'depends') this.directives.push({ ...directive, dependent: name(directive.dependent), on: directive.on.map(name) });
    else this.directives.push(directive.kind === 'empirical' ? { ...directive, units: directive.units.map((each) => ({ ...each, symbol: name(each.symbol) })) } : directive);
  }

  get result(): ChunkNotes {
    return { notes: this.notes, problems: this.problems, directives: this.directives, read: this.places.size, unread: this.left };
  }

  private unread(piece: Piece, span: { start: number; end: number }, text: string): void {
    this.left.push({ text, span: spanIn(piece, span.start, span.end) });
  }
}
