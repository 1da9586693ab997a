import { distance } from '../quantities/nearest.ts';

/** The nearest of the known words, or undefined where none is near. */
export function nearestWord(word: string, known: readonly string[]): string | undefined {
  const ranked = known.map((each) => [distance(word.toLowerCase(), each.toLowerCase()), each] as const).sort((a, b) => a[0] - b[0]);
  const best = ranked[0];
  const limit = Math.max(1, Math.round(word.length * 0.4));
  return best && best[0] <= limit ? best[1] : undefined;
}

/** ` Did you mean …?` with a leading blank, or nothing. */
export function didYouMean(word: string, known: readonly string[]): string {
  const near = nearestWord(word, known);
  return near === undefined ? '' : ` Did you mean ${near}?`;
}
