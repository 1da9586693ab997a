/** What the grammar does not know, blanked out so that offsets hold. */

/** A field that cannot be changed: `const name::Type` without a value, on a line of its own. */
const constantField = /^([ \t]*)const(?=[ \t]+[\p{L}_][\p{L}\p{N}_′!]*[ \t]*(?:::[^=\n#]*)?(?:#[^\n]*)?\r?$)/gmu;

/** The text with words of one kind blanked out; of the same length. */
export function readableJulia(text: string): string {
  return text.includes('const') ? text.replace(constantField, '$1     ') : text;
}
