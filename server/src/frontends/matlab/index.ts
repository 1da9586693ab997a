/**
 * The MATLAB and Octave front end, by a lexer and a recursive-descent parser of our own: no grammar of these languages is packaged for the
 * runtime that the others use, and a parser that knows where a statement must end recovers best in code that is being written.
 * A file is split into its top-level pieces by a scan of its lines, and only pieces that changed are parsed.
 */
import type { Chunk } from '../../program/nodes.ts';
import type { FrontEnd, FrontEndEntry, Parsed } from '../frontend.ts';
import { reuseChunks } from '../reuse.ts';
import { type ChunkFacts, chunkOf, type Draft, draftOf } from './chunk.ts';
import { neighbourOf } from './neighbours.ts';
import { splitPieces } from './pieces.ts';
import { printMatlab } from './print.ts';

const matlabFrontEnd: FrontEnd = {
  language: 'matlab',
  endings: ['.m'],
  style: {
    comment: '%', power: '^', pi: 'pi', print: printMatlab, toRadians: ['deg2rad'], toDegrees: ['rad2deg'], piNames: ['pi'], closedFunctions: true,
    define: (name, value, note) => `${name} = ${value};  % ${note}`,
  },
  parse,
  neighbour: neighbourOf,
};

export const matlabEntry: FrontEndEntry = { language: 'matlab', onTrial: true, endings: matlabFrontEnd.endings, create: () => matlabFrontEnd };

/** What is kept beside a program, to parse on from. */
interface Kept {
  readonly functionsEnd: boolean;
  readonly facts: ReadonlyMap<Chunk, ChunkFacts>;
}

function parse(text: string, file: string, previous?: Parsed): Parsed {
  const { spans, functionsEnd } = splitPieces(text);
  const before = previous?.program.file === file && (previous.tree as Kept).functionsEnd === functionsEnd ? previous : undefined;
  const old = (before?.tree as Kept | undefined)?.facts ?? new Map<Chunk, ChunkFacts>();
  const kept = reuseChunks(before?.program.chunks ?? [], text, spans, () => true);
  const drafts = spans.map((span, at): Draft | undefined => (kept[at] ? undefined : draftOf(text.slice(span.start, span.end), functionsEnd)));
  const variables = new Set<string>();
  spans.forEach((_, at) => {
    const chunk = kept[at];
    for (const name of chunk ? (old.get(chunk)?.assigns ?? []) : (drafts[at]?.scopes.top ?? [])) variables.add(name);
  });
  const facts = new Map<Chunk, ChunkFacts>();
  const chunks = spans.map((span, at): Chunk => {
    const chunk = kept[at];
    const known = chunk && old.get(chunk);
    if (chunk && known && stillHolds(known, variables)) {
      facts.set(chunk, known);
      return chunk;
    }
    const draft = drafts[at] ?? draftOf(text.slice(span.start, span.end), functionsEnd);
    const made = chunkOf(draft, file, span.start, variables, functionsEnd);
    facts.set(made.chunk, made.facts);
    return made.chunk;
  });
  return { text, program: { language: 'matlab', file, chunks }, tree: { functionsEnd, facts } satisfies Kept, release: () => undefined };
}

/** Whether every name with brackets behind it is still what it was taken for. */
function stillHolds({ consulted }: ChunkFacts, variables: ReadonlySet<string>): boolean {
  for (const [name, known] of consulted) if (variables.has(name) !== known) return false;
  return true;
}
