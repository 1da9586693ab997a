#!/usr/bin/env node
/** The command `termwise` on the process it runs in. */
import manifest from '../../../package.json' with { type: 'json' };
import type { Surroundings } from './check.ts';
import { run } from './run.ts';

let reading = true;
let status = 0;

/** `| head` closes the pipe: there is nothing more to do then, and nothing to complain about. */
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code !== 'EPIPE') throw error;
  reading = false;
  process.exit(status);
});
process.stderr.on('error', () => {});

const surroundings: Surroundings = {
  workingFolder: process.cwd(),
  version: manifest.version,
  out(text) {
    if (reading && text !== '') process.stdout.write(text);
    return reading;
  },
  complain: (text) => process.stderr.write(text),
  progress: process.stderr.isTTY ? (text) => process.stderr.write(text) : undefined,
  width: Math.min(Math.max(process.stdout.columns ?? Number(process.env.COLUMNS ?? 100), 40) || 100, 140),
  color: Boolean(process.stdout.isTTY) && !process.env.NO_COLOR && process.env.TERM !== 'dumb',
  input: process.stdin,
  async createWorkspace(source, settings) {
    const [{ createWorkspace }, { nodeAssets }] = await Promise.all([import('../service/workspace.ts'), import('../platform/node-assets.ts')]);
    return createWorkspace(nodeAssets(), source, settings, ['nomenclature']);
  },
};

try {
  status = await run(process.argv.slice(2), surroundings);
} catch (error) {
  surroundings.complain(`termwise: ${error instanceof Error ? error.message : String(error)}\n`);
  status = 2;
}
process.exitCode = status;
