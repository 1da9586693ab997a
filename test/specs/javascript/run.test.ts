/** Runs the texts of this folder: each section is checked as a file of its own and must give its marked findings and no others. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { nodeAssets } from '../../../server/src/platform/node-assets.ts';
import { createWorkspace } from '../../../server/src/service/workspace.ts';
import { defaultSettings, noFiles } from '../../harness/engine.ts';
import { loadFrontEnd } from '../../harness/front-ends.ts';
import { deviations, readMarks, readSections } from '../../harness/markers.ts';

const workspace = await createWorkspace(nodeAssets(), noFiles, defaultSettings, ['javascript']);
const javascript = await loadFrontEnd('javascript');

describe.each([{ name: 'handbook', marked: true }, { name: 'silent', marked: false }])('$name', ({ name, marked: isMarked }) => {
  const sections = readSections(readFileSync(join(import.meta.dirname, `${name}.js`), 'utf8'));

  test('the texts are there', () => expect(sections.length).toBeGreaterThanOrEqual(25));

  test.each(sections.map((section) => [section.title, section] as const))('%s', (_title, section) => {
    const marked = readMarks(section.text);
    expect(marked.expectations.length > 0).toBe(isMarked);
    expect(javascript.parse(marked.text, 'spec.js').program.chunks.flatMap((chunk) => chunk.problems)).toEqual([]);
    expect(deviations(marked, workspace.check('spec.js', marked.text), section.firstLine).join('\n')).toBe('');
  });
});
