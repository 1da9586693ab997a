/** The relation that selected statements are: the quantity they come to depends on those they read. */
import type { Understood } from '../analyze.ts';
import type { Expr, Stmt } from '../program/nodes.ts';
import { pathOf } from '../program/path.ts';
import type { Span } from '../text/span.ts';
import { chunkAt, describeSymbol, statementsOf, type TextOf, whereOf } from './groups-symbols.ts';
import type { FoundRelation } from './relations.ts';

/** A relation of fewer symbols has no group worth naming. */
const fewest = 3;

/**
 * The relation of the statements that a span touches, all of one function or of the top level; the last symbol assigned depends on
 * all that is read and not assigned among them. Undefined where nothing is assigned, or where too few symbols take part.
 */
export function relationOfSelection(understood: Understood, span: Span, textOf: TextOf): FoundRelation | undefined {
  const chunk = chunkAt(understood, span.start);
  if (!chunk) return undefined;
  const inChunk = { start: span.start - chunk.anchor.start, end: Math.max(span.start, Math.min(span.end, chunk.anchor.start + chunk.text.length)) - chunk.anchor.start };
  const where = whereOf(understood, chunk, { start: inChunk.start, end: inChunk.start });
  const bodies = where.piece ? [{ base: chunk.anchor.start, body: where.piece.fn.body }] : understood.parsed.program.chunks.map(({ anchor, statements }) => ({ base: anchor.start, body: statements }));
  const touched = bodies.flatMap(({ base, body }) => statementsOf(body).flatMap((statement) => (touches(statement, base, span) && statement.kind === 'assign' ? [{ statement, base }] : [])));
  const first = touched[0];
  const last = touched.at(-1);
  const dependent = last && lastTarget(last.statement);
  if (!first || !last || dependent === undefined) return undefined;
  const assigned = new Set(touched.flatMap(({ statement }) => targetsOf(statement)));
  const read = new Set(touched.flatMap(({ statement }) => (statement.kind === 'assign' ? namesIn(statement.value) : [])));
  const names = [dependent, ...[...read].filter((name) => !assigned.has(name) && !isNoQuantity(understood, name))];
  if (names.length < fewest) return undefined;
  const symbols = names.map((name) => describeSymbol(understood, where, name, textOf));
  const place = { start: first.base + first.statement.start, end: last.base + last.statement.end };
  return { relation: { dependent, symbols }, origin: 'selection', span: place, line: understood.lines.lineAt(place.start) + 1, language: understood.parsed.program.language, where };
}

function touches(statement: Stmt, base: number, span: Span): boolean {
  return base + statement.start <= span.end && span.start <= base + statement.end;
}

function targetsOf(statement: Stmt): readonly string[] {
  if (statement.kind !== 'assign') return [];
  return statement.targets.flatMap((target) => (target.kind === 'sequence' ? target.items : [target])).flatMap((target) => pathOf(target) ?? []);
}

function lastTarget(statement: Stmt): string | undefined {
  return targetsOf(statement).at(-1);
}

/** Symbols that an expression reads, in order; functions that it calls are none. */
function namesIn(expr: Expr): readonly string[] {
  const path = expr.kind === 'name' || expr.kind === 'member' ? pathOf(expr) : undefined;
  if (path !== undefined) return [path];
  switch (expr.kind) {
    case 'call':
      return expr.args.flatMap(({ value }) => namesIn(value));
    case 'binary':
      return [...namesIn(expr.left), ...namesIn(expr.right)];
    case 'unary':
      return namesIn(expr.operand);
    case 'choose':
      return [...namesIn(expr.then), ...namesIn(expr.otherwise)];
    case 'index':
      return namesIn(expr.object);
    case 'sequence':
      return expr.items.flatMap(namesIn);
    case 'compare':
    case 'logic':
      return expr.operands.flatMap(namesIn);
    default:
      return [];
  }
}

/** π, functions, and members of modules. */
function isNoQuantity({ solver }: Understood, name: string): boolean {
  const head = solver.global(name.split('.')[0] as string);
  return head?.module !== undefined || head?.callable !== undefined || (head?.literal !== undefined && head.form?.terms.length === 0 && head.form.dimension.isOne);
}
