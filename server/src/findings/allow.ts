import type { ChunkNotes } from '../notes/types.ts';
import type { Chunk } from '../program/nodes.ts';
import type { LineIndex } from '../text/line-index.ts';
import { absolute } from '../text/span.ts';
import type { Detected } from './collect.ts';

/** What is left after `termwise: allow <code> — reason`, on a line, above it, or for the whole file. */
export function allowed(detected: readonly Detected[], notes: ReadonlyMap<Chunk, ChunkNotes>, lines: LineIndex): readonly Detected[] {
  const wide = new Set<string>();
  const local = new Map<string, number[]>();
  for (const [chunk, read] of notes) {
    for (const directive of read.directives) {
      if (directive.kind !== 'allow') continue;
      if (directive.wholeFile) wide.add(directive.code);
      else local.set(directive.code, [...(local.get(directive.code) ?? []), lines.lineAt(chunk.anchor.start + directive.span.start)]);
    }
  }
  if (wide.size === 0 && local.size === 0) return detected;
  return detected.filter((each) => !wide.has(each.code) && !(local.get(each.code) ?? []).some((line) => covers(each, line, lines)));
}

/** A directive holds for its own line and, where it stands alone, for the line below. */
function covers(detected: Detected, line: number, lines: LineIndex): boolean {
  const span = absolute(detected.place);
  const [first, last] = [lines.lineAt(span.start), lines.lineAt(span.end)];
  if (first <= line && line <= last) return true;
  const alone = /^\s*(?:#|%|!|\/\/|\/\*)/.test(lines.lineText(line));
  return alone && line + 1 === first;
}
