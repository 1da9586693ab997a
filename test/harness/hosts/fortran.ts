/** Fortran: a module of functions and a program that uses it; notes stand behind declarations. */
import { call, number } from './make.ts';
import { features, type Host, type Line, type Local, noteText } from './host.ts';
import { alike, byFactor, itself, numberOf, taking } from './library.ts';

const types = { number: 'real', truth: 'logical', text: 'character(len=40)' } as const;
const kind = 'real';

export const fortranHost: Host = {
  language: 'fortran',
  fileName: 'spec.f90',
  says: features('globals', 'list', 'array arithmetic'),
  firstIndex: 1,
  last: (array) => call('size', array),
  ignoresCase: true,
  declaresNotes: true,
  isTyped: true,
  order: 'functions first',
  keywords: new Set(['end', 'do', 'if', 'then', 'else', 'program', 'module', 'function', 'contains', 'use', 'real', 'integer', 'result', 'pi', 'spec', 'main']),
  library: {
    ...alike('', 'abs', 'min', 'max', 'sum', 'hypot'), ...byFactor('pi'),
    log: taking('log', 1), round: 'anint', len: 'size', mod: 'modulo', array: itself, pi: 'pi', maximum: 'max', minimum: 'min', float: numberOf(call('huge', number(1))),
    mean: ([list]) => list && { kind: 'binary', op: '/', opSpan: { start: 0, end: 0 }, left: call('sum', list), right: call('size', list), start: 0, end: 0 },
    choose: ([then, otherwise, condition]) => then && otherwise && condition && call('merge', then, otherwise, condition),
  },
  comment: (text) => `! ${text}`,
  assign: (target, value) => `${target} = ${value}`,
  evaluate: (value) => `call ${value}`,
  show: (values) => `print *, ${values.join(', ')}`,
  if: (condition) => `if (${condition}) then`,
  elseIf: (condition) => `else if (${condition}) then`,
  else: 'else',
  while: (condition) => `do while (${condition})`,
  count: (variable, first, _end, last) => `do ${variable} = ${first}, ${last}`,
  end: (block) => (block === 'if' ? 'end if' : 'end do'),
  leave: { break: 'exit', continue: 'cycle', raise: 'error stop' },
  give: ([value], [result], isLast) => [`${result} = ${value}`, ...(isLast ? [] : ['return'])],
  giveNothing: 'return',
  frame({ name: own, params, results: [result], summary, remarks, locals, isRecursive }, noted) {
    const list = params.map((each) => each.name).join(', ');
    const declared = params.map((each) => ({ text: `${kind}, intent(in) :: ${each.name}${each.isArray ? '(:)' : ''}${trailing(noteText(each))}`, covers: noted(each.name) }));
    const back = result ? [{ text: `${kind} :: ${result.name}${result.unit === undefined ? '' : trailing(noteText(result))}`, covers: noted(result.name) }] : [];
    const open = `${isRecursive ? 'recursive ' : ''}${result ? `function ${own}(${list}) result(${result.name})` : `subroutine ${own}(${list})`}`;
    return { before: [], open, after: [{ text: `! ${summary}` }, ...remarks.map((each) => ({ text: `! ${each}` })), ...declared, ...back, ...locals.map(declaration)], close: result ? 'end function' : 'end subroutine' };
  },
  whole: ({ head, globals, functions, script, locals }) => [
    ...head, { text: 'module formulas' }, { text: '    implicit none' }, { text: `    ${kind}, parameter :: pi = 3.141592653589793` }, ...inside(globals.map((line) => ({ ...line, text: line.text.replace(/^(\w+) = /, `${kind}, parameter :: $1 = `) }))),
    { text: 'contains' }, ...inside(functions), { text: 'end module' }, { text: '' },
    { text: 'program bench' }, { text: '    use formulas' }, { text: '    implicit none' }, ...inside(locals.map(declaration)), ...inside(script), { text: 'end program' },
  ],
};

/** `real(8) :: D  ! [m] bore`. */
function declaration(local: Local): Line {
  const size = local.size === undefined ? '' : `(${local.size})`;
  return { ...(local.note !== undefined && { noteOf: local.noteLine }), text: `${local.isCounter ? 'integer' : types[local.type]} :: ${local.name}${size}${trailing(local.note ?? '')}` };
}

function trailing(note: string): string {
  return note === '' ? '' : `  ! ${note}`;
}

function inside(lines: readonly Line[]): readonly Line[] {
  return lines.map((line) => ({ ...line, text: line.text === '' ? '' : `    ${line.text}` }));
}
