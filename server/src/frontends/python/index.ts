/** The Python front end: tree-sitter's grammar, lowered chunk by chunk. */
import { Language, Parser, type Tree } from 'web-tree-sitter';
import type { Program } from '../../program/nodes.ts';
import { LineIndex } from '../../text/line-index.ts';
import { trueEdits } from '../edits.ts';
import type { FrontEnd, Parsed } from '../frontend.ts';
import { chunksOf } from './chunks.ts';
import { printPython } from './print.ts';
import { TreeCopier } from './syntax.ts';
import { tellEdits } from './tree-edit.ts';

/** Loads the grammar; both arguments are WASM bytes. Throws where they are not. */
export async function createPythonFrontEnd(runtime: Uint8Array, grammar: Uint8Array): Promise<FrontEnd> {
  await Parser.init({ wasmBinary: runtime });
  const parser = new Parser();
  const language = await Language.load(grammar);
  parser.setLanguage(language);
  const copier = new TreeCopier(language);
  return {
    language: 'python',
    endings: ['.py', '.pyw'],
    style: {
      comment: '#', power: '**', pi: 'math.pi', print: printPython,
      toRadians: ['math.radians', 'numpy.radians', 'numpy.deg2rad'], toDegrees: ['math.degrees', 'numpy.degrees', 'numpy.rad2deg'], piNames: ['math.pi', 'numpy.pi', 'scipy.constants.pi'],
    },
    parse: (text, file, previous, edits) => {
      const old = previous instanceof PythonParse ? previous.take() : null;
      if (old && previous) tellEdits(old, newlines(previous.text), trueEdits(previous.text, text, edits));
      const tree = parser.parse(newlines(text), old);
      old?.delete();
      const chunks = tree ? chunksOf(tree.rootNode, copier, LineIndex.of(text), file, previous?.program.chunks ?? []) : [];
      return new PythonParse(text, { language: 'python', file, chunks }, tree);
    },
  };
}

/** Holds memory of the parser until it is released or parsed on from, which takes the tree away. */
class PythonParse implements Parsed {
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

/** A lone `\r` ends a line in Python; the grammar knows only `\n`. Same length, so offsets hold. */
function newlines(text: string): string {
  return text.includes('\r') ? text.replace(/\r(?!\n)/g, '\n') : text;
}
