import type { MatchStmt, NameExpr, Stmt } from '../../program/nodes.ts';
import { lowerExpression } from './lower-expression.ts';
import { type Lowering, spanOf, textOf } from '../tree-sitter/lowering.ts';
import { fieldOf, fieldsOf, type Syntax } from '../tree-sitter/syntax.ts';

/** What a `match` statement holds besides its place; `block` lowers the statements of a case. */
export function matchParts(low: Lowering, node: Syntax, block: (node: Syntax | undefined) => readonly Stmt[]): Pick<MatchStmt, 'kind' | 'subject' | 'cases'> {
  const subjects = fieldsOf(node, 'subject').map((each) => lowerExpression(low, each));
  const [only] = subjects;
  const span = { start: only?.start ?? spanOf(low, node).start, end: subjects.at(-1)?.end ?? spanOf(low, node).start };
  const cases = (fieldOf(node, 'body')?.parts ?? []).filter((each) => each.type === 'case_clause').map((each) => {
    const bindings: NameExpr[] = [];
    for (const part of each.parts) if (part.type === 'case_pattern') captures(low, part, bindings);
    const test = fieldOf(each, 'guard')?.parts[0];
    return { bindings, ...(test ? { guard: lowerExpression(low, test) } : {}), body: block(fieldOf(each, 'consequence')) };
  });
  return { kind: 'match', subject: only && subjects.length === 1 ? only : { kind: 'sequence', form: 'tuple', items: subjects, ...span }, cases };
}

/** The names that a pattern binds: a dotted name is a constant, the name of a class or of an attribute binds nothing. */
function captures(low: Lowering, pattern: Syntax, names: NameExpr[]): void {
  switch (pattern.type) {
    case 'identifier':
      if (textOf(low, pattern) !== '_') names.push({ kind: 'name', name: textOf(low, pattern), ...spanOf(low, pattern) });
      return;
    case 'dotted_name':
      if (pattern.parts.length === 1) captures(low, pattern.parts[0] as Syntax, names);
      return;
    case 'class_pattern':
    case 'keyword_pattern':
      for (const part of pattern.parts.slice(1)) captures(low, part, names);
      return;
    default:
      for (const part of pattern.parts) captures(low, part, names);
  }
}
