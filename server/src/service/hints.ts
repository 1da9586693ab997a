/** What is shown in the text beside what its author wrote: units that follow, units that parameters have, values of formulas. */
import type { Understood } from '../analyze.ts';
import type { HostStyle } from '../frontends/frontend.ts';
import type { Chunk, Expr } from '../program/nodes.ts';
import { openSymbols } from '../repairs/open-symbols.ts';
import { noteEdit } from '../repairs/fixes/write-note.ts';
import type { Scene } from '../repairs/scene.ts';
import type { Piece } from '../solver/definitions.ts';
import type { Span } from '../text/span.ts';
import type { HintSettings, TextHint } from './contract.ts';
import type { FormulaValues } from './formula-values.ts';
import { sceneOf } from './scene-of.ts';

/** `values`: what the formulas of a nomenclature file come to; undefined for a script. */
export function hintsIn(understood: Understood, style: HostStyle, span: Span, settings: HintSettings, values: FormulaValues | undefined): readonly TextHint[] {
  const hints: TextHint[] = [];
  if (values) return settings.values ? valueHints(understood, span, values) : [];
  const scene = sceneOf(understood, style);
  for (const piece of [undefined, ...understood.solver.pieces()]) {
    if (piece && !meets(piece.chunk, piece.fn, span)) continue;
    if (settings.inferred) hints.push(...inferredHints(scene, piece, span));
    if (settings.arguments !== 'off') hints.push(...argumentHints(scene, piece, span, settings.arguments === 'all'));
  }
  return hints.sort((a, b) => a.at - b.at);
}

function inferredHints(scene: Scene, piece: Piece | undefined, span: Span): readonly TextHint[] {
  const seen = new Set<string>();
  return openSymbols(scene, piece).flatMap((symbol): readonly TextHint[] => {
    const { path, chunk, inferred } = symbol;
    if (inferred === undefined || seen.has(path)) return [];
    seen.add(path);
    if (!meets(chunk, symbol.span, span)) return [];
    const edit = noteEdit(symbol, inferred, scene);
    return [{ at: chunk.anchor.start + symbol.span.end, text: `[${inferred}]`, kind: 'inferred', tip: undefined, edits: edit ? [edit] : [] }];
  });
}

/** `pump(12 [m^3/h], 1450 [rpm])`. */
function argumentHints(scene: Scene, piece: Piece | undefined, span: Span, all: boolean): readonly TextHint[] {
  const { values } = scene.sightings(piece);
  const hints: TextHint[] = [];
  for (const [key, value] of values) {
    const callable = value && isCall(key) ? values.get(key.callee)?.callable : undefined;
    const scheme = callable?.kind === 'function' ? callable.scheme() : undefined;
    if (!scheme || !isCall(key)) continue;
    const chunk = chunkOf(scene, piece, key);
    if (!chunk || !meets(chunk, key, span)) continue;
    for (const [at, argument] of key.args.entries()) {
      if (argument.spread) break;
      const param = argument.name === undefined ? scheme.params[at] : scheme.params.find(({ name }) => name === argument.name);
      const unit = param?.note?.unit;
      if (!param || !unit?.scale || unit.text === '' || unit.dimension.isOne || !(all || isNumber(argument.value))) continue;
      hints.push({ at: chunk.anchor.start + argument.value.end, text: `[${unit.text}]`, kind: 'argument', tip: `${param.name} of ${scheme.name}`, edits: [] });
    }
  }
  return hints;
}

/** The chunk of an expression: the function's own, or for the top level the one that holds it. */
function chunkOf(scene: Scene, piece: Piece | undefined, expr: Expr): Chunk | undefined {
  if (piece) return piece.chunk;
  return scene.inputs.program.chunks.find((chunk) => chunk.statements.some((statement) => statement.start <= expr.start && expr.end <= statement.end && holdsExpr(statement, expr)));
}

/** Offsets are relative to their chunk, so that equal ones meet: the expression itself has to be in it. */
function holdsExpr(node: unknown, expr: Expr): boolean {
  if (node === expr) return true;
  if (Array.isArray(node)) return node.some((each) => holdsExpr(each, expr));
  if (typeof node !== 'object' || node === null) return false;
  const { start, end } = node as Partial<Span>;
  if (start !== undefined && end !== undefined && (end < expr.start || start > expr.end)) return false;
  return Object.values(node).some((part) => typeof part === 'object' && holdsExpr(part, expr));
}

function valueHints({ parsed }: Understood, span: Span, values: FormulaValues): readonly TextHint[] {
  return parsed.program.chunks.flatMap((chunk): readonly TextHint[] => {
    const [statement] = chunk.statements;
    const target = statement?.kind === 'assign' ? statement.targets[0] : undefined;
    const text = target?.kind === 'name' ? values.get(target.name) : undefined;
    if (text === undefined || !statement || !meets(chunk, statement, span)) return [];
    return [{ at: chunk.anchor.start + statement.end, text: `= ${text}`, kind: 'value', tip: undefined, edits: [] }];
  });
}

function isNumber(expr: Expr): boolean {
  return expr.kind === 'number' || (expr.kind === 'unary' && (expr.op === '-' || expr.op === '+') && isNumber(expr.operand));
}

function isCall(span: Span): span is Extract<Expr, { kind: 'call' }> {
  return 'kind' in span && span.kind === 'call';
}

function meets({ anchor }: Chunk, inner: Span, span: Span): boolean {
  return anchor.start + inner.start <= span.end && span.start <= anchor.start + inner.end;
}
