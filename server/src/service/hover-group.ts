/** The dimensionless product around a place, added to what a hover tells. */
import type { Understood } from '../analyze.ts';
import type { HoverInfo } from './contract.ts';
import { groupAt, groupText } from './groups-at.ts';
import type { TextOf } from './groups-symbols.ts';

/** The hover with the name and the value of the group that the place is part of; where nothing else is known, the group alone. */
export function withGroup(info: HoverInfo | undefined, understood: Understood, offset: number, textOf: TextOf): HoverInfo | undefined {
  const group = groupAt(understood, offset, textOf);
  const text = group && groupText(group);
  if (!group || text === undefined) return info;
  const code = understood.parsed.text.slice(group.span.start, group.span.end).replace(/\s+/g, ' ');
  if (info) return { ...info, group: { code, text } };
  return { span: group.span, name: code, unit: '', dimension: '1', kinds: [], origin: 'inferred', description: undefined, notes: [], range: group.value, group: { code, text } };
}
