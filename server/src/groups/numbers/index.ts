import { electromagnetic } from './electromagnetic.ts';
import type { NumberFamily } from './entry.ts';
import { environment } from './environment.ts';
import { flow } from './flow.ts';
import { heat } from './heat.ts';
import { machines } from './machines.ts';
import { mass } from './mass.ts';
import { solids } from './solids.ts';

/** Every characteristic number that is recognised, by field. */
export const numberFamilies: readonly NumberFamily[] = [flow, heat, mass, machines, environment, solids, electromagnetic];
