import type { UnitUnread } from '../../quantities/unit-result.ts';
import type { NotationFault, NotationProblem } from '../../signatures/problem.ts';
import type { Span } from '../../text/span.ts';

/** What can be wrong with a line of a nomenclature file. */
export type NomenclatureFault =
  | NotationFault | 'no-symbol' | 'needs-unit' | 'square-not-closed' | 'no-value' | 'value-without-equals' | 'unit-behind-value' | 'formula-breaks-off' | 'two-symbols' | 'range-reversed' | 'range-breaks-off'
  | 'relation-empty' | 'relation-symbol' | 'relation-repeats' | 'relation-of-itself' | 'unit-name' | 'unit-value' | 'unit-factor' | 'unit-unreadable' | 'unit-repeated' | 'symbol-repeated';

export interface NomenclatureProblem {
  readonly span: Span;
  readonly kind: NomenclatureFault;
  /** One sentence for the reader of the file. */
  readonly message: string;
  /** For an unknown unit: its text and what the unit reader says. */
  readonly unit?: { readonly text: string; readonly fault: UnitUnread };
}

const sentences: Record<Exclude<NomenclatureFault, NotationFault>, (found: string) => string> = {
  'no-symbol': () => 'A line begins with a symbol: `D [m] = 0.085 impeller diameter`.',
  'needs-unit': (found) => `\`${found}\` needs a unit in square brackets, or a value: \`${found} [m] …\`.`,
  'square-not-closed': () => 'This square bracket is not closed.',
  'no-value': () => 'A value or a formula was expected here.',
  'value-without-equals': (found) => `Write \`= ${found}\` where this is the value.`,
  'unit-behind-value': (found) => `The value is counted in the unit in brackets; \`${found}\` behind it is another one.`,
  'formula-breaks-off': () => 'This formula cannot be read from here on.',
  'two-symbols': (found) => `\`${found}\` stands behind the value without an operator: write \`*\` for a product, or two blanks before a description.`,
  'range-reversed': (found) => `The range ${found} is empty: the smaller value comes first.`,
  'range-breaks-off': () => 'A range has two values: `2 .. 12`.',
  'relation-empty': () => 'Depends on what? `P depends on N, D, rho` names the symbols.',
  'relation-symbol': (found) => `\`${found}\` is no symbol; write the symbols with commas between them.`,
  'relation-repeats': (found) => `\`${found}\` stands here twice.`,
  'relation-of-itself': (found) => `\`${found}\` cannot depend on itself.`,
  'unit-name': (found) => `\`${found}\` cannot be the name of a unit: letters first, then letters and digits.`,
  'unit-value': () => 'A unit needs a value: `unit crate = 18.5 kg`; without one, `unit crate` counts something new.',
  'unit-factor': (found) => `\`${found}\` is no factor of a unit: it must be a positive number, as \`18.5\`, \`1/12\` or \`2*pi\`.`,
  'unit-unreadable': (found) => `\`${found}\` is not a unit known here.`,
  'unit-repeated': (found) => `The unit \`${found}\` is declared above.`,
  'symbol-repeated': (found) => `\`${found}\` has another unit above; the first one counts.`,
};

/** The problem at `[start, end)`; `found` is the text it is about. */
export function problemAt(kind: Exclude<NomenclatureFault, NotationFault>, start: number, end: number, found = ''): NomenclatureProblem {
  return { span: { start, end: Math.max(start, end) }, kind, message: sentences[kind](found) };
}

/** The same problem, its line beginning at `by`. */
export function movedBy<T extends NomenclatureProblem | NotationProblem>(problem: T, by: number): T {
  return { ...problem, span: { start: problem.span.start + by, end: problem.span.end + by } };
}
