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
