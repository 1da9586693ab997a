/** Julia: docstrings with the headings of its manual ("Documentation", section on arguments). */
import { call, name } from './make.ts';
import { features, type Host, noteText, words } from './host.ts';
import { alike, itself, numberOf, taking } from './library.ts';

export const juliaHost: Host = {
  language: 'julia',
  fileName: 'spec.jl',
  says: features('choose', 'lambda', 'comprehension', 'tuple', 'nothing', 'list', 'defaults', 'letters beyond ASCII', 'globals', 'updates', 'several results', 'array arithmetic'),
  firstIndex: 1,
  last: () => name('end'),
  order: 'as written',
  keywords: words('baremodule begin break catch const continue do else elseif end export false finally for function global if import let local macro module quote return struct true try using while'),
  library: {
    ...alike('', 'abs', 'hypot', 'sum', 'round', 'deg2rad', 'rad2deg', 'mean', 'std', 'cumsum', 'norm', 'zeros', 'ones', 'isnan'),
    log: taking('log', 1), atan2: taking('atan', 2), radians: 'deg2rad', degrees: 'rad2deg', array: itself, len: 'length', mod: 'mod', pi: 'pi', inf: 'Inf', nan: 'NaN', float: numberOf('Inf'),
    min: (args) => call(args.length === 1 ? 'minimum' : 'min', ...args), max: (args) => call(args.length === 1 ? 'maximum' : 'max', ...args), maximum: 'max', minimum: 'min', clip: taking('clamp', 3),
  },
  comment: (text) => `# ${text}`,
  assign: (target, value) => `${target} = ${value}`,
  record: (target) => ({ open: `${target} = Dict(`, entry: (key, value) => `    "${key}" => ${value},`, close: ')' }),
  keyed: 'key',
  evaluate: (value) => value,
  show: (values) => `println(${values.join(', ')})`,
  append: (list, value) => `push!(${list}, ${value})`,
  if: (condition) => `if ${condition}`,
  elseIf: (condition) => `elseif ${condition}`,
  else: 'else',
  while: (condition) => `while ${condition}`,
  count: (variable, first, _end, last) => `for ${variable} in ${first}:${last}`,
  each: (variable, list) => [`for ${variable} in ${list}`],
  end: () => 'end',
  leave: { break: 'break', continue: 'continue', raise: 'error("not possible")' },
  give: (values) => [`return ${values.join(', ')}`],
  giveNothing: 'return nothing',
  frame({ name: own, params, results, summary, remarks }, noted) {
    const list = params.map((each) => each.name + (each.default === undefined ? '' : `=${each.default}`)).join(', ');
    const given = params.map((each) => ({ text: `- \`${each.name}\`: ${noteText(each, true)}`, covers: noted(each.name) }));
    const back = results.every((each) => each.unit === undefined) ? [] : [{ text: '' }, { text: '# Returns' }, ...results.map((each) => ({ text: `- \`${each.name}\`: ${noteText(each, true)}`, covers: noted(each.name) }))];
    const doc = [{ text: '"""' }, { text: `    ${own}(${params.map((each) => each.name).join(', ')})` }, { text: '' }, { text: summary }, ...remarks.flatMap((each) => [{ text: '' }, { text: each }]),
      ...(given.length > 0 ? [{ text: '' }, { text: '# Arguments' }, ...given] : []), ...back, { text: '"""' }];
    return { before: doc, open: `function ${own}(${list})`, after: [], close: 'end' };
  },
};
