/** Where blocks end: `end if`, `enddo`, a bare `end`. */
import type { Reader } from './reader.ts';
import type { Token } from './tokens.ts';

/** What an end closes; '' for a bare one. */
export interface Closer {
  readonly word: string;
  /** Tokens of the end itself, without the name behind it. */
  readonly length: number;
}

const words = new Set([
  'if', 'do', 'select', 'where', 'forall', 'associate', 'block', 'critical', 'team', 'type', 'interface', 'enum', 'function', 'subroutine', 'procedure', 'program', 'module', 'submodule', 'blockdata',
]);
export const unitWords = new Set(['', 'function', 'subroutine', 'procedure', 'program', 'module', 'submodule', 'blockdata']);

/** The end that stands at the next token; undefined where there is none: `end` may be a variable. */
export function closerAt(reader: Reader): Closer | undefined {
  const { token } = reader;
  if (token.kind !== 'name' || !token.text.startsWith('end')) return undefined;
  const next = reader.peek();
  if (token.text === 'end') {
    if (!next || next.kind === 'break') return { word: '', length: 1 };
    if (next.kind !== 'name' || !words.has(next.text)) return undefined;
    if (next.text === 'block' && reader.isName('data', 2)) return { word: 'blockdata', length: 3 };
    return isTarget(reader.peek(2)) ? undefined : { word: next.text, length: 2 };
  }
  const word = token.text.slice(3);
  return words.has(word) && !isTarget(next) ? { word, length: 1 } : undefined;
}

function isTarget(behind: Token | undefined): boolean {
  return behind?.kind === 'op' && (behind.text === '=' || behind.text === '%' || behind.text === '=>');
}

/** Takes the end of a block that `opener` began; a problem where another end or none stands there. */
export function closeBlock(reader: Reader, word: string, opener: Token): void {
  const closer = closerAt(reader);
  if (closer?.word === word) {
    reader.at += closer.length;
    if (word === 'interface') reader.skipStatement();
    else if (reader.token.kind === 'name') reader.next();
    return;
  }
  reader.problem(`${opener.text} is not closed`, opener);
  // An end that nothing around waits for is taken for this one's.
  if (closer && !reader.open.includes(closer.word) && !unitWords.has(closer.word)) reader.skipStatement();
}
