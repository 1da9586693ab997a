/** C, F and R: which of their meanings a product and its description speak for. */
import type { Factor } from './unit-factor.ts';
import { findSymbol } from './lookup.ts';

const heat = /^(?:[kMGmuµ]?W|[kMGm]?J|[kM]?BTU|[kM]?Btu|btu|MMBTU|k?cal|hp|kcal|Wh|kWh|[kM]?Pa|psi|psia|bar|atm)$/;
const imperial = /^(?:BTU|Btu|btu|ft|in|lb|lbm|lbs|lbf|hr|h|ft-lbf|psi|psia|gal|min)$/;

/** Whether a name and its description speak of a temperature: a name that begins with T, or the word. */
export function describesTemperature(describes: string | undefined): boolean {
  if (describes === undefined || describes === '') return false;
  return /^\s*(?:[\w.]*\.)?(?:[tT]|[dD](?:elta)?_?T|Δ\s*T|θ|ϑ)/.test(describes) || /temp|celsius|fahrenheit|dew.?point|(?:^|[\s_])[tT](?:_|\d|\s|$)/i.test(describes);
}

/** The product with C, F and R decided. */
export function settleLetters(factors: readonly Factor[], temperature: boolean): readonly Factor[] {
  return factors.some((factor) => factor.open) ? factors.map((factor) => settled(factor, factors, temperature)) : factors;
}

function settled(factor: Factor, all: readonly Factor[], temperature: boolean): Factor {
  if (!factor.open || !isDegree(factor, all, temperature)) return factor;
  const symbol = { C: 'degC', F: 'degF', R: 'degR' }[factor.open];
  const kind = ({ C: 'celsius-or-coulomb', F: 'fahrenheit-or-farad', R: 'rankine-or-gas' } as const)[factor.open];
  const unit = findSymbol(symbol)?.unit ?? factor.unit;
  return { ...factor, unit, text: symbol, hint: kind };
}

function isDegree(factor: Factor, all: readonly Factor[], temperature: boolean): boolean {
  const others = all.filter((each) => each !== factor && each.sure !== 'number');
  if (factor.open === 'R' || temperature) return true;
  const has = (pattern: RegExp): boolean => others.some((each) => pattern.test(each.text));
  if (factor.power.sign > 0) {
    if (factor.open === 'F') return has(imperial) && others.some((each) => heat.test(each.text));
    return others.some((each) => each.power.sign < 0 && heat.test(each.text) && !/^[kM]?J$/.test(each.text)) || has(/^(?:d|day|days|hr|min)$/);
  }
  if (!factor.power.abs().isOne || factor.open === 'F') return factor.open === 'F' ? others.length > 0 || factor.power.isOne === false : false;
  return !(others.length <= 2 && has(/^[kmuµM]?N$/)) && !has(/^(?:e|electron)$/);
}

/** Whether R stands where nothing says that it is a degree. */
export function isBareR(factors: readonly Factor[], temperature: boolean): boolean {
  return !temperature && factors.some((factor) => factor.open === 'R' && factor.power.sign > 0 && !factors.some((each) => each !== factor && heat.test(each.text)));
}
