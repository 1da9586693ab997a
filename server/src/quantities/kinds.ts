/** Which kinds of quantity have a dimension, by the names of ISO 80000. */
import type { Dimension } from './dimension.ts';
import { parseBaseProduct } from './factor.ts';

/** Coherent unit, then the kinds of quantity counted in it; source: ISO 80000-3 to -11 unless marked. */
const table: readonly (readonly [string, string])[] = [
  ['m', 'length'], ['m^2', 'area'], ['m^3', 'volume'], ['s', 'time'], ['kg', 'mass'], ['K', 'temperature'], ['A', 'electric current'], ['mol', 'amount of substance'], ['cd', 'luminous intensity'],
  ['m s^-1', 'speed'], ['m s^-2', 'acceleration'], ['s^-1', 'frequency, angular velocity'], ['s^-2', 'angular acceleration'], ['m^-1', 'wavenumber, curvature'], ['m^-2', 'number per area'], ['m^-3', 'number density'],
  ['m^4', 'second moment of area'], ['m^3 s^-1', 'volume flow rate'], ['kg s^-1', 'mass flow rate'], ['mol s^-1', 'molar flow rate'], ['kg m^-2 s^-1', 'mass flux'], ['mol m^-2 s^-1', 'molar flux'],
  ['kg m^-3', 'density'], ['m^3 kg^-1', 'specific volume'], ['kg m^-2', 'surface density'], ['kg m^-1', 'linear density'], ['kg m s^-1', 'momentum'], ['kg m^2', 'moment of inertia'], ['kg m^2 s^-1', 'angular momentum, action'],
  ['kg m s^-2', 'force'], ['kg s^-2', 'surface tension, stiffness'], ['kg m^-2 s^-2', 'specific weight, pressure gradient'], ['kg m^-1 s^-2', 'pressure, stress'], ['m s^2 kg^-1', 'compressibility'],
  ['kg m^2 s^-2', 'energy, torque'], ['kg m^2 s^-3', 'power, heat flow rate'], ['kg s^-3', 'heat flux'], ['kg m^-1 s^-3', 'power density'], ['kg m s^-3', 'power per length'],
  ['kg m^-1 s^-1', 'dynamic viscosity'], ['m^2 s^-1', 'kinematic viscosity, diffusivity'], ['m^2 s^-2', 'specific energy, squared speed'], ['m^2 s^-3', 'dissipation rate, specific power'],
  ['kg m s^-3 K^-1', 'thermal conductivity'], ['kg s^-3 K^-1', 'heat transfer coefficient'], ['kg^-1 s^3 K', 'thermal insulance'], ['kg^-1 m^-2 s^3 K', 'thermal resistance'], ['kg m^2 s^-3 K^-1', 'thermal conductance'],
  ['m^2 s^-2 K^-1', 'specific heat capacity'], ['kg m^2 s^-2 K^-1', 'heat capacity, entropy'], ['kg m^-1 s^-2 K^-1', 'volumetric heat capacity'], ['K^-1', 'thermal expansion coefficient'], ['K m^-1', 'temperature gradient'], ['K s^-1', 'rate of temperature change'],
  ['kg s^-3 K^-4', 'Stefan-Boltzmann constant'], ['kg m^2 s^-2 mol^-1', 'molar energy'], ['kg m^2 s^-2 K^-1 mol^-1', 'molar heat capacity, gas constant'], ['kg mol^-1', 'molar mass'], ['m^3 mol^-1', 'molar volume'], ['mol m^-3', 'concentration'], ['mol kg^-1', 'molality'], ['mol^-1', 'Avogadro constant'],
  ['mol m^-3 s^-1', 'reaction rate'], ['m^3 mol^-1 s^-1', 'second-order rate constant'], ['kg m^-3 s^-1', 'volumetric mass source'],
  ['A s', 'electric charge'], ['kg m^2 s^-3 A^-1', 'voltage'], ['kg m^2 s^-3 A^-2', 'resistance'], ['kg^-1 m^-2 s^3 A^2', 'conductance'], ['kg^-1 m^-2 s^4 A^2', 'capacitance'], ['kg m^2 s^-2 A^-2', 'inductance'],
  ['kg m^2 s^-2 A^-1', 'magnetic flux'], ['kg s^-2 A^-1', 'magnetic flux density'], ['kg m s^-3 A^-1', 'electric field strength'], ['A m^-1', 'magnetic field strength'], ['A m^-2', 'current density'], ['A m^-3 s', 'charge density'],
  ['kg m^3 s^-3 A^-2', 'resistivity'], ['kg^-1 m^-3 s^3 A^2', 'conductivity'], ['kg^-1 m^-3 s^4 A^2', 'permittivity'], ['kg m s^-2 A^-2', 'permeability'],
  ['kg m^-2 s^-3', 'volumetric flux'], ['s m^-1', 'mass transfer resistance'], ['s^2 m^-1', 'inverse acceleration'], ['m^2 kg^-1', 'mass attenuation'], ['m s kg^-1', 'fluidity'], ['s m^-2', 'inverse diffusivity'], ['s^2 m^-5', 'hydraulic loss coefficient'],
  ['m K', 'Wien displacement'], ['m^-1 s^-1', 'intensity'], ['kg m^2 s^-2 A^-1 m^-1', 'vector potential'], ['m s^-3', 'jerk'], ['m^2 K^-1 s^-2', 'specific entropy'], ['cd m^-2', 'luminance'], ['m^5', 'warping'],
];

let byDimension: Map<Dimension, readonly string[]> | undefined;

/** The kinds of quantity that a dimension may belong to; empty where none is known by name. */
export function kindsOf(dimension: Dimension): readonly string[] {
  byDimension ??= build();
  return byDimension.get(dimension) ?? [];
}

/** How familiar a dimension is: its place in the table, for choosing between two ways to say the same. */
export function familiarity(dimension: Dimension): number {
  const first = kindsOf(dimension)[0];
  const at = first === undefined ? -1 : table.findIndex(([, kinds]) => kinds.startsWith(first));
  return at < 0 ? table.length : at;
}

function build(): Map<Dimension, readonly string[]> {
  const map = new Map<Dimension, readonly string[]>();
  for (const [unit, kinds] of table) {
    const dimension = parseBaseProduct(unit);
    if (!map.has(dimension)) map.set(dimension, kinds.split(', '));
  }
  return map;
}
