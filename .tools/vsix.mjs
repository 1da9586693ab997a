/** `npm run package`: the extension as one file, termwise-<version>.vsix, or where the argument says; its size is printed. */
import { cpSync, mkdirSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { dirname, join, relative, resolve } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { createVSIX } from '@vscode/vsce';
import { build } from './build.mjs';

const root = join(dirname(fileURLToPath(import.meta.url)), '..');
const manifest = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8'));

/** What an editor reads of the manifest; the command and its packages have no place in an extension. */
const keys = ['name', 'displayName', 'version', 'description', 'license', 'publisher', 'icon', 'keywords', 'categories', 'engines', 'main', 'browser', 'activationEvents', 'capabilities', 'contributes', 'l10n'];
const copied = ['syntaxes', 'schemas', 'client/language', 'client/walkthrough', 'client/l10n', 'client/pictures', 'client/icon.png', 'examples', 'README.md', 'CHANGELOG.md', 'LICENSE'];
/** Of the build: the rest is the command's. */
const built = ['extension.cjs', 'extension.cjs.LEGAL.txt', 'language-server.js', 'language-server.js.LEGAL.txt', 'web-extension.js', 'web-server.js', 'THIRD-PARTY-NOTICES.txt', 'grammars', 'signatures', 'pages'];

/** Packs the extension and gives the path of the file. `webOnly`: without what runs in Node, so that an editor has to take the other. */
export async function packExtension(target = join(root, `${manifest.name}-${manifest.version}.vsix`), { webOnly = false } = {}) {
  const stage = join(root, '.cache', `vsix-${process.pid}`);
  try {
    const dist = join(stage, 'build');
    await build(dist);
    const folder = join(stage, 'extension');
    mkdirSync(join(folder, 'dist'), { recursive: true });
    const present = new Set(readdirSync(dist));
    for (const name of built) if (present.has(name)) cpSync(join(dist, name), join(folder, 'dist', name), { recursive: true });
    for (const name of copied) cpSync(join(root, name), join(folder, name), { recursive: true });
    writeFileSync(join(folder, 'package.json'), JSON.stringify(Object.fromEntries(keys.filter((key) => !(webOnly && key === 'main')).map((key) => [key, manifest[key]])), undefined, 2));
    // An editor in a browser loads no extension that calls itself a module; the server is one, and its folder says so.
    writeFileSync(join(folder, 'dist', 'package.json'), '{ "type": "module" }\n');
    mkdirSync(dirname(target), { recursive: true });
    await createVSIX({ cwd: folder, packagePath: target, dependencies: false, allowMissingRepository: true, rewriteRelativeLinks: false });
    return target;
  } finally {
    rmSync(stage, { recursive: true, force: true });
  }
}

if (process.argv[1] && import.meta.url === pathToFileURL(process.argv[1]).href) {
  const file = await packExtension(process.argv[2] && resolve(process.argv[2]));
  process.stdout.write(`${relative(process.cwd(), file)}: ${(statSync(file).size / 1024 / 1024).toFixed(2)} MB\n`);
}
