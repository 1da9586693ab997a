import { join } from 'node:path';
import { build } from 'esbuild';
import { expect, test } from 'vitest';

test('the arithmetic of formulas is loaded when a formula is evaluated, and not before', async () => {
  const entry = join(import.meta.dirname, '../../../server/src/notes/nomenclature/evaluate.ts');
  const { metafile } = await build({ entryPoints: [entry], bundle: true, write: false, metafile: true, format: 'esm', splitting: true, outdir: 'out', platform: 'node', logLevel: 'silent' });
  const outputs = Object.values(metafile.outputs);
  const holdsMath = (output: (typeof outputs)[number]): boolean => Object.keys(output.inputs).some((input) => input.includes('node_modules/mathjs'));
  const first = outputs.find((output) => output.entryPoint?.endsWith('evaluate.ts'));
  const reached = new Set<string>();
  const follow = (output: (typeof outputs)[number] | undefined): void => {
    for (const { path, kind } of output?.imports ?? []) {
      if (kind !== 'import-statement' || reached.has(path)) continue;
      reached.add(path);
      follow(metafile.outputs[path]);
    }
  };
  follow(first);
  expect(first && holdsMath(first)).toBe(false);
  expect([...reached].filter((path) => metafile.outputs[path] && holdsMath(metafile.outputs[path]))).toEqual([]);
  expect(outputs.some(holdsMath)).toBe(true);
});
