import { cpSync, mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { basename, join } from 'node:path';
import type { Script } from '../corpus/scripts.ts';

export interface ManyLines {
  readonly folder: string;
  readonly files: number;
  readonly lines: number;
  remove(): void;
}

/** A folder with copies of the scripts, each round in a folder of its own, until the lines are reached. */
export function manyLines(scripts: readonly Script[], wanted: number): ManyLines {
  const folder = mkdtempSync(join(tmpdir(), 'termwise-bench-'));
  let [files, lines] = [0, 0];
  for (let round = 0; lines < wanted; round++) {
    const inside = join(folder, `copy${round}`);
    mkdirSync(inside);
    for (const script of scripts) {
      if (lines >= wanted) break;
      cpSync(script.file, join(inside, `${files}_${basename(script.file)}`));
      files++;
      lines += script.text.split('\n').length;
    }
  }
  return { folder, files, lines, remove: () => rmSync(folder, { recursive: true, force: true }) };
}
