import { describe, expect, it } from 'vitest';
import { parseUnit } from '../../server/src/quantities/parse-unit.ts';

/** Kinds of brackets that are no units, as counted in public code; the lines are our own. */
const noUnits = `
directions and options: out · in, out · in/out · i/o · optional · OPTION · required · default 1.0 · SI · IP
citations, years, numbers: 12 · 2 · 0 · 10 · 2017 · 1, 2 · 3-5 · Eq 5 · eq. 12 · Fig. 3 · table 2 · p. 12 · sec 3.2
ranges, shapes, lists: 0, 1 · 0-1 · 0..1 · -90 .. 90 · n x 3 · 3 x n · 13x36 double · 1:10 · u, v, w · array1, array2 · T1, T2
strings and scale names: 'linear' · "cubic" · 'a', 'b' · ITS-90 · GPS-84 · True · None · False · nan
identifiers: pH · x · k · j · i · n · T_in · m_dot · T1 · V2 · h2 · K1 · A4 · N2 · m1 · m10 · c_p · kt_bin · self.T · df.A · x.T · a.m · u
index arithmetic: n-1 · N-1 · k+1 · i,j · i+1, j · 2*n · m-n
letters side by side: t h · a b · m n · h d · A B · x y · T s · N S
ratios of names: x/y · h/D · L/D · t/T · m/M · dy/dx · dP/dt · du/dy · r/R · a/b
prose: mm of water · m above the sea · see below · not used · in situ · as is · number of cells · degrees of freedom · days and hours · and/or · yes/no · on/off · z in m · m to mm · m -> mm · see m/s · per unit · h or m
functions and formulas: f(x) · rho(S,T,p) · -x(1 - y) · 1 - exp(-NTU) · 1 + R_1^2 · A^2 + B^2 · a[k+1] · -NTU(1-C_r) · \\frac{S}{h}\\right · 1 - \\frac{K}{4} · T^n
values in prose: 20 cm · 5 min · 0.1 mm · 25 degC · 3 kPa · 10 m
dates and times: hh:mm · HH:MM:SS · YYYY-MM-DD · dd/mm/yyyy · 30-Jan-2024
words that prefixes would make: as · am · pm · ramp · damp · ubar · has
abbreviations: e.g. · i.e. · U.S. · C.D
`;

describe('what is no unit stays unread and does not try to be one', () => {
  for (const line of noUnits.trim().split('\n')) {
    const at = line.indexOf(': ');
    it.each(line.slice(at + 2).split(' · '))(`${line.slice(0, at)}: %s`, (text) => {
      expect(parseUnit(text)).toMatchObject({ ok: false, triesToBeUnit: false });
    });
  }

  it('neither a whole bracket nor a very long text is read', () => {
    for (const text of ['[in]', '[m/s]', 'm/s '.repeat(40), '('.repeat(200), 'm'.repeat(500), 'm^'.repeat(40)]) expect(parseUnit(text)).toMatchObject({ ok: false, triesToBeUnit: false });
  });
});

describe('what may be a word or a name is read with doubt', () => {
  it.each(['m', 'a', 'in', 'h', 'K', 'min', 'second', 'bar', 'day', '-', '1', '', 's', 'W', 'V', 'C', 'nm', 'ns', 'inch', 'foot', 'knot', 'hour', 'A/V', 'm-1', 'gal', 'ppt', 'number', 'M'])('%j', (text) => {
    expect(parseUnit(text)).toMatchObject({ ok: true, beyondDoubt: false });
  });
});

describe('what has the mark of a unit is beyond doubt', () => {
  it.each(['m/s', 'kg/m^3', 'kPa', 'degC', 'W/m.K', 'm2', 'm³', 'mm', 'kg', 'rpm', 'psi', '°C', '%', '°', 's^-1', '1/s', 'N m', 'Pa s', 'kWh', 'mmHg', 'J/(kg K)', 'gC/m2', 'dimensionless', 'dim L', 'seconds', 'metres', 'degrees', 'Pa', 'Hz', 'MPa', 'm/s^2', 'deg C', 'radians per second', 'ft3', 'ft-lbf', 'W/K', 'J/K', 'kg/kg'])('%j', (text) => {
    expect(parseUnit(text)).toMatchObject({ ok: true, beyondDoubt: true });
  });
});
