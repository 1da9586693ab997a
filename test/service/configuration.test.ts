import { describe, expect, test } from 'vitest';
import { readConfiguration } from '../../server/src/service/configuration.ts';

const problems = (text: string): readonly string[] => readConfiguration(text, '/w/termwise.json').problems.map((each) => `${each.line}:${each.column} ${each.message}`);

test('everything that can be set', () => {
  const { configuration, problems } = readConfiguration(
    '{\n  // comment\n  "$schema": "x",\n  "severities": { "hidden-unit": "error", "bare-addend": "off" },\n  "notes": { "bare": false },\n  "exclude": ["old/"],\n}', '/w/termwise.json',
  );
  expect(problems).toEqual([]);
  expect(configuration).toMatchObject({ file: '/w/termwise.json', severities: { 'hidden-unit': 'error', 'bare-addend': 'off' }, notes: { bare: false } });
  expect([configuration.exclude.ignores('old/a.py'), configuration.exclude.ignores('new/a.py')]).toEqual([true, false]);
});

describe('problems have a place, and the rest holds', () => {
  test.each([
    ['{\n  "notes": { "bare": 1 } }', '2:22 notes.bare is true or false.'],
    ['{ "notes": { "brackets": true } }', '1:14 unknown key "brackets". Known are parentheses, bare.'],
    ['{ "note": {} }', '1:3 unknown key "note". Did you mean notes?'],
    ['{ "notes": [] }', '1:12 notes is an object: { … }.'],
    ['{ "severities": { "unlike-term": "off" } }', '1:19 unknown key "unlike-term". Did you mean unlike-terms?'],
    ['{ "severities": { "unlike-terms": true } }', '1:35 true is no severity; it is one of error, warning, information, hint, off.'],
    ['{ "exclude": "old/" }', '1:14 exclude is a list of patterns: ["old/", "*_generated.py"].'],
    ['{ "exclude": ["a", 2] }', '1:20 a pattern of exclude is a text in quotes.'],
    ['[]', '1:1 a configuration is an object: { … }.'],
    ['{ "notes": ', '1:12 this is not JSON: value expected.'],
    ['', '1:1 this is not JSON: value expected.'],
    ['{ notes: {} }', '1:3 this is not JSON: invalid symbol.'],
  ])('%j', (text, expected) => {
    expect(problems(text)[0]).toBe(expected);
  });

  test('a wrong value leaves the others in force', () => {
    const { configuration } = readConfiguration('{ "severities": { "unlike-terms": 7, "hidden-unit": "hint" }, "notes": { "bare": "no", "parentheses": false } }', '/w/termwise.json');
    expect(configuration).toMatchObject({ severities: { 'hidden-unit': 'hint' }, notes: { parentheses: false } });
  });
});
