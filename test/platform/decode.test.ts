import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { decode, longestLine, mostBytes } from '../../server/src/platform/decode.ts';

const bytes = (text: string, encoding: BufferEncoding = 'utf8'): Uint8Array => new Uint8Array(Buffer.from(text, encoding));
const problem = (content: Uint8Array): string => {
  const read = decode(content);
  return read.ok ? `read as ${JSON.stringify(read.text.slice(0, 40))}` : read.problem;
};

describe('read', () => {
  // PEP 263 gives the form of the declaration and its two lines.
  test.each<[string, Uint8Array, string]>([
    ['UTF-8', bytes('T = 20  # [°C]\n'), 'T = 20  # [°C]\n'],
    ['UTF-8 with its mark', bytes('\uFEFFT = 20  # [°C]\n'), 'T = 20  # [°C]\n'],
    ['UTF-16, little end first', new Uint8Array([0xff, 0xfe, ...bytes('T # [°C]', 'utf16le')]), 'T # [°C]'],
    ['UTF-16, big end first', new Uint8Array([0xfe, 0xff, 0, 0x54, 0, 0xb0]), 'T°'],
    ['latin-1 by declaration', bytes('# -*- coding: latin-1 -*-\n# [°C]\n', 'latin1'), '# -*- coding: latin-1 -*-\n# [°C]\n'],
    ['in the second line', bytes('#!/usr/bin/env python\n# vim: set fileencoding=iso-8859-1 :\n# [µm]\n', 'latin1'), '#!/usr/bin/env python\n# vim: set fileencoding=iso-8859-1 :\n# [µm]\n'],
    ['windows-1252', new Uint8Array([...bytes('# coding: cp1252\n# 5 '), 0x80]), '# coding: cp1252\n# 5 €'],
    ['UTF-8 by declaration', bytes('# coding: utf-8\n# [°C]\n'), '# coding: utf-8\n# [°C]\n'],
    ['nothing', new Uint8Array(), ''],
    ['carriage returns', bytes('a\r\nb\rc'), 'a\r\nb\rc'],
    ['a line as long as it may be', bytes('a'.repeat(longestLine)), 'a'.repeat(longestLine)],
  ])('%s', (_what, content, text) => {
    expect(decode(content)).toEqual({ ok: true, text });
  });
});

describe('refused, with the reason', () => {
  test.each<[string, Uint8Array, string]>([
    ['a zero byte', new Uint8Array([0x61, 0, 0x62]), 'it is a binary file'],
    ['UTF-16 without its mark', bytes('T = 20', 'utf16le'), 'it is a binary file'],
    ['latin-1 without a declaration', bytes('a = 1\nT = 20  # [°C]\n', 'latin1'), 'it is not UTF-8 (byte 0xB0 in line 2)'],
    ['a character that is cut off', new Uint8Array([0x61, 0xc3]), 'it is not UTF-8 (byte 0xC3 in line 1)'],
    ['a declaration in the third line', bytes('a = 1\nb = 2\n# coding: latin-1\n# °\n', 'latin1'), 'it is not UTF-8 (byte 0xB0 in line 4)'],
    ['an unknown encoding', bytes('# coding: morse\n'), 'it declares the encoding morse, which is not known'],
    ['another encoding than declared', new Uint8Array([...bytes('# coding: shift_jis\n'), 0xff, 0xff]), 'it is not in the encoding that it declares, shift_jis'],
    ['a line of data', bytes(`a = 1\n${'a'.repeat(longestLine + 1)}\n`), 'line 2 is longer than 1 MB'],
    ['one line of 50 MB', new Uint8Array(50 * 1024 * 1024).fill(97), 'it is 50 MB long; files of more than 20 MB are not read'],
    ['a file that is too long', new Uint8Array(mostBytes + 1).fill(10), 'it is 21 MB long'],
  ])('%s', (_what, content, words) => {
    expect(problem(content)).toContain(words);
  });
});

test('whatever the bytes, there is an answer; UTF-8 comes back as it went in', () => {
  fc.assert(fc.property(fc.uint8Array({ maxLength: 300 }), (content) => {
    expect(typeof decode(content).ok).toBe('boolean');
  }));
  fc.assert(fc.property(fc.string({ unit: 'grapheme', maxLength: 100 }).filter((text) => !text.includes('\0') && !/coding[:=]|\uFEFF/.test(text)), (text) => {
    expect(decode(bytes(text))).toEqual({ ok: true, text });
  }));
});
