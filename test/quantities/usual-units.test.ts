/** The units that completion proposes; what each is comes from the catalogue, whose factors have their own sources. */
import { describe, expect, test } from 'vitest';
import { kindsOf } from '../../server/src/quantities/kinds.ts';
import { parseUnit } from '../../server/src/quantities/parse-unit.ts';
import { usualUnits, usualUnitsOf } from '../../server/src/quantities/usual-units.ts';

describe.each(usualUnits.map((row) => [row[0] as string, row] as const))('%s', (first, row) => {
  test('every spelling is read without a doubt and has one dimension', () => {
    const read = row.map((text) => parseUnit(text, { describes: first === 'K' ? 'T' : 'x' }));
    expect(row.filter((_, at) => !read[at]?.ok)).toEqual([]);
    expect(new Set(read.map((each) => (each.ok ? each.unit.dimension : undefined))).size).toBe(1);
  });

  test('its dimension has a name', () => {
    const read = parseUnit(first);
    expect(read.ok && (read.unit.dimension.isOne || kindsOf(read.unit.dimension).length > 0)).toBe(true);
  });
});

test('one row for each dimension', () => {
  const dimensions = usualUnits.map(([first]) => parseUnit(first as string)).map((read) => (read.ok ? read.unit.dimension : undefined));
  expect(new Set(dimensions).size).toBe(dimensions.length);
  expect(usualUnitsOf(dimensions[1] as NonNullable<(typeof dimensions)[number]>)).toEqual(usualUnits[1]);
});
