/** Functions and subroutines: heads, parameters with their directions, results, what they contain. */
import type { FunctionStmt, OutputName, Param, Stmt } from '../../program/nodes.ts';
import { closerAt, unitWords } from './blocks.ts';
import { typeEnd } from './declarations.ts';
import { helpOf } from './documentation.ts';
import { expression } from './expressions.ts';
import type { Reader } from './reader.ts';
import { Scope } from './scope.ts';
import { specification } from './specification.ts';
import { baseOf, headBase, isAssignment, resultOf, statement } from './statements.ts';
import type { Token } from './tokens.ts';

const prefixes = new Set(['pure', 'elemental', 'impure', 'recursive', 'non_recursive', 'module', 'attributes']);

interface Head {
  readonly word: 'function' | 'subroutine' | 'procedure';
  readonly name: Token;
  readonly params: readonly Token[];
  readonly result: Token | undefined;
  readonly type: string | undefined;
}

/** The index of `function` or `subroutine` where the head of a procedure begins here. */
export function procedureWord(reader: Reader): number | undefined {
  let at = reader.at;
  let isModule = false;
  for (;;) {
    const token = reader.tokens[at];
    if (token?.kind !== 'name') return undefined;
    const next = reader.tokens[at + 1];
    if (token.text === 'function' || token.text === 'subroutine') return next?.kind === 'name' ? at : undefined;
    if (token.text === 'procedure' && isModule) return next?.kind === 'name' && reader.tokens[at + 2]?.kind === 'break' ? at : undefined;
    if (prefixes.has(token.text)) {
      isModule ||= token.text === 'module';
      at = next?.text === '(' ? reader.behindBrackets(at + 1) : at + 1;
    } else {
      const behind = typeEnd(reader, at);
      if (behind === undefined || behind === at) return undefined;
      at = behind;
    }
  }
}

/** The procedure whose head begins here; `word` is the index of its keyword. */
export function procedure(reader: Reader, word: number): FunctionStmt {
  const opener = reader.token;
  const outside = { scope: reader.scope, returns: reader.returns };
  const head = headOf(reader, word);
  const headEnd = reader.lastEnd;
  reader.scope = new Scope();
  reader.scope.usesModules = outside.scope.usesModules;
  reader.scope.isProcedure = true;
  reader.returns = [];
  const scope = reader.scope;
  const first = firstStatement(reader);
  const { declared, nested, rest } = bodyOf(reader, head);
  const outputs = head.word === 'function' ? [outputOf(head.result ?? head.name)] : given(head, scope);
  const end = reader.lastEnd;
  const value = resultOf(outputs);
  const last: readonly Stmt[] = value ? [{ kind: 'return', value, start: value.start, end: value.end }] : [];
  if (value) for (const each of reader.returns) each.value = value;
  closeProcedure(reader, head, opener);
  reader.scope = outside.scope;
  reader.returns = outside.returns;
  const base = headBase(reader, opener.start);
  const help = helpOf(reader, headEnd, first ?? end, base);
  const loose = reader.comments.loose(help.doc ? Math.max(help.doc.end, headEnd) : headEnd, base.end);
  return {
    kind: 'function', name: head.name.text, nameSpan: { start: head.name.start, end: head.name.end }, params: head.params.map((each) => paramOf(each, scope)), outputs,
    body: [...declared, ...nested, ...rest, ...last], decorators: [], ...(head.type === undefined ? {} : { annotation: head.type }), ...(loose.length > 0 ? { loose } : {}),
    ...(base.trailing ? { trailing: base.trailing } : {}), ...help, start: base.start, end: base.end,
  };
}

function headOf(reader: Reader, word: number): Head {
  const behind = typeIn(reader, word);
  reader.at = word;
  const kind = reader.next().text as Head['word'];
  const name = reader.next();
  const params: Token[] = [];
  if (reader.isOp('(')) {
    const end = reader.behindBrackets(reader.at);
    for (let at = reader.at + 1; at < end; at++) if (reader.tokens[at]?.kind === 'name') params.push(reader.tokens[at] as Token);
    if (reader.tokens[end - 1]?.text !== ')') reader.problem(') is missing', { start: reader.tokens[end - 1]?.end ?? name.end, end: reader.tokens[end - 1]?.end ?? name.end });
    reader.at = end;
  }
  const result = resultName(reader);
  reader.skipStatement();
  return { word: kind, name, params, result, type: behind };
}

/** The first word of the type in front of `function`. */
function typeIn(reader: Reader, word: number): string | undefined {
  for (let at = reader.at; at < word; at++) {
    const token = reader.tokens[at] as Token;
    if (token.kind === 'name' && !prefixes.has(token.text) && typeEnd(reader, at) !== undefined) return token.text;
  }
  return undefined;
}

function resultName(reader: Reader): Token | undefined {
  let found: Token | undefined;
  while (reader.token.kind === 'name') {
    const { text } = reader.next();
    if (text === 'result' && reader.isOp('(') && reader.peek()?.kind === 'name') found = reader.peek();
    if (reader.isOp('(')) reader.skipBrackets();
  }
  return found;
}

/** A result by its name in the head: that of the function, or the one behind `result`; a parameter that is given back. */
function outputOf({ text, start, end }: Token): OutputName {
  return { name: text, nameSpan: { start, end } };
}

/** The parameters that a subroutine may change: by their intent, or where none is declared by what its body does. */
function given(head: Head, scope: Scope): readonly OutputName[] {
  return head.params.filter((each) => directionOf(each.text, scope) !== undefined).map(outputOf);
}

function directionOf(name: string, scope: Scope): 'out' | 'inout' | undefined {
  const intent = scope.intents.get(name) ?? (scope.assigned.has(name) ? 'inout' : 'in');
  return intent === 'in' ? undefined : intent;
}

function paramOf({ text, start, end }: Token, scope: Scope): Param {
  const intent = directionOf(text, scope);
  const annotation = scope.types.get(text);
  return { name: text, nameSpan: { start, end }, mode: 'plain', ...(annotation === undefined ? {} : { annotation }), ...(intent ? { intent } : {}), start, end };
}

/** Where the first statement of the body begins. */
function firstStatement(reader: Reader): number | undefined {
  for (let at = reader.at; at < reader.tokens.length; at++) if (reader.tokens[at]?.kind !== 'break') return (reader.tokens[at] as Token).start;
  return undefined;
}

interface Body {
  readonly declared: readonly Stmt[];
  readonly nested: readonly Stmt[];
  readonly rest: readonly Stmt[];
}

function bodyOf(reader: Reader, head: Head): Body {
  const declared: Stmt[] = [];
  const rest: Stmt[] = [];
  const nested: Stmt[] = [];
  let contains = false;
  reader.open.push(head.word);
  while (!reader.done) {
    if (reader.atBreak) {
      reader.next();
      continue;
    }
    const closer = closerAt(reader);
    if (closer && unitWords.has(closer.word)) break;
    if (closer) {
      reader.problem('there is nothing to close here');
      reader.skipStatement();
      continue;
    }
    if (reader.isName('contains') && reader.peek()?.kind === 'break') {
      contains = true;
      reader.next();
      continue;
    }
    const word = contains || rest.length === 0 ? procedureWord(reader) : undefined;
    if (contains && word !== undefined) nested.push(procedure(reader, word));
    else if (word !== undefined) break;
    else bodyStatement(reader, declared, rest);
  }
  reader.open.pop();
  return { declared, nested, rest };
}

/** Declarations come before everything that is carried out. */
function bodyStatement(reader: Reader, declared: Stmt[], rest: Stmt[]): void {
  if (rest.length > 0) {
    rest.push(...statement(reader));
    return;
  }
  const defined = statementFunction(reader);
  if (defined) {
    declared.push(defined);
    return;
  }
  const declares = reader.token.kind === 'name' && !isAssignment(reader) ? specification(reader) : undefined;
  if (!declares) {
    rest.push(...statement(reader));
    return;
  }
  declared.push(...declares);
  if (!reader.done && !reader.atBreak) {
    reader.problem(`${reader.token.text} does not fit here`);
    reader.skipStatement();
  }
}

/** `area(d) = pi*d**2/4` among the declarations: a function of one line. */
export function statementFunction(reader: Reader): FunctionStmt | undefined {
  const { token, scope } = reader;
  if (token.kind !== 'name' || !reader.isOp('(', 1) || scope.arrays.has(token.text)) return undefined;
  const behind = reader.behindBrackets(reader.at + 1);
  if (reader.tokens[behind]?.text !== '=') return undefined;
  const inside = reader.tokens.slice(reader.at + 2, behind - 1);
  if (!inside.every((each, at) => (at % 2 === 0 ? each.kind === 'name' : each.text === ','))) return undefined;
  if (!scope.declared.has(token.text) && (scope.usesModules || scope.implicitNone || !scope.isProcedure)) return undefined;
  reader.at = behind + 1;
  const value = expression(reader);
  const params = inside.filter((each) => each.kind === 'name').map((each): Param => ({ name: each.text, nameSpan: { start: each.start, end: each.end }, mode: 'plain', start: each.start, end: each.end }));
  const base = baseOf(reader, token.start);
  return { kind: 'function', name: token.text, nameSpan: { start: token.start, end: token.end }, params, decorators: [], body: [{ kind: 'return', value, start: value.start, end: value.end }], ...base };
}

function closeProcedure(reader: Reader, head: Head, opener: Token): void {
  const closer = closerAt(reader);
  if (!closer) return reader.problem(`${head.word} is not closed`, opener);
  if (closer.word !== '' && closer.word !== head.word) return reader.problem(`${head.word} is not closed`, opener);
  reader.at += closer.length;
  if (closer.word !== '' && reader.token.kind === 'name') reader.next();
}
