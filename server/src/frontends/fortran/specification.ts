/** The statements that declare: what a unit uses, its names and types, what is only for the compiler. */
import type { Stmt } from '../../program/nodes.ts';
import { arraysStatement, attributeStatement, declaration, parameterStatement } from './declarations.ts';
import { closerAt, closeBlock } from './blocks.ts';
import type { Reader } from './reader.ts';
import { definesType, typeDefinition } from './types.ts';
import { useStatement } from './uses.ts';

const arrays = new Set(['dimension', 'common', 'allocatable', 'pointer', 'target', 'codimension', 'volatile', 'asynchronous', 'contiguous']);
const passed = new Set(['public', 'private', 'protected', 'save', 'external', 'intrinsic', 'equivalence', 'namelist', 'format', 'data', 'import', 'entry', 'value', 'bind', 'sequence', 'generic', 'final', 'include', 'static', 'automatic', 'volatile']);

/** The statements that one line of declarations makes; undefined where another kind of statement begins here. */
export function specification(reader: Reader): readonly Stmt[] | undefined {
  const { token } = reader;
  const { text } = token;
  if (definesType(reader)) {
    const made = typeDefinition(reader);
    return made ? [made] : [];
  }
  const declared = isSelector(reader) ? undefined : declaration(reader);
  if (declared) return declared;
  if (text === 'use') return useStatement(reader);
  if (text === 'implicit') return implicit(reader);
  if (text === 'parameter' && reader.isOp('(', 1)) return parameterStatement(reader);
  if (text === 'intent' || text === 'optional') {
    attributeStatement(reader);
    return [];
  }
  if (text === 'interface' || (text === 'abstract' && reader.isName('interface', 1))) return interfaceBlock(reader);
  if (text === 'enum') return enumeration(reader);
  if (arrays.has(text)) {
    arraysStatement(reader);
    return [];
  }
  if (text === 'procedure' || !passed.has(text)) return undefined;
  reader.skipStatement();
  return [];
}

/** `type is (…)` and `class is (…)` in a selection. */
function isSelector(reader: Reader): boolean {
  return (reader.isName('type') || reader.isName('class')) && reader.peek()?.kind === 'name';
}

function implicit(reader: Reader): readonly Stmt[] {
  reader.next();
  if (reader.isName('none')) reader.scope.implicitNone = true;
  reader.skipStatement();
  return [];
}

/** What an interface says of procedures elsewhere is passed over: they are read where they stand. */
function interfaceBlock(reader: Reader): readonly Stmt[] {
  const opener = reader.token;
  skipTo(reader, 'interface');
  closeBlock(reader, 'interface', opener);
  // The comments above are about the interface.
  reader.comments.above(opener);
  return [];
}

function enumeration(reader: Reader): readonly Stmt[] {
  const opener = reader.token;
  skipTo(reader, 'enum');
  closeBlock(reader, 'enum', opener);
  return [];
}

function skipTo(reader: Reader, word: string): void {
  while (!reader.done && closerAt(reader)?.word !== word) {
    if (reader.atBreak) reader.next();
    else reader.skipStatement();
  }
}
