import { expect, test } from 'vitest';
import { readFile } from './helpers.ts';

test('blanks inside a unit are one, so that messages are', () => {
  const [read] = readFile('V = 2.0  # √     V\n').chunks;
  expect(read?.notes.notes.map(({ unit }) => unit.text)).toEqual(['√ V']);
});
