/** A product rewritten so that its dimensionless factors stand together: `f*L*V**2/(2*g*D)` as `f*(L/D)*V**2/(2*g)`. */
import type { Expr } from '../../program/nodes.ts';
import { Dimension } from '../../quantities/dimension.ts';
import type { Sightings } from '../../solver/pieces.ts';
import type { Anchor, Span } from '../../text/span.ts';
import { expressionsAt } from '../expressions-at.ts';
import type { Fix, Fixer } from '../fix.ts';
import { dimensionOf, type Scene } from '../scene.ts';
import { factorText, isBracketed, spaced, withBrackets } from '../source.ts';

export const regroup: Fixer = { kind: 'regroup', forPlace: regroupings };

/** Below, nothing is gained; above, the search takes too long. */
const fewest = 3;
const most = 12;
/** Factors of one dimensionless group; the characteristic numbers of ISO 80000-11 have five at most. */
const largestGroup = 5;

interface Factor {
  readonly code: string;
  readonly above: boolean;
  /** Of the factor where it stands: the inverse for one that is below. */
  readonly dimension: Dimension;
}

function regroupings(span: Span, scene: Scene): readonly Fix[] {
  const chunk = scene.inputs.program.chunks.find(({ anchor, text }) => anchor.start <= span.start && span.end <= anchor.start + text.length);
  if (!chunk) return [];
  const inside = { start: span.start - chunk.anchor.start, end: span.end - chunk.anchor.start };
  const product = expressionsAt(chunk.statements, inside).find(isProduct);
  if (!product) return [];
  const sightings = scene.sightings(scene.pieceAt(chunk.anchor, product));
  const factors: Factor[] = [];
  if (!collect(product, true, chunk.anchor, sightings, scene, factors) || factors.length < fewest || factors.length > most) return [];
  const groups = groupsOf(factors);
  if (groups.length === 0 || groups.some((group) => group.length === factors.filter((factor) => !factor.dimension.isOne).length && group.length === factors.length)) return [];
  const place = { start: chunk.anchor.start + product.start, end: chunk.anchor.start + product.end };
  const from = scene.text.slice(place.start, place.end);
  const to = written(factors, groups, (op) => spaced(scene, place.start, op));
  if (to.replace(/\s/g, '') === from.replace(/\s/g, '')) return [];
  return [{ kind: 'regroup', confidence: 'choice', edits: [{ ...place, text: to }], says: { what: 'regroup', from, to }, cost: 5 }];
}

function isProduct(expr: Expr): expr is Extract<Expr, { kind: 'binary' }> {
  return expr.kind === 'binary' && (expr.op === '*' || expr.op === '/');
}

/** The factors of a product, through brackets that hold nothing but products; false where a unit is not known. */
function collect(expr: Expr, above: boolean, anchor: Anchor, sightings: Sightings, scene: Scene, found: Factor[]): boolean {
  if (isProduct(expr)) {
    return collect(expr.left, above, anchor, sightings, scene, found) && collect(expr.right, expr.op === '*' ? above : !above, anchor, sightings, scene, found);
  }
  const dimension = dimensionOf(sightings.values.get(expr), sightings);
  if (!dimension) return false;
  const span = withBrackets(scene.text, { start: anchor.start + expr.start, end: anchor.start + expr.end });
  const code = scene.text.slice(span.start, span.end);
  const atom = expr.kind === 'unary' && !isBracketed(code) ? `(${code})` : factorText(code, expr);
  found.push({ code: atom, above, dimension: above ? dimension : Dimension.one.div(dimension) });
  return true;
}

/** Disjoint dimensionless groups of factors that have a dimension, the smallest first; each has something above and something below. */
function groupsOf(factors: readonly Factor[]): readonly (readonly number[])[] {
  const free = new Set(factors.flatMap((factor, at) => (factor.dimension.isOne ? [] : [at])));
  const groups: (readonly number[])[] = [];
  for (let size = 2; size <= largestGroup; size++) {
    for (let group = groupIn([...free], size, factors); group; group = groupIn([...free], size, factors)) {
      groups.push(group);
      for (const at of group) free.delete(at);
    }
  }
  return groups;
}

function groupIn(candidates: readonly number[], size: number, factors: readonly Factor[], chosen: readonly number[] = [], dimension: Dimension = Dimension.one): readonly number[] | undefined {
  if (chosen.length === size) return dimension.isOne && chosen.some((at) => factors[at]?.above) && chosen.some((at) => !factors[at]?.above) ? chosen : undefined;
  for (const [index, at] of candidates.entries()) {
    const found = groupIn(candidates.slice(index + 1), size, factors, [...chosen, at], dimension.mul((factors[at] as Factor).dimension));
    if (found) return found;
  }
  return undefined;
}

/** Each group stands where its first factor above stood; the rest keeps its order. */
function written(factors: readonly Factor[], groups: readonly (readonly number[])[], operator: (op: '*' | '/') => string): string {
  const grouped = new Map(groups.flatMap((group) => group.map((at) => [at, group] as const)));
  const top: string[] = [];
  const bottom: string[] = [];
  const fraction = (above: readonly string[], below: readonly string[]): string => {
    const over = below.length > 1 ? `(${below.join(operator('*'))})` : below[0];
    const head = above.length > 0 ? above.join(operator('*')) : '1';
    return over === undefined ? head : `${head}${operator('/')}${over}`;
  };
  factors.forEach(({ code, above }, at) => {
    const group = grouped.get(at);
    if (!group) (above ? top : bottom).push(code);
    else if (at === group.find((each) => factors[each]?.above)) {
      const parts = group.map((each) => factors[each] as Factor);
      top.push(`(${fraction(parts.filter((each) => each.above).map((each) => each.code), parts.filter((each) => !each.above).map((each) => each.code))})`);
    }
  });
  return fraction(top, bottom);
}
