import type { LanguageId } from '../../../server/src/program/nodes.ts';
import { loadFrontEnd } from '../../harness/front-ends.ts';
import { showExpr, showProgram } from '../../harness/show-program.ts';

export const javascript = await loadFrontEnd('javascript');
export const typescript = await loadFrontEnd('typescript');

/** A text in the common form, one statement a line. */
export function form(text: string, language: LanguageId = 'javascript'): string {
  return showProgram((language === 'typescript' ? typescript : javascript).parse(text, 'a.js').program);
}

/** What the only expression of a text prints as, and the form of both. */
export function printedAgain(text: string): { readonly printed: string; readonly before: string; readonly after: string } {
  const read = (source: string): Parameters<typeof showExpr>[0] => {
    const [statement] = javascript.parse(source, 'a.js').program.chunks.flatMap((chunk) => chunk.statements);
    if (statement?.kind !== 'assign') throw new Error(`not an assignment: ${source}`);
    return statement.value;
  };
  const before = read(`x = ${text}`);
  const printed = javascript.style.print(before);
  return { printed, before: showExpr(before), after: showExpr(read(`x = ${printed}`)) };
}
