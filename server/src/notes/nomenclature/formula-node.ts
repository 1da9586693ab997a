import type { Rational } from '../../quantities/rational.ts';
import type { Span } from '../../text/span.ts';
import type { ElementaryName } from './elementary.ts';

/** A formula as arithmetic on plain numbers, every symbol counted in its coherent SI unit. Nodes may be shared. */
export type Node =
  | { readonly kind: 'number'; readonly value: number }
  | { readonly kind: 'variable'; readonly name: string }
  | { readonly kind: 'sum'; readonly left: Node; readonly right: Node; readonly sign: 1 | -1 }
  | { readonly kind: 'product'; readonly left: Node; readonly right: Node }
  | { readonly kind: 'quotient'; readonly left: Node; readonly right: Node; readonly span: Span }
  | { readonly kind: 'power'; readonly base: Node; readonly exponent: Rational; readonly span: Span }
  /** An exponent that is no constant; the base is positive. */
  | { readonly kind: 'exponential'; readonly base: Node; readonly exponent: Node; readonly span: Span }
  | { readonly kind: 'function'; readonly name: ElementaryName; readonly argument: Node; readonly span: Span }
  | { readonly kind: 'abs'; readonly argument: Node }
  | { readonly kind: 'extreme'; readonly which: 'min' | 'max'; readonly args: readonly Node[] }
  | { readonly kind: 'atan2'; readonly y: Node; readonly x: Node; readonly span: Span };

/** The nodes directly below one. */
export function partsOf(node: Node): readonly Node[] {
  switch (node.kind) {
    case 'number':
    case 'variable':
      return [];
    case 'sum':
    case 'product':
    case 'quotient':
      return [node.left, node.right];
    case 'power':
    case 'function':
    case 'abs':
      return [node.kind === 'power' ? node.base : node.argument];
    case 'exponential':
      return [node.base, node.exponent];
    case 'extreme':
      return node.args;
    case 'atan2':
      return [node.y, node.x];
  }
}

/** How often each variable is read; shared nodes count once for each way to them, up to a limit that only "more than once" needs. */
export function readingsOf(root: Node): ReadonlyMap<string, number> {
  const counts = new Map<Node, ReadonlyMap<string, number>>();
  const countOf = (node: Node): ReadonlyMap<string, number> => {
    const known = counts.get(node);
    if (known) return known;
    const sum = new Map<string, number>(node.kind === 'variable' ? [[node.name, 1]] : []);
    for (const part of partsOf(node)) for (const [name, count] of countOf(part)) sum.set(name, Math.min(2, (sum.get(name) ?? 0) + count));
    counts.set(node, sum);
    return sum;
  };
  return countOf(root);
}
