/** Letters alone that count as a unit without a bracket around them. The rest are words, names and codes more often. */

const short = new Set([
  'm', 's', 'h', 'd', 'g', 'l', 't', 'mm', 'cm', 'dm', 'km', 'nm', 'um', 'kg', 'mg', 'ms', 'us', 'ns', 'ft', 'psi', 'ksi', 'psf', 'pcf', 'plf', 'klf', 'lbm', 'fpm', 'mph', 'gal', 'gph', 'gpd', 'MGD', 'kip', 'in', 'rpm', 'gpm', 'cfm', 'cfs', 'bar', 'deg', 'rad', 'mol', 'ppm', 'ppb', 'ppt', 'sec', 'hr', 'hrs', 'atm', 'clo', 'ohm', 'lb', 'lbs', 'lbf', 'day', 'kt', 'kts', 'oz', 'ha', 'hp', 'msl', 'sr', 'lm', 'lx', 'cd', 'eV',
  'K', 'W', 'N', 'J', 'V', 'A', 'C', 'F', 'R', 'L', 'S', 'T', 'H', 'Pa', 'Hz', 'Wh', 'VA', 'MW', 'GW', 'MJ', 'GJ', 'MN', 'MV', 'GN', 'Mg', 'Gg', 'Tg', 'Gy', 'Sv', 'Bq', 'Wb', 'Nm', 'Psi', 'PSI', 'Ohm', 'AU', 'DU', 'BTU', 'Btu', 'MPa', 'GPa', 'MHz', 'GHz', 'Ah', 'RPM', 'GPM', 'CFM', 'PPM', 'MWh', 'GWh', 'Kg', 'KG', 'KW',
]);

const names = /^(?:\w*(?:met(?:re|er)s?|grams?|grammes?|watts?|pascals?|joules?|newtons?|volts?|amp(?:ere)?s?|ohms?|radians?|degrees?|lit(?:re|er)s?|bars?|hertz|kelvins?|seconds)|seconds?|minutes|hours?|days?|weeks?|months?|years?|moles?|coulombs?|farads?|henr(?:y|ies)|teslas?|webers?|siemens|lumens?|candelas?|feet|foot|inch(?:es)?|yards?|miles?|pounds?|ounces?|tonnes?|tons?|gallons?|knots?|acres?|hectares?|percent|percents|unitless|dimensionless|celsius|fahrenheit|rankine|decibels?|poise|stokes|mmhg|inhg|dbar|mbar|hbar|psia|psig|barg|bara|slug|slugs|rpms?|arcsec|arcmin|degc|degf|degk|degr|kwhr?|btuh|scfm|acfm|cuft|sqft|mmol|umol|kmol|nmol|kcal|torr|msec|usec|nsec|secs|mins|kips?|btus?|ergs?|dynes?|calories|electron-?volts?|steradians?|becquerels?|sieverts?|micro\w{4,}|milli\w{4,}|kilo\w{4,}|mega\w{4,}|hecto\w{5,}|deci\w{5,}|nano\w{5,})$/i;
/** Words that end like a unit's name. */
const others = /^(?:diagrams?|programs?|histograms?|parameters?|perimeters?|diameters?|thermometers?|barometers?|manometers?|anemometers?|pyranometers?|geometers?|symmet\w*|damps?|lamps?|ramps?|stamps?|timestamps?|clamps?|swamps?|camps?|microphone|microwave|microscope|kilobytes|megabytes|millions?|millennium|decimals?|decision\w*|declination|sidebars?|toolbars?|revolts?|instagram|anagrams?|paragrams?|telegrams?|kilobars?|spectrometers?|pyrheliometers?|flowmeters?|telemeter|centers?|hyper\w+)$/i;

/** True for a spelling with other marks than letters, and for letters alone where those are a unit's usual ones. */
export function mayStandAlone(text: string): boolean {
  if (!/^[A-Za-z]+$/.test(text)) return true;
  if (text.length > 16) return false;
  if (text.length <= 3) return short.has(text) || /^[a-z]{1,2}[A-Z]/.test(text);
  return /^[a-z]{1,2}[A-Z]|^[a-z]+[CFKR]$/.test(text) || (names.test(text) && !others.test(text));
}
