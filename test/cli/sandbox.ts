/** Runs the command in a folder of its own, with the engine or with one made for the test. */
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { run } from '../../server/src/cli/run.ts';
import type { Surroundings } from '../../server/src/cli/check.ts';
import { nodeAssets } from '../../server/src/platform/node-assets.ts';
import { createWorkspace } from '../../server/src/service/workspace.ts';

export interface Ran {
  readonly status: number;
  readonly out: string;
  readonly complaints: string;
}

export class Sandbox {
  readonly folder = mkdtempSync(join(tmpdir(), 'termwise-cli-'));

  constructor(files: Readonly<Record<string, string | Uint8Array>> = {}) {
    for (const [name, content] of Object.entries(files)) this.write(name, content);
  }

  write(name: string, content: string | Uint8Array): void {
    const path = join(this.folder, name);
    mkdirSync(dirname(path), { recursive: true });
    writeFileSync(path, content);
  }

  remove(): void {
    rmSync(this.folder, { recursive: true, force: true });
  }

  /** Runs a command line; words are split at blanks. */
  async run(line: string, over: Partial<Surroundings> = {}, input: string | Uint8Array = ''): Promise<Ran> {
    let out = '';
    let complaints = '';
    const around: Surroundings = {
      workingFolder: this.folder,
      version: '0.0.0',
      out: (text) => {
        out += text;
        return true;
      },
      complain: (text) => {
        complaints += text;
      },
      progress: undefined,
      width: 80,
      color: false,
      input: once(typeof input === 'string' ? new TextEncoder().encode(input) : input),
      createWorkspace: (source, settings) => createWorkspace(nodeAssets(), source, settings),
      ...over,
    };
    const status = await run(line.split(' ').filter((word) => word !== ''), around);
    return { status, out, complaints };
  }
}

async function* once(bytes: Uint8Array): AsyncGenerator<Uint8Array> {
  yield bytes;
}

/** One fault of every severity: an error, a warning, a hint. */
export const faulty = `p = 2.1e5    # [Pa]
h = 3.0      # [m]
total = p + h
eta = 0.1    # [metrs/s]
far = h + 0.5
`;

/** The same without a fault. */
export const sound = `rho = 998.2  # [kg/m^3]
V = 1.8      # [m/s]
p = 0.5*rho*V**2   # [Pa]
`;

/** A script without any note. */
export const plain = 'def double(x):\n    return 2*x\n';
