/**
 * Measurements on a real file: `npm run bench -- <file.py> [--pyright]`. Parsing alone, whole check, re-check after a keystroke,
 * start-up, memory, and 100,000 lines in one command, made from copies of the scripts in the file's folder.
 */
import { spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { cpus } from 'node:os';
import { dirname, join, resolve } from 'node:path';
import { Language, Parser } from 'web-tree-sitter';
import { defaultNoteSettings } from '../../server/src/notes/types.ts';
import { diskFiles } from '../../server/src/platform/disk.ts';
import { nodeAssets } from '../../server/src/platform/node-assets.ts';
import { createWorkspace } from '../../server/src/service/workspace.ts';
import { scriptsIn } from '../corpus/scripts.ts';
import { manyLines } from './many-lines.ts';
import { measureServer } from './server.ts';
import { repeat, type Ran, runNode, runProgram, type Spread, spread } from './measure.ts';
import { loadFrontEnd } from '../harness/front-ends.ts';

const root = join(import.meta.dirname, '../..');
const command = join(root, 'dist/termwise.js');
const [given] = process.argv.slice(2).filter((each) => !each.startsWith('--'));
if (given === undefined) {
  process.stderr.write('usage: npm run bench -- <file.py> [--pyright]\n');
  process.exitCode = 2;
} else await main(resolve(given), process.argv.includes('--pyright'));

async function main(file: string, pyright: boolean): Promise<void> {
  const text = readFileSync(file, 'utf8');
  print(`${file}: ${text.split('\n').length} lines; node ${process.version}, ${cpus().length} × ${cpus()[0]?.model ?? 'unknown processor'}`);
  await inProcess(file, text);
  spawnSync(process.execPath, [join(root, '.tools/build.mjs')], { stdio: 'inherit' });
  await measureServer(join(root, 'dist/language-server.js'), file, 'python', show, print);
  const once = commandRuns(file);
  if (pyright) againstPyright(file, once);
  hundredThousand(dirname(file));
}

async function inProcess(file: string, text: string): Promise<void> {
  const assets = nodeAssets();
  const grammar = assets.grammar('python');
  if (!grammar) throw new Error('no Python grammar');
  const frontEnd = await loadFrontEnd('python');
  const workspace = await createWorkspace(assets, diskFiles(), { severities: {}, notes: defaultNoteSettings });
  const first = repeat(1, () => workspace.check(file, text));
  const tree = await treeAlone(grammar, text);
  const parse = spread(repeat(15, () => frontEnd.parse(text, file).release()));
  const whole = spread(repeat(15, () => {
    workspace.forget(file);
    workspace.check(file, text);
  }));
  show('syntax tree alone', tree);
  show('parse (tree and program form)', parse);
  show('first check of the process', spread(first));
  show('whole check, nothing kept of the file', whole, `${ratio(whole.median, parse.median)} of parse, ${ratio(whole.median, tree.median)} of the tree alone`);
  const keys = spread(keystrokes(text).map((edited) => {
    const sample = repeat(1, () => workspace.check(file, edited))[0] as number;
    workspace.check(file, text);
    return sample;
  }));
  show('re-check after a keystroke', keys, `${ratio(keys.median, whole.median)} of the whole check`);
  print(`memory of this process: ${(process.memoryUsage().rss / 2 ** 20).toFixed(0)} MB`);
}

async function treeAlone(grammar: Uint8Array, text: string): Promise<Spread> {
  const parser = new Parser();
  parser.setLanguage(await Language.load(grammar));
  return spread(repeat(15, () => parser.parse(text)?.delete()));
}

/** A character typed at the end of a line of code, at 100 places spread over the text. */
function keystrokes(text: string): readonly string[] {
  const ends = [...text.matchAll(/[\w)\]](?=\n)/g)].map((match) => match.index + 1);
  const places = Array.from({ length: Math.min(100, ends.length) }, (_, at) => ends[Math.floor((at * ends.length) / 100)] as number);
  return places.map((place) => `${text.slice(0, place)}1${text.slice(place)}`);
}

function commandRuns(file: string): Spread {
  show('start-up (termwise --version)', spread(repeat(9, () => runNode([command, '--version']))));
  const runs = Array.from({ length: 7 }, () => runNode([command, 'check', file]));
  const taken = spread(runs.map((run) => run.milliseconds));
  show('termwise check, the whole command', taken, memory(runs));
  return taken;
}

function againstPyright(file: string, own: Spread): void {
  runProgram('npx', ['--yes', 'pyright', '--version']);
  const runs = Array.from({ length: 5 }, () => runProgram('npx', ['--yes', 'pyright', file]));
  const taken = spread(runs.map((run) => run.milliseconds));
  const told = / in ([\d.]+)\s*sec|Completed in ([\d.]+)/.exec(runProgram('npx', ['--yes', 'pyright', '--stats', file]).out);
  show('pyright, the whole command', taken, `${ratio(taken.median, own.median)} of termwise${told ? `; by its own account ${told[1] ?? told[2]} s` : ''}`);
}

function hundredThousand(folder: string): void {
  const scripts = [...scriptsIn(folder, 'python', () => {})].filter(({ lineName }) => !lineName);
  for (const wanted of [25_000, 50_000, 100_000]) {
    const made = manyLines(scripts, wanted);
    const run = runNode([command, 'check', made.folder, '--format', 'json']);
    print(`${made.lines} lines in ${made.files} files: ${(run.milliseconds / 1000).toFixed(1)} s, ${memory([run])}`);
    made.remove();
  }
}

function memory(runs: readonly Ran[]): string {
  const largest = Math.max(...runs.map((run) => run.megabytes ?? Number.NaN));
  return `largest memory ${largest.toFixed(0)} MB`;
}

function show(what: string, { median, p95 }: Spread, remark = ''): void {
  print(`${what.padEnd(40)} median ${median.toFixed(1).padStart(7)} ms, 95 % ${p95.toFixed(1).padStart(7)} ms${remark ? `; ${remark}` : ''}`);
}

function ratio(a: number, b: number): string {
  return `${(a / b).toFixed(2)} ×`;
}

function print(line: string): void {
  process.stdout.write(`${line}\n`);
}
