import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Parsed } from '../../../server/src/frontends/frontend.ts';
import { faultsOf } from '../../../server/src/program/well-formed.ts';
import { showProgram } from '../../harness/show-program.ts';
import { matlab, parse } from './helpers.ts';
import { classFile, script } from './script.ts';

const file = 'script.m';
const fragments = ['\n', ' ', '%', '#', '"', "'", '(', ')', '[', ']', '{', '}', ':', '=', ',', ';', '...', '\r', '\0', '.', '@', '%{\n', '%}\n', 'end\n', 'if x\n', 'else ', 'function y = f(x)\n', 'classdef A\n', 'methods\n', 'arguments\n', 'x = 2;\n', '% [m]\n', 'é', '𝒳', '!', '~', "a' "];
const anyEdit = fc.record({ at: fc.double({ min: 0, max: 1, noNaN: true }), length: fc.nat(40), text: fc.oneof(fc.constantFrom(...fragments), fc.constant(''), fc.string({ maxLength: 6 })) });

describe('parsing on from a previous version', () => {
  it.each([['script', script], ['class', classFile]])('gives what a fresh parse gives, and a well-formed program, for any edits of a %s', (_name, source) => {
    fc.assert(fc.property(fc.array(anyEdit, { minLength: 1, maxLength: 6 }), (edits) => {
      let parsed = matlab.parse(source, file);
      for (const { at, length, text } of edits) {
        const start = Math.floor(at * parsed.text.length);
        const edited = parsed.text.slice(0, start) + text + parsed.text.slice(start + length);
        parsed = matlab.parse(edited, file, parsed);
        expect(faultsOf(parsed.program, edited)).toEqual([]);
        expect(showProgram(parsed.program, true)).toBe(showProgram(parse(edited), true));
      }
    }), { numRuns: 200 });
  });
});

describe('chunks', () => {
  it.each<[string, (text: string) => string, number]>([
    ['a changed line', (text) => text.replace('g = 9.81; ', 'g = 9.80; '), 1],
    ['a line in a function', (text) => text.replace('r = w*d', 'r = 2*w*d'), 1],
    ['a changed comment', (text) => text.replace('mean flow', 'peak flow'), 1],
    ['a line at the top', (text) => `clc;\n${text}`, 1],
    ['a line at the end', (text) => `${text}% last\n`, 1],
    ['a removed line', (text) => text.replace('hold on\n', ''), 0],
    ['a name that becomes a variable where it was called', (text) => text.replace('hold on', 'lower = 3;'), 2],
    ['the end of a function taken out and put back', (text) => text.replace('  return\nend\n', '  return\n'), 1],
  ])('parses only what changed: %s', (_name, change, made) => {
    const previous = matlab.parse(script, file);
    const old = new Set(previous.program.chunks);
    const after = matlab.parse(change(script), file, previous);
    expect(after.program.chunks.filter((chunk) => !old.has(chunk)).length).toBe(made);
    expect(showProgram(after.program, true)).toBe(showProgram(parse(change(script)), true));
  });

  it('keep their order where the same line stands twice', () => {
    const previous = matlab.parse('x = 1;\ny = 2;\nx = 1;\n', file);
    const [first, , third] = previous.program.chunks;
    const after = matlab.parse('x = 1;\nz = 2;\nx = 1;\n', file, previous);
    expect(after.program.chunks[0]).toBe(first);
    expect(after.program.chunks[2]).toBe(third);
  });
});

describe('any text', () => {
  it.each([['script', script], ['class', classFile]])('every beginning of a %s parses to a well-formed program', (_name, source) => {
    let previous: Parsed | undefined;
    for (let length = 0; length <= source.length; length++) {
      const text = source.slice(0, length);
      previous = matlab.parse(text, file, previous);
      expect(faultsOf(previous.program, text)).toEqual([]);
    }
  });

  it('random characters never throw', () => {
    fc.assert(fc.property(fc.array(fc.oneof(fc.constantFrom(...fragments), fc.string({ unit: 'binary', maxLength: 8 })), { maxLength: 40 }), (parts) => {
      const text = parts.join('');
      expect(faultsOf(parse(text), text)).toEqual([]);
    }), { numRuns: 500 });
  });

  it('may nest as deep as it likes', () => {
    for (const text of ['('.repeat(5000), `x = ${'-'.repeat(5000)}`, '[{'.repeat(3000), 'if x\n'.repeat(3000), '@(x) '.repeat(3000), 'a^-'.repeat(3000)]) expect(faultsOf(parse(text), text)).toEqual([]);
  });

  it.each(['', '\n', '\0', '\uFEFFx = 1', '\ud800', '\r\r\r', '\t', '%{', '%{\n%{\n%}', '...', "'", 'function', 'function [', 'end', 'classdef', 'arguments'])('%j', (text) => expect(faultsOf(parse(text), text)).toEqual([]));

  it('a lone return ends a line', () => expect(parse('x = 1\ry = 2 % [m]\rz = 3').chunks.map((chunk) => chunk.text)).toEqual(['x = 1', 'y = 2 % [m]', 'z = 3']));

  it('a bracket that is not closed ends where a statement certainly begins', () => {
    const texts = parse('x = f(1,\ny = 2;\nz = [1 2\nif y, z = 3; end').chunks.map((chunk) => chunk.text);
    expect(texts).toEqual(['x = f(1,', 'y = 2;', 'z = [1 2', 'if y, z = 3; end']);
  });

  it('a function that is not closed ends where the next begins at the margin', () => {
    expect(parse('function a\n  if x\n  y = 1;\nend\nfunction b\nend\nfunction c\nend\n').chunks.map((chunk) => chunk.text.split('\n')[0])).toEqual(['function a', 'function b', 'function c']);
  });
});
