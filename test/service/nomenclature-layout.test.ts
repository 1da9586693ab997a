/** The layout of nomenclature files: text in, text out. */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { readNomenclature } from '../../server/src/notes/nomenclature/read.ts';
import { applyEdits } from '../../server/src/repairs/apply.ts';
import { alignedColumns, foldedParts, tokensOf } from '../../server/src/service/nomenclature-layout.ts';

const aligned = (text: string): string => applyEdits(text, alignedColumns(text));

describe('columns', () => {
  test('of symbols, units, values and descriptions', () => {
    expect(aligned('N [rev/s] 2 .. 12 shaft speed\nD [m] = 0.085   impeller diameter\nrho   [kg/m^3]= 1240\nP [W] shaft power  # measured\n')).toBe(
      'N    [rev/s]   2 .. 12  shaft speed\nD    [m]       = 0.085  impeller diameter\nrho  [kg/m^3]  = 1240\nP    [W]                shaft power  # measured\n',
    );
  });
  test('formulas keep their length', () => {
    expect(aligned('Re [-] = rho*N*D^2/mu\nP_calc [W] = Np*rho*N^3*D^5  power\n')).toBe('Re      [-]  = rho*N*D^2/mu\nP_calc  [W]  = Np*rho*N^3*D^5  power\n');
  });
  test('what stands apart is aligned apart, and what cannot be read stays', () => {
    const text = '# bench\nN  [1/s]\n\nlonger_name  [m]\n??\nP depends on N, D\nunit tin = 12.5 kg\n';
    expect(aligned(text)).toBe(text);
  });

  const lines = fc.array(fc.constantFrom('N [rev/s] 2 .. 12 shaft speed', 'D   [m] = 0.085 impeller', 'Re [1] = rho*N*D^2/mu', '# words', '', 'P depends on N, D', 'f(x [m]) [s]', 'unit tin = 12.5 kg', 'bad [', 'x [m] = 3,  # note', 'q [m^3/h], 3 .. 4 flow'), { maxLength: 12 });

  test('mean the same as before, and are stable', () => {
    fc.assert(fc.property(lines, (rows) => {
      const text = rows.join('\n');
      const after = aligned(text);
      expect(aligned(after)).toBe(after);
      const [was, is] = [readNomenclature(text, 'a.nomen'), readNomenclature(after, 'a.nomen')];
      const plain = ({ symbols }: typeof was): unknown => [...symbols.values()].map(({ name, unit, value, range, description }) => [name, unit?.text, value?.toString(), range, description]);
      expect(plain(is)).toEqual(plain(was));
      expect(is.problems.length).toBe(was.problems.length);
    }), { numRuns: 300 });
  });
});

test('parts fold under their headings', () => {
  expect(foldedParts('# bench\n# of the hall\nN [1/s]\nD [m]\n\nP [W]\nq [W]\n# alone\n')).toEqual([
    { first: 0, last: 1, comment: true },
    { first: 1, last: 3, comment: false },
    { first: 5, last: 6, comment: false },
  ]);
});

describe('tokens', () => {
  const shown = (text: string): readonly string[] => tokensOf(text).map(({ start, end, kind, declared }) => `${text.slice(start, end)}:${kind}${declared ? '!' : ''}`);
  test.each<[string, readonly string[]]>([
    ['N [rev/s] 2 .. 12  speed  # x', ['N:symbol!', 'rev/s:unit', '2:number', '12:number', '# x:comment']],
    ['Re [1] = rho*sqrt(N)/2', ['Re:symbol!', '1:unit', 'rho:symbol', 'sqrt:function', 'N:symbol', '2:number']],
    ['P depends on N, D', ['P:symbol', 'depends on:keyword', 'N:symbol', 'D:symbol']],
    ['unit tin = 12.5 kg', ['unit:keyword', 'tin:unit!', 'kg:unit']],
    ['head(Q [m^3/h], n [rpm]) [m]', ['head:function!', 'm^3/h:unit', 'rpm:unit', 'm:unit']],
    ['# words', ['# words:comment']],
  ])('%s', (text, expected) => {
    expect(shown(text)).toEqual(expected);
  });

  test('never overlap', () => {
    fc.assert(fc.property(fc.string({ unit: fc.constantFrom('N', '[', ']', ' ', '=', '*', '(', ')', '1', '.', '#', '\n', 'unit ', ' depends on ', 'm/s', ','), maxLength: 40 }), (text) => {
      let last = 0;
      for (const { start, end } of tokensOf(text)) {
        expect(start).toBeGreaterThanOrEqual(last);
        expect(end).toBeGreaterThan(start);
        last = end;
      }
    }), { numRuns: 400 });
  });
});
