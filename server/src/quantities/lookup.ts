/** Symbols and names to units: the catalogue, the prefixes, and derived spellings. Built at the first question, entry by entry as asked for. */
import { catalogue, prefixes } from './catalogue/index.ts';
import type { PrefixEntry, UnitEntry } from './catalogue/entry.ts';
import { parseBaseProduct, parseFactor } from './factor.ts';
import { Rational } from './rational.ts';
import { Scale } from './scale.ts';
import { spellingsOf } from './unit-names.ts';
import type { Unit } from './unit.ts';

export interface Found {
  readonly unit: Unit;
  /** Read only where nothing else fits. */
  readonly weak: boolean;
  readonly entry: UnitEntry;
  readonly prefixed: boolean;
  /** Found by its full English name. */
  readonly named: boolean;
}

/** A spelling of several words, `deg C`, `ft-lbf`, `inches of mercury`; names are in small letters. */
export interface Compound {
  readonly text: string;
  readonly entry: UnitEntry;
  readonly named: boolean;
}

interface Tables {
  readonly symbols: Map<string, UnitEntry>;
  readonly names: Map<string, UnitEntry>;
  /** By the first word in small letters, the longest first. */
  readonly compounds: Map<string, Compound[]>;
}

/** What parts a spelling into words; a stop at the very end does not. */
const separator = /[\s.-](?=.)/;
let tables: Tables | undefined;
const units = new Map<UnitEntry, Unit>();
/** Grows with the distinct spellings met. */
const found = new Map<string, Found | undefined>();
const prefixMarks = new Map(prefixes.flatMap((prefix) => prefix.symbols.map((mark) => [mark, prefix] as const)));

/** The unit that a whole symbol stands for, prefix included; case counts. */
export function findSymbol(symbol: string): Found | undefined {
  let known = found.get(symbol);
  if (known === undefined && !found.has(symbol)) {
    known = symbol.length > 24 ? undefined : lookSymbol(symbol);
    remember(symbol, known);
  }
  return known;
}

/** The unit that an English word names, singular or plural, prefix included; case does not count. */
export function findName(word: string): Found | undefined {
  const key = `~${word}`;
  if (found.has(key)) return found.get(key);
  const known = word.length > 60 ? undefined : lookName(word.toLowerCase());
  remember(key, known);
  return known;
}

/** Spellings of several words that begin with this word, the longest first. */
export function compoundsOf(first: string): readonly Compound[] {
  return load().compounds.get(first.toLowerCase()) ?? [];
}

/** The unit of a compound. */
export function compoundUnit(compound: Compound): Found {
  return { unit: unitOf(compound.entry), weak: compound.entry.weak === true, entry: compound.entry, prefixed: false, named: compound.named };
}

/** All symbols, without prefixes, of units that are never mistaken for other things. */
export function knownSymbols(): readonly string[] {
  return [...load().symbols].flatMap(([symbol, entry]) => (entry.weak ? [] : [symbol]));
}

/** All names of one word, plurals included, of units that are never mistaken for other things. */
export function knownNames(): readonly string[] {
  return [...load().names].flatMap(([name, entry]) => (entry.weak || name.includes(' ') ? [] : [name]));
}

/** The unit of a catalogue entry. */
export function unitOf(entry: UnitEntry): Unit {
  let unit = units.get(entry);
  if (!unit) {
    unit = build(entry);
    units.set(entry, unit);
  }
  return unit;
}

function remember(key: string, value: Found | undefined): void {
  if (found.size > 50000) found.clear();
  found.set(key, value);
}

function load(): Tables {
  if (tables) return tables;
  const made: Tables = { symbols: new Map(), names: new Map(), compounds: new Map() };
  for (const family of catalogue) {
    for (const entry of family.units) {
      for (const symbol of entry.symbols) add(made, made.symbols, symbol, entry, false);
      for (const name of entry.names) for (const spelling of spellingsOf(name)) add(made, made.names, spelling, entry, true);
    }
  }
  for (const list of made.compounds.values()) list.sort((a, b) => b.text.length - a.text.length);
  tables = made;
  return made;
}

function add({ compounds }: Tables, map: Map<string, UnitEntry>, key: string, entry: UnitEntry, named: boolean): void {
  const held = map.get(key);
  if (held && !(held.weak && !entry.weak)) return;
  map.set(key, entry);
  const cut = key.search(separator);
  if (cut < 0) return;
  const word = key.slice(0, cut).toLowerCase();
  const list = compounds.get(word);
  if (list) list.push({ text: key, entry, named });
  else compounds.set(word, [{ text: key, entry, named }]);
}

function lookSymbol(symbol: string): Found | undefined {
  const { symbols } = load();
  const whole = symbols.get(symbol);
  if (whole) return { unit: unitOf(whole), weak: whole.weak === true, entry: whole, prefixed: false, named: false };
  for (const length of symbol.startsWith('da') ? [2, 1] : [1]) {
    const prefix = prefixMarks.get(symbol.slice(0, length));
    const entry = prefix && symbols.get(symbol.slice(length));
    if (prefix && entry && allows(entry, prefix)) return { unit: prefixed(entry, prefix, symbol), weak: entry.weak === true, entry, prefixed: true, named: false };
  }
  return undefined;
}

function lookName(word: string): Found | undefined {
  const { names } = load();
  const whole = names.get(word);
  if (whole) return { unit: unitOf(whole), weak: whole.weak === true, entry: whole, prefixed: false, named: true };
  for (const prefix of prefixes) {
    const entry = word.startsWith(prefix.name) ? names.get(word.slice(prefix.name.length).replace(/^-/, '')) : undefined;
    if (entry && allows(entry, prefix)) return { unit: prefixed(entry, prefix, word), weak: entry.weak === true, entry, prefixed: true, named: true };
  }
  return undefined;
}

function allows(entry: UnitEntry, prefix: PrefixEntry): boolean {
  return entry.prefixes === 'all' || (entry.prefixes === 'large' && prefix.power > 0) || (entry.prefixes === 'small' && prefix.power < 0);
}

function prefixed(entry: UnitEntry, { power }: PrefixEntry, text: string): Unit {
  const unit = unitOf(entry);
  return { ...unit, scale: unit.scale?.mul(Scale.of(Rational.of(10).pow(power))), text };
}

function build(entry: UnitEntry): Unit {
  const exact = parseFactor(entry.factor);
  const scale = entry.uncertainty === undefined ? exact : Scale.measuredAs(exact.toNumber(), entry.uncertainty);
  const zero = entry.offset && Rational.parse(entry.offset.zero);
  const [one, none] = [Rational.one, Rational.zero];
  const rotation = entry.rotation === 'radian' ? { radian: one, cycle: none } : { radian: none, cycle: one };
  return {
    dimension: parseBaseProduct(entry.of), scale, text: entry.symbols[0] as string,
    ...(entry.offset && zero ? { offset: { kind: entry.offset.kind, zero } } : {}),
    ...(entry.rotation ? { rotation } : {}),
    ...(entry.level ? { level: true } : {}),
  };
}
