/**
 * The server as another editor meets it, with its generic configuration from the README and nothing else: a client of the registry
 * (ts-lsp-client, which speaks JSON-RPC by a library of its own) over standard input and output.
 */
import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { JSONRPCEndpoint, LspClient } from 'ts-lsp-client';
import { afterAll, beforeAll, expect, test } from 'vitest';
// @ts-expect-error A tool without types.
import { build } from '../../.tools/build.mjs';

const folder = mkdtempSync(join(tmpdir(), 'termwise-other-'));

beforeAll(() => build(folder));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

test('findings, hover and the end', async () => {
  const server = spawn(process.execPath, [join(folder, 'language-server.js'), '--stdio'], { stdio: ['pipe', 'pipe', 'inherit'] });
  const ended = new Promise<number | null>((resolve) => server.once('exit', resolve));
  const endpoint = new JSONRPCEndpoint(server.stdin, server.stdout);
  const client = new LspClient(endpoint);
  const root = pathToFileURL(folder).href;
  const { capabilities } = await client.initialize({ processId: process.pid, rootUri: root, capabilities: {}, clientInfo: { name: 'other', version: '1' }, workspaceFolders: null });
  expect(capabilities).toMatchObject({ hoverProvider: true, positionEncoding: 'utf-16' });
  client.initialized();
  const uri = `${root}/pump.py`;
  const published = new Promise<{ readonly uri: string; readonly diagnostics: readonly { readonly code: string }[] }>((resolve) => endpoint.once('textDocument/publishDiagnostics', resolve));
  client.didOpen({ textDocument: { uri, languageId: 'python', version: 1, text: 'p = 2.0e5  # [Pa]\nh = 12.0  # [m]\nx = p + h\n' } });
  const { diagnostics, uri: about } = await published;
  expect([about, diagnostics.map(({ code }) => code)]).toEqual([uri, ['unlike-terms']]);
  const hover = await client.hover({ textDocument: { uri }, position: { line: 2, character: 4 } });
  expect(JSON.stringify(hover)).toContain('[Pa]');
  await client.shutdown();
  client.exit();
  expect(await ended).toBe(0);
});
