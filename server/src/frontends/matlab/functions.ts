/** Definitions of functions: outputs, parameters, blocks of arguments, help. */
import type { Expr, FunctionStmt, OutputName, Param, Stmt } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { type Declaration, declarations } from './declarations.ts';
import { helpOf } from './documentation.ts';
import { expression } from './expressions.ts';
import type { Reader } from './reader.ts';
import { baseOf, block, headBase } from './statements.ts';
import { blockClosers, type Token } from './tokens.ts';

interface Head {
  readonly outputs: readonly OutputName[];
  readonly outputsSpan: Span;
  readonly name: string;
  readonly nameSpan: Span;
  readonly params: readonly Param[];
}

/** The outputs of the functions being read, the innermost last; by reader, since one reads one piece. */
const heads = new WeakMap<Reader, Head[]>();

/** A definition; the keyword is the next token. Undefined where not even a name is there. */
export function functionStatement(reader: Reader, unbound = false): FunctionStmt | undefined {
  return reader.within(reader.at, () => definition(reader, unbound));
}

function definition(reader: Reader, unbound: boolean): FunctionStmt | undefined {
  const opener = reader.next();
  const head = headOf(reader);
  if (!head) {
    reader.problem('the name of a function is missing');
    return undefined;
  }
  const headEnd = reader.lastEnd;
  const around = heads.get(reader) ?? [];
  heads.set(reader, [...around, head]);
  const declared = argumentBlocks(reader);
  const body = block(reader, reader.functionsEnd ? blockClosers : nextFunction);
  if (reader.functionsEnd) closeFunction(reader, opener);
  else skipToFunction(reader);
  heads.set(reader, around);
  const base = headBase(reader, opener.start);
  const help = helpOf(reader, headEnd, declared.start ?? body[0]?.start, base);
  const loose = reader.comments.loose(help.doc ? help.doc.end + 1 : headEnd, base.end);
  const result = implicitResult(head);
  return {
    kind: 'function', name: head.name, nameSpan: head.nameSpan, params: head.params.map((param) => withDeclaration(param, declared.found)), outputs: head.outputs,
    body: result ? [...body, result] : body, decorators: [], ...(unbound ? { unbound: true } : {}), ...(loose.length > 0 ? { loose } : {}),
    ...(base.trailing ? { trailing: base.trailing } : {}), ...help, start: base.start, end: base.end,
  };
}

const nextFunction = new Set(['function']);

function closeFunction(reader: Reader, opener: Token): void {
  if (reader.token.kind === 'keyword' && blockClosers.has(reader.token.text)) reader.next();
  else reader.problem('function is not closed', opener);
}

/** Stray ends of a file whose functions are not closed. */
function skipToFunction(reader: Reader): void {
  while (!reader.done && !reader.isKeyword('function')) reader.next();
}

/** `[a, b] = name(x, y)`, `a = name`, `name(x)`. */
function headOf(reader: Reader): Head | undefined {
  const { start } = reader.token;
  const outputs: OutputName[] = [];
  if (reader.isOp('[')) {
    reader.next();
    while (!reader.done && !reader.isOp(']') && reader.token.kind !== 'break') {
      const token = reader.next();
      if (token.kind === 'name') outputs.push({ name: token.text, nameSpan: { start: token.start, end: token.end } });
    }
    reader.takeOp(']');
  } else if (reader.token.kind === 'name' && reader.peek()?.text === '=') {
    const token = reader.next();
    outputs.push({ name: token.text, nameSpan: { start: token.start, end: token.end } });
  }
  const outputsSpan = { start, end: Math.max(start, reader.lastEnd) };
  reader.takeOp('=');
  const name = dottedName(reader);
  if (!name) return undefined;
  return { outputs, outputsSpan, name: name.text, nameSpan: { start: name.start, end: name.end }, params: reader.isOp('(') ? parameters(reader) : [] };
}

/** `get.Width` names the access to a property. */
function dottedName(reader: Reader): { readonly text: string; readonly start: number; readonly end: number } | undefined {
  const first = reader.token;
  if (first.kind !== 'name') return undefined;
  reader.next();
  while (reader.isOp('.') && reader.peek()?.kind === 'name') reader.at += 2;
  return { text: reader.text.slice(first.start, reader.lastEnd), start: first.start, end: reader.lastEnd };
}

function parameters(reader: Reader): readonly Param[] {
  const { start } = reader.next();
  const params: Param[] = [];
  while (!reader.done && !reader.isOp(')') && reader.token.kind !== 'break' && reader.token.kind !== 'keyword') {
    const token = reader.next();
    if (token.kind === 'op' && (token.text === '~' || token.text === '!')) params.push(placeholder(token));
    if (token.kind !== 'name') continue;
    const value = reader.takeOp('=') ? expression(reader) : undefined;
    const span = reader.since(token.start);
    params.push({ name: token.text, nameSpan: { start: token.start, end: token.end }, mode: token.text === 'varargin' ? 'rest' : 'plain', ...(value ? { default: value } : {}), ...span });
  }
  if (!reader.takeOp(')')) reader.problem(') is missing');
  return /[\r\n]/.test(reader.text.slice(start, reader.lastEnd)) ? params.map((param) => withComment(reader, param)) : params;
}

function placeholder({ text, start, end }: Token): Param {
  return { name: text, nameSpan: { start, end }, mode: 'plain', start, end };
}

function withComment(reader: Reader, param: Param): Param {
  const comment = reader.comments.beside(param);
  return comment ? { ...param, comment } : param;
}

interface Declared {
  readonly found: ReadonlyMap<string, Declaration>;
  readonly start: number | undefined;
}

/** The `arguments` blocks at the head of a body. */
function argumentBlocks(reader: Reader): Declared {
  const found = new Map<string, Declaration>();
  let start: number | undefined;
  for (;;) {
    const before = reader.at;
    while (reader.token.kind === 'break' && !reader.done) reader.next();
    if (!reader.isKeyword('arguments')) {
      reader.at = before;
      return { found, start };
    }
    start ??= reader.token.start;
    for (const each of declarations(reader)) found.set(each.name, each);
  }
}

/** A parameter stands where its block declares it: there are its default, its kind and its comment. */
function withDeclaration(param: Param, declared: ReadonlyMap<string, Declaration>): Param {
  const found = declared.get(param.name);
  if (!found) return param;
  const { name, nameSpan, value, annotation, comment, start, end } = found;
  return { name, nameSpan, mode: param.mode, ...(value ? { default: value } : {}), ...(annotation ? { annotation } : {}), ...(comment ? { comment } : {}), start, end };
}

/** What a function gives back: its outputs by name, at the head where they stand. */
function resultOf({ outputs, outputsSpan }: Head): Expr | undefined {
  const names = outputs.filter((each) => each.name !== 'varargout').map((each): Expr => ({ kind: 'name', name: each.name, ...each.nameSpan }));
  return outputs.length > 1 ? { kind: 'sequence', form: 'tuple', items: names, ...outputsSpan } : names[0];
}

function implicitResult(head: Head): Stmt | undefined {
  const value = resultOf(head);
  return value && { kind: 'return', value, ...head.outputsSpan };
}

/** `return`: the outputs as they are then. */
export function resultStatement(reader: Reader, token: Token): Stmt {
  const head = heads.get(reader)?.at(-1);
  const value = head && resultOf(head);
  return { kind: 'return', ...(value ? { value } : {}), ...baseOf(reader, token.start) };
}

