/** Sentences for numbers that would have to carry a unit. */
import { knownConstant } from '../quantities/known-constants.ts';
import type { Fault } from '../solver/fault.ts';
import { hiddenNumbers, neededDimension } from '../solver/hidden.ts';
import { chainOf, sideWords } from './sides.ts';
import { capital } from './dimension-words.ts';
import { unitWithKinds, type Voice, type Words } from './voice.ts';

type HiddenFault = Extract<Fault, { kind: 'dimension' | 'pure' | 'varying-power' }>;

export function hiddenWords(voice: Voice, fault: HiddenFault, alike: number): Words {
  const { constraint } = fault;
  const found = hiddenNumbers(constraint, fault.involved);
  const names = [...new Set(found.map((each) => each.text))].slice(0, 3);
  const need = neededDimension(fault, found);
  const number = names.length > 0 ? names.map((name) => `\`${name}\``).join(' or ') : 'something without a note in it';
  const known = found[0] && need ? knownConstant(found[0].size, need) : undefined;
  const what = need ? ` carried ${unitWithKinds(need, known?.unit)}` : ' carried a unit';
  const constant = known && need ? ` That is ${known.name} (${known.value} ${known.unit}): name it and note its unit.` : '';
  const sides = sideText(voice, fault);
  const more = alike > 0 ? ` ${alike === 1 ? 'One more place' : `${alike} more places`} in this function ${alike === 1 ? 'is' : 'are'} of the same kind.` : '';
  const advice = known ? '' : names.length === 0 ? ' Note the units that are missing in it, and this can be decided.' : ' Note that unit on a named constant, or declare the relation with `empirical:` and the units its symbols are counted in.';
  return { message: `This would be right only if ${number}${what}. ${sides}${constant}${advice}${more}`, related: chainOf(voice, constraint, fault.involved) };
}

function sideText(voice: Voice, fault: HiddenFault): string {
  const { anchor } = fault.constraint;
  if (fault.kind !== 'dimension') {
    const value = fault.kind === 'pure' ? fault.constraint.value : fault.constraint.base;
    return `${capital(sideWords(voice, anchor, value, fault.dimension))}.`;
  }
  const { constraint, left, right } = fault;
  return `As it stands, ${sideWords(voice, anchor, constraint.left, left)}; ${sideWords(voice, anchor, constraint.right, right)}.`;
}
