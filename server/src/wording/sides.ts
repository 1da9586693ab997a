/** What each side of a contradiction is, and where its units come from. */
import type { Unknown } from '../constraints/form.ts';
import type { Constraint } from '../constraints/problem.ts';
import type { Value } from '../constraints/value.ts';
import type { Dimension } from '../quantities/dimension.ts';
import type { Involved } from '../solver/fault.ts';
import { noteLeaves, sidesOf } from '../solver/root-cause.ts';
import { type Anchor, type Place, placeAt } from '../text/span.ts';
import { type Related, code, countedIn, nameOf, unitOf, unitWords, type Voice, where } from './voice.ts';

const mostLeaves = 5;

/** "`tau*omega` is W (tau N m, line 3; omega rad/s, line 4)". */
export function sideWords(voice: Voice, anchor: Anchor, value: Value, dimension: Dimension): string {
  const leaves = noteLeaves(value).filter((leaf) => leaf !== value);
  const own = value.version?.note;
  const unit = unitOf(value, dimension);
  if (own) return `${nameOf(voice, anchor, value)} is ${unit} (${where(voice, placeAt(own.anchor, own.note.span))})`;
  const parts = leaves.slice(0, mostLeaves).map((leaf) => leafWords(voice, leaf));
  return `${nameOf(voice, anchor, value)} is ${unit}${parts.length > 0 ? ` (${parts.join('; ')}${leaves.length > mostLeaves ? '; …' : ''})` : ''}`;
}

/** "`V_dot*dp/1000` comes from V_dot m3/h, line 3; dp Pa, line 4": where the number is counted in no unit with a name. */
export function sourceWords(voice: Voice, anchor: Anchor, value: Value, dimension: Dimension): string {
  const leaves = noteLeaves(value).filter((leaf) => leaf !== value);
  if (value.version?.note || leaves.length === 0 || countedIn(value, dimension) !== undefined || (value.measure && value.measure.cycle + value.measure.radian !== 0)) return sideWords(voice, anchor, value, dimension);
  const parts = leaves.slice(0, mostLeaves).map((leaf) => leafWords(voice, leaf));
  return `${nameOf(voice, anchor, value)} comes from ${parts.join('; ')}${leaves.length > mostLeaves ? '; …' : ''}`;
}

function leafWords(voice: Voice, leaf: Value): string {
  const note = leaf.version?.note;
  if (!note) return '';
  return `${leaf.version?.path} ${unitWords(note.unit.text, note.unit.dimension)}, ${where(voice, placeAt(note.anchor, note.note.span))}`;
}

/** The related places of a fault: each noted symbol it rests on, each use that fixed a symbol without a note. */
export function chainOf(voice: Voice, constraint: Constraint, involved: readonly Involved[]): readonly Related[] {
  const related: Related[] = [];
  const add = (place: Place, message: string): void => {
    if (!related.some((each) => each.place.anchor === place.anchor && each.place.start === place.start)) related.push({ place, message });
  };
  const values = [...sidesOf(constraint), ...involved.flatMap((each) => sidesOf(each.by))];
  for (const leaf of noteLeaves(...values)) {
    const note = leaf.version?.note;
    if (note) add(placeAt(note.anchor, note.note.span), `\`${leaf.version?.path}\` is noted ${unitWords(note.unit.text, note.unit.dimension)}`);
  }
  for (const each of involved) add(placeAt(each.by.anchor, each.by.span), solvedWords(voice, each.unknown, each.by));
  return related.slice(0, 8);
}

function solvedWords(voice: Voice, unknown: Unknown, by: Constraint): string {
  const name = unknown.name === '' ? 'a value without a note' : `\`${unknown.name}\``;
  return `this use decides the unit of ${name}: ${code(voice, by.anchor, by.span)}`;
}
