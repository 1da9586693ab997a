import { expect, test } from 'vitest';
import { nodeAssets } from '../../server/src/platform/node-assets.ts';
import { loadSignatures } from '../../server/src/signatures/load.ts';
import { createWorkspace } from '../../server/src/service/workspace.ts';
import { defaultSettings, noFiles } from '../harness/engine.ts';

const workspace = await createWorkspace(nodeAssets(), noFiles, defaultSettings, ['julia']);

test('the signatures load without problems', () => {
  const loaded = loadSignatures(nodeAssets().signatures('julia'));
  expect(loaded.problems).toEqual([]);
  expect(loaded.functions.size).toBeGreaterThan(120);
});

// Definitions: Julia manual, Mathematics; Statistics; Linear Algebra.
test.each([
  ['h = 2.0  # [m]\nv = sqrt(2 * 9.81 * h)  # [m]', 'hidden-unit'],
  ['a = 30  # [deg]\ny = sin(a)', 'scale-mismatch'],
  ['a = 30  # [deg]\ny = sind(a)  # [-]', ''],
  ['x = [1, 2]  # [m]\ns = std(x)  # [m^2]', 'unlike-result'],
  ['x = [1, 2]  # [m]\nm = maximum(x)  # [m]', ''],
  ['F = [1, 2]  # [N]\ns = [3, 4]  # [m]\nW = dot(F, s)  # [J]', ''],
  ['F = [1, 2]  # [N]\ns = [3, 4]  # [m]\nW = dot(F, s)  # [W]', 'unlike-result'],
  ['x = 2  # [m]\ny = exp(x)', 'dimensioned-argument'],
])('%s', (text, code) => {
  expect(workspace.check('s.jl', text).findings.filter((each) => each.severity !== 'hint').map((each) => each.code).join()).toBe(code);
});
