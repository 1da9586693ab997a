/** Imports and exports, of ES modules and of CommonJS. */
import type { Expr, ImportStmt, Stmt } from '../../program/nodes.ts';
import { spanOf, textOf } from '../tree-sitter/lowering.ts';
import { fieldOf, type Syntax } from '../tree-sitter/syntax.ts';
import { lowerExpression } from './lower-expression.ts';
import { classStatement } from './lower-class.ts';
import { functionStatement } from './lower-function.ts';
import { stringText } from './literals.ts';
import { type Base, lowerDeclaration } from './lower-statement.ts';
import { bare, isFunction, nameAt, type Script } from './script.ts';

/** The name under which a module gives its default. */
export const defaultName = 'default';

type Names = NonNullable<ImportStmt['names']>;

/** `import a, { b as c } from './x.js'`, `import * as n from …`, `import './x.js'`, `import x = require('./x')`. */
export function importStatement(script: Script, node: Syntax, base: Base): readonly Stmt[] {
  const demanded = node.parts.find((each) => each.type === 'import_require_clause');
  const source = fieldOf(node, 'source') ?? (demanded && fieldOf(demanded, 'source'));
  if (!source || node.children.some((each) => each.type === 'type' && !each.named)) return source ? typesOnly(script, node, source, base) : [];
  const module = stringText(script, source);
  const alias = demanded?.parts.find((each) => each.type === 'identifier');
  if (alias) return [importOf(module, base, undefined, textOf(script, alias))];
  const clause = node.parts.find((each) => each.type === 'import_clause');
  if (!clause) return [importOf(module, base, [])];
  return clauseImports(script, clause, module, base);
}

function clauseImports(script: Script, clause: Syntax, module: string, base: Base): readonly Stmt[] {
  return clause.parts.flatMap((part): readonly Stmt[] => {
    if (part.type === 'identifier') return [importOf(module, base, [{ name: defaultName, alias: textOf(script, part) }])];
    if (part.type === 'namespace_import') return [importOf(module, base, undefined, textOf(script, part.parts.at(-1) ?? part))];
    return part.type === 'named_imports' ? [importOf(module, base, specifiers(script, part))] : [];
  });
}

/** `import type { X }`: the shapes of objects may carry units. */
function typesOnly(script: Script, node: Syntax, source: Syntax, base: Base): readonly Stmt[] {
  const clause = node.parts.find((each) => each.type === 'import_clause');
  return clause ? clauseImports(script, clause, stringText(script, source), base) : [];
}

function specifiers(script: Script, node: Syntax): Names {
  return node.parts.flatMap((each) => {
    const name = fieldOf(each, 'name');
    const alias = fieldOf(each, 'alias');
    if (!name) return [];
    const text = name.type === 'string' ? stringText(script, name) : textOf(script, name);
    return [{ name: text, alias: alias ? textOf(script, alias) : text }];
  });
}

function importOf(module: string, base: Base, names: Names | undefined, alias?: string): ImportStmt {
  return { kind: 'import', module, level: module.startsWith('.') ? 1 : 0, ...(names ? { names } : {}), ...(alias === undefined ? {} : { alias }), start: base.start, end: base.end };
}

/** Every form of export: what is declared, what goes by another name, what comes from another file. */
export function exportStatement(script: Script, node: Syntax, base: Base): readonly Stmt[] {
  const source = fieldOf(node, 'source');
  const clause = node.parts.find((each) => each.type === 'export_clause');
  if (source) return [reexport(script, node, clause, stringText(script, source), base)];
  if (clause) return specifiers(script, clause).flatMap(({ name, alias }) => (name === alias ? [] : [renamed(name, alias, base)]));
  const declaration = fieldOf(node, 'declaration');
  const value = bare(fieldOf(node, 'value'));
  const isDefault = node.children.some((each) => each.type === defaultName);
  if (declaration) {
    const lowered = fieldOf(declaration, 'name') || !isDefault ? lowerDeclaration(script, declaration, base) : [functionOrClass(script, declaration, base)].flat();
    const first = lowered[0];
    return isDefault && first && (first.kind === 'function' || first.kind === 'class') && first.name !== defaultName ? [...lowered, renamed(first.name, defaultName, base)] : lowered;
  }
  if (!value) return [];
  if (isFunction(value) || value.type === 'class') return functionOrClass(script, value, base);
  return [{ kind: 'assign', targets: [hidden(defaultName, base)], value: lowerExpression(script, value), ...base }];
}

function functionOrClass(script: Script, node: Syntax, base: Base): readonly Stmt[] {
  const span = { start: base.start, end: base.start };
  if (node.type.startsWith('class')) {
    const made = classStatement(script, node, base, fieldOf(node, 'name') ?? node);
    return made ? [{ ...made, name: defaultName, nameSpan: span }] : [];
  }
  return [functionStatement(script, node, { name: defaultName, ...span }, base)];
}

function reexport(script: Script, node: Syntax, clause: Syntax | undefined, module: string, base: Base): Stmt {
  if (clause) return importOf(module, base, specifiers(script, clause));
  const namespace = node.parts.find((each) => each.type === 'namespace_export');
  return namespace ? importOf(module, base, undefined, textOf(script, namespace.parts.at(-1) ?? namespace)) : importOf(module, base, [{ name: '*', alias: '*' }]);
}

/** A second name for something of the file. */
function renamed(name: string, alias: string, base: Base): Stmt {
  const here = { start: base.start, end: base.start };
  return { kind: 'assign', targets: [hidden(alias, base)], value: { kind: 'name', name, ...here }, ...here };
}

function hidden(name: string, base: Base): Expr {
  return { kind: 'name', name, start: base.start, end: base.start };
}

/** `const x = require('./x')`, `const { a, b: c } = require('./x')`, `const f = require('./x').f`; undefined for anything else. */
export function required(script: Script, name: Syntax, value: Syntax | undefined, base: Base): readonly Stmt[] | undefined {
  const member = value?.type === 'member_expression' ? fieldOf(value, 'property') : undefined;
  const module = requiredModule(script, member && value ? fieldOf(value, 'object') : value);
  if (module === undefined) return undefined;
  if (name.type === 'identifier') return [member ? importOf(module, base, [{ name: textOf(script, member), alias: textOf(script, name) }]) : importOf(module, base, undefined, textOf(script, name))];
  if (name.type !== 'object_pattern' || member) return undefined;
  const names = name.parts.flatMap((part) => {
    const key = part.type === 'pair_pattern' ? fieldOf(part, 'key') : part;
    const alias = part.type === 'pair_pattern' ? fieldOf(part, 'value') : part;
    return key && alias && key.parts.length === 0 && alias.parts.length === 0 ? [{ name: textOf(script, key), alias: textOf(script, alias) }] : [];
  });
  return [importOf(module, base, names)];
}

function requiredModule(script: Script, node: Syntax | undefined): string | undefined {
  const callee = node?.type === 'call_expression' ? fieldOf(node, 'function') : undefined;
  const argument = node && callee?.type === 'identifier' && textOf(script, callee) === 'require' ? fieldOf(node, 'arguments')?.parts[0] : undefined;
  return argument?.type === 'string' ? stringText(script, argument) : undefined;
}

/** What `module.exports = …`, `exports.f = …` name; undefined for any other assignment. */
export function exported(script: Script, targets: readonly Syntax[], value: Syntax | undefined, base: Base): readonly Stmt[] | undefined {
  const names = targets.map((target) => exportedName(textOf(script, target)));
  if (!value || names.some((name) => name === undefined)) return undefined;
  const name = names.find((each) => each !== '' && each !== undefined) ?? defaultName;
  if (value.type === 'object' && name === defaultName) return value.parts.flatMap((part) => exportedEntry(script, part));
  if (isFunction(value)) return [functionStatement(script, value, { name, start: base.start, end: base.start }, base)];
  if (value.type === 'identifier') return textOf(script, value) === name ? [] : [renamed(textOf(script, value), name, base)];
  const property = fieldOf(targets[0] as Syntax, 'property');
  const target = property && name !== defaultName ? nameAt(script, property) : hidden(name, base);
  return [{ kind: 'assign', targets: [target], value: lowerExpression(script, value), ...base }];
}

/** The name behind `exports.`; empty for the whole. */
function exportedName(text: string): string | undefined {
  return /^(?:module\.exports|exports)(?:\.([\p{L}_$][\p{L}\p{N}_$]*))?$/u.exec(text)?.slice(1).map((each) => each ?? '')[0];
}

function exportedEntry(script: Script, part: Syntax): readonly Stmt[] {
  const key = fieldOf(part, 'key') ?? fieldOf(part, 'name');
  const value = part.type === 'pair' ? bare(fieldOf(part, 'value')) : part.type === 'method_definition' ? part : undefined;
  if (!key || !value || key.type === 'computed_property_name') return [];
  const name = key.type === 'string' ? stringText(script, key) : textOf(script, key);
  const own = spanOf(script, part);
  const above = script.comments.above(own);
  if (isFunction(value) || value.type === 'method_definition') return [functionStatement(script, value, { name, ...spanOf(script, key) }, { ...own, ...(above.length > 0 ? { above } : {}) })];
  if (value.type === 'identifier') return textOf(script, value) === name ? [] : [renamed(textOf(script, value), name, own)];
  const trailing = script.comments.trailing(own);
  return [{ kind: 'assign', targets: [nameAt(script, key)], value: lowerExpression(script, value), ...own, ...(trailing ? { trailing } : {}), ...(above.length > 0 ? { above } : {}) }];
}
