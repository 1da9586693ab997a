/** `use`: the names that a module brings in. */
import type { Stmt } from '../../program/nodes.ts';
import type { Reader } from './reader.ts';
import { baseOf } from './statements.ts';

/** `use, intrinsic :: module, only: a, b => c`. */
export function useStatement(reader: Reader): readonly Stmt[] {
  const opener = reader.next();
  if (reader.takeOp(',') && reader.token.kind === 'name') reader.next();
  reader.takeOp('::');
  if (reader.token.kind !== 'name') {
    reader.problem('the name of a module is missing', { start: reader.position, end: reader.position });
    reader.skipStatement();
    return [];
  }
  const module = reader.next().text;
  reader.scope.usesModules = true;
  const only = reader.isOp(',') && reader.isName('only', 1);
  const names = renames(reader, only);
  reader.skipStatement();
  const all = only ? names : [{ name: '*', alias: '*' }, ...names];
  return [{ kind: 'import', module, level: 0, names: all, ...baseOf(reader, opener.start) }];
}

function renames(reader: Reader, only: boolean): { readonly name: string; readonly alias: string }[] {
  const found: { readonly name: string; readonly alias: string }[] = [];
  if (!reader.takeOp(',')) return found;
  if (only) {
    reader.next();
    reader.takeOp(':');
  }
  while (!reader.done && !reader.atBreak) {
    const token = reader.next();
    if (token.kind !== 'name') continue;
    // `operator(+)` and `assignment(=)` bring in no name.
    if (reader.isOp('(')) reader.skipBrackets();
    else if (reader.takeOp('=>')) found.push({ name: reader.next().text, alias: token.text });
    else if (only) found.push({ name: token.text, alias: token.text });
  }
  return found;
}
