/** One symbol or name of a unit expression, at an offset of plain text: which unit it is, and where it ends. */
import { otherCase, standsAlone } from './unit-case.ts';
import { compoundsOf, compoundUnit, type Found, findName, findSymbol } from './lookup.ts';
import { Dimension } from './dimension.ts';
import type { Sureness } from './unit-factor.ts';
import { isFormula, isLabel } from './unit-labels.ts';
import type { UnitHint, Vocabulary } from './unit-result.ts';
import { distinct, everyday, never } from './unit-vocabulary.ts';
import type { Unit } from './unit.ts';

/** What stands at an offset; a power behind it goes to the last part. */
export interface SymbolFound {
  readonly end: number;
  readonly parts: readonly SymbolPart[];
}

export interface SymbolPart {
  readonly unit: Unit;
  readonly text: string;
  readonly sure: Sureness;
  readonly open?: 'C' | 'F' | 'R';
  readonly hint?: UnitHint['kind'];
}

/** What the reader has met before the symbol. */
export interface SymbolContext {
  readonly vocabulary: Vocabulary | undefined;
  readonly below: boolean;
  /** Nothing stands before it. */
  readonly first: boolean;
}

const word = /[\p{L}°º℃℉%‰％℧′″☉⊕€£$_]+|#(?=\s*\/)/uy;
const wordWithDigits = /[\p{L}°º℃℉%‰％℧′″☉⊕€£$_]+(?:\d+[\p{L}_]+)*\d*|#(?=\s*\/)/uy;

/** The symbol or name that begins at an offset; undefined where none is known. */
export function symbolAt(text: string, at: number, context: SymbolContext): SymbolFound | undefined {
  const plain = match(word, text, at);
  if (plain === undefined) return undefined;
  const whole = match(wordWithDigits, text, at) as string;
  return (
    own(whole, plain, at, context.vocabulary) ??
    degree(text, at) ??
    compound(text, at, plain) ??
    column(text, at) ??
    numbered(whole, plain, at) ??
    dotted(text, at, plain) ??
    letter(text, at, plain) ??
    together(text, at, plain, context, true) ??
    plainUnit(plain, at) ??
    labelled(whole, plain, at) ??
    (standsAlone(plain) ? otherLetters(plain, at) : undefined) ??
    together(text, at, plain, context, false) ??
    otherLetters(plain, at) ??
    step(text, at, plain)
  );
}

/** Whether the letters are a unit of the catalogue that is no everyday word. */
export function isKnownWord(text: string): boolean {
  return findSymbol(text)?.weak === false || findName(text)?.weak === false;
}

/** The unbroken letters that stand at an offset: what a fault points at. */
export function wordAt(text: string, at: number): string {
  return match(wordWithDigits, text, at) ?? text[at] ?? '';
}

function match(pattern: RegExp, text: string, at: number): string | undefined {
  pattern.lastIndex = at;
  return pattern.exec(text)?.[0];
}

function one(end: number, unit: Unit, text: string, sure: Sureness, more: Partial<SymbolPart> = {}): SymbolFound {
  return { end, parts: [{ unit, text, sure, ...more }] };
}

/** A unit of the project's own vocabulary, singular or plural. */
function own(whole: string, plain: string, at: number, vocabulary: Vocabulary | undefined): SymbolFound | undefined {
  if (!vocabulary || vocabulary.units.size === 0) return undefined;
  for (const each of whole === plain ? [plain] : [whole, plain]) {
    const unit = vocabulary.units.get(each) ?? (each.endsWith('s') ? vocabulary.units.get(each.slice(0, -1)) : undefined);
    if (unit) return one(at + each.length, unit, each, each.length < 3 ? 'word' : 'sure');
  }
  return undefined;
}

const degrees = /(?:deg(?:ree)?s?\.?|°|º)[\s_-]*(cel[sc]ius|centigrade|fahrenheit|rankine|kelvins?|[cfkr])(?![\p{L}])/iuy;
const scales: Readonly<Record<string, string>> = { c: 'degC', f: 'degF', r: 'degR', k: 'K' };
const scaleNames = /(cel[sc]ius|centigrade|fahrenheit|rankine)(?:\s+degrees?)?(?!\p{L})/iuy;
/** Heating and cooling degree-days: of which degree, the house decides. */
const degreeTimes = /deg(?:ree)?[\s-](?:days?|hours?)(?!\p{L})/iuy;
const compass = /[°º][NSEW](?![\p{L}\d])/uy;

/** `deg C`, `degrees Celsius`, `°F`, `Celsius degree`; `°N` is an angle. */
function degree(text: string, at: number): SymbolFound | undefined {
  degrees.lastIndex = at;
  scaleNames.lastIndex = at;
  const found = degrees.exec(text) ?? scaleNames.exec(text);
  if (found) {
    const symbol = scales[(found[1] as string)[0]?.toLowerCase() ?? ''] as string;
    const unit = findSymbol(symbol)?.unit;
    return unit && one(at + found[0].length, unit, symbol, 'sure');
  }
  const days = match(degreeTimes, text, at);
  if (days !== undefined) return one(at + days.length, { dimension: Dimension.base('Θ').mul(Dimension.base('T')), scale: undefined, text: days }, days, 'sure');
  if (match(compass, text, at) === undefined) return undefined;
  const angle = findSymbol('deg')?.unit;
  return angle && one(at + 2, angle, 'deg', 'sure');
}

/** Spellings of several words; one with a hyphen that a power follows is a product instead: `lb-ft^2`. */
function compound(text: string, at: number, plain: string): SymbolFound | undefined {
  for (const each of compoundsOf(plain.replace(/%$/, '') || plain)) {
    const end = at + each.text.length;
    const typed = text.slice(at, end);
    if (typed !== each.text && !(each.named && typed.toLowerCase() === each.text)) continue;
    const next = text.slice(end, end + 2);
    if (each.text.includes(' per ') && (/^\s+(?:squared|cubed)/i.test(text.slice(end)) || /(?:square|cubic|sq\.?|cu\.?)\s+$/i.test(text.slice(0, at)))) continue;
    if (/^[\p{L}_]/u.test(next) || (each.text.includes('-') && /^(?:[\^²³\d]|[-+]\d)/.test(next))) continue;
    const { unit, weak } = compoundUnit(each);
    const phrase = each.named && !/ (?:per|of) | (?:gauge|gage|absolute)$/.test(each.text) && !each.text.endsWith('s');
    return one(end, unit, each.entry.symbols[0] as string, weak && each.text.length < 5 ? 'weak' : phrase ? 'word' : 'sure');
  }
  return undefined;
}

const columns = /(in|inch|inches|ft|feet|mm|cm)\.?\s+(?:of\s+)?(water|mercury|hg|h2o|w\.?g\.?|w\.?c\.?)(?![\p{L}\d])/iuy;

/** `in. w.g.`, `ft of water`, `mm of mercury`. Millimetres of water may be a depth of rain, and are left unread. */
function column(text: string, at: number): SymbolFound | undefined {
  columns.lastIndex = at;
  const match = columns.exec(text);
  if (!match) return undefined;
  const [whole, length = '', liquid = ''] = match;
  const mercury = /^(?:mercury|hg)$/i.test(liquid);
  if (!mercury && /^[mc]m$/i.test(length)) return undefined;
  const symbol = `${length.toLowerCase().replace(/^inch(?:es)?$/, 'in').replace('feet', 'ft')}${mercury ? 'Hg' : 'H2O'}`;
  const unit = findSymbol(symbol)?.unit;
  return unit && one(at + whole.length, unit, symbol, 'sure');
}

/** `inH2O`, `Nm3`: a digit inside a symbol of the catalogue. */
function numbered(whole: string, plain: string, at: number): SymbolFound | undefined {
  if (whole === plain) return undefined;
  const found = findSymbol(whole);
  return found && one(at + whole.length, found.unit, whole, found.weak ? 'weak' : 'sure');
}

/** `in.`, `ft.`: an abbreviation's point, where nothing follows it. */
function dotted(text: string, at: number, plain: string): SymbolFound | undefined {
  const end = at + plain.length;
  if (text[end] !== '.' || /[\p{L}\d(]/u.test(text[end + 1] ?? '')) return undefined;
  const found = findSymbol(`${plain}.`);
  return found && one(end + 1, found.unit, plain, 'word');
}

/** C, F, R: coulomb, farad, nothing; or degrees, as the other factors and the description say. `M^2` is a square metre. */
function letter(text: string, at: number, plain: string): SymbolFound | undefined {
  if (plain === 'M' && /^\^?\(?[23]/.test(text.slice(at + 1))) return one(at + 1, (findSymbol('m') as Found).unit, 'm', 'word', { hint: 'case' });
  if (plain !== 'C' && plain !== 'F' && plain !== 'R') return undefined;
  const unit = findSymbol(plain === 'R' ? 'degR' : plain)?.unit;
  return unit && one(at + 1, unit, plain, 'word', { open: plain });
}

function plainUnit(plain: string, at: number): SymbolFound | undefined {
  if (never.has(plain)) return undefined;
  const found = findSymbol(plain) ?? (plain.length > 1 ? findName(plain) : undefined);
  return found && one(at + plain.length, found.unit, plain, sureness(found, plain));
}

function sureness(found: Found, plain: string): Sureness {
  if (found.weak) return 'weak';
  if (/[^\x20-\x7f]|%/.test(plain)) return 'sure';
  if (plain.length < 3) return distinct.has(plain) ? 'sure' : 'word';
  if (found.named && !found.prefixed && plain[0] !== plain[0]?.toLowerCase() && plain.toLowerCase() !== 'kelvin') return everyday.has(plain.toLowerCase()) ? 'word' : 'sure';
  return everyday.has(plain) ? 'word' : 'sure';
}

/** `gC`, `umolCO2`, `kg_air`, `degrees_north`: a substance glued to the unit is a label. */
function labelled(whole: string, plain: string, at: number): SymbolFound | undefined {
  const bar = whole.indexOf('_');
  if (bar > 0) {
    const found = findSymbol(whole.slice(0, bar)) ?? findName(whole.slice(0, bar));
    const label = whole.slice(bar + 1);
    const known = label.split('_').every((each) => isLabel(each) || isFormula(each));
    return found && !found.weak && known ? one(at + whole.length, found.unit, whole, bar < 2 ? 'word' : 'sure') : undefined;
  }
  for (const typed of whole === plain ? [plain] : [whole, plain]) {
    for (let cut = typed.length - 1; cut > 0; cut--) {
      if (!isFormula(typed.slice(cut))) continue;
      const found = findSymbol(typed.slice(0, cut));
      if (found && !found.weak && isSubstance(found.unit)) return one(at + typed.length, found.unit, typed, 'sure');
    }
  }
  return undefined;
}

/** Whether a unit counts a mass or an amount. */
export function isSubstance({ dimension }: Unit): boolean {
  return dimension === Dimension.base('M') || dimension === Dimension.base('N');
}

/** Symbols that are run together with others. */
const pieces = new Set(['m', 'mm', 'cm', 'km', 'nm', 's', 'h', 'hr', 'd', 'g', 'kg', 'mg', 'N', 'kN', 'Pa', 'kPa', 'MPa', 'mPa', 'J', 'kJ', 'MJ', 'W', 'kW', 'MW', 'mW', 'K', 'mol', 'kmol', 'mmol', 'umol', 'µmol', 'μmol', 'V', 'A', 'L', 'ft', 'lb', 'BTU', 'Btu', 'sr', 'ha', 'yr', 'cal', 'kcal', 'lm', 'cd']);
const usualTogether = /^(?:[kMGmcµμun]?N(?:m|mm|cm|s)|[mkµμu]?Pas|Vs|Js|[kM]?Wm|Nms)$/;
const powerBehind = /(?:\^|[-+]?\d)/y;

/**
 * `Wm-2`, `J/kgK`, `kNm`: symbols run together. At first only those that habit reads so although they are a symbol of
 * their own: `ms-1` is metre per second, `W/mK` metre kelvin, `kg/ms` metre second, `kgm-3` kilogram metre.
 */
function together(text: string, at: number, plain: string, context: SymbolContext, habitual: boolean): SymbolFound | undefined {
  if (plain.length < 2 || plain.length > 8) return undefined;
  const end = at + plain.length;
  const powered = match(powerBehind, text, end) !== undefined;
  if (habitual) {
    const habit = (plain === 'ms' && context.first && /^\^?\(?-[12](?!\d)/.test(text.slice(end))) || (plain === 'kgm' && powered) || (plain === 'mK' && context.below && !powered) || (plain === 'ms' && context.below && /^\s*kg\s*\/\s*$/.test(text.slice(0, at)));
    const split = habit ? splitUp(plain) : undefined;
    return split && { end, parts: split.map((each) => ({ ...each, hint: 'prefix-or-product' as const })) };
  }
  if (!powered && !context.below && !usualTogether.test(plain)) return undefined;
  const split = splitUp(plain);
  return split && { end, parts: split.map((each) => (powered || usualTogether.test(plain) ? each : { ...each, hint: 'prefix-or-product' as const })) };
}

function splitUp(plain: string): readonly SymbolPart[] | undefined {
  for (let cut = plain.length - 1; cut > 0; cut--) {
    const first = plain.slice(0, cut);
    if (!pieces.has(first)) continue;
    const rest = plain.slice(cut);
    const others = pieces.has(rest) ? [partOf(rest)] : rest.length > 1 ? splitUp(rest) : undefined;
    if (others) return [partOf(first), ...others];
  }
  return undefined;
}

function partOf(symbol: string): SymbolPart {
  return { unit: (findSymbol(symbol) as Found).unit, text: symbol, sure: 'sure' };
}

/** `w` for `W`, `Kg` for `kg`. */
function otherLetters(plain: string, at: number): SymbolFound | undefined {
  const cased = never.has(plain) ? undefined : otherCase(plain);
  const unit = cased === undefined ? undefined : findSymbol(cased)?.unit;
  return unit && one(at + plain.length, unit, cased as string, 'word', { hint: 'case' });
}

const steps = /(?:time[\s_-]?steps?|steps?|timesteps?|dt|Δt)(?!\p{L})/iuy;
const digital = /^(?:LSB|lsb|digit|digits|tick|ticks)$/;

/** `mm/step`, `rad/s/LSB`: a size that only the data know. */
function step(text: string, at: number, plain: string): SymbolFound | undefined {
  const time = match(steps, text, at);
  if (time !== undefined) return one(at + time.length, { dimension: Dimension.base('T'), scale: undefined, text: time }, time, 'weak');
  return digital.test(plain) ? one(at + plain.length, { dimension: Dimension.one, scale: undefined, text: plain }, plain, 'weak') : undefined;
}

