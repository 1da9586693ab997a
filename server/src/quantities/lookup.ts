/** Symbols and names to units: the catalogue, the prefixes, and derived spellings. Built at the first question. */
import { catalogue, prefixes } from './catalogue/index.ts';
import type { UnitEntry } from './catalogue/entry.ts';
import { parseBaseProduct, parseFactor } from './factor.ts';
import { Rational } from './rational.ts';
import { Scale } from './scale.ts';
import type { Unit } from './unit.ts';

export interface Found {
  readonly unit: Unit;
  readonly weak: boolean;
  readonly entry: UnitEntry;
  readonly prefixed: boolean;
}

interface Tables {
  readonly symbols: Map<string, UnitEntry>;
  readonly names: Map<string, UnitEntry>;
  readonly lower: Map<string, string>;
}

let tables: Tables | undefined;
const units = new Map<UnitEntry, Unit>();
const found = new Map<string, Found | undefined>();

/** The unit that a whole symbol stands for, prefix included; case counts. */
export function findSymbol(symbol: string): Found | undefined {
  if (!found.has(symbol)) found.set(symbol, lookSymbol(symbol));
  return found.get(symbol);
}

/** The unit that an English word names, singular or plural, prefix included; case does not count. */
export function findName(word: string): Found | undefined {
  const key = `~${word}`;
  if (!found.has(key)) found.set(key, lookName(word.toLowerCase()));
  return found.get(key);
}

/** The symbol that this one would be in other letters' case: `w` is `W`, `Kg` is `kg`. */
export function otherCase(symbol: string): string | undefined {
  return load().lower.get(symbol.toLowerCase());
}

/** All symbols without prefixes, for the nearest spelling. */
export function knownSymbols(): Iterable<string> {
  return load().symbols.keys();
}

export function knownNames(): Iterable<string> {
  return load().names.keys();
}

function load(): Tables {
  if (tables) return tables;
  tables = { symbols: new Map(), names: new Map(), lower: new Map() };
  for (const family of catalogue) {
    for (const entry of family.units) {
      for (const symbol of entry.symbols) add(tables.symbols, symbol, entry);
      for (const name of entry.names) addName(tables.names, name, entry);
    }
  }
  for (const symbol of ['W', 'kg', 'J', 'kJ', 'Pa', 'kPa', 'MPa', 'kW', 'MW', 'mm', 'm', 'cm', 'km', 'K', 'N', 'kN', 'Hz', 'kHz', 'V', 'mol', 'rpm', 'psi', 'ft', 'bar', 'mbar', 'hPa', 's', 'ms', 'g', 'mg', 'L', 'kcal', 'cal', 'deg', 'rad', 'min', 'lbf', 'lb', 'kWh', 'MJ']) {
    if (!tables.lower.has(symbol.toLowerCase())) tables.lower.set(symbol.toLowerCase(), symbol);
  }
  return tables;
}

function add(map: Map<string, UnitEntry>, key: string, entry: UnitEntry): void {
  const held = map.get(key);
  if (!held || (held.weak && !entry.weak)) map.set(key, entry);
}

function addName(map: Map<string, UnitEntry>, name: string, entry: UnitEntry): void {
  const spellings = [name];
  if (name.includes('metre')) spellings.push(name.replace('metre', 'meter'));
  if (name.includes('litre')) spellings.push(name.replace('litre', 'liter'));
  for (const each of spellings) {
    add(map, each, entry);
    add(map, plural(each), entry);
  }
}

function plural(name: string): string {
  const words = name.split(' ');
  const at = words.findIndex((_, index) => words[index + 1] === 'per' || words[index + 1] === 'of') ;
  const index = at >= 0 ? at : words.length - 1;
  const word = words[index] as string;
  words[index] = word === 'foot' ? 'feet' : /(?:s|x|z|ch|sh|hertz)$/.test(word) ? word : /(?:inch)$/.test(word) ? `${word}es` : /[^aeo]y$/.test(word) ? `${word.slice(0, -1)}ies` : `${word}s`;
  if (word === 'inch') words[index] = 'inches';
  return words.join(' ');
}

function lookSymbol(symbol: string): Found | undefined {
  const { symbols } = load();
  const whole = symbols.get(symbol);
  if (whole) return { unit: unitOf(whole), weak: whole.weak === true, entry: whole, prefixed: false };
  for (const prefix of prefixes) {
    for (const mark of prefix.symbols) {
      if (!symbol.startsWith(mark) || symbol.length === mark.length) continue;
      const entry = symbols.get(symbol.slice(mark.length));
      if (entry && allows(entry, prefix.power)) return { unit: prefixed(entry, prefix.power, symbol), weak: entry.weak === true, entry, prefixed: true };
    }
  }
  return undefined;
}

function lookName(word: string): Found | undefined {
  const { names } = load();
  const whole = names.get(word);
  if (whole) return { unit: unitOf(whole), weak: whole.weak === true, entry: whole, prefixed: false };
  for (const prefix of prefixes) {
    const entry = word.startsWith(prefix.name) ? names.get(word.slice(prefix.name.length)) : undefined;
    if (entry && allows(entry, prefix.power)) return { unit: prefixed(entry, prefix.power, word), weak: false, entry, prefixed: true };
  }
  return undefined;
}

function allows(entry: UnitEntry, power: number): boolean {
  return entry.prefixes === 'all' || (entry.prefixes === 'large' && power > 0) || (entry.prefixes === 'small' && power < 0);
}

function prefixed(entry: UnitEntry, power: number, text: string): Unit {
  const { offset, ...unit } = unitOf(entry);
  void offset;
  const factor = Scale.of(power >= 0 ? Rational.of(10n ** BigInt(power)) : Rational.of(1n, 10n ** BigInt(-power)));
  return { ...unit, scale: unit.scale?.mul(factor), text };
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

function build(entry: UnitEntry): Unit {
  const exact = parseFactor(entry.factor);
  const scale = entry.uncertainty === undefined ? exact : Scale.measuredAs(exact.toNumber(), entry.uncertainty);
  const zero = entry.offset && Rational.parse(entry.offset.zero);
  const one = Rational.one;
  const none = Rational.zero;
  return {
    dimension: parseBaseProduct(entry.of), scale, text: entry.symbols[0] as string,
    ...(entry.offset && zero ? { offset: { kind: entry.offset.kind, zero } } : {}),
    ...(entry.rotation === 'radian' ? { rotation: { radian: one, cycle: none } } : entry.rotation === 'cycle' ? { rotation: { radian: none, cycle: one } } : {}),
    ...(entry.level ? { level: true } : {}),
  };
}
