/** Docstrings: of functions, classes and modules, and those behind a field. */
import type { DocText, Stmt } from '../../program/nodes.ts';
import { type Lowering, textOf } from '../tree-sitter/lowering.ts';
import type { Syntax } from '../tree-sitter/syntax.ts';

/** The text between the quotes of a single plain or raw string; undefined for joined and formatted texts, bytes, and unfinished ones. */
export function docText(low: Lowering, node: Syntax): DocText | undefined {
  if (node.type !== 'string') return undefined;
  const open = node.parts.find((each) => each.type === 'string_start');
  const close = node.parts.find((each) => each.type === 'string_end');
  if (!open || !close || close.broken || /[bft]/i.test(textOf(low, open)) || node.parts.some((each) => each.type === 'interpolation')) return undefined;
  return { text: low.text.slice(open.end, close.start), start: open.end - low.base, end: close.start - low.base };
}

/** The documentation at the head of a block. */
export function docOf(low: Lowering, block: Syntax | undefined): DocText | undefined {
  const text = block?.parts[0] && stringIn(block.parts[0]);
  return text && docText(low, text);
}

/** Gives a one-line text right behind a field to the field, as if it were its comment. */
export function withFieldDocs(low: Lowering, block: Syntax | undefined, statements: readonly Stmt[]): readonly Stmt[] {
  if (!statements.some(isText)) return statements;
  const texts = new Map((block?.parts ?? []).map((each) => [each.start - low.base, stringIn(each)]));
  return statements.map((statement, at) => {
    const next = statements[at + 1];
    if ((statement.kind !== 'assign' && statement.kind !== 'declare') || statement.trailing || !next || !isText(next)) return statement;
    const string = texts.get(next.start);
    const doc = string && docText(low, string);
    return doc && !doc.text.includes('\n') ? { ...statement, trailing: trimmed(doc) } : statement;
  });
}

function isText(statement: Stmt): boolean {
  return statement.kind === 'evaluate' && statement.value.kind === 'text';
}

function stringIn(statement: Syntax): Syntax | undefined {
  return statement.type === 'expression_statement' && statement.parts.length === 1 ? statement.parts[0] : undefined;
}

function trimmed(doc: DocText): DocText {
  const text = doc.text.trim();
  const start = doc.start + doc.text.indexOf(text);
  return { text, start, end: start + text.length };
}
