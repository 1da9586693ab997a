/** English spellings of unit names: plurals, and -er for -re. */

const irregular: Readonly<Record<string, string>> = { foot: 'feet', inch: 'inches', henry: 'henries', lux: 'lux', siemens: 'siemens', hertz: 'hertz' };

/** A name with its plural, in British and American spelling: `metre`, `metres`, `meter`, `meters`. */
export function spellingsOf(name: string): readonly string[] {
  const many = plural(name);
  if (!name.includes('re')) return many === name ? [name] : [name, many];
  const american = name.replace(/(met|lit)re/g, '$1er');
  return american === name ? [name, many] : [name, many, american, plural(american)];
}

/** The plural falls on the word before `per` or `of`, else on the last: `feet per second`, `inches of water`. */
function plural(name: string): string {
  const [per, of] = [name.indexOf(' per '), name.indexOf(' of ')];
  const end = per >= 0 && (of < 0 || per < of) ? per : of >= 0 ? of : name.length;
  const start = Math.max(name.lastIndexOf(' ', end - 1), name.lastIndexOf('-', end - 1)) + 1;
  return name.slice(0, start) + pluralWord(name.slice(start, end)) + name.slice(end);
}

function pluralWord(word: string): string {
  const known = irregular[word];
  if (known !== undefined) return known;
  const last = word.at(-1);
  if (last === 's' || last === 'x' || last === 'z' || word === 'feet') return word;
  if (word.endsWith('ch') || word.endsWith('sh')) return `${word}es`;
  return last === 'y' && !/[aeiou]y$/.test(word) ? `${word.slice(0, -1)}ies` : `${word}s`;
}
