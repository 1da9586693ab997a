import type { Comment } from '../../program/nodes.ts';
import type { LineIndex } from '../../text/line-index.ts';
import type { Span } from '../../text/span.ts';
import type { Syntax } from './syntax.ts';

interface Placed {
  readonly comment: Comment;
  /** Nothing else stands on its line. */
  readonly alone: boolean;
  readonly column: number;
}

/** The comments of one chunk by line, with offsets relative to the chunk. */
export class Comments {
  private readonly byLine = new Map<number, Placed>();
  readonly all: Comment[] = [];

  constructor(nodes: readonly Syntax[], private readonly lines: LineIndex, private readonly base: number) {
    for (const node of nodes) this.collect(node);
  }

  /** The comment on the line where a span ends, else on the line where it starts. */
  trailing(span: Span): Comment | undefined {
    return this.onLine(this.lines.lineAt(this.base + span.end), span.end) ?? this.onLine(this.lines.lineAt(this.base + span.start), span.start);
  }

  /** The comment behind something on its own line. */
  beside(span: Span): Comment | undefined {
    return this.onLine(this.lines.lineAt(this.base + span.end), span.end);
  }

  /** The comment lines directly above, top to bottom, of the same indentation. */
  above(span: Span): readonly Comment[] {
    const line = this.lines.lineAt(this.base + span.start);
    const column = this.base + span.start - this.lines.lineStart(line);
    const found: Comment[] = [];
    for (let at = line - 1; at >= 0; at--) {
      const placed = this.byLine.get(at);
      if (!placed?.alone || placed.column !== column) break;
      found.unshift(placed.comment);
    }
    return found;
  }

  /** Comments that stand alone between two offsets. */
  between(start: number, end: number): readonly Comment[] {
    return this.all.filter((comment) => comment.start >= start && comment.end <= end);
  }

  private onLine(line: number, after: number): Comment | undefined {
    const placed = this.byLine.get(line);
    return placed && !placed.alone && placed.comment.start >= after ? placed.comment : undefined;
  }

  private collect(node: Syntax): void {
    if (node.type !== 'comment') {
      node.children.forEach((child) => this.collect(child));
      return;
    }
    const raw = this.lines.text.slice(node.start, node.end);
    const lead = /^#+:?[ \t]*/.exec(raw)?.[0].length ?? 1;
    const text = raw.slice(lead).trimEnd();
    const start = node.start + lead - this.base;
    const comment = { text, start, end: start + text.length };
    const line = this.lines.lineAt(node.start);
    const lineStart = this.lines.lineStart(line);
    const alone = this.lines.text.slice(lineStart, node.start).trim() === '';
    this.byLine.set(line, { comment, alone, column: node.start - lineStart });
    this.all.push(comment);
  }
}
