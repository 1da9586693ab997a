/** Sentences for terms and results that do not match. */
import type { Reason } from '../constraints/problem.ts';
import { familiarity, kindsOf } from '../quantities/kinds.ts';
import { coherentUnit } from '../quantities/print-unit.ts';
import type { Fault } from '../solver/fault.ts';
import { chainOf, sideWords } from './sides.ts';
import { nameOf, unitOf, unitWithKinds, unitWords, type Voice, type Words } from './voice.ts';

type DimensionFault = Extract<Fault, { kind: 'dimension' }>;

export function dimensionWords(voice: Voice, fault: DimensionFault): Words {
  const { constraint, left, right } = fault;
  const { anchor } = constraint;
  const [a, b] = [unitOf(constraint.left, left), unitOf(constraint.right, right)];
  const opening = openingOf(voice, constraint.reason, a, b, fault);
  const noted = isNoted(constraint.reason);
  const sides = noted ? sideWords(voice, anchor, constraint.left, left) : `${sideWords(voice, anchor, constraint.left, left)}; ${sideWords(voice, anchor, constraint.right, right)}`;
  return { message: `${opening} ${capital(sides)}. ${missing(voice, fault)}`, related: chainOf(voice, constraint, fault.involved) };
}

function openingOf(voice: Voice, reason: Reason, a: string, b: string, fault: DimensionFault): string {
  switch (reason.kind) {
    case 'sum':
      return reason.op === '+' ? `This sum adds ${a} to ${b}.` : reason.op === '-' ? `This difference takes ${b} from ${a}.` : `This remainder divides ${a} by ${b}.`;
    case 'comparison':
      return `This comparison (${reason.op}) sets ${a} against ${b}.`;
    case 'choice':
      if (reason.of === 'correction') return `This factor is applied only under a condition, so it has to be a pure number, but it is ${a}.`;
      if (reason.of === 'branches') return `The ways through the if above leave this in different units: ${a} and ${b}.`;
      return `The two choices are not alike: ${a} and ${b}.`;
    case 'alike':
      return `\`${short(reason.function)}\` needs its arguments ${reason.positions[0] + 1} and ${reason.positions[1] + 1} in one unit; here they are ${a} and ${b}.`;
    case 'target':
      return `\`${reason.path}\` is noted ${bracket(reason.note.unit.text)}, but this value is ${a}.`;
    case 'result':
      return `\`${reason.function}\` is noted to return ${bracket(reason.note.unit.text)}, but this value is ${a}.`;
    case 'parameter':
      return `\`${reason.function}\` takes \`${reason.name}\` in ${bracket(reason.note.unit.text)}, but this argument is ${a}.`;
    case 'inferred-parameter':
      return `\`${reason.function}\` uses \`${reason.name}\` as ${b} (inferred from its body), but this argument is ${a}.`;
    case 'argument':
      return `\`${short(reason.function)}\` takes ${reason.name ? `\`${reason.name}\`` : `argument ${reason.position}`} in ${b}, but this is ${a}.`;
    case 'conversion-edge':
      return `This empirical relation counts \`${reason.path}\` in ${bracket(reason.note.unit.text)}, but ${nameOf(voice, fault.constraint.anchor, fault.constraint.left)} is ${a}.`;
    default:
      return `${a} and ${b} stand where one unit is needed.`;
  }
}

/** What one side lacks, and which kinds of quantity have it. */
function missing(voice: Voice, fault: DimensionFault): string {
  const lacking = fault.right.div(fault.left);
  const inverse = fault.left.div(fault.right);
  const { anchor, left, right, reason } = fault.constraint;
  if (kindsOf(lacking).length === 0 && kindsOf(inverse).length === 0) return 'No usual quantity stands between the two: look for a quotient the wrong way round, or a power left out.';
  // A symbol that is noted itself is the better witness: what is computed beside it has to change.
  const computed = !isNoted(reason) && left.version?.note && !right.version?.note ? right : undefined;
  if (computed && familiarity(lacking) <= familiarity(inverse)) return `${nameOf(voice, anchor, computed)} would have to be divided by something in ${unitWithKinds(lacking)}.`;
  if (familiarity(lacking) <= familiarity(inverse)) return `${nameOf(voice, anchor, left)} would have to be multiplied by something in ${unitWithKinds(lacking)}.`;
  if (isNoted(reason)) return `${nameOf(voice, anchor, left)} would have to be divided by something in ${unitWithKinds(inverse)}.`;
  return `${nameOf(voice, anchor, right)} would have to be multiplied by something in ${unitWithKinds(inverse)}.`;
}

function isNoted(reason: Reason): boolean {
  return reason.kind === 'target' || reason.kind === 'result' || reason.kind === 'parameter' || reason.kind === 'inferred-parameter' || reason.kind === 'argument' || reason.kind === 'conversion-edge';
}

export function bracket(text: string): string {
  return `[${text === '' ? '-' : text}]`;
}

export function short(name: string): string {
  return name.slice(name.lastIndexOf('.') + 1);
}

export function capital(text: string): string {
  return /^[a-z]/.test(text) ? (text[0] as string).toUpperCase() + text.slice(1) : text;
}

/** For pure numbers wanted: exponents and the arguments of exp and friends. */
export function pureWords(voice: Voice, fault: Extract<Fault, { kind: 'pure' }>): Words {
  const { constraint, dimension } = fault;
  const side = sideWords(voice, constraint.anchor, constraint.value, dimension);
  const unit = unitWords(unitOf(constraint.value, dimension), dimension);
  const related = chainOf(voice, constraint, fault.involved);
  if (constraint.reason.kind === 'exponent') return { message: `An exponent has to be a pure number; this one is ${unit}. ${capital(side)}.`, related };
  const reason = constraint.reason;
  const name = reason.kind === 'pure-argument' ? short(reason.function) : 'this function';
  const advice = reason.kind === 'pure-argument' && reason.gentle
    ? `If the formula means the number counted in ${unit}, divide by 1 ${unit} in a noted constant, so that the reference value shows.`
    : `Divide it by something in ${unitWithKinds(dimension)}.`;
  return { message: `\`${name}\` takes a pure number, but this is ${unit}. ${capital(side)}. ${advice}`, related };
}

export function varyingWords(voice: Voice, fault: Extract<Fault, { kind: 'varying-power' }>): Words {
  const { constraint, dimension } = fault;
  const base = sideWords(voice, constraint.anchor, constraint.base, dimension);
  const message = `${capital(base)}, and its exponent ${nameOf(voice, constraint.anchor, constraint.exponent)} is not constant: the result would have no fixed unit. Divide the base by a reference value in ${coherentUnit(dimension)}.`;
  return { message, related: chainOf(voice, constraint, fault.involved) };
}
