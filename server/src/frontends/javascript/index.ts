/** The JavaScript and TypeScript front ends: tree-sitter's grammars, one lowering for both. */
import type { LanguageId } from '../../program/nodes.ts';
import type { FrontEndEntry, HostStyle } from '../frontend.ts';
import { treeParser } from '../tree-sitter/front-end.ts';
import { isStatement, lowerChunk } from './lower-statement.ts';
import { printScript } from './print.ts';
import { resolveImport } from './resolve.ts';
import { scriptShape } from './shape.ts';

export const javascriptEntry = entry('javascript', ['.js', '.mjs', '.cjs', '.jsx'], 'tree-sitter-javascript/tree-sitter-javascript.wasm');
export const typescriptEntry = entry('typescript', ['.ts', '.mts', '.cts', '.tsx'], 'tree-sitter-typescript/tree-sitter-typescript.wasm');

const style: HostStyle = {
  comment: '//', power: '**', pi: 'Math.PI', print: printScript,
  toRadians: [], toDegrees: [], piNames: ['Math.PI'], builtIn: ['Math'],
  define: (name, value, note) => `const ${name} = ${value};  // ${note}`,
};

function entry(language: LanguageId, endings: readonly string[], grammar: string): FrontEndEntry {
  return {
    language, endings, grammar, signatures: 'javascript', onTrial: true,
    create: async (bytes) => ({
      language, endings, style,
      resolve: resolveImport,
      parse: await treeParser(language, bytes, {
        shape: scriptShape,
        markers: { lead: /^(?:\/\/[/!]*|\/\*+!?|<!--|#!)[^\S\n]*/, tail: /[^\S\n]*\*+\/$/ },
        isStatement,
        lowerStatements: lowerChunk,
      }),
    }),
  };
}
