/** What a fix does, in a line for a menu. */
import type { Fix } from '../repairs/fix.ts';
import { bracket } from './dimension-words.ts';

const longest = 48;

export function fixTitle({ says }: Fix): string {
  switch (says.what) {
    case 'rewrite':
      return `Write ${quote(says.to)} for ${quote(says.from)}${says.unit ? `: gives ${says.unit}` : ''}`;
    case 'note':
      return `Note \`${says.symbol}\` as ${bracket(says.unit)}, which its uses need`;
    case 'notes':
      return `Note the ${says.count} units that follow from the others`;
    case 'correct-note': {
      const evidence = says.uses ? `: ${says.uses[0]} of ${says.uses[1]} uses need it` : '';
      return `Correct the note${says.symbol ? ` on \`${says.symbol}\`` : ''} from ${bracket(says.from)} to ${bracket(says.to)}${evidence}`;
    }
    case 'allow':
      return `Allow ${says.code} ${says.wide ? 'in this file' : 'here'}, with a reason`;
    case 'name-number':
      return `Name ${quote(says.number)} as \`${says.name}\` ${bracket(says.unit)}${says.constant ? `, the ${says.constant}` : ''}`;
    case 'empirical':
      return `Declare an empirical relation: ${says.units}`;
    case 'regroup':
      return `Write ${quote(says.to)}, with dimensionless factors together`;
    case 'missing':
      return `Nothing here is in ${says.unit}${says.kinds.length > 0 ? ` (${says.kinds.join(' or ')})` : ''}, which this lacks`;
  }
}

function quote(code: string): string {
  const line = code.replace(/\s+/g, ' ');
  return `\`${line.length > longest ? `${line.slice(0, longest - 2)} …` : line}\``;
}
