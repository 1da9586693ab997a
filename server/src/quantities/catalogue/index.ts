/** Every unit the product knows, family by family, and the SI prefixes. */
import { amount } from './amount-concentration.ts';
import { angle, rotation } from './angle-rotation.ts';
import { electric } from './electric.ts';
import { energy, power } from './energy-power.ts';
import type { UnitFamily } from './entry.ts';
import { flow, speed } from './flow.ts';
import { force, gaugePressure, pressure } from './force-pressure.ts';
import { heat } from './heat.ts';
import { information, levels } from './information-levels.ts';
import { area, length, volume } from './length-area-volume.ts';
import { mass } from './mass.ts';
import { navigation } from './navigation.ts';
import { photometry } from './photometry.ts';
import { radiation } from './radiation.ts';
import { ratios } from './ratios.ts';
import { siBase } from './si-base.ts';
import { siDerived } from './si-derived.ts';
import { temperature } from './temperature.ts';
import { time } from './time.ts';
import { viscosity } from './viscosity.ts';

export { prefixes } from './prefixes.ts';

/** The unit catalogue. A unit is looked up by symbol first and by name next; a whole symbol wins over prefix plus symbol. */
export const catalogue: readonly UnitFamily[] = [
  siBase, siDerived, length, area, volume, mass, time, force, pressure, gaugePressure, energy, power, temperature, flow, speed,
  viscosity, angle, rotation, electric, photometry, radiation, amount, information, levels, ratios, heat, navigation,
];
