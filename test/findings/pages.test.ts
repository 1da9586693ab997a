/** The page of every check: its parts are there, and its examples give what they say. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { type FindingCode, findingCodes, type Severity } from '../../server/src/findings/finding.ts';
import { engine } from '../harness/engine.ts';
import { deviations, readMarks } from '../harness/markers.ts';

const workspace = await engine();
const folder = join(import.meta.dirname, '../../server/src/findings/checks');

/** Default severities, from the table of codes in the design; the page's second line states them. */
const severities: Record<FindingCode, Severity> = {
  'unlike-terms': 'error',
  'unlike-result': 'error',
  'dimensioned-exponent': 'error',
  'dimensioned-argument': 'error',
  'scale-mismatch': 'error',
  'offset-misuse': 'error',
  'hidden-unit': 'warning',
  'conflicting-notes': 'warning',
  'unreadable-unit': 'warning',
  'ambiguous-unit': 'hint',
  'bare-addend': 'hint',
};

const parts = ['What it means', 'Why it matters', 'How to settle it', 'Flagged', 'Clean'];

/** The fenced examples under a heading, with the line of the page on which each begins. */
function examples(page: string, part: string): readonly { readonly line: number; readonly text: string }[] {
  const lines = page.split('\n');
  const found: { line: number; text: string }[] = [];
  let heading = '';
  let start = -1;
  lines.forEach((line, at) => {
    if (start < 0 && line.startsWith('## ')) heading = line.slice(3).trim();
    if (start < 0 && line === '```python') start = at + 1;
    else if (start >= 0 && line === '```') {
      if (heading === part) found.push({ line: start, text: `${lines.slice(start, at).join('\n')}\n` });
      start = -1;
    }
  });
  return found;
}

describe.each(findingCodes)('%s', (code) => {
  const page = readFileSync(join(folder, `${code}.md`), 'utf8');

  test('has its parts in order and states its severity', () => {
    const headings = [...page.matchAll(/^## (.*)$/gm)].map((each) => each[1]);
    expect(headings).toEqual(parts);
    expect(page.split('\n')[2]).toMatch(new RegExp(`^\`${code}\` · ${severities[code]}\\b`));
  });

  test.each(examples(page, 'Flagged').map((each) => [each.line + 1, each] as const))('flagged example on line %i', (_line, example) => {
    const marked = readMarks(example.text);
    expect(marked.expectations.length).toBeGreaterThan(0);
    expect(marked.expectations.every((each) => each.code === code)).toBe(true);
    const result = workspace.check('example.py', marked.text);
    expect(deviations(marked, result, example.line).join('\n')).toBe('');
  });

  test.each([...examples(page, 'Clean'), ...examples(page, 'How to settle it')].map((each) => [each.line + 1, each] as const))('clean example on line %i', (_line, example) => {
    const marked = readMarks(example.text);
    expect(marked.expectations).toEqual([]);
    const result = workspace.check('example.py', marked.text);
    expect(deviations(marked, result, example.line).join('\n')).toBe('');
    expect(result.findings.filter((each) => each.code === code).map((each) => each.message)).toEqual([]);
  });

  test('its example of an allowed line would be flagged without the permission', () => {
    const allowing = examples(page, 'How to settle it').filter((each) => each.text.includes('termwise: allow'));
    expect(allowing.length).toBeGreaterThan(0);
    for (const example of allowing) {
      const open = example.text.replace(/termwise: allow [^\n]*/g, '');
      const codes = workspace.check('example.py', open).findings.map((each) => each.code);
      expect(codes).toContain(code);
    }
  });

  test('findings have the default severity', () => {
    for (const example of examples(page, 'Flagged')) {
      const found = workspace.check('example.py', readMarks(example.text).text).findings.filter((each) => each.code === code);
      const logarithms = code === 'dimensioned-argument' && example.text.includes('math.log(');
      expect(new Set(found.map((each) => each.severity))).toEqual(new Set([logarithms ? 'warning' : severities[code]]));
    }
  });
});
