/**
 * Texts with marks. On the line under a flagged one stands a comment of the host language: carets under the flagged
 * columns, the code, and words that the message must contain after a colon:
 *
 *     dp = p + rho*h
 *     #    ^^^^^^^^^ unlike-terms: Pa
 *
 * `# <-- code` flags a finding that starts anywhere on the line above, for columns that carets cannot reach. The marks are
 * taken out before the text is checked, so that a text is read as its author would have written it.
 */
import { type FindingCode, findingCodes } from '../../server/src/findings/finding.ts';
import type { CheckResult, PlacedFinding } from '../../server/src/service/contract.ts';
import { LineIndex } from '../../server/src/text/line-index.ts';

/** One mark; lines and columns from zero in the text without marks. */
export interface Expectation {
  readonly line: number;
  /** Columns under the carets, the end excluded; undefined for `<--`. */
  readonly columns: { readonly start: number; readonly end: number } | undefined;
  readonly code: FindingCode;
  readonly words: string | undefined;
}

export interface MarkedText {
  /** The text without its marks. */
  readonly text: string;
  readonly expectations: readonly Expectation[];
  /** Line of the marked text, from zero, for each line of `text`. */
  readonly lines: readonly number[];
}

/** A part of a file that is checked as a file of its own: `# ==== title ====` begins one. */
export interface Section {
  readonly title: string;
  /** Line of the file, from zero, on which `text` begins. */
  readonly firstLine: number;
  readonly text: string;
}

const mark = /^\s*(?:#|\/\/|%|!|--)\s*(?:(?<carets>\^+)|<--)\s+(?<code>[a-z-]+)(?::\s*(?<words>.*\S))?\s*$/;
const heading = /^(?:#|\/\/|%|!)\s*={4}\s+(?<title>.*\S)\s+={4}$/;

/** Takes the marks out of a text. Throws on a mark that names no code or has no line above it: a fault of the test. */
export function readMarks(source: string): MarkedText {
  const kept: string[] = [];
  const lines: number[] = [];
  const expectations: Expectation[] = [];
  source.split('\n').forEach((line, at) => {
    const found = mark.exec(line)?.groups;
    if (!found) {
      kept.push(line);
      lines.push(at);
      return;
    }
    const code = findingCodes.find((each) => each === found.code);
    if (!code || kept.length === 0) throw new Error(`line ${at + 1}: not a mark of a finding: ${line.trim()}`);
    const start = line.indexOf('^');
    const columns = found.carets === undefined ? undefined : { start, end: start + found.carets.length };
    expectations.push({ line: kept.length - 1, columns, code, words: found.words });
  });
  return { text: kept.join('\n'), expectations, lines };
}

/** The sections of a file; what stands before the first heading belongs to none. */
export function readSections(source: string): readonly Section[] {
  const lines = source.split('\n');
  const starts = lines.flatMap((line, at) => (heading.test(line) ? [at] : []));
  return starts.map((start, at) => ({
    title: heading.exec(lines[start] as string)?.groups?.title ?? '',
    firstLine: start + 1,
    text: lines.slice(start + 1, starts[at + 1] ?? lines.length).join('\n'),
  }));
}

/**
 * What differs between marks and findings, one sentence each; empty where they agree. Findings of severity error or warning
 * need a mark; others may have one. `firstLine` is added to the lines in the sentences.
 */
export function deviations(marked: MarkedText, result: CheckResult, firstLine = 0): readonly string[] {
  const index = new LineIndex(marked.text);
  const open = [...result.findings].sort((a, b) => length(a) - length(b));
  const problems: string[] = [];
  for (const expected of marked.expectations) {
    const at = open.findIndex((finding) => agrees(expected, finding, index));
    if (at >= 0) open.splice(at, 1);
    else problems.push(`missing ${expected.code}${expected.words ? ` with "${expected.words}"` : ''} ${quote(marked, firstLine, expected.line, expected.columns)}`);
  }
  for (const finding of open) {
    if (finding.severity !== 'error' && finding.severity !== 'warning') continue;
    const start = index.position(finding.span.start);
    const end = Math.min(finding.span.end, index.lineEnd(start.line)) - index.lineStart(start.line);
    problems.push(`unexpected ${finding.code}: ${finding.message} ${quote(marked, firstLine, start.line, { start: start.column, end })}`);
  }
  return problems;
}

function agrees(expected: Expectation, finding: PlacedFinding, index: LineIndex): boolean {
  if (finding.code !== expected.code || index.lineAt(finding.span.start) !== expected.line) return false;
  if (expected.words !== undefined && !finding.message.includes(expected.words)) return false;
  if (!expected.columns) return true;
  const start = index.lineStart(expected.line);
  return finding.span.start <= start + expected.columns.start && finding.span.end >= start + expected.columns.end;
}

function length(finding: PlacedFinding): number {
  return finding.span.end - finding.span.start;
}

function quote(marked: MarkedText, firstLine: number, line: number, columns: { readonly start: number; readonly end: number } | undefined): string {
  const text = marked.text.split('\n')[line] ?? '';
  const under = columns ? `\n      ${' '.repeat(columns.start)}${'^'.repeat(Math.max(columns.end - columns.start, 1))}` : '';
  return `at line ${firstLine + (marked.lines[line] ?? line) + 1}\n    | ${text}${under}`;
}
