import { describe, expect, it } from 'vitest';
import { readChunkNotes } from '../../../server/src/notes/read-chunk.ts';
import { defaultNoteSettings } from '../../../server/src/notes/types.ts';
import { emptyVocabulary } from '../../../server/src/quantities/unit-result.ts';
import { nameOf } from '../../notes/helpers.ts';
import { parse } from './helpers.ts';

/** `D m; V m/s`, in the order of the text; `none` without notes. */
function notes(text: string): string {
  const found = parse(text).chunks.flatMap((chunk) => [...readChunkNotes(chunk, defaultNoteSettings, emptyVocabulary, 'matlab').notes].sort((a, b) => a.span.start - b.span.start));
  return found.length === 0 ? 'none' : found.map((note) => `${nameOf(note)} ${note.unit.text === '' ? '1' : note.unit.text}`).join('; ');
}

describe('trailing comments', () => {
  it.each([
    ['D = 0.05;  % [m] inside diameter', 'D m'],
    ['D = 0.05;  % inside diameter [m]', 'D m'],
    ['D = 0.05  # [m]', 'D m'],
    ['V = 2;     %% [m/s]', 'V m/s'],
    ['V = 2;     % (m/s) mean', 'V m/s'],
    ['rho = 998; % kg/m^3', 'rho kg/m^3'],
    ['s.rho = 998; % [kg/m^3]', 's.rho kg/m^3'],
    ['x(3) = 2;  % [m]', 'x m'],
    ["tank = struct('D', 2, ... % [m]\n 'V', 3);     % [m^3]", '{D} m; {V} m^3'],
    ['for x = 0:0.1:2  % [m]\n  y = x;\nend', 'x m'],
    ['x = [ ...  % [m]\n 3 4];', 'x m'],
    ['a = 1; b = 2;  % [m]', 'none'],
    ['[a, b] = f(x); % [m], [s]', 'a m; b s'],
    ['x = size(a); % [n x 3]', 'none'],
    ['x = zeros(nl, 1);  % [nl]', 'none'],
    ['x = zeros(nl + 1, 1);  % [nl+1]', 'none'],
    ['if nl\n x = ones(nl, 1);  % [nl]\n y = 1;  % [1] all\nend', 'none'],
    ['if nl\n x = ones(nl, 1);\n y = 1;  % [1] all\nend', 'y 1'],
    ['unit = 1e-3;  % all lengths in mm', 'none'],
    ['unit = 1e-3;  % [m/mm]', 'unit m/mm'],
    ["disp('x [m]')  % [s]", 'none'],
    ['% y = 3;  % [m]', 'none'],
  ])('%s', (text, found) => expect(notes(text)).toBe(found));
});

describe('names in the code', () => {
  it('between transposes are names', () => expect(notes("% A [N/m] stiffness\nW = u'*A*u';")).toBe('file:A N/m'));
  it('in texts are none', () => expect(notes("% A [N/m] stiffness\ndisp('A'), B = u';")).toBe('none'));
});

describe('comments above', () => {
  it.each([
    ['% V [m/s], D [m]\nRe = V*D/nu;', 'file:V m/s; file:D m'],
    ['%{\n V [m/s] mean velocity\n D [m] diameter\n%}\nRe = V*D/nu;', 'file:V m/s; file:D m'],
  ])('%s', (text, found) => expect(notes(text)).toBe(found));
});

const help = (...lines: string[]): string => ['function [v, q] = flow(d, A)', ...lines.map((line) => `%${line}`), 'v = d; q = v*A;', 'end'].join('\n');

describe('help blocks', () => {
  it.each<[string, string, string]>([
    ['sections with equals signs', help(' INPUT:', '  d  =  depth            [ m ]', '  A  =  area             [ m^2 ]', ' OUTPUT:', '  v  =  velocity         [ m/s ]', '  q  =  flow             [ m^3/s ]', ' AUTHOR: nobody [ a@b ]'),
      'flow(d) m; flow(A) m^2; flow -> 0 v m/s; flow:v m/s; flow -> 1 q m^3/s; flow:q m^3/s'],
    ['sections with dashes', help(' Inputs:', '   d - depth [m]', '   A - area [m^2]', ' Outputs:', '   q - flow [m^3/s]'), 'flow(d) m; flow(A) m^2; flow -> 1 q m^3/s; flow:q m^3/s'],
    ['a plain list', help(' FLOW  through a gate', '  d   depth [m]', '  v : velocity [m/s]'), 'flow(d) m; flow -> 0 v m/s; flow:v m/s'],
    ['parentheses and words', help('   d - depth in m', '   A - area (m^2)'), 'flow(d) m; flow(A) m^2'],
    ['names in capitals', help(' Inputs:', '   D - depth [m]'), 'flow(d) m'],
    ['other names, a call', help('   x - width [m]', '   v = flow(d, A) gives m/s'), 'none'],
  ])('%s', (_name, text, found) => expect(notes(text)).toBe(found));

  it('are read once', () => expect(notes('function v = flow(d)\n% d [m] depth\n% A [m] width\nv = d*A;\nend')).toBe('flow(d) m'));
  it('an output that is converted on the way carries its unit at the end only', () => expect(notes('function p = f(h)\n% p = pressure [kPa]\np = 9810*h;\np = p/1000;\nend')).toBe('f -> p kPa'));
  it('an output that is turned keeps it', () => expect(notes("function p = f(h)\n% p = pressure [kPa]\np = h;\np = p(:)';\nend")).toBe('f -> p kPa; f:p kPa'));
  it('above the function', () => expect(notes('% FLOW\n%  d [m] depth\nfunction v = flow(d)\nv = d;\nend')).toContain('flow(d) m'));
});

describe('declarations', () => {
  it('of arguments and of parameters on lines of their own', () => {
    expect(notes('function q = f(d, A)\narguments\n  d (1,1) double {mustBePositive} = 2  % [m] depth\n  A double % area [m^2]\nend\nq = d*A;\nend')).toBe('f(d) m; f(A) m^2');
    expect(notes('function q = f(d, ... % [m]\n               A)     % [m^2]\nq = d*A;\nend')).toBe('f(d) m; f(A) m^2');
  });

  it('of properties', () => {
    expect(notes('classdef Tank\n  properties\n    width = 4.0  % [m]\n    % depth of water [m]\n    depth\n  end\nend')).toBe('width m; depth m');
  });
});
