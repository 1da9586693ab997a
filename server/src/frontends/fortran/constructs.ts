/** Blocks: conditions, selections, loops, associations. */
import type { Expr, Stmt } from '../../program/nodes.ts';
import { closeBlock } from './blocks.ts';
import { expression } from './expressions.ts';
import { doStatement, forallStatement } from './loops.ts';
import { list } from './primary.ts';
import type { Reader } from './reader.ts';
import { assigned, baseOf, block, headBase, isAssignment, statement } from './statements.ts';
import type { Token } from './tokens.ts';

/** The block that begins here; undefined where none does. */
export function constructs(reader: Reader): readonly Stmt[] | undefined {
  const { token } = reader;
  switch (token.text) {
    case 'if':
      return reader.isOp('(', 1) ? [ifStatement(reader, token)] : undefined;
    case 'where':
      return reader.isOp('(', 1) ? [whereStatement(reader, token)] : undefined;
    case 'do':
      return doStatement(reader, token);
    case 'forall':
      return reader.isOp('(', 1) ? forallStatement(reader, token) : undefined;
    case 'select':
    case 'selectcase':
    case 'selecttype':
      return selection(reader, token);
    case 'associate':
      return association(reader, token);
    case 'block':
    case 'critical':
      return inPlace(reader, token);
    default:
      return undefined;
  }
}

/** The condition in brackets that opens here. */
function condition(reader: Reader): Expr {
  const args = list(reader, ')');
  const [only] = args;
  return args.length === 1 && only ? only.value : reader.unknown(reader.since(reader.position), args.map((each) => each.value));
}

function isElse(reader: Reader): boolean {
  return /^(?:else|elseif|elsewhere)$/.test(reader.token.text) && reader.token.kind === 'name' && !isAssignment(reader);
}

function inBlock<T>(reader: Reader, word: string, run: () => T): T {
  reader.open.push(word);
  const made = run();
  reader.open.pop();
  return made;
}

function ifStatement(reader: Reader, opener: Token): Stmt {
  reader.next();
  const first = condition(reader);
  if (!reader.isName('then') || reader.peek()?.kind === 'op') return oneLine(reader, opener, first);
  reader.next();
  const arms: { condition: Expr; body: readonly Stmt[] }[] = [];
  let otherwise: readonly Stmt[] = [];
  inBlock(reader, 'if', () => {
    arms.push({ condition: first, body: block(reader, isElse) });
    while (isElse(reader)) {
      const word = reader.next();
      const again = word.text === 'elseif' || reader.takeName('if');
      const test = again && reader.isOp('(') ? condition(reader) : undefined;
      reader.takeName('then');
      if (!reader.atBreak) reader.skipStatement();
      const body = block(reader, isElse);
      if (test) arms.push({ condition: test, body });
      else otherwise = body;
    }
  });
  closeBlock(reader, 'if', opener);
  return { kind: 'if', arms, otherwise, ...headBase(reader, opener.start) };
}

/** `if (c) x = y`, and `if (x) 10, 20, 30`. */
function oneLine(reader: Reader, opener: Token, test: Expr): Stmt {
  if (reader.token.kind === 'number') {
    reader.skipStatement();
    return { kind: 'leave', flow: 'none', values: [test], ...baseOf(reader, opener.start) };
  }
  if (reader.atBreak) reader.problem('a statement is missing', { start: reader.position, end: reader.position });
  const body = reader.atBreak ? [] : statement(reader);
  return { kind: 'if', arms: [{ condition: test, body }], otherwise: [], ...reader.since(opener.start) };
}

/** A mask chooses elements: each part may or may not be done. */
function whereStatement(reader: Reader, opener: Token): Stmt {
  reader.next();
  const first = condition(reader);
  if (!reader.atBreak) return oneLine(reader, opener, first);
  const arms: { condition: Expr; body: readonly Stmt[] }[] = [];
  let otherwise: readonly Stmt[] = [];
  inBlock(reader, 'where', () => {
    arms.push({ condition: first, body: block(reader, isElse) });
    while (isElse(reader)) {
      reader.next();
      reader.takeName('where');
      const test = reader.isOp('(') ? condition(reader) : undefined;
      if (!reader.atBreak) reader.skipStatement();
      const body = block(reader, isElse);
      if (test) arms.push({ condition: test, body });
      else otherwise = body;
    }
  });
  closeBlock(reader, 'where', opener);
  return { kind: 'if', arms, otherwise, ...headBase(reader, opener.start) };
}

function isCase(reader: Reader): boolean {
  const { token } = reader;
  if (token.kind !== 'name' || isAssignment(reader)) return false;
  const next = reader.peek();
  if (token.text === 'case' || token.text === 'rank') return next?.text === '(' || next?.text === 'default';
  return (token.text === 'type' || token.text === 'class') && (next?.text === 'is' || next?.text === 'default');
}

/** `select case (x)`, `select type (p => x)`, `select rank (x)`. */
function selection(reader: Reader, opener: Token): readonly Stmt[] | undefined {
  if (opener.text === 'select' && reader.peek()?.kind !== 'name') return undefined;
  reader.next();
  if (opener.text === 'select') reader.next();
  const { start } = reader.token;
  const renamed = reader.isOp('(') && reader.isOp('=>', 2);
  if (renamed) reader.at += 3;
  const subject = renamed ? expression(reader) : reader.isOp('(') ? condition(reader) : reader.unknown({ start, end: start });
  reader.skipStatement();
  const cases: { bindings: []; guard?: Expr; body: readonly Stmt[] }[] = [];
  inBlock(reader, 'select', () => {
    block(reader, isCase);
    while (isCase(reader)) {
      const isValue = reader.next().text === 'case';
      const guard = isValue && reader.isOp('(') ? values(reader) : undefined;
      reader.skipStatement();
      cases.push({ bindings: [], ...(guard ? { guard } : {}), body: block(reader, isCase) });
    }
  });
  closeBlock(reader, 'select', opener);
  return [{ kind: 'match', subject, cases, ...headBase(reader, opener.start) }];
}

/** The values of a case; ranges among them. */
function values(reader: Reader): Expr {
  const { start } = reader.token;
  const args = list(reader, ')');
  return reader.unknown(reader.since(start), args.map((each) => each.value));
}

/** Names for expressions, and the block that uses them, as if it stood here. */
function association(reader: Reader, opener: Token): readonly Stmt[] | undefined {
  if (!reader.isOp('(', 1)) return undefined;
  reader.at += 2;
  const made: Stmt[] = [];
  while (!reader.done && !reader.atBreak && reader.token.kind === 'name' && reader.isOp('=>', 1)) {
    const name = reader.next();
    reader.next();
    const value = expression(reader);
    assigned(reader, value);
    const own: Expr = { kind: 'name', name: name.text, start: name.start, end: name.end };
    made.push({ kind: 'assign', targets: [own], value, ...reader.since(name.start) });
    if (!reader.takeOp(',')) break;
  }
  if (!reader.takeOp(')')) reader.problem(') is missing');
  reader.skipStatement();
  made.push(...inBlock(reader, 'associate', () => block(reader)));
  closeBlock(reader, 'associate', opener);
  return made;
}

function inPlace(reader: Reader, opener: Token): readonly Stmt[] | undefined {
  if (reader.peek()?.kind !== 'break' && !reader.isOp('(', 1)) return undefined;
  reader.skipStatement();
  const made = inBlock(reader, opener.text, () => block(reader));
  closeBlock(reader, opener.text, opener);
  return made;
}
