import type { Expr } from './nodes.ts';

/**
 * The symbol an expression stands for, as text: `x`, `self.rho`, `df["p"]`; undefined for everything that is no fixed symbol.
 * A subscript that is not a constant key keeps the unit of what it indexes, so `p[i]` is the symbol `p`.
 */
export function pathOf(expr: Expr): string | undefined {
  switch (expr.kind) {
    case 'name':
      return expr.name;
    case 'member': {
      const object = pathOf(expr.object);
      return object === undefined ? undefined : `${object}.${expr.name}`;
    }
    case 'index': {
      const object = pathOf(expr.object);
      const key = expr.keys.length === 1 ? expr.keys[0] : undefined;
      return object === undefined || key?.kind !== 'text' ? object : `${object}[${JSON.stringify(key.value)}]`;
    }
    default:
      return undefined;
  }
}
