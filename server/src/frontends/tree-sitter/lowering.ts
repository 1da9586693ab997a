import type { Span } from '../../text/span.ts';
import type { Comments } from './comments.ts';
import type { Syntax } from './syntax.ts';

/** What lowering needs besides the tree: offsets are relative to the chunk's start. */
export interface Lowering {
  readonly text: string;
  readonly base: number;
  readonly comments: Comments;
  depth: number;
}

export function spanOf(low: Lowering, node: Syntax): Span {
  return { start: node.start - low.base, end: node.end - low.base };
}

export function textOf(low: Lowering, node: Syntax): string {
  return low.text.slice(node.start, node.end);
}
