/** Texts above definitions and fields. */
import type { Comment, DocText } from '../../program/nodes.ts';
import { type Lowering, textOf } from '../tree-sitter/lowering.ts';
import type { Syntax } from '../tree-sitter/syntax.ts';

/** Whether a node is a text that may stand above a definition. */
export function isDocumentation(type: string): boolean {
  return type === 'string_literal' || type === 'prefixed_string_literal';
}

/** The text between the quotes, holes and all; undefined for anything but a finished text. */
export function docText(low: Lowering, node: Syntax): DocText | undefined {
  if (!isDocumentation(node.type) || node.broken) return undefined;
  const raw = textOf(low, node);
  const open = /^(?:raw|doc|md)?("""|")/.exec(raw);
  const quote = open?.[1] ?? '';
  if (!open || !raw.endsWith(quote) || raw.length < open[0].length + quote.length) return undefined;
  const start = node.start + open[0].length;
  const end = node.end - quote.length;
  return { text: low.text.slice(start, end), start: start - low.base, end: end - low.base };
}

/** The text above a field as a comment: its only line, or the only one that holds a bracket. */
export function fieldDoc(doc: DocText): Comment | undefined {
  const lines = doc.text.split('\n').filter((line) => line.trim() !== '');
  const marked = lines.length === 1 ? lines : lines.filter((line) => line.includes('['));
  const line = marked.length === 1 ? (marked[0] as string).trim() : undefined;
  if (line === undefined) return undefined;
  const start = doc.start + doc.text.indexOf(line);
  return { text: line, start, end: start + line.length };
}
