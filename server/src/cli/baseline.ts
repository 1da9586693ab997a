/**
 * Findings that are known already: an old project takes up the checks at once, and only what is new counts. A known finding is found again
 * by its file, its code and the text of its line, wherever the line has moved to.
 */
import type { Reported } from './report.ts';

interface Entry {
  readonly file: string;
  readonly code: string;
  /** The line with its blanks reduced. */
  readonly line: string;
  /** How often the same line has the same finding. */
  readonly count: number;
}

/** A list of known findings; each counts as often as it was written down. */
export class Baseline {
  private readonly left = new Map<string, number>();
  /** How many findings were known. */
  known = 0;

  private constructor(entries: readonly Entry[]) {
    for (const entry of entries) this.left.set(keyOf(entry), (this.left.get(keyOf(entry)) ?? 0) + entry.count);
  }

  /** Reads what `written` wrote; a sentence where that cannot be. */
  static read(text: string): Baseline | string {
    let read: unknown;
    try {
      read = JSON.parse(text);
    } catch {
      return 'it is not JSON';
    }
    const { version, known } = typeof read === 'object' && read !== null ? (read as { version?: unknown; known?: unknown }) : {};
    if (version !== 1 || !Array.isArray(known)) return 'it is no list of known findings; --write-baseline writes one';
    const entries = known.filter((each): each is Entry => typeof each?.file === 'string' && typeof each.code === 'string' && typeof each.line === 'string' && Number.isInteger(each.count));
    return entries.length === known.length ? new Baseline(entries) : 'an entry of it has no file, code, line or count';
  }

  /** Whether a finding is known; each entry answers as often as it was counted. */
  knows(finding: Reported): boolean {
    const key = keyOf(entryOf(finding));
    const left = this.left.get(key) ?? 0;
    if (left === 0) return false;
    this.left.set(key, left - 1);
    this.known++;
    return true;
  }

  /** Known findings that were not met: what was mended, or lies in files that were not checked. */
  get unmet(): number {
    return [...this.left.values()].reduce((sum, each) => sum + each, 0);
  }
}

/** Findings as a list that can be kept: sorted, so that two versions of it compare line by line. Hints are left out: they never fail a run. */
export function written(findings: readonly Reported[]): string {
  const entries = new Map<string, Entry>();
  for (const finding of findings) {
    if (finding.severity === 'hint' || finding.severity === 'information') continue;
    const entry = entryOf(finding);
    entries.set(keyOf(entry), { ...entry, count: (entries.get(keyOf(entry))?.count ?? 0) + 1 });
  }
  const sorted = [...entries].sort(([a], [b]) => (a < b ? -1 : 1)).map(([, entry]) => `    ${JSON.stringify(entry)}`);
  return `{\n  "version": 1,\n  "known": [${sorted.length > 0 ? `\n${sorted.join(',\n')}\n  ` : ''}]\n}\n`;
}

function entryOf({ file, code, source }: Reported): Entry {
  return { file, code, line: source.trim().replace(/\s+/g, ' '), count: 1 };
}

function keyOf({ file, code, line }: Entry): string {
  return `${file}\0${code}\0${line}`;
}
