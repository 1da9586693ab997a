import type { Exponents } from '../groups/index.ts';
import { readExpression } from '../notes/nomenclature/expression.ts';
import { productOf } from '../service/groups-product.ts';

/** The exponents of `rho*N*D**2/mu`, with `^` or `**` for powers; undefined for anything but a product of symbols. */
export function readProduct(text: string): Exponents | undefined {
  const plain = text.replaceAll('**', '^').trim();
  const { expr, end } = readExpression(plain, 0);
  return expr && plain.slice(end).trim() === '' ? productOf(expr) : undefined;
}
