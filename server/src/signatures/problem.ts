import type { UnitUnread } from '../quantities/unit-result.ts';
import type { Span } from '../text/span.ts';

/** What can be wrong with a line of the notation. */
export type NotationFault =
  | 'bracket-not-closed' | 'not-a-name' | 'not-a-parameter' | 'repeated-parameter' | 'parameter-behind-rest' | 'unknown-unit' | 'bad-power' | 'slash-before-two' | 'empty-claim'
  | 'text-behind' | 'not-a-line';

/** A place that could not be read; `message` is one sentence. */
export interface NotationProblem {
  readonly span: Span;
  readonly kind: NotationFault;
  readonly message: string;
  /** For an unknown unit: its text and what the unit reader says. */
  readonly unit?: { readonly text: string; readonly fault: UnitUnread };
}

const sentences: Record<NotationFault, (found: string) => string> = {
  'bracket-not-closed': () => 'This bracket is not closed.',
  'not-a-name': (found) => `\`${found}\` is no name of a function.`,
  'not-a-parameter': (found) => `\`${found}\` is no parameter; write \`x [m]\`, \`x [m] ...\`, \`x [m] = 0\` or \`f(x [m]) [s]\`.`,
  'repeated-parameter': (found) => `There is a parameter \`${found}\` before this one.`,
  'parameter-behind-rest': () => 'Nothing can follow a parameter that takes all further arguments, except one with a value of its own.',
  'unknown-unit': (found) => `\`${found}\` is not a unit known here.`,
  'bad-power': (found) => `\`${found}\` is no power; write \`?a^2\`, \`?a^-1\` or \`?a^(1/2)\`.`,
  'slash-before-two': () => 'It is not clear how far this slash reaches; write negative powers: `?a m^-1 s^-1`.',
  'empty-claim': (found) => `A ${found} of what? \`[${found} ?a]\` is one of values in ?a.`,
  'text-behind': (found) => `\`${found}\` cannot stand here.`,
  'not-a-line': () => 'This line is neither a signature nor a constant.',
};

/** The problem at `[start, end)`; `found` is the text it is about. */
export function notationProblem(kind: NotationFault, start: number, end: number, found = ''): NotationProblem {
  return { span: { start, end: Math.max(start, end) }, kind, message: sentences[kind](found) };
}

/** A unit that could not be read, with the nearest spelling where there is one. */
export function unknownUnit(text: string, start: number, fault: UnitUnread): NotationProblem {
  const near = fault.suggestion === undefined ? '' : ` \`${fault.suggestion}\` is.`;
  const plain = notationProblem('unknown-unit', start, start + text.length, text);
  return { ...plain, message: plain.message + near, unit: { text, fault } };
}
