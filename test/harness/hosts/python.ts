/** Python again: what comes back must give the same findings, or the writer is at fault. */
import { features, type Host, noteText, type NotedName, words } from './host.ts';
import { alike, numberOf } from './library.ts';

function numpydoc(title: string, noted: readonly NotedName[]): readonly string[] {
  return noted.length === 0 ? [] : ['', title, '-'.repeat(title.length), ...noted.flatMap((each) => [`${each.name} : float`, `    ${noteText(each, true)}`])];
}

export const pythonHost: Host = {
  language: 'python',
  fileName: 'spec.py',
  says: features('choose', 'lambda', 'comprehension', 'tuple', 'nothing', 'list', 'matrix', 'defaults', 'named arguments', 'letters beyond ASCII', 'globals', 'updates', 'several results', 'array arithmetic'),
  firstIndex: 0,
  order: 'as written',
  keywords: words('None True False'),
  opening: ['import math', 'import numpy as np', ''],
  library: {
    ...alike('np.', 'hypot', 'linspace', 'zeros', 'ones', 'zeros_like', 'empty', 'eye', 'arange', 'cumsum', 'mean', 'std', 'gradient', 'interp', 'trapezoid', 'where', 'maximum', 'minimum', 'array', 'isnan', 'clip', 'polyfit', 'polyval', 'degrees', 'radians', 'deg2rad', 'rad2deg', 'round', 'logspace'),
    abs: 'abs', min: 'min', max: 'max', sum: 'sum', len: 'len', pi: 'math.pi', inf: 'np.inf', nan: 'np.nan', float: numberOf('np.inf'),
  },
  comment: (text) => `# ${text}`,
  assign: (target, value) => `${target} = ${value}`,
  record: (target) => ({ open: `${target} = {`, entry: (key, value) => `    "${key}": ${value},`, close: '}' }),
  keyed: 'key',
  evaluate: (value) => value,
  show: (values) => `print(${values.join(', ')})`,
  append: (list, value) => `${list}.append(${value})`,
  if: (condition) => `if ${condition}:`,
  elseIf: (condition) => `elif ${condition}:`,
  else: 'else:',
  while: (condition) => `while ${condition}:`,
  count: (name, first, end) => `for ${name} in range(${first}, ${end}):`,
  each: (name, list) => [`for ${name} in ${list}:`],
  end: () => '',
  leave: { break: 'break', continue: 'continue', raise: 'raise ValueError' },
  give: (values) => [`return ${values.join(', ')}`],
  giveNothing: 'return',
  frame({ name, params, results, summary, remarks }, noted) {
    const doc = [`"""${summary}`, ...remarks.flatMap((each) => ['', each]), ...numpydoc('Parameters', params), ...(results.every((each) => each.unit === undefined) ? [] : numpydoc('Returns', results)), '"""'];
    const all = [...params, ...results];
    return {
      before: [],
      open: `def ${name}(${params.map((each) => each.name + (each.default === undefined ? '' : `=${each.default}`)).join(', ')}):`,
      after: doc.map((text) => ({ text, covers: text.startsWith('    ') ? noted(all.find((each) => text === `    ${noteText(each, true)}`)?.name ?? '?') : [] })),
      close: '',
    };
  },
};
