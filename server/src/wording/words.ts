/** Findings in sentences: the one place that turns a detected fault into what a person reads. */
import { placeAt } from '../text/span.ts';
import type { Detected } from '../findings/collect.ts';
import type { Finding } from '../findings/finding.ts';
import type { Fault } from '../solver/fault.ts';
import { placeOf } from '../findings/collect.ts';
import { bracket, dimensionWords, pureWords, varyingWords } from './dimension-words.ts';
import { hiddenWords } from './hidden-words.ts';
import { unitFaultWords, hintWords } from './note-words.ts';
import { pointWords, scaleWords, weightWords } from './scale-words.ts';
import { nameOf, type Voice, type Words } from './voice.ts';
import { chainOf } from './sides.ts';

export function toFinding(voice: Voice, detected: Detected): Finding {
  const { code, severity, place, cause } = detected;
  const words = wordsOf(voice, cause);
  return { code, severity, place, message: words.message, related: words.related };
}

function wordsOf(voice: Voice, cause: Detected['cause']): Words {
  switch (cause.kind) {
    case 'fault':
      return faultWords(voice, cause.fault, cause.alike.length);
    case 'unreadable':
      return { message: unitFaultWords(cause.problem), related: [] };
    case 'ambiguous':
      return { message: hintWords(cause.note, cause.hint), related: [] };
    case 'directive':
      return { message: cause.problem, related: [] };
  }
}

function faultWords(voice: Voice, fault: Fault, alike: number): Words {
  switch (fault.kind) {
    case 'dimension':
      return fault.hidden ? hiddenWords(voice, fault, alike) : dimensionWords(voice, fault);
    case 'pure':
      return fault.hidden ? hiddenWords(voice, fault, alike) : pureWords(voice, fault);
    case 'varying-power':
      return fault.hidden ? hiddenWords(voice, fault, alike) : varyingWords(voice, fault);
    case 'scale':
      return scaleWords(voice, fault);
    case 'weight':
      return weightWords(voice, fault);
    case 'point':
      return pointWords(voice, fault);
    case 'bare':
      return bareWords(voice, fault);
    case 'notes':
      return notesWords(fault);
    case 'note':
      return noteWords(voice, fault);
  }
}

function bareWords(voice: Voice, fault: Extract<Fault, { kind: 'bare' }>): Words {
  const { constraint } = fault;
  const beside = nameOf(voice, constraint.anchor, constraint.beside);
  const unit = constraint.beside.version?.note?.unit.text ?? '';
  return { message: `This bare number is read in the unit of ${beside}${unit ? ` (${unit})` : ''}.`, related: chainOf(voice, constraint, []) };
}

function notesWords(fault: Extract<Fault, { kind: 'notes' }>): Words {
  const { path, first, second } = fault.constraint;
  return {
    message: `Two notes on \`${path}\` disagree: ${bracket(first.unit.text)} here, ${bracket(second.unit.text)} elsewhere. The first is used; correct one of them.`,
    related: [{ place: placeAt(second.anchor, second.note.span), message: `\`${path}\` is noted ${bracket(second.unit.text)} here` }],
  };
}

function noteWords(voice: Voice, fault: Extract<Fault, { kind: 'note' }>): Words {
  const details = fault.faults.map((each) => ({ place: placeOf(each), message: faultWords(voice, each, 0).message }));
  const count = fault.faults.length;
  return { message: `This note explains ${count} contradictions: with \`${fault.path}\` in ${bracket(fault.note.unit.text)} they arise, without it everything else agrees. ${details[0]?.message ?? ''}`, related: details };
}
