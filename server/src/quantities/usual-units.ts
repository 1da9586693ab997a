/**
 * Units that engineers write for the usual kinds of quantity, the commonest first; common practice. Every spelling of a row has the
 * dimension of the first. Which kinds a dimension may belong to is in `kinds-table.ts`.
 */
import type { Dimension } from './dimension.ts';
import { parseUnit } from './parse-unit.ts';

export const usualUnits: readonly (readonly string[])[] = [
  ['1', '%', 'ppm', 'rad', 'deg', 'dB'],
  ['m', 'mm', 'cm', 'km', 'um', 'in', 'ft', 'mi'],
  ['m^2', 'mm^2', 'cm^2', 'ft^2', 'in^2', 'ha'],
  ['m^3', 'L', 'mL', 'cm^3', 'ft^3', 'gal'],
  ['s', 'min', 'h', 'd', 'ms', 'a'],
  ['kg', 'g', 'mg', 't', 'lb', 'oz'],
  ['K', 'degC', 'degF', 'degR'],
  ['mol', 'kmol', 'mmol'],
  ['A', 'mA', 'kA'],
  ['cd'],
  ['m/s', 'km/h', 'mm/s', 'ft/s', 'mph', 'kn'],
  ['m/s^2', 'ft/s^2'],
  ['1/s', 'Hz', 'kHz', 'rpm', 'rad/s', 'rev/s', '1/h'],
  ['rad/s^2'],
  ['kg/m^3', 'g/cm^3', 'kg/L', 'lb/ft^3'],
  ['m^3/kg', 'ft^3/lb'],
  ['kg/s', 'kg/h', 'g/s', 't/h', 'lb/h'],
  ['m^3/s', 'm^3/h', 'L/s', 'L/min', 'gpm', 'cfm'],
  ['mol/s', 'kmol/h'],
  ['N', 'kN', 'MN', 'lbf', 'kgf'],
  ['N/m', 'kN/m', 'N/mm', 'lbf/ft'],
  ['Pa', 'kPa', 'MPa', 'GPa', 'bar', 'mbar', 'psi', 'atm', 'mmHg', 'inH2O', 'N/mm^2'],
  ['J', 'kJ', 'MJ', 'kWh', 'N m', 'kN m', 'BTU', 'cal', 'ft lbf'],
  ['W', 'kW', 'MW', 'hp', 'BTU/h'],
  ['Pa s', 'mPa s', 'cP', 'kg/(m s)'],
  ['m^2/s', 'mm^2/s', 'cSt', 'cm^2/s'],
  ['J/kg', 'kJ/kg', 'BTU/lb'],
  ['J/(kg K)', 'kJ/(kg K)', 'BTU/(lb degR)'],
  ['J/K', 'kJ/K'],
  ['J/mol', 'kJ/mol'],
  ['J/(mol K)'],
  ['W/(m K)', 'BTU/(h ft degR)'],
  ['W/(m^2 K)', 'kW/(m^2 K)', 'BTU/(h ft^2 degR)'],
  ['W/K', 'kW/K'],
  ['K/W'],
  ['m^2 K/W'],
  ['W/m^2', 'kW/m^2', 'BTU/(h ft^2)'],
  ['W/m^3'],
  ['W/m'],
  ['W/(m^2 K^4)'],
  ['K/m'],
  ['1/K'],
  ['1/m', '1/mm'],
  ['Pa/m', 'kPa/m', 'bar/m'],
  ['1/Pa'],
  ['m^4', 'mm^4', 'in^4'],
  ['kg m^2'],
  ['kg/m', 'g/m'],
  ['kg/m^2'],
  ['kg/mol', 'g/mol'],
  ['mol/m^3', 'mol/L'],
  ['kg m/s'],
  ['V', 'mV', 'kV'],
  ['ohm', 'kohm'],
  ['C', 'A h'],
  ['F', 'uF', 'nF'],
  ['H', 'mH'],
  ['T', 'mT'],
  ['Wb'],
  ['V/m', 'kV/m'],
  ['S/m'],
  ['ohm m'],
  ['A/m'],
  ['A/m^2', 'A/mm^2'],
];

let byDimension: ReadonlyMap<Dimension, readonly string[]> | undefined;

/** The usual units of a dimension, the commonest first; empty where none is listed. */
export function usualUnitsOf(dimension: Dimension): readonly string[] {
  byDimension ??= new Map(usualUnits.flatMap((row) => {
    const first = parseUnit(row[0] as string);
    return first.ok ? [[first.unit.dimension, row] as const] : [];
  }));
  return byDimension.get(dimension) ?? [];
}
