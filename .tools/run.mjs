/** Runs a TypeScript file of this project: `node .tools/run.mjs <file.ts> [arguments]`. */
import { mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { build } from 'esbuild';

const root = join(dirname(fileURLToPath(import.meta.url)), '..');
const [script, ...args] = process.argv.slice(2);
if (!script) {
  process.stderr.write('usage: node .tools/run.mjs <file.ts> [arguments]\n');
  process.exit(2);
}

/** Each module is told its own place in the sources, since it finds its data beside itself. */
const ownPlaces = {
  name: 'own-places',
  setup(bundle) {
    bundle.onLoad({ filter: /\.ts$/ }, ({ path }) => {
      const text = readFileSync(path, 'utf8');
      const contents = text.replaceAll('import.meta.url', JSON.stringify(pathToFileURL(path).href)).replaceAll('import.meta.dirname', JSON.stringify(dirname(path)));
      return { contents, loader: 'ts' };
    });
  },
};

const { outputFiles } = await build({
  absWorkingDir: root,
  entryPoints: [resolve(script)],
  bundle: true,
  write: false,
  format: 'esm',
  platform: 'node',
  target: 'node20',
  packages: 'external',
  sourcemap: 'inline',
  logLevel: 'warning',
  plugins: [ownPlaces],
});
const folder = join(root, 'node_modules', '.cache', 'termwise');
mkdirSync(folder, { recursive: true });
const file = join(folder, `run-${process.pid}.mjs`);
writeFileSync(file, outputFiles[0].contents);
process.on('exit', () => rmSync(file, { force: true }));
process.argv = [process.argv[0], resolve(script), ...args];
await import(pathToFileURL(file).href);
