/** Text back to the bytes of a file, in the encoding that the file has. */
import { decode } from './decode.ts';

type Encoder = (text: string) => Uint8Array | undefined;

/** Encodes a changed text like the bytes that were read; undefined where no encoding gives exactly those bytes, or one lacks a character. */
export function encodeLike(before: Uint8Array, textBefore: string, text: string): Uint8Array | undefined {
  for (const encoder of encoders) {
    const same = encoder(textBefore);
    if (!same || !equalBytes(same, before)) continue;
    const encoded = encoder(text);
    const back = encoded && decode(encoded, true);
    return back?.ok && back.text === text ? encoded : undefined;
  }
  return undefined;
}

export function equalBytes(a: Uint8Array, b: Uint8Array): boolean {
  return a.length === b.length && a.every((byte, at) => byte === b[at]);
}

const encoders: readonly Encoder[] = [utf8, marked(utf8, 0xef, 0xbb, 0xbf), marked(utf16(true), 0xff, 0xfe), marked(utf16(false), 0xfe, 0xff), latin1];

function utf8(text: string): Uint8Array {
  return new TextEncoder().encode(text);
}

function utf16(little: boolean): Encoder {
  return (text) => {
    const bytes = new Uint8Array(text.length * 2);
    const view = new DataView(bytes.buffer);
    for (let at = 0; at < text.length; at++) view.setUint16(at * 2, text.charCodeAt(at), little);
    return bytes;
  };
}

/** Latin-1 and, where the characters between 0x80 and 0x9F do not occur, windows-1252. */
function latin1(text: string): Uint8Array | undefined {
  const bytes = new Uint8Array(text.length);
  for (let at = 0; at < text.length; at++) {
    const code = text.charCodeAt(at);
    if (code > 0xff) return undefined;
    bytes[at] = code;
  }
  return bytes;
}

function marked(encoder: Encoder, ...mark: readonly number[]): Encoder {
  return (text) => {
    const inner = encoder(text);
    return inner && Uint8Array.from([...mark, ...inner]);
  };
}
