import type { ClassStmt } from '../program/nodes.ts';
import type { Form, Unknown } from './form.ts';
import type { Measure } from './measure.ts';
import type { NoteInForce, Value } from './value.ts';

/** What a function of the workspace does to units, solved: polymorphic in the unknowns it mentions. */
export interface Scheme {
  readonly name: string;
  readonly params: readonly SchemeParam[];
  readonly result: SchemeResult | undefined;
  /** Equal schemes have equal fingerprints, whatever file positions they mention. */
  readonly fingerprint: string;
}

export interface SchemeParam {
  readonly name: string;
  readonly mode: 'plain' | 'keyword' | 'rest' | 'rest-named';
  readonly optional: boolean;
  /** The argument comes back with what the function gives it. */
  readonly intent?: 'out' | 'inout';
  readonly note?: NoteInForce;
  /** What the uses inside the function require; undefined: nothing is known. */
  readonly form: Form | undefined;
  /** The unknown of a parameter without a note. */
  readonly unknown: Unknown | undefined;
  /** Its note says that it is a plain number in exactly this unit (an empirical relation). */
  readonly fields?: ReadonlyMap<string, Value>;
}

export interface SchemeResult {
  /** A literal that may hide a unit multiplies it. */
  readonly tainted?: boolean;
  readonly form: Form | undefined;
  readonly measure: Measure | undefined;
  readonly note?: NoteInForce;
  readonly items?: readonly SchemeResult[];
  readonly fields?: ReadonlyMap<string, Value>;
}

/** A class: its fields' units and its methods' schemes, on demand. */
export interface ClassInfo {
  readonly name: string;
  readonly statement: ClassStmt;
  readonly fields: () => ReadonlyMap<string, Value>;
  /** Fields without what the constructor adds: what the constructor itself sees. */
  readonly declared: () => ReadonlyMap<string, Value>;
  readonly method: (name: string) => Scheme | undefined;
  readonly fingerprint: () => string;
}

/** An object of a class; its fields are worked out when one is asked for, since classes may hold each other. */
export function objectOf(info: ClassInfo): Value {
  return { expr: undefined, form: undefined, fields: new LazyFields(info.fields), from: [] };
}

/** The class that a type annotation names: `Motor`, `'Motor'`, `Optional[Motor]`, `Motor | None`. */
export function namedClass(annotation: string | undefined, global: (name: string) => Value | undefined): ClassInfo | undefined {
  const name = annotation && /^(?:typing\.)?(?:Optional\[)?\s*['"]?([\p{L}_][\p{L}\p{N}_]*)['"]?\s*\]?(?:\s*\|\s*None)?$/u.exec(annotation.trim())?.[1];
  if (!name || plainTypes.has(name)) return undefined;
  const callable = global(name)?.callable;
  return callable?.kind === 'class' ? callable.info : undefined;
}

const plainTypes = new Set(['float', 'int', 'str', 'bool', 'complex', 'list', 'dict', 'tuple', 'set', 'object', 'Any', 'None', 'Callable']);

class LazyFields implements ReadonlyMap<string, Value> {
  constructor(private readonly make: () => ReadonlyMap<string, Value>) {}
  get size(): number {
    return this.make().size;
  }
  get(name: string): Value | undefined {
    return this.make().get(name);
  }
  has(name: string): boolean {
    return this.make().has(name);
  }
  forEach(visit: (value: Value, key: string, map: ReadonlyMap<string, Value>) => void): void {
    for (const [name, value] of this.make()) visit(value, name, this);
  }
  entries(): MapIterator<[string, Value]> {
    return this.make().entries();
  }
  keys(): MapIterator<string> {
    return this.make().keys();
  }
  values(): MapIterator<Value> {
    return this.make().values();
  }
  [Symbol.iterator](): MapIterator<[string, Value]> {
    return this.make()[Symbol.iterator]();
  }
}
