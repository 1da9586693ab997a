/** Sentences about unit notes themselves. */
import type { Note, NoteProblem } from '../notes/types.ts';
import type { UnitHint } from '../quantities/unit-result.ts';

export function unitFaultWords(problem: NoteProblem): string {
  const { reason, suggestion } = problem.fault;
  const nearest = suggestion ? ` Did you mean \`${suggestion}\`?` : '';
  switch (reason.kind) {
    case 'unknown-symbol':
      return `\`${reason.symbol}\` is not a unit known here.${nearest}`;
    case 'unexpected':
      return `This unit cannot be read past \`${reason.found}\`.${nearest}`;
    case 'missing-bracket':
      return `A bracket is missing in this unit.${nearest}`;
    case 'bad-exponent':
      return `\`${reason.found}\` is no exponent.${nearest}`;
    case 'empty':
      return `There is no unit here.${nearest}`;
  }
}

const why: Record<UnitHint['kind'], string> = {
  'product-after-slash': 'a product after a slash can be meant above or below it',
  'celsius-or-coulomb': 'C can be degrees Celsius or coulombs',
  'fahrenheit-or-farad': 'F can be degrees Fahrenheit or farads',
  'rankine-or-gas': 'R can be degrees Rankine or the gas constant',
  'prefix-or-product': 'a letter can be a prefix or a unit of its own',
  'pound-mass-or-force': 'lb can be a mass or a force',
  case: 'capital and small letters mean different units',
  'minute-or-minimum': 'min can be a minute or a minimum',
};

export function hintWords(note: Note, hint: UnitHint): string {
  return `\`${note.unit.text}\` was read as \`${hint.readAs}\`: ${why[hint.kind]}. Writing \`${hint.readAs}\` leaves no doubt.`;
}
