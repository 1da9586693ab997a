/** `termwise check --fix`: what was fixed, in words and as a diff. */
import { createTwoFilesPatch } from 'diff';
import type { Repaired } from '../service/fix-all.ts';

/** `3 findings fixed in a.py: scale-mismatch 2, ambiguous-unit 1`. */
export function fixedSentence(name: string, { fixed }: Repaired, past = 'fixed'): string {
  const counts = Object.entries(fixed);
  const all = counts.reduce((sum, [, count]) => sum + count, 0);
  return `${all} finding${all === 1 ? '' : 's'} ${past} in ${name}: ${counts.map(([code, count]) => `${code} ${count}`).join(', ')}`;
}

/** A unified diff of a file, as `patch` and `git apply` read it; empty where nothing changed. */
export function unifiedDiff(name: string, before: string, after: string): string {
  if (before === after) return '';
  const [, from = '', to = '', ...rest] = createTwoFilesPatch(`a/${name}`, `b/${name}`, before, after, '', '', { context: 3 }).split('\n');
  return [from.trimEnd(), to.trimEnd(), ...rest].join('\n');
}
