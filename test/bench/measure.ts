/** Timing and child processes for the measurements. Nothing here is asserted: the figures depend on the machine. */
import { spawnSync } from 'node:child_process';

export interface Spread {
  readonly median: number;
  readonly p95: number;
}

/** Milliseconds of one call. */
export function timed(work: () => unknown): number {
  const start = performance.now();
  work();
  return performance.now() - start;
}

export function spread(samples: readonly number[]): Spread {
  const sorted = [...samples].sort((a, b) => a - b);
  const at = (share: number): number => sorted[Math.min(Math.floor(sorted.length * share), sorted.length - 1)] ?? Number.NaN;
  return { median: at(0.5), p95: at(0.95) };
}

export function repeat(times: number, work: (at: number) => unknown): readonly number[] {
  return Array.from({ length: times }, (_, at) => timed(() => work(at)));
}

export interface Ran {
  readonly milliseconds: number;
  /** Largest resident memory in MB; undefined where the process is not node or did not tell. */
  readonly megabytes: number | undefined;
  readonly status: number | null;
  readonly out: string;
}

const tellMemory = 'data:text/javascript,process.on("exit",()=>process.stderr.write("\\nlargest-kilobytes "+process.resourceUsage().maxRSS+"\\n"))';

/** Runs a node program once, with its wall time and its largest memory. */
export function runNode(args: readonly string[], folder?: string): Ran {
  return runProgram(process.execPath, ['--import', tellMemory, ...args], folder);
}

export function runProgram(program: string, args: readonly string[], folder?: string): Ran {
  const start = performance.now();
  const { stdout, stderr, status } = spawnSync(program, args, { cwd: folder, encoding: 'utf8', maxBuffer: 1 << 30 });
  const milliseconds = performance.now() - start;
  const kilobytes = /largest-kilobytes (\d+)/.exec(stderr ?? '')?.[1];
  return { milliseconds, megabytes: kilobytes === undefined ? undefined : Number(kilobytes) / 1024, status, out: stdout ?? '' };
}
