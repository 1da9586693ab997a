import { describe, expect, it } from 'vitest';
import { findName, findSymbol, unitOf } from '../../server/src/quantities/lookup.ts';
import { allUnits, prefixesOf, symbolMeasure } from './catalogue-reader.ts';

describe('the lookup agrees with the strict reading of the catalogue', () => {
  it('in every symbol, exactly', () => {
    for (const entry of allUnits) {
      for (const symbol of entry.symbols) {
        const found = findSymbol(symbol);
        const wanted = symbolMeasure(symbol);
        expect(found?.unit.dimension.key, symbol).toBe(wanted?.dimension.key);
        expect(wanted && found?.unit.scale?.equals(wanted.scale), symbol).toBe(true);
      }
    }
  });

  it('in every prefix that an entry allows', () => {
    for (const entry of allUnits.filter((each) => each.prefixes !== 'none')) {
      for (const prefix of prefixesOf(entry)) {
        const text = `${prefix.symbols[0]}${entry.symbols[0]}`;
        const wanted = symbolMeasure(text);
        expect(wanted && findSymbol(text)?.unit.scale?.equals(wanted.scale), text).toBe(true);
      }
    }
  });

  it('in every name, and in its plural', () => {
    for (const entry of allUnits) {
      for (const name of entry.names) expect(findName(name)?.unit.dimension.key, name).toBe(unitOf(entry).dimension.key);
    }
    for (const [plural, singular] of [['feet', 'foot'], ['inches', 'inch'], ['henries', 'henry'], ['metres', 'metre'], ['meters', 'metre'], ['litres', 'litre'], ['liter', 'litre'], ['kilometers', 'kilometre'], ['siemens', 'siemens'], ['hertz', 'hertz'], ['lux', 'lux'], ['feet per second', 'foot per second'], ['inches of mercury', 'inch of mercury']]) {
      expect(findName(plural as string)?.unit.scale?.equals(findName(singular as string)?.unit.scale as never), plural).toBe(true);
    }
  });
});

describe('case and prefixes count', () => {
  it('in symbols, not in names', () => {
    expect(findSymbol('KPa')).toBeUndefined();
    expect(findSymbol('kpa')).toBeUndefined();
    expect(findName('Pascal')).toBeDefined();
    expect(findName('KiloPascals')).toBeDefined();
  });

  it.each(['kmin', 'mft', 'µpsi', 'kK K', 'kkg', 'mmm', 'dadam', '', 'k', 'µ', 'x'.repeat(100)])('%j is no symbol', (text) => {
    expect(findSymbol(text)).toBeUndefined();
  });
});
