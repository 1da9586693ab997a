/**
 * `npm run test:editor`: the packaged extension in a real VS Code. On a desktop (a `code` on the path, or --download) with
 * @vscode/test-electron; else in the browser workbench, where some flows also drive the page. `--screenshots DIR` keeps its pictures, `--flow WORDS` runs only the flows with these words in their names, `--suite` only what runs inside the editor.
 */
import { execFileSync } from 'node:child_process';
import { cpSync, existsSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from 'esbuild';
import { copyExamples, dataFolder, installWorkbench, startWorkbench } from './editor-rig.mjs';
import { browserExecutable, openPage } from './editor-page.mjs';
import { lastLook, pageFlows, webFlows } from './editor-flows.mjs';
import { packExtension } from './vsix.mjs';

const root = join(dirname(fileURLToPath(import.meta.url)), '..');
const args = process.argv.slice(2);
const screenshots = args.includes('--screenshots') ? resolve(args[args.indexOf('--screenshots') + 1]) : undefined;
/** Part of a flow's name: that one alone is run. */
const only = args.includes('--flow') ? args[args.indexOf('--flow') + 1] : undefined;
const say = (text) => process.stdout.write(`${text}\n`);
const suiteTime = 8 * 60_000;
const counts = { passed: 0, failed: 0 };
const folder = mkdtempSync(join(tmpdir(), 'termwise-editor-'));

try {
  const suite = join(folder, 'suite');
  await bundleSuite(suite);
  const vsix = await packExtension(join(folder, 'termwise.vsix'));
  const webVsix = await packExtension(join(folder, 'termwise-web.vsix'), { webOnly: true });
  const desktop = desktopEditor();
  if (desktop || args.includes('--download')) await onDesktop(suite, vsix, desktop);
  else await inBrowser(suite, vsix, webVsix);
} catch (error) {
  counts.failed++;
  say(error instanceof Error ? (error.stack ?? error.message) : String(error));
} finally {
  rmSync(folder, { recursive: true, force: true });
}
say(`${counts.passed} passed, ${counts.failed} failed`);
process.exit(counts.failed > 0 ? 1 : 0);

async function bundleSuite(target) {
  await build({ absWorkingDir: root, entryPoints: ['test/editor/suite.ts'], outfile: join(target, 'suite.cjs'), bundle: true, format: 'cjs', platform: 'node', target: 'node20', external: ['vscode'], logLevel: 'warning' });
  // A folder that counts as the extension under development: the one that is tested is installed.
  writeFileSync(join(target, 'package.json'), JSON.stringify({ name: 'suite', publisher: 'termwise', version: '0.0.0', engines: { vscode: '^1.91.0' }, main: './suite.cjs' }));
}

function desktopEditor() {
  if (!process.env.DISPLAY && process.platform === 'linux') return undefined;
  try {
    return execFileSync(process.platform === 'win32' ? 'where' : 'which', ['code'], { encoding: 'utf8' }).trim().split('\n')[0];
  } catch {
    return undefined;
  }
}

async function onDesktop(suite, vsix, executable) {
  const electron = await import('@vscode/test-electron');
  const path = executable ?? (await electron.downloadAndUnzipVSCode());
  const cli = executable ?? electron.resolveCliPathFromVSCodeExecutablePath(path);
  const own = ['--user-data-dir', join(folder, 'data'), '--extensions-dir', join(folder, 'extensions')];
  execFileSync(cli, [...own, '--install-extension', vsix], { stdio: ['ignore', 'ignore', 'inherit'], shell: process.platform === 'win32' });
  try {
    await electron.runTests({ vscodeExecutablePath: path, extensionDevelopmentPath: suite, extensionTestsPath: join(suite, 'suite.cjs'), launchArgs: [copyExamples(), ...own, '--disable-workspace-trust'] });
    counts.passed++;
  } catch (error) {
    counts.failed++;
    say(String(error));
  }
}

async function inBrowser(suite, vsix, webVsix) {
  installWorkbench(say);
  const executablePath = browserExecutable();
  const template = join(folder, 'template');
  const settings = { 'workbench.startupEditor': 'none', 'files.autoSave': 'off', 'files.hotExit': 'off', 'editor.hover.delay': 100, 'security.workspace.trust.enabled': false };
  dataFolder(template, vsix, settings);
  if (only === undefined) await withWorkbench(template, 'suite', (workbench, workspace) => runSuite(workbench, workspace, suite, executablePath));
  if (screenshots) mkdirSync(screenshots, { recursive: true });
  const webTemplate = join(folder, 'web-template');
  dataFolder(webTemplate, webVsix, settings);
  const flows = [...Object.entries(pageFlows).map(([name, flow]) => [name, flow, template]), ...webFlows.map((name) => [`in a worker of the browser: ${name}`, pageFlows[name], webTemplate])];
  for (const [name, flow, data] of flows.filter(([each]) => !args.includes('--suite') && (only === undefined || each.includes(only)))) {
    try {
      await withWorkbench(data, 'flow', (workbench, workspace) => runFlow(workbench, workspace, name, flow, executablePath));
      counts.passed++;
      say(`ok: ${name}`);
    } catch (error) {
      counts.failed++;
      say(`FAILED: ${name}: ${error instanceof Error ? error.message : error}`);
    }
  }
}

/** A fresh copy of data and workspace for each: backups of unsaved files leak into the next. */
async function withWorkbench(template, name, use) {
  const data = mkdtempSync(join(folder, `${name}-`));
  cpSync(template, data, { recursive: true });
  const workspace = copyExamples(mkdtempSync(join(folder, 'examples-')));
  const workbench = await startWorkbench({ data, testing: true });
  try {
    return await use(workbench, workspace);
  } finally {
    workbench.stop();
    await workbench.ended;
  }
}

async function runSuite(workbench, workspace, suite, executablePath) {
  const remote = (path) => `vscode-remote://${workbench.authority}${path}`;
  const page = await openPage({
    executablePath, workbench, workspace,
    payload: [['extensionDevelopmentPath', remote(suite)], ['extensionTestsPath', remote(join(suite, 'suite.cjs'))], ['skipWelcome', 'true']],
    log: (line) => {
      if (/^(?:ok|FAILED): /.test(line)) say(line);
      if (line.startsWith('ok: ')) counts.passed++;
      if (line.startsWith('FAILED: ')) counts.failed++;
    },
  });
  const late = new Promise((resolve) => setTimeout(resolve, suiteTime, 'late').unref());
  const status = await Promise.race([page.exit, late]);
  await page.close();
  if (status === 'late') throw new Error(`the suite did not end within ${suiteTime / 60_000} minutes`);
  if (status !== 0 && counts.failed === 0) throw new Error(`the suite ended with ${status}`);
  if (counts.passed === 0) throw new Error('the suite ran no case');
}

async function runFlow(workbench, workspace, name, flow, executablePath) {
  const opened = await openPage({ executablePath, workbench, workspace, payload: [['openFile', `vscode-remote://${workbench.authority}${workspace}/mixer.py`], ['skipWelcome', 'true']], log: () => {} });
  try {
    await flow(opened.page, screenshots && existsSync(screenshots) ? screenshots : undefined);
  } catch (error) {
    await lastLook(opened.page, screenshots, name);
    throw error;
  } finally {
    await opened.close();
  }
}
