import fc from 'fast-check';
import { evaluate as mathEvaluate, type Unit } from 'mathjs';
import { describe, expect, test } from 'vitest';
import { evaluateFormulas } from '../../../server/src/notes/nomenclature/evaluate.ts';
import { read, valueOf } from './helpers.ts';

/** A paint mixer; the numbers of this file are worked by hand beside each case. */
const bench = `
N    [rev/s]   = 5       shaft speed
D    [m]       = 0.085   impeller diameter
rho  [kg/m^3]  = 1240
mu   [Pa s]    = 0.38
Np   [-]       = 1.3     power number
T1   [degC]    = 20
T2   [degC]    = 30
T_K  [K]       = 293.15
dT   [K]       = 10
p_g  [barg]    = 4
p_at [bar]     = 1.013
dp   [kPa]     = 50
m    [kg/s]    = 0.5
c    [kJ/(kg K)] = 4.18
n    [rpm]     = 60
lat  [deg]     = 30
eta  [%]       = 75
L    [dB]      = 3
nothing [m]
`;

const check = (formula: string): Promise<string> => valueOf(`${bench}y ${formula}`);

describe('values in the units declared', () => {
  test.each([
    // 1240 · 5 · 0.085² / 0.38 = 44.795 / 0.38
    ['[1] = rho*N*D^2/mu', '117.882 1'],
    // 1.3 · 1240 · 5³ · 0.085⁵ = 201 500 · 4.43705e-6 W
    ['[mW] = Np*rho*N^3*D^5', '894.066 mW'],
    // 0.5 kg/s · 4.18 kJ/(kg K) · 10 K
    ['[kW] = m*c*(T2 - T1)', '20.9 kW'],
    ['[kW] = m*c*dT', '20.9 kW'],
    // without a unit: the coherent one
    ['= m*c*dT', '20900 W'],
    ['= 2*3^2 - 1', '17 1'],
    ['[1] = 7 - 2*pi', '0.716815 1'],
    // 0.085 m = 85 mm; a bare number beside it is read in its unit: 0.085 + 0.015 m
    ['[mm] = D', '85 mm'],
    ['[mm] = D + 0.015', '100 mm'],
    // 3² + 4² = 5²
    ['[1] = hypot(3, 4)', '5 1'],
    ['[cm] = max(D, 0.1)', '10 cm'],
    ['[cm] = min(D, 0.1, 3*D)', '8.5 cm'],
    // sin 30° = 1/2; 90° - 30°; arctan 1 = 45°
    ['[1] = sin(lat)', '0.5 1'],
    ['[deg] = 90 - lat', '60 deg'],
    ['[deg] = atan(1)', '45 deg'],
    ['[deg] = atan2(D, D)', '45 deg'],
    // ln e² = 2; lg 1000 = 3; lb 8 = 3
    ['[1] = ln(exp(2)) + lg(1000) + lb(8)', '8 1'],
    // 1 - 75 % = 25 %
    ['[%] = 1 - eta', '25 %'],
    ['[1] = (-8)^(1/3) + cbrt(27)', '1 1'],
    ['[1] = erf(0) + erfc(0) + abs(-2)', '3 1'],
    // 0.085^1.5
    ['= D^1.5/(1*D^1.5)', '1 1'],
  ])('%s', async (formula, value) => {
    expect(await check(formula)).toBe(value);
  });

  test('formulas in formulas, in any order', async () => {
    // 2 · (3 + 1) = 8
    expect(await valueOf('y [mm] = 2*b\nb [cm] = a + 0.01\na [m] = 0.03')).toBe('80 mm');
  });

  test('an exponent that is a symbol without a unit', async () => {
    expect(await valueOf('k [-] = 3\nD [m] = 2\ny [m^3] = D^k')).toBe('8 m^3');
  });

  test('units of the file', async () => {
    expect(await valueOf('unit crate = 18.5 kg\nn [crate] = 3\ny [kg] = n')).toBe('55.5 kg');
  });
});

describe('temperatures, gauge pressures, rotation', () => {
  test.each([
    ['[degC] = (T1 + T2)/2', '25 degC'],
    ['[degC] = T2 - T1', '10 degC'],
    ['[degC] = T1 + dT', '30 degC'],
    ['[degC] = T1 + 5', '25 degC'],
    ['[K] = T1', '293.15 K'],
    ['[K] = T1 + 273.15', '293.15 K'],
    // a script that writes 273 is followed to the digit
    ['[K] = T1 + 273', '293 K'],
    ['[degC] = T_K - 273.15', '20 degC'],
    // 20 °C = 20 · 1.8 + 32 °F
    ['[degF] = T1', '68 degF'],
    ['[degC] = T_K', '20 degC'],
    ['[degC] = max(T1, 25)', '25 degC'],
    ['[bar] = p_g + p_at', '5.013 bar'],
    // 4 bar - 50 kPa, still counted from the atmosphere
    ['[barg] = p_g - dp', '3.5 barg'],
    // 2π · 60 rev/min = 2π rad/s
    ['[rad/s] = 2*pi*n', '6.28319 rad/s'],
    ['[Hz] = n', '1 Hz'],
    // 2π/s · 0.085 m
    ['[m/s] = 2*pi*n*D', '0.534071 m/s'],
  ])('%s', async (formula, value) => {
    expect(await check(formula)).toBe(value);
  });

  test.each([
    ['[degC] = T1 + T2', 'offset'],
    ['[K] = 2*T1', 'offset'],
    ['[J] = m*c*T1', 'offset'],
    ['[degC] = m*c*dT/(m*c)', 'offset'],
    ['[degC] = T_K - dT', 'offset'],
    ['[bar] = p_g', 'offset'],
    ['[barg] = p_at', 'offset'],
    ['[rad/s] = n', 'rotation'],
  ])('refused: %s', async (formula, kind) => {
    expect(await check(formula)).toContain(`none: ${kind}`);
  });
});

describe('what has no value says why and where', () => {
  test.each([
    ['[m] = D + m', 'none: unlike at D + m'],
    ['[m] = N*D', 'none: unlike at N*D'],
    ['[m] = D*(rho + mu)', 'none: unlike at rho + mu'],
    ['[1] = sin(D)', 'none: unlike at sin(D)'],
    ['[m] = D^D', 'none: exponent at D'],
    ['[m] = nothing', 'none: no-value at nothing'],
    ['[m] = D*unheard', 'none: unknown-symbol at unheard'],
    ['[m] = f(D)', 'none: unknown-function at f(D)'],
    ['[1] = constructor(2)', 'none: unknown-function at constructor(2)'],
    ['[1] = sin(1, 2)', 'none: unknown-function at sin(1, 2)'],
    ['[1] = 1/0', 'none: undefined at 1/0'],
    ['[1] = 1/(N - N)', 'none: unlike at 1/(N - N)'],
    ['[s] = 1/(N - N)', 'none: undefined at 1/(N - N)'],
    ['[1] = ln(0)', 'none: undefined at ln(0)'],
    ['[1] = sqrt(-4)', 'none: undefined at sqrt(-4)'],
    ['[1] = (-8)^0.5', 'none: undefined at (-8)^0.5'],
    ['[1] = asin(2)', 'none: undefined at asin(2)'],
    ['[1] = exp(1000)', 'none: undefined at exp(1000)'],
    ['[1] = L', 'none: no-unit at L'],
    ['[metrs] = D', 'none: no-unit at metrs'],
    ['[m] = y', 'none: circle at y'],
  ])('%s', async (formula, reason) => {
    expect(await check(formula)).toBe(reason);
  });

  test('a circle through others', async () => {
    expect(await valueOf('a [m] = b\nb [m] = y\ny [m] = a')).toContain('none: circle');
  });

  test('a long chain ends in a reason', async () => {
    const lines = Array.from({ length: 2000 }, (_, at) => `a${at + 1} [m] = a${at} + a${at}`);
    expect(await valueOf(`${lines.reverse().join('\n')}\na0 [m] = 1`, 'a2000')).toContain('too-long');
  });
});

describe('against mathjs and its units', () => {
  test.each([
    ['998.2 kg/m^3 * 9.81 m/s^2 * 60 m^3/hour * 20 m / 0.72', 'kW', 'rho [kg/m^3] = 998.2\ng [m/s^2] = 9.81\nQ [m^3/h] = 60\nH [m] = 20\neta [-] = 0.72\ny [kW] = rho*g*Q*H/eta'],
    ['0.5 * 1.2 kg/m^3 * (72 km/hour)^2', 'Pa', 'rho [kg/m^3] = 1.2\nv [km/h] = 72\ny [Pa] = 0.5*rho*v^2'],
    ['sqrt(2 * 9.81 m/s^2 * 12 ft)', 'm/s', 'g [m/s^2] = 9.81\nh [ft] = 12\ny [m/s] = sqrt(2*g*h)'],
    ['4 in * 3 lbf', 'N m', 'a [in] = 4\nF [lbf] = 3\ny [N m] = a*F'],
    ['pi / 4 * (52.5 mm)^2 * 1.4 m/s', 'L/minute', 'D [mm] = 52.5\nv [m/s] = 1.4\ny [L/min] = pi/4*D^2*v'],
  ])('%s in %s', async (expression, unit, text) => {
    const expected = (mathEvaluate(expression) as Unit).toNumber(unit);
    expect(Number.parseFloat(await valueOf(text))).toBeCloseTo(expected, 4 - Math.floor(Math.log10(expected)));
  });
});

test('never throws: every formula has a finite value, a range in order, or a reason', async () => {
  const piece = fc.constantFrom('D', 'T1', 'p_g', 'n', 'eta', 'y', 'z', 'pi', '2', '0.5', '64', '1e300', '0', '273.15', '+', '-', '*', '/', '^', '^', '(', ')', 'sqrt(', 'ln(', 'max(', 'atan2(', ', ');
  const unit = fc.constantFrom('[m]', '[1]', '[degC]', '[K]', '[barg]', '[rad/s]', '[dB]', '');
  const line = fc.tuple(unit, fc.array(piece, { minLength: 1, maxLength: 12 })).map(([own, pieces]) => `${own} = ${pieces.join('')}`);
  await fc.assert(fc.asyncProperty(line, line, fc.boolean(), async (y, z, ranged) => {
    const text = `${ranged ? bench.replace('= 0.085', '0.05 .. 0.1') : bench}y ${y}\nz ${z}`;
    for (const result of (await evaluateFormulas(read(text))).values()) {
      if (result.kind === 'value') expect(Number.isFinite(result.value)).toBe(true);
      if (result.kind === 'range') expect(result.low <= result.high && Number.isFinite(result.low) && Number.isFinite(result.high)).toBe(true);
      if (result.kind === 'none') expect(result.reason.span.end <= text.length).toBe(true);
    }
  }), { numRuns: 600 });
});

test('a tower of powers is refused or evaluated at once', async () => {
  expect(await check('[1] = ((2^64)^64)^64')).toBe('none: undefined at (2^64)^64');
});
