import { expect, test } from 'vitest';
import { createWorkspace } from '../../../server/src/service/workspace.ts';
import { nodeAssets } from '../../../server/src/platform/node-assets.ts';
import { defaultSettings, noFiles } from '../../harness/engine.ts';

const workspace = await createWorkspace(nodeAssets(), noFiles, defaultSettings, ['matlab']);

/** The text after the first fix of a kind, for the only finding. */
function after(text: string, kind: string): string | undefined {
  workspace.check('fix.m', text);
  const offer = workspace.fixes('fix.m').find((each) => each.kind === kind);
  return offer && [...offer.edits].sort((a, b) => b.start - a.start).reduce((now, edit) => now.slice(0, edit.start) + edit.text + now.slice(edit.end), text);
}

test.each([
  ['an angle by a built-in function', 'convert', 'a = 30;  % [deg]\ny = sin(a);', 'a = 30;  % [deg]\ny = sin(deg2rad(a));'],
  ['a number with a name', 'name-number', 'h = 1.7;  % [m]\nv = sqrt(2*9.81*h);  % [m/s]', 'h = 1.7;  % [m]\ng = 9.81;  % [m/s^2] standard acceleration of free fall\nv = sqrt(2*g*h);  % [m/s]'],
  ['a factor', 'convert', 'p = 3;  % [kPa]\nq = 4;  % [Pa]\nr = p + q;', 'p = 3;  % [kPa]\nq = 4;  % [Pa]\nr = p*1000 + q;'],
  ['two pi', 'convert', 'n = 3;  % [rev/s]\nw = n;  % [rad/s]', 'n = 3;  % [rev/s]\nw = n*2*pi;  % [rad/s]'],
])('%s', (_name, kind, text, fixed) => expect(after(text, kind)).toBe(fixed));

test('what a script assigns is not offered inside a function', () => {
  const text = 'h = 1.7;  % [m]\nfunction y = f(x)\n% x [m] length\ny = x^2;  % [m]\nend';
  workspace.check('fix.m', text);
  expect(workspace.fixes('fix.m').map((each) => each.title).join()).not.toMatch(/\/h\b/);
});
