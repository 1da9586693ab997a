/** `npm start`: builds, checks the examples, and says what to do next. */
import { spawnSync } from 'node:child_process';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from './build.mjs';

const root = join(dirname(fileURLToPath(import.meta.url)), '..');
await build();
process.stdout.write('$ termwise check examples\n\n');
const { status } = spawnSync(process.execPath, [join(root, 'dist', 'termwise.js'), 'check', 'examples'], { cwd: root, stdio: 'inherit' });

/** 1 is what the examples are for: their faults are there on purpose (examples/README.md lists them). */
if (status !== 0 && status !== 1) process.exit(status ?? 2);
process.stdout.write(`
The faults in examples/ are there on purpose: examples/README.md lists them.

Next:
  node dist/termwise.js check path/to/your/scripts     check your own scripts; nothing is run or changed
  npm install -g .                                     then the command is termwise check ...
  npm run editor                                       the examples in VS Code, on the desktop or in the browser
  node dist/termwise.js help check                     options, configuration file, exit status
`);
