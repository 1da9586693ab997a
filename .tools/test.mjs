/**
 * `npm test`: build, lint, types, generated documents, the tests, and the extension in a real editor. Each step counts like a test; all run even where one
 * fails. Arguments go to vitest. The last line is `N passed, N failed`.
 */
import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { hasBrowser } from './editor-page.mjs';

const root = join(dirname(fileURLToPath(import.meta.url)), '..');
const bin = (name) => join(root, 'node_modules', name);

const steps = [
  ['build', ['.tools/build.mjs']],
  ['lint', [bin('@biomejs/biome/bin/biome'), 'lint', '--error-on-warnings']],
  ['types', [bin('typescript/bin/tsc'), '-p', '.']],
  ['generated documents', ['.tools/run.mjs', '.tools/docs.ts', '--check']],
];

const counts = { passed: 0, failed: 0, skipped: 0 };
for (const [name, args] of steps) {
  const ok = node(args) === 0;
  counts[ok ? 'passed' : 'failed']++;
  process.stdout.write(`${ok ? 'ok' : 'FAILED'}: ${name}\n`);
}
add(runTests());
if (process.argv.length === 2) add(runEditor());
if (counts.skipped > 0) process.stdout.write(`\n${counts.skipped} skipped\n`);
process.stdout.write(`\n${counts.passed} passed, ${counts.failed} failed\n`);
process.exitCode = counts.failed > 0 ? 1 : 0;

/** Counts of the tests; a run that did not come to its end is a failure. */
function runTests() {
  const folder = mkdtempSync(join(tmpdir(), 'termwise-'));
  const file = join(folder, 'counts.json');
  const args = [bin('vitest/vitest.mjs'), 'run', '--reporter=default', '--reporter=./.tools/count-reporter.mjs', ...process.argv.slice(2)];
  const status = node(args, { TERMWISE_COUNTS: file });
  try {
    const counted = JSON.parse(readFileSync(file, 'utf8'));
    return status !== 0 && counted.failed === 0 ? { ...counted, failed: 1 } : counted;
  } catch {
    return { passed: 0, failed: 1, skipped: 0 };
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** The extension in a real VS Code, where a browser can show one and nothing else was asked for. */
function runEditor() {
  if (!hasBrowser()) {
    process.stdout.write('not run: the tests in a real editor need chromium (npm run test:editor)\n');
    return {};
  }
  const { status, stdout } = spawnSync(process.execPath, ['.tools/editor-test.mjs'], { cwd: root, encoding: 'utf8', stdio: ['ignore', 'pipe', 'inherit'] });
  process.stdout.write(stdout);
  const [, passed, failed] = /(\d+) passed, (\d+) failed\s*$/.exec(stdout) ?? [];
  return failed === undefined || (status !== 0 && failed === '0') ? { failed: 1 } : { passed: Number(passed), failed: Number(failed) };
}

function add(more) {
  for (const key of Object.keys(counts)) counts[key] += more[key] ?? 0;
}

function node(args, environment = {}) {
  return spawnSync(process.execPath, args, { cwd: root, stdio: ['ignore', 'inherit', 'inherit'], env: { ...process.env, ...environment } }).status;
}
