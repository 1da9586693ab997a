/**
 * `npm run editor`: the examples in a real VS Code with the extension. The desktop one where `code` is installed (with a profile
 * of its own); else the workbench in the browser, at an address on this machine only, which is printed.
 */
import { randomBytes } from 'node:crypto';
import { execFileSync, spawnSync } from 'node:child_process';
import { existsSync, mkdirSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { copyExamples, dataFolder, installWorkbench, startWorkbench } from './editor-rig.mjs';
import { packExtension } from './vsix.mjs';

const cache = join(dirname(fileURLToPath(import.meta.url)), '..', '.cache', 'editor');
const say = (text) => process.stdout.write(`${text}\n`);
const args = process.argv.slice(2);

mkdirSync(cache, { recursive: true });
const vsix = await packExtension(join(cache, 'termwise.vsix'));
const examples = join(cache, 'examples');
if (!existsSync(examples)) copyExamples(examples);

const windowless = process.platform === 'linux' && !process.env.DISPLAY && !process.env.WAYLAND_DISPLAY;
const desktop = !args.includes('--browser') && !windowless && spawnSync('code', ['--version'], { shell: process.platform === 'win32' }).status === 0;
if (desktop) onDesktop();
else await inBrowser();

function onDesktop() {
  const own = ['--user-data-dir', join(cache, 'desktop-data'), '--extensions-dir', join(cache, 'desktop-extensions')];
  const code = (rest) => execFileSync('code', [...own, ...rest], { stdio: 'inherit', shell: process.platform === 'win32' });
  code(['--install-extension', vsix, '--force']);
  code(['--new-window', examples, join(examples, 'mixer.py')]);
  say(`VS Code opens ${examples}, a copy of the examples, with a profile of its own.`);
}

async function inBrowser() {
  installWorkbench(say);
  const data = join(cache, 'data');
  dataFolder(data, vsix, { 'workbench.startupEditor': 'none', 'editor.hover.delay': 200 });
  const token = randomBytes(12).toString('hex');
  const workbench = await startWorkbench({ data, token, port: args.includes('--port') ? Number(args[args.indexOf('--port') + 1]) : undefined });
  const payload = encodeURIComponent(JSON.stringify([['openFile', `vscode-remote://${workbench.authority}${join(examples, 'mixer.py')}`]]));
  say(`\nOpen in a browser on this machine:\n\n  http://${workbench.authority}/?folder=${encodeURI(examples)}&tkn=${token}&payload=${payload}\n\nIt shows a copy of the examples. Ctrl+C ends it.`);
  process.on('SIGINT', workbench.stop);
  process.on('SIGTERM', workbench.stop);
  await workbench.ended;
}
