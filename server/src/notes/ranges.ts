const number = '[-+]?\\d+(?:\\.\\d*)?(?:[eE][-+]?\\d+)?';
const pattern = new RegExp(`^\\s*,?\\s*(${number})\\s*(?:\\.{2,3}|…|–|to\\b)\\s*(${number})(?![\\w.])`);

/** A range at the head of a text: `0.5 .. 3`, `0.5 to 3`; `length` counts its characters. */
export function rangeIn(text: string): { readonly low: number; readonly high: number; readonly length: number } | undefined {
  const match = pattern.exec(text);
  if (!match) return undefined;
  const [low, high] = [Number(match[1]), Number(match[2])];
  return low <= high ? { low, high, length: match[0].length } : undefined;
}
