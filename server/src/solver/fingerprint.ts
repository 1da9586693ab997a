/** Texts that are equal where two values mean the same to a reader of them; what cached results are checked by. */
import type { Form } from '../constraints/form.ts';
import type { Measure } from '../constraints/measure.ts';
import type { Scheme, SchemeResult } from '../constraints/scheme.ts';
import type { NoteInForce, Value } from '../constraints/value.ts';
import type { Unit } from '../quantities/unit.ts';
import type { Anchor } from '../text/span.ts';

const anchors = new WeakMap<Anchor, number>();
let count = 0;
/** Objects that hold each other are read so far. */
const deepestFields = 3;

/** The fingerprint of what a name stands for. */
export function fingerprintOf(value: Value | undefined, depth = 0): string {
  if (!value) return '-';
  const callable = value.callable;
  if (callable?.kind === 'function') return `f${callable.scheme()?.fingerprint ?? '?'}`;
  if (callable?.kind === 'library') return `l${callable.name}`;
  if (callable?.kind === 'class') return `c${callable.info.fingerprint()}`;
  if (value.module) return `m${value.module.name}`;
  if (value.literal) return `n${value.literal.value}|${value.literal.pi}`;
  const constant = value.version?.assigned?.literal;
  const inside = value.fields && depth < deepestFields ? [...value.fields].filter(([, field]) => !field.callable).map(([name, field]) => `${name}:${fingerprintOf(field, depth + 1)}`) : [];
  const parts = [...(value.items?.map((item) => fingerprintOf(item, depth + 1)) ?? []), ...inside].join();
  return `v${formText(value.form, constant !== undefined)}|${measureText(value.measure)}|${constant?.value ?? ''}|${parts}|${place(value.version?.anchor)}`;
}

/** Where a scheme's notes stand counts too, since a finding may point at them. */
export function schemeFingerprint(scheme: Omit<Scheme, 'fingerprint'>): string {
  const names = new Map<number, number>();
  const params = scheme.params.map((param) => `${param.name}:${param.mode}:${param.intent ?? ''}:${param.note ? noteText(param.note) : named(param.form, names)}`);
  return `${scheme.name}(${params.join()})${scheme.result ? resultText(scheme.result, names) : ''}`;
}

function resultText(result: SchemeResult, names: Map<number, number>): string {
  if (result.items) return `(${result.items.map((item) => resultText(item, names)).join()})`;
  return result.note ? noteText(result.note) : `${named(result.form, names)}|${measureText(result.measure)}`;
}

function noteText(note: NoteInForce): string {
  return `${unitText(note.unit)}@${place(note.anchor)}:${note.note.span.start}`;
}

export function unitText(unit: Unit): string {
  return `${unit.dimension.key}/${unit.scale?.key}/${unit.offset?.zero ?? ''}/${unit.text}`;
}

/** Unknowns by the order they are met in, so that two analyses of one text agree. */
function named(form: Form | undefined, names: Map<number, number>): string {
  if (!form) return '?';
  const terms = form.terms.map((term) => {
    const at = names.get(term.unknown.id) ?? names.size;
    names.set(term.unknown.id, at);
    return `${at}^${term.power}`;
  });
  return `${form.dimension.key}${terms.join()}`;
}

function formText(form: Form | undefined, constant: boolean): string {
  if (!form) return '?';
  return constant ? 'k' : form.dimension.key + form.terms.length;
}

function measureText(measure: Measure | undefined): string {
  if (!measure) return '';
  return measure.readings.map((reading) => `${reading.scale.key}~${reading.weight}~${reading.zero.toFixed(3)}`).join('/') + measure.factors.length + measure.radian + measure.cycle;
}

function place(anchor: Anchor | undefined): number {
  if (!anchor) return 0;
  let id = anchors.get(anchor);
  if (id === undefined) {
    id = ++count;
    anchors.set(anchor, id);
  }
  return id;
}
