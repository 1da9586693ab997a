/** Symbols whose unit no note says, with the unit that everything around gives them. */
import type { Value } from '../constraints/value.ts';
import type { AssignStmt, Chunk, FunctionStmt, Param, Stmt } from '../program/nodes.ts';
import { pathOf } from '../program/path.ts';
import { parseUnit } from '../quantities/parse-unit.ts';
import { coherentUnit, printUnit } from '../quantities/print-unit.ts';
import type { Piece } from '../solver/definitions.ts';
import type { Sightings } from '../solver/pieces.ts';
import { blocksOf, dimensionOf, type Scene } from './scene.ts';

export interface OpenSymbol {
  readonly path: string;
  readonly chunk: Chunk;
  readonly span: { readonly start: number; readonly end: number };
  readonly at: { readonly kind: 'assign'; readonly statement: AssignStmt } | { readonly kind: 'parameter'; readonly owner: FunctionStmt; readonly param: Param };
  /** What follows from the units around. */
  readonly inferred: string | undefined;
  /** What the end of its name says, as in `p_kPa`. */
  readonly suffix: string | undefined;
}

/** The open symbols of a function, or of the top level. */
export function openSymbols(scene: Scene, piece: Piece | undefined): readonly OpenSymbol[] {
  const sightings = scene.sightings(piece);
  if (!piece) return scene.inputs.program.chunks.flatMap((chunk) => assigned(chunk.statements, chunk, sightings));
  const parameters = piece.fn.params.flatMap((param): readonly OpenSymbol[] => {
    const value = sightings.values.get(param.nameSpan);
    return value && !value.version?.note ? [{ path: param.name, chunk: piece.chunk, span: param.nameSpan, at: { kind: 'parameter', owner: piece.fn, param }, ...said(param.name, value, sightings) }] : [];
  });
  return [...parameters, ...assigned(piece.fn.body, piece.chunk, sightings)];
}

function assigned(block: readonly Stmt[], chunk: Chunk, sightings: Sightings): readonly OpenSymbol[] {
  return block.flatMap((statement): readonly OpenSymbol[] => {
    if (statement.kind === 'function' || statement.kind === 'class') return [];
    if (statement.kind !== 'assign') return assigned(blocksOf(statement), chunk, sightings);
    const [target] = statement.targets;
    const path = target && target.kind !== 'index' ? pathOf(target) : undefined;
    const value = target && sightings.values.get(target);
    if (!target || path === undefined || statement.targets.length > 1 || statement.op || !value || value.version?.note) return [];
    return [{ path, chunk, span: target, at: { kind: 'assign', statement }, ...said(path, value, sightings) }];
  });
}

function said(path: string, value: Value, sightings: Sightings): Pick<OpenSymbol, 'inferred' | 'suffix'> {
  return { inferred: inferredUnit(value, sightings), suffix: suffixUnit(path) };
}

/** The unit of a value, in the scale it is counted in; undefined where that is open, or a pure number. */
export function inferredUnit(value: Value, sightings: Sightings): string | undefined {
  const dimension = value.fits || value.callable || value.items ? undefined : dimensionOf(value, sightings);
  if (!dimension || dimension.isOne) return undefined;
  const { measure } = value;
  if (value.version?.origin === 'parameter' || value.version?.origin === 'constant') return coherentUnit(dimension);
  if (measure?.readings.length !== 1 || measure.cycle !== 0 || measure.radian !== 0 || !measure.factors.every((factor) => factor.literal.pure)) return undefined;
  const [reading] = measure.readings;
  if (reading?.weight !== 0) return undefined;
  const text = printUnit({ dimension, scale: reading.scale, text: '' });
  return /^\d/.test(text) && !text.startsWith('1/') ? undefined : text;
}

/** Short words that end names without being meant as units. */
const words = new Set(['a', 'b', 'c', 'd', 'f', 'g', 'h', 'i', 'j', 'k', 'l', 'm', 'n', 's', 't', 'u', 'v', 'w', 'x', 'y', 'z', 'in', 'min', 'max', 'at', 'per', 'out', 'ref', 'rad', 'mol', 'bar', 'mil', 'd', 'T', 'H', 'N', 'A', 'C', 'F', 'V', 'W', 'J', 'K', 'L', 'S', 'G']);

/** The unit behind the last underscore of a name. */
function suffixUnit(path: string): string | undefined {
  const found = /_([A-Za-z]+\d?)$/.exec(path)?.[1];
  if (found === undefined || words.has(found)) return undefined;
  const read = parseUnit(found, { describes: path });
  return read.ok && read.beyondDoubt && read.hints.length === 0 ? found : undefined;
}
