import { describe, expect, test } from 'vitest';
import { notesOf, problemsOf, spansOf, unitsOf } from './helpers.ts';

/** A function with this documentation, indented as in a script. */
function documented(lines: readonly string[], params = 'V, D, T=20.0, method="a"'): string {
  return [`def f(${params}):`, '    """Mean flow.', '', ...lines.map((line) => (line === '' ? '' : `    ${line}`)), '    """', '    return V'].join('\n');
}

const parameters = (...lines: string[]): string => documented(['Parameters', '----------', ...lines]);
const returns = (...lines: string[]): string => documented(['Returns', '-------', ...lines]);

describe('numpydoc parameters', () => {
  test.each<[string, string[], string]>([
    ['bracket in the description', ['V : float', '    Mean velocity [m/s]'], 'f(V): m/s (documentation) "Mean velocity"'],
    ['bracket behind a comma', ['V : float', '    Mean velocity, [m/s]'], 'f(V): m/s (documentation) "Mean velocity"'],
    ['bracket on a line of its own', ['V : float', '    Mean velocity of the flow.', '    [m/s]'], 'f(V): m/s (documentation) "Mean velocity of the flow"'],
    ['bracket in the type', ['V : float [m/s]', '    Mean velocity'], 'f(V): m/s (documentation) "float"'],
    ['bracket in front of sentences', ['V : float', '    Mean velocity [m/s]. At 20 [degC] it is steady.'], 'f(V): m/s (documentation) "Mean velocity. At 20 [degC] it is steady"'],
    ['no type', ['V', '    Mean velocity [m/s]'], 'f(V): m/s (documentation) "Mean velocity"'],
    ['no blank before the colon', ['V: float', '    Mean velocity [m/s]'], 'f(V): m/s (documentation) "Mean velocity"'],
    ['several names', ['V, D : float', '    Lengths of the sides [m]'], 'f(V): m (documentation) "Lengths of the sides"|f(D): m (documentation) "Lengths of the sides"'],
    ['dimensionless', ['V : float', '    Friction factor [-]'], 'f(V): - (documentation) "Friction factor"'],
    ['one', ['V : float', '    Friction factor, [1]'], 'f(V): 1 (documentation) "Friction factor"'],
    ['empty', ['V : float', '    Prandtl number []'], 'f(V): 1 (documentation) "Prandtl number"'],
    ['a symbol in front of its unit', ['V : float', '    Power (:math:`P`) [:math:`kPa`]'], 'f(V): :math:`kPa` (documentation) "Power (:math:`P`)"'],
    ['a numbered stream', ['T : float', '    Temperature of stream 1 [K]'], 'f(T): K (documentation) "Temperature of stream 1"'],
    ['a default', ['T : float, optional', '    Temperature, default is 298 [K]'], 'f(T): K (documentation) "Temperature, default is 298"'],
    ['inches behind words', ['D : float', '    Bore [in]'], 'f(D): in (documentation) "Bore"'],
    ['Celsius by its name', ['T : float', '    Temperature of the cell [C]'], 'f(T): C (documentation) "Temperature of the cell"'],
    ['a range behind the bracket', ['T : float', '    Temperature [degC] 5 .. 60'], 'f(T): degC 5..60 (documentation) "Temperature"'],
    ['a role in front', ['V : numeric', '    Speed. See :term:`wind_speed`. [ms⁻¹]'], 'f(V): ms⁻¹ (documentation) "Speed. See :term:`wind_speed`"'],
    ['parentheses', ['V : float', '    Mean velocity (m/s)'], 'f(V): m/s (documentation) "Mean velocity"'],
    ['a letter in parentheses at the end', ['D : float', '    Height of the rows, at their centre (m)'], 'f(D): m (documentation) "Height of the rows, at their centre"'],
    ['the type names it', ['V : float, m/s', '    Mean velocity'], 'f(V): m/s (documentation) "float"'],
    ['the type names one symbol', ['D : array-like, m', '    Depth'], 'f(D): m (documentation) "array-like"'],
    ['the type names a quotient', ['D : array-like, J/(kg (g/kg)^2)', '    Derivative'], 'f(D): J/(kg (g/kg)^2) (documentation) "array-like"'],
    ['behind the last comma', ['T : array-like', '    In-situ temperature (ITS-90), degrees C'], 'f(T): degrees C (documentation) "In-situ temperature (ITS-90)"'],
    ['behind the last comma, one symbol', ['D : array-like', '    Depth, positive up, m'], 'f(D): m (documentation) "Depth, positive up"'],
    ['in words', ['D : float', '    Length in cubic metres per second, positive.'], 'f(D): cubic metres per second (documentation) "Length, positive"'],
    ['in words before more words', ['D : float', '    Time in seconds to wait for the pump'], 'f(D): seconds (documentation) "Time to wait for the pump"'],
    ['in words over a line break', ['D : float', '    Angle between the planes in', '    degrees.'], 'f(D): degrees (documentation) "Angle between the planes"'],
    ['in units of', ['D : float', '    Gap in units of eV.'], 'f(D): eV (documentation) "Gap"'],
    ['units:', ['D : float', '    Gap. Units: m/s.'], 'f(D): m/s (documentation) "Gap"'],
    ['a sentence of its own, then a remark', ['D : array', '    Squared frequency, 1/s^2. (Frequency N is in radians per second.)'], 'f(D): 1/s^2 (documentation) "Squared frequency. (Frequency N is in radians per second.)"'],
    ['two systems', ['T : float', '    Dry bulb temperature in °F [IP] or °C [SI]'], 'f(T): °F or °C (scale unknown) (documentation) "Dry bulb temperature in"'],
    ['two systems, unclosed', ['T : float', '    Enthalpy in Btu/lb [IP] or J/kg'], 'f(T): Btu/lb or J/kg (scale unknown) (documentation) "Enthalpy in"'],
    ['a value in prose beside it', ['T : float', '    Temperature [K], above 273.15 [K]'], 'f(T): K (documentation) "Temperature, above 273.15 [K]"'],
    ['a float that may be a frame', ['V : float or DataFrame', '    Speed [m/s]'], 'f(V): m/s (documentation) "Speed"'],
  ])('%s', (_what, lines, expected) => {
    expect(notesOf(parameters(...lines)).join('|')).toBe(expected);
  });

  test.each<[string, string[]]>([
    ['a name that is no parameter', ['W : float', '    Power [W]']],
    ['a name that is a unit', ['V : float', '    Voltage of the cell']],
    ['a citation', ['V : float', '    Velocity after [1]_ and [2]']],
    ['a citation in words', ['V : float', '    Velocity, see [1]']],
    ['a footnote', ['V : float', '    Velocity given several times. [1]']],
    ['a shape', ['V : array', '    Speeds [n x 3]']],
    ['a range', ['V : float', '    Fraction in [0, 1]']],
    ['options', ['method : str', "    One of ['a', 'b'] [optional]"]],
    ['a direction', ['V : float', '    [in] the speed']],
    ['a conversion', ['V : float', '    Factor from [m] to [mm]']],
    ['a text', ['method : str', '    Name of the method, [-]']],
    ['a truth value', ['method : bool', '    Whether the pipe is closed, [-]']],
    ['two quantities', ['V : float', '    Amount in [kg] or [mol]']],
    ['prose with a value', ['V : float', '    Valid above 25 [degC]']],
    ['a value in parentheses', ['V : float', '    Two thousandths (2 mm) by default']],
    ['a series in parentheses', ['V : array', '    The coefficients (k1-k6)']],
    ['a mark in code', ['V : float', '    As in ``x[m]`` or `[m]`']],
    ['in with an article', ['V : float', '    Number in a row of tubes']],
    ['fractions', ['V : float', '    Composition in mol fraction']],
    ['a choice in the type', ['V : int, {60, 10, 30}', '    Step']],
    ['types in a row', ['V : numeric, array, date', '    Step']],
    ['a column of a frame', ['V : DataFrame', '    Table with columns t [s] and T [K]']],
    ['a list of letters', ['V : float', '    The constants a, b, m']],
    ['a label of quantity and unit', ['V : float', '    Time, t / s.']],
    ['a glued index', ['V : float', '    The row u[m] of the table']],
  ])('%s is no note', (_what, lines) => {
    expect(unitsOf(parameters(...lines))).toBe('none');
    expect(problemsOf(parameters(...lines))).toEqual([]);
  });

  test('a failed unit is reported where a note would count', () => {
    expect(problemsOf(parameters('V : float', '    Velocity [m/s^^2]'))).toEqual(['m/s^^2']);
    expect(problemsOf(parameters('W : float', '    Velocity [m/s^^2]'))).toEqual([]);
    expect(problemsOf(documented(['Notes', '-----', 'In [m/s^^2] as printed.']))).toEqual([]);
  });

  test('[1] is a citation where references are numbered', () => {
    const lines = ['Parameters', '----------', 'V : float', '    Friction factor [1]', '', 'References', '----------'];
    expect(unitsOf(documented([...lines, '.. [1] Handbook of pipes, 2nd ed.']))).toBe('none');
    expect(unitsOf(documented([...lines, 'Handbook of pipes, 2nd ed.']))).toBe('f(V) 1');
  });
});

describe('numpydoc results', () => {
  test.each<[string, string[], string]>([
    ['named', ['dp : float', '    Pressure drop [Pa]'], 'f -> dp Pa'],
    ['unnamed', ['float', '    Pressure drop [Pa]'], 'f -> Pa'],
    ['prose', ['The pressure drop over', 'the whole pipe [Pa]'], 'f -> Pa'],
    ['several', ['dp : float', '    Pressure drop [Pa]', 'V : float', '    Velocity [m/s]'], 'f -> 0 dp Pa; f -> 1 V m/s'],
    ['several, one silent', ['n : int', '    Number of steps', 'V : float', '    Velocity [m/s]'], 'f -> 1 V m/s'],
    ['names in one line', ['a, b : float', '    Lengths [m]'], 'f -> 0 a m; f -> 1 b m'],
    ['type with unit', ['dp : array-like, 1/K', '    expansion'], 'f -> dp 1/K'],
    ['an introduction in front', ['Tuple of the following results:', '', 'dp : float', '    Pressure drop [Pa]', 'V : float', '    Velocity [m/s]'], 'f -> 0 dp Pa; f -> 1 V m/s'],
    ['one entry for a whole tuple', ['tuple', '    currents [A], voltages [V], power [W]'], 'none'],
    ['values in words', ['numeric, values in degrees C.'], 'f -> degrees C'],
    ['a record', ['out : dict', '    * a : length, [m]'], 'none'],
  ])('%s', (_what, lines, expected) => {
    expect(unitsOf(returns(...lines))).toBe(expected);
  });
});

test('keys of a returned record', () => {
  const doc = ['    """Sums.', '', '    Returns', '    -------', '    out : dict', '        * Q : Heat flow through', '          the wall, [W]', '        * Cr : Ratio, [-]', '        * W : Width, [m]', '    """'].join('\n');
  expect(unitsOf(`def f(x):\n${doc}\n    return {'Q': x, 'Cr': 2 * x}`)).toBe('{Q} W; {Cr} -');
  expect(unitsOf(`def f(x):\n${doc}\n    out = {'Q': x}\n    if x:\n        return out\n    return None`)).toBe('{Q} W');
  expect(unitsOf(`def f(x):\n${doc}\n    return dict(Q=x)`)).toBe('{Q} W');
});

describe('other styles', () => {
  test('Google', () => {
    const lines = ['Args:', '    V (float): Mean velocity [m/s]', '    D: Bore in mm,', '        inside.', '    T : Dry bulb temperature in °F [IP] or °C [SI]', '', 'Returns:', '    Pressure drop over the', '    pipe [Pa]', '', 'Raises:', '    ValueError: below 0 [K]'];
    expect(unitsOf(documented(lines))).toBe('f(V) m/s; f(D) mm; f(T) °F or °C (scale unknown); f -> Pa');
    expect(unitsOf(documented(['Returns:', '    float: Pressure drop [Pa]']))).toBe('f -> Pa');
    expect(unitsOf(documented(['Returns:', '    dp: Pressure drop [Pa]', '    V: Velocity [m/s]']))).toBe('f -> 0 dp Pa; f -> 1 V m/s');
    expect(unitsOf(documented(['Args:', '    V [m/s]: Mean velocity']))).toBe('f(V) m/s');
  });

  test('field lists', () => {
    expect(unitsOf(documented([':param V: mean velocity [m/s]', ':param float D: bore, measured', '    inside [mm]', ':type T: float, degC', ':param T: temperature of the air', ':returns: pressure drop [Pa]', ':raises ValueError: below 0 [K]']))).toBe('f(V) m/s; f(D) mm; f(T) degC; f -> Pa');
  });

  test('plain lists', () => {
    expect(unitsOf(documented(['V [m/s] mean velocity', 'D: bore [mm]', '- T = temperature [degC]', 'The [m] is no unit here: see [kg].']))).toBe('f(V) m/s; f(D) mm; f(T) degC');
    expect(unitsOf(documented(['V   mean velocity  [m/s]', 'D   bore  [mm]']))).toBe('f(V) m/s; f(D) mm');
    expect(unitsOf(documented(['V : float', 'D : float', 'T : float']))).toBe('none');
    expect(unitsOf(documented(['Some words on V [m/s] and others.']))).toBe('none');
  });

  test('sections that are not read', () => {
    expect(unitsOf(documented(['Notes', '-----', 'V : float', '    in [m/s]', '', 'Examples', '--------', '>>> f(2)[m]', '', 'See Also', '--------', 'D : bore [m]']))).toBe('none');
  });
});

describe('classes', () => {
  const pipe = (own: string): string => ['class Pipe:', '    """A pipe.', '', '    Parameters', '    ----------', '    D : float', '        Bore [mm]', '    L : float', '        Length [m]', '', '    Attributes', '    ----------', '    A : float', '        Area [mm^2]', '    """', '', '    def __init__(self, D, L):', `        ${own}`, '        self.D = D'].join('\n');

  test('parameters are fields and parameters of the constructor', () => {
    expect(unitsOf(pipe('pass'))).toBe('Pipe.D mm; __init__(D) mm; Pipe.L m; __init__(L) m; Pipe.A mm^2');
  });

  test('what the constructor says itself goes first', () => {
    expect(unitsOf(pipe('""":param D: bore [cm]"""'))).toBe('Pipe.D mm; Pipe.L m; __init__(L) m; Pipe.A mm^2; __init__(D) cm');
  });

  test('attribute fields', () => {
    expect(unitsOf('class Pipe:\n    """A pipe.\n\n    :ivar D: bore [mm]\n    """\n')).toBe('Pipe.D mm');
  });

  test('a property tells its unit in its first sentence', () => {
    const property = (decorator: string): string => `class Paint:\n    ${decorator}\n    def rho(self):\n        """Density of the paint [kg/m^3]."""\n        return 1240.0`;
    expect(unitsOf(property('@property'))).toBe('rho -> kg/m^3');
    expect(unitsOf(property('@functools.cached_property'))).toBe('rho -> kg/m^3');
    expect(unitsOf(property('@staticmethod'))).toBe('rho -> kg/m^3');
  });

  test('nested functions and methods have their own', () => {
    expect(unitsOf('def outer(V):\n    """Outer.\n\n    :param V: speed [m/s]\n    """\n    def inner(V):\n        """Inner.\n\n        :param V: volume [m^3]\n        """\n        return V\n    return inner')).toBe('outer(V) m/s; inner(V) m^3');
  });
});

test('spans cover the characters of the unit, whatever stands before', () => {
  const text = `x = 1\n\n\n${parameters('V : float', '    Wörter — velocity [ m/s ]', 'D : array-like, kg/s', '    flow', 'T : float', '    Temperature in degrees', '    C, measured')}`;
  expect(spansOf(text)).toEqual(['m/s', 'kg/s', 'degrees\n        C']);
});

test('words that introduce a unit are outside of its span', () => {
  expect(spansOf(parameters('V : float', '    Zenith angle of the sun, in degrees.', 'D : float', '    Bore (in mm).'))).toEqual(['degrees', 'mm']);
});

test('line breaks of other systems', () => {
  expect(spansOf(parameters('V : float', '    Velocity [m/s]', 'D : float', '    Bore in mm').replace(/\n/g, '\r\n'))).toEqual(['m/s', 'mm']);
});

describe('the first sentence of a function', () => {
  const fn = (head: string, doc: string): string => unitsOf(`def ${head}:\n    """${doc}"""\n    return x\n`);

  test.each([
    ['f(Q)', 'Time to dose a batch [s]', 'f -> s'],
    ['f(Q)', 'Head of the pump [m] at flow Q [m3/s]', 'f -> m; f(Q) m3/s'],
    ['f(Q)', 'Head of the pump [m] at flow Q [m3/s].', 'f -> m; f(Q) m3/s'],
    ['f(t)', 'feed [m^3/s] at time t [s]', 'f -> m^3/s; f(t) s'],
    ['f(self)', 'Rated torque [N·m].', 'f -> N·m'],
    ['f(p)', 'Saturation temperature at pressure p [kPa]', 'f(p) kPa'],
    ['f(self)', 'Energy in the brake for one stop from full speed [kJ].', 'f -> kJ'],
    ['f(p)', 'Temperature at the outlet [K].\n\n    :param p: pressure', 'f -> K'],
    ['f(K)', 'Head.\n\n    Parameters\n    ----------\n    K : float\n        sum of the loss coefficients, -', 'f(K) -'],
  ])('%s: %s', (head, doc, expected) => {
    expect(fn(head, doc).split('; ').sort().join('; ')).toBe(expected);
  });

  test.each([
    ['f(p)', 'Saturation temperature at a pressure in [kPa]'], ['f(x)', 'Convert the pressure in [psi] to [kPa]'], ['f(x)', 'Plot the level [m] of a run'], ['f(x)', 'Levels [m] and flows [m3/s]'],
    ['f(x)', 'See [1].'], ['f(x)', 'The work of a tank.\n\n    Levels are counted in [m].'], ['f(x)', 'Density.\n\n    Returns\n    -------\n    float'], ['f(level)', 'Volume below the level'],
  ])('%s: %s says nothing of it', (head, doc) => {
    expect(fn(head, doc)).toBe('none');
  });
});
