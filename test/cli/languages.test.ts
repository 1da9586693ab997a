import { expect, test } from 'vitest';
import { languageEndings, languageOf } from '../../server/src/cli/languages.ts';
import { nomenclatureFrontEnd } from '../../server/src/frontends/nomenclature/index.ts';
import { createPythonFrontEnd } from '../../server/src/frontends/python/index.ts';
import { nodeAssets } from '../../server/src/platform/node-assets.ts';

test('folders are searched for the endings that the front ends read', async () => {
  const assets = nodeAssets();
  const frontEnds = [await createPythonFrontEnd(assets.runtime, assets.grammar('python') as Uint8Array), nomenclatureFrontEnd];
  expect(languageEndings).toEqual(frontEnds.map((each) => [each.language, each.endings]));
});

test.each([['a.py', 'python'], ['A.PY', 'python'], ['a.nomen', 'nomenclature'], ['a.pyc', undefined], ['py', undefined]])('%s', (file, language) => {
  expect(languageOf(file)).toBe(language);
});
