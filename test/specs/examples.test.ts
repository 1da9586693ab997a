/** The example workspace: its README lists the faults that were put in on purpose; nothing else may be reported. */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { languageOf } from '../../server/src/frontends/registry.ts';
import { LineIndex } from '../../server/src/text/line-index.ts';
import { engine, filesOf } from '../harness/engine.ts';

const folder = join(import.meta.dirname, '../../examples');
const names = readdirSync(folder).filter((name) => languageOf(name) !== undefined);
const texts = Object.fromEntries(names.map((name) => [`examples/${name}`, readFileSync(join(folder, name), 'utf8')]));
const workspace = await engine(filesOf(texts));
await workspace.prepare(...new Set(names.flatMap((name) => languageOf(name) ?? [])));

/** The rows of the README's table, in the order of their files and lines. */
function listed(): readonly string[] {
  const rows = [...readFileSync(join(folder, 'README.md'), 'utf8').matchAll(/^\| `([^`]+)` \| `([^`]+)` \| `([^`]+)` \|/gm)];
  return rows.map(([, file, place, code]) => `${file} | ${code} | ${lineWith(String(file), String(place))}`).sort();
}

/** The one line of a file that holds the words, from one. */
function lineWith(file: string, words: string): number {
  const lines = (texts[`examples/${file}`] ?? '').split('\n');
  const found = lines.flatMap((line, at) => (line.includes(words) ? [at + 1] : []));
  if (found.length !== 1) throw new Error(`${file}: ${found.length} lines hold ${words}`);
  return found[0] as number;
}

test('the faults that the README lists, and no others', () => {
  const found = Object.entries(texts).flatMap(([file, text]) => {
    const index = new LineIndex(text);
    const findings = workspace.check(file, text).findings.filter((each) => each.severity === 'error' || each.severity === 'warning');
    return findings.map((each) => `${file.replace('examples/', '')} | ${each.code} | ${index.lineAt(each.span.start) + 1}`);
  });
  expect(found.sort()).toEqual(listed());
});

test('the faults spread over the codes', () => {
  expect(new Set(listed().map((row) => row.split(' | ')[1])).size).toBeGreaterThanOrEqual(8);
});
