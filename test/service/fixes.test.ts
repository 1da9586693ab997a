import { expect, test } from 'vitest';
import { applyProven } from '../../server/src/service/fix-all.ts';
import { applyEdits } from '../../server/src/repairs/apply.ts';
import { engine } from '../harness/engine.ts';

const file = '/scripts/a.py';
const script = `import math
p = 2.0     # [kPa]
q = 150.0   # [Pa]
dp = p - q  # [Pa]
a = 30.0    # [deg]
s = math.sin(a)
k = 0.6     # [w/m/K]
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
    text: script.replace('p - q', 'p*1000 - q').replace('sin(a)', 'sin(math.radians(a))').replace('w/m/K', 'W/m/K'),
    fixed: { 'scale-mismatch': 2, 'ambiguous-unit': 1 },
  });
  expect(applyProven(workspace, file, script, 'python', 'ambiguous-unit').text).toBe(script.replace('w/m/K', 'W/m/K'));
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

const module_ = `import math


def area(d):
    """Cross section.

    Parameters
    ----------
    d : float
        Diameter [m]
    """
    return math.pi*d/4


def flow(d, V, rho, length):
    """Mass flow.

    Parameters
    ----------
    d : float
        Diameter [m]
    V : float
        Speed [m/s]
    rho : float
        Density [kg/m^3]
    length : float
        Length [m]

    Returns
    -------
    m : float
        Mass flow [kg/s]
    """
    return rho*V*area(d)


def power(d, V, rho, dp):
    # d [m], V [m/s], rho [kg/m^3], dp [Pa]
    P = dp*flow(d, V, rho, 1.0)  # [W]
    return P
`;

test('inside functions too, where only what the change reaches is checked again', async () => {
  const workspace = await engine();
  const before = workspace.check(file, module_).findings.filter((each) => each.severity !== 'hint');
  expect(before.length).toBe(2);
  const offered = workspace.fixes(file);
  expect(offered.filter((fix) => fix.kind === 'repair').length).toBeGreaterThan(0);
  for (const fix of offered.filter((each) => each.edits.length > 0)) {
    const after = workspace.check(file, applyEdits(module_, fix.edits)).findings.filter((each) => each.severity !== 'hint');
    expect([fix.title, after.length]).toEqual([fix.title, before.length - 1 - fix.alsoSettles]);
  }
});

test('a change that would break a caller is not offered', async () => {
  const workspace = await engine();
  const text = `def speed(d, t):
    # d [m], t [s]
    v = d*t
    return v


def drop(d, t, rho):
    # d [m], t [s], rho [kg/m^3]
    x = rho*speed(d, t)  # [kg/(m^2 s)]
    return x


def other(d, t):
    # d [m], t [s]
    y = speed(d, t)  # [m s]
    return y
`;
  workspace.check(file, text);
  for (const fix of workspace.fixes(file).filter((each) => each.kind === 'repair')) {
    expect(applyEdits(text, fix.edits)).toContain('v = d*t\n');
  }
});
