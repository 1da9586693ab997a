import type { Fixer } from './fix.ts';
import { allow } from './fixes/allow.ts';
import { correctNote } from './fixes/correct-note.ts';
import { convert } from './fixes/convert.ts';
import { nameNumber } from './fixes/name-number.ts';
import { offset } from './fixes/offset.ts';
import { regroup } from './fixes/regroup.ts';
import { repair } from './fixes/repair.ts';
import { writeNote } from './fixes/write-note.ts';

/** Every fix, in the order in which they are tried. */
export const fixers: readonly Fixer[] = [convert, offset, nameNumber, correctNote, repair, writeNote, regroup, allow];
