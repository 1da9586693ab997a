/**
 * The engine on real code: `npm run corpus -- <folder>`. Prints functions, notes read and not read, findings by code, crashes and
 * time; with --seed-edits, how many of the faults put into its functions are reported. Nothing of the corpus is kept.
 */
import { relative, resolve } from 'node:path';
import type { FrontEnd } from '../../server/src/frontends/frontend.ts';
import { languages } from '../../server/src/frontends/registry.ts';
import { defaultNoteSettings } from '../../server/src/notes/types.ts';
import { diskFiles } from '../../server/src/platform/disk.ts';
import { nodeAssets } from '../../server/src/platform/node-assets.ts';
import type { CheckResult, Workspace } from '../../server/src/service/contract.ts';
import { createWorkspace } from '../../server/src/service/workspace.ts';
import { loadFrontEnd } from '../harness/front-ends.ts';
import { LineIndex } from '../../server/src/text/line-index.ts';
import { type CorpusOptions, readCorpusArguments } from './arguments.ts';
import { type EditKind, seedEdits } from './edits.ts';
import { restoredLine } from './repairs.ts';
import { type Script, scriptsIn } from './scripts.ts';
import { type Tried, tryEdits } from './try-edits.ts';

const options = readCorpusArguments(process.argv.slice(2));
if (typeof options === 'string') {
  process.stderr.write(`${options}\n`);
  process.exitCode = 2;
} else await main(options);

async function main(options: CorpusOptions): Promise<void> {
  const workspace = await createWorkspace(nodeAssets(), diskFiles(), { severities: {}, notes: defaultNoteSettings }, languages);
  survey(workspace, options);
  if (!options.seedEdits) return;
  const present = new Set([...scriptsIn(options.folder, options.language, () => {})].map(({ language }) => language));
  for (const language of present) measureEdits(workspace, await loadFrontEnd(language), options);
}

function survey(workspace: Workspace, { folder, language, list, unread }: CorpusOptions): void {
  const totals = { files: 0, lines: 0, functions: 0, notes: 0, crashes: 0 };
  const codes = new Map<string, number>();
  const spellings = new Map<string, number>();
  const start = performance.now();
  for (const { file, text, language: written, lineName } of scriptsIn(folder, language, tellUnreadable)) {
    totals.files++;
    totals.lines += text.split('\n').length;
    try {
      const result = workspace.check(file, text, written, lineName);
      totals.functions += result.statistics.functions;
      totals.notes += result.statistics.notes;
      for (const spelling of result.statistics.unread) count(spellings, spelling);
      for (const finding of result.findings) count(codes, `${finding.code} (${finding.severity})`);
      listFindings(result, folder, list, lineName);
    } catch (error) {
      totals.crashes++;
      print(`CRASH ${file}: ${error instanceof Error ? error.stack : String(error)}`);
    }
    workspace.forget(file);
  }
  const seconds = (performance.now() - start) / 1000;
  const notRead = [...spellings.values()].reduce((sum, each) => sum + each, 0);
  print(`${totals.files} files, ${totals.lines} lines, ${totals.functions} functions, ${seconds.toFixed(1)} s, ${totals.crashes} crashes`);
  print(`${totals.notes} notes read, ${notRead} brackets not read (${spellings.size} spellings)`);
  for (const [code, number] of ranked(codes)) print(`  ${code}: ${number}`);
  if (unread > 0 && spellings.size > 0) print(`commonest not read: ${ranked(spellings).slice(0, unread).map(([text, number]) => `${JSON.stringify(text)} ${number}`).join(', ')}`);
}

function listFindings(result: CheckResult, folder: string, list: readonly string[], lineName: Script['lineName']): void {
  const lines = new LineIndex(result.text);
  for (const { code, severity, span, message } of result.findings) {
    if (!list.includes(code) && !list.includes(severity) && !list.includes('all')) continue;
    const line = lines.lineAt(span.start);
    print(`${nameOf(result.file, folder)}${lineName ? `: ${lineName(span.start)}` : `:${line + 1}`}: ${severity} ${code}: ${message}\n    ${lines.lineText(line).trim()}`);
  }
}

function measureEdits(workspace: Workspace, frontEnd: FrontEnd, { folder, missed, repairs }: CorpusOptions): void {
  const start = performance.now();
  const tried: Record<EditKind, Tried[]> = { squared: [], dropped: [] };
  for (const script of scriptsIn(folder, frontEnd.language, () => {})) {
    const edits = seedEdits(frontEnd, script.file, script.text);
    if (edits.length === 0) continue;
    for (const each of tryEdits(workspace, script, edits, repairs)) {
      tried[each.edit.kind].push(each);
      if (missed && !each.reported) print(`missed ${each.edit.kind} ${each.edit.parameter} in ${nameOf(script.file, folder)}:${each.line} ${each.edit.functionName}${each.elsewhere ? ' (reported elsewhere)' : ''}\n    ${each.source}`);
    }
    workspace.forget(script.file);
  }
  print(`seeded edits in ${frontEnd.language}, ${((performance.now() - start) / 1000).toFixed(1)} s`);
  for (const kind of ['squared', 'dropped'] as const) {
    print(`  ${kind}: ${shares(tried[kind])}`);
    if (repairs) print(`    repairs: ${restoredLine(tried[kind].flatMap((each) => each.restored ?? []))}`);
  }
}

function shares(tried: readonly Tried[]): string {
  const share = (number: number): string => `${number} (${tried.length === 0 ? 0 : ((100 * number) / tried.length).toFixed(1)} %)`;
  const [reported, placed, elsewhere] = (['reported', 'placed', 'elsewhere'] as const).map((key) => tried.filter((each) => each[key]).length);
  return `${share(reported as number)} of ${tried.length} reported, ${share(placed as number)} at a new place; ${elsewhere} reported only elsewhere`;
}

function tellUnreadable(file: string, problem: string): void {
  print(`${file}: ${problem}`);
}

function nameOf(file: string, folder: string): string {
  return relative(resolve(folder), file) || file;
}

function count(into: Map<string, number>, key: string): void {
  into.set(key, (into.get(key) ?? 0) + 1);
}

function ranked(counts: ReadonlyMap<string, number>): readonly (readonly [string, number])[] {
  return [...counts].sort((a, b) => b[1] - a[1] || (a[0] < b[0] ? -1 : 1));
}

function print(line: string): void {
  process.stdout.write(`${line}\n`);
}
