import type { Chunk, ClassStmt, Comment, Expr, FunctionStmt, Stmt } from '../program/nodes.ts';
import { fieldAboveNote, namedAboveNote } from './above-notes.ts';
import type { Collector } from './collector.ts';
import { entryNotes, paramNote, returnNotes, trailingNotes } from './comment-notes.ts';
import { classDocs, functionDocs } from './doc-notes.ts';

/** Visits the statements of a chunk and reads the notes that belong to them. */
export class NoteWalk {
  /** Starts of comments that a statement has claimed. */
  readonly used = new Set<number>();
  readonly functions: FunctionStmt[] = [];
  readonly classes: ClassStmt[] = [];

  constructor(private readonly out: Collector, private readonly chunk: Chunk) {}

  /** The innermost function around a comment, or the one that the comment stands directly above. */
  ownerAt(comment: Comment): FunctionStmt | undefined {
    return this.functions.findLast((fn) => (fn.start <= comment.start && comment.start < this.endOf(fn)) || fn.above?.some((each) => each.start === comment.start));
  }

  block(statements: readonly Stmt[], owner: FunctionStmt | undefined, cls: ClassStmt | undefined): void {
    for (const statement of statements) this.statement(statement, owner, cls);
  }

  private statement(statement: Stmt, owner: FunctionStmt | undefined, cls: ClassStmt | undefined): void {
    if (statement.trailing) this.used.add(statement.trailing.start);
    switch (statement.kind) {
      case 'assign':
      case 'declare':
        trailingNotes(this.out, this.chunk, statement, owner);
        if (statement.above) this.above(statement, cls, owner);
        if (statement.kind === 'assign') this.entries(statement.value);
        return;
      case 'evaluate':
        return this.entries(statement.value);
      case 'return':
        if (owner) returnNotes(this.out, owner, statement);
        if (statement.value) this.entries(statement.value);
        return;
      case 'function':
        return this.function(statement, cls);
      case 'class':
        this.classes.push(statement);
        if (statement.doc) this.used.add(statement.doc.start);
        classDocs(this.out, statement);
        return this.block(statement.body, undefined, statement);
      case 'loop':
        trailingNotes(this.out, this.chunk, statement);
        return [statement.body, statement.otherwise].forEach((block) => this.block(block, owner, undefined));
      case 'scope':
        trailingNotes(this.out, this.chunk, statement);
        return this.block(statement.body, owner, undefined);
      case 'if':
        for (const arm of statement.arms) this.block(arm.body, owner, cls);
        return this.block(statement.otherwise, owner, cls);
      case 'attempt':
        return [statement.body, ...statement.handlers, statement.otherwise, statement.finally].forEach((block) => this.block(block, owner, undefined));
      case 'match':
        return statement.cases.forEach((each) => this.block(each.body, owner, undefined));
      default:
    }
  }

  private above(statement: Extract<Stmt, { kind: 'assign' | 'declare' }>, cls: ClassStmt | undefined, owner: FunctionStmt | undefined): void {
    const claimed = cls || statement.kind === 'declare' ? fieldAboveNote(this.out, statement, owner) : namedAboveNote(this.out, statement);
    const comment = statement.above?.at(-1);
    if (claimed && comment) this.used.add(comment.start);
  }

  private function(fn: FunctionStmt, cls: ClassStmt | undefined): void {
    this.functions.push(fn);
    if (fn.doc) this.used.add(fn.doc.start);
    for (const param of fn.params) {
      if (!param.comment) continue;
      this.used.add(param.comment.start);
      paramNote(this.out, this.chunk, fn, param);
    }
    functionDocs(this.out, fn, cls);
    this.block(fn.body, fn, undefined);
  }

  private endOf(fn: FunctionStmt): number {
    return Math.max(fn.end, fn.loose?.at(-1)?.end ?? 0);
  }

  /** Records anywhere in an expression may carry notes on their entries. */
  private entries(expr: Expr): void {
    switch (expr.kind) {
      case 'record':
        for (const entry of expr.entries) {
          if (entry.comment) this.used.add(entry.comment.start);
          this.entries(entry.value);
        }
        return entryNotes(this.out, this.chunk, expr);
      case 'call':
        return expr.args.forEach((argument) => this.entries(argument.value));
      case 'sequence':
        return expr.items.forEach((item) => this.entries(item));
      default:
    }
  }
}
