import { describe, expect, test } from 'vitest';
import { readArguments } from '../../server/src/cli/arguments.ts';
import { checkHelp, generalHelp } from '../../server/src/cli/help.ts';
import { findingCodes } from '../../server/src/findings/finding.ts';

function read(line: string): ReturnType<typeof readArguments> {
  return readArguments(line.split(' ').filter((word) => word !== ''));
}

function problem(line: string): string {
  const request = read(line);
  return request.kind === 'misuse' ? request.problem : `read as ${request.kind}`;
}

test('a check with everything', () => {
  expect(read('check a.py b --format sarif --severity hidden-unit=error --severity=bare-addend=off --hints --stats --language python --stdin-file x.py --config c.json --no-color')).toEqual({
    kind: 'check',
    options: {
      paths: ['a.py', 'b'], format: 'sarif', severities: { 'hidden-unit': 'error', 'bare-addend': 'off' }, hints: true, stats: true, color: false,
      language: 'python', stdinFile: 'x.py', config: 'c.json',
    },
  });
});

test.each(['check - --language python', 'check --language=python -'])('standard input: %s', (line) => {
  expect(read(line)).toMatchObject({ kind: 'check', options: { paths: ['-'], language: 'python' } });
});

test('what follows -- is a path', () => {
  expect(read('check -- --odd.py')).toMatchObject({ kind: 'check', options: { paths: ['--odd.py'] } });
});

test('the last of two values holds', () => {
  expect(read('check a --format json --format text --severity hidden-unit=error --severity hidden-unit=hint')).toMatchObject({ options: { format: 'text', severities: { 'hidden-unit': 'hint' } } });
});

test.each([
  ['--version', { kind: 'version' }],
  ['-V', { kind: 'version' }],
  ['version', { kind: 'version' }],
  ['--help', { kind: 'help' }],
  ['help', { kind: 'help' }],
  ['-h', { kind: 'help' }],
  ['help check', { kind: 'help', about: 'check' }],
  ['help hidden-unit', { kind: 'help', about: 'hidden-unit' }],
  ['check --help', { kind: 'help', about: 'check' }],
  ['check a.py -h', { kind: 'help', about: 'check' }],
])('%s', (line, request) => {
  expect(read(line)).toEqual(request);
});

describe('refusals name what is wrong', () => {
  test.each([
    ['', 'No command'],
    ['chekc a.py', 'Did you mean check?'],
    ['pump.py', 'termwise check pump.py'],
    ['frobnicate', 'Unknown command frobnicate.'],
    ['help chekc', 'Did you mean check?'],
    ['help hiden-unit', 'Did you mean hidden-unit?'],
    ['check', 'Nothing to check'],
    ['check a --formt json', 'Did you mean --format?'],
    ['check a --stat', 'Did you mean --stats?'],
    ['check a --xyzzy', 'Unknown option --xyzzy.'],
    ['check a -q', 'Unknown option -q.'],
    ['check a --format', '--format needs a value'],
    ['check a --format --stats', '--format needs a value'],
    ['check a --format=', '--format needs a value'],
    ['check a --format xml', 'Unknown format xml'],
    ['check a --format jsn', 'Did you mean json?'],
    ['check a --stats=yes', '--stats takes no value'],
    ['check a --severity hidden-unit', 'expected code=level'],
    ['check a --severity hiden-unit=off', 'Did you mean hidden-unit?'],
    ['check a --severity hidden-unit=fatal', 'unknown level fatal'],
    ['check a --severity toString=off', 'unknown code toString'],
    ['check a --toString', 'Unknown option --toString.'],
    ['check - --language pyton', 'Did you mean python?'],
  ])('%s', (line, words) => {
    expect(problem(line)).toContain(words);
  });
});

test('the help names every option, and every code is a setting', () => {
  for (const option of ['--format', '--severity', '--hints', '--stats', '--language', '--stdin-file', '--config', '--no-color', '--help']) expect(checkHelp).toContain(option);
  expect(generalHelp).toContain('termwise check');
  for (const code of findingCodes) expect(read(`check a --severity ${code}=off`).kind).toBe('check');
});
