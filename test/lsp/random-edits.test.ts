/** Random edits sent one by one: in the end the server holds the same text as the editor, and says what a fresh check says. */
import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Diagnostic } from 'vscode-languageserver/node.js';
import { rangeOf } from '../../server/src/lsp/positions.ts';
import { LineIndex } from '../../server/src/text/line-index.ts';
import { engine } from '../harness/engine.ts';
import { Client } from './client.ts';

/** A day's notes on a filter press, our own, with faults in it. */
const script = `"""Filter press: cake, cloth and pump."""
from math import pi, exp

mu = 1.1e-3   # [Pa s] viscosity of the filtrate
A = 4.5       # [m^2] cloth
R_m = 2.0e10  # [1/m] resistance of the cloth
alpha = 1.4e11  # [m/kg] of the cake
c = 35.0      # [kg/m^3] solids in the slurry


def flow(dp, V):
    """Filtrate flow.

    Parameters
    ----------
    dp : float
        Pressure drop [Pa]
    V : float
        Filtrate so far [m^3]

    Returns
    -------
    Q : float
        Flow [m^3/s]
    """
    R_c = alpha * c * V / A   # [1/m]
    return A * dp / (mu * (R_c + R_m))


def thickness(V, rho_s, eps):
    # V [m^3], rho_s [kg/m^3], eps [-]
    m = c * V              # [kg]
    return m / (rho_s * (1 - eps) * A)


class Press:
    def __init__(self, p, n):
        self.p = p   # [bar]
        self.n = n   # [-]

    def force(self):
        F = self.p * A     # [N]
        return F


dp = 3.0      # [bar]
t = 40.0      # [min]
Q = flow(dp, 0.2)
level = Q * t + A          # [m^3]
fade = exp(-t)
L = thickness(0.5, 2600.0, 0.45) + 12.0
`;

const pieces = [
  '', ' ', '\n', '\n\n', '#', '"', '"""', '(', ')', '[', ']', ':', '*', '/', '**2', ' + A', '# [Pa]', '# [kg/m^3]', '# [metrs]', 'x = p + h\n', 'def g(a, b):\n', '    return a + b\n', '  ', 'π', '𝑥', '\r\n', '\t', 'if A > 1:\n    ', 'V', '0.5', 'lambda q: q',
];

interface Edit {
  readonly at: number;
  readonly removed: number;
  readonly text: string;
}

const edit: fc.Arbitrary<Edit> = fc.record({
  at: fc.double({ min: 0, max: 1, noNaN: true }),
  removed: fc.oneof({ weight: 6, arbitrary: fc.nat(3) }, { weight: 2, arbitrary: fc.nat(40) }, { weight: 1, arbitrary: fc.nat(200) }),
  text: fc.oneof(fc.constantFrom(...pieces), fc.nat(script.length - 60).map((from) => script.slice(from, from + 50))),
});

/** Megabytes that the server may hold at the end beyond what it held after 200 edits: garbage that is not collected yet, and no more. */
const mostGrowth = 120;

const shape = (found: Diagnostic) => ({ code: found.code, range: found.range, message: found.message });

/** Sends edits, and compares with a fresh check after every twentieth. */
async function follow(edits: readonly Edit[], encoding: 'utf-8' | 'utf-16'): Promise<void> {
  const editor = await Client.start({ pull: true, encodings: [encoding] });
  try {
    let text = script;
    let slowest = 0;
    let early = 0;
    await editor.open('press.py', text);
    for (const [index, each] of edits.entries()) {
      // Half an astral character is no text: an edit there is widened as an editor would.
      let start = Math.round(each.at * text.length);
      let end = Math.min(start + each.removed, text.length);
      if (/[\uDC00-\uDFFF]/.test(text[start] ?? '')) start--;
      if (/[\uDC00-\uDFFF]/.test(text[end] ?? '')) end++;
      if (text[start - 1] === '\r' && text[start] === '\n') start--;
      if (text[end - 1] === '\r' && text[end] === '\n') end++;
      const inserted = each.text.replace(/^[\uDC00-\uDFFF]|[\uD800-\uDBFF]$/g, '');
      await editor.change('press.py', { range: rangeOf(LineIndex.of(text), { start, end }, encoding), text: inserted });
      text = text.slice(0, start) + inserted + text.slice(end);
      if (index % 20 !== 19) continue;
      const asked = performance.now();
      const report = await editor.pull('press.py');
      slowest = Math.max(slowest, performance.now() - asked);
      if (index === 199) early = editor.memory();
      const { findings } = (await engine()).check(`${editor.folder}/press.py`, text);
      const expected = findings.map(({ code, span, message }) => ({ code, range: rangeOf(LineIndex.of(text), span, encoding), message }));
      expect(report.kind === 'full' ? report.items.map(shape) : report.kind).toEqual(expected);
    }
    const late = editor.memory();
    // How late an answer comes depends on the machine, so it is told and not asserted.
    console.log(`${edits.length} edits: slowest answer ${slowest.toFixed(0)} ms, memory ${early.toFixed(0)} MB after 200 edits, ${late.toFixed(0)} MB at the end`);
    expect(late - early).toBeLessThan(mostGrowth);
  } finally {
    await editor.stop();
  }
}

test.each(['utf-16', 'utf-8'] as const)('1,000 edits in %s', async (encoding) => {
  await fc.assert(
    fc.asyncProperty(fc.array(edit, { minLength: 500, maxLength: 500 }), (edits) => follow(edits, encoding)),
    { numRuns: 2, endOnFailure: true },
  );
});
