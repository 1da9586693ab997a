/** Declarations: types with their attributes, the names behind them, and the older statements that add to them. */
import type { Comment, Expr, Stmt } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { expression } from './expressions.ts';
import type { Reader } from './reader.ts';
import type { Token } from './tokens.ts';

interface Entity extends Span {
  readonly name: Token;
  readonly value?: Expr;
  readonly comment: Comment | undefined;
}

interface Attributes {
  readonly type: string;
  readonly isArray: boolean;
  readonly isConstant: boolean;
  readonly intent: 'in' | 'out' | 'inout' | undefined;
  readonly isOptional: boolean;
}

const plainTypes = new Set(['integer', 'real', 'doubleprecision', 'complex', 'doublecomplex', 'character', 'logical', 'byte']);

/**
 * The index behind the type that begins at a token; undefined where none does. `real(kind=r8)`, `real*8`, `double precision`,
 * `type(point)`, `character(len=*)`.
 */
export function typeEnd(reader: Reader, at = reader.at): number | undefined {
  const token = reader.tokens[at];
  if (token?.kind !== 'name') return undefined;
  const next = reader.tokens[at + 1];
  if (token.text === 'double' && (next?.text === 'precision' || next?.text === 'complex')) return at + 2;
  if (token.text === 'type' || token.text === 'class' || token.text === 'procedure') return next?.text === '(' ? reader.behindBrackets(at + 1) : undefined;
  if (!plainTypes.has(token.text)) return undefined;
  if (next?.text === '*' && next.kind === 'op') return reader.tokens[at + 2]?.text === '(' ? reader.behindBrackets(at + 2) : at + 3;
  return next?.text === '(' ? reader.behindBrackets(at + 1) : at + 1;
}

/** `real(r8), intent(in) :: a, b(:)`: one statement per line of names, or none where no declaration begins here. */
export function declaration(reader: Reader): readonly Stmt[] | undefined {
  const behind = typeEnd(reader);
  if (behind === undefined) return undefined;
  const first = reader.token;
  const type = typeName(reader, behind);
  reader.at = behind;
  const attributes = attributesOf(reader, type);
  const entities = entityList(reader, attributes);
  for (const each of entities) note(reader, each.name.text, attributes);
  return statementsOf(reader, first, entities, attributes);
}

/** The type as an annotation; of `type(point)` the name of the type. */
function typeName(reader: Reader, behind: number): string {
  const { text } = reader.token;
  if ((text === 'type' || text === 'class') && reader.peek(2)?.kind === 'name') return (reader.peek(2) as Token).text;
  return text === 'double' ? `double ${reader.tokens[behind - 1]?.text}` : text;
}

function note(reader: Reader, name: string, { intent, isOptional, type }: Attributes): void {
  const { scope } = reader;
  scope.declared.add(name);
  scope.types.set(name, type);
  if (intent) scope.intents.set(name, intent);
  if (isOptional) scope.optional.add(name);
}

function attributesOf(reader: Reader, type: string): Attributes {
  let isArray = false;
  let isConstant = false;
  let isOptional = false;
  let intent: Attributes['intent'];
  while (reader.takeOp(',')) {
    const word = reader.token.text;
    if (reader.token.kind === 'name') reader.next();
    if (word === 'dimension') isArray = true;
    else if (word === 'parameter') isConstant = true;
    else if (word === 'optional') isOptional = true;
    const open = reader.at;
    if (reader.isOp('(')) reader.skipBrackets();
    if (word === 'intent') intent = direction(reader.tokens.slice(open, reader.at));
    if (reader.at === open && word === reader.token.text) break;
  }
  reader.takeOp('::');
  return { type, isArray, isConstant, intent, isOptional };
}

function direction(tokens: readonly Token[]): 'in' | 'out' | 'inout' {
  const words = tokens.filter((each) => each.kind === 'name').map((each) => each.text).join('');
  return words === 'out' ? 'out' : words === 'inout' ? 'inout' : 'in';
}

function entityList(reader: Reader, attributes: Attributes): readonly Entity[] {
  const found: Entity[] = [];
  while (!reader.done && !reader.atBreak) {
    if (reader.token.kind !== 'name') {
      reader.problem(`${reader.token.text} does not fit here`);
      reader.skipStatement();
      break;
    }
    found.push(entity(reader, attributes));
    if (!reader.takeOp(',')) break;
  }
  if (!reader.done && !reader.atBreak) {
    reader.problem(`${reader.token.text} does not fit here`);
    reader.skipStatement();
  } else if (found.length === 0) reader.problem('a name is missing', { start: reader.position, end: reader.position });
  return found;
}

function entity(reader: Reader, { isArray, type }: Attributes): Entity {
  const name = reader.next();
  if (reader.isOp('(') || isArray || type === 'character') reader.scope.arrays.add(name.text);
  if (reader.isOp('(')) reader.skipBrackets();
  if (reader.isOp('[')) reader.skipBrackets();
  if (reader.takeOp('*')) length(reader);
  const { end } = reader.since(name.start);
  const value = initial(reader);
  // The comment of a line with a comma stands behind the comma.
  return { name, ...(value ? { value } : {}), start: name.start, end: value ? reader.lastEnd : end, comment: reader.comments.behind(reader.lastEnd) };
}

/** `*8` and `*(*)` behind a name. */
function length(reader: Reader): void {
  if (reader.isOp('(')) reader.skipBrackets();
  else reader.next();
}

/** `= value`, `=> null()`, `/value/`. */
function initial(reader: Reader): Expr | undefined {
  if (reader.takeOp('=')) return expression(reader);
  if (reader.takeOp('=>')) {
    expression(reader);
    return undefined;
  }
  if (!reader.takeOp('/')) return undefined;
  while (!reader.done && !reader.atBreak && !reader.isOp('/')) reader.next();
  reader.takeOp('/');
  return undefined;
}

/** Names that share a line share its comment, and so one statement. */
function statementsOf(reader: Reader, first: Token, entities: readonly Entity[], attributes: Attributes): readonly Stmt[] {
  const above = reader.comments.above(first);
  const made: Stmt[] = [];
  for (let at = 0; at < entities.length; at++) {
    const one = entities[at] as Entity;
    const group = [one];
    while (one.comment && entities[at + 1]?.comment === one.comment) group.push(entities[++at] as Entity);
    const isLast = at === entities.length - 1;
    const comment = one.comment ?? (isLast ? commentBelow(reader) : undefined);
    const base = { ...(comment ? { trailing: comment } : {}), ...(above.length > 0 && entities.length === group.length ? { above } : {}) };
    const plain = group.filter((each) => !each.value);
    if (plain.length > 0) made.push({ kind: 'declare', target: targetOf(plain), annotation: attributes.type, ...base, start: (plain[0] as Entity).start, end: (plain.at(-1) as Entity).end });
    for (const each of group) if (each.value) made.push(...withValue(reader, each, each.value, attributes, base));
  }
  return made;
}

function nameOf({ name }: Entity): Expr {
  return { kind: 'name', name: name.text, start: name.start, end: name.end };
}

function targetOf(group: readonly Entity[]): Expr {
  const [only] = group;
  if (group.length === 1 && only) return nameOf(only);
  return { kind: 'sequence', form: 'tuple', items: group.map(nameOf), start: (group[0] as Entity).start, end: (group.at(-1) as Entity).end };
}

/** A constant is its value; a variable that begins with one is declared first, so that its comment holds for it all along. */
function withValue(reader: Reader, entity: Entity, value: Expr, { isConstant, type }: Attributes, base: Pick<Stmt, 'trailing' | 'above'>): readonly Stmt[] {
  const { start, end } = entity;
  const own = nameOf(entity);
  if (isConstant || !reader.scope.isProcedure) return [{ kind: 'assign', targets: [own], value, annotation: type, ...base, start, end }];
  reader.scope.assigned.add(entity.name.text);
  return [{ kind: 'declare', target: own, annotation: type, ...base, start: own.start, end: own.end }, { kind: 'assign', targets: [own], value, start, end }];
}

/** `!! …`, `!< …` and `!+ …` on the line below a declaration without a comment of its own describe it. */
function commentBelow(reader: Reader): Comment | undefined {
  const below = /^[^\n]*\n[ \t]*(![!<+])[ \t]*(?=\S)/.exec(reader.text.slice(reader.lastEnd, reader.lastEnd + 400));
  const start = below && reader.lastEnd + below[0].length;
  return start === null ? undefined : reader.comments.all.find((each) => each.start === start);
}

/** `parameter (g = 9.81, n = 3)`. */
export function parameterStatement(reader: Reader): readonly Stmt[] {
  reader.next();
  reader.takeOp('(');
  const found: Stmt[] = [];
  while (!reader.done && !reader.atBreak && reader.token.kind === 'name') {
    const name = reader.next();
    const value = reader.takeOp('=') ? expression(reader) : undefined;
    const span = reader.since(name.start);
    const comment = reader.comments.behind(reader.lastEnd);
    const own: Expr = { kind: 'name', name: name.text, start: name.start, end: name.end };
    if (value) found.push({ kind: 'assign', targets: [own], value, ...(comment ? { trailing: comment } : {}), ...span });
    if (!reader.takeOp(',')) break;
  }
  reader.takeOp(')');
  return found;
}

/** `dimension a(3), b(:)`, `common /block/ c(5)`, `allocatable :: d(:)`: names with dimensions are arrays. */
export function arraysStatement(reader: Reader): void {
  reader.next();
  while (!reader.done && !reader.atBreak) {
    const token = reader.next();
    if (token.kind !== 'name') continue;
    reader.scope.declared.add(token.text);
    if (!reader.isOp('(')) continue;
    reader.scope.arrays.add(token.text);
    reader.skipBrackets();
  }
}

/** `intent(out) :: a, b` and `optional :: a`. */
export function attributeStatement(reader: Reader): void {
  const word = reader.next().text;
  const open = reader.at;
  if (reader.isOp('(')) reader.skipBrackets();
  const intent = word === 'intent' ? direction(reader.tokens.slice(open, reader.at)) : undefined;
  while (!reader.done && !reader.atBreak) {
    const token = reader.next();
    if (token.kind !== 'name') continue;
    if (intent) reader.scope.intents.set(token.text, intent);
    else if (word === 'optional') reader.scope.optional.add(token.text);
  }
}
