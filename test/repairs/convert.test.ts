/** Factors: SI Brochure (9th ed.), tables 8 and 5; NIST SP 811 B.8 for °F. The offsets of °C and °F are exact by definition there. */
import { expect, test } from 'vitest';
import { becomes, codesOf, fixed, offers } from './offers.ts';

const given = `import math
p_in = 2.0      # [kPa]
p_out = 150.0   # [Pa]
a = 30.0        # [deg]
L = 12.0        # [mm]
H = 3.0         # [m]
N = 900.0       # [rpm]
T = 21.0        # [degC]
TF = 70.0       # [degF]
t = 3.0         # [h]
`;

test.each([
  ['dp = p_in - p_out  # [Pa]', ['proven: dp = p_in*1000 - p_out  # [Pa]']],
  ['dp = p_in - p_out  # [kPa]', ['proven: dp = p_in - p_out/1000  # [kPa]']],
  ['dp = p_in - p_out', ['likely: dp = p_in*1000 - p_out', 'likely: dp = p_in - p_out/1000']],
  ['s = math.sin(a)', ['proven: s = math.sin(math.radians(a))']],
  ['s = math.sin(2*a + a)', ['proven: s = math.sin(math.radians(2*a + a))']],
  ['tall = L > H', ['proven: tall = L/1000 > H', 'proven: tall = L > H*1000']],
  ['A = L * H  # [m^2]', ['proven: A = L * H / 1000  # [m^2]']],
  ['w = N  # [rad/s]', ['proven: w = N*2*math.pi/60  # [rad/s]', 'choice: w = N  # [rpm]']],
  ['TK = T  # [K]', ['proven: TK = T + 273.15  # [K]', 'choice: TK = T  # [degC]']],
  ['TK = TF  # [K]', ['proven: TK = (TF + 459.67)*5/9  # [K]', 'choice: TK = TF  # [degF]']],
  ['TC = TF  # [degC]', ['proven: TC = (TF - 32)*5/9  # [degC]', 'choice: TC = TF  # [degF]']],
  ['s = 2*t  # [s]', ['likely: s = 2*t*3600  # [s]']],
])('%s', (line, expected) => {
  const text = given + line;
  expect(becomes(text, ['convert', 'note'])).toEqual(expected);
  for (const fix of offers(text, ['convert', 'note'])) expect(codesOf(fixed(text, fix))).not.toContain('scale-mismatch');
});

test('a comparison is proven either way, a sum without a target is not', () => {
  expect(offers(`${given}x = L + H`, ['convert']).map((fix) => fix.confidence)).toEqual(['likely', 'likely']);
});

test('numpy is used where it is imported, a factor where nothing is', () => {
  const line = 'a = 30.0  # [deg]\n';
  expect(becomes(`import numpy as np\n${line}s = np.sin(a)`)[0]).toBe('proven: s = np.sin(np.radians(a))');
  expect(becomes(`from math import sin, radians\n${line}s = sin(a)`)[0]).toBe('proven: s = sin(radians(a))');
  expect(becomes(`from math import sin\n${line}s = sin(a)`)[0]).toBe('proven: s = sin(a*3.141592653589793/180)');
});

test('not offered where the units are converted or unknown', () => {
  for (const line of ['dp = p_in*1000 - p_out  # [Pa]', 's = math.sin(math.radians(a))', 'TK = T + 273.15  # [K]', 'dp = p_in - unknown  # [Pa]']) {
    expect(offers(given + line)).toEqual([]);
  }
});

test('a factor that is almost right is changed by what is missing, and never called proven', () => {
  const fixes = offers('rho = 1000.0  # [kg/m^3]\nV = 2.0  # [m/s]\np = 0.5*rho*V**2/100  # [kPa]', ['convert']);
  expect(fixes.map((fix) => fix.confidence)).not.toContain('proven');
});

test('a speed in rpm in a power is not proven: only the formula tells revolutions from radians', () => {
  const text = 'M = f()  # [N m]\nn = f()  # [rpm]\nP = M*n  # [W]\n';
  expect(offers(text, ['convert']).map((fix) => fix.confidence)).not.toContain('proven');
});
