import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseUnit } from '../../server/src/quantities/parse-unit.ts';

describe('a unit with a mistake: the characters, the reason, the nearest spelling', () => {
  it.each([
    ['metrs/s', 'metrs', 'unknown-symbol', 'metres/s'],
    ['  metrs^3/s', 'metrs', 'unknown-symbol', 'metres^3/s'],
    ['m/sceond', 'sceond', 'unknown-symbol', 'm/second'],
    ['kg/(m secnd)', 'secnd', 'unknown-symbol', 'kg/(m second)'],
    ['kPPa/m', 'kPPa', 'unknown-symbol', 'kPa/m'],
    ['J/(kg klevin)', 'klevin', 'unknown-symbol', 'J/(kg kelvin)'],
    ['wattts/m^2', 'wattts', 'unknown-symbol', 'watts/m^2'],
    ['kg/m^^3', '^', 'bad-exponent', 'kg/m^3'],
    ['kg/m^', '^', 'bad-exponent', 'kg/m'],
    ['W/(m K', '(', 'missing-bracket', 'W/(m K)'],
    ['J/kg//K', '/', 'unexpected', 'J/kg/K'],
    ['kg/m3)', ')', 'unexpected', 'kg/m3'],
    ['W/(m² K', '(', 'missing-bracket', 'W/(m² K)'],
  ])('%s', (text, characters, kind, suggestion) => {
    const result = parseUnit(text);
    if (result.ok) throw new Error('read');
    expect(text.slice(result.span.start, result.span.end)).toBe(characters);
    expect(result.reason.kind).toBe(kind);
    expect(result.triesToBeUnit).toBe(true);
    expect(result.suggestion).toBe(suggestion);
  });

  it('points at the second caret, the second slash and the open bracket', () => {
    const spanOf = (text: string): unknown => (parseUnit(text) as { span: unknown }).span;
    expect(spanOf('kg/m^^3')).toEqual({ start: 5, end: 6 });
    expect(spanOf('J/kg//K')).toEqual({ start: 5, end: 6 });
    expect(spanOf('W/(m K')).toEqual({ start: 2, end: 3 });
    expect(spanOf('m/:sceond')).toEqual({ start: 0, end: 9 });
  });

  it('points into TeX and superscripts by the original offsets', () => {
    const text = ':math:`\\text{kg}\\cdot\\text{metrs}^{-3}`';
    const result = parseUnit(text);
    if (result.ok) throw new Error('read');
    expect(text.slice(result.span.start, result.span.end)).toBe('metrs');
    const raised = parseUnit('m²/sceond');
    expect(raised).toMatchObject({ ok: false, span: { start: 3, end: 9 }, suggestion: 'm²/second' });
  });

  it('reads what is only wrong in physics, so that the checks can find it', () => {
    for (const text of ['J/kg3', 'W/m⁻²', 'kg/m', 'J/kg^3']) expect(parseUnit(text)).toMatchObject({ ok: true, beyondDoubt: true });
  });
});

describe('remarks with a slash or a power do not try to be units', () => {
  it.each(['mass/m', 'cell/day', 'holes/m2', 'flow/s', 'rate/h', 'x^n', 'm^x', 'T^n', 'boxes/pallet', 'user/day', 'area/volume', 'kg clinker/h', 'width/height', 'east/west', 'm/s + 1', 'car/h', 'frames/bus', 'A^2 + B^2', 'value/m'])('%s', (text) => {
    expect(parseUnit(text)).toMatchObject({ ok: false, triesToBeUnit: false });
  });
});

describe('any text', () => {
  const pieces = fc.constantFrom('kg', 'm', 's', '/', '^', '*', ' ', '(', ')', '-', '2', '⁻²', '\\text{', '}', '$', '\\frac{', '<sup>', '</sup>', '°', 'deg', ' per ', '.', '·', ',', 'metrs', 'C', '_', '1e9', '10^', 'or', '[', ']', '√', 'square ');

  it('never throws, keeps its spans inside the text and its suggestions readable', () => {
    fc.assert(
      fc.property(fc.oneof(fc.string({ maxLength: 60 }), fc.array(pieces, { maxLength: 14 }).map((all) => all.join(''))), (text) => {
        const result = parseUnit(text);
        if (result.ok) {
          for (const hint of result.hints) expect(hint.span.end).toBeLessThanOrEqual(text.length);
          return;
        }
        expect(result.span.start).toBeGreaterThanOrEqual(0);
        expect(result.span.end).toBeLessThanOrEqual(text.length);
        expect(result.span.start).toBeLessThanOrEqual(result.span.end);
        expect(result.triesToBeUnit).toBe(result.suggestion !== undefined);
        if (result.suggestion !== undefined) expect(parseUnit(result.suggestion).ok).toBe(true);
      }),
      { numRuns: 1500 },
    );
  });
});
