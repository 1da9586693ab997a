import { evaluate } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { definitions, equation, expression, type HostSyntax, hostSyntax } from '../../server/src/groups/express.ts';
import { relationDocument } from '../../server/src/groups/json.ts';
import { latexProduct, latexReport, latexSymbol, markdownReport } from '../../server/src/groups/report.ts';
import { solveGroups } from '../../server/src/groups/solve.ts';
import { product } from './checks.ts';
import { fluidExamples, processExamples, solidExamples } from './examples.ts';
import { relation } from './relations.ts';

const stirrer = relation('P power; N rate shaft speed; D length; rho density; mu viscosity');

describe('products in a host language', () => {
  it.each([
    ['rho N D^2 / mu', 'python', 'rho*N*D**2/mu'],
    ['P / rho N^3 D^5', 'python', 'P/(rho*N**3*D**5)'],
    ['P / rho N^3 D^5', 'nomenclature', 'P/(rho*N^3*D^5)'],
    ['rho N D^2 / mu', 'matlab', 'rho.*N.*D.^2./mu'],
    ['rho N D^2 / mu', 'c', 'rho*N*pow(D, 2)/mu'],
    ['V / g^1/2 L^1/2', 'c', 'V/(sqrt(g)*sqrt(L))'],
    ['V / g^1/2 L^1/2', 'javascript', 'V/(Math.sqrt(g)*Math.sqrt(L))'],
    ['a^1/3 / b^3/2', 'fortran', 'a**(1.0/3.0)/b**1.5'],
    ['1 / n t', 'julia', '1/(n*t)'],
    ['1', 'python', '1'],
  ] as const)('%s in %s: %s', (source, host, expected) => {
    expect(expression(product(source), hostSyntax[host])).toBe(expected);
  });

  // mathjs computes what was printed; the exponents say what it should be.
  it.each([...fluidExamples, ...processExamples, ...solidExamples].map((example) => [example.relation, example] as const))('means its exponents: %s', (_source, example) => {
    const result = solveGroups(relation(example.relation));
    const scope = Object.fromEntries(result.columns.map((name, at) => [name, 1.1 + 0.37 * at]));
    for (const { expression: printed, group } of definitions(result, hostSyntax.nomenclature)) {
      const expected = [...group.exponents].reduce((value, [name, power]) => value * (scope[name] as number) ** power.toNumber(), 1);
      expect(evaluate(printed, { ...scope })).toBeCloseTo(expected, 8);
    }
  });
});

describe('the equation for the dependent symbol', () => {
  const solved = (source: string, syntax: HostSyntax = hostSyntax.python, naming?: 'names' | 'expressions') => equation(solveGroups(relation(source)), syntax, naming);

  it.each([
    ['P power; N rate shaft speed; D length; rho density; mu viscosity', 'P = rho*N**3*D**5 * phi(Re)'],
    ['t time; l length; g acceleration', 't = sqrt(l/g) * C'],
    ['R length; E energy; rho density; t time', 'R = (E*t**2/rho)**0.2 * C'],
    ['dp pressure pressure drop; rho density; V speed; mu viscosity; d length; L length; e length roughness', 'dp = rho*V**2 * phi(Re, L/d, e/d)'],
    ['H length height; c pressure cohesion; gamma gradient unit weight; phi number', 'H = c/gamma * psi(phi)'],
    ['U voltage; U0 voltage; t time; R resistance; C capacitance', 'U = U0 * phi(Pi_2)'],
    ['eta number; V speed; c speed speed of sound', 'eta = phi(V/c)'],
  ])('%s', (source, expected) => {
    expect(solved(source)).toBe(expected);
  });

  it('takes expressions for names', () => {
    expect(solved('P power; N rate shaft speed; D length; rho density; mu viscosity', hostSyntax.nomenclature, 'expressions')).toBe('P = rho*N^3*D^5 * phi(rho*N*D^2/mu)');
  });

  it('is not offered where the dependent symbol is in no group', () => {
    expect(solved('m mass; t time; l length; g acceleration')).toBeUndefined();
    expect(solved('P power; N ?')).toBeUndefined();
  });

  // Homogeneity: in units where every base unit counts twice as many, both sides scale alike.
  it.each([...fluidExamples, ...processExamples, ...solidExamples].map((example) => example.relation))('is homogeneous: %s', (source) => {
    const one = relation(source);
    const result = solveGroups(one);
    const written = equation(result, hostSyntax.nomenclature);
    if (!written) return;
    const [left, right] = written.split(' = ') as [string, string];
    const scale = right.split(' * ').slice(0, -1).join(' * ') || '1';
    const change: Record<string, number> = { L: 2, M: 3, T: 5, Θ: 7, I: 11, N: 13 };
    const factorOf = (name: string) => (one.symbols.find((symbol) => symbol.name === name)?.dimension?.exponents ?? []).reduce((sum, [base, power]) => sum * (change[base] as number) ** power.toNumber(), 1);
    const scope = Object.fromEntries(one.symbols.map(({ name }) => [name, factorOf(name)]));
    expect(evaluate(scale, { ...scope }) / factorOf(left)).toBeCloseTo(1, 8);
  });
});

describe('definitions', () => {
  it('have names that no symbol has', () => {
    const clash = solveGroups(relation('P power; N rate shaft speed; D length; Re density; mu viscosity'));
    expect(definitions(clash, hostSyntax.python).map(({ name, expression: printed }) => `${name} = ${printed}`)).toEqual(['Ne = P/(Re*N**3*D**5)', 'Re_ = Re*N*D**2/mu']);
  });
});

describe('reports', () => {
  it.each([
    ['rho', '\\rho'],
    ['T_wall', 'T_{\\mathrm{wall}}'],
    ['D_AB', 'D_{\\mathrm{AB}}'],
    ['rho_p', '\\rho_{p}'],
    ['x1', 'x_{1}'],
    ['dp', '\\mathrm{dp}'],
    ['self.mu', '\\mu'],
  ])('%s as %s', (name, expected) => {
    expect(latexSymbol(name)).toBe(expected);
  });

  it('write products as fractions', () => {
    expect(latexProduct(product('rho N D^2 / mu'))).toBe('\\frac{\\rho\\,N\\,D^{2}}{\\mu}');
    expect(latexProduct(product('T_w^2 / T_c'))).toBe('\\frac{{T_{w}}^{2}}{T_{c}}');
  });

  it('in LaTeX', () => {
    expect(latexReport(solveGroups(stirrer)).split('\n')).toEqual([
      '\\begin{align*}',
      '  \\Pi_{1} &= \\frac{P}{\\rho\\,N^{3}\\,D^{5}} && \\text{power number} \\\\',
      '  \\Pi_{2} &= \\frac{\\rho\\,N\\,D^{2}}{\\mu} && \\text{Reynolds number} \\\\',
      '  P &= \\rho\\,N^{3}\\,D^{5}\\,\\varphi\\left(\\Pi_{2}\\right)',
      '\\end{align*}',
      '',
    ]);
  });

  it('in Markdown', () => {
    expect(markdownReport(solveGroups(stirrer)).split('\n')).toEqual([
      '5 symbols, rank 3: 2 dimensionless groups. Repeating symbols: $N$, $D$, $\\rho$.',
      '',
      '| group | product | known as |',
      '| --- | --- | --- |',
      '| $\\Pi_{1}$ | $\\frac{P}{\\rho\\,N^{3}\\,D^{5}}$ | power number |',
      '| $\\Pi_{2}$ | $\\frac{\\rho\\,N\\,D^{2}}{\\mu}$ | Reynolds number |',
      '',
      '$$P = \\rho\\,N^{3}\\,D^{5}\\,\\varphi\\left(\\Pi_{2}\\right)$$',
      '',
    ]);
  });

  it('as the document of the contract', () => {
    const document = relationDocument(solveGroups(relation('t time period; l length; g acceleration; m mass')), 'swing.py', 3);
    expect(document).toMatchObject({
      file: 'swing.py',
      line: 3,
      dependent: 't',
      rank: 3,
      repeating: ['l', 'g'],
      groups: [{ exponents: { t: '2', l: '-1', g: '1' }, recognised: ['reduced period of a pendulum squared'], expression: 't**2*g/l' }],
      unmatched: [{ symbol: 'm', reason: 'mass: nothing else here has mass' }],
      alternatives: 0,
    });
    expect(JSON.parse(JSON.stringify(document))).toEqual(document);
  });
});
