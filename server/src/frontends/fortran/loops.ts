/** Loops: counted, conditional, concurrent, and the older ones that end at a label. */
import type { Expr, Stmt } from '../../program/nodes.ts';
import { closerAt, closeBlock } from './blocks.ts';
import { expression } from './expressions.ts';
import { list } from './primary.ts';
import type { Reader } from './reader.ts';
import { assigned, block, headBase, statement } from './statements.ts';
import type { Token } from './tokens.ts';

interface Counter {
  readonly target: Expr;
  readonly iterable: Expr;
}

/** `do i = 1, n`, `do while (c)`, `do concurrent (…)`, `do 10 i = 1, n`, `do`. */
export function doStatement(reader: Reader, opener: Token): readonly Stmt[] | undefined {
  reader.next();
  const label = reader.token.kind === 'number' ? reader.next().text : undefined;
  reader.takeOp(',');
  if (reader.isName('while') && reader.isOp('(', 1)) {
    reader.next();
    const test = list(reader, ')')[0]?.value;
    const body = bodyOf(reader, opener, label);
    return [{ kind: 'loop', ...(test ? { condition: test } : {}), body, otherwise: [], ...headBase(reader, opener.start) }];
  }
  if (reader.isName('concurrent') && reader.isOp('(', 1)) {
    reader.next();
    const counters = countersIn(reader);
    reader.skipStatement();
    return nested(reader, opener, counters, bodyOf(reader, opener, label));
  }
  const counter = reader.token.kind === 'name' && reader.isOp('=', 1) ? counted(reader) : undefined;
  if (!counter && !reader.atBreak) reader.problem(`${reader.token.text} does not fit here`);
  const body = bodyOf(reader, opener, label);
  return [{ kind: 'loop', ...counter, body, otherwise: [], ...headBase(reader, opener.start) }];
}

/** `i = first, last, step`. */
function counted(reader: Reader): Counter {
  const name = reader.next();
  reader.next();
  const target: Expr = { kind: 'name', name: name.text, start: name.start, end: name.end };
  assigned(reader, target);
  const { start } = reader.token;
  const parts = [expression(reader)];
  while (reader.takeOp(',')) parts.push(expression(reader));
  return { target, iterable: { kind: 'slice', parts, start: Math.min(start, (parts[0] as Expr).start), end: Math.max(reader.lastEnd, (parts.at(-1) as Expr).end) } };
}

/** `(i = 1:n, j = 1:m, mask)` of `forall` and `do concurrent`; a mask is passed over. */
function countersIn(reader: Reader): readonly Counter[] {
  return list(reader, ')').flatMap((each): Counter[] => {
    if (each.name === undefined || each.value.kind !== 'slice') return [];
    const target: Expr = { kind: 'name', name: each.name, start: each.start, end: each.start + each.name.length };
    assigned(reader, target);
    return [{ target, iterable: each.value }];
  });
}

function nested(reader: Reader, opener: Token, counters: readonly Counter[], body: readonly Stmt[]): readonly Stmt[] {
  const base = headBase(reader, opener.start);
  const made = counters.reduceRight<readonly Stmt[]>((inner, counter) => [{ kind: 'loop', ...counter, body: inner, otherwise: [], start: base.start, end: base.end }], body);
  return made;
}

/** The body with its end: `end do`, or the statement that carries the label, which loops around may share. */
function bodyOf(reader: Reader, opener: Token, label: string | undefined): readonly Stmt[] {
  if (!reader.atBreak && !reader.done) reader.skipStatement();
  reader.open.push('do');
  const body = label === undefined ? block(reader) : labelled(reader, label, opener);
  reader.open.pop();
  if (label === undefined) closeBlock(reader, 'do', opener);
  return body;
}

function labelled(reader: Reader, label: string, opener: Token): readonly Stmt[] {
  const found: Stmt[] = [];
  while (!reader.done) {
    if (reader.atBreak) {
      reader.next();
      continue;
    }
    if (reader.token.kind === 'number' && reader.token.text === label && isEndDo(reader)) {
      reader.skipStatement();
      reader.label = label;
      return found;
    }
    if (closerAt(reader)) break;
    found.push(...statement(reader));
    if (reader.label === label) return found;
  }
  reader.problem(`${opener.text} is not closed`, opener);
  return found;
}

/** `10 end do`. */
function isEndDo(reader: Reader): boolean {
  reader.at++;
  const found = closerAt(reader)?.word === 'do';
  reader.at--;
  return found;
}

/** `forall (i = 1:n) a(i) = b(i)`, or a block. */
export function forallStatement(reader: Reader, opener: Token): readonly Stmt[] {
  reader.next();
  const counters = countersIn(reader);
  if (!reader.atBreak) return nested(reader, opener, counters, statement(reader));
  reader.open.push('forall');
  const body = block(reader);
  reader.open.pop();
  closeBlock(reader, 'forall', opener);
  return nested(reader, opener, counters, body);
}
