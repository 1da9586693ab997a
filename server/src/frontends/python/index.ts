/** The Python front end: tree-sitter's grammar, lowered chunk by chunk. */
import type { FrontEndEntry } from '../frontend.ts';
import { treeParser } from '../tree-sitter/front-end.ts';
import { docText } from './documentation.ts';
import { resolveImport } from './imports.ts';
import { isStatement, lowerStatements } from './lower-statement.ts';
import { printPython } from './print.ts';
import { pythonShape } from './shape.ts';

export const pythonEntry: FrontEndEntry = {
  language: 'python',
  endings: ['.py', '.pyw'],
  grammar: 'tree-sitter-python/tree-sitter-python.wasm',
  create: async (bytes) => ({
    language: 'python',
    endings: pythonEntry.endings,
    style: {
      comment: '#', power: '**', pi: 'math.pi', print: printPython,
      toRadians: ['math.radians', 'numpy.radians', 'numpy.deg2rad'], toDegrees: ['math.degrees', 'numpy.degrees', 'numpy.rad2deg'], piNames: ['math.pi', 'numpy.pi', 'scipy.constants.pi'],
      define: (name, value, note) => `${name} = ${value}  # ${note}`,
    },
    resolve: resolveImport,
    parse: await treeParser('python', bytes, {
      shape: pythonShape,
      markers: { lead: /^#+:?[^\S\n]*/ },
      isStatement,
      lowerStatements,
      fileDoc: (low, [node]) => {
        const text = node?.type === 'expression_statement' ? node.parts[0] : undefined;
        return text && docText(low, text);
      },
      mayDocument: ({ statements: [statement] }) => statement?.kind === 'evaluate' && statement.value.kind === 'text',
    }),
  }),
};
