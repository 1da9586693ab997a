import type { Expr, FunctionStmt, RecordExpr, Stmt } from '../program/nodes.ts';

/** The records written out in a function that it returns, directly or through a name. */
export function returnedRecords(fn: FunctionStmt): readonly RecordExpr[] {
  const records: RecordExpr[] = [];
  const named = new Map<string, RecordExpr[]>();
  const returned = new Set<string>();
  const visit = (statement: Stmt): void => {
    if (statement.kind === 'return' && statement.value) take(statement.value, records, returned);
    else if (statement.kind === 'assign' && statement.value.kind === 'record') hold(statement.targets, statement.value, named);
    for (const block of blocksOf(statement)) block.forEach(visit);
  };
  fn.body.forEach(visit);
  for (const name of returned) records.push(...(named.get(name) ?? []));
  return records;
}

function take(value: Expr, records: RecordExpr[], returned: Set<string>): void {
  if (value.kind === 'record') records.push(value);
  else if (value.kind === 'name') returned.add(value.name);
}

function hold(targets: readonly Expr[], value: RecordExpr, named: Map<string, RecordExpr[]>): void {
  for (const target of targets) if (target.kind === 'name') named.set(target.name, [...(named.get(target.name) ?? []), value]);
}

/** The blocks inside a statement; functions and classes have returns of their own. */
function blocksOf(statement: Stmt): readonly (readonly Stmt[])[] {
  switch (statement.kind) {
    case 'if':
      return [...statement.arms.map((arm) => arm.body), statement.otherwise];
    case 'loop':
      return [statement.body, statement.otherwise];
    case 'attempt':
      return [statement.body, ...statement.handlers, statement.otherwise, statement.finally];
    case 'scope':
      return [statement.body];
    case 'match':
      return statement.cases.map((each) => each.body);
    default:
      return [];
  }
}
