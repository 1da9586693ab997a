/** Kinds of quantity by coherent unit. Data only. */

export interface KindsOfPart {
  /** Where the names come from. */
  readonly source: string;
  /** Product of base units, then the kinds counted in it, separated by commas, the most usual first. */
  readonly rows: readonly (readonly [product: string, kinds: string])[];
}

/** The more familiar parts and rows stand first: the order says how familiar a dimension is. */
export const kindsTable: readonly KindsOfPart[] = [
  { source: 'ISO 80000-3, space and time', rows: [
    ['m', 'length'], ['m^2', 'area'], ['m^3', 'volume'], ['s', 'time'], ['m s^-1', 'speed'], ['m s^-2', 'acceleration'], ['s^-1', 'frequency, angular velocity'], ['s^-2', 'angular acceleration'], ['m^-1', 'wavenumber, curvature'], ['m s^-3', 'jerk'],
  ] },
  { source: 'ISO 80000-4, mechanics', rows: [
    ['kg', 'mass'], ['kg m s^-2', 'force'], ['kg m^-1 s^-2', 'pressure, stress'], ['kg m^2 s^-2', 'energy, torque'], ['kg m^2 s^-3', 'power, heat flow rate'], ['kg m^-3', 'density'], ['m^3 s^-1', 'volume flow rate'], ['kg s^-1', 'mass flow rate'],
    ['kg m^-1 s^-1', 'dynamic viscosity'], ['m^2 s^-1', 'kinematic viscosity, diffusivity'], ['kg s^-2', 'surface tension, stiffness'], ['m^3 kg^-1', 'specific volume'], ['kg m^-2', 'surface density'], ['kg m^-1', 'linear density'],
    ['kg m s^-1', 'momentum, impulse'], ['kg m^2', 'moment of inertia'], ['kg m^2 s^-1', 'angular momentum, action'], ['m^4', 'second moment of area'], ['m s^2 kg^-1', 'compressibility'], ['kg m^-2 s^-1', 'mass flux'], ['m^3 s^-2 kg^-1', 'gravitational constant'],
  ] },
  { source: 'ISO 80000-5, thermodynamics', rows: [
    ['K', 'temperature'], ['kg s^-3', 'heat flux'], ['kg m s^-3 K^-1', 'thermal conductivity'], ['kg s^-3 K^-1', 'heat transfer coefficient'], ['kg^-1 s^3 K', 'thermal insulance'], ['kg^-1 m^-2 s^3 K', 'thermal resistance'], ['kg m^2 s^-3 K^-1', 'thermal conductance'],
    ['m^2 s^-2', 'specific energy, squared speed'], ['m^2 s^-2 K^-1', 'specific heat capacity, specific entropy'], ['kg m^2 s^-2 K^-1', 'heat capacity, entropy'], ['K^-1', 'thermal expansion coefficient'], ['kg m^-1 s^-2 K^-1', 'pressure coefficient, volumetric heat capacity'],
  ] },
  { source: 'ISO 80000-6, electromagnetism', rows: [
    ['A', 'electric current'], ['A s', 'electric charge'], ['kg m^2 s^-3 A^-1', 'voltage'], ['kg m^2 s^-3 A^-2', 'resistance'], ['kg^-1 m^-2 s^3 A^2', 'conductance'], ['kg^-1 m^-2 s^4 A^2', 'capacitance'], ['kg m^2 s^-2 A^-2', 'inductance'],
    ['kg m^2 s^-2 A^-1', 'magnetic flux'], ['kg s^-2 A^-1', 'magnetic flux density'], ['kg m s^-3 A^-1', 'electric field strength'], ['A m^-1', 'magnetic field strength'], ['A m^-2', 'current density'], ['A s m^-3', 'charge density'], ['A s m^-2', 'electric flux density, surface charge density'], ['A s m', 'electric dipole moment'],
    ['kg m^3 s^-3 A^-2', 'resistivity'], ['kg^-1 m^-3 s^3 A^2', 'conductivity'], ['kg^-1 m^-3 s^4 A^2', 'permittivity'], ['kg m s^-2 A^-2', 'permeability'], ['A m^2', 'magnetic moment'], ['kg m s^-2 A^-1', 'magnetic vector potential'], ['kg^-1 m^-2 s^2 A^2', 'reluctance'], ['kg m^3 s^-3 A^-1', 'electric flux'],
  ] },
  { source: 'ISO 80000-7, light and radiation', rows: [
    ['cd', 'luminous intensity, luminous flux'], ['cd m^-2', 'luminance, illuminance'], ['cd s', 'luminous energy'], ['kg^-1 m^-2 s^3 cd', 'luminous efficacy'], ['cd s m^-2', 'luminous exposure'], ['kg m^-1 s^-3', 'spectral irradiance, power density'], ['kg m s^-3', 'spectral power, power per length'],
  ] },
  { source: 'ISO 80000-8, acoustics', rows: [
    ['kg m^-4 s^-1', 'acoustic impedance, flow resistance'],
  ] },
  { source: 'ISO 80000-9, physical chemistry', rows: [
    ['mol', 'amount of substance'], ['kg mol^-1', 'molar mass'], ['m^3 mol^-1', 'molar volume'], ['mol m^-3', 'concentration'], ['mol kg^-1', 'molality'], ['mol^-1', 'Avogadro constant'], ['kg m^2 s^-2 mol^-1', 'molar energy'], ['kg m^2 s^-2 K^-1 mol^-1', 'molar heat capacity, gas constant'],
    ['mol s^-1', 'molar flow rate, catalytic activity'], ['mol m^-3 s^-1', 'reaction rate'], ['A s mol^-1', 'Faraday constant'], ['m^-3', 'number density'], ['m^2 mol^-1', 'molar absorption coefficient'], ['kg^-1 s^3 A^2 mol^-1', 'molar conductivity'],
  ] },
  { source: 'ISO 80000-10, atomic and nuclear physics', rows: [
    ['m^-2', 'fluence, number per area'], ['m^-2 s^-1', 'fluence rate'], ['kg^-1 s A', 'exposure'], ['m^2 s^-3', 'dose rate, specific power, dissipation rate'], ['kg^-1 s^-1', 'specific activity'], ['m^2 kg^-1', 'mass attenuation coefficient, specific surface area'],
  ] },
  { source: 'common practice in heat and mass transfer', rows: [
    ['mol m^-2 s^-1', 'molar flux'], ['kg m^-3 s^-1', 'volumetric mass source'], ['K m^-1', 'temperature gradient'], ['K s^-1', 'rate of temperature change'], ['kg s^-3 K^-4', 'Stefan-Boltzmann constant'], ['kg m^-1 s^-3 K^-1', 'volumetric heat transfer coefficient'], ['m K', 'Wien displacement constant'],
    ['s m^-1', 'mass transfer resistance'], ['kg^-1 m^-1 s^3 K', 'thermal resistivity'], ['m s^2 K kg^-1', 'Joule-Thomson coefficient'], ['kg s^-2 K^-1', 'temperature coefficient of surface tension'], ['m^3 mol^-1 s^-1', 'second-order rate constant'], ['m^2 s^-2 K^-2', 'temperature coefficient of specific heat'],
  ] },
  { source: 'common practice in fluid and solid mechanics', rows: [
    ['kg m^-2 s^-2', 'specific weight, pressure gradient'], ['m s kg^-1', 'fluidity'], ['s^2 m^-5', 'hydraulic loss coefficient'], ['kg m^-7', 'quadratic flow resistance'], ['kg m^3 s^-2', 'bending stiffness'], ['m^6', 'warping constant'], ['kg m^-0.5 s^-2', 'fracture toughness'],
    ['s m^-2', 'inverse diffusivity'], ['s^2 m^-2', 'inverse squared speed'], ['s^2 m^-1', 'inverse acceleration'], ['s^2', 'squared period'], ['kg^-1 m^-1 s^2', 'inverse force'], ['kg^-1 s^2', 'compliance'], ['kg^-1', 'inverse mass'], ['m^4 s kg^-1', 'hydraulic conductance'], ['m s^-0.5', 'sorptivity'],
    ['m^-1 s^-1', 'intensity per length'],
  ] },
];
