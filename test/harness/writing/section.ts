/** A section of the Python specifications in another language: its text there, and its marks on the lines where they stand then. */
import type { FindingCode } from '../../../server/src/findings/finding.ts';
import type { FrontEnd } from '../../../server/src/frontends/frontend.ts';
import { readChunkNotes } from '../../../server/src/notes/read-chunk.ts';
import { defaultNoteSettings, type Note } from '../../../server/src/notes/types.ts';
import type { Chunk, Expr, Stmt } from '../../../server/src/program/nodes.ts';
import { emptyVocabulary } from '../../../server/src/quantities/unit-result.ts';
import { LineIndex } from '../../../server/src/text/line-index.ts';
import type { Host, Line } from '../hosts/host.ts';
import type { Expectation, MarkedText } from '../markers.ts';
import { python } from '../python.ts';
import { Names } from './names.ts';
import { readByFunctions } from './scope.ts';
import { Unsayable, unsayable } from './unsayable.ts';
import { expressionsOf, nestedIn, within } from './visit.ts';
import { Writer } from './writer.ts';

export type WrittenSection =
  /** `notes`: how many notes the original has, which the written text must have at least. */
  | { readonly said: true; readonly marked: MarkedText; readonly notes: number }
  | { readonly said: false; readonly reason: string };

/** These stand where the note is. */
const aboutNotes = new Set<FindingCode>(['unreadable-unit', 'ambiguous-unit', 'conflicting-notes']);

/** Writes a section without its marks; what the language cannot say is told by its reason. */
export function writeSection(marked: MarkedText, host: Host, frontEnd: FrontEnd): WrittenSection {
  try {
    return written(marked, host, frontEnd);
  } catch (error) {
    if (error instanceof Unsayable) return { said: false, reason: error.message };
    throw error;
  }
}

function written({ text, expectations }: MarkedText, host: Host, frontEnd: FrontEnd): WrittenSection {
  const parsed = python.parse(text, 'spec.py');
  parsed.release();
  const { chunks } = parsed.program;
  if (chunks.some((chunk) => chunk.problems.length > 0)) return unsayable('broken syntax');
  const notes = new Map(chunks.map((chunk) => [chunk, readChunkNotes(chunk, defaultNoteSettings, emptyVocabulary, 'python').notes]));
  const lines = fileOf(chunks, host, frontEnd, new LineIndex(text), (chunk) => notes.get(chunk) ?? []);
  const places = expectations.map((each): Expectation => {
    const note = aboutNotes.has(each.code) ? lines.findIndex((candidate) => candidate.noteOf === each.line) : -1;
    const line = note >= 0 ? note : lines.findIndex((candidate) => candidate.covers?.includes(each.line));
    return line < 0 ? unsayable(`no place for ${each.code}`) : { ...each, line, columns: undefined };
  });
  const count = [...notes.values()].flat().filter((note) => isRead(note, host)).length;
  return { said: true, notes: count, marked: { text: `${lines.map((line) => line.text).join('\n')}\n`, expectations: places, lines: lines.map((_, at) => at) } };
}

function fileOf(chunks: readonly Chunk[], host: Host, frontEnd: FrontEnd, index: LineIndex, notesOf: (chunk: Chunk) => readonly Note[]): readonly Line[] {
  const all = chunks.flatMap((chunk) => chunk.statements.map((stmt) => ({ chunk, stmt })));
  const statements = all.map(({ stmt }) => stmt);
  const names = new Names(statements, host);
  const writer = new Writer(host, frontEnd.style, names, index, notesOf);
  const shared = readByFunctions(statements);
  const script = statements.filter((stmt) => stmt.kind !== 'function');
  const locals = writer.locals(script);
  if (!host.says.has('globals') && script.some((stmt) => isShared(stmt, shared))) return unsayable('functions that read the script');
  if (!host.says.has('array arithmetic') && statements.some((stmt) => reckonsWithLists(stmt, names, writer))) return unsayable('arithmetic with lists');
  const asScript = writer.script(locals, new Set());
  const parts = { functions: [] as Line[], globals: [] as Line[], script: [] as Line[], written: [] as Line[] };
  for (const { chunk, stmt } of all) {
    const lines = stmt.kind === 'function' ? [...writer.function(chunk, stmt), { text: '' }] : asScript(chunk, stmt);
    parts.written.push(...lines);
    (stmt.kind === 'function' ? parts.functions : host.whole && isShared(stmt, shared) ? parts.globals : parts.script).push(...lines);
  }
  const own = locals.filter((each) => !shared.has(each.name));
  const opening = (host.opening ?? []).map((text) => ({ text }));
  if (host.whole) return [...opening, ...host.whole({ ...parts, head: [], locals: own })];
  if (host.order === 'script first') return [...opening, ...parts.script, { text: '' }, ...parts.functions];
  return [...opening, ...parts.written];
}

function isRead({ unit, target }: Note, { leavesAlone }: Host): boolean {
  if (unit.text === 'in' && leavesAlone?.has('[in]')) return false;
  return !(target.kind === 'statement' && target.statement.kind === 'loop' && leavesAlone?.has('loop heads'));
}

/** Operators and library functions on whole lists. */
function reckonsWithLists(top: Stmt, names: Names, writer: Writer): boolean {
  const block = top.kind === 'function' ? top.body : [top];
  const lists = new Set(writer.locals(block).flatMap((each) => (each.size === undefined ? [] : [each.name])));
  const isList = (expr: Expr): boolean => expr.kind === 'name' && lists.has(names.of(expr.name));
  return block.flatMap((each) => [...nestedIn(each)]).flatMap((each) => [...expressionsOf(each)]).flatMap((each) => [...within(each)]).some((expr) => {
    if (expr.kind === 'binary') return isList(expr.left) || isList(expr.right);
    if (expr.kind === 'call') return names.library(expr.callee) !== undefined && names.library(expr.callee) !== 'len' && expr.args.some((arg) => isList(arg.value));
    return expr.kind === 'unary' && isList(expr.operand);
  });
}

/** An assignment that functions read. */
function isShared(stmt: Stmt, shared: ReadonlySet<string>): boolean {
  return stmt.kind === 'assign' && stmt.targets.some((target) => target.kind === 'name' && shared.has(target.name));
}
