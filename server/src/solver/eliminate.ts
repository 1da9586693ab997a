/**
 * Exact elimination over unknown dimensions, one equation at a time: each is reduced by what is solved already, and what is
 * left either holds, or contradicts, or solves one more unknown. Rational exponents always divide, so one pivot is as good as
 * another for the answer; the order below makes the better explanation. Unification over free Abelian groups with rational
 * exponents; cost per equation is the number of unknowns in it.
 */
import type { Constraint } from '../constraints/problem.ts';
import { divideForms, type Form, multiplyForms, raiseForm, substitute, type Term, type Unknown } from '../constraints/form.ts';
import { Dimension } from '../quantities/dimension.ts';
import { Rational } from '../quantities/rational.ts';
import type { Involved } from './fault.ts';

interface Row {
  readonly unknown: Unknown;
  readonly form: Form;
  readonly by: Constraint;
  /** Solved from an equation whose literals may hide a unit. */
  readonly soft: boolean;
}

export type Outcome = { readonly kind: 'holds' } | { readonly kind: 'solved' } | { readonly kind: 'contradicts'; readonly left: Form; readonly right: Form };

export class Elimination {
  private readonly rows = new Map<number, Row>();

  get isEmpty(): boolean {
    return this.rows.size === 0;
  }

  /** The form with every solved unknown replaced. */
  reduce(form: Form): Form {
    if (form.terms.length === 0 || this.rows.size === 0) return form;
    let result = form;
    while (result.terms.some((term) => this.rows.has(term.unknown.id))) result = substitute(result, (unknown) => this.rows.get(unknown.id)?.form);
    return result;
  }

  /** The form as far as equations without doubtful literals decide it. */
  reduceSurely(form: Form): Form {
    let result = form;
    const sure = (unknown: Unknown): Form | undefined => {
      const row = this.rows.get(unknown.id);
      return row && !row.soft && !isNumbered(row.by) ? row.form : undefined;
    };
    while (result.terms.some((term) => sure(term.unknown))) result = substitute(result, sure);
    return result;
  }

  /** Whether a form's reduction rests on a unit that was inferred and not noted. */
  isInferred(form: Form): boolean {
    return this.certificate(form).involved.some(({ unknown }) => this.rows.get(unknown.id)?.form.terms.length === 0);
  }

  /** Whether a form's reduction rests on a literal that may hide a unit. */
  isDoubtful(form: Form): boolean {
    return this.certificate(form).soft;
  }

  /** Adds `left = right`. */
  equate(left: Form, right: Form, by: Constraint, soft: boolean): Outcome {
    const [a, b] = [this.reduce(left), this.reduce(right)];
    const rest = divideForms(a, b);
    if (rest.terms.length === 0) return rest.dimension.isOne ? { kind: 'holds' } : { kind: 'contradicts', left: a, right: b };
    const pivot = rest.terms.reduce(better);
    const alone: Form = { dimension: Dimension.one, terms: [{ unknown: pivot.unknown, power: pivot.power.neg() }] };
    const others = multiplyForms(rest, alone);
    this.rows.set(pivot.unknown.id, { unknown: pivot.unknown, form: raiseForm(others, pivot.power.inv().mul(Rational.minusOne)), by, soft });
    return { kind: 'solved' };
  }

  /** The rows that a form's reduction used, transitively: the certificate beside the equation itself. */
  certificate(...forms: readonly (Form | undefined)[]): { readonly involved: readonly Involved[]; readonly soft: boolean } {
    const seen = new Map<number, Row>();
    const visit = (form: Form): void => {
      for (const term of form.terms) {
        const row = this.rows.get(term.unknown.id);
        if (!row || seen.has(term.unknown.id)) continue;
        seen.set(term.unknown.id, row);
        visit(row.form);
      }
    };
    for (const form of forms) if (form) visit(form);
    const rows = [...seen.values()];
    return { involved: rows.map((row) => ({ unknown: row.unknown, by: row.by })), soft: rows.some((row) => row.soft) };
  }
}

/** An equation in which literals scale a side: `a + b/4` may hold a conversion that only its author knows. */
function isNumbered(constraint: Constraint): boolean {
  return constraint.kind === 'same' && (constraint.left.numbered === true || constraint.right.numbered === true);
}

const rank: Record<Unknown['origin'], number> = { open: 0, constant: 1, parameter: 2 };

/** The pivot: a unit variable left open before a constant, a constant before a parameter, the younger before the older. */
function better(a: Term, b: Term): Term {
  const difference = rank[a.unknown.origin] - rank[b.unknown.origin];
  return difference < 0 || (difference === 0 && a.unknown.id > b.unknown.id) ? a : b;
}
