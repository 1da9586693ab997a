import { describe, expect, test } from 'vitest';
import { frontEndEntries, languageOf } from '../../server/src/frontends/registry.ts';
import { loadFrontEnd } from '../harness/front-ends.ts';

describe.each(frontEndEntries.map((entry) => [entry.language, entry] as const))('%s', (language, { endings }) => {
  test('is what its line of the registry says', async () => {
    const { language: own, endings: read } = await loadFrontEnd(language);
    expect([own, read]).toEqual([language, endings]);
  });

  test('has endings that no other language has', () => {
    expect(endings.map((ending) => languageOf(`a${ending}`))).toEqual(endings.map(() => language));
  });
});

test.each([['a.py', 'python'], ['A.PY', 'python'], ['a.nomen', 'nomenclature'], ['a.pyc', undefined], ['py', undefined]])('%s', (file, language) => {
  expect(languageOf(file)).toBe(language);
});
