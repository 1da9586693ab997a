/** Symbols typed in the wrong letters' case: `w/m2`, `Kg/s`, `KPA`. */
import { findSymbol, knownSymbols } from './lookup.ts';

/** Where two symbols differ only in case, the one that scripts mean; common practice. */
const first = ['W', 'kg', 'J', 'kJ', 'Pa', 'kPa', 'MPa', 'hPa', 'GPa', 'kW', 'MW', 'mm', 'm', 'cm', 'km', 'K', 'N', 'kN', 'MN', 'Hz', 'kHz', 'MHz', 'GHz', 'V', 'kV', 'mV', 'mol', 'kmol', 'mmol', 'rpm', 'psi', 'psig', 'psia', 'ft', 'in', 'bar', 'mbar', 's', 'ms', 'g', 'mg', 'L', 'mL', 'kcal', 'cal', 'deg', 'rad', 'min', 'h', 'hr', 'sec', 'lbf', 'lb', 'lbm', 'kWh', 'MWh', 'MJ', 'GJ', 'um', 'nm', 'mA', 'kVA', 'eV', 'keV', 'MeV', 'dB', 'ohm', 'degC', 'degF', 'inHg', 'inH2O', 'mmHg', 'gpm', 'cfm', 'ppm', 'ppb'];
const alone = new Set(['kg', 'kpa', 'mpa', 'hpa', 'gpa', 'kw', 'kj', 'mj', 'khz', 'mhz', 'ghz', 'kn', 'kwh', 'mwh', 'kmol', 'mmol', 'pa', 'lbf', 'degc', 'degf', 'kcal', 'kva', 'mev', 'kev', 'mol', 'mmhg', 'inhg', 'ppm', 'bar', 'mbar', 'sec', 'hr']);
let lower: Map<string, string> | undefined;

/** The symbol that this one would be in other letters' case. */
export function otherCase(symbol: string): string | undefined {
  if (!/^[A-Za-z]+$/.test(symbol) || symbol.length > 6) return undefined;
  lower ??= build();
  const found = lower.get(symbol.toLowerCase());
  return found === symbol ? undefined : found;
}

/** Whether a symbol in the wrong case is plain enough to stand alone: `Kpa`, not `k`. */
export function standsAlone(symbol: string): boolean {
  return alone.has(symbol.toLowerCase());
}

function build(): Map<string, string> {
  const map = new Map<string, string>();
  for (const symbol of [...first, ...knownSymbols()]) {
    const key = symbol.toLowerCase();
    if (!map.has(key) && findSymbol(symbol) && (symbol.length > 1 || first.includes(symbol))) map.set(key, symbol);
  }
  return map;
}
