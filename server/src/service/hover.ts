/** What is known of the symbol, expression or unit note at an offset. */
import type { Understood } from '../analyze.ts';
import type { NoteInForce, Value } from '../constraints/value.ts';
import type { HostStyle } from '../frontends/frontend.ts';
import type { Note } from '../notes/types.ts';
import type { Chunk, NumberExpr } from '../program/nodes.ts';
import { pathOf } from '../program/path.ts';
import type { Dimension } from '../quantities/dimension.ts';
import { kindsOf } from '../quantities/kinds.ts';
import { printUnit } from '../quantities/print-unit.ts';
import { expressionsAt } from '../repairs/expressions-at.ts';
import { dimensionOf, type Scene } from '../repairs/scene.ts';
import { noteLeaves } from '../solver/root-cause.ts';
import type { Sightings } from '../solver/pieces.ts';
import { LineIndex } from '../text/line-index.ts';
import type { Span } from '../text/span.ts';
import { unitOf } from '../wording/voice.ts';
import type { HoverInfo } from './contract.ts';
import { conversionOf } from './conversion-at.ts';
import { sceneOf } from './scene-of.ts';

const longestName = 60;
export function hoverAt(understood: Understood, style: HostStyle, offset: number, textOf: (file: string) => string): HoverInfo | undefined {
  const { parsed, notes } = understood;
  const chunk = parsed.program.chunks.find(({ anchor, text }) => anchor.start <= offset && offset <= anchor.start + text.length);
  if (!chunk) return undefined;
  const at = offset - chunk.anchor.start;
  const page: Page = { scene: sceneOf(understood, style), chunk, textOf };
  const note = (notes.get(chunk)?.notes ?? []).find(({ span }) => holds(span, at));
  return note ? ofNote(note, page) : ofSymbol(at, page);
}

interface Page {
  readonly scene: Scene;
  readonly chunk: Chunk;
  readonly textOf: (file: string) => string;
}

function ofNote(note: Note, { chunk, scene }: Page): HoverInfo | undefined {
  const { unit, span } = note;
  return {
    span: absoluteIn(chunk, span),
    name: scene.code(chunk.anchor, span),
    unit: unit.scale ? unit.text : undefined,
    dimension: unit.dimension.toString(),
    kinds: kindsOf(unit.dimension),
    origin: 'declared',
    description: note.description,
    notes: [],
    range: note.range,
  };
}

/** The innermost thing at the place: a parameter's name, a function's name, or an expression. */
function ofSymbol(at: number, page: Page): HoverInfo | undefined {
  const { scene, chunk } = page;
  const piece = scene.pieceAt(chunk.anchor, { start: at, end: at });
  if (piece && holds(piece.fn.nameSpan, at)) return ofFunction(piece.fn.name, piece.fn.nameSpan, scene.inputs.solver.piece(piece)?.scheme?.result?.note, page);
  const sightings = scene.sightings(piece);
  const param = piece?.fn.params.find(({ nameSpan }) => holds(nameSpan, at));
  if (param) return ofValue(param.name, param.nameSpan, sightings.values.get(param.nameSpan), sightings, page);
  // What begins at the place counts before what ends there.
  const expr = expressionsAt(chunk.statements, { start: at, end: at + 1 }).at(-1) ?? expressionsAt(chunk.statements, { start: at, end: at }).at(-1);
  if (expr?.kind === 'number') return ofLiteral(expr, sightings, page);
  const value = expr && sightings.values.get(expr);
  if (!expr || !value) return undefined;
  const name = pathOf(expr) ?? shortened(scene.code(chunk.anchor, expr));
  if (value.callable?.kind === 'function') return ofFunction(name, expr, value.callable.scheme()?.result?.note, page);
  return ofValue(name, expr, value, sightings, page);
}

/** A number that converts says between which units; any other needs no words. */
function ofLiteral(expr: NumberExpr, sightings: Sightings, page: Page): HoverInfo | undefined {
  const conversion = conversionOf(expr, sightings);
  if (!conversion) return undefined;
  return { span: absoluteIn(page.chunk, expr), name: expr.text, unit: '', dimension: '1', kinds: [], origin: 'inferred', description: undefined, notes: [], range: undefined, conversion };
}

function ofFunction(name: string, span: Span, note: NoteInForce | undefined, page: Page): HoverInfo | undefined {
  if (!note) return undefined;
  return { ...declared(note), span: absoluteIn(page.chunk, span), name: `${name}()`, notes: [noteWhere(`${name}()`, note, page)] };
}

function ofValue(name: string, span: Span, value: Value | undefined, sightings: Sightings, page: Page): HoverInfo | undefined {
  if (!value || value.literal || value.fits || value.spoilt) return undefined;
  const dimension = dimensionOf(value, sightings);
  if (!dimension) return undefined;
  const note = value.version?.note;
  const leaves = noteLeaves(value).flatMap((leaf) => (leaf.version?.note ? [noteWhere(leaf.version.path, leaf.version.note, page)] : []));
  if (note) return { ...declared(note), span: absoluteIn(page.chunk, span), name, notes: leaves };
  return {
    span: absoluteIn(page.chunk, span),
    name,
    unit: countedIn(value, dimension),
    dimension: dimension.toString(),
    kinds: kindsOf(dimension),
    origin: value.version?.origin === 'library' ? 'library' : 'inferred',
    description: undefined,
    notes: leaves,
    range: undefined,
  };
}

function declared({ note, unit }: NoteInForce): Omit<HoverInfo, 'span' | 'name' | 'notes'> {
  return {
    unit: unit.scale ? unit.text : undefined,
    dimension: unit.dimension.toString(),
    kinds: kindsOf(unit.dimension),
    origin: 'declared',
    description: note.description,
    range: note.range,
  };
}

/** Undefined where a literal leaves open which unit the number is counted in. */
function countedIn(value: Value, dimension: Dimension): string | undefined {
  const { measure } = value;
  const reading = measure?.readings.length === 1 && measure.factors.length === 0 ? measure.readings[0] : undefined;
  if (!reading || reading.pending) return undefined;
  if (reading.weight !== 0) return pointScale(reading.weight, reading.zero, reading.scale.isOne);
  const printed = printUnit({ dimension, scale: reading.scale, text: '' });
  return /^[\d.]+ /.test(printed) ? undefined : unitOf(value, dimension);
}

function pointScale(weight: number, zero: number, kelvinSized: boolean): string | undefined {
  if (weight !== 1) return undefined;
  if (kelvinSized && Math.abs(zero - 273.15) < 1e-6) return 'degC';
  return !kelvinSized && Math.abs(zero - (459.67 * 5) / 9) < 1e-6 ? 'degF' : undefined;
}

function noteWhere(symbol: string, { note, unit, anchor }: NoteInForce, { scene, textOf }: Page): HoverInfo['notes'][number] {
  const here = scene.isHere(anchor);
  const lines = here ? scene.inputs.lines : LineIndex.of(textOf(anchor.file));
  const span = { start: anchor.start + note.span.start, end: anchor.start + note.span.end };
  return { symbol, unit: unit.text, file: here ? undefined : anchor.file, line: lines.lineAt(span.start) + 1, span };
}

function absoluteIn({ anchor }: Chunk, { start, end }: Span): Span {
  return { start: anchor.start + start, end: anchor.start + end };
}

function holds({ start, end }: Span, at: number): boolean {
  return start <= at && at <= end;
}

function shortened(code: string): string {
  const line = code.replace(/\s+/g, ' ');
  return line.length > longestName ? `${line.slice(0, longestName - 2)} …` : line;
}
