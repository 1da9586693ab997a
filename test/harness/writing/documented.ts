/** Notes of parameters and results, as the reader of notes finds them in the Python text, ready to be written in another form. */
import type { Note } from '../../../server/src/notes/types.ts';
import type { FunctionStmt } from '../../../server/src/program/nodes.ts';
import type { NotedName } from '../hosts/host.ts';
import { unsayable } from './unsayable.ts';

export interface Documented {
  readonly params: ReadonlyMap<string, Pick<NotedName, 'unit' | 'words'>>;
  /** By position. */
  readonly results: ReadonlyMap<number, Pick<NotedName, 'unit' | 'words'>>;
  /** Offsets of the notes in the chunk, by the parameter's name or the result's position. */
  readonly places: ReadonlyMap<string | number, number>;
  readonly summary: string;
  readonly remarks: readonly string[];
}

/** What is said of a function's parameters and of its results. Throws where it has notes that have no place in that. */
export function documentedBy(fn: FunctionStmt, notes: readonly Note[]): Documented {
  const params = new Map<string, Pick<NotedName, 'unit' | 'words'>>();
  const places = new Map<string | number, number>();
  const results = new Map<number, Pick<NotedName, 'unit' | 'words'>>();
  for (const note of notes) {
    const { target } = note;
    const words = { unit: note.unit.text, words: plain(note.description ?? '') };
    if (target.kind === 'parameter' && target.owner === fn) {
      if (params.has(target.param.name)) unsayable('two notes on a parameter');
      params.set(target.param.name, words);
      places.set(target.param.name, note.span.start);
    } else if (target.kind === 'result' && target.owner === fn) {
      const position = target.position ?? 0;
      if (results.has(position)) unsayable('two notes on a result');
      results.set(position, words);
      places.set(position, note.span.start);
    }
  }
  const lines = (fn.doc?.text ?? '').split('\n').map((line) => line.trim());
  return { params, results, places, summary: plain(lines.find((line) => line !== '') ?? ''), remarks: lines.filter((line) => /^(?:empirical:|termwise:)|\bdepends on\b/.test(line)) };
}

/** Words that no reader takes for markup or for a unit. */
function plain(text: string): string {
  return text.replace(/[[\](){}*@\\`:]/g, ' ').replace(/\s+/g, ' ').replace(/[\s,;–—-]+$/, '').trim();
}
