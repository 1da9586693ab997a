/** A comment that is a unit, or begins with one: `# kg/m^3`, `# W/m.K wall`, `# s, time step`. */
import { parseUnit } from '../quantities/parse-unit.ts';
import type { ReadOptions } from '../quantities/unit-result.ts';
import type { Found } from './find-unit.ts';
import type { Piece } from './piece.ts';
import { mayStandAlone } from './plain-words.ts';

/**
 * The bare unit at the head of a comment. `number`: the value beside it is a plain number, so that one weak symbol counts.
 * `taken`: a word is a name of the code around, so that one letter is that name and no unit.
 */
export function bareUnit(piece: Piece, number: boolean, taken: (name: string) => boolean, options: ReadOptions): Found | undefined {
  const text = piece.text.trimEnd();
  if (text === '' || text.length > 200) return undefined;
  for (const end of endsOf(text)) {
    const words = text.slice(0, end).replace(/[\s,;:.]+$/, '');
    const result = read(words, options);
    if (!result || (isLetter(words) && taken(words))) continue;
    const behind = text.slice(words.length);
    if (!(end === text.length ? wholeCounts(words, result.beyondDoubt, number) : leadingCounts(words, behind, result.beyondDoubt, number))) continue;
    return { unit: result.unit, hints: result.hints, span: { start: 0, end: words.length }, outer: { start: 0, end: words.length }, by: 'bare' };
  }
  return undefined;
}

/** The whole text, then the first places where a leading unit may end, the longest first. */
function endsOf(text: string): readonly number[] {
  const ends: number[] = [];
  for (const match of text.slice(0, 60).matchAll(/[,;:](?=\s)|\s+(?=\S)/g)) {
    ends.push(match.index);
    if (ends.length === 5) break;
  }
  return [text.length, ...ends.reverse()];
}

function read(words: string, options: ReadOptions) {
  if (words === '' || words.length > 50 || /^(?:(?!1\/\p{L})[\d.[(]|in\s(?!(?:lbf?|wg|H2O|Hg)$))/iu.test(words) || /[=<>?!"']|\.\./.test(words)) return undefined;
  if (numbersOfNoUnit.has(words.toLowerCase()) || !mayStandAlone(words) || derived.test(words) || computed.test(words) || (/^[A-Za-z]\d$/.test(words) && !/^(?:m[234]|s2)$/.test(words))) return undefined;
  const result = parseUnit(words.replace(/\s+/g, ' '), options);
  return result.ok ? result : undefined;
}

/** Spellings of a pure number that are remarks where no bracket stands around them. */
const numbersOfNoUnit = new Set(['1', '--', '---', '–', '—', 'none', 'n/a', 'no unit', 'no units', 'decimal', 'fraction', 'fractional', 'ratio']);
/** `mol fraction`: a number named after a unit. */
const derived = /\s(?:fractions?|ratios?|numbers?|balance|chart)\b/i;
/** `bits / 8`, `bits in n**2`, `U+03A7`: sums and codes. */
const computed = /(?<!\^\s*\(\s*\d+)\/\s*\d|\sin\s|^U\+|^dim\s+[a-z]/;
/** Words that are units and more often something else. */
const ordinary = new Set(['min', 'in', 'mil', 'met', 'var', 'point', 'line', 'part', 'parts', 'turn', 'all', 'each', 'cycle', 'link', 'chain', 'count', 'counts', 'item', 'items', 'max', 'era', 'rev', 'drop', 'hand', 'cup', 'are', 'second', 'dash', 'grade', 'stone', 'pole']);
/** One or two letters that stand for a unit beside any value; common practice. */
const plain = new Set(['m', 's', 'K', 'W', 'N', 'J', 'Pa', 'Hz', 'kg', 'ft', 'hp', 'ksi', 'psf', 'fpm', 'kip', 'kips', 'lbm', 'mph', 'gal', 'gph', 'gpd', 'MGD', 'pcf', 'plf', 'klf', 'slugs', '%', '°', '-', 'bar', 'day', 'days', 'hours', 'minutes', 'seconds', 'metres', 'meters', 'degrees', 'radians', 'volts', 'watts', 'feet', 'inches', 'years', 'dimensionless', 'unitless']);

function wholeCounts(words: string, beyondDoubt: boolean, number: boolean): boolean {
  if (words === 'in') return number;
  if (ordinary.has(words.toLowerCase())) return false;
  return beyondDoubt || plain.has(words) || number;
}

/** A unit in front of a description: behind a comma a symbol is enough, before plain words it needs the look of a unit. */
function leadingCounts(words: string, behind: string, beyondDoubt: boolean, number: boolean): boolean {
  if (words === 'in') return number && /^(?:,\s+[a-z]{3,}|\s{2,}(?!(?:the|an?|this|that|all|each|order)\b)\S)/.test(behind);
  if (ordinary.has(words.toLowerCase()) || /\sof\s/.test(words) || /^\s*(?:to|into|->|→|=>)\s/.test(behind)) return false;
  const described = /^\s*[,;(]\s*\(?[\p{L}]{3,}/u.test(behind) || /^\s+[-–—(]+\s*[\p{L}]{3,}/u.test(behind);
  // A column of units, then a column of remarks.
  if (/^\s{2,}[\p{L}\d(]/u.test(behind) && (beyondDoubt || plain.has(words))) return true;
  if (described) return beyondDoubt || plain.has(words) || (/^[A-Za-z]{1,2}$/.test(words) && behind.startsWith(','));
  if (/^\s*:/.test(behind)) return beyondDoubt && structured.test(words);
  if (!beyondDoubt || /^\s*(?:(?:is|are|was|of|for|and|or|per)\b|[=+*/<>])/i.test(behind) || !/^\s+[([{\p{L}@]/u.test(behind)) return false;
  return structured.test(words) || scaled.test(words);
}

/** One letter that a formula may use as a name; `m` and `s` are units first. */
export function isLetter(words: string): boolean {
  return /^[A-Za-z]$/.test(words) && words !== 'm' && words !== 's';
}

const structured = /[/^*·⋅²³⁻°℃µμΩ]|\*\*|[\p{L}]\s*-?\d|\p{L}\s\p{L}/u;
/** Symbols with a prefix that are no English words. */
const scaled = /^(?:mm|cm|km|kg|mg|kW|MW|GW|kJ|MJ|kN|MN|kPa|MPa|GPa|hPa|mbar|kHz|MHz|mA|mV|kV|kWh|ms|rpm|psi|degC|degF|gpm|cfm)$/;
