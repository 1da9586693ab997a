/** A script of our own with most of what the front end meets: small enough for every prefix of it to be parsed. */
export const script = `#!/usr/bin/env node
// Settling tank, first sizing
import { water as w } from './water.js';

/**
 * Velocity after Stokes.
 * @param {number} d - grain size [m]
 * @param {number} [rho_s=2650] - density of the grain [kg/m^3]
 * @returns {number} velocity [m/s]
 */
export function settle(d, rho_s = 2650, { mu = 1e-3 } = {}) {
  const v = g * (rho_s - 998) * d ** 2 / (18 * mu);  // [m/s]
  return v > 0 ? v : \`none \${v}\`;
  // end
}
const g = 9.81, sizes = [1e-4, 3e-4];  // both
const tank = {
  width: 4.0,  // [m]
  'depth': 3.2, ...w,
};
for (let i = 0; i < sizes.length; i++) { total += settle(sizes[i]); }
for (const s of sizes) console.log("d = " + s + /[m/s]/.source);
switch (mode) { case 'a': x = 1; break; default: x = 2; }
class Basin extends Tank {
  depth = 3;  // [m]
  static of(x) { return new Basin(x?.y ?? 0); }
  get area() { return this.width * this.depth; }
}
try { [a, b] = [b, a]; } catch { throw new Error('x'); }
sizes.forEach((s) => { sum += s; });
const y = 1;
const z = 2;
const y2 = 1;
module.exports = { settle, g: g };
`;
