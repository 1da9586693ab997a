/** Languages whose names do not tell capital from small letters: their front ends lower them all in the common form. */
import type { LanguageId } from './nodes.ts';

const ignoring: ReadonlySet<LanguageId> = new Set(['fortran']);

export function ignoresCase(language: LanguageId): boolean {
  return ignoring.has(language);
}

/** A name of a comment, a documentation or a nomenclature file as the common form has it. */
export function nameIn(language: LanguageId, name: string): string {
  return ignoring.has(language) ? name.toLowerCase() : name;
}
