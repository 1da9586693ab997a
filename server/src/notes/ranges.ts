const pattern = /^\s*(-?\d+(?:\.\d+)?(?:e[+-]?\d+)?)\s*(?:\.\.|to|…)\s*(-?\d+(?:\.\d+)?(?:e[+-]?\d+)?)/i;

/** A range behind a unit: `0.5 .. 3`, `0.5 to 3`. */
export function rangeIn(text: string): { readonly low: number; readonly high: number; readonly length: number } | undefined {
  const match = pattern.exec(text);
  if (!match) return undefined;
  const [low, high] = [Number(match[1]), Number(match[2])];
  return low <= high ? { low, high, length: match[0].length } : undefined;
}
