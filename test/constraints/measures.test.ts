/** Numbers counted in units, and the literals that convert them: lines of Python in, the codes of their findings out. */
import { describe, expect, test } from 'vitest';
import { engine } from '../harness/engine.ts';

const workspace = await engine();

/** Codes of the errors and warnings of an assignment to a noted symbol. */
function codes(notes: Readonly<Record<string, string>>, expression: string, unit: string): string {
  const lines = Object.entries(notes).map(([name, note]) => `${name} = f()  # [${note}]`);
  const { findings } = workspace.check('line.py', [...lines, `y = ${expression}  # [${unit}]`, ''].join('\n'));
  return findings.filter((each) => each.severity === 'error' || each.severity === 'warning').map((each) => each.code).join(' ') || 'none';
}

describe('temperatures: conversions in any arrangement', () => {
  // Zeros and sizes of the scales: NIST SP 811, B.8
  const right: readonly (readonly [string, string, string])[] = [
    ['degC', 't + 273.15', 'K'], ['degC', '273.15 + t', 'K'], ['degC', 't + 273', 'K'], ['degC', 't - (-273.15)', 'K'],
    ['K', 't - 273.15', 'degC'], ['K', '-273.15 + t', 'degC'],
    ['degC', '1.8*t + 32', 'degF'], ['degC', '32 + t*1.8', 'degF'], ['degC', 't*9/5 + 32', 'degF'], ['degC', '(9/5)*t + 32.0', 'degF'], ['degC', 't/(5/9) + 32', 'degF'],
    ['degF', '(t - 32)/1.8', 'degC'], ['degF', '(t - 32)*5/9', 'degC'], ['degF', '5/9*(t - 32)', 'degC'], ['degF', '(t - 32.0)*(5.0/9.0)', 'degC'], ['degF', '0.5556*(t - 32)', 'degC'],
    ['degF', '(t - 32)/1.8 + 273.15', 'K'], ['degF', '(t + 459.67)/1.8', 'K'], ['degF', '(t + 459.67)*5/9', 'K'], ['degF', 't + 459.67', 'degR'], ['degF', 't + 460', 'degR'], ['degR', 't/1.8', 'K'], ['K', '1.8*t', 'degR'],
    ['K', '1.8*t - 459.67', 'degF'], ['K', '(t - 273.15)*1.8 + 32', 'degF'], ['degR', 't - 459.67', 'degF'],
  ];
  test.each(right)('%s: %s is %s', (unit, expression, target) => expect(codes({ t: unit }, expression, target)).toBe('none'));

  const wrong: readonly (readonly [string, string, string])[] = [
    ['degC', 't', 'K'], ['K', 't', 'degC'], ['degC', 't - 273.15', 'K'], ['degC', '1.8*t', 'degF'], ['degC', 't + 32', 'degF'], ['degF', '(t + 32)/1.8', 'degC'], ['degF', 't/1.8', 'degC'],
    ['degF', 't + 273.15', 'K'], ['degC', 't + 459.67', 'degR'], ['degF', 't', 'degC'], ['degR', 't', 'K'],
  ];
  test.each(wrong)('%s: %s is not %s', (unit, expression, target) => expect(codes({ t: unit }, expression, target)).toBe('scale-mismatch'));
});

describe('differences and means of points', () => {
  test.each([
    ['(a + b)/2', 'degC', 'none'], ['0.5*(a + b)', 'degC', 'none'], ['0.3*a + 0.7*b', 'degC', 'none'], ['a - b', 'K', 'none'], ['2*(a - b)', 'K', 'none'], ['(a + b)/2 + 273.15', 'K', 'none'], ['b + (a - b)*0.4', 'degC', 'none'],
    ['0.9*a', 'degC', 'none'], ['a + b', 'degC', 'offset-misuse'], ['a*b', 'K^2', 'offset-misuse'], ['1/a', '1/K', 'offset-misuse'], ['a**2', 'K^2', 'offset-misuse'],
  ])('%s in [%s]: %s', (expression, unit, expected) => expect(codes({ a: 'degC', b: 'degC' }, expression, unit)).toBe(expected));
});

describe('conversions by literals', () => {
  // Factors: NIST SP 811, appendix B
  test.each([
    ['kPa', 'x*1000', 'Pa'], ['kPa', '1e3*x', 'Pa'], ['kPa', 'x*10**3', 'Pa'], ['Pa', 'x/1e5', 'bar'], ['bar', 'x*1e5', 'Pa'], ['ft', 'x*0.3048', 'm'], ['m', 'x/0.3048', 'ft'], ['m', 'x*3.28084', 'ft'], ['m', 'x*3.281', 'ft'],
    ['lb', 'x*0.4536', 'kg'], ['psi', 'x*6894.76', 'Pa'], ['psi', 'x*144', 'lbf/ft^2'], ['gpm', 'x/448.83', 'ft^3/s'], ['gpm', 'x*0.002228', 'ft^3/s'], ['gpm', 'x*6.309e-5', 'm^3/s'], ['hp', 'x*745.7', 'W'], ['hp', 'x*550', 'ft lbf/s'],
    ['BTU', 'x*778.17', 'ft lbf'], ['BTU', 'x*1055.06', 'J'], ['BTU/h', 'x/3412', 'kW'], ['L/min', 'x/60000', 'm^3/s'], ['L/min', 'x/60/1000', 'm^3/s'], ['km/h', 'x/3.6', 'm/s'], ['kW h', 'x*3.6', 'MJ'], ['rpm', 'x/60', 'rev/s'], ['rpm', 'x/60', 'Hz'],
    ['rpm', '2*3.14159*x/60', 'rad/s'], ['rpm', 'x*0.10472', 'rad/s'], ['deg', 'x*3.14159/180', 'rad'], ['deg', 'x/57.2958', 'rad'], ['cP', 'x/1000', 'Pa s'], ['cSt', 'x*1e-6', 'm^2/s'], ['in', 'x/12', 'ft'], ['acre ft', 'x*43560', 'ft^3'], ['gal', 'x/7.48', 'ft^3'], ['d', 'x*86400', 's'], ['a', 'x*365', 'd'], ['a', 'x*8760', 'h'],
  ])('%s: %s is %s', (unit, expression, target) => expect(codes({ x: unit }, expression, target)).toBe('none'));

  test.each([
    ['kPa', 'x/1000', 'Pa'], ['kPa', 'x*100', 'Pa'], ['ft', 'x/0.3048', 'm'], ['ft', 'x*0.3', 'm'], ['psi', 'x*12', 'lbf/ft^2'], ['gpm', 'x/60', 'ft^3/s'], ['hp', 'x*735.5', 'W'], ['L/min', 'x/60', 'm^3/s'], ['km/h', 'x*3.6', 'm/s'], ['rpm', 'x/60', 'rad/s'], ['deg', 'x', 'rad'], ['cSt', 'x*1e-3', 'm^2/s'], ['h', 'x*60', 's'],
  ])('%s: %s is not %s', (unit, expression, target) => expect(codes({ x: unit }, expression, target)).toBe('scale-mismatch'));
});

describe('the message names the one conversion that is missing', () => {
  const message = (notes: string, expression: string, unit: string): string =>
    workspace.check('line.py', `${notes}\ny = ${expression}  # [${unit}]\n`).findings.find((each) => each.code === 'scale-mismatch')?.message ?? 'none';

  test.each([
    ['q = f()  # [m^3/h]\ndp = f()  # [Pa]', 'q*dp/1000', 'kW', 'by 1/3600'],
    ['q = f()  # [gpm]\nh = f()  # [ft]\nw = f()  # [lbf/ft^3]', 'w*q/448.83*h', 'hp', 'by 1/550'],
    ['a = f()  # [ft]\nd = f()  # [in]', 'a - d/2', 'ft', 'Multiply `a` by 12 or `d/2` by 1/12'],
    ['F = f()  # [lbf]\nA = f()  # [in^2]', 'F/A', 'lbf/ft^2', 'by 144'],
    ['n = f()  # [rpm]', 'n/60', 'rad/s', 'by 2*pi'],
  ])('%s; %s', (notes, expression, unit, words) => expect(message(notes, expression, unit)).toContain(words));
});
