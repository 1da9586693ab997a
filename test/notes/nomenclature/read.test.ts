import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { loadFrontEnd } from '../../harness/front-ends.ts';
import { problemsOf, read, symbolsOf } from './helpers.ts';

const nomenclature = await loadFrontEnd('nomenclature');

describe('symbols', () => {
  test.each([
    ['N [rev/s] 2 .. 12 shaft speed', 'N [rev/s] 2 .. 12 "shaft speed"'],
    ['D    [m]   = 0.085   impeller diameter', 'D [m] = 17/200 "impeller diameter"'],
    ['P [W] shaft power   # measured', 'P [W] "shaft power"'],
    ['t [degC] = -40', 't [degC] = -40'],
    ['eps [m] = 1.5e-6 roughness', 'eps [m] = 3/2000000 "roughness"'],
    ['n = 3', 'n = 3'],
    ['Δp [kPa] pressure drop', 'Δp [kPa] "pressure drop"'],
    ['self.rho [kg/m^3] density', 'self.rho [kg/m^3] "density"'],
    ['x [-] -1 .. 1', 'x [-] -1 .. 1'],
    ['x [m] 0.5 to 3 span', 'x [m] 0.5 .. 3 "span"'],
    ['unit [m] a symbol named unit', 'unit [m] "a symbol named unit"'],
    ['Re [1] = rho*N*D^2/mu', 'Re [1] = …'],
    ['Re [1] = rho*N*D^2/mu   of the impeller', 'Re [1] = … "of the impeller"'],
    ['y [m] = 2*pi', 'y [m] = …'],
    ['D [m] = 0.085 m', 'D [m] = 17/200'],
  ])('%s', (text, printed) => {
    expect(symbolsOf(text)).toEqual([printed]);
    expect(problemsOf(text)).toEqual([]);
  });

  test('the first line of a symbol counts, and a later formula gives its value', () => {
    expect(symbolsOf('P [W] shaft power\nP [W] = 3*Q\nQ [W]')).toEqual(['P [W] = … "shaft power"', 'Q [W]']);
  });

  test('C is a temperature beside a symbol or a word that says so', () => {
    const { symbols } = read('T_hall [C] in the hall\nq [C] charge');
    expect([symbols.get('T_hall')?.unit?.offset?.kind, symbols.get('q')?.unit?.offset?.kind]).toEqual(['temperature', undefined]);
  });
});

describe('spans are those of the file', () => {
  test('names and units', () => {
    const text = '# bench\r\n  rho [kg/m^3] = 1240\nmu [Pa s]\n\nRe [1] = rho / mu\n';
    const { symbols, formulas } = read(text);
    const cut = (span: { start: number; end: number } | undefined): string => (span ? text.slice(span.start, span.end) : '');
    expect([...symbols.values()].map((each) => `${cut(each.nameSpan)}|${cut(each.unitSpan)}`)).toEqual(['rho|kg/m^3', 'mu|Pa s', 'Re|1']);
    expect(cut(formulas.get('Re')?.formula)).toBe('rho / mu');
  });

  test('parts of a formula', () => {
    const text = 'a [m]\n y [m] = sqrt(a*2.5)^2 - -a';
    const formula = read(text).formulas.get('y')?.formula;
    const parts: string[] = [];
    const walk = (expr: NonNullable<typeof formula>): void => {
      parts.push(text.slice(expr.start, expr.end));
      if (expr.kind === 'binary') [expr.left, expr.right].forEach(walk);
      if (expr.kind === 'unary') walk(expr.operand);
      if (expr.kind === 'call') [expr.callee, ...expr.args.map((each) => each.value)].forEach(walk);
    };
    if (formula) walk(formula);
    expect(parts).toEqual(['sqrt(a*2.5)^2 - -a', 'sqrt(a*2.5)^2', 'sqrt(a*2.5)', 'sqrt', 'a*2.5', 'a', '2.5', '2', '-a', 'a']);
  });

  test('signatures and constants behind other lines', () => {
    const text = 'D [m]\r\nf(x [m]) [s]\nlab.g0 [m/s^2] = 9.812\n';
    const { signatures, constants } = read(text);
    expect([...signatures, ...constants].map(({ span }) => text.slice(span.start, span.end))).toEqual(['f', 'lab.g0']);
  });
});

describe('refusals', () => {
  test.each([
    ['[m] = 3', 'no-symbol: [m] = 3'],
    ['D = ', 'no-value: '],
    ['D', 'needs-unit: D'],
    ['shaft power in watts', 'needs-unit: shaft'],
    ['D [m = 3', 'square-not-closed: [m = 3'],
    ['D [metrs]', 'unknown-unit: metrs'],
    ['D [m] 0.085', 'value-without-equals: 0.085'],
    ['p [Pa] = 5 bar', 'unit-behind-value: bar'],
    ['N [rpm] 12 .. 2', 'range-reversed: 12 .. 2'],
    ['N [rpm] 12 .. full speed', 'range-breaks-off: 12 .. full'],
    ['y [m] = a b', 'two-symbols: b'],
    ['y [m] = 2 r', 'two-symbols: r'],
    ['y [m] = 0.5 rho*v^2', 'two-symbols: rho*v^2'],
    ['y [m] = a*', 'formula-breaks-off: *'],
    ['y [m] = a^', 'formula-breaks-off: ^'],
    ['y [m] = (a + b', 'formula-breaks-off: (a + b'],
    ['y [m] = f(a b)', 'formula-breaks-off: (a b)'],
    ['y [m] = a = b', 'formula-breaks-off: = b'],
    ['y [m] = 3x', 'formula-breaks-off: x'],
    ['P depends on', 'relation-empty: P depends on'],
    ['P depends on N, 2D', 'relation-symbol: 2D'],
    ['P depends on N, N', 'relation-repeats: N'],
    ['P depends on N, P', 'relation-of-itself: P'],
    ['unit crate =', 'unit-value: crate ='],
    ['unit crate = 0 kg', 'unit-factor: 0'],
    ['unit crate = -2 kg', 'unit-factor: -2'],
    ['unit crate = 2 kgg', 'unit-unreadable: kgg'],
    ['unit 2box = 3 kg', 'unit-name: 2box'],
    ['unit box = 3 kg\nunit box = 4 kg', 'unit-repeated: box'],
    ['unit a1 = 2 b1\nunit b1 = 2 a1', 'unit-unreadable: b1|unit-unreadable: a1'],
    ['D [m]\nD [kg]', 'symbol-repeated: D'],
    ['f(x [metrs]) [s]', 'unknown-unit: metrs'],
    ['f(x [m] [s]', 'bracket-not-closed: (x [m] [s]'],
  ])('%s', (text, problem) => {
    expect(problemsOf(text)).toEqual(problem.split('|'));
  });

  test('a line that cannot be read does not disturb the next', () => {
    expect(symbolsOf('D [m] bore\n)(\nx [\nL [m] length')).toEqual(['D [m] "bore"', 'L [m] "length"']);
  });

  test('each problem says so in a sentence', () => {
    for (const { message } of read('D\nP depends on\nunit box =\ny = a b\nf(x [metrs])').problems) expect(message).toMatch(/^[`A-Z].*[.?]$/);
  });
});

describe('units of the file', () => {
  test('factors, in any order, and a base dimension of its own', () => {
    const { vocabulary } = read('unit pallet = 12 crate\nunit crate = 18.5 kg\nunit item\nunit dozen_items = 12 item\nunit turns = 2*pi rad');
    const unit = (name: string) => vocabulary.units.get(name);
    // 12 · 18.5 kg = 222 kg
    expect(unit('pallet')?.scale?.toNumber()).toBe(222);
    expect(unit('item')?.dimension.toString()).toBe('item');
    expect(unit('dozen_items')?.dimension).toBe(unit('item')?.dimension);
    expect(unit('turns')?.scale?.key).toContain('2|1');
    // 18.5 kg in 3600 s
    expect(read('unit crate = 18.5 kg\nm [crate/h] rate').symbols.get('m')?.unit?.scale?.key).toBe('37/7200|0||1');
  });

  test('the units of outer files hold', () => {
    const outer = read('unit crate = 18.5 kg').vocabulary;
    expect(outer.units.size).toBe(1);
    expect(read('m [crate]').problems.length).toBe(1);
  });
});

describe('relations and constants', () => {
  test('a relation names its symbols', () => {
    const { relations, problems } = read('P depends on N, D,rho , mu\n# a comment');
    expect(relations.map((each) => `${each.dependent} <- ${each.on.join(' ')}`)).toEqual(['P <- N D rho mu']);
    expect(problems).toEqual([]);
  });

  test('dotted numbers are constants of a library', () => {
    expect(read('lab.g0 [m/s^2] = 9.812\nlab.turn = 2*pi').constants.map((each) => `${each.name} ${each.unit?.text ?? ''} ${each.value} ${each.pi}`)).toEqual(['lab.g0 m/s^2 2453/250 0', 'lab.turn  2 1']);
  });
});

describe('as a program', () => {
  test('unchanged lines keep their chunks when lines are added above', () => {
    const first = nomenclature.parse('D [m]\nRe [1] = D*2', 'a.nomen');
    const again = nomenclature.parse('# new\nD [m]\nRe [1] = D*2', 'a.nomen', first);
    expect(again.program.chunks.slice(1)).toEqual(first.program.chunks);
    expect(again.program.chunks[2]).toBe(first.program.chunks[1]);
    expect(again.program.chunks.map((chunk) => chunk.anchor.start)).toEqual([0, 6, 12]);
  });

  test.each(['a*(b + c)/d', 'a/b/c', 'a/(b/c)', 'a^(1/2)', '-a^2', '(-a)^2', 'a - (b - c)', 'max(a, 2*b)', 'a^-b', '2^3^2'])('%s is printed as it was read', (formula) => {
    const { program } = nomenclature.parse(`y = ${formula}`, 'a.nomen');
    const statement = program.chunks[0]?.statements[0];
    expect(statement?.kind === 'assign' && nomenclature.style.print(statement.value)).toBe(formula);
  });
});

test('never throws, and every span lies in the text', () => {
  const piece = fc.constantFrom('D', 'rho', '[m]', '[', ']', '=', '2', '0.5', '..', '*', '^', '/', '(', ')', ',', ' ', '\n', '#', 'unit ', 'depends on', '?a', '-', '.', 'sin(', '[?a^', '\r', 'é', '…');
  fc.assert(fc.property(fc.array(piece, { maxLength: 40 }).map((pieces) => pieces.join('')), (text) => {
    for (const { span } of read(text).problems) expect(span.start >= 0 && span.start <= span.end && span.end <= text.length).toBe(true);
    nomenclature.parse(text, 'a.nomen');
  }), { numRuns: 400 });
});
