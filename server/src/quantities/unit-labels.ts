/** Words beside a unit that say what is measured and are no part of it. Source: common practice, as met in earth science and process code. */

/** Chemical formulas and elements: after a mass, an amount or a volume, glued or apart. */
const formulas = new Set([
  'C', 'N', 'P', 'S', 'H', 'O', 'CO', 'CO2', 'CO2e', 'CO2eq', 'CO2-eq', 'H2', 'H2O', 'CH4', 'O2', 'O3', 'N2', 'N2O', 'NH3', 'NH4', 'NO', 'NO2', 'NO3', 'NOx', 'SO2', 'SO4', 'SOx', 'PO4', 'CaCO3', 'CaO', 'NaCl', 'HCl', 'NaOH', 'SiO2', 'Fe', 'Si', 'Ca', 'Na', 'Cl', 'Chl', 'chl', 'Chla', 'chla',
  'COD', 'BOD', 'TSS', 'VSS', 'TN', 'TP', 'DIC', 'DOC', 'POC', 'SOC', 'DM', 'DW', 'FW', 'dm', 'dw', 'fw', 'da', 'DA', 'wv',
]);

const words = new Set([
  'water', 'air', 'dryair', 'dry', 'moist', 'humid', 'wet', 'steam', 'vapor', 'vapour', 'ice', 'snow', 'soil', 'fuel', 'gas', 'liquid', 'solid', 'solids', 'solution', 'solvent', 'solute', 'biomass', 'glucose', 'photon', 'photons', 'quanta', 'electron', 'electrons', 'e-',
  'leaf', 'ground', 'land', 'salt', 'carbon', 'nitrogen', 'oxygen', 'oil', 'product', 'feed', 'refrigerant', 'mixture', 'wood', 'sw', 'seawater', 'brine', 'sediment', 'plant', 'root', 'catalyst', 'cat', 'moles', 'standard', 'std', 'stp', 'STP', 'NTP', 'ntp', 'wb',
  'eq', 'equiv', 'equivalent', 'equivalents', 'el', 'th', 'elec', 'electric', 'thermal', 'peak', 'rms', 'RMS', 'DC', 'AC', 'dc', 'ac', 'asl', 'amsl', 'agl', 'msl', 'ASL', 'AMSL', 'AGL', 'MSL', 'true', 'north', 'south', 'east', 'west', 'clockwise', 'latitude', 'longitude', 'lat', 'lon',
]);

/** Whether a word beside a unit names what is measured. */
export function isLabel(word: string): boolean {
  return words.has(word) || formulas.has(word) || words.has(word.toLowerCase());
}

/** Whether letters glued to a unit of mass or amount are a substance: `gC`, `kgCO2`, `kgda`. */
export function isFormula(word: string): boolean {
  return formulas.has(word) || word === 'w' || word === 'air' || word === 'water';
}
