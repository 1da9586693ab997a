import type { Constraint } from '../constraints/problem.ts';
import type { Unknown } from '../constraints/form.ts';
import type { NoteInForce } from '../constraints/value.ts';
import type { Dimension } from '../quantities/dimension.ts';

type Of<K extends Constraint['kind']> = Extract<Constraint, { kind: K }>;

/** What cannot hold, with its proof: the constraint, what each side came to, and the unknowns that were solved on the way. */
export type Fault =
  | { readonly kind: 'dimension'; readonly constraint: Of<'same'>; readonly left: Dimension; readonly right: Dimension; readonly hidden: boolean; readonly involved: readonly Involved[] }
  | { readonly kind: 'pure'; readonly constraint: Of<'pure'>; readonly dimension: Dimension; readonly hidden: boolean; readonly involved: readonly Involved[] }
  | { readonly kind: 'varying-power'; readonly constraint: Of<'varying-power'>; readonly dimension: Dimension; readonly hidden: boolean; readonly involved: readonly Involved[] }
  /** `ratio`: the left number has to be multiplied by it; `zeros`: only the zero of the scale differs. */
  | { readonly kind: 'scale'; readonly constraint: Of<'same'>; readonly ratio: number; readonly turns: number; readonly zeros: boolean }
  | { readonly kind: 'weight'; readonly constraint: Of<'same'>; readonly weight: number }
  | { readonly kind: 'point'; readonly constraint: Of<'point'> }
  | { readonly kind: 'bare'; readonly constraint: Of<'bare'>; readonly dimension: Dimension }
  | { readonly kind: 'notes'; readonly constraint: Of<'notes'> }
  /** One note explains several faults: without it all the others agree. */
  | { readonly kind: 'note'; readonly note: NoteInForce; readonly path: string; readonly faults: readonly Fault[] };

/** An unknown that was solved on the way to a contradiction, and by what. */
export interface Involved {
  readonly unknown: Unknown;
  readonly by: Constraint;
}
