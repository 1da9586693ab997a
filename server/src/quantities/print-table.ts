/** How engineers spell coherent units and those next to them. Source: SI Brochure, tables 4 to 6; the choice among equals is common practice. */

/** Products of base units that have a better name. */
export const coherentSpellings: readonly (readonly [product: string, spelling: string])[] = [
  ['kg m s^-2', 'N'], ['kg m^-1 s^-2', 'Pa'], ['kg m^2 s^-2', 'J'], ['kg m^2 s^-3', 'W'], ['A s', 'C'], ['kg m^2 s^-3 A^-1', 'V'], ['kg m^2 s^-3 A^-2', 'ohm'], ['kg^-1 m^-2 s^3 A^2', 'S'], ['kg^-1 m^-2 s^4 A^2', 'F'], ['kg m^2 s^-2 A^-2', 'H'],
  ['kg m^2 s^-2 A^-1', 'Wb'], ['kg s^-2 A^-1', 'T'], ['kg m^-1 s^-1', 'Pa s'], ['kg s^-2', 'N/m'], ['kg m^-2 s^-2', 'Pa/m'], ['kg s^-3', 'W/m^2'], ['kg m^-1 s^-3', 'W/m^3'], ['kg m s^-3', 'W/m'], ['kg m^4 s^-2', 'N m^3'], ['kg m^3 s^-2', 'N m^2'],
  ['kg m s^-3 K^-1', 'W/(m K)'], ['kg s^-3 K^-1', 'W/(m^2 K)'], ['kg^-1 s^3 K', 'm^2 K/W'], ['kg^-1 m^-2 s^3 K', 'K/W'], ['kg m^2 s^-3 K^-1', 'W/K'], ['kg s^-3 K^-4', 'W/(m^2 K^4)'], ['kg^-1 m^-1 s^3 K', 'm K/W'], ['kg m^-1 s^-3 K^-1', 'W/(m^3 K)'],
  ['m^2 s^-2 K^-1', 'J/(kg K)'], ['kg m^2 s^-2 K^-1', 'J/K'], ['kg m^-1 s^-2 K^-1', 'J/(m^3 K)'], ['kg m^2 s^-2 mol^-1', 'J/mol'], ['kg m^2 s^-2 K^-1 mol^-1', 'J/(mol K)'], ['kg s^-2 K^-1', 'N/(m K)'], ['m s^2 K kg^-1', 'K/Pa'],
  ['kg m s^-3 A^-1', 'V/m'], ['kg m^3 s^-3 A^-2', 'ohm m'], ['kg m^2 s^-3 A^-1 K^-1', 'V/K'],
  ['kg^-1 m^-3 s^3 A^2', 'S/m'], ['kg^-1 m^-3 s^4 A^2', 'F/m'], ['kg m s^-2 A^-2', 'H/m'], ['A s m^-2', 'C/m^2'], ['A s m^-3', 'C/m^3'], ['kg^-1 s A', 'C/kg'], ['A s mol^-1', 'C/mol'], ['kg^-1 m^-2 s^3 A', '1/V'], ['kg m^3 s^-3 A^-1', 'V m'],
  ['m s^2 kg^-1', '1/Pa'], ['m s kg^-1', '1/(Pa s)'], ['m^3 s^-2 kg^-1', 'N m^2/kg^2'], ['kg^-1 m^-2 s^2', '1/J'], ['kg^-1 m^-2 s^3', '1/W'], ['kg^-1 m^-1 s^2', '1/N'], ['kg m^-4 s^-1', 'Pa s/m^3'], ['kg^-1 m^4 s', 'm^3/(Pa s)'], ['mol s^-1', 'mol/s'],
  ['kg^0.5 m^-0.5 s^-1', 'Pa^(1/2)'], ['kg m^-0.5 s^-2', 'Pa m^(1/2)'],
];

/** Spellings beside the coherent ones, the usual first. Each is read by the unit reader. */
export const familiarSpellings: readonly string[] = [
  '%', 'ppm', 'ppb', 'rad', 'deg', 'rev', 'g/kg', 'mm', 'cm', 'km', 'um', 'nm', 'ft', 'in', 'mi', 'yd', 'nmi', 'mm^2', 'cm^2', 'km^2', 'ha', 'ft^2', 'in^2', 'L', 'mL', 'mm^3', 'm^3', 'ft^3', 'in^3', 'gal', 'mm^4', 'cm^4', 'in^4',
  'g', 'mg', 'ug', 't', 'lb', 'oz', 'slug', 'min', 'h', 'd', 'ms', 'us', 'ns', 'yr', 'degC', 'degF', 'degR', 'Hz', 'kHz', 'MHz', 'GHz', 'rpm', 'rad/s', 'deg/s', 'deg/h', 'rad/s^2', 'Hz/s', '1/min', '1/h', '1/d',
  'm/s', 'km/h', 'mm/s', 'cm/s', 'km/s', 'm/h', 'm/d', 'm/min', 'mm/h', 'mm/d', 'mm/min', 'ft/s', 'ft/min', 'mph', 'kn', 'in/s', 'in/h', 'ft/s^2', 'cm/s^2', 'mm/s^2', 'in/s^2',
  'L/s', 'L/min', 'L/h', 'mL/min', 'm^3/h', 'm^3/d', 'm^3/min', 'gpm', 'cfm', 'ft^3/s', 'MGD', 'kg/h', 'kg/min', 'kg/d', 'g/s', 'g/h', 't/h', 't/d', 'lb/h', 'lb/s', 'lb/min', 'mm^2/s', 'cm^2/s', 'm^2/h', 'ft^2/s', 'ft^2/h',
  'g/cm^3', 'mg/L', 'ug/L', 'lb/ft^3', 'lb/gal', 'slug/ft^3', 'cm^3/g', 'ft^3/lb', 'g/m^2', 'kg/ha', 't/ha',
  'kN', 'MN', 'mN', 'lbf', 'kgf', 'kip', 'dyn', 'kN/m', 'mN/m', 'lbf/in', 'lbf/ft', 'kPa', 'MPa', 'GPa', 'hPa', 'bar', 'psi', 'ksi', 'psig', 'barg', 'kPag', 'atm', 'mmHg', 'inHg', 'inH2O', 'mmH2O', 'ftH2O', 'lbf/ft^2', 'Torr', 'dbar', 'kPa/m', 'bar/m', 'psi/ft', 'lbf/ft^3',
  'kJ', 'MJ', 'GJ', 'kWh', 'MWh', 'Wh', 'BTU', 'cal', 'kcal', 'eV', 'ft lbf', 'in lbf', 'erg', 'kW', 'MW', 'GW', 'mW', 'hp', 'BTU/h', 'kcal/h', 'ton_ref', 'kW/m^2', 'BTU/(h ft^2)', 'W/cm^2', 'kWh/m^2', 'MJ/m^2', 'kJ/h',
  'kJ/kg', 'MJ/kg', 'BTU/lb', 'kcal/kg', 'kWh/kg', 'kJ/(kg K)', 'BTU/(lb degF)', 'kcal/(kg K)', 'kJ/mol', 'J/kmol', 'kcal/mol', 'J/(kmol K)', 'kJ/(mol K)', 'BTU/ft^3', 'kJ/(m^3 K)', 'MJ/(m^3 K)', 'kJ/K',
  'kW/(m K)', 'mW/(m K)', 'W/(cm K)', 'BTU/(h ft degF)', 'BTU in/(h ft^2 degF)', 'kW/(m^2 K)', 'BTU/(h ft^2 degF)', 'h ft^2 degF/BTU', 'kW/K', 'K/kW', 'mPa s', 'uPa s', 'kPa s', 'lbf s/ft^2', 'lb/(ft s)', 'lb/(ft h)',
  'kmol', 'mmol', 'umol', 'lbmol', 'g/mol', 'kmol/h', 'mol/h', 'kmol/s', 'mmol/s', 'mol/L', 'umol/L', 'mol/g', 'umol/kg', 'L/mol', 'mmol/(m^2 s)', 'umol/(m^2 s)', 'g/(m^2 s)', 'kg/(m^2 h)', 'g/(m^2 d)', 'kg/(m^2 d)',
  'mA', 'uA', 'kA', 'mV', 'kV', 'uV', 'MV', 'kohm', 'Mohm', 'mohm', 'uF', 'nF', 'pF', 'mF', 'mH', 'uH', 'nH', 'A h', 'mA h', 'mS', 'uS', 'mT', 'uT', 'kV/m', 'A/mm^2', 'A/cm^2', 'mS/cm', 'uS/cm', 'S/cm', 'ohm cm', 'mWb', 'dB', 'mW/m^2', 'klx', 'K/km', 'K/min', 'K/h', '1/cm', '1/mm', '1/ft', '1/km', '1/cm^3', '1/L', 'MPa m^0.5', 'ksi in^0.5', 'mol/(L s)', 'mol/(g s)',
];
