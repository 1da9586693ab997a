/** Measurements of the language server as an editor meets it: over standard input and output, on a real file. */
import { readFileSync } from 'node:fs';
import { extname } from 'node:path';
import type { Position } from 'vscode-languageserver/node.js';
import { LineIndex } from '../../server/src/text/line-index.ts';
import { Client } from '../lsp/client.ts';
import { type Spread, spread } from './measure.ts';

type Show = (what: string, figures: Spread, more?: string) => void;

/** Prints what opening, typing and asking cost; `languageId` as an editor names it. */
export async function measureServer(serverFile: string, file: string, languageId: string, show: Show, print: (line: string) => void): Promise<void> {
  const text = readFileSync(file, 'utf8');
  const name = `bench${extname(file)}`;
  Client.use(serverFile);
  const start = performance.now();
  const editor = await Client.start();
  try {
    await editor.open('small.py', 'p = 2.0  # [Pa]\nh = 3.0  # [m]\nx = p + h\n');
    await editor.untilCodes('small.py', ['unlike-terms']);
    show('server: start to first findings', spread([performance.now() - start]));
    const opened = performance.now();
    await editor.open(name, text, languageId);
    await published(editor, name, 1);
    show('server: first findings of the file', spread([performance.now() - opened]));
    show('server: findings after a keystroke', spread(await keystrokes(editor, name, text)));
    const places = placesIn(text);
    for (const [what, ask] of requests) show(`server: ${what}`, spread(await timedAll(places, (at) => ask(editor, name, at))));
    print(`server: memory with this file open ${editor.memory().toFixed(0)} MB`);
    for (let at = 0; at < 100; at++) await editor.open(`copy${at}${extname(file)}`, `${text.slice(0, 20_000)}\n`, languageId);
    await published(editor, `copy99${extname(file)}`, 1);
    print(`server: memory with 100 more open, 20,000 characters each, ${editor.memory().toFixed(0)} MB`);
  } finally {
    await editor.stop();
  }
}

const requests: readonly (readonly [string, (editor: Client, name: string, at: Position) => Promise<unknown>])[] = [
  ['hover', (editor, name, at) => editor.hover(name, at)],
  ['hints of 60 lines', (editor, name, at) => editor.ask('textDocument/inlayHint', name, { range: { start: { line: Math.max(at.line - 30, 0), character: 0 }, end: { line: at.line + 30, character: 0 } } })],
  ['completion', (editor, name, at) => editor.ask('textDocument/completion', name, { position: at })],
  ['code actions', (editor, name, at) => editor.actions(name, at)],
  ['origin of a unit', (editor, name, at) => editor.ask('textDocument/typeDefinition', name, { position: at })],
  ['outline', (editor, name) => editor.ask('textDocument/documentSymbol', name)],
  ['counts above functions', (editor, name) => editor.ask('textDocument/codeLens', name)],
];

async function published(editor: Client, name: string, version: number): Promise<void> {
  await editor.until(() => editor.published.some((each) => each.uri === editor.uri(name) && (each.version ?? 0) >= version), `findings of version ${version} of ${name}`);
}

/** A character typed and taken back at 60 places. */
async function keystrokes(editor: Client, name: string, text: string): Promise<readonly number[]> {
  const lines = new LineIndex(text);
  const samples: number[] = [];
  let version = 1;
  for (const position of placesIn(text).slice(0, 60)) {
    const end = { line: position.line, character: lines.lineText(position.line).length };
    for (const change of [{ range: { start: end, end }, text: '1' }, { range: { start: end, end: { ...end, character: end.character + 1 } }, text: '' }]) {
      const start = performance.now();
      await editor.change(name, change);
      await published(editor, name, ++version);
      samples.push(performance.now() - start);
    }
  }
  return samples;
}

/** The ends of words on 100 lines of code spread over the text. */
function placesIn(text: string): readonly Position[] {
  const lines = text.split('\n').flatMap((line, at) => (/^\s+\w+ = .*[\w)]$/.test(line) ? [{ line: at, character: line.length - 1 }] : []));
  return Array.from({ length: Math.min(100, lines.length) }, (_, at) => lines[Math.floor((at * lines.length) / Math.min(100, lines.length))] as Position);
}

async function timedAll(places: readonly Position[], ask: (at: Position) => Promise<unknown>): Promise<readonly number[]> {
  const samples: number[] = [];
  for (const at of places) {
    const start = performance.now();
    await ask(at);
    samples.push(performance.now() - start);
  }
  return samples;
}
