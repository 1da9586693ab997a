/**
 * The common program form as compact s-expressions, one statement a line, blocks indented: text that tests can compare.
 * `x = a + 2  # [m]` shows as `(= x (+ a 2)) # [m]`.
 */
import type { Chunk, Comment, Expr, Param, Program, Stmt } from '../../server/src/program/nodes.ts';

/** Every statement of a program; `offsets` adds the range of every node in the file, so that two parses can be compared wholly. */
export function showProgram(program: Program, offsets = false): string {
  return program.chunks.map((chunk) => showChunk(chunk, offsets)).filter((each) => each !== '').join('\n');
}

export function showChunk(chunk: Chunk, offsets = false): string {
  const shown = new Shower(offsets ? chunk.anchor.start : undefined);
  const lines = [...(chunk.doc ? [`doc ${shown.quoted(chunk.doc)}`] : []), ...chunk.statements.flatMap((each) => shown.statement(each))];
  for (const problem of chunk.problems) lines.push(`! ${problem.message}${shown.at(problem)}`);
  if (offsets) lines.push(`chunk@${chunk.anchor.start}+${chunk.text.length} ${chunk.comments.map((each) => `# ${each.text}${shown.at(each)}`).join(' ')}`);
  return lines.join('\n');
}

/** One expression; without offsets. */
export function showExpr(expr: Expr): string {
  return new Shower(undefined).expr(expr);
}

class Shower {
  constructor(private readonly base: number | undefined) {}

  at(span: { start: number; end: number }): string {
    return this.base === undefined ? '' : `@${this.base + span.start}-${this.base + span.end}`;
  }

  quoted(text: { text: string; start: number; end: number }): string {
    return JSON.stringify(text.text) + this.at(text);
  }

  expr(expr: Expr): string {
    return this.bare(expr) + this.at(expr);
  }

  all(exprs: readonly Expr[]): string {
    return exprs.map((each) => ` ${this.expr(each)}`).join('');
  }

  statement(stmt: Stmt): readonly string[] {
    const above = (stmt.above ?? []).map((each) => this.comment(each));
    const [head, ...rest] = this.lines(stmt);
    return [...above, head + this.at(stmt) + (stmt.trailing ? ` ${this.comment(stmt.trailing)}` : ''), ...rest];
  }

  private comment(comment: Comment): string {
    return `# ${comment.text}${this.at(comment)}`;
  }

  private block(statements: readonly Stmt[]): readonly string[] {
    return statements.flatMap((each) => this.statement(each)).map((line) => `  ${line}`);
  }

  private part(name: string, statements: readonly Stmt[]): readonly string[] {
    return statements.length === 0 ? [] : [name, ...this.block(statements)];
  }

  private lines(stmt: Stmt): readonly string[] {
    switch (stmt.kind) {
      case 'assign':
        return [`(${stmt.op ?? ''}=${this.all(stmt.targets)} ${this.expr(stmt.value)}${annotated(stmt.annotation)})`];
      case 'declare':
        return [`(declare ${this.expr(stmt.target)}${annotated(stmt.annotation)})`];
      case 'evaluate':
        return [this.expr(stmt.value)];
      case 'if':
        return [...stmt.arms.flatMap((arm, at) => [`${at === 0 ? 'if' : 'elif'} ${this.expr(arm.condition)}`, ...this.block(arm.body)]), ...this.part('else', stmt.otherwise)];
      case 'loop': {
        const head = stmt.target && stmt.iterable ? `for ${this.expr(stmt.target)} in ${this.expr(stmt.iterable)}` : `while ${stmt.condition ? this.expr(stmt.condition) : ''}`;
        return [head, ...this.block(stmt.body), ...this.part('else', stmt.otherwise)];
      }
      case 'return':
        return [`(${stmt.yields ? 'yield' : 'return'}${stmt.value ? this.all([stmt.value]) : ''})`];
      case 'attempt':
        return ['try', ...this.block(stmt.body), ...stmt.handlers.flatMap((each) => ['except', ...this.block(each)]), ...this.part('else', stmt.otherwise), ...this.part('finally', stmt.finally)];
      case 'scope':
        return [`with ${stmt.items.map((each) => `${this.expr(each.value)}${each.target ? ` as ${this.expr(each.target)}` : ''}`).join(', ')}`, ...this.block(stmt.body)];
      case 'match':
        return [`match ${this.expr(stmt.subject)}`, ...stmt.cases.flatMap((each) => [`case${this.all(each.bindings)}${each.guard ? ` if ${this.expr(each.guard)}` : ''}`, ...this.block(each.body)])];
      case 'function':
        return [
          `def ${stmt.name}${this.at(stmt.nameSpan)}(${this.params(stmt.params)})${annotated(stmt.annotation)}${this.decorated(stmt.decorators)}`,
          ...(stmt.doc ? [`  doc ${this.quoted(stmt.doc)}`] : []), ...this.block(stmt.body), ...(stmt.loose ?? []).map((each) => `  loose ${this.comment(each)}`),
        ];
      case 'class':
        return [`class ${stmt.name}${this.at(stmt.nameSpan)}(${stmt.bases.map((each) => this.expr(each)).join(' ')})${this.decorated(stmt.decorators)}`, ...(stmt.doc ? [`  doc ${this.quoted(stmt.doc)}`] : []), ...this.block(stmt.body)];
      case 'import':
        return [`(import ${'.'.repeat(stmt.level)}${stmt.module}${stmt.alias ? ` as ${stmt.alias}` : ''}${(stmt.names ?? []).map((each) => ` ${each.name}${each.alias === each.name ? '' : `:${each.alias}`}`).join('')})`];
      case 'leave':
        return [`(${stmt.flow === 'none' ? 'do' : stmt.flow}${this.all(stmt.values)})`];
      case 'outer':
        return [`(outer ${stmt.names.join(' ')})`];
    }
  }

  private decorated(decorators: readonly Expr[]): string {
    return decorators.map((each) => ` @${this.expr(each)}`).join('');
  }

  private params(params: readonly Param[]): string {
    return params.map((each) => {
      const mode = { plain: '', keyword: '!', rest: '*', 'rest-named': '**' }[each.mode];
      return `${mode}${each.name}${this.at(each.nameSpan)}${annotated(each.annotation)}${each.default ? `=${this.expr(each.default)}` : ''}${this.at(each)}${each.comment ? ` ${this.comment(each.comment)}` : ''}`;
    }).join(', ');
  }

  private bare(expr: Expr): string {
    switch (expr.kind) {
      case 'number':
        return expr.value ? `${expr.value}` : `${expr.text}?`;
      case 'text':
        return JSON.stringify(expr.value);
      case 'truth':
        return expr.value ? 'True' : 'False';
      case 'nothing':
        return 'None';
      case 'name':
        return expr.name;
      case 'member':
        return `(. ${this.expr(expr.object)} ${expr.name}${this.at(expr.nameSpan)})`;
      case 'index':
        return `(at ${this.expr(expr.object)}${this.all(expr.keys)})`;
      case 'call':
        return `(${this.expr(expr.callee)}${expr.args.map((each) => ` ${each.spread ? '...' : ''}${each.name === undefined ? '' : `${each.name}=`}${this.expr(each.value)}${this.at(each)}`).join('')})`;
      case 'unary':
        return `(${expr.op} ${this.expr(expr.operand)})`;
      case 'binary':
        return `(${expr.op}${this.at(expr.opSpan)} ${this.expr(expr.left)} ${this.expr(expr.right)})`;
      case 'compare':
        return `(cmp ${expr.operands.map((each, at) => (at === 0 ? '' : `${expr.ops[at - 1]} `) + this.expr(each)).join(' ')})`;
      case 'logic':
        return `(${expr.op}${this.all(expr.operands)})`;
      case 'choose':
        return `(choose ${this.expr(expr.condition)} ${this.expr(expr.then)} ${this.expr(expr.otherwise)})`;
      case 'sequence':
        return `(${expr.form}${expr.items.map((each, at) => ` ${this.expr(each)}${expr.comments?.[at] ? `{# ${expr.comments[at].text}}` : ''}`).join('')})`;
      case 'record':
        return `{${expr.entries.map((each) => `${JSON.stringify(each.key)}${this.at(each.keySpan)}: ${this.expr(each.value)}${this.at(each)}${each.comment ? ` {# ${each.comment.text}}` : ''}`).join(', ')}${expr.others.length === 0 ? '' : ` |${this.all(expr.others)}`}}`;
      case 'lambda':
        return `(lambda (${this.params(expr.params)}) ${this.expr(expr.body)})`;
      case 'comprehension':
        return `(each ${expr.key ? `${this.expr(expr.key)}: ` : ''}${this.expr(expr.element)}${expr.clauses.map((each) => ` for ${this.expr(each.target)} in ${this.expr(each.iterable)}`).join('')}${expr.conditions.map((each) => ` if ${this.expr(each)}`).join('')})`;
      case 'slice':
        return `(slice${this.all(expr.parts)})`;
      case 'bind':
        return `(:= ${this.expr(expr.target)} ${this.expr(expr.value)})`;
      case 'opaque':
        return `(?${this.all(expr.parts)})`;
    }
  }
}

function annotated(annotation: string | undefined): string {
  return annotation === undefined ? '' : ` : ${annotation}`;
}
