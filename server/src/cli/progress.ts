/** One line on a terminal that says how far a long run has come. */

export interface Progress {
  /** Called between files. */
  step(files: number, path: string): void;
  /** Takes the line away before other output. */
  clear(): void;
}

const before = 1000;
const between = 100;

/** `write` undefined: there is no terminal to show it on. `now` in milliseconds. */
export function progressLine(write: ((text: string) => void) | undefined, width: number, now: () => number): Progress {
  if (!write) return { step() {}, clear() {} };
  const start = now();
  let last = start;
  let shown = false;
  return {
    step(files, path) {
      const at = now();
      if (at - start < before || at - last < between) return;
      last = at;
      shown = true;
      write(`\r\u001B[K${`${files} files, ${Math.round((at - start) / 1000)} s: ${path}`.slice(0, Math.max(width - 1, 10))}`);
    },
    clear() {
      if (shown) write('\r\u001B[K');
      shown = false;
    },
  };
}
