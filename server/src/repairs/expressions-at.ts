/** The expressions of a program around a place. */
import type { Expr } from '../program/nodes.ts';
import type { Span } from '../text/span.ts';

/** Every expression that holds a span, from the outermost in; `root` may be any part of the program form. */
export function expressionsAt(root: unknown, span: Span): readonly Expr[] {
  const found: Expr[] = [];
  visit(root, 0);
  return found;

  function visit(node: unknown, depth: number): void {
    if (depth > 400 || typeof node !== 'object' || node === null) return;
    if (Array.isArray(node)) {
      for (const item of node) visit(item, depth + 1);
      return;
    }
    const { start, end, kind } = node as { start?: number; end?: number; kind?: string };
    if (start !== undefined && end !== undefined && (start > span.start || end < span.end)) return;
    if (kind !== undefined && expressionKinds.has(kind)) found.push(node as Expr);
    for (const part of Object.values(node)) if (typeof part === 'object') visit(part, depth + 1);
  }
}

/** Kinds whose parts are worth standing in. */
const expressionKinds = new Set(['binary', 'unary', 'name', 'member', 'index', 'call', 'number']);
