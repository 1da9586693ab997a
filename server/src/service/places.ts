/** Where a symbol of a nomenclature file is used, and whether every use in a file can be shown to be one. */
import type { Understood } from '../analyze.ts';
import type { Chunk, NameExpr } from '../program/nodes.ts';
import type { Piece } from '../solver/definitions.ts';
import type { Sightings } from '../solver/pieces.ts';
import type { Span } from '../text/span.ts';

export interface SymbolUses {
  /** Names that are read with the symbol's unit, in offsets of the file, in order. */
  readonly uses: readonly Span[];
  /** Every occurrence of the name is one of them; only then may it be renamed. */
  readonly proven: boolean;
}

/** The uses in a file of a symbol that `declaredIn` gives a unit. In the nomenclature file itself every occurrence is a use. */
export function usesOf(understood: Understood, name: string, declaredIn: string): SymbolUses {
  const { parsed, solver } = understood;
  const here = parsed.program.file === declaredIn;
  const uses: Span[] = [];
  const seen = new Map<Piece | undefined, Sightings>();
  const pieces = [...solver.pieces()];
  let proven = true;
  for (const chunk of parsed.program.chunks) {
    for (const node of namesIn(chunk, name)) {
      const span = { start: chunk.anchor.start + node.start, end: chunk.anchor.start + node.end };
      if (here) {
        uses.push(span);
        continue;
      }
      const piece = pieces.filter((each) => each.chunk === chunk && each.fn.start <= node.start && node.end <= each.fn.end).at(-1);
      const sightings = seen.get(piece) ?? solver.sightings(piece);
      seen.set(piece, sightings);
      if (sightings.values.get(node)?.version?.note?.anchor.file === declaredIn) uses.push(span);
      else proven = false;
    }
  }
  const sorted = uses.sort((a, b) => a.start - b.start);
  return { uses: sorted, proven: proven && (here || onlyThere(parsed.text, name, sorted)) };
}

/** The nodes of a chunk that are this name. */
function namesIn(chunk: Chunk, name: string): readonly NameExpr[] {
  const found: NameExpr[] = [];
  const visit = (node: unknown): void => {
    if (Array.isArray(node)) node.forEach(visit);
    else if (typeof node === 'object' && node !== null) {
      const { kind, name: own } = node as Partial<NameExpr>;
      if (kind === 'name' && own === name) found.push(node as NameExpr);
      for (const part of Object.values(node)) if (typeof part === 'object') visit(part);
    }
  };
  visit(chunk.statements);
  return found;
}

/** The word stands nowhere else in the text: a keyword argument, an attribute or a text of that name would be missed. */
function onlyThere(text: string, name: string, uses: readonly Span[]): boolean {
  const starts = new Set(uses.map(({ start }) => start));
  const word = new RegExp(`(?<![\\p{L}\\p{N}_])${name.replace(/[.$]/g, '\\$&')}(?![\\p{L}\\p{N}_])`, 'gu');
  return [...text.matchAll(word)].every((match) => starts.has(match.index));
}
