import { describe, expect, it } from 'vitest';
import { nodeAssets } from '../../server/src/platform/node-assets.ts';

describe('the assets of a source run', () => {
  const assets = nodeAssets();
  // The first four bytes of every module, WebAssembly Core Specification 5.5.16.
  const magic = [0, 0x61, 0x73, 0x6d];

  it('holds the runtime and the grammar of Python as WASM', () => {
    expect([...assets.runtime().subarray(0, 4)]).toEqual(magic);
    expect([...(assets.grammar('python')?.subarray(0, 4) ?? [])]).toEqual(magic);
  });
  it('holds the signatures of Python, sorted by file', () => {
    const files = assets.signatures('python').map((each) => each.file);
    expect(files.some((file) => file.endsWith('numpy.nomen'))).toBe(true);
    expect(files).toEqual([...files].sort());
    for (const each of assets.signatures('python')) expect(each.text).toContain('(');
  });
  it('has no grammar for a language that is parsed by code of our own', () => {
    expect(assets.grammar('nomenclature')).toBeUndefined();
  });
});
