import type { Comment } from '../../program/nodes.ts';
import type { LineIndex } from '../../text/line-index.ts';
import type { Span } from '../../text/span.ts';

interface Placed {
  readonly comment: Comment;
  /** Nothing else stands on its line. */
  readonly alone: boolean;
  readonly column: number;
}

/** What opens and closes a comment, with the blanks inside: anchored patterns. */
export interface CommentMarkers {
  readonly lead: RegExp;
  readonly tail?: RegExp;
}

/** Whether a comment is documentation by its opening, `/** …`: of what stands below it. */
export function isBlock(text: string, base: number, comment: Comment): boolean {
  return /\/\*\*[^\S\n]*$/.test(text.slice(Math.max(base + comment.start - 20, 0), base + comment.start));
}

/** The comments of one chunk by line, with offsets relative to the chunk. */
export class Comments {
  private readonly byLine = new Map<number, Placed>();
  /** Comments over several lines, by their last line. */
  private readonly byLastLine = new Map<number, Placed>();
  private readonly owned = new Set<Comment>();
  private readonly alone = new Set<Comment>();
  readonly all: readonly Comment[];

  /** `found`: where comments stand in the file, in order, markers included; `markers` takes those off. */
  constructor(found: readonly Span[], private readonly lines: LineIndex, private readonly base: number, private readonly markers: CommentMarkers) {
    this.all = found.map((each) => this.place(each));
  }

  /** The comment on the line where a span ends, else on the line where it starts. */
  trailing(span: Span): Comment | undefined {
    return this.beside(span) ?? this.behind(span.start);
  }

  /** The comment behind the end of something, on the same line. */
  beside(span: Span): Comment | undefined {
    return this.behind(span.end);
  }

  /** The comment on the line of an offset and behind it. */
  behind(offset: number): Comment | undefined {
    if (this.all.length === 0) return undefined;
    const placed = this.byLine.get(this.lines.lineAt(this.base + offset));
    return placed && !placed.alone && placed.comment.start >= offset ? placed.comment : undefined;
  }

  /** Whether nothing else stands on the comment's line. */
  isAlone(comment: Comment): boolean {
    return this.alone.has(comment);
  }

  /** The comment lines directly above, top to bottom, of the same indentation; they belong to what asked. */
  above(span: Span): readonly Comment[] {
    if (this.all.length === 0) return [];
    const line = this.lines.lineAt(this.base + span.start);
    const column = this.base + span.start - this.lineStart(line);
    const found: Comment[] = [];
    for (let at = line - 1; at >= 0; at--) {
      const placed = this.byLastLine.get(at) ?? this.byLine.get(at);
      if (!placed?.alone || placed.column !== column) break;
      found.push(placed.comment);
      this.owned.add(placed.comment);
      at = Math.min(at, this.lines.lineAt(this.base + placed.comment.start));
    }
    return found.reverse();
  }

  /** Comments on lines of their own between two offsets that belong to nothing yet; they belong to what asked. */
  loose(start: number, end: number): readonly Comment[] {
    if (this.all.length === 0) return [];
    const found = [...this.byLine.values()].filter(({ alone, comment }) => alone && comment.start >= start && comment.end <= end && !this.owned.has(comment));
    for (const { comment } of found) this.owned.add(comment);
    return found.map((each) => each.comment);
  }

  /** Where a line begins in the chunk: what stands left of the chunk must not count, or its reuse elsewhere would differ. */
  private lineStart(line: number): number {
    return Math.max(this.lines.lineStart(line), this.base);
  }

  private place(at: Span): Comment {
    const raw = this.lines.text.slice(at.start, at.end);
    const lead = this.markers.lead.exec(raw)?.[0].length ?? 0;
    const tail = this.markers.tail?.exec(raw.slice(lead))?.[0].length ?? 0;
    const text = raw.slice(lead, raw.length - tail).trimEnd();
    const start = at.start + lead - this.base;
    const comment = { text, start, end: start + text.length };
    const line = this.lines.lineAt(at.start);
    const lineStart = this.lineStart(line);
    const alone = this.lines.text.slice(lineStart, at.start).trim() === '';
    if (alone) this.alone.add(comment);
    const placed = { comment, alone, column: at.start - lineStart };
    this.byLine.set(line, placed);
    const last = this.lines.lineAt(at.end);
    if (last !== line) this.byLastLine.set(last, placed);
    return comment;
  }
}
