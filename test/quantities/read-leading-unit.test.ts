import { describe, expect, it } from 'vitest';
import { readLeadingUnit } from '../../server/src/quantities/parse-unit.ts';

/** The unit marked off by `|` in front of the rest. */
function leading(comment: string): string {
  const found = readLeadingUnit(comment);
  return found ? `${comment.slice(0, found.end)}|${comment.slice(found.end)}` : comment;
}

describe('the unit that a comment begins with', () => {
  it.each([
    'kg/m^3|', 'W/m.K| wall conductivity', 'kg/m^3|, density', 'm2| - area', 'm²|, surface of the tank', 'W/(m·K)| concrete', 'kg/s| mass flow', 'kg m-3| density of the paint', 'deg C| inlet', '°C|, indoor temperature', 'J/kg K| heat capacity', 'm2| a wall', 'm/s| in the pipe', 'K/W| (wall)',
    'kg/m3|: density', '10^-6 m^2/s| viscosity', '% |of total'.replace('% |', '%| '), 'psi gauge| at the pump', 'W⋅m⁻²⋅K⁻⁴| of the radiator', '1/s| decay', 'seconds| since start', 'Pa| at inlet', 'rad|, angle', 'kPa or psi|', 'm/s|; upward',
  ])('%s', (marked) => {
    expect(leading(marked.replace('|', ''))).toBe(marked);
  });

  it('may be a doubtful one where it is the whole comment', () => {
    for (const comment of ['m', 's', 'K', 'h', '1', 'bar']) {
      expect(leading(comment)).toBe(`${comment}|`);
      expect(readLeadingUnit(comment)?.beyondDoubt).toBe(false);
    }
  });

  it.each(['m, length', 'a wall', 'in the loop', 'min value', 'time in s', 'controller gain', 'm = 3', 'mm to m', 'feet to metres', 'kB * T / q', '1000 kg/m^3 at first', '20 C outside', 'v2, i2 of the curve', 'set by the caller', 'not m/s', 'hours - shift = (a - b)', 'I or V'])('is none in: %s', (comment) => {
    expect(leading(comment)).toBe(comment);
  });
});
