import type { Note } from '../notes/types.ts';
import type { Expr } from '../program/nodes.ts';
import type { Signature } from '../program/signature.ts';
import type { Unit } from '../quantities/unit.ts';
import type { Anchor, Span } from '../text/span.ts';
import type { Form } from './form.ts';
import type { Literal } from './literal.ts';
import type { Measure } from './measure.ts';
import type { ClassInfo, Scheme } from './scheme.ts';
import type { LocalFunction } from './context.ts';

/** What is known of an expression's unit. Immutable; `from` and `version` are its proof. */
export interface Value {
  readonly expr: Expr | undefined;
  /** Undefined: unknown, and silent. */
  readonly form: Form | undefined;
  readonly measure?: Measure | undefined;
  /** Set for a number made of literals only; its form counts in products and is open in sums. */
  readonly literal?: Literal;
  /** 0, inf, nan, empty, None: fits any unit. */
  readonly fits?: boolean;
  /** A literal that may hide a unit multiplies it. */
  readonly tainted?: boolean;
  /** Unknown because of a contradiction that was reported: nothing is to be concluded from it. */
  readonly spoilt?: boolean;
  /** Unknown, but raised to a simple fraction: beside other characteristic numbers it is one. */
  readonly fractional?: boolean;
  /** Left in two dimensions by the ways through an if; reported where arithmetic uses it. */
  readonly split?: readonly [Value, Value];
  /** A literal other than 1 multiplies it, even if a pure one. */
  readonly numbered?: boolean;
  /** Holds nothing yet but zeros or NaN, whatever its note says: a copy of it fits any unit too. */
  readonly blank?: boolean;
  /** A tuple's positions. */
  readonly items?: readonly Value[];
  /** What a member is, for what is only run over: `zip`, `enumerate`. */
  readonly element?: Value;
  /** A record's entries, an object's attributes. */
  readonly fields?: ReadonlyMap<string, Value>;
  readonly callable?: Callable;
  /** A module, by the name it was imported from. */
  readonly module?: ModuleValue;
  /** A point on a scale was used as if it counted from zero; reported where the value is put to use. */
  readonly misuse?: Misuse | undefined;
  /** Factors of a product that decide whether it is a gas law. */
  readonly gaugeFactor?: boolean;
  readonly temperatureFactor?: boolean;
  readonly from: readonly Value[];
  /** The version of a symbol that was read. */
  readonly version?: Version;
}

export type Callable =
  | { readonly kind: 'function'; readonly name: string; readonly scheme: () => Scheme | undefined }
  | { readonly kind: 'library'; readonly name: string; readonly signature: Signature }
  | { readonly kind: 'class'; readonly info: ClassInfo }
  | { readonly kind: 'local'; readonly local: LocalFunction };

export interface ModuleValue {
  /** Dotted name: `numpy`, `scipy.constants`. */
  readonly name: string;
  /** A member of a module of the workspace; undefined for a library. */
  readonly member?: (name: string) => Value | undefined;
}

export interface Misuse {
  readonly span: Span;
  readonly use: 'product' | 'quotient' | 'power' | 'gas law';
  readonly value: Value;
}

/** One assignment of a symbol. */
export interface Version {
  readonly path: string;
  readonly anchor: Anchor;
  readonly span: Span;
  readonly origin: 'note' | 'assigned' | 'parameter' | 'constant' | 'library' | 'joined';
  readonly note?: NoteInForce;
  /** What was assigned, where no note decides. */
  readonly assigned?: Value;
}

/** A note with the place it stands at. */
export interface NoteInForce {
  readonly note: Note;
  readonly unit: Unit;
  readonly anchor: Anchor;
}

export const unknownValue: Value = { expr: undefined, form: undefined, from: [] };

/** A value about which nothing is known, for this expression. */
export function unknown(expr: Expr, from: readonly Value[] = []): Value {
  if (from.some((value) => value.spoilt)) return { expr, form: undefined, from, spoilt: true };
  return from.length === 0 && expr.kind !== 'name' ? unknownValue : { expr, form: undefined, from };
}

/** Whether a value takes part in no comparison: unknown, or fitting any unit. */
export function isOpen(value: Value): boolean {
  return value.form === undefined || value.fits === true || value.literal !== undefined;
}
