/** Replaces a file in one step, and only where it still holds what was read. */
import { closeSync, fsyncSync, openSync, readFileSync, realpathSync, renameSync, rmSync, statSync, writeSync, chmodSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';
import { encodeLike, equalBytes } from '../platform/encode.ts';
import { whyUnreadable } from '../platform/walk.ts';

/** What came of it; the problem is the end of a sentence that begins with the file's name. */
export type Written = { readonly ok: true } | { readonly ok: false; readonly problem: string };

/** `before`: the bytes that were read, `textBefore` what they were read as. Keeps the encoding and the permissions; links are followed. */
export function replaceFile(path: string, before: Uint8Array, textBefore: string, text: string): Written {
  const bytes = encodeLike(before, textBefore, text);
  if (!bytes) return refuse('it was not written: its encoding does not have the characters of the fix');
  let temporary: string | undefined;
  try {
    const real = realpathSync(path);
    const { mode } = statSync(real);
    temporary = join(dirname(real), `.${basename(real)}.${process.pid}.termwise`);
    write(temporary, bytes, mode);
    if (!equalBytes(readFileSync(real), before)) return refuse('it was not written: it changed while it was checked');
    renameSync(temporary, real);
    temporary = undefined;
    return { ok: true };
  } catch (error) {
    return refuse(`it was not written: ${whyUnreadable(error)}`);
  } finally {
    if (temporary !== undefined) rmSync(temporary, { force: true });
  }
}

function write(path: string, bytes: Uint8Array, mode: number): void {
  const file = openSync(path, 'wx', mode);
  try {
    for (let at = 0; at < bytes.length; ) at += writeSync(file, bytes, at);
    fsyncSync(file);
  } finally {
    closeSync(file);
  }
  chmodSync(path, mode & 0o7777);
}

function refuse(problem: string): Written {
  return { ok: false, problem };
}
