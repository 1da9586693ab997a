/** All unit notes and directives of one chunk, in one walk over its statements and one over its comments. */
import type { Chunk, ClassStmt, Expr, FunctionStmt, LanguageId, Stmt } from '../program/nodes.ts';
import type { Vocabulary } from '../quantities/unit-result.ts';
import { Collector } from './collector.ts';
import { entryNote, fieldAboveNote, paramNote, symbolNotes, trailingNotes } from './comment-notes.ts';
import { directiveIn } from './directives.ts';
import { classDocs, functionDocs } from './doc-notes.ts';
import type { ChunkNotes, NoteSettings } from './types.ts';

/** Reads the notes of a chunk; spans are relative to it. Never throws. */
export function readChunkNotes(chunk: Chunk, settings: NoteSettings, vocabulary: Vocabulary, _language: LanguageId): ChunkNotes {
  const out = new Collector(settings);
  const walk = new Walk(out, vocabulary);
  walk.block(chunk.statements, undefined, undefined);
  const firstCode = chunk.statements[0]?.start ?? Number.POSITIVE_INFINITY;
  for (const comment of chunk.comments) {
    out.directive(directiveIn(comment.text, comment.start, chunk.anchor.start === 0 && comment.end < firstCode, vocabulary));
    if (!walk.used.has(comment.start)) symbolNotes(out, comment, walk.ownerAt(comment.start), vocabulary);
  }
  if (chunk.doc) docDirectives(out, chunk.doc.text, chunk.doc.start, true, vocabulary);
  return out.result;
}

function docDirectives(out: Collector, text: string, start: number, wholeFile: boolean, vocabulary: Vocabulary): void {
  if (!/termwise|empirical|depends on/.test(text)) return;
  let offset = start;
  for (const line of text.split('\n')) {
    out.directive(directiveIn(line, offset, wholeFile, vocabulary));
    offset += line.length + 1;
  }
}

class Walk {
  /** Starts of comments that belong to a statement as its trailing note. */
  readonly used = new Set<number>();
  private readonly functions: FunctionStmt[] = [];

  constructor(private readonly out: Collector, private readonly vocabulary: Vocabulary) {}

  /** The innermost function around an offset. */
  ownerAt(offset: number): FunctionStmt | undefined {
    return this.functions.findLast((fn) => (fn.above?.[0]?.start ?? fn.start) <= offset && offset < fn.end);
  }

  block(statements: readonly Stmt[], owner: FunctionStmt | undefined, cls: ClassStmt | undefined): void {
    for (const statement of statements) this.statement(statement, owner, cls);
  }

  private statement(statement: Stmt, owner: FunctionStmt | undefined, cls: ClassStmt | undefined): void {
    if (statement.trailing) this.used.add(statement.trailing.start);
    switch (statement.kind) {
      case 'assign':
      case 'declare':
        trailingNotes(this.out, statement, this.vocabulary);
        if (cls) fieldAboveNote(this.out, statement, this.vocabulary);
        if (statement.kind === 'assign') this.entries(statement.value);
        return;
      case 'evaluate':
        return this.entries(statement.value);
      case 'return':
        if (statement.value) this.entries(statement.value);
        return;
      case 'function':
        return this.function(statement);
      case 'class':
        classDocs(this.out, statement, this.vocabulary);
        return this.block(statement.body, undefined, statement);
      case 'loop':
        trailingNotes(this.out, statement, this.vocabulary);
        this.block(statement.body, owner, undefined);
        return this.block(statement.otherwise, owner, undefined);
      case 'if':
        for (const arm of statement.arms) this.block(arm.body, owner, cls);
        return this.block(statement.otherwise, owner, cls);
      case 'attempt':
        for (const block of [statement.body, ...statement.handlers, statement.otherwise, statement.finally]) this.block(block, owner, undefined);
        return;
      case 'scope':
        return this.block(statement.body, owner, undefined);
      case 'match':
        for (const each of statement.cases) this.block(each.body, owner, undefined);
        return;
      default:
    }
  }

  private function(fn: FunctionStmt): void {
    this.functions.push(fn);
    for (const param of fn.params) {
      if (param.comment) this.used.add(param.comment.start);
      paramNote(this.out, fn, param, this.vocabulary);
    }
    functionDocs(this.out, fn, this.vocabulary);
    if (fn.doc) docDirectives(this.out, fn.doc.text, fn.doc.start, false, this.vocabulary);
    this.block(fn.body, fn, undefined);
  }

  /** Records anywhere in an expression may carry notes on their entries. */
  private entries(expr: Expr): void {
    if (expr.kind === 'record') {
      for (const entry of expr.entries) {
        if (entry.comment) this.used.add(entry.comment.start);
        entryNote(this.out, entry, this.vocabulary);
        this.entries(entry.value);
      }
    } else if (expr.kind === 'call') for (const argument of expr.args) this.entries(argument.value);
    else if (expr.kind === 'sequence') for (const item of expr.items) this.entries(item);
  }
}
