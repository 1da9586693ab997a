import { constantForm, oneForm } from '../constraints/form.ts';
import { measureOf } from '../constraints/measure.ts';
import type { Value } from '../constraints/value.ts';
import type { NamedConstant, Signature } from '../program/signature.ts';

/** The shipped and the user's own signatures, by dotted name. */
export interface SignatureTable {
  readonly functions: ReadonlyMap<string, Signature>;
  readonly methods: ReadonlyMap<string, Signature>;
  readonly constants: ReadonlyMap<string, NamedConstant>;
}

export interface Library {
  /** A function, a constant or a module by its dotted name. */
  find(name: string): Value | undefined;
  method(name: string): Signature | undefined;
}

/** Values of library names, made when asked for. */
export function libraryOf(...tables: readonly SignatureTable[]): Library {
  const values = new Map<string, Value | undefined>();
  const modules = new Set<string>();
  for (const table of tables) for (const name of [...table.functions.keys(), ...table.constants.keys()]) addPrefixes(name, modules);
  return {
    find(name) {
      if (!values.has(name)) values.set(name, make(name, tables, modules));
      return values.get(name);
    },
    method: (name) => tables.find((table) => table.methods.has(name))?.methods.get(name),
  };
}

/** A table for a language whose names do not tell capital from small letters. */
export function inSmallLetters(table: SignatureTable): SignatureTable {
  const lowered = <T>(map: ReadonlyMap<string, T>): ReadonlyMap<string, T> => new Map([...map].map(([name, each]) => [name.toLowerCase(), each]));
  return { functions: lowered(table.functions), methods: lowered(table.methods), constants: lowered(table.constants) };
}

function addPrefixes(name: string, modules: Set<string>): void {
  for (let dot = name.indexOf('.'); dot > 0; dot = name.indexOf('.', dot + 1)) modules.add(name.slice(0, dot));
}

function make(name: string, tables: readonly SignatureTable[], modules: ReadonlySet<string>): Value | undefined {
  for (const table of tables) {
    const signature = table.functions.get(name);
    if (signature) return { expr: undefined, form: undefined, from: [], callable: { kind: 'library', name, signature } };
    const constant = table.constants.get(name);
    if (constant) return constantValue(constant);
  }
  return modules.has(name) ? { expr: undefined, form: undefined, from: [], module: { name } } : undefined;
}

/** A constant without a unit is a literal: π, e, a conversion factor. */
function constantValue(constant: NamedConstant): Value | undefined {
  const dimension = constant.unit?.dimension;
  if (constant.value && (!dimension || dimension.isOne)) {
    return { expr: undefined, form: oneForm, literal: { value: constant.value, pi: constant.pi, pure: true, tolerance: 1e-9 }, from: [] };
  }
  if (!dimension || !constant.unit) return { expr: undefined, form: undefined, fits: true, from: [] };
  return { expr: undefined, form: constantForm(dimension), measure: measureOf(constant.unit), from: [] };
}
