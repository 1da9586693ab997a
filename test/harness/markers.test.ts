import { describe, expect, test } from 'vitest';
import type { CheckResult, PlacedFinding } from '../../server/src/service/contract.ts';
import { deviations, readMarks, readSections } from './markers.ts';

function finding(text: string, part: string, over: Partial<PlacedFinding> = {}): PlacedFinding {
  const start = text.indexOf(part);
  return { code: 'unlike-terms', severity: 'error', span: { start, end: start + part.length }, message: 'a pressure [Pa] and a length [m]', related: [], ...over };
}

function result(text: string, ...findings: PlacedFinding[]): CheckResult {
  return { file: 'a.py', language: 'python', text, findings, statistics: { functions: 0, notes: 0, unread: [] } };
}

describe('marks', () => {
  const source = 'x = 1\ny = p + h\n#   ^^^^^ unlike-terms: Pa\nz = 2\n';

  test('are taken out, and point at the line above', () => {
    const marked = readMarks(source);
    expect(marked.text).toBe('x = 1\ny = p + h\nz = 2\n');
    expect(marked.expectations).toEqual([{ line: 1, columns: { start: 4, end: 9 }, code: 'unlike-terms', words: 'Pa' }]);
    expect(marked.lines).toEqual([0, 1, 3, 4]);
  });

  test.each(['# ^^ scale-mismatch', '// ^^ scale-mismatch', '% ^^ scale-mismatch', '! ^^ scale-mismatch', '   # <-- scale-mismatch'])('are comments of any host: %s', (line) => {
    expect(readMarks(`a\n${line}`).expectations).toHaveLength(1);
  });

  test.each(['x = 1  # ^^ scale-mismatch', '# see ^^ above', 's = "# ^^ scale-mismatch"'])('are not read into other lines: %s', (line) => {
    expect(readMarks(`a\n${line}`).expectations).toHaveLength(0);
  });

  test('several lines of marks under one line', () => {
    expect(readMarks('f(a, b)\n# ^ unlike-result\n#    ^ unlike-result\n').expectations.map((each) => each.line)).toEqual([0, 0]);
  });

  test('an unknown code is a fault of the test', () => {
    expect(() => readMarks('x\n# ^ unlike-words')).toThrow('line 2');
    expect(() => readMarks('# ^ unlike-terms')).toThrow('line 1');
  });

  test('agree with a finding that covers the carets', () => {
    const marked = readMarks(source);
    expect(deviations(marked, result(marked.text, finding(marked.text, 'p + h')))).toEqual([]);
    expect(deviations(marked, result(marked.text, finding(marked.text, 'y = p + h')))).toEqual([]);
  });

  test.each<[string, string, Partial<PlacedFinding>, string]>([
    ['too short', 'p +', {}, 'missing unlike-terms'],
    ['another line', 'z = 2', {}, 'missing unlike-terms'],
    ['another code', 'p + h', { code: 'unlike-result' }, 'missing unlike-terms'],
    ['other words', 'p + h', { message: 'no unit named' }, 'with "Pa"'],
  ])('differ from a finding with %s', (_what, part, over, words) => {
    const marked = readMarks(source);
    const found = deviations(marked, result(marked.text, finding(marked.text, part, over)));
    expect(found).toHaveLength(2);
    expect(found[0]).toContain(words);
    expect(found[1]).toContain('unexpected');
  });

  test('one finding does not answer two marks', () => {
    const marked = readMarks('y = p + h\n#   ^ unlike-terms\n#       ^ unlike-terms\n');
    expect(deviations(marked, result(marked.text, finding(marked.text, 'p + h')))).toHaveLength(1);
  });

  test('a finding without a mark counts unless it is a hint', () => {
    const marked = readMarks('y = p + h\n');
    expect(deviations(marked, result(marked.text, finding(marked.text, 'p + h')), 10)[0]).toContain('line 11');
    expect(deviations(marked, result(marked.text, finding(marked.text, 'p + h', { severity: 'hint' })))).toEqual([]);
  });
});

test('sections begin with their headings and know their lines', () => {
  const found = readSections('# about\n# ==== one ====\na = 1\n\n# ==== two words ====\nb = 2\n');
  expect(found).toEqual([
    { title: 'one', firstLine: 2, text: 'a = 1\n' },
    { title: 'two words', firstLine: 5, text: 'b = 2\n' },
  ]);
});
