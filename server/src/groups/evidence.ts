/** How well a symbol fits a kind of quantity: by its dimension first, then by words, and by letters only where words are silent. */
import type { QuantityKind } from './quantity-kinds.ts';
import { kindsOfDimension } from './quantity-kinds.ts';
import type { KnownSymbol } from './system.ts';

/** Weights of evidence. Only their order matters: a word for a special kind outweighs a word for a general one, and any word a letter. */
const weight = { toldByWords: 3, words: 2, letter: 0.5, nothing: 0, otherWords: -1 };

/** Undefined where the symbol cannot be of this kind. */
export function evidence(symbol: KnownSymbol, kind: QuantityKind): number | undefined {
  if (symbol.dimension !== kind.dimension) return undefined;
  const said = kindsSaid(symbol);
  if (kind.takes === 'told') return said.includes(kind) ? weight.toldByWords : undefined;
  // "Density difference" says density too, but what is special about it is the difference.
  if (kind.takes === 'any' && said.some((other) => other.takes === 'told')) return weight.otherWords;
  if (said.includes(kind)) return weight.words;
  if (said.some((other) => other.takes !== 'any')) return kind.takes === 'any' ? weight.otherWords : undefined;
  return hasLetter(symbol, kind) ? weight.letter : weight.nothing;
}

/** Kinds that the words at a symbol name. */
export function kindsSaid(symbol: KnownSymbol): readonly QuantityKind[] {
  let found = said.get(symbol);
  if (!found) {
    const text = wordsOf(symbol);
    found = text === '' ? [] : kindsOfDimension(symbol.dimension).filter((kind) => kind.words.test(text));
    said.set(symbol, found);
  }
  return found;
}

const said = new WeakMap<KnownSymbol, readonly QuantityKind[]>();

/** Description, unit in braces, and the words inside a long name: `speed_of_sound`, `wallThickness`. */
function wordsOf({ name, description, unit }: KnownSymbol): string {
  const tokens = lastPart(name).replace(/([a-z])([A-Z])/g, '$1 $2').split(/[_\s]+/);
  const words = tokens.filter((token) => token.length > 3 && !greek.has(token.toLowerCase()));
  const marked = unit && /^(Hz|rad|rev|rpm|rps)/i.test(unit.text) ? `{${unit.text}}` : '';
  return [description ?? '', words.join(' '), marked].join(' ').trim();
}

/** Spelled Greek letters are letters. */
const greek = new Set(['alpha', 'beta', 'gamma', 'delta', 'epsilon', 'kappa', 'lambda', 'sigma', 'theta', 'omega']);

function hasLetter({ name }: KnownSymbol, kind: QuantityKind): boolean {
  const last = lastPart(name);
  const stem = last.replace(/_.*$/, '').replace(/\d+$/, '');
  return kind.letters.includes(last) || kind.letters.includes(stem);
}

function lastPart(name: string): string {
  return name.split(/[.\]["]+/).filter(Boolean).at(-1) ?? name;
}
