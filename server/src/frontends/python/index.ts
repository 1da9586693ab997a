/** The Python front end: tree-sitter's grammar, lowered chunk by chunk. */
import { Language, type Node as TreeNode, Parser, type Tree } from 'web-tree-sitter';
import type { Chunk, SyntaxProblem } from '../../program/nodes.ts';
import { LineIndex } from '../../text/line-index.ts';
import type { FrontEnd, Parsed, TextEdit } from '../frontend.ts';
import { Comments } from './comments.ts';
import { differenceOf } from './difference.ts';
import type { Lowering } from './lower-expression.ts';
import { docText, lowerStatements } from './lower-statement.ts';
import { printPython } from './print.ts';
import { partsOf, type Syntax, TreeCopier } from './syntax.ts';

/** Loads the grammar; both arguments are WASM bytes. */
export async function createPythonFrontEnd(runtime: Uint8Array, grammar: Uint8Array): Promise<FrontEnd> {
  await Parser.init({ wasmBinary: runtime });
  const parser = new Parser();
  const language = await Language.load(grammar);
  parser.setLanguage(language);
  const copier = new TreeCopier(language);
  return {
    language: 'python',
    endings: ['.py', '.pyw'],
    style: { comment: '#', power: '**', pi: 'math.pi', print: printPython },
    parse: (text, file, previous, edits) => parse({ parser, copier }, text, file, previous, edits),
  };
}

interface Tools {
  readonly parser: Parser;
  readonly copier: TreeCopier;
}

function parse({ parser, copier }: Tools, text: string, file: string, previous: Parsed | undefined, edits: readonly TextEdit[] | undefined): Parsed {
  const old = previous?.tree as Tree | undefined;
  const lines = LineIndex.of(text);
  if (old && previous) for (const edit of edits ?? differenceOf(previous.text, text)) applyEdit(old, previous.text, edit);
  const tree = parser.parse(text, old ?? null);
  old?.delete();
  const chunks = tree ? chunksOf(tree.rootNode, copier, lines, file, previous) : [];
  let open = tree;
  return {
    text,
    program: { language: 'python', file, chunks },
    get tree() {
      return open;
    },
    release: () => {
      open?.delete();
      open = null;
    },
  };
}

function applyEdit(tree: Tree, before: string, edit: TextEdit): void {
  const index = LineIndex.of(before);
  const after = edit.start + edit.text.length;
  const start = index.position(edit.start);
  const inserted = edit.text.split('\n');
  const last = inserted.at(-1) as string;
  const newEnd = { row: start.line + inserted.length - 1, column: inserted.length === 1 ? start.column + last.length : last.length };
  const oldEnd = index.position(edit.end);
  tree.edit({
    startIndex: edit.start, oldEndIndex: edit.end, newEndIndex: after,
    startPosition: { row: start.line, column: start.column }, oldEndPosition: { row: oldEnd.line, column: oldEnd.column }, newEndPosition: newEnd,
  } as Parameters<Tree['edit']>[0]);
}

interface Group {
  start: number;
  end: number;
  readonly nodes: TreeNode[];
  broken: boolean;
}

/** One group per top-level statement: with the comments directly above it and what stands on its lines. */
function chunksOf(root: TreeNode, copier: TreeCopier, lines: LineIndex, file: string, previous: Parsed | undefined): readonly Chunk[] {
  const pool = poolOf(previous);
  const groups: Group[] = [];
  let lastLine = -1;
  let commentsOnly = false;
  for (const node of root.children) {
    if (!node) continue;
    const line = lines.lineAt(node.startIndex);
    const comment = node.type === 'comment';
    const group = groups.at(-1);
    const joins = group && (line === lastLine || (commentsOnly && line === lastLine + 1));
    if (joins) {
      group.nodes.push(node);
      group.end = node.endIndex;
      group.broken ||= node.hasError;
      commentsOnly = commentsOnly && comment;
    } else {
      groups.push({ start: node.startIndex, end: node.endIndex, nodes: [node], broken: node.hasError });
      commentsOnly = comment;
    }
    lastLine = lines.lineAt(Math.max(node.endIndex - (lines.text[node.endIndex - 1] === '\n' ? 1 : 0), node.startIndex));
  }
  return groups.map((group, at) => reuse(group, lines, pool) ?? lower(group, copier, lines, file, at === 0));
}

function poolOf(previous: Parsed | undefined): Map<string, Chunk[]> {
  const pool = new Map<string, Chunk[]>();
  for (const chunk of previous?.program.chunks ?? []) pool.set(chunk.text, [...(pool.get(chunk.text) ?? []), chunk]);
  return pool;
}

function reuse(group: Group, lines: LineIndex, pool: Map<string, Chunk[]>): Chunk | undefined {
  const found = pool.get(lines.text.slice(group.start, group.end));
  const at = found?.findIndex((chunk) => chunk.problems.length > 0 === group.broken) ?? -1;
  const chunk = at >= 0 ? found?.splice(at, 1)[0] : undefined;
  if (chunk) chunk.anchor.start = group.start;
  return chunk;
}

function lower(group: Group, copier: TreeCopier, lines: LineIndex, file: string, first: boolean): Chunk {
  const nodes = group.nodes.map((node) => copier.copy(node, group.broken));
  const comments = new Comments(nodes, lines, group.start);
  const low: Lowering = { text: lines.text, base: group.start, comments, depth: 0 };
  const problems: SyntaxProblem[] = [];
  if (group.broken) for (const node of nodes) collectProblems(node, group.start, problems);
  const opening = first ? nodes.find((node) => node.type !== 'comment') : undefined;
  const text = opening?.type === 'expression_statement' ? partsOf(opening)[0] : undefined;
  const doc = text && docText(low, text);
  return {
    anchor: { file, start: group.start },
    text: lines.text.slice(group.start, group.end),
    statements: lowerStatements(low, nodes.filter((node) => node.type !== 'comment')),
    problems, comments: comments.all, ...(doc ? { doc } : {}),
  };
}

function collectProblems(node: Syntax, base: number, problems: SyntaxProblem[]): void {
  if (node.type === 'ERROR' || node.missing) problems.push({ start: node.start - base, end: node.end - base, message: node.missing ? `missing ${node.type}` : 'cannot be parsed' });
  else node.children.forEach((child) => collectProblems(child, base, problems));
}
