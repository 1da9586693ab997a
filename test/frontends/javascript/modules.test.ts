/** Imports between files. Source of the forms: ECMA-262 (2025), clause 16.2; Node.js documentation, modules. */
import { describe, expect, test } from 'vitest';
import { engine, filesOf } from '../../harness/engine.ts';

const library = `/**
 * @param {number} d - diameter [m]
 * @returns {number} area [m^2]
 */
export function area(d) { return Math.PI / 4 * d ** 2; }
export const depth = 3;  // [m]
export default area;
export { depth as height };
`;

/** What is found in the last of some files. */
async function found(files: Readonly<Record<string, string>>, file: string): Promise<readonly string[]> {
  const workspace = await engine(filesOf(files));
  await workspace.prepare('javascript');
  await workspace.prepare('typescript');
  return workspace.check(file, files[file] as string).findings.filter((each) => each.severity !== 'hint').map((each) => each.code);
}

describe('the units of another file', () => {
  test.each([
    ['named', "import { area, depth } from './lib.js';\nconst x = area(depth) + depth;", 'b/a/lib.js'],
    ['renamed', "import { area as A, height } from './lib';\nconst x = A(2) + height;", 'b/a/lib.js'],
    ['the default', "import A, { depth } from './lib.js';\nconst x = A(2) + depth;", 'b/a/lib.js'],
    ['the whole', "import * as lib from './lib.js';\nconst x = lib.area(2) + lib.depth;", 'b/a/lib.js'],
    ['required', "const { area, depth: D } = require('./lib');\nconst x = area(2) + D;", 'b/a/lib.js'],
    ['required as a whole', "const lib = require('./lib.js');\nconst x = lib.area(2) + lib.depth;", 'b/a/lib.js'],
    ['a source that is made into it', "import { area, depth } from './lib.js';\nconst x = area(depth) + depth;", 'b/a/lib.ts'],
    ['the index of a folder', "import { area, depth } from './lib';\nconst x = area(depth) + depth;", 'b/a/lib/index.js'],
    ['a folder above', "import { area, depth } from '../lib.js';\nconst x = area(depth) + depth;", 'b/lib.js'],
  ])('%s', async (_name, script, at) => {
    expect(await found({ [at]: library, 'b/a/main.js': script }, 'b/a/main.js')).toEqual(['unlike-terms']);
  });

  test('through a file that exports again', async () => {
    const files = { 'b/a/lib.js': library, 'b/a/all.js': "export { area as A } from './lib.js';\nexport * from './lib.js';\n", 'b/a/main.js': "import { A, depth } from './all.js';\nconst x = A(2) + depth;" };
    expect(await found(files, 'b/a/main.js')).toEqual(['unlike-terms']);
  });

  test('right sums are silent, and so are packages', async () => {
    expect(await found({ 'b/a/lib.js': library, 'b/a/main.js': "import { area, depth } from './lib.js';\nimport y from 'lib';\nconst x = area(depth) + depth ** 2 + y;" }, 'b/a/main.js')).toEqual([]);
  });

  test('a script reads a file of the other language', async () => {
    const files = { 'b/a/pump.ts': 'export interface Pump { D: number;  // [m]\n N: number;  // [rev/s]\n}\n', 'b/a/main.ts': "import type { Pump } from './pump';\nexport function f(p: Pump) { return p.D + p.N; }\n" };
    expect(await found(files, 'b/a/main.ts')).toEqual(['unlike-terms']);
  });
});
