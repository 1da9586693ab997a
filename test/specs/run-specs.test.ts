/**
 * Runs the texts of this folder. A section of `handbook` and `silent` is checked as a file of its own; the sections of a text in
 * `workspaces` are the files of one folder. Each must give its marked findings and no others.
 */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { languageOf, languages } from '../../server/src/frontends/registry.ts';
import { engine, filesOf } from '../harness/engine.ts';
import { deviations, readMarks, readSections } from '../harness/markers.ts';

const alone = await engine();

const folders = [
  { name: 'handbook', least: 100, silent: false },
  { name: 'silent', least: 100, silent: true },
];

for (const folder of folders) {
  const files = readdirSync(join(import.meta.dirname, folder.name)).filter((name) => name.endsWith('.py'));
  const read = files.map((name) => ({ name, sections: readSections(readFileSync(join(import.meta.dirname, folder.name, name), 'utf8')) }));

  test(`${folder.name}: the texts are there`, () => {
    expect(read.flatMap((file) => file.sections).length).toBeGreaterThanOrEqual(folder.least);
  });

  for (const file of read) {
    describe(`${folder.name}/${file.name}`, () => {
      test.each(file.sections.map((section) => [section.title, section] as const))('%s', (_title, section) => {
        const marked = readMarks(section.text);
        expect(marked.expectations.length > 0).toBe(!folder.silent && !section.title.endsWith('(clean)'));
        const problems = deviations(marked, alone.check('spec.py', marked.text), section.firstLine);
        expect(problems.join('\n'), `${folder.name}/${file.name}`).toBe('');
      });
    });
  }
}

const workspaces = readdirSync(join(import.meta.dirname, 'workspaces')).map((name) => [name, readFileSync(join(import.meta.dirname, 'workspaces', name), 'utf8')] as const);

describe.each(workspaces)('workspaces/%s', (_name, source) => {
  const files = readSections(source).filter(({ title }) => languageOf(title) !== undefined).map((section) => ({ section, marked: readMarks(section.text) }));
  const texts = Object.fromEntries(files.map(({ section, marked }) => [`work/${section.title}`, marked.text]));

  test.each(files.map((file) => [file.section.title, file] as const))('%s', async (title, { section, marked }) => {
    const workspace = await engine(filesOf(texts));
    await workspace.prepare(...languages);
    expect(deviations(marked, workspace.check(`work/${title}`, marked.text), section.firstLine).join('\n')).toBe('');
  });

  test('holds at least one mark', () => {
    expect(files.some((file) => file.marked.expectations.length > 0)).toBe(true);
  });
});
