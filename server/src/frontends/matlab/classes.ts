/** `classdef`: properties are fields, methods are functions; events and enumerations hold nothing with a unit. */
import type { ClassStmt, Expr, FunctionStmt, Stmt } from '../../program/nodes.ts';
import { declarations, skipBrackets, type Declaration } from './declarations.ts';
import { helpOf } from './documentation.ts';
import { functionStatement } from './functions.ts';
import type { Reader } from './reader.ts';
import { headBase } from './statements.ts';
import { blockClosers, type Token } from './tokens.ts';

/** A class; the keyword is the next token. */
export function classStatement(reader: Reader): ClassStmt | undefined {
  const opener = reader.next();
  if (reader.isOp('(')) skipBrackets(reader);
  const name = reader.token;
  if (name.kind !== 'name') {
    reader.problem('the name of a class is missing');
    return undefined;
  }
  reader.next();
  const bases = basesOf(reader);
  const headEnd = reader.lastEnd;
  reader.methods = methodNames(reader);
  const body: Stmt[] = [];
  const firstBlock = firstKeyword(reader);
  while (!reader.done && !(reader.token.kind === 'keyword' && blockClosers.has(reader.token.text))) part(reader, name.text, body);
  if (!reader.done) reader.next();
  else reader.problem('classdef is not closed', opener);
  reader.methods = new Set();
  const base = headBase(reader, opener.start);
  const help = helpOf(reader, headEnd, firstBlock, base);
  const { above: _above, ...rest } = base;
  return { kind: 'class', name: name.text, nameSpan: { start: name.start, end: name.end }, bases, body, decorators: [], ...help, ...rest };
}

function basesOf(reader: Reader): readonly Expr[] {
  if (!reader.takeOp('<')) return [];
  const bases: Expr[] = [];
  while (!reader.done && reader.token.kind !== 'break') {
    const token = reader.next();
    if (token.kind !== 'name') continue;
    while (reader.isOp('.') && reader.peek()?.kind === 'name') reader.at += 2;
    bases.push({ kind: 'name', name: reader.text.slice(token.start, reader.lastEnd), start: token.start, end: reader.lastEnd });
  }
  return bases;
}

function firstKeyword(reader: Reader): number | undefined {
  return reader.tokens.slice(reader.at).find((token) => token.kind === 'keyword')?.start;
}

/** Names behind `function` in the rest of the piece. */
function methodNames(reader: Reader): ReadonlySet<string> {
  const names = new Set<string>();
  reader.tokens.forEach((token, at) => {
    if (token.kind !== 'keyword' || token.text !== 'function') return;
    let next = at + 1;
    while (reader.tokens[next] && reader.tokens[next]?.kind !== 'break' && reader.tokens[next]?.text !== '(') next++;
    const last = reader.tokens[next - 1];
    if (last?.kind === 'name') names.add(last.text);
  });
  return names;
}

function part(reader: Reader, className: string, body: Stmt[]): void {
  const token = reader.token;
  if (token.kind !== 'keyword') return void reader.next();
  switch (token.text) {
    case 'properties':
      body.push(...declarations(reader).map((each) => field(reader, each)));
      return;
    case 'methods':
      body.push(...methods(reader, className));
      return;
    case 'events':
    case 'enumeration':
      declarations(reader);
      return;
    case 'function': {
      const fn = functionStatement(reader);
      if (fn) body.push(fn);
      return;
    }
    default:
      reader.next();
  }
}

function field(reader: Reader, each: Declaration): Stmt {
  const target: Expr = { kind: 'name', name: each.name, ...each.nameSpan };
  const above = reader.comments.above(each);
  const rest = {
    ...(each.annotation === undefined ? {} : { annotation: each.annotation }), ...(each.comment ? { trailing: each.comment } : {}), ...(above.length > 0 ? { above } : {}), start: each.start, end: each.end,
  };
  return each.value ? { kind: 'assign', targets: [target], value: each.value, ...rest } : { kind: 'declare', target, ...rest };
}

/** The functions of a `methods` block; those that are only declared stand in files of their own. */
function methods(reader: Reader, className: string): readonly FunctionStmt[] {
  const opener: Token = reader.next();
  const from = reader.at;
  if (reader.isOp('(')) skipBrackets(reader);
  const isStatic = reader.tokens.slice(from, reader.at).some((token) => token.kind === 'name' && token.text === 'Static');
  const found: FunctionStmt[] = [];
  while (!reader.done && !(reader.token.kind === 'keyword' && blockClosers.has(reader.token.text))) {
    if (!reader.isKeyword('function')) {
      reader.next();
      continue;
    }
    const fn = functionStatement(reader, isStatic);
    if (fn) found.push(fn.name === className ? { ...fn, unbound: true } : fn);
  }
  if (reader.done) reader.problem('methods is not closed', opener);
  else reader.next();
  return found;
}
