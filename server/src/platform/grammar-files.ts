/** Files of the grammars, as packages have them and as a build lays them side by side. */

/** What runs every grammar. */
export const runtimeFile = 'web-tree-sitter/web-tree-sitter.wasm';

/** The name of a grammar's file in the folder `grammars` of a build. */
export function builtName(path: string): string {
  return path.slice(path.lastIndexOf('/') + 1);
}
