/** The dimensionless product at a place of a file, and what it is known as. */
import type { Understood } from '../analyze.ts';
import { compositeText, groupValue, recognitionText, recogniseProduct, type Exponents, type GroupValue, type RelationSymbol } from '../groups/index.ts';
import type { Expr } from '../program/nodes.ts';
import { expressionsAt } from '../repairs/expressions-at.ts';
import type { Span } from '../text/span.ts';
import { productOf } from './groups-product.ts';
import { chunkAt, describeSymbol, type TextOf, whereOf } from './groups-symbols.ts';

export interface GroupAtPlace {
  /** The whole product, in offsets of the file. */
  readonly span: Span;
  readonly exponents: Exponents;
  /** Best first: `Reynolds number`, `Re·Pr`; empty for a product without a name. */
  readonly names: readonly string[];
  /** In coherent units; undefined where a symbol has no value. */
  readonly value: GroupValue | undefined;
}

/** The largest dimensionless product of two symbols or more around an offset; undefined where there is none or a unit is not known. */
export function groupAt(understood: Understood, offset: number, textOf: TextOf): GroupAtPlace | undefined {
  return groupsAround(understood, offset, textOf)[0];
}

/** Every dimensionless product around an offset, from the outermost in. */
export function groupsAround(understood: Understood, offset: number, textOf: TextOf): readonly GroupAtPlace[] {
  const chunk = chunkAt(understood, offset);
  if (!chunk) return [];
  const at = { start: offset - chunk.anchor.start, end: offset - chunk.anchor.start };
  return expressionsAt(chunk.statements, at).flatMap((expr) => {
    const found = dimensionless(expr, (name) => describeSymbol(understood, whereOf(understood, chunk, expr), name, textOf));
    return found ? [{ ...found, span: { start: chunk.anchor.start + expr.start, end: chunk.anchor.start + expr.end } }] : [];
  });
}

/** The product of an expression with its names, where it is dimensionless. */
function dimensionless(expr: Expr, describe: (name: string) => RelationSymbol): Omit<GroupAtPlace, 'span'> | undefined {
  const exponents = productOf(expr);
  if (!exponents || exponents.size < 2) return undefined;
  const symbols = [...exponents.keys()].map(describe);
  const name = recogniseProduct(exponents, symbols);
  if (!name) return undefined;
  const names = name.recognised.length > 0 ? name.recognised.map(recognitionText) : name.composites.map(compositeText);
  return { exponents, names, value: groupValue(exponents, symbols) };
}

/** `Reynolds number, 5894 to 70728`; undefined where there is neither a name nor a value. */
export function groupText({ names, value }: Pick<GroupAtPlace, 'names' | 'value'>): string | undefined {
  const parts = [names.join(' or '), value ? valueText(value) : ''].filter((part) => part !== '');
  return parts.length > 0 ? parts.join(', ') : undefined;
}

/** Four significant digits; a range with both ends. */
export function valueText({ low, high }: GroupValue): string {
  const [from, to] = [low, high].map((bound) => String(Number(bound.toPrecision(4))));
  return from === to ? `${from}` : `${from} to ${to}`;
}
