import type { ChunkNotes, Directive, Note, NoteProblem, NoteSettings } from './types.ts';

/** Gathers what the readers find in one chunk. */
export class Collector {
  private readonly notes: Note[] = [];
  private readonly problems: NoteProblem[] = [];
  private readonly directives: Directive[] = [];
  private readonly left: { readonly text: string; readonly span: { readonly start: number; readonly end: number } }[] = [];

  constructor(readonly settings: NoteSettings) {}

  note(note: Note): void {
    this.notes.push(note);
  }

  problem(problem: NoteProblem): void {
    this.problems.push(problem);
  }

  directive(directive: Directive | undefined): void {
    if (directive) this.directives.push(directive);
  }

  unread(brackets: ChunkNotes['unread']): void {
    this.left.push(...brackets);
  }

  get result(): ChunkNotes {
    return { notes: this.notes, problems: this.problems, directives: this.directives, read: this.notes.length, unread: this.left };
  }
}
