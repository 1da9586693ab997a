import { pathOf } from '../program/path.ts';
import type { Expr, Stmt } from '../program/nodes.ts';

/** Every symbol that a block assigns, in its nested blocks too. */
export function assignedPaths(block: readonly Stmt[], found: Set<string> = new Set()): Set<string> {
  for (const statement of block) visit(statement, found);
  return found;
}

function visit(statement: Stmt, found: Set<string>): void {
  switch (statement.kind) {
    case 'assign':
      for (const target of statement.targets) collect(target, found);
      break;
    case 'if':
      for (const arm of statement.arms) assignedPaths(arm.body, found);
      assignedPaths(statement.otherwise, found);
      break;
    case 'loop':
      if (statement.target) collect(statement.target, found);
      assignedPaths(statement.body, found);
      assignedPaths(statement.otherwise, found);
      break;
    case 'attempt':
      for (const block of [statement.body, ...statement.handlers, statement.otherwise, statement.finally]) assignedPaths(block, found);
      break;
    case 'scope':
      for (const item of statement.items) if (item.target) collect(item.target, found);
      assignedPaths(statement.body, found);
      break;
    case 'match':
      for (const each of statement.cases) assignedPaths(each.body, found);
      break;
    default:
  }
}

function collect(target: Expr, found: Set<string>): void {
  if (target.kind === 'sequence') for (const item of target.items) collect(item, found);
  const path = pathOf(target);
  if (path !== undefined) found.add(path);
}
