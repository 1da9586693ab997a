import { Dimension } from '../quantities/dimension.ts';
import { Rational } from '../quantities/rational.ts';
import type { Span } from '../text/span.ts';

/** A unit that is not known: of a parameter without a note, of a constant without one, of a unit variable left open. */
export interface Unknown {
  readonly id: number;
  /** What it is the unit of, for messages: `x`. */
  readonly name: string;
  readonly span: Span | undefined;
  readonly origin: 'parameter' | 'constant' | 'open';
}

export interface Term {
  readonly unknown: Unknown;
  readonly power: Rational;
}

/** A dimension that may depend on unknowns: `dimension · Π unknown^power`. Terms are sorted by id and never zero. */
export interface Form {
  readonly dimension: Dimension;
  readonly terms: readonly Term[];
}

const none: readonly Term[] = [];
const constants = new WeakMap<Dimension, Form>();

/** The form without unknowns; one object per dimension. */
export function constantForm(dimension: Dimension): Form {
  let form = constants.get(dimension);
  if (!form) {
    form = { dimension, terms: none };
    constants.set(dimension, form);
  }
  return form;
}

export const oneForm: Form = constantForm(Dimension.one);

export function unknownForm(unknown: Unknown): Form {
  return { dimension: Dimension.one, terms: [{ unknown, power: Rational.one }] };
}

export function isConstant(form: Form): boolean {
  return form.terms.length === 0;
}

export function multiplyForms(a: Form, b: Form): Form {
  const dimension = a.dimension.mul(b.dimension);
  if (a.terms.length === 0 && b.terms.length === 0) return constantForm(dimension);
  return { dimension, terms: mergeTerms(a.terms, b.terms) };
}

export function raiseForm(a: Form, power: Rational): Form {
  if (power.isOne) return a;
  if (power.isZero) return oneForm;
  const dimension = a.dimension.pow(power);
  if (a.terms.length === 0) return constantForm(dimension);
  return { dimension, terms: a.terms.map((term) => ({ unknown: term.unknown, power: term.power.mul(power) })) };
}

export function divideForms(a: Form, b: Form): Form {
  return multiplyForms(a, raiseForm(b, Rational.minusOne));
}

export function sameForm(a: Form, b: Form): boolean {
  if (a === b) return true;
  if (a.dimension !== b.dimension || a.terms.length !== b.terms.length) return false;
  return a.terms.every((term, at) => term.unknown === b.terms[at]?.unknown && term.power.equals((b.terms[at] as Term).power));
}

/** Replaces unknowns; `undefined` from the callback leaves one in place. */
export function substitute(form: Form, replacement: (unknown: Unknown) => Form | undefined): Form {
  let result = form;
  for (const term of form.terms) {
    const found = replacement(term.unknown);
    if (!found) continue;
    const without: Form = { dimension: Dimension.one, terms: [{ unknown: term.unknown, power: term.power.neg() }] };
    result = multiplyForms(multiplyForms(result, without), raiseForm(found, term.power));
  }
  return result;
}

function mergeTerms(a: readonly Term[], b: readonly Term[]): readonly Term[] {
  if (a.length === 0) return b;
  if (b.length === 0) return a;
  const merged: Term[] = [];
  let i = 0;
  let j = 0;
  while (i < a.length || j < b.length) {
    const left = a[i];
    const right = b[j];
    if (left && (!right || left.unknown.id < right.unknown.id)) {
      merged.push(left);
      i++;
    } else if (right && (!left || right.unknown.id < left.unknown.id)) {
      merged.push(right);
      j++;
    } else if (left && right) {
      const power = left.power.add(right.power);
      if (!power.isZero) merged.push({ unknown: left.unknown, power });
      i++;
      j++;
    }
  }
  return merged;
}
