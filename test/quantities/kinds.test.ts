import { describe, expect, it } from 'vitest';
import { Dimension } from '../../server/src/quantities/dimension.ts';
import { kindsTable } from '../../server/src/quantities/kinds-table.ts';
import { familiarity, kindsOf } from '../../server/src/quantities/kinds.ts';
import { parseUnit } from '../../server/src/quantities/parse-unit.ts';
import { readCoherent } from './catalogue-reader.ts';

function dimensionOf(unit: string): Dimension {
  const result = parseUnit(unit);
  if (!result.ok) throw new Error(`unread: ${unit}`);
  return result.unit.dimension;
}

describe('kinds of quantity', () => {
  it.each([
    ['psi', 'pressure', 'ISO 80000-4'], ['cP', 'dynamic viscosity', 'ISO 80000-4'], ['cSt', 'kinematic viscosity', 'ISO 80000-4'], ['N m', 'torque', 'ISO 80000-4'], ['hp', 'power', 'ISO 80000-4'], ['lb/ft^3', 'density', 'ISO 80000-4'], ['mN/m', 'surface tension', 'ISO 80000-4'],
    ['BTU/(h ft degF)', 'thermal conductivity', 'ISO 80000-5'], ['W/(m^2 K)', 'heat transfer coefficient', 'ISO 80000-5'], ['kJ/(kg K)', 'specific heat capacity', 'ISO 80000-5'], ['m^2 K/W', 'thermal insulance', 'ISO 80000-5'], ['K/W', 'thermal resistance', 'ISO 80000-5'],
    ['mV', 'voltage', 'ISO 80000-6'], ['uF', 'capacitance', 'ISO 80000-6'], ['ohm m', 'resistivity', 'ISO 80000-6'], ['A/m', 'magnetic field strength', 'ISO 80000-6'], ['lx', 'illuminance', 'ISO 80000-7'], ['mol/L', 'concentration', 'ISO 80000-9'], ['g/mol', 'molar mass', 'ISO 80000-9'], ['Gy/s', 'dose rate', 'ISO 80000-10'],
  ])('%s is counted in by %s (%s)', (unit, kind, source) => {
    expect(kindsOf(dimensionOf(unit))).toContain(kind);
    expect(kindsTable.find((part) => part.rows.some((row) => row[1].split(', ').includes(kind)))?.source).toMatch(new RegExp(`^${source}`));
  });

  it('covers at least 100 dimensions, each once and with a source', () => {
    const rows = kindsTable.flatMap((part) => part.rows);
    const whole = rows.filter(([product]) => !product.includes('.'));
    expect(new Set(whole.map(([product]) => readCoherent(product))).size).toBe(whole.length);
    expect(rows.length).toBeGreaterThanOrEqual(100);
    for (const part of kindsTable) expect(part.source).toMatch(/^(?:ISO 80000-\d+|common practice)/);
  });

  it('has no name for a number or for a dimension that nobody uses', () => {
    expect(kindsOf(Dimension.one)).toEqual([]);
    expect(kindsOf(dimensionOf('kg^5 m^7'))).toEqual([]);
  });

  it('orders by how familiar a dimension is', () => {
    expect(familiarity(dimensionOf('m'))).toBeLessThan(familiarity(dimensionOf('Pa')));
    expect(familiarity(dimensionOf('Pa'))).toBeLessThan(familiarity(dimensionOf('1/Pa')));
    expect(familiarity(dimensionOf('m s^2/kg'))).toBeLessThan(familiarity(dimensionOf('kg^5 m^7')));
  });
});
