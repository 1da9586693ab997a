/**
 * The workbench of VS Code in a browser, on a machine that has no VS Code: the server and the page that the npm package
 * `code-server` carries (the last line that runs on Node 20), installed once into .cache/.
 */
import { execFileSync, spawn } from 'node:child_process';
import { cpSync, existsSync, mkdirSync, mkdtempSync, renameSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = join(dirname(fileURLToPath(import.meta.url)), '..');
const version = '4.100.3';
const home = join(root, '.cache', 'editor', version);
const entry = join(home, 'vscode', 'out', 'server-main.js');

/** Native modules of the workbench that are not built here; what needs them is not needed. */
const standIns = {
  'native-watchdog': 'exports.start = () => {};\nexports.exit = (status) => process.exit(status);\n',
  '@vscode/spdlog': `const { appendFileSync } = require('node:fs');
const levels = ['trace', 'debug', 'info', 'warn', 'error', 'critical'];
class Logger {
  constructor(_kind, _name, file) { this.file = file; this.level = 2; }
  getLevel() { return this.level; }
  setLevel(level) { this.level = level; }
  setPattern() {}
  clearFormatters() {}
  flush() {}
  drop() {}
}
levels.forEach((name, at) => {
  Logger.prototype[name] = function (text) {
    if (at >= this.level && this.file) try { appendFileSync(this.file, text + '\\n'); } catch {}
  };
});
exports.Logger = Logger;
exports.version = 0;
exports.createRotatingLogger = async (name, file) => new Logger('rotating', name, file);
exports.createAsyncRotatingLogger = async (name, file) => new Logger('rotating_async', name, file);
exports.setLevel = () => {};
exports.setFlushOn = () => {};
exports.shutdown = () => {};
`,
};

/** Installs the workbench unless it is there; a broken install leaves nothing behind. */
export function installWorkbench(say) {
  if (existsSync(entry)) return writeStandIns(join(home, 'vscode'));
  say(`Installing the browser workbench of VS Code into ${home} (about 145 MB, once) …`);
  mkdirSync(dirname(home), { recursive: true });
  const stage = mkdtempSync(`${home}-`);
  try {
    const npm = (args, cwd) => execFileSync('npm', args, { cwd, encoding: 'utf8', stdio: ['ignore', 'pipe', 'inherit'] });
    const packed = npm(['pack', '--silent', `code-server@${version}`], stage).trim().split('\n').at(-1);
    execFileSync('tar', ['xzf', packed, '--strip-components=2', '--exclude=*.map', 'package/lib/vscode'], { cwd: stage });
    rmSync(join(stage, packed));
    const vscode = join(stage, 'vscode');
    npm(['install', '--ignore-scripts', '--omit=dev', '--no-audit', '--no-fund', '--silent'], vscode);
    prepare(vscode);
    renameSync(stage, home);
  } catch (error) {
    rmSync(stage, { recursive: true, force: true });
    throw error;
  }
}

function prepare(vscode) {
  symlinkSync('node_modules', join(vscode, 'node_modules.asar'));
  writeStandIns(vscode);
  const ripgrep = ['/usr/bin/rg', '/usr/local/bin/rg', '/opt/homebrew/bin/rg'].find((each) => existsSync(each));
  if (!ripgrep) return;
  const bin = join(vscode, 'node_modules', '@vscode', 'ripgrep', 'bin');
  mkdirSync(bin, { recursive: true });
  rmSync(join(bin, 'rg'), { force: true });
  symlinkSync(ripgrep, join(bin, 'rg'));
}

function writeStandIns(vscode) {
  for (const [name, text] of Object.entries(standIns)) {
    const folder = join(vscode, 'node_modules', name);
    rmSync(folder, { recursive: true, force: true });
    mkdirSync(folder, { recursive: true });
    writeFileSync(join(folder, 'package.json'), JSON.stringify({ name, version: '0.0.0', main: 'index.js' }));
    writeFileSync(join(folder, 'index.js'), text);
  }
}

/** A data folder with the extension installed and the settings given. */
export function dataFolder(folder, vsix, settings) {
  mkdirSync(join(folder, 'data', 'User'), { recursive: true });
  writeFileSync(join(folder, 'data', 'User', 'settings.json'), JSON.stringify(settings, undefined, 2));
  execFileSync(process.execPath, [entry, '--accept-server-license-terms', '--server-data-dir', folder, '--install-extension', vsix], { stdio: ['ignore', 'ignore', 'inherit'] });
}

/** Starts the workbench on the loopback address; `testing` leaves out what guards a person's page. */
export async function startWorkbench({ data, port, token, testing }) {
  const chosen = port ?? (await freePort());
  const args = ['--host', '127.0.0.1', '--port', String(chosen), '--accept-server-license-terms', '--server-data-dir', data, '--telemetry-level', 'off'];
  args.push(...(testing ? ['--without-connection-token', '--disable-workspace-trust', '--enable-smoke-test-driver'] : ['--connection-token', token]));
  const server = spawn(process.execPath, [entry, ...args], { stdio: ['ignore', 'pipe', 'pipe'] });
  let log = '';
  await new Promise((resolve, reject) => {
    const listen = (chunk) => {
      log += chunk;
      if (/Extension host agent listening on/.test(log)) resolve();
    };
    server.stdout.on('data', listen);
    server.stderr.on('data', listen);
    server.once('exit', (status) => reject(new Error(`the workbench ended with ${status}:\n${log}`)));
  });
  return { port: chosen, authority: `127.0.0.1:${chosen}`, stop: () => server.kill(), ended: new Promise((resolve) => server.once('exit', resolve)) };
}

/** A copy of the examples that may be changed. */
export function copyExamples(folder = mkdtempSync(join(tmpdir(), 'termwise-examples-'))) {
  cpSync(join(root, 'examples'), folder, { recursive: true });
  return folder;
}

function freePort() {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const { port } = probe.address();
      probe.close(() => resolve(port));
    });
  });
}
