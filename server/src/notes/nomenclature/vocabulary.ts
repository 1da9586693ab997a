import { Dimension } from '../../quantities/dimension.ts';
import { parseUnit } from '../../quantities/parse-unit.ts';
import { Scale } from '../../quantities/scale.ts';
import { scaledBy, type Unit } from '../../quantities/unit.ts';
import type { UnitUnread, Vocabulary } from '../../quantities/unit-result.ts';
import type { Line, UnitLine } from './model.ts';
import { movedBy, type NomenclatureProblem, problemAt } from './problem.ts';
import { factorOf } from './unit-line.ts';

/** The base vocabulary with the units that these lines declare, in any order, and what is wrong with them. */
export function declaredUnits(lines: readonly { readonly start: number; readonly line: Line }[], base: Vocabulary): { readonly vocabulary: Vocabulary; readonly problems: readonly NomenclatureProblem[] } {
  const units = new Map(base.units);
  const problems: NomenclatureProblem[] = [];
  const declared = new Set<string>();
  let open: { readonly start: number; readonly line: UnitLine }[] = [];
  const marks: string[] = [];
  for (const { start, line } of lines) {
    if (line.kind !== 'base' && line.kind !== 'unit') continue;
    if (declared.has(line.name)) {
      problems.push(movedBy(problemAt('unit-repeated', line.nameSpan.start, line.nameSpan.end, line.name), start));
      continue;
    }
    declared.add(line.name);
    marks.push(line.kind === 'base' ? line.name : `${line.name}=${line.factor} ${line.of}`);
    if (line.kind === 'base') units.set(line.name, { dimension: Dimension.base(line.name), scale: Scale.one, text: line.name });
    else {
      units.delete(line.name);
      open.push({ start, line });
    }
  }
  if (marks.length === 0) return { vocabulary: base, problems };
  const unread = new Map<UnitLine, UnitUnread>();
  for (let before = -1; before !== open.length; ) {
    before = open.length;
    open = open.filter(({ line }) => {
      const made = declaredUnit(line, { units, fingerprint: `${base.fingerprint}|${marks.join('|')}|${units.size}` });
      if (!('ok' in made)) units.set(line.name, made);
      else unread.set(line, made);
      return 'ok' in made;
    });
  }
  for (const { start, line } of open) problems.push(movedBy({ ...problemAt('unit-unreadable', line.ofSpan.start, line.ofSpan.end, line.of), unit: { text: line.of, fault: unread.get(line) as UnitUnread } }, start));
  return { vocabulary: { units, fingerprint: `${base.fingerprint}|${marks.join('|')}` }, problems };
}

function declaredUnit(line: UnitLine, vocabulary: Vocabulary): Unit | UnitUnread {
  const read = parseUnit(line.of, { vocabulary });
  const factor = factorOf(line.factor);
  if (!read.ok) return read;
  const { offset: _, ...unit } = factor ? scaledBy(read.unit, factor, line.name) : read.unit;
  return { ...unit, text: line.name };
}
