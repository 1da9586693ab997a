/** Small edits of an expression that give it the dimension that is needed. */
import type { BinaryExpr, Expr } from '../program/nodes.ts';
import { pathOf } from '../program/path.ts';
import { Rational } from '../quantities/rational.ts';
import type { Sightings } from '../solver/pieces.ts';
import { distance as spelling } from '../quantities/nearest.ts';
import type { Span } from '../text/span.ts';
import { exponentBetween } from './goals.ts';
import { literalExponent, type Position } from './positions.ts';
import type { Scene } from './scene.ts';
import { isBefore, limitAt, type ScopeSymbol } from './scope.ts';
import { factorText, isAtom, isBracketed, spaced, withBrackets } from './source.ts';

/** One replacement, with what it costs: the lower, the less of the text and its meaning changes. */
export interface SmallEdit {
  readonly start: number;
  readonly end: number;
  readonly text: string;
  readonly cost: number;
}

export interface Workshop {
  readonly scene: Scene;
  readonly sightings: Sightings;
  readonly symbols: readonly ScopeSymbol[];
}

/** Powers that formulas have. */
const powers = ['-4', '-3', '-2', '-3/2', '-1', '-1/2', '1/4', '1/3', '1/2', '2/3', '3/2', '2', '5/2', '3', '4', '5', '6'];
const half = Rational.of(1, 2);
const fewPowers = new Set(['1', '-1', '2', '-2', '3', '-3', '1/2', '-1/2']);

export function editsAt(position: Position, workshop: Workshop): readonly SmallEdit[] {
  const far = position.distance * 0.15;
  const limit = limitAt(workshop.scene, position.anchor, position.expr);
  const symbols = workshop.symbols.filter((symbol) => isBefore(symbol, limit));
  return editsWith(position, { ...workshop, symbols }).map((edit) => ({ ...edit, text: beside(edit, workshop.scene), cost: edit.cost + far }));
}

/** In brackets where a power before or behind it would take a part of it. */
function beside({ start, end, text }: SmallEdit, { text: file }: Scene): string {
  const torn = /(?:\*\*|\^)\s*$/.test(file.slice(Math.max(0, start - 8), start)) || /^\s*(?:\*\*|\^)/.test(file.slice(end, end + 8));
  return torn && !/^[\w.]+$/.test(text) && !isBracketed(text) ? `(${text})` : text;
}

function editsWith(position: Position, workshop: Workshop): readonly SmallEdit[] {
  return [...exponents(position, workshop), ...replacements(position, workshop), ...unity(position, workshop), ...(position.isRoot ? factors(position, workshop) : [])];
}

/** The place of an expression in the file, with brackets of its own. */
export function placeOf(position: { readonly anchor: Position['anchor']; readonly expr: Span }, scene: Scene): Span {
  const { anchor, expr } = position;
  return withBrackets(scene.text, { start: anchor.start + expr.start, end: anchor.start + expr.end });
}

/** Another exponent: `V` to `V**2`, `(d**2)` to `d`, `sqrt(x)` to `x`; an exponent of 0 drops the factor, -1 moves it across the slash. */
function exponents(position: Position, workshop: Workshop): readonly SmallEdit[] {
  const { expr, parent, dimension, ratio } = position;
  const isBase = parent?.kind === 'binary' && parent.op === '**' && parent.left === expr;
  const isPower = expr.kind === 'binary' && expr.op === '**';
  if (!dimension || (isBase && !isPower) || expr.kind === 'number' || (expr.kind === 'binary' && !isPower)) return [];
  const change = exponentBetween(ratio, dimension);
  if (!change) return [];
  const [base, now] = baseOf(expr, workshop);
  const then = now.add(now.mul(change));
  if (then.isZero) return dropped(position, workshop);
  const flipped = then.equals(now.neg()) ? moved(position, workshop) : [];
  if (flipped.length > 0 || (!then.isOne && !powers.includes(then.toString()))) return flipped;
  const span = placeOf(position, workshop.scene);
  const text = powerText(base, then, position, workshop);
  const step = Math.abs(then.toNumber() - now.toNumber());
  return [{ ...span, text, cost: 0.9 + Math.min(step, 3) * 0.3 + (then.isInteger ? 0 : 0.6) + (then.sign < 0 ? 1 : 0) }];
}

/** `x**n`, `sqrt(x)`: the base and its exponent. */
function baseOf(expr: Expr, { sightings }: Workshop): readonly [Expr, Rational] {
  if (expr.kind === 'binary' && expr.op === '**') {
    const exponent = literalExponent(expr.right, sightings);
    if (exponent && !exponent.isZero) return [expr.left, exponent];
  }
  const callee = expr.kind === 'call' ? pathOf(expr.callee) : undefined;
  const argument = expr.kind === 'call' ? expr.args[0]?.value : undefined;
  if (argument && callee && /(?:^|\.)sqrt$/.test(callee)) return [argument, half];
  return [expr, Rational.one];
}

function powerText(base: Expr, power: Rational, position: Position, { scene }: Workshop): string {
  const span = placeOf({ anchor: position.anchor, expr: base }, scene);
  const code = scene.text.slice(span.start, span.end);
  if (power.isOne) return isAtom(base) || position.isRoot ? bare(code, base) : factorText(code, base);
  const number = power.isInteger ? power.toString() : power.equals(half) ? '0.5' : power.den === 2n || power.den === 4n ? String(power.toNumber()) : `(${power})`;
  return `${isAtom(base) || isBracketed(code) ? code : `(${code})`}${spaced(scene, span.start, scene.inputs.style.power)}${number}`;
}

function bare(code: string, expr: Expr): string {
  return isAtom(expr) && isBracketed(code) ? code.slice(1, -1) : code;
}

/** A factor left out of its product. */
function dropped(position: Position, workshop: Workshop): readonly SmallEdit[] {
  const { parent, expr, anchor } = position;
  if (parent?.kind !== 'binary' || (parent.op !== '*' && parent.op !== '/')) return [];
  const whole = { start: anchor.start + parent.start, end: anchor.start + parent.end };
  if (parent.left === expr && parent.op === '/') return [];
  const other = placeOf({ anchor, expr: parent.left === expr ? parent.right : parent.left }, workshop.scene);
  return [{ ...whole, text: workshop.scene.text.slice(other.start, other.end), cost: 2.5 }];
}

/** `a*b` to `a/b` and back, and brackets that do the same: `x/a*b` to `x/(a*b)`. */
function moved(position: Position, { scene }: Workshop): readonly SmallEdit[] {
  const { parent, expr, anchor } = position;
  if (parent?.kind !== 'binary' || parent.right !== expr || (parent.op !== '*' && parent.op !== '/')) return [];
  const [start, end] = [placeOf({ anchor, expr: parent.left }, scene).start, placeOf(position, scene).end];
  const [from, to] = [anchor.start + parent.opSpan.start, anchor.start + parent.opSpan.end];
  const edits: SmallEdit[] = [{ start, end, text: `${scene.text.slice(start, from)}${parent.op === '*' ? '/' : '*'}${scene.text.slice(to, end)}`, cost: 1.5 }];
  const before = parent.left;
  const isOpen = before.kind === 'binary' && before.op === '/' && start === anchor.start + before.start;
  if (isOpen) {
    const divisor = placeOf({ anchor, expr: before.right }, scene).start;
    edits.push({ start, end, text: `${scene.text.slice(start, divisor)}(${scene.text.slice(divisor, end)})`, cost: 1.4 });
  }
  return edits;
}

/** Another symbol in place of this one: `nu` for `mu`. */
function replacements(position: Position, { symbols }: Workshop): readonly SmallEdit[] {
  const { expr, dimension, ratio } = position;
  const path = expr.kind === 'name' || expr.kind === 'member' ? pathOf(expr) : undefined;
  if (!path || !dimension) return [];
  const needed = dimension.mul(ratio);
  const span = { start: position.anchor.start + expr.start, end: position.anchor.start + expr.end };
  return symbols.filter((symbol) => symbol.dimension === needed && symbol.path !== path && !needed.isOne)
    .map((symbol) => ({ ...span, text: symbol.path, cost: 2 + unlikeness(symbol.path, path) + standing(symbol) }));
}

/** A factor of 1, which does nothing, stands where a symbol may have stood. */
function unity(position: Position, workshop: Workshop): readonly SmallEdit[] {
  const { expr, parent, ratio } = position;
  if (expr.kind !== 'number' || expr.value?.isOne !== true || parent?.kind !== 'binary') return [];
  const span = { start: position.anchor.start + expr.start, end: position.anchor.start + expr.end };
  return workshop.symbols.flatMap((symbol): readonly SmallEdit[] => {
    const power = exponentBetween(ratio, symbol.dimension);
    if (!power || power.sign < 0 || !fewPowers.has(power.toString())) return [];
    return [{ ...span, text: symbolPower(symbol.path, power, span.start, workshop), cost: 0.9 + standing(symbol) + (power.isOne ? 0 : 0.8) }];
  });
}

/** A factor in scope multiplied in, or out. */
function factors(position: Position, workshop: Workshop): readonly SmallEdit[] {
  const { scene } = workshop;
  const span = placeOf(position, scene);
  const code = factorText(scene.text.slice(span.start, span.end), position.expr);
  const inside = pathsIn(position.expr);
  return workshop.symbols.flatMap((symbol): readonly SmallEdit[] => {
    const power = exponentBetween(position.ratio, symbol.dimension);
    // Of a factor that is there already, the exponent is changed.
    if (inside.has(symbol.path) || !power || !fewPowers.has(power.toString())) return [];
    const size = power.abs();
    const op = power.sign < 0 ? '/' : '*';
    const text = `${code}${spaced(scene, span.start, op)}${symbolPower(symbol.path, size, span.start, workshop)}`;
    return [{ ...span, text, cost: 2.1 + standing(symbol) + (op === '/' ? 0.15 : 0) + (size.isOne ? 0 : 0.5 + Math.abs(size.toNumber() - 1) * 0.3) + (size.isInteger ? 0 : 1) }];
  });
}

/** The symbols that multiply into an expression. */
function pathsIn(expr: Expr, found = new Set<string>()): ReadonlySet<string> {
  const path = pathOf(expr);
  if (path !== undefined) found.add(path);
  else if (expr.kind === 'binary' && expr.op !== '+' && expr.op !== '-') {
    pathsIn(expr.left, found);
    if (expr.op !== '**') pathsIn(expr.right, found);
  } else if (expr.kind === 'unary') pathsIn(expr.operand, found);
  else if (expr.kind === 'call') for (const arg of expr.args) pathsIn(arg.value, found);
  return found;
}

function symbolPower(path: string, power: Rational, at: number, { scene }: Workshop): string {
  if (power.isOne) return path;
  return `${path}${spaced(scene, at, scene.inputs.style.power)}${power.isInteger ? power.toString() : power.toNumber()}`;
}

/** A parameter that is read nowhere is what was forgotten; a symbol that is used once is more likely than one used often. */
function standing({ isParameter, isOutside, uses, note }: ScopeSymbol): number {
  return (isOutside ? 0.6 : 0) + (isParameter ? (uses === 0 ? -0.6 : -0.1) : uses === 0 ? -0.3 : 0) + (note ? 0 : 0.15) + Math.min(uses, 10) * 0.02;
}

/** 0 for symbols that differ in one letter, up to 0.8. */
function unlikeness(a: string, b: string): number {
  const steps = spelling(a.toLowerCase(), b.toLowerCase());
  return Math.min(0.8, ((steps - 1) / Math.max(a.length, b.length, 2)) * 0.8);
}

/** `X*b + c` to `X*(b + c)`, `a + c/Y` to `(a + c)/Y`: brackets that make the terms of a sum alike. */
export function bracketsIn(sum: BinaryExpr, anchor: Position['anchor'], dimensionAt: (expr: Expr) => unknown, scene: Scene): readonly SmallEdit[] {
  const edits: SmallEdit[] = [];
  const [left, right] = [placeOf({ anchor, expr: sum.left }, scene), placeOf({ anchor, expr: sum.right }, scene)];
  const text = scene.text;
  const last = sum.left.kind === 'binary' && isProduct(sum.left) && left.start === anchor.start + sum.left.start ? sum.left.right : undefined;
  if (last && dimensionAt(last) !== undefined && dimensionAt(last) === dimensionAt(sum.right)) {
    const from = placeOf({ anchor, expr: last }, scene);
    edits.push({ start: left.start, end: right.end, text: `${text.slice(left.start, from.start)}(${text.slice(from.start, right.end)})`, cost: 1.2 });
  }
  const first = right.start === anchor.start + sum.right.start ? firstFactor(sum.right) : undefined;
  if (first && dimensionAt(first) !== undefined && dimensionAt(first) === dimensionAt(sum.left)) {
    const to = placeOf({ anchor, expr: first }, scene);
    edits.push({ start: left.start, end: right.end, text: `(${text.slice(left.start, to.end)})${text.slice(to.end, right.end)}`, cost: 1.3 });
  }
  return edits;
}

function isProduct(expr: BinaryExpr): boolean {
  return expr.op === '*' || expr.op === '/';
}

function firstFactor(expr: Expr): Expr | undefined {
  let found: Expr | undefined;
  for (let inner = expr; inner.kind === 'binary' && isProduct(inner); inner = inner.left) found = inner.left;
  return found;
}
