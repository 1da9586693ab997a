/** The order of the folders, as architecture and DEVELOPERS.md state it, held by the import graph. */
import { readdirSync, readFileSync } from 'node:fs';
import { join, posix } from 'node:path';
import ts from 'typescript';
import { describe, expect, test } from 'vitest';

const sources = join(import.meta.dirname, '../server/src');

/** Imports go from a later layer to an earlier one, or stay in the layer. Folders on one row do not know each other. */
const layers: readonly (readonly string[])[] = [
  ['text'], ['quantities'], ['program'], ['signatures'], ['notes'], ['frontends'], ['constraints'], ['solver'], ['findings', 'groups'],
  ['repairs'], ['wording'], ['analyze.ts'], ['service'], ['platform'], ['lsp', 'cli'],
];

/** Folders that may do input and output. */
const outside = new Set(['platform', 'lsp', 'cli']);
const mostLines = 390;

const files = readdirSync(sources, { recursive: true, encoding: 'utf8' }).filter((name) => name.endsWith('.ts')).map((name) => name.replaceAll('\\', '/')).sort();

function textOf(file: string): string {
  return readFileSync(join(sources, file), 'utf8');
}

/** Every module that a file imports, also for types only, dynamically or to export again. */
function importsOf(file: string, text = textOf(file)): readonly string[] {
  return ts.preProcessFile(text, true, true).importedFiles.map((each) => each.fileName);
}

function layerOf(file: string): { readonly name: string; readonly rank: number } {
  const name = file.split('/')[0] as string;
  return { name, rank: layers.findIndex((layer) => layer.includes(name)) };
}

/** What an import of a file does against the order; undefined where it keeps it. */
function fault(file: string, imported: string): string | undefined {
  const from = layerOf(file);
  if (!imported.startsWith('.')) {
    const node = imported.startsWith('node:') && !outside.has(from.name) ? `${file} imports ${imported}: analysis does no input or output` : undefined;
    return node ?? (imported.includes('tree-sitter') && from.name !== 'frontends' && from.name !== 'platform' ? `${file} imports ${imported}: only front ends know a host's syntax` : undefined);
  }
  const target = posix.join(posix.dirname(file), imported);
  if (target.startsWith('..')) return /(^|\/)package\.json$/.test(target) && outside.has(from.name) ? undefined : `${file} imports ${imported}, which lies outside of server/src`;
  const to = layerOf(target);
  if (to.rank < 0) return `${file} imports ${imported}, which is in no layer`;
  const allowed = to.name === from.name || to.rank < from.rank;
  return allowed ? undefined : `${file} imports ${imported}: ${from.name} comes before ${to.name}`;
}

test('every file is in a layer', () => {
  expect(files.length).toBeGreaterThan(100);
  expect(files.filter((file) => layerOf(file).rank < 0)).toEqual([]);
});

test('imports keep the order', () => {
  expect(files.flatMap((file) => importsOf(file).map((imported) => fault(file, imported)).filter((each) => each !== undefined))).toEqual([]);
});

test('outside of front ends and platform nobody names a syntax tree', () => {
  const naming = files.filter((file) => !/^(frontends|platform)\//.test(file) && /tree[-_]?sitter|childForFieldName|rootNode\b|nodeType\b/i.test(textOf(file)));
  expect(naming).toEqual([]);
});

test(`no file is longer than ${mostLines} lines`, () => {
  const long = files.map((file) => ({ file, lines: textOf(file).split('\n').length - 1 })).filter(({ lines }) => lines > mostLines);
  expect(long).toEqual([]);
});

describe('the test itself', () => {
  test.each([
    ['quantities/unit.ts', '../text/span.ts', true],
    ['quantities/unit.ts', './scale.ts', true],
    ['quantities/unit.ts', '../program/nodes.ts', false],
    ['findings/registry.ts', '../groups/bases.ts', false],
    ['solver/solve.ts', '../wording/words.ts', false],
    ['cli/check.ts', '../service/workspace.ts', true],
    ['cli/check.ts', '../lsp/server.ts', false],
    ['service/workspace.ts', 'node:fs', false],
    ['platform/disk.ts', 'node:fs', true],
    ['service/workspace.ts', 'web-tree-sitter', false],
    ['frontends/python/index.ts', 'web-tree-sitter', true],
    ['notes/types.ts', '../../../test/harness/markers.ts', false],
  ])('%s importing %s', (file, imported, kept) => {
    expect(fault(file, imported) === undefined).toBe(kept);
  });

  test('sees every form of import', () => {
    const text = "import a from './a.ts';\nimport type { B } from './b.ts';\nexport * from './c.ts';\nconst d = await import('./d.ts');\nimport './e.ts';\nlet f: import('./f.ts').F;\n";
    expect(importsOf('x.ts', text)).toEqual(expect.arrayContaining(['./a.ts', './b.ts', './c.ts', './d.ts', './e.ts']));
  });
});
