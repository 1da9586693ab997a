/** Bytes of a file to text: UTF-8, UTF-16 with a byte order mark, or the encoding that a Python script declares for itself. */

/** Files beyond this are data and no scripts. */
export const mostBytes = 20 * 1024 * 1024;
/** Nobody writes a line of this length: beyond it a file is generated data. In UTF-16 units. */
export const longestLine = 1024 * 1024;

export type Decoded = { readonly ok: true; readonly text: string } | { readonly ok: false; readonly problem: string };

/**
 * Decodes the whole content of a file; the problem is the end of a sentence that begins with the file's name. `anyLine`: lines may be
 * of any length, as those of a notebook are that hold its pictures.
 */
export function decode(bytes: Uint8Array, anyLine = false): Decoded {
  if (bytes.length > mostBytes) return tooLong(bytes.length);
  const marked = byOrderMark(bytes);
  const decoded = marked ?? byDeclaration(bytes);
  if (!decoded.ok) return decoded;
  const long = anyLine ? undefined : overlongLine(decoded.text);
  return long === undefined ? decoded : refuse(`line ${long} is longer than 1 MB: this is data and no script`);
}

/** The refusal of a file by its size alone, before it is read. */
export function tooLong(bytes: number): Decoded {
  return refuse(`it is ${Math.ceil(bytes / 1024 / 1024)} MB long; files of more than 20 MB are not read`);
}

function refuse(problem: string): Decoded {
  return { ok: false, problem };
}

function byOrderMark(bytes: Uint8Array): Decoded | undefined {
  const [a, b, c] = bytes;
  if (a === 0xef && b === 0xbb && c === 0xbf) return utf8(bytes.subarray(3));
  if (a === 0xff && b === 0xfe) return through('utf-16le', bytes.subarray(2), 'UTF-16');
  if (a === 0xfe && b === 0xff) return through('utf-16be', bytes.subarray(2), 'UTF-16');
  return undefined;
}

function byDeclaration(bytes: Uint8Array): Decoded {
  if (bytes.includes(0)) return refuse('it is a binary file');
  const name = declaredEncoding(bytes);
  if (name === undefined || /^utf[-_]?8/i.test(name)) return utf8(bytes);
  if (/^(latin[-_]?1|iso[-_]?8859[-_]?1|l1)$/i.test(name)) return { ok: true, text: latin1(bytes) };
  if (/^(cp|windows[-_]?)1252$/i.test(name)) return { ok: true, text: latin1(bytes).replace(/[\u0080-\u009F]/g, (character) => windows1252[character.charCodeAt(0) - 0x80] as string) };
  return through(name.replaceAll('_', '-'), bytes, name);
}

/** What windows-1252 has in place of the control characters of latin-1; Node 20's decoder does not know them. Source: WHATWG Encoding, index windows-1252. */
const windows1252 = '€\u0081‚ƒ„…†‡ˆ‰Š‹Œ\u008DŽ\u008F\u0090‘’“”•–—˜™š›œ\u009DžŸ';

/** The encoding named in one of the first two lines, as Python's PEP 263 has it. */
function declaredEncoding(bytes: Uint8Array): string | undefined {
  const head = latin1(bytes.subarray(0, 400)).split(/\r\n|\n|\r/, 2);
  for (const line of head) {
    const found = /^[ \t\f]*#.*?coding[:=][ \t]*([-_.a-zA-Z0-9]+)/.exec(line);
    if (found) return found[1];
    if (!/^[ \t\f]*(#.*)?$/.test(line)) return undefined;
  }
  return undefined;
}

function latin1(bytes: Uint8Array): string {
  let text = '';
  for (let at = 0; at < bytes.length; at += 8192) text += String.fromCharCode(...bytes.subarray(at, at + 8192));
  return text;
}

function through(label: string, bytes: Uint8Array, name: string): Decoded {
  const decoder = decoderFor(label);
  if (!decoder) return refuse(`it declares the encoding ${name}, which is not known`);
  try {
    return { ok: true, text: decoder.decode(bytes) };
  } catch {
    return refuse(`it is not in the encoding that it declares, ${name}`);
  }
}

function decoderFor(label: string) {
  try {
    return new TextDecoder(label, { fatal: true, ignoreBOM: true });
  } catch {
    return undefined;
  }
}

function utf8(bytes: Uint8Array): Decoded {
  try {
    return { ok: true, text: new TextDecoder('utf-8', { fatal: true, ignoreBOM: true }).decode(bytes) };
  } catch {
    return refuse(`it is not UTF-8${firstBadByte(bytes)}; save it as UTF-8, or name its encoding in the first line (# -*- coding: latin-1 -*-)`);
  }
}

/** Where decoding first went wrong: found by comparing with what a forgiving decoder makes of the bytes. */
function firstBadByte(bytes: Uint8Array): string {
  const encoder = new TextEncoder();
  const forgiving = new TextDecoder('utf-8', { ignoreBOM: true }).decode(bytes);
  const at = mismatch(encoder.encode(forgiving), bytes);
  let line = 1;
  for (let i = 0; i < at; i++) if (bytes[i] === 10) line++;
  const byte = bytes[at];
  return byte === undefined ? ` (line ${line})` : ` (byte 0x${byte.toString(16).toUpperCase()} in line ${line})`;
}

function mismatch(a: Uint8Array, b: Uint8Array): number {
  let at = 0;
  while (at < a.length && at < b.length && a[at] === b[at]) at++;
  return at;
}

/** One-based number of the first line beyond the limit. */
function overlongLine(text: string): number | undefined {
  if (text.length <= longestLine) return undefined;
  let line = 1;
  let start = 0;
  for (let at = 0; at <= text.length; at++) {
    const code = at === text.length ? 10 : text.charCodeAt(at);
    if (code !== 10 && code !== 13) continue;
    if (at - start > longestLine) return line;
    if (!(code === 13 && text.charCodeAt(at + 1) === 10)) line++;
    start = at + 1;
  }
  return undefined;
}
