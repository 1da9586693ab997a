/** Input and output: what is read becomes unknown, what is written is looked at. */
import type { Expr, Stmt } from '../../program/nodes.ts';
import { expression } from './expressions.ts';
import type { Reader } from './reader.ts';
import { assigned, baseOf } from './statements.ts';

const passed = new Set(['open', 'close', 'inquire', 'rewind', 'backspace', 'endfile', 'flush', 'wait']);

/** A statement of input or output; undefined where none begins here. */
export function ioStatement(reader: Reader): readonly Stmt[] | undefined {
  const { token } = reader;
  if (passed.has(token.text)) {
    reader.skipStatement();
    return [{ kind: 'leave', flow: 'none', values: [], ...baseOf(reader, token.start) }];
  }
  if (token.text !== 'print' && token.text !== 'write' && token.text !== 'read') return undefined;
  reader.next();
  if (reader.isOp('(') && token.text !== 'print') reader.skipBrackets();
  else skipFormat(reader);
  return reader.leniently(() => {
    const items = itemsOf(reader);
    if (token.text !== 'read') return [{ kind: 'leave', flow: 'none', values: items, ...baseOf(reader, token.start) }];
    for (const each of items) assigned(reader, each);
    return items.map((each): Stmt => ({ kind: 'assign', targets: [each.kind === 'call' ? each.callee : each], value: reader.unknown(each), start: each.start, end: each.end }));
  });
}

/** `print *, a` and `print '(f8.3)', a`: what stands before the first comma. */
function skipFormat(reader: Reader): void {
  while (!reader.done && !reader.atBreak && !reader.isOp(',')) {
    if (reader.isOp('(') || reader.isOp('(/')) reader.skipBrackets();
    else reader.next();
  }
  reader.takeOp(',');
}

function itemsOf(reader: Reader): readonly Expr[] {
  const items: Expr[] = [];
  while (!reader.done && !reader.atBreak) {
    const before = reader.at;
    items.push(expression(reader));
    if (!reader.takeOp(',')) break;
    if (reader.at === before) break;
  }
  reader.skipStatement();
  return items;
}
