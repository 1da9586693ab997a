/** Classes: their fields' units from notes, dataclass fields and the constructor; their methods' schemes. */
import { type ClassInfo, namedClass, objectOf } from '../constraints/scheme.ts';
import { notedValue } from '../constraints/targets.ts';
import type { Value } from '../constraints/value.ts';
import { constructorNames, constructorOf } from '../program/objects.ts';
import { pathOf } from '../program/path.ts';
import type { Chunk, ClassStmt, FunctionStmt } from '../program/nodes.ts';
import { methodsOf } from './definitions.ts';
import type { FileSolver } from './file-solver.ts';
import { fingerprintOf } from './fingerprint.ts';

export function classInfo(statement: ClassStmt, chunk: Chunk, file: FileSolver): ClassInfo {
  let fields: Map<string, Value> | undefined;
  const methods = new Map(methodsOf(statement).map((fn) => [fn.name, fn]));
  const method = (name: string): ReturnType<ClassInfo['method']> => {
    const fn = methods.get(name);
    return fn ? file.scheme(fn, statement, chunk) : baseOf(statement, file)?.method(name);
  };
  const declared = (): Map<string, Value> => {
    const found = new Map(baseOf(statement, file)?.fields() ?? []);
    declaredFields(statement, chunk, file, found);
    for (const [name, fn] of methods) found.set(name, methodValue(name, () => file.scheme(fn, statement, chunk)));
    return found;
  };
  return {
    name: statement.name,
    statement,
    method,
    declared,
    fields: () => {
      if (fields) return fields;
      fields = new Map(declared());
      const constructor = constructorOf(statement);
      const made = constructor && file.piece({ fn: constructor, owner: statement, chunk });
      for (const [name, value] of made?.fields ?? []) if (!fields.get(name)?.version?.note) fields.set(name, value);
      for (const [name, fn] of methods) {
        const note = isProperty(fn) ? file.notesIn(chunk, statement).results(fn)[0] : undefined;
        if (note) fields.set(name, notedValue(name, note, note.anchor, undefined));
        else if (isProperty(fn)) setProperty(fields, name, file.scheme(fn, statement, chunk));
      }
      return fields;
    },
    fingerprint: () => `${statement.name}{${[...declaredNames(statement, chunk, file)].map(([name, value]) => `${name}:${fingerprintOf(value)}`).join()}}${[...methods].map(([name, fn]) => (constructorNames.includes(name) || isProperty(fn) ? (method(name)?.fingerprint ?? '') : '')).join()}`,
  };
}

function baseOf(statement: ClassStmt, file: FileSolver): ClassInfo | undefined {
  const base = statement.bases[0];
  const value = base?.kind === 'name' && base.name !== statement.name ? file.global(base.name) : undefined;
  return value?.callable?.kind === 'class' ? value.callable.info : undefined;
}

function declaredNames(statement: ClassStmt, chunk: Chunk, file: FileSolver): ReadonlyMap<string, Value> {
  const fields = new Map<string, Value>();
  declaredFields(statement, chunk, file, fields);
  return fields;
}

function declaredFields(statement: ClassStmt, chunk: Chunk, file: FileSolver, fields: Map<string, Value>): void {
  const lookup = file.notesIn(chunk, statement);
  for (const each of statement.body) {
    if (each.kind !== 'assign' && each.kind !== 'declare') continue;
    const target = each.kind === 'assign' ? each.targets[0] : each.target;
    const name = target && pathOf(target);
    if (name === undefined || !target) continue;
    const note = lookup.statement(each, name, undefined)[0] ?? lookup.field(statement, name);
    const held = note ? undefined : namedClass(each.annotation, (global) => file.global(global));
    fields.set(name, note ? notedValue(name, note, chunk.anchor, target) : held && held.statement !== statement ? objectOf(held) : { expr: undefined, form: undefined, from: [] });
  }
  for (const [name, note] of file.index(chunk).fields.get(statement) ?? []) {
    if (!fields.get(name)?.form) fields.set(name, notedValue(name, note, note.anchor, undefined));
  }
}

function methodValue(name: string, scheme: () => ReturnType<ClassInfo['method']>): Value {
  return { expr: undefined, form: undefined, from: [], callable: { kind: 'function', name, scheme } };
}

function isProperty(fn: FunctionStmt): boolean {
  return fn.decorators.some((each) => each.kind === 'name' && (each.name === 'property' || each.name === 'cached_property'));
}

function setProperty(fields: Map<string, Value>, name: string, scheme: ReturnType<ClassInfo['method']>): void {
  const result = scheme?.result;
  const value: Value = { expr: undefined, form: undefined, from: [] };
  fields.set(name, result?.form && result.form.terms.length === 0 ? { ...value, form: result.form, measure: result.measure } : value);
}
