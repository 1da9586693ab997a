import { describe, expect, it, test } from 'vitest';
import { createWorkspace } from '../../../server/src/service/workspace.ts';
import { nodeAssets } from '../../../server/src/platform/node-assets.ts';
import { defaultSettings, filesOf } from '../../harness/engine.ts';
import { matlab } from './helpers.ts';

const paths = ['plant/run.m', 'plant/flow.m', 'plant/private/loss.m', 'plant/+fluid/density.m', 'plant/lib/level.m', 'plant/old/level2.m', 'plant/lib/twice.m', 'plant/old/twice.m', 'tools/x.m'];
const files = filesOf(Object.fromEntries(paths.map((path) => [path, ''])));

describe('where a function is found', () => {
  it.each([
    ['flow', 'plant/flow.m'], ['loss', 'plant/private/loss.m'], ['fluid.density', 'plant/+fluid/density.m'], ['level', 'plant/lib/level.m'],
    ['twice', undefined], ['x', undefined], ['end', undefined], ['fluid.viscosity', undefined],
  ])('%s', (name, file) => expect(matlab.neighbour?.('plant/run.m', name, files)).toBe(file));

  it('from a folder below, the one above', () => expect(matlab.neighbour?.('plant/lib/level.m', 'flow', files)).toBe('plant/flow.m'));
});

async function findings(texts: Readonly<Record<string, string>>, file: string): Promise<readonly string[]> {
  const workspace = await createWorkspace(nodeAssets(), filesOf(texts), defaultSettings, ['matlab']);
  return workspace.check(file, texts[file] as string).findings.map((each) => `${each.code}: ${(texts[file] as string).slice(each.span.start, each.span.end)}`);
}

const flow = 'function [q, v] = flow(d)\n% d = depth [m]\n% q = flow [m^3/s]\n% v = velocity [m/s]\nq = 2; v = 3;\nend\n';

test('a call is checked against the file of the function', async () => {
  expect(await findings({ 'plant/flow.m': flow, 'plant/run.m': 't = 2; % [s]\nq = flow(t);' }, 'plant/run.m')).toEqual(['unlike-result: t']);
});

test('one result is the first, several are told apart', async () => {
  expect(await findings({ 'plant/flow.m': flow, 'plant/run.m': 'd = 1; % [m]\nq = flow(d); % [m^3/s]\n[q, v] = flow(d); % [m^3/s], [m/s]\nw = flow(d); % [m/s]' }, 'plant/run.m')).toEqual(['unlike-result: flow(d)']);
  expect(await findings({ 'plant/run.m': 'd = [1 2]; % [m]\nt = [1 2]; % [s]\n[m, i] = max(d);\nt(i) + t;\nt + max(d);' }, 'plant/run.m')).toEqual(['unlike-terms: t + max(d)']);
});

test('a function of a package', async () => {
  expect(await findings({ 'plant/+fluid/density.m': 'function rho = density(T)\n% T - temperature [K]\nrho = 3;\nend', 'plant/run.m': 't = 2; % [s]\nrho = fluid.density(t);' }, 'plant/run.m')).toEqual(['unlike-result: t']);
});

test('a wrong output is told where it got its value', async () => {
  expect(await findings({ 'f.m': 'function p = f(h, g)\n% p = pressure [Pa]\n% h = depth [m]\np = h;\np = p*1.0;\nend' }, 'f.m')).toEqual(['unlike-result: p*1.0']);
});

test('a symbol of the nomenclature goes before a built-in function of that name, unless that is called', async () => {
  const texts = { 'p/x.nomen': 'beta [1/K]  expansion\nD [m]  diameter\n', 'p/a.m': 'function y = f(T)\n% T - temperature [K]\ny = beta*T + 1;\ny = beta + D;\ny = beta(2, 3) + 4;\nend\n' };
  const workspace = await createWorkspace(nodeAssets(), filesOf(texts), defaultSettings, ['matlab', 'nomenclature']);
  expect(workspace.check('p/a.m', texts['p/a.m']).findings.filter((each) => each.code === 'unlike-terms').map((each) => texts['p/a.m'].slice(each.span.start, each.span.end))).toEqual(['beta + D']);
});
