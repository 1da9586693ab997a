/**
 * The Fortran front end, by a lexer that joins lines and a recursive-descent parser of our own: no grammar of the language is packaged for
 * the runtime that the others use, both source forms and all standards since FORTRAN 77 have to be read, and since no word is reserved, a
 * parser that looks at whole statements tells `end = 5` from an end and recovers at the next line of code that is being written.
 * A file is split at its procedures by a scan of its lines, and only pieces that changed are parsed.
 */
import type { FrontEnd, FrontEndEntry, Parsed } from '../frontend.ts';
import { reuseChunks } from '../reuse.ts';
import { chunkOf } from './chunk.ts';
import { splitPieces } from './pieces.ts';
import { printFortran } from './print.ts';
import { neighbourOf, resolveModule } from './resolve.ts';
import { formOf } from './tokens.ts';

const fortranFrontEnd: FrontEnd = {
  language: 'fortran',
  endings: ['.f90', '.f95', '.f03', '.f08', '.f', '.for', '.ftn'],
  style: { comment: '!', power: '**', pi: 'pi', print: printFortran, toRadians: [], toDegrees: [], piNames: ['pi'], define: () => undefined },
  parse,
  resolve: resolveModule,
  neighbour: neighbourOf,
};

export const fortranEntry: FrontEndEntry = { language: 'fortran', onTrial: true, endings: fortranFrontEnd.endings, create: () => fortranFrontEnd };

function parse(text: string, file: string, previous?: Parsed): Parsed {
  const form = formOf(file);
  const spans = splitPieces(text, form);
  const before = previous?.program.file === file ? previous.program.chunks : [];
  const kept = reuseChunks(before, text, spans, () => true);
  const chunks = spans.map((span, at) => kept[at] ?? chunkOf(text.slice(span.start, span.end), file, span.start, form));
  return { text, program: { language: 'fortran', file, chunks }, tree: undefined, release: () => undefined };
}
