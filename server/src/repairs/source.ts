/** How a change is written into the author's text: brackets only where they are needed, blanks as on the same line. */
import type { Expr, Program } from '../program/nodes.ts';
import type { Span } from '../text/span.ts';
import type { Scene } from './scene.ts';

/** Brackets around a span that are no argument list, with the span they enclose; the span itself where there are none. */
export function withBrackets(text: string, span: Span): Span {
  let { start, end } = span;
  while (/\s/.test(text[start - 1] ?? '')) start--;
  while (/\s/.test(text[end] ?? '')) end++;
  if (text[start - 1] !== '(' || text[end] !== ')') return span;
  const before = text.slice(0, start - 1).match(/([\w\])])$/);
  return before && !/\b(?:return|and|or|not|in|if|else|elif|while|is|yield|lambda|assert)$/.test(text.slice(Math.max(0, start - 10), start - 1)) ? span : { start: start - 1, end: end + 1 };
}

/** A part of an expression that needs brackets before it is multiplied. */
export function isLoose(expr: Expr): boolean {
  if (expr.kind === 'binary') return expr.op !== '*' && expr.op !== '/' && expr.op !== '**';
  return ['compare', 'logic', 'choose', 'lambda', 'bind'].includes(expr.kind);
}

/** A part that can stand as it is before a power or behind a slash. */
export function isAtom(expr: Expr): boolean {
  return ['name', 'member', 'index', 'call', 'number'].includes(expr.kind);
}

/** An operator with blanks around it where the author's line has them. */
export function spaced(scene: Scene, at: number, op: string): string {
  const line = scene.inputs.lines.lineText(scene.inputs.lines.lineAt(at));
  if (op === '+' || op === '-') return /\S[+-](?=\S)/.test(line.replace(/[eE][+-]\d/g, '')) && !/ [+-] /.test(line) ? op : ` ${op} `;
  if (op === '**' || op === '^') return / (?:\*\*|\^) /.test(line) ? ` ${op} ` : op;
  return / [*/] /.test(line) ? ` ${op} ` : op;
}

/** An expression's text, in brackets where a factor before or behind it would tear it apart. */
export function factorText(code: string, expr: Expr): string {
  return isLoose(expr) && !isBracketed(code) ? `(${code})` : code;
}

/** Whether a text is one pair of brackets with what is between. */
export function isBracketed(code: string): boolean {
  if (!code.startsWith('(') || !code.endsWith(')')) return false;
  let depth = 0;
  for (let at = 0; at < code.length; at++) {
    if (code[at] === '(') depth++;
    else if (code[at] === ')' && --depth === 0) return at === code.length - 1;
  }
  return false;
}

/** How this script calls a library name: `np.deg2rad` for `numpy.deg2rad`; undefined where it is not imported. A name without a module is built in. */
export function importedName(program: Program, dotted: string, builtIn: readonly string[] = []): string | undefined {
  const at = dotted.lastIndexOf('.');
  if (at < 0 || builtIn.includes(dotted.slice(0, at))) return dotted;
  const [module, name] = [dotted.slice(0, at), dotted.slice(at + 1)];
  for (const chunk of program.chunks) {
    for (const statement of chunk.statements) {
      if (statement.kind !== 'import' || statement.level > 0 || statement.module !== module) continue;
      if (!statement.names) return `${statement.alias ?? statement.module}.${name}`;
      const named = statement.names.find((each) => each.name === name);
      if (named) return named.alias;
      if (statement.names.some((each) => each.name === '*')) return name;
    }
  }
  return undefined;
}

/** A factor's text with π as this script writes it; digits where it has no name for π. */
export function hostFactor(factor: string, scene: Scene): string {
  if (!/\bpi\b/.test(factor)) return factor;
  const pi = scene.inputs.style.piNames.map((name) => importedName(scene.inputs.program, name, scene.inputs.style.builtIn)).find((name) => name !== undefined);
  return factor.replace(/\bpi\b/g, pi ?? String(Math.PI));
}

