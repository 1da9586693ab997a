/** JavaScript and TypeScript with JSDoc. */
import { curly, starred } from './curly.ts';
import { features, type Host, noteText, words } from './host.ts';
import { alike, byFactor, itself, numberOf, taking } from './library.ts';
import { member } from './make.ts';

const keywords = words('await break case catch class const continue debugger default delete do else enum export extends false finally for function if implements import in instanceof interface let new null package private protected public return static super switch this throw true try typeof var void while with yield');

function scripted(language: 'javascript' | 'typescript', fileName: string): Host {
  const isTyped = language === 'typescript';
  const type = (isArray: boolean): string => (isArray ? 'number[]' : 'number');
  return {
    ...curly,
    language,
    fileName,
    says: features('choose', 'nothing', 'list', 'matrix', 'defaults', 'letters beyond ASCII', 'globals', 'updates', ...(isTyped ? [] : ['lambda' as const])),
    firstIndex: 0,
    order: 'as written',
    keywords,
    library: {
      ...alike('Math.', 'abs', 'hypot', 'min', 'max', 'round'), ...byFactor('Math.PI'),
      log: taking('Math.log', 1), array: itself, pi: 'Math.PI', inf: 'Infinity', nan: 'NaN', float: numberOf('Infinity'), isnan: 'Number.isNaN',
      maximum: 'Math.max', minimum: 'Math.min', len: ([list]) => list && member(list, 'length'),
    },
    assign: (target, value, local) => `${local ? (local.isConstant ? 'const ' : 'let ') : ''}${target} = ${value};`,
    record: (target, local) => ({ open: `${local ? 'const ' : ''}${target} = {`, entry: (key, value) => `    ${key}: ${value},`, close: '};' }),
    keyed: 'member',
    declare: (local) => `let ${local.name};`,
    show: (values) => `console.log(${values.join(', ')});`,
    append: (list, value) => `${list}.push(${value});`,
    count: (variable, first, end) => `for (let ${variable} = ${first}; ${variable} < ${end}; ${variable}++) {`,
    each: (variable, list) => [`for (const ${variable} of ${list}) {`],
    leave: { break: 'break;', continue: 'continue;', raise: "throw new RangeError('not possible');" },
    frame({ name: own, params, results: [result], summary, remarks }, noted) {
      const list = params.map((each) => `${each.name}${isTyped ? `: ${type(each.isArray)}` : ''}${each.default === undefined ? '' : ` = ${each.default}`}`).join(', ');
      const tag = (isArray: boolean): string => (isTyped ? '' : `{${type(isArray)}} `);
      const doc = [{ text: summary }, ...remarks.map((text) => ({ text })), ...params.map((each) => ({ text: `@param ${tag(each.isArray)}${each.name} ${noteText(each, true)}`, covers: noted(each.name) })),
        ...(result?.unit === undefined ? [] : [{ text: `@returns ${tag(false)}${noteText(result, true)}`, covers: noted(result.name) }])];
      return { before: starred(doc), open: `function ${own}(${list})${isTyped && result ? ': number' : ''} {`, after: [], close: '}' };
    },
  };
}

export const javascriptHost = scripted('javascript', 'spec.js');
export const typescriptHost = scripted('typescript', 'spec.ts');
