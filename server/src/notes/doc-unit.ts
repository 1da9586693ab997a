/** The unit that an entry of a documentation text states. */
import { parseUnit } from '../quantities/parse-unit.ts';
import type { ReadOptions } from '../quantities/unit-result.ts';
import type { Collector } from './collector.ts';
import type { DocEntry } from './doc-entries.ts';
import { choose, isValue, type Found, type Looked } from './find-unit.ts';
import { type Piece, partOf } from './piece.ts';
import { mayStandAlone } from './plain-words.ts';
import { unitInWords } from './unit-words.ts';

export interface EntryUnit {
  readonly piece: Piece;
  readonly found: Found;
}

/** Brackets of the description, of the type, then parentheses, then words. `counts`: a failed unit is reported. */
export function unitOfEntry(out: Collector, entry: DocEntry, citations: boolean, counts: boolean): EntryUnit | undefined {
  const { type, body } = entry;
  if (type && holdsNoNumber(type.text)) return undefined;
  const options = out.options(entry.names[0] ?? '', body?.text ?? '');
  const pieces = [body, type].filter((piece) => piece !== undefined);
  const looked = pieces.map((piece) => ({ piece, looked: out.look(piece, 'documentation', options, counts, citations) }));
  for (const each of looked) {
    const telling = each.looked.brackets.filter((one) => counted(each.piece.text, one));
    const found = choose(each.piece.text, telling);
    if (found) return { piece: each.piece, found };
    out.leave(each.piece, each.looked.brackets);
    if (telling.length > 0) return undefined;
  }
  if (looked.some((each) => each.looked.problems.length > 0)) return undefined;
  return withoutBracket(out.names.occurs, looked, type, body, options);
}

function withoutBracket(taken: (name: string) => boolean, looked: readonly { readonly piece: Piece; readonly looked: Looked }[], type: Piece | undefined, body: Piece | undefined, options: ReadOptions): EntryUnit | undefined {
  const typed = type && unitOfType(type, taken, options);
  if (type && typed) return { piece: type, found: typed };
  // `declination (radians) : numeric` says more than a parenthesis somewhere in the description.
  for (const { piece, looked: each } of [...looked].reverse()) {
    const found = parenthesisOf(piece.text, each.parentheses);
    if (found) return { piece, found };
  }
  const found = body && unitInWords(body, true, taken, options);
  return body && found ? { piece: body, found } : undefined;
}

/** The unit in parentheses of a first sentence, where no other is there: `the irradiance (W/m2) that …`. */
function parenthesisOf(text: string, parentheses: readonly Found[]): Found | undefined {
  const [first, ...others] = parentheses.filter((one) => !isValue(text, one));
  if (!first || others.some((other) => other.unit.dimension !== first.unit.dimension)) return undefined;
  const sentence = /[.;]\s/.exec(text)?.index ?? text.length;
  return first.outer.end <= sentence ? first : undefined;
}

/** A value with its unit in prose is no note, unless it is the default. */
function counted(text: string, found: Found): boolean {
  return !isValue(text, found) || /\bdefaults?\b[^.]*$/i.test(text.slice(0, found.outer.start));
}

const types = /^(?:\w+\s+of\s+)?(?:float|int|integer|array|array[_-]?like|ndarray|np\.\w+|numpy\.\w+|numeric|number|scalar|real|double|Series|pd\.\w+|pandas\.\w+|list|tuple|sequence|floats|arrays?)\b/i;
/** No quantity is counted in these. */
const others = /\b(?:bool|boolean|str|string|dict|OrderedDict|DataFrame|object|callable|function|class|Dataset|path|file|module|instance|datetime|DatetimeIndex|Timestamp|dictionary|date)\b/i;

const numeric = /\b(?:float|int|array|array[_-]?like|ndarray|numeric|number|scalar|Series)\b/i;

function holdsNoNumber(type: string): boolean {
  if (/^\s*[{(]?\s*[`‘'"][\w -]+[`’'"]\s*(?:[,|}]|or\b)/.test(type)) return true; // a choice of words
  return others.test(type) && !numeric.test(type.replace(/\([^()]*\)/g, ''));
}

/** `float, m/s`, `array-like, kg/kg`, `float in m`, or the unit itself: `m/s`. */
function unitOfType(type: Piece, taken: (name: string) => boolean, options: ReadOptions): Found | undefined {
  const { text } = type;
  const commas = [...text.matchAll(/,\s*/g)];
  for (const comma of commas.reverse()) {
    const start = comma.index + comma[0].length;
    const part = text.slice(start).replace(/\.?\s*$/, '').replace(/,.*$/s, '');
    if (part === '' || /^\d(?!\/)|[{}'"]/.test(part) || !types.test(text) || /^(?:optional|default|in|shape|length)\b/i.test(part) || part === '1' || !mayStandAlone(part)) continue;
    const result = parseUnit(part, options);
    if (result.ok) return { unit: result.unit, hints: result.hints, span: { start, end: start + part.length }, outer: { start: comma.index, end: start + part.length }, by: 'words' };
  }
  const worded = unitInWords(partOf(type, 0), false, taken, options);
  if (worded) return worded;
  if (types.test(text) || text.length > 30 || !/[/^*²³⁻°·]|\d/.test(text) || /^\d/.test(text)) return undefined;
  const whole = parseUnit(text, options);
  return whole.ok && whole.beyondDoubt ? { unit: whole.unit, hints: whole.hints, span: { start: 0, end: text.length }, outer: { start: 0, end: text.length }, by: 'words' } : undefined;
}
