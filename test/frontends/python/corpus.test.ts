/** Real scripts, where a folder of them is named: `TERMWISE_CORPUS=<folder> npx vitest run test/frontends`. */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { faultsOf } from '../../../server/src/program/well-formed.ts';
import { parsePython } from '../../harness/python.ts';

const folder = process.env['TERMWISE_CORPUS'];

describe.skipIf(folder === undefined)('every script of the corpus', () => {
  it('lowers to a well-formed program', () => {
    const files = scriptsIn(folder ?? '.');
    expect(files.length).toBeGreaterThan(0);
    for (const file of files) {
      const text = readFileSync(file, 'utf8');
      expect(faultsOf(parsePython(text), text), file).toEqual([]);
    }
  });
});

function scriptsIn(folder: string): readonly string[] {
  return readdirSync(folder, { recursive: true, encoding: 'utf8' }).filter((name) => name.endsWith('.py')).map((name) => join(folder, name));
}
