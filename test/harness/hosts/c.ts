/** C and C++ with Doxygen: functions first, the script in `main`, what functions read of it as variables of the file. */
import { curly, starred } from './curly.ts';
import { features, type Host, type Line, type Local, noteText, words } from './host.ts';
import { alike, byFactor, inPairs, itself, numberOf, taking } from './library.ts';

const keywords = words('auto break case char const continue default do double else enum extern float for goto if inline int long register restrict return short signed sizeof static struct switch typedef union unsigned void volatile while bool catch class constexpr delete explicit export false friend mutable namespace new noexcept nullptr operator private protected public template this throw true try typename using virtual y0 y1 j0 j1');

function compiled(language: 'c' | 'cpp', fileName: string): Host {
  const isPlus = language === 'cpp';
  const std = isPlus ? 'std::' : '';
  return {
    ...curly,
    language,
    fileName,
    says: features('choose', 'globals', 'updates', ...(isPlus ? ['defaults' as const] : [])),
    firstIndex: 0,
    order: 'functions first',
    isTyped: true,
    keywords,
    library: {
      ...alike('', 'hypot', 'round'), ...byFactor('M_PI'),
      log: taking('log', 1), abs: 'fabs', min: inPairs('fmin'), max: inPairs('fmax'), maximum: inPairs('fmax'), minimum: inPairs('fmin'), pi: 'M_PI', inf: 'INFINITY', nan: 'NAN', float: numberOf('INFINITY'), isnan: 'isnan', array: itself, mod: 'fmod',
    },
    assign: (target, value, local) => (local ? `${typeOf(local, isPlus)} ${target}${isPlus || local.size === undefined ? '' : `[${local.size}]`} = ${value};` : `${target} = ${value};`),
    initial: (items) => `{${items.join(', ')}}`,
    declare: (local) => `${typeOf(local, isPlus)} ${local.name};`,
    show: (values) => (isPlus ? `${std}cout${values.map((value) => ` << ${value}`).join('')} << ${std}endl;` : values.map((value) => (value.startsWith('"') ? `printf(${value});` : `printf("%g\\n", ${value});`)).join(' ')),
    count: (variable, first, end) => `for (int ${variable} = ${first}; ${variable} < ${end}; ${variable}++) {`,
    leave: { break: 'break;', continue: 'continue;', raise: isPlus ? 'throw std::domain_error("not possible");' : 'exit(1);' },
    frame({ name: own, params, results: [result], summary, remarks }, noted) {
      const list = params.map((each) => `${each.isArray ? 'const double *' : 'double '}${each.name}${each.default === undefined ? '' : ` = ${each.default}`}`).join(', ');
      const doc = [{ text: `@brief ${summary}` }, ...remarks.map((text) => ({ text })), ...params.map((each) => ({ text: `@param ${each.name} ${noteText(each, true)}`, covers: noted(each.name) })),
        ...(result?.unit === undefined ? [] : [{ text: `@return ${noteText(result, true)}`, covers: noted(result.name) }])];
      return { before: starred(doc), open: `${result ? 'double' : 'void'} ${own}(${list === '' ? (isPlus ? '' : 'void') : list}) {`, after: [], close: '}' };
    },
    whole: ({ head, globals, functions, script, locals }) => [
      ...head, { text: isPlus ? '#include <cmath>' : '#include <math.h>' }, ...(isPlus ? ['#include <iostream>', '#include <vector>'] : ['#include <stdbool.h>', '#include <stdio.h>']).map((text) => ({ text })), { text: '' }, ...globals.map((line) => ({ ...line, text: line.text.replace(/^double /, 'static const double ') })), { text: '' }, ...functions,
      ...(script.length === 0 ? [] : [{ text: isPlus ? 'int main() {' : 'int main(void) {' }, ...hoisted(locals, isPlus), ...script.map((line): Line => ({ ...line, text: `    ${line.text}` })), { text: '    return 0;' }, { text: '}' }]),
    ],
  };
}

function typeOf({ size, type }: Local, isPlus: boolean): string {
  if (type !== 'number') return type === 'truth' ? 'bool' : 'const char *';
  return size !== undefined && isPlus ? 'std::vector<double>' : 'double';
}

function hoisted(locals: readonly Local[], isPlus: boolean): readonly Line[] {
  return locals.filter((each) => !each.declaredByAssignment && !each.isCounter).map((each) => ({ text: `    ${typeOf(each, isPlus)} ${each.name};` }));
}

export const cHost = compiled('c', 'spec.c');
export const cppHost = compiled('cpp', 'spec.cpp');
