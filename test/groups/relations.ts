/** Relations as text: one symbol a line, `name : M L^-1 T^-2 ; description`, the dependent symbol first. */
import type { Relation, RelationSymbol } from '../../server/src/groups/types.ts';
import { Dimension } from '../../server/src/quantities/dimension.ts';
import { Rational } from '../../server/src/quantities/rational.ts';

/** Usual quantities by a short word, so that tables of relations stay readable. */
export const dimensions: Readonly<Record<string, string>> = {
  length: 'L', area: 'L^2', volume: 'L^3', time: 'T', rate: 'T^-1', mass: 'M', speed: 'L T^-1', acceleration: 'L T^-2', flow: 'L^3 T^-1', massflow: 'M T^-1',
  density: 'M L^-3', viscosity: 'M L^-1 T^-1', diffusivity: 'L^2 T^-1', pressure: 'M L^-1 T^-2', force: 'M L T^-2', energy: 'M L^2 T^-2', power: 'M L^2 T^-3',
  tension: 'M T^-2', stiffness: 'M T^-2', temperature: 'Θ', heat: 'L^2 T^-2 Θ^-1', conductivity: 'M L T^-3 Θ^-1', film: 'M T^-3 Θ^-1', expansion: 'Θ^-1', flux: 'M T^-3',
  number: '1', secondmoment: 'L^4', gradient: 'M L^-2 T^-2', specific: 'L^2 T^-2', current: 'I', charge: 'I T', voltage: 'M L^2 T^-3 I^-1', resistance: 'M L^2 T^-3 I^-2',
  capacitance: 'M^-1 L^-2 T^4 I^2', inductance: 'M L^2 T^-2 I^-2', field: 'M T^-2 I^-1', sigma: 'M^-1 L^-3 T^3 I^2', concentration: 'N L^-3', inertia: 'M L^2',
};

/** A dimension from a word of `dimensions` or from powers of base dimensions; `?` is unknown. */
export function dimension(text: string): Dimension | undefined {
  if (text === '?') return undefined;
  const powers = dimensions[text] ?? text;
  if (powers === '1') return Dimension.one;
  return Dimension.from(
    powers.split(' ').map((part) => {
      const [base, power = '1'] = part.split('^');
      return [base as string, Rational.parse(power) as Rational] as const;
    }),
  );
}

/** `P power; N rate shaft speed; rho density` with the dependent symbol first. */
export function relation(text: string): Relation {
  const symbols = text.split(/[;\n]/).map((line) => line.trim()).filter(Boolean).map(symbolOf);
  return { dependent: symbols[0]?.name, symbols };
}

/** Powers of base dimensions stand in brackets: `eta [M L^-1 T^-1] viscosity`. */
function symbolOf(line: string): RelationSymbol {
  const [, name, powers, word, description] = /^(\S+) (?:\[([^\]]*)\]|(\S+)) ?(.*)$/.exec(line) as RegExpExecArray;
  return { name: name as string, dimension: dimension((powers ?? word) as string), ...(description ? { description } : {}) };
}
