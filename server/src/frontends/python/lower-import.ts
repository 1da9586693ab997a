import type { ImportStmt } from '../../program/nodes.ts';
import { type Lowering, textOf } from '../tree-sitter/lowering.ts';
import { fieldOf, fieldsOf, type Syntax } from '../tree-sitter/syntax.ts';

type Imported = Pick<ImportStmt, 'kind' | 'module' | 'level' | 'names' | 'alias'>;

/** `import a, b.c as d`: one import per module. */
export function importedModules(low: Lowering, node: Syntax): readonly Imported[] {
  return fieldsOf(node, 'name').map((each) => {
    const { name, alias } = nameIn(low, each);
    return { kind: 'import', module: name, level: 0, ...(each.type === 'aliased_import' ? { alias } : {}) };
  });
}

/** `from ..a import b as c` and `from a import *`. */
export function importedNames(low: Lowering, node: Syntax): Imported | undefined {
  const module = fieldOf(node, 'module_name');
  if (!module && node.type !== 'future_import_statement') return undefined;
  const path = module ? textOf(low, module) : '__future__';
  const level = /^[.\s]*/.exec(path)?.[0].replace(/\s/g, '').length ?? 0;
  const star = node.parts.some((each) => each.type === 'wildcard_import');
  const names = star ? [{ name: '*', alias: '*' }] : fieldsOf(node, 'name').map((each) => nameIn(low, each));
  return { kind: 'import', module: path.replace(/^[.\s]*/, ''), level, names };
}

function nameIn(low: Lowering, node: Syntax): { readonly name: string; readonly alias: string } {
  const name = textOf(low, (node.type === 'aliased_import' && fieldOf(node, 'name')) || node);
  const alias = node.type === 'aliased_import' ? fieldOf(node, 'alias') : undefined;
  return { name, alias: alias ? textOf(low, alias) : name };
}
