/** MATLAB and Octave: functions behind the script, help blocks with the units in brackets. */
import { binary, call, name } from './make.ts';
import { features, type Host, noteText, words } from './host.ts';
import { alike, itself, numberOf, ordered, taking } from './library.ts';

export const matlabHost: Host = {
  language: 'matlab',
  fileName: 'spec.m',
  says: features('list', 'lambda', 'matrix', 'several results', 'array arithmetic'),
  firstIndex: 1,
  last: () => name('end'),
  order: 'script first',
  keywords: words('break case catch classdef continue else elseif end for function global if otherwise parfor persistent return spmd switch try while double single i j'),
  library: {
    ...alike('', 'abs', 'min', 'max', 'sum', 'round', 'hypot', 'mean', 'std', 'gradient', 'cumsum', 'linspace', 'isnan', 'polyfit', 'polyval', 'deg2rad', 'rad2deg'),
    radians: 'deg2rad', degrees: 'rad2deg', maximum: 'max', minimum: 'min', array: itself, len: 'numel', pi: 'pi', inf: 'Inf', nan: 'NaN', float: numberOf('Inf'),
    trapezoid: ordered('trapz', 1, 0), interp: ordered('interp1', 1, 2, 0), norm: taking('norm', 1), solve: ([a, b]) => a && b && binary('\\', a, b),
    mod: 'mod', zeros: ([n]) => n && call('zeros', n), ones: ([n]) => n && call('ones', n), eye: 'eye',
  },
  comment: (text) => `% ${text}`,
  assign: (target, value) => `${target} = ${value};`,
  targets: (names) => `[${names.join(', ')}]`,
  record: (target) => ({ entry: (key, value) => `${target}.${key} = ${value};` }),
  keyed: 'member',
  evaluate: (value) => `${value};`,
  show: (values) => values.map((value) => `disp(${value});`).join(' '),
  append: (list, value) => `${list}(end + 1) = ${value};`,
  if: (condition) => `if ${condition}`,
  elseIf: (condition) => `elseif ${condition}`,
  else: 'else',
  while: (condition) => `while ${condition}`,
  count: (variable, first, _end, last) => `for ${variable} = ${first}:${last}`,
  each: (variable, list) => [`for ${variable} = ${list}`],
  end: () => 'end',
  leave: { break: 'break;', continue: 'continue;', raise: "error('not possible');" },
  give: (values, results, isLast) => [values.map((value, at) => `${results[at]} = ${value};`).join(' '), ...(isLast ? [] : ['return;'])],
  giveNothing: 'return;',
  frame({ name: own, params, results, summary, remarks }, noted) {
    const head = `${results.length === 0 ? '' : results.length === 1 ? `${results[0]?.name} = ` : `[${results.map((each) => each.name).join(', ')}] = `}${own}(${params.map((each) => each.name).join(', ')})`;
    const input = params.map((each) => ({ text: `%   ${each.name} = ${noteText(each, true)}`, covers: noted(each.name) }));
    const output = results.every((each) => each.unit === undefined) ? [] : [{ text: '% OUTPUT:' }, ...results.map((each) => ({ text: `%   ${each.name} = ${noteText(each, true)}`, covers: noted(each.name) }))];
    const help = [{ text: `% ${own.toUpperCase()}  ${summary}` }, ...remarks.map((each) => ({ text: `% ${each}` })), ...(input.length > 0 ? [{ text: '% INPUT:' }, ...input] : []), ...output];
    return { before: [], open: `function ${head}`, after: [...help, { text: '' }], close: 'end' };
  },
};
