import { describe, expect, it } from 'vitest';
import { catalogue, prefixes } from '../../server/src/quantities/catalogue/index.ts';
import type { UnitEntry } from '../../server/src/quantities/catalogue/entry.ts';
import { allUnits, measureOf, prefixesOf, readFactor, symbolMeasure } from './catalogue-reader.ts';

/** What to call an entry in a message. */
const label = (entry: UnitEntry): string => entry.names[0] ?? (entry.symbols[0] as string);

/** Every spelling of prefix plus symbol that the catalogue allows, with the units it may mean. */
function combinations(): Map<string, Set<UnitEntry>> {
  const found = new Map<string, Set<UnitEntry>>();
  for (const entry of allUnits) {
    for (const prefix of prefixesOf(entry)) {
      for (const mark of prefix.symbols) {
        for (const symbol of entry.symbols) {
          const text = mark + symbol;
          found.set(text, (found.get(text) ?? new Set()).add(entry));
        }
      }
    }
  }
  return found;
}

const whole = new Map(allUnits.flatMap((entry) => entry.symbols.map((symbol) => [symbol, entry] as const)));
const combined = combinations();

describe(`catalogue: ${allUnits.length} units, ${whole.size} symbols, ${combined.size} with a prefix`, () => {
  it('holds at least 320 units in families of distinct fields', () => {
    expect(allUnits.length).toBeGreaterThanOrEqual(320);
    expect(new Set(catalogue.map((family) => family.field)).size).toBe(catalogue.length);
  });

  it('gives every unit a symbol, a readable factor, coherent units and a source', () => {
    for (const entry of allUnits) {
      expect(entry.symbols.length, label(entry)).toBeGreaterThan(0);
      expect(measureOf(entry).scale.toNumber(), label(entry)).toBeGreaterThan(0);
      expect(entry.source, label(entry)).toMatch(/SI Brochure|NIST|ISO|IEC|IAU|ITU|CODATA|DIN|ASHRAE|ICAO|IEA|UN |UNESCO|common practice/);
      expect(entry.uncertainty ?? 1, label(entry)).toBeGreaterThan(0);
      if (entry.offset) expect(readFactor(entry.offset.zero).toNumber(), label(entry)).toBeGreaterThan(0);
      if (entry.rotation) expect(entry.of, label(entry)).toMatch(/^(1|s\^-1)$/);
    }
  });

  it('writes symbols without blanks at the ends, operators or brackets, and names in small letters', () => {
    for (const entry of allUnits) {
      for (const symbol of entry.symbols) expect(symbol, label(entry)).toMatch(/^[^\s*^/[\]]+( [^\s*^/[\]]+)?$/);
      for (const name of entry.names) expect(name, label(entry)).toMatch(/^[\p{Ll}\d-]+( [\p{Ll}\d-]+)*$/u);
    }
  });

  it('uses no symbol twice and no name for two units', () => {
    expect(repeated(allUnits.flatMap((entry) => entry.symbols))).toEqual([]);
    expect(repeated(allUnits.flatMap((entry) => entry.names))).toEqual([]);
  });

  it('never lets one prefixed spelling mean two units', () => {
    expect([...combined].filter(([, units]) => units.size > 1).map(([text]) => text)).toEqual([]);
  });

  it('lists every whole symbol that hides a prefixed one', () => {
    const hidden = [...combined].flatMap(([text, [entry]]) => {
      const winner = whole.get(text);
      return winner && entry ? [`${text}: ${label(winner)}, not ${entry.symbols[0]} with a prefix`] : [];
    });
    expect(hidden.sort()).toEqual([
      'Gs: gauss, not s with a prefix',
      'PS: metric horsepower, not S with a prefix',
      'RT: TR, not T with a prefix',
      'cP: cP, not P with a prefix',
      'cSt: cSt, not St with a prefix',
      'fL: footlambert, not L with a prefix',
      'kt: kt, not t with a prefix',
    ]);
  });

  it.each([
    ['min', 'minute'], ['Pa', 'pascal'], ['cd', 'candela'], ['ft', 'foot'], ['nmi', 'nautical mile'], ['dyn', 'dyne'],
    ['kip', 'kip'], ['mol', 'mole'], ['lm', 'lumen'], ['mil', 'mil'], ['hp', 'horsepower'], ['ha', 'hectare'], ['pt', 'pint'],
    ['T', 'tesla'], ['h', 'hour'], ['Gy', 'gray'], ['mb', 'mb'], ['cc', 'cubic centimetre'], ['gal', 'gallon'], ['psi', 'pound per square inch'],
  ])('%s is a whole symbol that no prefix can make', (symbol, name) => {
    expect(label(whole.get(symbol) as UnitEntry)).toBe(name);
    expect(combined.has(symbol)).toBe(false);
  });

  it.each([
    'mmin', 'kh', 'µft', 'kin', 'klb', 'krpm', 'mdeg', 'kha', 'mnmi', 'MBTU', 'cacre', 'kmph', 'mrev', 'kyd', 'ma', 'µt', 'mbit', 'kP', 'krad',
  ].filter((text) => !whole.has(text)))('%s is no unit: no prefix there', (text) => {
    expect(symbolMeasure(text)).toBeUndefined();
  });

  it.each([
    'kPa', 'MPa', 'hPa', 'mm', 'µm', 'μm', 'um', 'nm', 'kg', 'mg', 'mL', 'kWh', 'GWh', 'mAh', 'kVA', 'kvar', 'cP', 'cSt', 'kmol', 'mmol', 'kΩ',
    'kOhm', 'mbar', 'dbar', 'mTorr', 'kcal', 'MeV', 'GHz', 'MJ', 'kJ', 'mV', 'µatm', 'MWe', 'kWp', 'Mt', 'Gt', 'µrad', 'mrad', 'kbit', 'MB', 'kyr', 'Myr', 'daN', 'kPag', 'mbarg', 'mGal', 'msec', 'µsec',
  ])('%s takes its prefix', (text) => {
    expect(symbolMeasure(text)).toBeDefined();
  });

  it('takes symbols that are other things in most scripts as units only where nothing else fits', () => {
    const others = ['in', 'a', 'y', 'b', 'r', 'M', 'G', 'U', 'at', 'ton', 'P', 'St', 'Da', 'We', 'Mx', 'Jy', 'fc', 'kt', 'ct', 'ac', 'AU', 'AF', 'CV', 'RT', 'var', 'den', 'pc', 'ppt', 'Gal', 'u', 'Ly', 'met', 'g_n', 'M_sun', 'cpd', 'gr'];
    expect(others.filter((symbol) => !whole.get(symbol)?.weak)).toEqual([]);
    const units = ['m', 's', 'kn', 'knot', 'VAr', 'cP', 'cSt', 'acre', 'inch', 'ft', 'psi', 'rpm', 'Hz', 'gal', 'lb', 'lbf', 'bar', 'psu', 'dB', 'ppm', 'min', 'h', 'd', 'deg'];
    expect(units.filter((symbol) => whole.get(symbol)?.weak)).toEqual([]);
  });

  it('leaves characteristic numbers and abbreviations alone', () => {
    expect(['Bi', 'Fr', 'Re', 'Pr', 'Nu', 'Gr', 'Ra', 'Pe', 'Le', 'Ec', 'R', 'ADC', 'cv', 'cp', 'Cp', 'cf', 'Eq.', 'ID', 'OD', 'NM', 'PSS'].filter((text) => symbolMeasure(text))).toEqual([]);
  });

  it('reads the spellings that scripts use most', () => {
    const seen = [
      'm', 'm', 'degrees', 'mm', 'Pa', 'dbar', 'K', 's', 'ft', 'rad', '°C', 'kPa', 'sec', 'cfs', '%', '°F', 'deg', 'W', 'kg', 'V', 'C', 'km', 'MPa', 'ppt',
      'A', 'AU', 'Hz', '°', 'cm', 'Psi', 'secs', 'hr', 'hrs', 'mins', 'degC', 'oC', 'psig', 'barg', 'gpm', 'cfm', 'inH2O', 'mmHg', 'lbf', 'lbm', 'lbs', 'rpm',
      'PSI', 'ltr', 'tonne', 'galUK', 'BTU', 'Btu', 'Cal', 'PS', 'knot', 'kn', 'kt', 'nmi', 'Å', 'micron', 'ha', 'acre', 'ac', 'bbl', 'P', 'St', 'Ω', 'VAr', 'lbmol',
      'M', 'eV', 'u', 'Da', 'psu', 'sr', 'cycles', 'turn', 'in', 'in.', 'clo', 'met', 'Np', 'dB', '‰', 'ppb', 'scfm', 'MGD', 'kp', 'torr',
    ];
    expect(seen.filter((symbol) => !symbolMeasure(symbol))).toEqual([]);
  });
});

describe('prefixes', () => {
  it('are the 24 of the SI (SI Brochure, table 7), da and three spellings of micro among them', () => {
    expect(prefixes.map(({ power }) => power)).toEqual([30, 27, 24, 21, 18, 15, 12, 9, 6, 3, 2, 1, -1, -2, -3, -6, -9, -12, -15, -18, -21, -24, -27, -30]);
    expect(prefixes.map(({ symbols }) => symbols[0]).join(' ')).toBe('Q R Y Z E P T G M k h da d c m µ n p f a z y r q');
    expect(prefixes.find(({ name }) => name === 'micro')?.symbols).toEqual(['\u00b5', '\u03bc', 'u']);
  });
});

function repeated(texts: readonly string[]): string[] {
  const seen = new Set<string>();
  return texts.filter((text) => seen.size === seen.add(text).size);
}
