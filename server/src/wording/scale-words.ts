/** Sentences for units that slip: a missing factor, a zero that differs, a point where a difference is meant. */
import type { Reason } from '../constraints/problem.ts';
import type { Value } from '../constraints/value.ts';
import { Dimension } from '../quantities/dimension.ts';
import type { Fault } from '../solver/fault.ts';
import { bracket, capital, short } from './dimension-words.ts';
import { factorWords } from './factor-words.ts';
import { noteLeaves } from '../solver/root-cause.ts';
import { chainOf, sourceWords } from './sides.ts';
import { countedIn, nameOf, unitOf, type Voice, type Words } from './voice.ts';

const temperature = Dimension.base('Θ');
const velocity = Dimension.base('L').div(Dimension.base('T'));

type ScaleFault = Extract<Fault, { kind: 'scale' }>;

export function scaleWords(voice: Voice, fault: ScaleFault): Words {
  const { constraint } = fault;
  const { anchor, left, right } = constraint;
  const dimension = right.form?.dimension ?? Dimension.one;
  const [a, b] = [countedIn(left, dimension), countedIn(right, dimension)];
  const sides = [left, ...(isBetween(constraint.reason) ? [right] : [])].map((side) => sourceWords(voice, anchor, side, dimension)).join('; ');
  return { message: `${openingOf(constraint.reason, a, b, turnsOf(fault))} ${capital(sides)}. ${adviceOf(voice, fault, dimension)}`, related: chainOf(voice, constraint, []) };
}

function adviceOf(voice: Voice, fault: ScaleFault, dimension: Dimension): string {
  const { anchor, left, right, reason } = fault.constraint;
  const name = nameOf(voice, anchor, left);
  if (fault.zeros) return zeroAdvice(name, left, right, unitOf(left, dimension), unitOf(right, dimension));
  const other = isBetween(reason) && fault.turns === 1 ? ` or ${nameOf(voice, anchor, right)} by ${factorWords(1 / fault.ratio)}` : '';
  return `Multiply ${name} by ${factorWords(fault.ratio)}${other}${turnsAdvice(fault, dimension)}${correctable(reason)}.`;
}

/** Two terms of the author's own, of which either may be the one to convert. */
function isBetween(reason: Reason): boolean {
  return reason.kind === 'sum' || reason.kind === 'comparison' || reason.kind === 'choice' || reason.kind === 'alike';
}

/** What a rotation leaves open: the radius or the diameter, the frequency or the angular velocity. */
function turnsAdvice(fault: ScaleFault, dimension: Dimension): string {
  const { left, right } = fault.constraint;
  const [from, to] = [left.measure, right.measure];
  if (fault.turns !== 1) return dimension === velocity && to?.radian === 0 ? ' with a radius, by half of that with a diameter (a revolution is 2π radians)' : ' (a revolution is 2π radians)';
  const open = from && to && from.cycle !== 0 && to.cycle === 0 && to.radian === 0 && from.radian === 0;
  return open ? `, or by ${factorWords(fault.ratio * (2 * Math.PI) ** from.cycle)} where the formula is one for rad/s` : '';
}

/** A conversion that does not fit leaves both sides with one unit's name, or the number in a unit without one. */
function inUnit(a: string | undefined, b: string | undefined): string {
  return a === undefined || a === b ? 'otherwise' : `in ${a}`;
}

/** The two units of terms that ought to share one. */
function both(opening: string, a: string | undefined, b: string | undefined): string {
  return a === undefined || b === undefined || a === b ? `${opening} not counted in the same unit.` : `${opening} counted in different units: ${a} and ${b}.`;
}

/** Rotation that is counted otherwise than the other side counts it. */
function turnsOf(fault: ScaleFault): string | undefined {
  if (fault.turns === 1) return undefined;
  return (fault.constraint.left.measure?.cycle ?? 0) !== 0 ? 'counts revolutions' : 'counts radians';
}

function openingOf(reason: Reason, a: string | undefined, b: string | undefined, turns: string | undefined): string {
  switch (reason.kind) {
    case 'sum':
      return both('The terms are', a, b);
    case 'comparison':
      return a === undefined || b === undefined || a === b ? both('The two sides of this comparison are', a, b) : `This comparison sets ${a} against ${b}.`;
    case 'choice':
      return both('The two choices are', a, b);
    case 'alike':
      return `\`${short(reason.function)}\` needs its arguments ${reason.positions[0] + 1} and ${reason.positions[1] + 1} in one unit${a === undefined || b === undefined || a === b ? '' : `; here they are ${a} and ${b}`}.`;
    case 'target':
      if (turns) return `\`${reason.path}\` is noted ${bracket(reason.note.unit.text)}, but this value ${turns}.`;
      return `\`${reason.path}\` is noted ${bracket(reason.note.unit.text)}, but this value is counted ${inUnit(a, b)}.`;
    case 'result':
      if (turns) return `\`${reason.function}\` is noted to return ${bracket(reason.note.unit.text)}, but this value ${turns}.`;
      return `\`${reason.function}\` is noted to return ${bracket(reason.note.unit.text)}, but this value is counted ${inUnit(a, b)}.`;
    case 'parameter':
      if (turns) return `\`${reason.function}\` takes \`${reason.name}\` in ${bracket(reason.note.unit.text)}, but this argument ${turns}.`;
      return `\`${reason.function}\` takes \`${reason.name}\` in ${bracket(reason.note.unit.text)}, but this argument is counted ${inUnit(a, b)}.`;
    case 'argument':
      return `\`${short(reason.function)}\` takes ${reason.claim === 'rad' ? 'radians' : (b ?? 'another unit')}, but this is counted ${inUnit(a, b)}.`;
    case 'conversion-edge':
      return `This empirical relation counts \`${reason.path}\` in ${bracket(reason.note.unit.text)}, but here it is counted ${inUnit(a, b)}.`;
    default:
      return both('The values are', a, b);
  }
}

function correctable(reason: Reason): string {
  return reason.kind === 'target' || reason.kind === 'result' ? ', or correct the note if the code is right' : '';
}

function zeroAdvice(left: string, from: Value, to: Value, a: string, b: string): string {
  const [have, want] = [from.measure?.readings[0], to.measure?.readings[0]];
  if (!have || !want) return `${left} counts from another zero.`;
  const shift = (have.zero - want.zero) / want.scale.toNumber();
  if (Math.abs(shift) < 1e-9) return `${capital(a)} and ${b} do not count the same number of points.`;
  return `${left} counts from another zero: ${shift > 0 ? 'add' : 'subtract'} ${Number(Math.abs(shift).toPrecision(7))} to get ${b}.`;
}

export function weightWords(voice: Voice, fault: Extract<Fault, { kind: 'weight' }>): Words {
  const { constraint, weight } = fault;
  const text = nameOf(voice, constraint.anchor, constraint.left);
  return {
    message: `${text} adds ${Number(weight.toPrecision(3))} temperatures that count from a zero of their own; the sum depends on where that zero is. Take a difference, divide by their number for a mean, or convert to an absolute temperature first.`,
    related: chainOf(voice, constraint, []),
  };
}

export function pointWords(voice: Voice, fault: Extract<Fault, { kind: 'point' }>): Words {
  const { constraint } = fault;
  const { value, anchor } = constraint;
  const name = nameOf(voice, anchor, value);
  const unit = unitOf(value, value.form?.dimension ?? Dimension.one);
  const related = chainOf(voice, constraint, []);
  if (constraint.use === 'gas law') {
    return { message: `${name} is a gauge pressure (${unit}) in a gas law, which needs the absolute pressure. Add the atmospheric pressure first.`, related };
  }
  const point = pointIn(value) ?? value;
  const own = unitOf(point, temperature);
  const advice = /F/.test(own) ? 'add 459.67 for °R' : 'add 273.15 for K';
  const what = point === value ? `${name} is a temperature in ${own}` : `${nameOf(voice, anchor, { ...point, expr: undefined })} is a temperature in ${own} and a factor of ${name}`;
  const where = constraint.use === 'product' ? 'a product' : constraint.use === 'quotient' ? 'a quotient' : 'a power';
  return { message: `${what}; ${where} depends on where that scale has its zero. Use an absolute temperature (${advice}) or a temperature difference.`, related };
}

/** The noted temperature that a product carries from another zero. */
function pointIn(value: Value): Value | undefined {
  return value.form?.dimension === temperature ? undefined : noteLeaves(value).find((leaf) => leaf.version?.note?.unit.offset && leaf.form?.dimension === temperature);
}
