/** What the languages with curly brackets have in common. */
import type { Host, Line } from './host.ts';

export const curly: Pick<Host, 'comment' | 'evaluate' | 'if' | 'elseIf' | 'else' | 'while' | 'end' | 'give' | 'giveNothing' | 'leavesAlone'> = {
  leavesAlone: new Set(['[in]', 'loop heads']),
  comment: (text) => `// ${text}`,
  evaluate: (value) => `${value};`,
  if: (condition) => `if (${condition}) {`,
  elseIf: (condition) => `} else if (${condition}) {`,
  else: '} else {',
  while: (condition) => `while (${condition}) {`,
  end: () => '}',
  give: ([value]) => [`return ${value};`],
  giveNothing: 'return;',
};

/** A block comment with a star on each line, as Doxygen and JSDoc read it. */
export function starred(lines: readonly Line[]): readonly Line[] {
  return [{ text: '/**' }, ...lines.map((line) => ({ ...line, text: ` * ${line.text}`.trimEnd() })), { text: ' */' }];
}
