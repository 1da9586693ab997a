/**
 * One set of specifications, run once per language: the sections of `handbook` and `silent`, which are Python, are written again in every
 * language from the common program form, and must give the same findings there. What a language cannot say is left out and counted.
 */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { languages } from '../../server/src/frontends/registry.ts';
import { engine } from '../harness/engine.ts';
import { loadFrontEnd } from '../harness/front-ends.ts';
import { hosts } from '../harness/hosts/index.ts';
import { deviations, readMarks, readSections } from '../harness/markers.ts';
import { writeSection } from '../harness/writing/section.ts';

/** How many sections at least each language says; the writer and the language's printer hold them up. */
const floors: Readonly<Record<string, number>> = {
  python: 247,
  matlab: 235,
  julia: 238,
  javascript: 229,
  typescript: 229,
};

const sections = ['handbook', 'silent'].flatMap((folder) => readdirSync(join(import.meta.dirname, folder)).filter((name) => name.endsWith('.py')).flatMap((name) =>
  readSections(readFileSync(join(import.meta.dirname, folder, name), 'utf8')).map((section) => ({ title: `${folder}/${name}: ${section.title}`, marked: readMarks(section.text) }))));

const workspace = await engine();

for (const host of hosts) {
  const floor = floors[host.language];
  if (!languages.includes(host.language) || floor === undefined) continue;
  await workspace.prepare(host.language);
  const frontEnd = await loadFrontEnd(host.language);
  const all = sections.map(({ title, marked }) => ({ title, section: writeSection(marked, host, frontEnd) }));
  const said = all.flatMap(({ title, section }) => (section.said ? [{ title, section }] : []));
  const left = all.flatMap(({ section }) => (section.said ? [] : [section.reason]));

  describe(host.language, () => {
    test(`${said.length} of ${all.length} sections can be said`, () => {
      const reasons = [...new Set(left)].map((reason) => `${left.filter((each) => each === reason).length} ${reason}`);
      process.stdout.write(`${host.language}: ${said.length} of ${all.length} sections; left out: ${reasons.join(', ')}\n`);
      expect(said.length).toBeGreaterThanOrEqual(floor);
    });

    test.each(said.map(({ title, section }) => [title, section] as const))('%s', (_title, { marked, notes }) => {
      const parsed = frontEnd.parse(marked.text, host.fileName);
      parsed.release();
      expect(parsed.program.chunks.flatMap((chunk) => chunk.problems.map((each) => each.message)), marked.text).toEqual([]);
      const result = workspace.check(host.fileName, marked.text, host.language);
      expect(deviations(marked, result).join('\n'), marked.text).toBe('');
      expect(result.statistics.notes, marked.text).toBeGreaterThanOrEqual(notes);
    });
  });
}
