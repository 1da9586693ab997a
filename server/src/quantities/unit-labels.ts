/** Words and formulas of substances that stand beside a unit and are no part of it. Common practice. */
const substances = new Set([
  'C', 'N', 'P', 'S', 'CO', 'CO2', 'H', 'H2O', 'HO', 'CH', 'CH4', 'O', 'O2', 'N2O', 'NH', 'NO', 'NO3', 'SO', 'CaCO', 'water', 'air', 'dry', 'dryair', 'dry_air', 'DryAir', 'moist', 'wet', 'steam', 'vapor', 'vapour', 'ice', 'snow', 'soil', 'fuel', 'gas',
  'liquid', 'solid', 'solution', 'biomass', 'glucose', 'photon', 'photons', 'quanta', 'e', 'electron', 'DM', 'leaf', 'ground', 'da', 'salt', 'carbon', 'nitrogen', 'oil', 'product', 'feed', 'refrigerant', 'mixture', 'wood', 'dw', 'fw', 'sw', 'seawater',
]);

/** Whether a word beside a unit names what is measured. */
export function isLabel(word: string): boolean {
  return substances.has(word);
}
