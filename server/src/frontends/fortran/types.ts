/** Derived types as classes of the common form. */
import type { ClassStmt, Stmt } from '../../program/nodes.ts';
import { closerAt, closeBlock } from './blocks.ts';
import { declaration } from './declarations.ts';
import type { Reader } from './reader.ts';
import { Scope } from './scope.ts';
import { headBase } from './statements.ts';
import type { Token } from './tokens.ts';

/** Whether a type is defined here: `type point`, `type, extends(base) :: point`, `type :: point`. */
export function definesType(reader: Reader): boolean {
  if (!reader.isName('type')) return false;
  const next = reader.peek();
  if (next?.kind === 'op') return next.text === ',' || next.text === '::';
  return next?.kind === 'name' && reader.peek(2)?.kind === 'break';
}

export function typeDefinition(reader: Reader): ClassStmt | undefined {
  const opener = reader.next();
  let base: Token | undefined;
  while (reader.takeOp(',')) {
    const extending = reader.takeName('extends');
    if (!extending) reader.next();
    if (extending && reader.peek()?.kind === 'name') base = reader.peek();
    if (reader.isOp('(')) reader.skipBrackets();
  }
  reader.takeOp('::');
  const name = reader.token;
  if (name.kind !== 'name') {
    reader.problem('the name of a type is missing');
    reader.skipStatement();
    return undefined;
  }
  reader.next();
  reader.skipStatement();
  const outside = reader.scope;
  reader.scope = new Scope();
  const body = components(reader);
  reader.scope = outside;
  closeBlock(reader, 'type', opener);
  return {
    kind: 'class', name: name.text, nameSpan: { start: name.start, end: name.end }, decorators: [], body,
    bases: base ? [{ kind: 'name', name: base.text, start: base.start, end: base.end }] : [], ...headBase(reader, opener.start),
  };
}

/** Fields up to the end of the type; bound procedures are passed over. */
function components(reader: Reader): readonly Stmt[] {
  const body: Stmt[] = [];
  let procedures = false;
  while (!reader.done) {
    if (reader.atBreak) reader.next();
    else if (closerAt(reader)) break;
    else if (reader.isName('contains') && reader.peek()?.kind === 'break') {
      procedures = true;
      reader.next();
    } else {
      const fields = procedures ? undefined : declaration(reader);
      if (fields) body.push(...fields);
      else reader.skipStatement();
    }
  }
  return body;
}
