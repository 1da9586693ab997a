/** A front end on a tree-sitter grammar: incremental parsing, and chunks that come back where they did not change. */
import { Language, Parser, type Tree } from 'web-tree-sitter';
import type { LanguageId, Program } from '../../program/nodes.ts';
import { LineIndex } from '../../text/line-index.ts';
import { differenceOf, trueEdits } from '../edits.ts';
import type { FrontEnd, GrammarBytes, Parsed } from '../frontend.ts';
import { chunksOf, type TreeHost } from './chunks.ts';
import { TreeCopier } from './syntax.ts';
import { tellEdits } from './tree-edit.ts';

/** The runtime is started once: every start would leave the grammars loaded before without theirs. */
let started: Promise<void> | undefined;

/** Loads the grammar and gives the `parse` of its language. Throws where the bytes are no grammar. */
export async function treeParser(language: LanguageId, bytes: GrammarBytes, host: TreeHost): Promise<FrontEnd['parse']> {
  started ??= Parser.init({ wasmBinary: bytes.runtime });
  await started;
  const parser = new Parser();
  const grammar = await Language.load(bytes.grammar);
  parser.setLanguage(grammar);
  const copier = new TreeCopier(grammar, host.shape);
  const readable = (text: string): string => (host.readable ? host.readable(newlines(text)) : newlines(text));
  return (text, file, previous, edits) => {
    const old = previous instanceof TreeParse ? previous.take() : null;
    const source = readable(text);
    if (old && previous) tellEdits(old, readable(previous.text), host.readable ? differenceOf(readable(previous.text), source) : trueEdits(previous.text, text, edits));
    const tree = parser.parse(source, old);
    old?.delete();
    const chunks = tree ? chunksOf(tree.rootNode, host, copier, LineIndex.of(text), file, previous?.program.chunks ?? []) : [];
    return new TreeParse(text, { language, file, chunks }, tree);
  };
}

/** Holds memory of the parser until it is released or parsed on from, which takes the tree away. */
class TreeParse implements Parsed {
  constructor(readonly text: string, readonly program: Program, private held: Tree | null) {}

  get tree(): Tree | null {
    return this.held;
  }

  take(): Tree | null {
    const tree = this.held;
    this.held = null;
    return tree;
  }

  release(): void {
    this.take()?.delete();
  }
}

/** A lone `\r` ends a line in an editor; the grammars know only `\n`. Same length, so offsets hold. */
function newlines(text: string): string {
  return text.includes('\r') ? text.replace(/\r(?!\n)/g, '\n') : text;
}
