import { expect, test } from 'vitest';
import { applyProven } from '../../server/src/service/fix-all.ts';
import { applyEdits } from '../../server/src/service/fixes.ts';
import { engine } from '../harness/engine.ts';

const file = '/scripts/a.py';
const script = `import math
p = 2.0     # [kPa]
q = 150.0   # [Pa]
dp = p - q  # [Pa]
a = 30.0    # [deg]
s = math.sin(a)
k = 0.6     # [W/m K]
x = q + a
`;

test('nothing is offered for a file that was not checked', async () => {
  expect((await engine()).fixes(file)).toEqual([]);
});

test('only what touches the span; all of the file without one', async () => {
  const workspace = await engine();
  workspace.check(file, script);
  const at = script.indexOf('p - q');
  expect(new Set(workspace.fixes(file, { start: at, end: at }).filter((fix) => fix.finding).map((fix) => fix.finding?.code))).toEqual(new Set(['scale-mismatch']));
  expect(new Set(workspace.fixes(file).map((fix) => fix.finding?.code))).toEqual(new Set(['scale-mismatch', 'ambiguous-unit', 'unlike-terms']));
});

test('asking twice gives the same, and leaves the check as it was', async () => {
  const workspace = await engine();
  const before = workspace.check(file, script);
  const first = workspace.fixes(file);
  expect(workspace.fixes(file)).toEqual(first);
  expect(workspace.check(file, script).findings).toEqual(before.findings);
  for (const fix of first) expect(fix.finding === undefined || before.findings.some((each) => each.code === fix.finding?.code && each.span.start === fix.finding.span.start)).toBe(true);
});

test('every fix that is offered loses its finding and brings none', async () => {
  const workspace = await engine();
  const before = workspace.check(file, script).findings.length;
  for (const fix of workspace.fixes(file).filter((each) => each.edits.length > 0)) {
    const after = workspace.check(file, applyEdits(script, fix.edits)).findings;
    expect(after.length).toBe(before - 1 - fix.alsoSettles);
  }
});

test('all that is proven at once, or of one code', async () => {
  const workspace = await engine();
  expect(applyProven(workspace, file, script)).toEqual({
    text: script.replace('p - q', 'p*1000 - q').replace('sin(a)', 'sin(math.radians(a))').replace('W/m K', 'W/(m K)'),
    fixed: { 'scale-mismatch': 2, 'ambiguous-unit': 1 },
  });
  expect(applyProven(workspace, file, script, 'python', 'ambiguous-unit').text).toBe(script.replace('W/m K', 'W/(m K)'));
});

test('what is only likely, or a choice, is never applied to all', async () => {
  const workspace = await engine();
  const text = 'p = 1.0  # [kPa]\nq = 2.0  # [Pa]\nx = p + q\nR = 287.0  # [J/(kg K)]\nT = 20.0  # [degC]\nrho = q/(R*T)  # [kg/m^3]\n';
  expect(applyProven(workspace, file, text)).toEqual({ text, fixed: {} });
});

test.each(['', 'def f(:\n  x = (1', '# [m]\nx = y\n', 'x = 1.0  # [m]\ny = x + \n', '\uD800 = 3 # [m]'])('broken text %j gives no fault', async (text) => {
  const workspace = await engine();
  workspace.check(file, text);
  expect(() => workspace.fixes(file, { start: 0, end: text.length })).not.toThrow();
  expect(() => workspace.fixes(file)).not.toThrow();
});

test('a nomenclature file is answered too', async () => {
  const workspace = await engine();
  workspace.check('/scripts/n.nomen', 'k [W/m K] = 0.6\n');
  expect(() => workspace.fixes('/scripts/n.nomen')).not.toThrow();
});
