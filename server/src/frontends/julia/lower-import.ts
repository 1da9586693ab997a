/** `using`, `import` and `include` in the common form. */
import type { ImportStmt } from '../../program/nodes.ts';
import { type Lowering, textOf } from '../tree-sitter/lowering.ts';
import type { Syntax } from '../tree-sitter/syntax.ts';

type Import = Omit<ImportStmt, 'start' | 'end'>;

/** One import a module; `using A` brings all its names in. */
export function importsOf(low: Lowering, node: Syntax): readonly Import[] {
  const using = node.type === 'using_statement';
  return node.parts.flatMap((part): Import[] => {
    if (part.type !== 'selected_import') return [whole(low, part, using)];
    const [module, ...names] = part.parts;
    if (!module) return [];
    const listed = names.filter((each) => each.type === 'identifier' || each.type === 'import_alias').map((each) => {
      const [name, alias] = each.type === 'import_alias' ? each.parts : [each, each];
      return { name: textOf(low, name ?? each), alias: textOf(low, alias ?? each) };
    });
    return [{ kind: 'import', ...moduleOf(textOf(low, module)), names: listed }];
  });
}

function whole(low: Lowering, part: Syntax, using: boolean): Import {
  const [path, alias] = part.type === 'import_alias' ? part.parts : [part];
  const module = moduleOf(textOf(low, path ?? part));
  if (alias) return { kind: 'import', ...module, alias: textOf(low, alias) };
  return using ? { kind: 'import', ...module, names: [{ name: '*', alias: '*' }] } : { kind: 'import', ...module };
}

/** `..A.B`: module `A.B`, level 2. */
function moduleOf(text: string): { readonly module: string; readonly level: number } {
  const level = /^\.*/.exec(text)?.[0].length ?? 0;
  return { module: text.slice(level), level };
}
