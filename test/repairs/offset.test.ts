/** 0 °C is 273.15 K: SI Brochure 2.3.1; 0 °F is 459.67 °R: NIST SP 811 B.8; 101 325 Pa: ISO 2533. */
import { expect, test } from 'vitest';
import { becomes, codesOf, fixed, offers } from './offers.ts';

const given = `R = 287.05      # [J/(kg K)]
sigma = 5.67e-8 # [W/(m^2 K^4)]
p = 1.0e5       # [Pa]
T = 21.0        # [degC]
TF = 70.0       # [degF]
pg = 3e5        # [Pa(g)]
T_abs = 300.0   # [K]
`;

test.each([
  ['rho = p/(R*T)  # [kg/m^3]', ['likely: rho = p/(R*(T + 273.15))  # [kg/m^3]']],
  ['q = sigma*T**4  # [W/m^2]', ['likely: q = sigma*(T + 273.15)**4  # [W/m^2]']],
  ['rho = p/(R*TF)  # [kg/m^3]', ['likely: rho = p/(R*((TF + 459.67)/1.8))  # [kg/m^3]']],
  ['rho = pg/(R*T_abs)  # [kg/m^3]', ['choice: rho = (pg + 101325)/(R*T_abs)  # [kg/m^3]']],
  ['p_atm = 1e5  # [Pa]\nrho = pg/(R*T_abs)  # [kg/m^3]', ['likely: rho = (pg + p_atm)/(R*T_abs)  # [kg/m^3]', 'choice: rho = (pg + 101325)/(R*T_abs)  # [kg/m^3]']],
  ['T2 = 15.0  # [degC]\nTm = T + T2  # [degC]', ['choice: Tm = (T + T2)/2  # [degC]']],
])('%s', (line, expected) => {
  const text = given + line;
  expect(becomes(text, ['offset'])).toEqual(expected);
  for (const fix of offers(text, ['offset'])) expect(codesOf(fixed(text, fix))).not.toContain('offset-misuse');
});

test('a difference is offered where another point of the scale is in scope', () => {
  const text = 'cp = 4186.0  # [J/(kg K)]\nT = 21.0  # [degC]\nT_ref = 15.0  # [degC]\nx = T**0.5';
  expect(becomes(text, ['offset'])).toEqual(['likely: x = (T + 273.15)**0.5', 'choice: x = (T - T_ref)**0.5']);
});

test('not offered for absolute temperatures and pressures, nor for differences', () => {
  for (const line of ['rho = p/(R*T_abs)  # [kg/m^3]', 'q = sigma*(T + 273.15)**4  # [W/m^2]', 'dT = T - T_abs + 273.15']) expect(offers(given + line)).toEqual([]);
});
