/** What a product that can be read is worth: no unit at all, a unit, or a unit beyond doubt. */
import type { Marks } from './parse-unit-reader.ts';
import { standsAlone } from './unit-case.ts';
import { Dimension } from './dimension.ts';
import type { Factor } from './unit-factor.ts';
import { letters, usualLetters } from './unit-vocabulary.ts';

export type Worth = 'nothing' | 'doubtful' | 'beyond doubt';

/** Judges a product by its text: `kPa` is beyond doubt, `h` doubtful, `x.T` nothing. */
export function worthOf(text: string, factors: readonly Factor[], marks: Marks): Worth {
  const symbols = factors.filter((factor) => factor.sure !== 'number');
  const numbers = factors.filter((factor) => factor.sure === 'number');
  if (symbols.length === 0) return /\^/.test(text) && /^1?0(?:\.\d+)?\s*\^/.test(text) && numbers.length === 1 ? 'doubtful' : 'nothing';
  if (!numbersFit(text, factors) || /^d\p{L}?\s*\/\s*d\p{L}$/u.test(text)) return 'nothing';
  if (symbols.length === 1 && marks.operators === 0) return worthOfOne(text, symbols[0] as Factor, marks, numbers.length > 0);
  if (symbols.some((factor) => factor.hint === 'case') && symbols.every((factor) => factor.text.length === 1 && factor.sure !== 'sure') && !/^w\/m/.test(text)) return 'nothing';
  if (marks.operators + marks.powers === 0 && !hasDigitPower(text)) return worthOfWords(text, symbols);
  if (marks.operators > 0 && symbols.length === 1) return worthOfInverse(text, symbols[0] as Factor, numbers);
  return onlyLetters(text) ? worthOfLetters(text, symbols, marks) : symbols.every((factor) => factor.sure === 'weak') ? 'doubtful' : 'beyond doubt';
}

/** A leading number is a power of ten, or 1; elsewhere any number may stand. `20 cm` is a value. */
function numbersFit(text: string, factors: readonly Factor[]): boolean {
  if (factors.some((factor) => factor.sure === 'number' && (factor.below || factor.power.sign < 0) && factor.text.includes('.'))) return false;
  const first = factors[0];
  if (first?.sure !== 'number' || first.below || first.power.sign < 0) return true;
  const rest = text.slice(first.end);
  if (!first.power.isOne) return /^10(?:\.0*)?$/.test(first.text);
  if (/^\s*\*/.test(rest)) return true;
  const structured = /[/^(]|\p{L}\d|-\d/u.test(rest);
  return structured ? /^(?:0\.0*1|10*(?:\.0*)?|1(?:\.0*)?[eE][-+]?\d+)$/.test(first.text) : /^(?:0\.0{2,}1|1000+|1[eE][-+]?\d+)$/.test(first.text);
}

function worthOfOne(text: string, factor: Factor, marks: Marks, scaled: boolean): Worth {
  const plain = factor.power.isOne;
  if (factor.unit.scale === undefined && factor.sure === 'weak') return 'nothing';
  if (factor.hint === 'case' && plain && !standsAlone(text)) return 'nothing';
  if (factor.sure === 'weak' && letters.has(factor.text) && marks.powers === 0) return 'nothing';
  if (scaled) return /\^|[eE]/.test(text) ? 'beyond doubt' : 'doubtful';
  const signed = /^\p{L}([-+])\d$/u.exec(text);
  if (signed) return signed[1] === '-' && /^[msKhd]/.test(text) ? 'doubtful' : 'nothing';
  if (/^\p{L}+\d[\d./]*$/u.test(text)) return digitPower(text, factor);
  if (marks.words > 0 || marks.powers > 0) return factor.text.length === 1 && marks.words === 0 && !/[msKLhWNJVAg]/.test(factor.text) ? 'doubtful' : 'beyond doubt';
  if (marks.labels > 0) return factor.sure === 'sure' || isMassLabel(text) ? 'beyond doubt' : 'doubtful';
  return factor.sure === 'sure' && factor.hint === undefined ? 'beyond doubt' : 'doubtful';
}

function isMassLabel(text: string): boolean {
  return /^(?:[kmµuMGT]?g|mol)\b/.test(text);
}

/** `m2` and `ft3` are units; `h2`, `T4` and `m10` are names. */
function digitPower(text: string, factor: Factor): Worth {
  const digits = /\d+(?:\.\d+)?$/.exec(text)?.[0] ?? '';
  if (factor.sure === 'weak' || /^[01]$|^0/.test(digits) || Number(digits) > 6) return 'nothing';
  if (factor.text.length === 1) return /^m[234]$|^m\d\.\d|^[mM]\d\/\d$/.test(text) || /^M[23]$/.test(text) ? 'beyond doubt' : 'nothing';
  return factor.unit.dimension === Dimension.base('L') ? 'beyond doubt' : 'doubtful';
}

function hasDigitPower(text: string): boolean {
  return /\p{L}\d/u.test(text);
}

/** Symbols side by side, without any sign: `N m`, `kW h`, `pascal second`; two units of one kind are no product. */
function worthOfWords(text: string, symbols: readonly Factor[]): Worth {
  if (/^(?:in|ft)[ .·-](?:lbf?|ozf?|kips?)$/.test(text)) return 'beyond doubt';
  const kinds = new Set(symbols.map((factor) => factor.unit.dimension));
  if (symbols.length > 3 || kinds.size < symbols.length || symbols.some((factor) => factor.sure === 'weak' || factor.hint === 'case' || factor.unit.scale === undefined)) return 'nothing';
  if (/^(?:[kMm]?N|[mk]?Pa|[kM]?W|lbf|ft)[-. ·]?(?:m|mm|s|ft|h|in)$/.test(text)) return /^[kMm]?N[ms]$|^Pas$/.test(text) ? (text === 'Ns' ? 'doubtful' : 'beyond doubt') : 'beyond doubt';
  if (symbols.every((factor) => factor.text.length === 1)) return usualLetters.has(symbols.map((factor) => factor.text).join(' ')) ? (/^[NJVAW][ .·*-]/.test(text) ? 'beyond doubt' : 'doubtful') : symbols.every((factor) => /^[AKVWJNms]$/.test(factor.text)) ? 'doubtful' : 'nothing';
  if (/^\p{L}(?:\.\p{L}+)+$/u.test(text) && !symbols.some((factor) => factor.sure === 'sure')) return 'nothing';
  return symbols.some((factor) => factor.sure === 'sure') && symbols.filter((factor) => factor.sure === 'word').length <= 1 ? 'beyond doubt' : 'doubtful';
}

/** `1/s`, `per metre`, `/day`: beyond doubt unless it is one letter that is often a name. */
function worthOfInverse(text: string, factor: Factor, numbers: readonly Factor[]): Worth {
  if (numbers.some((number) => number.text !== '1' && number.power.isOne && number.power.sign > 0 && !number.below)) return 'nothing';
  return factor.text.length === 1 && !/^[smKhdVWCFJ%°Ω]$/.test(factor.text) && /\//.test(text) ? 'doubtful' : factor.sure === 'weak' ? 'doubtful' : 'beyond doubt';
}

function onlyLetters(text: string): boolean {
  return /^\(?\p{L}\)?(?:\s*[/*. ·-]\s*\(?\p{L}\)?)+\)?$/u.test(text);
}

/** `m/s` is a unit, `h/D` hardly. */
function worthOfLetters(text: string, symbols: readonly Factor[], marks: Marks): Worth {
  if (symbols.some((factor) => factor.sure === 'weak' && letters.has(factor.text)) || isRatioOfNames(text)) return 'nothing';
  const plain = text.replace(/[()]/g, '').replace(/\s*([/*])\s*/g, '$1').replace(/\*/g, ' ');
  if (usualLetters.has(plain)) return 'beyond doubt';
  if (symbols.length > 2 && text.includes('/')) return 'beyond doubt';
  return marks.operators > 0 && !text.includes('/') ? 'nothing' : 'doubtful';
}

/** `t/T`, `m/M`: a quantity over its own reference. */
function isRatioOfNames(text: string): boolean {
  const [above = '', below = ''] = text.split('/').map((part) => part.trim());
  return above !== below && above.toLowerCase() === below.toLowerCase();
}
