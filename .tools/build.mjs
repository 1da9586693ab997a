/** Builds what is shipped into dist/, or into the folder that is named: the command, the language server, the editor's client, the grammars, the signatures, the pages. */
import { chmodSync, cpSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { build as bundle } from 'esbuild';

const root = join(dirname(fileURLToPath(import.meta.url)), '..');

/** WASM files of the packages that ship them. */
const grammars = [
  'web-tree-sitter/web-tree-sitter.wasm', 'tree-sitter-python/tree-sitter-python.wasm',
  'tree-sitter-javascript/tree-sitter-javascript.wasm', 'tree-sitter-typescript/tree-sitter-typescript.wasm', 'tree-sitter-julia/tree-sitter-julia.wasm',
];

/** An earlier build stays where this one fails; a folder that is named is written into and not emptied. */
export async function build(folder) {
  const dist = folder ?? join(root, 'dist');
  const bundles = [bundleCommand(dist), bundleLanguageServer(dist), bundleClient(dist), bundleWorker(dist), bundleWebClient(dist)];
  const made = await Promise.all(bundles);
  const outputFiles = made.flatMap((each) => each.outputFiles);
  if (!folder) rmSync(dist, { recursive: true, force: true });
  mkdirSync(dist, { recursive: true });
  for (const file of outputFiles) writeFileSync(file.path, file.contents);
  for (const command of ['termwise.js', 'language-server.js']) chmodSync(join(dist, command), 0o755);
  copyAssets(dist);
  writeFileSync(join(dist, 'THIRD-PARTY-NOTICES.txt'), notices(made.flatMap(({ metafile }) => Object.keys(metafile.inputs))));
}

/** Everything stays in one folder: the assets are looked for beside the file that asks for them. */
function bundleCommand(dist) {
  return bundle({
    absWorkingDir: root,
    entryPoints: { termwise: 'server/src/cli/termwise.ts' },
    outdir: dist,
    bundle: true,
    write: false,
    metafile: true,
    splitting: true,
    format: 'esm',
    platform: 'node',
    target: 'node20',
    mainFields: ['module', 'main'],
    minify: true,
    legalComments: 'linked',
    chunkNames: '[name]-[hash]',
    logLevel: 'warning',
  });
}

/** One file: an editor starts it once, and then it stays. Parts of the protocol's library ask for Node's modules with `require`. */
function bundleLanguageServer(dist) {
  return bundle({
    absWorkingDir: root,
    entryPoints: { 'language-server': 'server/src/lsp/main.ts' },
    outdir: dist,
    bundle: true,
    write: false,
    metafile: true,
    format: 'esm',
    platform: 'node',
    target: 'node20',
    mainFields: ['module', 'main'],
    minify: true,
    legalComments: 'linked',
    banner: { js: "#!/usr/bin/env node\nimport { createRequire as termwiseRequire } from 'node:module';\nconst require = termwiseRequire(import.meta.url);" },
    logLevel: 'warning',
  });
}

/** Editors load their extensions with `require`. */
function bundleClient(dist) {
  return bundle({
    absWorkingDir: root,
    entryPoints: { extension: 'client/src/extension.ts' },
    outdir: dist,
    outExtension: { '.js': '.cjs' },
    bundle: true,
    write: false,
    metafile: true,
    format: 'cjs',
    platform: 'node',
    target: 'node20',
    external: ['vscode'],
    minify: true,
    legalComments: 'linked',
    logLevel: 'warning',
  });
}

/** The server as a worker: the protocol's library for browsers in the place of the one for Node, and no module of Node. */
function bundleWorker(dist) {
  return bundle({
    absWorkingDir: root,
    entryPoints: { 'web-server': 'server/src/lsp/browser.ts' },
    outdir: dist,
    bundle: true,
    write: false,
    metafile: true,
    format: 'iife',
    platform: 'browser',
    target: 'es2022',
    mainFields: ['module', 'browser', 'main'],
    alias: { 'vscode-languageserver/node.js': 'vscode-languageserver/browser.js' },
    // Asked for by the runtime of the grammars where it runs in Node, which is not here.
    external: ['fs/promises', 'module', 'node:*'],
    // An address to be named and not asked: the bytes are handed over.
    define: { 'import.meta.url': '"https://termwise.invalid/"' },
    minify: true,
    legalComments: 'linked',
    logLevel: 'warning',
  });
}

/** The client for an editor in a browser; extensions there are loaded with `require`, too, and end in `.js`. */
function bundleWebClient(dist) {
  return bundle({
    absWorkingDir: root,
    entryPoints: { 'web-extension': 'client/src/web.ts' },
    outdir: dist,
    bundle: true,
    write: false,
    metafile: true,
    format: 'cjs',
    platform: 'browser',
    target: 'es2022',
    external: ['vscode'],
    minify: true,
    legalComments: 'linked',
    logLevel: 'warning',
  });
}

/** The licences of every package of which something is shipped. `inputs`: the files that went into the bundles. */
function notices(inputs) {
  const folders = [...inputs, ...grammars.map((grammar) => `node_modules/${grammar}`)].flatMap((file) => /^(.*node_modules\/(?:@[^/]+\/)?[^/]+)\//.exec(file)?.[1] ?? []);
  const packages = [...new Set(folders)].sort().map((folder) => {
    const { name, version, license } = JSON.parse(readFileSync(join(root, folder, 'package.json'), 'utf8'));
    const file = readdirSync(join(root, folder)).find((each) => /^(?:licen[cs]e|copying)/i.test(each));
    return `${name} ${version} (${typeof license === 'string' ? license : 'see its text'})\n\n${file ? readFileSync(join(root, folder, file), 'utf8').trim() : 'The package carries no licence text of its own.'}\n`;
  });
  return `This software contains parts of the following packages.\n\n${packages.join(`\n${'-'.repeat(80)}\n\n`)}`;
}

function copyAssets(dist) {
  mkdirSync(join(dist, 'grammars'), { recursive: true });
  for (const grammar of grammars) cpSync(join(root, 'node_modules', grammar), join(dist, 'grammars', grammar.split('/')[1]));
  cpSync(join(root, 'server/src/signatures'), join(dist, 'signatures'), { recursive: true, filter: (path) => !path.endsWith('.ts') });
  const signatures = join(dist, 'signatures');
  // For a place where folders cannot be listed.
  writeFileSync(join(signatures, 'list.json'), JSON.stringify(Object.fromEntries(readdirSync(signatures, { withFileTypes: true }).filter((each) => each.isDirectory()).map(({ name }) => [name, readdirSync(join(signatures, name)).sort()]))));
  cpSync(join(root, 'server/src/findings/checks'), join(dist, 'pages'), { recursive: true, filter: (path) => !path.endsWith('.ts') });
}

if (process.argv[1] && import.meta.url === pathToFileURL(process.argv[1]).href) await build(process.argv[2] && resolve(process.argv[2]));
