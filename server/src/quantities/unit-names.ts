/** English spellings of unit names: plurals, and -er for -re. */

const irregular: Readonly<Record<string, string>> = { foot: 'feet', inch: 'inches', henry: 'henries', lux: 'lux', siemens: 'siemens', hertz: 'hertz' };

/** A name with its plural, in British and American spelling: `metre`, `metres`, `meter`, `meters`. */
export function spellingsOf(name: string): readonly string[] {
  const spellings = new Set<string>();
  for (const each of [name, name.replace(/(met|lit)re/g, '$1er')]) {
    spellings.add(each);
    spellings.add(plural(each));
  }
  return [...spellings];
}

/** The plural falls on the word before `per` or `of`, else on the last: `feet per second`, `inches of water`. */
function plural(name: string): string {
  const words = name.split(' ');
  const joint = words.findIndex((_, at) => words[at + 1] === 'per' || words[at + 1] === 'of');
  const at = joint >= 0 ? joint : words.length - 1;
  words[at] = pluralWord(words[at] as string);
  return words.join(' ');
}

function pluralWord(word: string): string {
  const cut = word.lastIndexOf('-') + 1;
  const last = word.slice(cut);
  const known = irregular[last];
  if (known !== undefined) return word.slice(0, cut) + known;
  if (/(?:s|x|z|feet|inches)$/.test(last)) return word;
  if (/(?:ch|sh)$/.test(last)) return `${word}es`;
  return /[^aeiou]y$/.test(last) ? `${word.slice(0, -1)}ies` : `${word}s`;
}
