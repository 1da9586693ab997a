import { describe, expect, it } from 'vitest';
import { parseUnit } from '../../server/src/quantities/parse-unit.ts';

/** `characters kind: spelling` for each hint of a text. */
function hints(text: string, describes?: string): string[] {
  const result = parseUnit(text, describes === undefined ? {} : { describes });
  if (!result.ok) throw new Error(`unread: ${text}`);
  return result.hints.map((hint) => `${text.slice(hint.span.start, hint.span.end)} ${hint.kind}: ${hint.readAs}`);
}

describe('a reading that depends on convention says which one was taken', () => {
  it.each([
    ['kg/m^2 s', ['kg/m^2 s product-after-slash: kg/(m^2 s)']],
    ['W/m-K', ['W/m-K product-after-slash: W/(m K)']],
    ['kJ/kg.K', ['kJ/kg.K product-after-slash: kJ/(kg K)']],
    ['W/m²⋅K', ['W/m²⋅K product-after-slash: W/(m^2 K)']],
    ['kg/m*s', ['kg/m*s product-after-slash: kg s/m']],
    ['w/m2', ['w case: W/m2']],
    ['J/Kg', ['Kg case: J/kg']],
    ['M^2', ['M case: m^2']],
    ['W/m2/C', ['C celsius-or-coulomb: W/m2/degC']],
    ['BTU/(hr F)', ['F fahrenheit-or-farad: BTU/(hr degF)']],
    ['BTU/(lbm R)', ['R rankine-or-gas: BTU/(lbm degR)']],
    ['W/mK', ['mK prefix-or-product: W/(m K)']],
    ['ms-1', ['ms prefix-or-product: m/s']],
    ['lb/in2', ['lb pound-mass-or-force: lbm/in^2']],
  ])('%s', (text, wanted) => {
    expect(hints(text)).toEqual(wanted);
  });

  it('decides C, F and R by the description', () => {
    expect(hints('C', 'T_oil of the bath')).toEqual(['C celsius-or-coulomb: degC']);
    expect(hints('F', 'surface temperature')).toEqual(['F fahrenheit-or-farad: degF']);
    expect(hints('R', 'T')).toEqual(['R rankine-or-gas: degR']);
    expect(hints('C', 'charge of the ion')).toEqual([]);
  });

  it('keeps the author’s other symbols and puts every letter right at once', () => {
    expect(hints('w/m2/C')).toEqual(['w case: W/m2/degC', 'C celsius-or-coulomb: W/m2/degC']);
    expect(hints('W/m-C')).toEqual(['W/m-C product-after-slash: W/(m degC)', 'C celsius-or-coulomb: W/(m degC)']);
  });

  it('asks about min only where a minimum is spoken of', () => {
    expect(hints('min', 'h_min, minimum level')).toEqual(['min minute-or-minimum: minute']);
    expect(hints('min', 'duration')).toEqual([]);
  });
});

describe('what is said without doubt needs no hint', () => {
  it.each(['kg/(m^2 s)', 'W/(m K)', 'W/m/K', 'W m-1 K-1', 'kg/m^3', 'm*K/W', 'degC', 'J/(kg K)', 'Wm-2', 'mol m-2s-1', 'N m', 'kPa', 'm/s', 'radians per second', 'joules per kilogram kelvin', 'N m^2/C^2', 'C/kg', 'F/m', 'lb/ft3', 'min'])('%s', (text) => {
    expect(hints(text)).toEqual([]);
  });
});

describe('the spelling that a hint offers', () => {
  it.each(['kg/m^2 s', 'W/m-K', 'kg/m*s', 'w/m2', 'J/Kg', 'W/m2/C', 'W/m-C', 'W/mK', 'ms-1', 'BTU/hr-ft2-F', 'hr-ft2-F/BTU', 'kJ/kg.K', 'J/kgK', 'ft/sec-F', 'M^2', 'kg/ms', 'lb/in2', '$W/m \\cdot K$', 'gC/m2 s'])('of %s reads as the same unit, without that hint', (text) => {
    const first = parseUnit(text);
    if (!first.ok) throw new Error('unread');
    const again = parseUnit(first.hints[0]?.readAs as string);
    if (!again.ok) throw new Error(`unread: ${first.hints[0]?.readAs}`);
    expect(again.unit.dimension.key).toBe(first.unit.dimension.key);
    expect(again.unit.scale?.equals(first.unit.scale as never)).toBe(true);
    expect(again.hints).toEqual([]);
  });
});
