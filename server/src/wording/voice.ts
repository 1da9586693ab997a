/** What the words need to know of the text: its characters and line numbers, and how quantities are named. */
import type { Value } from '../constraints/value.ts';
import type { Dimension } from '../quantities/dimension.ts';
import { kindsOf } from '../quantities/kinds.ts';
import { coherentUnit, printUnit } from '../quantities/print-unit.ts';
import type { Anchor, Place, Span } from '../text/span.ts';

export interface Voice {
  /** The characters at a place. */
  textAt(place: Place): string;
  /** The line as it is called: `line 6`, in a notebook `cell 2, line 3`. */
  lineAt(place: Place): string;
  /** The file a place is in, if it is not the one that is checked. */
  otherFile(place: Place): string | undefined;
}

export interface Related {
  readonly place: Place;
  readonly message: string;
}

export interface Words {
  readonly message: string;
  readonly related: readonly Related[];
}

const longest = 60;

/** An expression as the author wrote it, on one line and not too long. */
export function code(voice: Voice, anchor: Anchor, span: Span): string {
  const text = voice.textAt({ anchor, start: span.start, end: span.end }).replace(/\s+/g, ' ');
  return `\`${text.length > longest ? `${text.slice(0, longest - 2)} …` : text}\``;
}

/** A side of a comparison: its expression, or the symbol whose note it is. */
export function nameOf(voice: Voice, anchor: Anchor, value: Value): string {
  if (value.expr) return code(voice, anchor, value.expr);
  return value.version ? `\`${value.version.path}\`` : 'this value';
}

/** The unit of a side as the author writes units, else the coherent SI unit of its dimension: `kPa`, `W/(m K)`. */
export function unitOf(value: Value, dimension: Dimension): string {
  return countedIn(value, dimension) ?? unitWords(coherentUnit(dimension), dimension);
}

/** The unit that a side's number is counted in, where that is known and has a name; a 2 or a 1/4 in front converts nothing. */
export function countedIn(value: Value, dimension: Dimension): string | undefined {
  const note = value.version?.note;
  if (note && note.unit.dimension === dimension && note.unit.text !== '') return unitWords(note.unit.text, dimension);
  const plain = value.measure?.factors.every(({ literal }) => literal.pure && literal.pi === 0 && !Number.isInteger(Math.log10(Math.abs(literal.value.toNumber())))) === true;
  const reading = value.measure?.readings.length === 1 && plain ? value.measure.readings[0] : undefined;
  const printed = reading && value.form?.terms.length === 0 ? printUnit({ dimension, scale: reading.scale, text: '' }) : undefined;
  return printed === undefined || /^\d\S* /.test(printed) ? undefined : unitWords(turned(printed, value.measure), dimension);
}

/** Revolutions and radians show in a plain rate: `1/s` of something in rpm is `rev/s`. */
function turned(text: string, measure: Value['measure']): string {
  if (!measure || !text.startsWith('1/')) return text;
  return measure.cycle === 1 ? `rev${text.slice(1)}` : measure.radian === 1 ? `rad${text.slice(1)}` : text;
}

/** A dimensionless unit is said in words. */
export function unitWords(text: string, dimension: Dimension): string {
  return dimension.isOne && /^(?:1|-+)?$/.test(text.trim()) ? 'dimensionless' : text;
}

/** `m/s (speed)`: the coherent unit of a dimension, or the one given, with the kinds of quantity that have it. */
export function unitWithKinds(dimension: Dimension, unit = coherentUnit(dimension)): string {
  if (dimension.isOne) return 'a pure number';
  const kinds = kindsOf(dimension).slice(0, 2).join(' or ');
  return unit + (kinds ? ` (${kinds})` : '');
}

/** ` (line 6)`, or with the file's name where it is another file. */
export function where(voice: Voice, place: Place): string {
  const file = voice.otherFile(place);
  return file ? `${file}, ${voice.lineAt(place)}` : voice.lineAt(place);
}
