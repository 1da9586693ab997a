/**
 * The CODATA constants against three sources outside the table: the relations of physics between them, the constants of
 * mathjs (CODATA 2018, from its documentation), and the list of CODATA 2022 values below.
 */
import { create, all } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { constants } from '../../server/src/quantities/constants/index.ts';
import { readFactor, readStrict } from './catalogue-reader.ts';

const math = create(all ?? {});

/** Value of a constant in coherent SI units. */
function valueOf(name: string): number {
  const entry = constants.find((constant) => constant.name === name);
  if (!entry) throw new Error(`no constant '${name}'`);
  return readFactor(entry.value).toNumber() * readStrict(entry.unit).scale.toNumber();
}

const c = valueOf('speed of light in vacuum');
const h = valueOf('Planck constant');
const e = valueOf('elementary charge');
const k = valueOf('Boltzmann constant');
const avogadro = valueOf('Avogadro constant');
const gas = valueOf('molar gas constant');
const electron = valueOf('electron mass');
const alpha = valueOf('fine-structure constant');
const eps0 = valueOf('vacuum electric permittivity');
const hbar = h / (2 * Math.PI);

/** Root of x = n (1 - exp(-x)), which places the peak of Planck's law. */
function planckPeak(n: number): number {
  let x = n;
  for (let step = 0; step < 60; step++) x = n * (1 - Math.exp(-x));
  return x;
}

describe('relations of physics between the constants', () => {
  // Exact relations hold to double precision; relations between measured constants to their published uncertainty.
  it.each<[string, number, number]>([
    ['reduced Planck constant', hbar, 1e-14],
    ['molar gas constant', avogadro * k, 1e-14],
    ['Faraday constant', avogadro * e, 1e-14],
    ['Stefan-Boltzmann constant', (2 * Math.PI ** 5 * k ** 4) / (15 * h ** 3 * c ** 2), 1e-14],
    ['Wien displacement constant', (h * c) / (k * planckPeak(5)), 1e-13],
    ['first radiation constant', 2 * Math.PI * h * c ** 2, 1e-14],
    ['second radiation constant', (h * c) / k, 1e-14],
    ['magnetic flux quantum', h / (2 * e), 1e-14],
    ['conductance quantum', (2 * e ** 2) / h, 1e-14],
    ['Josephson constant', (2 * e) / h, 1e-14],
    ['von Klitzing constant', h / e ** 2, 1e-14],
    ['molar volume of an ideal gas at 0 °C and 1 atm', (gas * 273.15) / 101325, 1e-14],
    ['molar volume of an ideal gas at 0 °C and 100 kPa', (gas * 273.15) / 100000, 1e-14],
    ['molar volume of an ideal gas at 25 °C and 1 atm', (gas * 298.15) / 101325, 1e-6],
    ['molar volume of an ideal gas at 60 °F and 14.696 psi', (gas * ((459.67 + 60) / 1.8)) / ((14.696 * 4.4482216152605) / 0.0254 ** 2), 2e-5],
    ['Loschmidt constant', 101325 / (k * 273.15), 1e-14],
    ['fine-structure constant', e ** 2 / (4 * Math.PI * eps0 * hbar * c), 5e-10],
    ['vacuum magnetic permeability', 1 / (eps0 * c ** 2), 5e-10],
    ['characteristic impedance of vacuum', 1 / (eps0 * c), 5e-10],
    ['Coulomb force constant', 1 / (4 * Math.PI * eps0), 5e-10],
    ['Bohr radius', hbar / (electron * c * alpha), 1e-9],
    ['Rydberg constant', (alpha ** 2 * electron * c) / (2 * h), 1e-9],
    ['Rydberg energy', h * c * valueOf('Rydberg constant'), 1e-11],
    ['Hartree energy', 2 * valueOf('Rydberg energy'), 1e-14],
    ['Bohr magneton', (e * hbar) / (2 * electron), 1e-9],
    ['nuclear magneton', (e * hbar) / (2 * valueOf('proton mass')), 1e-9],
    ['classical electron radius', alpha ** 2 * valueOf('Bohr radius'), 1e-9],
    ['Thomson cross section', (8 * Math.PI * valueOf('classical electron radius') ** 2) / 3, 2e-9],
    ['head of conventional water per pressure', 1 / valueOf('specific weight of conventional water'), 1e-9],
    ['specific gas constant of water vapour', gas / valueOf('molar mass of water'), 2e-6],
    ['specific gas constant of dry air', gas / valueOf('molar mass of dry air'), 1e-4],
    ['ratio of the molar masses of water and dry air', valueOf('molar mass of water') / valueOf('molar mass of dry air'), 2e-5],
    ['density of the standard atmosphere at sea level', 101325 / (287.05287 * 288.15), 2e-6],
    ['speed of sound of the standard atmosphere at sea level', Math.sqrt(1.4 * 287.05287 * 288.15), 1e-6],
    ['speed of sound in air over the root of temperature', Math.sqrt(1.4 * 287.05287), 1e-6],
    ['height scale of the standard atmosphere', 288.15 / 0.0065, 1e-7],
    ['pressure lapse of the standard atmosphere', 0.0065 / 288.15, 1e-6],
    ['gravitational parameter of the earth', valueOf('Newtonian constant of gravitation') * 5.9722e24, 1e-4],
  ])('%s', (name, expected, tolerance) => {
    expect(Math.abs(valueOf(name) / expected - 1)).toBeLessThan(tolerance);
  });
});

/** Our name, the name in mathjs, and the largest relative change between the editions 2018 and 2022 (zero: exact in both). */
const shared: readonly (readonly [string, string, number])[] = [
  ['speed of light in vacuum', 'speedOfLight', 0],
  ['Planck constant', 'planckConstant', 0],
  ['reduced Planck constant', 'reducedPlanckConstant', 0],
  ['elementary charge', 'elementaryCharge', 0],
  ['Boltzmann constant', 'boltzmann', 0],
  ['Avogadro constant', 'avogadro', 0],
  ['molar gas constant', 'gasConstant', 0],
  ['Faraday constant', 'faraday', 0],
  ['Stefan-Boltzmann constant', 'stefanBoltzmann', 0],
  ['first radiation constant', 'firstRadiation', 0],
  ['second radiation constant', 'secondRadiation', 0],
  ['magnetic flux quantum', 'magneticFluxQuantum', 0],
  ['conductance quantum', 'conductanceQuantum', 0],
  ['von Klitzing constant', 'klitzing', 0],
  ['Loschmidt constant', 'loschmidt', 0],
  ['molar volume of an ideal gas at 0 °C and 1 atm', 'molarVolume', 0],
  ['standard acceleration of free fall', 'gravity', 0],
  ['Wien displacement constant', 'wienDisplacement', 1e-9],
  ['Newtonian constant of gravitation', 'gravitationConstant', 1e-15],
  ['vacuum electric permittivity', 'electricConstant', 1e-9],
  ['vacuum magnetic permeability', 'magneticConstant', 1e-9],
  ['characteristic impedance of vacuum', 'vacuumImpedance', 1e-9],
  ['Bohr magneton', 'bohrMagneton', 2e-9],
  ['nuclear magneton', 'nuclearMagneton', 2e-9],
  ['Bohr radius', 'bohrRadius', 1e-9],
  ['classical electron radius', 'classicalElectronRadius', 3e-9],
  ['electron mass', 'electronMass', 2e-9],
  ['proton mass', 'protonMass', 2e-9],
  ['atomic mass constant', 'atomicMass', 2e-9],
  ['Rydberg constant', 'rydberg', 1e-12],
  ['Hartree energy', 'hartreeEnergy', 1e-12],
  ['Thomson cross section', 'thomsonCrossSection', 5e-9],
  ['fine-structure constant', 'fineStructure', 1e-9],
];

describe(`constants of mathjs (${shared.length})`, () => {
  it.each(shared)('%s', (name, theirs, drift) => {
    const value: unknown = math.evaluate(theirs);
    const number = typeof value === 'number' ? value : (value as { toSI(): { toNumber(unit?: string): number; value: number } }).toSI().value;
    expect(Math.abs(valueOf(name) / number - 1)).toBeLessThan(drift + 1e-14);
  });
});

/** CODATA 2022, value and standard uncertainty in SI units, as distributed with scipy 1.17 (scipy.constants.physical_constants). */
const codata2022: readonly (readonly [string, number, number])[] = [
  ['Newtonian constant of gravitation', 6.6743e-11, 1.5e-15],
  ['vacuum electric permittivity', 8.8541878188e-12, 1.4e-21],
  ['vacuum magnetic permeability', 1.25663706127e-6, 2e-16],
  ['characteristic impedance of vacuum', 376.730313412, 5.9e-8],
  ['electron mass', 9.1093837139e-31, 2.8e-40],
  ['proton mass', 1.67262192595e-27, 5.2e-37],
  ['neutron mass', 1.67492750056e-27, 8.5e-37],
  ['alpha particle mass', 6.644657345e-27, 2.1e-36],
  ['atomic mass constant', 1.66053906892e-27, 5.2e-37],
  ['Rydberg constant', 10973731.568157, 1.2e-5],
  ['Bohr radius', 5.29177210544e-11, 8.2e-21],
  ['fine-structure constant', 0.0072973525643, 1.1e-12],
  ['Bohr magneton', 9.2740100657e-24, 2.9e-33],
  ['nuclear magneton', 5.0507837393e-27, 1.6e-36],
  ['Hartree energy', 4.359744722206e-18, 4.8e-30],
  ['classical electron radius', 2.8179403205e-15, 1.3e-24],
  ['Thomson cross section', 6.6524587051e-29, 6.2e-38],
];

describe('measured constants of CODATA 2022', () => {
  it.each(codata2022)('%s', (name, value, uncertainty) => {
    expect(Math.abs(valueOf(name) / value - 1)).toBeLessThan(1e-14);
    const declared = constants.find((entry) => entry.name === name)?.uncertainty ?? 0;
    expect(Math.abs(declared - uncertainty / value)).toBeLessThan(0.06 * declared);
  });
});
