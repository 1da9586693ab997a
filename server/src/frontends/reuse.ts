/** Which chunks of the previous version of a text come back: those that did not change. */
import type { Chunk } from '../program/nodes.ts';
import type { Span } from '../text/span.ts';

/**
 * For each piece of the new text the old chunk with the same text, or undefined; every old chunk is given once. Chunks before
 * the first and behind the last change keep their order; those between are found by their text. `fits` may refuse a pair.
 * Moves the anchors of what it returns.
 */
export function reuseChunks(previous: readonly Chunk[], text: string, pieces: readonly Span[], fits: (chunk: Chunk, piece: number) => boolean): readonly (Chunk | undefined)[] {
  const kept: (Chunk | undefined)[] = pieces.map(() => undefined);
  const same = (chunk: Chunk | undefined, at: number): chunk is Chunk => {
    const piece = pieces[at] as Span;
    return chunk !== undefined && chunk.text.length === piece.end - piece.start && text.startsWith(chunk.text, piece.start) && fits(chunk, at);
  };
  const most = Math.min(previous.length, pieces.length);
  let head = 0;
  for (; head < most && same(previous[head], head); head++) kept[head] = previous[head];
  let tail = 0;
  for (; tail < most - head && same(previous[previous.length - 1 - tail], pieces.length - 1 - tail); tail++) kept[pieces.length - 1 - tail] = previous[previous.length - 1 - tail];
  const pool = poolOf(previous.slice(head, previous.length - tail));
  for (let at = head; at < pieces.length - tail; at++) {
    const piece = pieces[at] as Span;
    const found = pool.get(text.slice(piece.start, piece.end));
    if (same(found?.at(-1), at)) kept[at] = found?.pop();
  }
  kept.forEach((chunk, at) => {
    if (chunk) chunk.anchor.start = (pieces[at] as Span).start;
  });
  return kept;
}

/** Chunks by text, the first one last, so that it is taken first. */
function poolOf(chunks: readonly Chunk[]): Map<string, Chunk[]> {
  const pool = new Map<string, Chunk[]>();
  for (let at = chunks.length - 1; at >= 0; at--) {
    const chunk = chunks[at] as Chunk;
    const alike = pool.get(chunk.text);
    if (alike) alike.push(chunk);
    else pool.set(chunk.text, [chunk]);
  }
  return pool;
}
