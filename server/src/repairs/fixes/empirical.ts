/** A relation declared empirical: its symbols are plain numbers in the units that they are counted in. */
import { noteLeaves, sidesOf } from '../../solver/root-cause.ts';
import type { Contradiction } from '../goals.ts';
import type { Fix } from '../fix.ts';
import type { Scene } from '../scene.ts';

/** More symbols than these make no relation that anybody would read. */
const mostSymbols = 8;

/** The declaration above the statement, with the units of the symbols as they are noted. */
export function empirical(fault: Contradiction, scene: Scene): readonly Fix[] {
  const { anchor, span } = fault.constraint;
  const statement = scene.statementAt(anchor, span);
  if (!statement || (statement.kind !== 'assign' && statement.kind !== 'return')) return [];
  const { lines, style } = scene.inputs;
  const first = lines.lineAt(anchor.start + statement.start);
  const indent = /^[ \t]*/.exec(lines.lineText(first))?.[0] ?? '';
  if (lines.lineStart(first) + indent.length !== anchor.start + statement.start) return [];
  const target = fault.kind === 'dimension' && fault.constraint.reason.kind === 'target' ? [{ path: fault.constraint.reason.path, unit: fault.constraint.reason.note.unit.text }] : [];
  const code = scene.code(anchor, statement);
  const leaves = noteLeaves(...sidesOf(fault.constraint)).flatMap((leaf) => (leaf.version?.note ? [{ path: leaf.version.path, unit: leaf.version.note.unit.text }] : []));
  const symbols = [...target, ...leaves].filter(({ path }, at, all) => code.includes(path) && all.findIndex((each) => each.path === path) === at);
  if (symbols.length === 0 || symbols.length > mostSymbols) return [];
  const units = symbols.map(({ path, unit }) => `${path} [${unit === '' ? '-' : unit}]`).join(', ');
  const breaks = scene.text.includes('\r\n') ? '\r\n' : '\n';
  const start = lines.lineStart(first);
  return [{
    kind: 'empirical', confidence: 'choice', edits: [{ start, end: start, text: `${indent}${style.comment} empirical: ${units}${breaks}` }],
    says: { what: 'empirical', units }, cost: 3.2,
  }];
}
