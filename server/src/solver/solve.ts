import { isConstant, oneForm } from '../constraints/form.ts';
import type { Constraint } from '../constraints/problem.ts';
import type { Form } from '../constraints/form.ts';
import { Elimination } from './eliminate.ts';
import type { Fault } from './fault.ts';
import { hidesConstant } from './hidden.ts';
import { scaleFault } from './scales.ts';

/** What came of a problem. Inert: plain results and the means to reduce a form by them. */
export interface Solution {
  readonly faults: readonly Fault[];
  reduce(form: Form): Form;
  reduceSurely(form: Form): Form;
  isDoubtful(form: Form): boolean;
  isInferred(form: Form): boolean;
}

/**
 * Solves the constraints of one function. First those without literals that might hide a unit, then the others, which may
 * only solve what is still open; what merely is checked (logarithms, varying powers) comes last.
 */
export function solve(constraints: readonly Constraint[]): Solution {
  const elimination = new Elimination();
  const faults: { readonly at: number; readonly fault: Fault }[] = [];
  const report = (at: number, fault: Fault | undefined): void => void (fault && faults.push({ at, fault }));
  const later: number[] = [];
  const last: number[] = [];
  constraints.forEach((constraint, at) => {
    if (isGentle(constraint)) last.push(at);
    else if (isTainted(constraint)) later.push(at);
    else report(at, settle(constraint, elimination, false));
  });
  for (const at of later) report(at, settle(constraints[at] as Constraint, elimination, true));
  for (const at of last) report(at, check(constraints[at] as Constraint, elimination));
  faults.sort((a, b) => a.at - b.at);
  return { faults: faults.map((each) => each.fault), reduce: (form) => elimination.reduce(form), reduceSurely: (form) => elimination.reduceSurely(form), isDoubtful: (form) => elimination.isDoubtful(form), isInferred: (form) => elimination.isInferred(form) };
}

function isGentle(constraint: Constraint): boolean {
  return constraint.kind !== 'same' && !(constraint.kind === 'pure' && !(constraint.reason.kind === 'pure-argument' && constraint.reason.gentle));
}

function isTainted(constraint: Constraint): boolean {
  if (constraint.kind === 'same') return constraint.left.tainted === true || constraint.right.tainted === true;
  return constraint.kind === 'pure' && constraint.value.tainted === true;
}

function settle(constraint: Constraint, elimination: Elimination, soft: boolean): Fault | undefined {
  if (constraint.kind === 'same') return settleSame(constraint, elimination, soft);
  if (constraint.kind !== 'pure' || !constraint.value.form) return undefined;
  const outcome = elimination.equate(constraint.value.form, oneForm, constraint, soft);
  if (outcome.kind !== 'contradicts') return undefined;
  const proof = elimination.certificate(constraint.value.form);
  return { kind: 'pure', constraint, dimension: outcome.left.dimension, hidden: soft || proof.soft, involved: proof.involved };
}

function settleSame(constraint: Extract<Constraint, { kind: 'same' }>, elimination: Elimination, soft: boolean): Fault | undefined {
  const { left, right } = constraint;
  if (!left.form || !right.form) return undefined;
  const outcome = elimination.equate(left.form, right.form, constraint, soft);
  if (outcome.kind !== 'contradicts') return scaleFault(constraint, elimination);
  const proof = elimination.certificate(left.form, right.form);
  const [a, b] = [outcome.left.dimension, outcome.right.dimension];
  return { kind: 'dimension', constraint, left: a, right: b, hidden: soft || proof.soft || hidesConstant(constraint, a, b), involved: proof.involved };
}

/** Constraints that ask and do not solve. */
function check(constraint: Constraint, elimination: Elimination): Fault | undefined {
  switch (constraint.kind) {
    case 'point':
      return { kind: 'point', constraint };
    case 'notes':
      return { kind: 'notes', constraint };
    case 'bare': {
      const form = constraint.beside.form && elimination.reduce(constraint.beside.form);
      return form && isConstant(form) && !form.dimension.isOne ? { kind: 'bare', constraint, dimension: form.dimension } : undefined;
    }
    case 'pure':
    case 'varying-power': {
      const value = constraint.kind === 'pure' ? constraint.value : constraint.base;
      const form = value.form && elimination.reduce(value.form);
      if (!form || !isConstant(form) || form.dimension.isOne) return undefined;
      const proof = elimination.certificate(value.form);
      const common = { dimension: form.dimension, hidden: value.tainted === true || proof.soft, involved: proof.involved };
      return constraint.kind === 'pure' ? { kind: 'pure', constraint, ...common } : { kind: 'varying-power', constraint, ...common };
    }
    default:
      return undefined;
  }
}
