/** Errors are warnings in a language whose errors on real code have not been judged often enough; a setting says otherwise. */
import { expect, test } from 'vitest';
import { frontEndEntries } from '../../server/src/frontends/registry.ts';
import { defaultSettings, engine, noFiles } from '../harness/engine.ts';

const faulty = { python: 'p = 2.0e5  # [Pa]\nh = 12.0  # [m]\nx = p + h\n', matlab: 'p = 2.0e5;  % [Pa]\nh = 12.0;  % [m]\nx = p + h;\n' } as const;

async function severity(language: keyof typeof faulty, settings = defaultSettings): Promise<string | undefined> {
  const workspace = await engine(noFiles, settings);
  await workspace.prepare(language);
  return workspace.check(language === 'python' ? 'a.py' : 'a.m', faulty[language], language).findings[0]?.severity;
}

test('Python and nomenclature files are not on trial', () => {
  expect(frontEndEntries.filter(({ onTrial }) => !onTrial).map(({ language }) => language)).toEqual(['python', 'nomenclature']);
});

test('the same fault in both', async () => {
  expect([await severity('python'), await severity('matlab')]).toEqual(['error', 'warning']);
  expect(await severity('matlab', { ...defaultSettings, severities: { 'unlike-terms': 'error' } })).toBe('error');
});
