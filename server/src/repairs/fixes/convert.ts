/** A conversion that is missing: the exact factor where it belongs, or the note that says otherwise. */
import { Dimension } from '../../quantities/dimension.ts';
import { printUnit } from '../../quantities/print-unit.ts';
import type { Detected } from '../../findings/collect.ts';
import type { Fault } from '../../solver/fault.ts';
import type { Value } from '../../constraints/value.ts';
import type { Measure } from '../../constraints/measure.ts';
import { type Conversion, conversionOf, factorStep } from '../conversion.ts';
import type { Confidence, Fix, Fixer } from '../fix.ts';
import type { Scene } from '../scene.ts';
import { factorText, hostFactor, importedName, isAtom, spaced, withBrackets } from '../source.ts';

type ScaleFault = Extract<Fault, { kind: 'scale' }>;

export const convert: Fixer = { kind: 'convert', forFinding: conversions };

function conversions(detected: Detected, scene: Scene): readonly Fix[] {
  if (detected.cause.kind !== 'fault' || detected.cause.fault.kind !== 'scale') return [];
  const fault = detected.cause.fault;
  const { left, right, reason } = fault.constraint;
  if (!left.measure || !right.measure || !scene.isHere(fault.constraint.anchor)) return [];
  const forth = converted(fault, left, left.measure, right.measure, fault.ratio, fault.turns, right, scene);
  // A side with a note decides what the other is converted to; terms of a sum may be converted either way.
  const noted = reason.kind !== 'sum' && reason.kind !== 'comparison' && reason.kind !== 'choice' && reason.kind !== 'alike';
  const back = noted ? [] : converted(fault, right, right.measure, left.measure, 1 / fault.ratio, 1 / fault.turns, left, scene);
  return [...forth, ...back, ...noteInstead(fault, scene)];
}

function converted(fault: ScaleFault, value: Value, from: Measure, to: Measure, ratio: number, turns: number, target: Value, scene: Scene): readonly Fix[] {
  const { expr } = value;
  const { anchor, reason } = fault.constraint;
  if (!expr) return [];
  const step = conversionOf(from, to, ratio, turns);
  if (!step) return [];
  const inner = { start: anchor.start + expr.start, end: anchor.start + expr.end };
  const span = withBrackets(scene.text, inner);
  const code = scene.text.slice(span.start, span.end);
  const written = angleCall(from, to, step, scene, scene.text.slice(inner.start, inner.end)) ?? arithmetic(code, expr, step, scene, span.start, reason.kind === 'sum');
  if (written === undefined) return [];
  const angle = reason.kind === 'argument' && reason.claim === 'rad';
  const unit = angle ? 'rad' : unitText(target);
  // Either side of a comparison may be converted; of the two terms of a sum only the author knows which.
  const confidence: Confidence = step.sure && !leavesTurns(from, to) && isNoted(value) && (angle || isNoted(target)) && reason.kind !== 'choice' ? 'proven' : 'likely';
  return [{ kind: 'convert', confidence, edits: [{ ...span, text: written }], says: { what: 'rewrite', from: code, to: written, ...(unit ? { unit } : {}) }, cost: 1 }];
}

/** `P = M*n` in watts, of a speed in rpm: by 1/60 it counts revolutions, by 2π/60 radians, and only the formula tells which. */
function leavesTurns(from: Measure, to: Measure): boolean {
  const plain = (measure: Measure): boolean => measure.cycle === 0 && measure.radian === 0;
  return (from.cycle !== 0 && plain(to)) || (to.cycle !== 0 && plain(from));
}

/** Both numbers are what notes say they are, or computed from such. */
function isNoted(value: Value, depth = 0): boolean {
  if (value.version?.note) return true;
  if (value.version?.assigned) return depth < 20 && isNoted(value.version.assigned, depth + 1);
  return !value.tainted && depth < 20 && value.from.length > 0 && value.from.every((part) => isNoted(part, depth + 1));
}

/** `math.radians(a)` where the script imports it. */
function angleCall(from: Measure, to: Measure, step: Conversion, scene: Scene, code: string): string | undefined {
  if (!from.readings.every((each) => each.weight === 0) || !step.sure || to.factors.length > 0) return undefined;
  const { toRadians, toDegrees } = scene.inputs.style;
  const size = step.factor.toNumber();
  const names = Math.abs(size / (Math.PI / 180) - 1) < 1e-12 ? toRadians : Math.abs((size * Math.PI) / 180 - 1) < 1e-12 ? toDegrees : [];
  if (from.readings[0]?.nature !== 'ratio' || from.cycle > 0) return undefined;
  const name = names.map((each) => importedName(scene.inputs.program, each, scene.inputs.style.builtIn)).find((each) => each !== undefined);
  return name && `${name}(${code})`;
}

function arithmetic(code: string, expr: NonNullable<Value['expr']>, step: Conversion, scene: Scene, at: number, term: boolean): string | undefined {
  const factor = factorStep(step.factor);
  const sum = (text: string, amount: number): string => (amount === 0 ? text : `${text}${spaced(scene, at, amount > 0 ? '+' : '-')}${Math.abs(amount)}`);
  const { before, after } = step;
  if (!factor && before === 0 && after === 0) return undefined;
  const shifted = sum(code, before);
  const inner = before === 0 || !factor ? shifted : `(${shifted})`;
  const head = before === 0 && factor ? factorText(code, expr) : inner;
  const [op, number] = factor ?? ['*', ''];
  const text = hostFactor(number, scene);
  const operand = op === '/' && /[*/]/.test(text) ? `(${text})` : text;
  const scaled = factor ? `${head}${spaced(scene, at, op)}${operand}` : head;
  const whole = sum(scaled, after);
  return term && (after !== 0 || (before !== 0 && !factor)) && !isAtom(expr) ? `(${whole})` : whole;
}

/** The note on the target, where the code is right and the note is not. */
function noteInstead(fault: ScaleFault, scene: Scene): readonly Fix[] {
  const { reason, left } = fault.constraint;
  if (reason.kind !== 'target' && reason.kind !== 'result' && reason.kind !== 'parameter') return [];
  const { note, anchor } = reason.note;
  const reading = left.measure?.readings.length === 1 && left.measure.factors.length === 0 ? left.measure.readings[0] : undefined;
  if (!scene.isHere(anchor) || !reading) return [];
  const to = unitText(left);
  if (!to || to === note.unit.text || /^\d/.test(to)) return [];
  const span = { start: anchor.start + note.span.start, end: anchor.start + note.span.end };
  return [{ kind: 'note', confidence: 'choice', edits: [{ ...span, text: to }], says: { what: 'correct-note', from: note.unit.text, to }, cost: 3 }];
}

/** The unit of a side: as its author wrote it, else as it would be written. */
function unitText(value: Value): string | undefined {
  const note = value.version?.note;
  if (note) return note.unit.text === '' ? undefined : note.unit.text;
  const reading = value.measure?.readings.length === 1 ? value.measure.readings[0] : undefined;
  if (!reading || !value.form) return undefined;
  const turning = (value.measure?.cycle ?? 0) !== 0 || (value.measure?.radian ?? 0) !== 0;
  if (turning && value.form.dimension.isOne === false) return undefined;
  if (reading.weight !== 0 && value.form.dimension === Dimension.base('Θ')) return reading.scale.isOne ? 'degC' : 'degF';
  return printUnit({ dimension: value.form.dimension, scale: reading.scale, text: '' });
}
