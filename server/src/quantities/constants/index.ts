/** The constants an engineer meets, with the rounded forms they take in scripts. */
import type { ConstantEntry } from '../catalogue/entry.ts';
import { engineeringConstants } from './engineering.ts';
import { gasConstants } from './gases.ts';
import { mechanicsConstants } from './mechanics.ts';
import { physicalConstants } from './physical.ts';

/** Every constant that a bare number of a script may stand for. Where two fit, the earlier one is the likelier. */
export const constants: readonly ConstantEntry[] = [...mechanicsConstants, ...gasConstants, ...physicalConstants, ...engineeringConstants];
