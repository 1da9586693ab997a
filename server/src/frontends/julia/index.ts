/** The Julia front end: tree-sitter's grammar, lowered chunk by chunk. */
import type { FrontEndEntry } from '../frontend.ts';
import { treeParser } from '../tree-sitter/front-end.ts';
import { isDocumentation } from './documentation.ts';
import { isStatement, lowerStatements } from './lower-statement.ts';
import { neighbourOf, resolveModule } from './neighbours.ts';
import { printJulia } from './print.ts';
import { readableJulia } from './readable.ts';
import { juliaShape } from './shape.ts';

export const juliaEntry: FrontEndEntry = {
  language: 'julia',
  onTrial: true,
  endings: ['.jl'],
  grammar: 'tree-sitter-julia/tree-sitter-julia.wasm',
  create: async (bytes) => ({
    language: 'julia',
    endings: juliaEntry.endings,
    style: {
      comment: '#', power: '^', pi: 'pi', print: printJulia,
      toRadians: ['deg2rad'], toDegrees: ['rad2deg'], piNames: ['pi'],
      define: (name, value, note) => `${name} = ${value}  # ${note}`,
    },
    resolve: resolveModule,
    neighbour: neighbourOf,
    parse: await treeParser('julia', bytes, {
      shape: juliaShape,
      markers: { lead: /^(?:#=|#+)[^\S\n]*/, tail: /\s*=#$/ },
      isStatement,
      lowerStatements,
      readable: readableJulia,
      precedes: isDocumentation,
    }),
  }),
};
