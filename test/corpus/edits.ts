/** Faults put into real functions: one use of a documented parameter squared, or left out of its product. */
import type { FrontEnd, HostStyle } from '../../server/src/frontends/frontend.ts';
import { readChunkNotes } from '../../server/src/notes/read-chunk.ts';
import { defaultNoteSettings } from '../../server/src/notes/types.ts';
import type { Chunk, Expr, FunctionStmt, NameExpr } from '../../server/src/program/nodes.ts';
import { Dimension } from '../../server/src/quantities/dimension.ts';
import { emptyVocabulary } from '../../server/src/quantities/unit-result.ts';
import type { Span } from '../../server/src/text/span.ts';

export type EditKind = 'squared' | 'dropped';

export interface SeedEdit {
  readonly kind: EditKind;
  readonly functionName: string;
  /** The whole function in the text before the edit. */
  readonly functionSpan: Span;
  readonly parameter: string;
  /** What is replaced in the text before the edit. */
  readonly span: Span;
  readonly replacement: string;
}

/** At most one edit of each kind for every function that documents a parameter with a dimension. Deterministic. */
export function seedEdits(frontEnd: FrontEnd, file: string, text: string): readonly SeedEdit[] {
  const parsed = frontEnd.parse(text, file);
  const edits = parsed.program.chunks.flatMap((chunk) => editsIn(chunk, frontEnd));
  parsed.release();
  return edits;
}

function editsIn(chunk: Chunk, frontEnd: FrontEnd): readonly SeedEdit[] {
  const documented = new Map<FunctionStmt, Set<string>>();
  for (const { target, unit } of readChunkNotes(chunk, defaultNoteSettings, emptyVocabulary, frontEnd.language).notes) {
    if (target.kind !== 'parameter' || unit.dimension === Dimension.one) continue;
    documented.set(target.owner, (documented.get(target.owner) ?? new Set()).add(target.param.name));
  }
  return [...documented].flatMap(([fn, names]) => editsOf(fn, names, chunk.anchor.start, frontEnd.style));
}

function editsOf(fn: FunctionStmt, names: ReadonlySet<string>, anchor: number, style: HostStyle): readonly SeedEdit[] {
  const uses = usesIn(fn, names);
  return (['squared', 'dropped'] as const).flatMap((kind): SeedEdit[] => {
    const fitting = uses.filter((use) => kind === 'squared' || use.factor);
    const parameters = [...new Set(fitting.map((use) => use.name.name))].sort();
    const parameter = parameters[hash(fn.name) % parameters.length];
    if (parameter === undefined) return [];
    const own = fitting.filter((use) => use.name.name === parameter);
    const { name } = own[hash(`${fn.name}.${parameter}`) % own.length] as Use;
    return [{
      kind, parameter, functionName: fn.name,
      functionSpan: { start: anchor + fn.start, end: anchor + fn.end },
      span: { start: anchor + name.start, end: anchor + name.end },
      replacement: kind === 'dropped' ? '1.0' : style.power === 'pow' ? `pow(${parameter}, 2)` : `(${parameter}${style.power}2)`,
    }];
  });
}

interface Use {
  readonly name: NameExpr;
  /** Stands in a product or quotient, perhaps under a constant power or a sign. */
  readonly factor: boolean;
}

/** Uses in arithmetic of names that have not been assigned again before. */
function usesIn(fn: FunctionStmt, names: ReadonlySet<string>): readonly Use[] {
  const uses: Use[] = [];
  const rebound = new Map<string, number>();
  visit(fn.body, [], (node, parents) => {
    if (node.kind === 'assign') for (const target of node.targets as readonly Expr[]) if (target.kind === 'name' && !rebound.has(target.name)) rebound.set(target.name, node.end as number);
    if (node.kind !== 'name' || !names.has((node as unknown as NameExpr).name)) return;
    const place = arithmeticPlace(node, parents);
    if (place) uses.push({ name: node as unknown as NameExpr, factor: place === 'factor' });
  });
  return uses.filter(({ name }) => name.start < (rebound.get(name.name) ?? Number.POSITIVE_INFINITY));
}

interface AnyNode {
  readonly kind?: string;
  readonly [key: string]: unknown;
}

function arithmeticPlace(node: AnyNode, parents: readonly AnyNode[]): 'factor' | 'term' | undefined {
  let inner = node;
  for (const parent of [...parents].reverse()) {
    if (parent.kind === 'unary' || (parent.kind === 'binary' && parent.op === '**' && parent.left === inner)) {
      inner = parent;
      continue;
    }
    if (parent.kind === 'binary' && (parent.op === '*' || parent.op === '/')) return 'factor';
    if (parent.kind === 'binary' && (parent.op === '+' || parent.op === '-')) return 'term';
    break;
  }
  return inner !== node && inner.kind === 'binary' ? 'term' : undefined;
}

/** Every node below, with those around it from the outermost in. */
function visit(value: unknown, parents: readonly AnyNode[], see: (node: AnyNode, parents: readonly AnyNode[]) => void): void {
  if (Array.isArray(value)) for (const item of value) visit(item, parents, see);
  else if (isNode(value)) {
    see(value, parents);
    const inside = [...parents, value];
    for (const part of Object.values(value)) if (typeof part === 'object' && part !== null) visit(part, inside, see);
  }
}

function isNode(value: unknown): value is AnyNode {
  return typeof value === 'object' && value !== null && Object.getPrototypeOf(value) === Object.prototype;
}

/** FNV-1a, 32 bits: spreads names evenly and is the same everywhere. */
function hash(text: string): number {
  let state = 0x811c9dc5;
  for (let at = 0; at < text.length; at++) state = Math.imul(state ^ text.charCodeAt(at), 0x01000193) >>> 0;
  return state;
}
