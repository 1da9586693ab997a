/** Reading what is to be checked. */
import { readFileSync, statSync } from 'node:fs';
import { isNotebook } from '../frontends/notebook/index.ts';
import { decode, type Decoded, mostBytes, tooLong } from '../platform/decode.ts';
import { whyUnreadable } from '../platform/walk.ts';

/** The text of a file, or why there is none. */
export function readText(path: string): Decoded {
  try {
    const { size } = statSync(path);
    return size > mostBytes ? tooLong(size) : decode(readFileSync(path), isNotebook(path));
  } catch (error) {
    return { ok: false, problem: whyUnreadable(error) };
  }
}

/** All that a stream gives, as text; reading stops at the limit of length. */
export async function readStream(stream: AsyncIterable<Uint8Array>): Promise<Decoded> {
  const parts: Uint8Array[] = [];
  let length = 0;
  try {
    for await (const part of stream) {
      parts.push(part);
      length += part.length;
      if (length > mostBytes) return tooLong(length);
    }
  } catch (error) {
    return { ok: false, problem: whyUnreadable(error) };
  }
  return decode(Buffer.concat(parts));
}
