// Textbook relations in JavaScript: the right form stands without a mark, the usual slip carries one. Sources are named by section.

// ==== Head of a column (White, Fluid Mechanics, ch. 2) ====
const rho = 998;  // [kg/m^3]
const g = 9.81;  // [m/s^2]
const h = 4;  // [m]
const p = rho * g * h;  // [Pa]
const q = rho * h;  // [Pa]
// <-- unlike-result

// ==== Velocity in a pipe (White, ch. 3) ====
/**
 * @param {number} Q - flow [m^3/s]
 * @param {number} D - inside diameter [m]
 * @returns {number} velocity [m/s]
 */
export const velocity = (Q, D) => Q / (Math.PI * D ** 2 / 4);
/**
 * @param {number} Q - flow [m^3/s]
 * @param {number} D - inside diameter [m]
 * @returns {number} velocity [m/s]
 */
export const slip = (Q, D) => Q / (Math.PI * D);
// <-- unlike-result

// ==== Reynolds number in an exponential (White, ch. 6) ====
const rho = 998;  // [kg/m^3]
const V = 2;  // [m/s]
const D = 0.1;  // [m]
const x = Math.exp(rho * V * D);
// <-- dimensioned-argument

// ==== Degrees in a sine (ECMA-262, Math.sin) ====
const a = 30;  // [deg]
const s = Math.sin(a);
// <-- scale-mismatch
const t = Math.sin(a * Math.PI / 180);

// ==== Class with fields (common practice) ====
class Shaft {
  N = 6;  // [rev/s]
  D = 0.1;  // [m]
  /** Torque [N m] */
  get torque() { return this.P / (2 * Math.PI * this.N); }
  P = 100;  // [W]
  wrong() { return this.N + this.D; }
  // <-- unlike-terms
}

// ==== Returned record (common practice) ====
/**
 * @param {number} F - force [N]
 * @param {number} A - area [m^2]
 */
function stress(F, A) {
  const sigma = F / A;
  return { sigma, F };
}
const { sigma, F } = stress(f0, a0);
const bad = sigma + F;
// <-- unlike-terms

// ==== Destructured parameters (common practice) ====
const pump = {
  H: 20,  // [m]
  Q: 0.01,  // [m^3/s]
};
const { H, Q: flow } = pump;
const total = H + flow;
// <-- unlike-terms

// ==== Kinetic energy through Math.pow (White, ch. 3) ====
const m = 2;  // [kg]
const v = 3;  // [m/s]
const E = 0.5 * m * Math.pow(v, 2);  // [J]
const E2 = 0.5 * m * v;  // [J]
// <-- unlike-result

// ==== Free fall (Halliday and Resnick, ch. 2) ====
const g = 9.81;  // [m/s^2]
const h = 10;  // [m]
const v = Math.sqrt(2 * g * h);  // [m/s]
const w = 2 * g * h;  // [m/s]
// <-- unlike-result

// ==== Ohm's law (Hayt and Kemmerly, ch. 2) ====
const U = 230;  // [V]
const R = 50;  // [ohm]
const I = U / R;  // [A]
const J = U * R;  // [A]
// <-- unlike-result

// ==== Pressures in two units (SI Brochure) ====
const p1 = 3;  // [bar]
const p2 = 2000;  // [Pa]
const p3 = p1 * 1e5 + p2;  // [Pa]
const p4 = p1 + p2;
// <-- scale-mismatch

// ==== A loop that steps (common practice) ====
let T = 20;  // [degC]
const dt = 60;  // [s]
const rate = 0.01;  // [K/s]
for (let i = 0; i < 10; i++) {
  T += rate * dt;
  T += rate;
  // <-- unlike-terms
}

// ==== Choice by a condition (common practice) ====
const d = 2;  // [m]
const t = 3;  // [s]
const x = t > 1 ? d : t;
// <-- unlike-terms

// ==== The largest of two (ECMA-262, Math.max) ====
const d = 2;  // [m]
const t = 3;  // [s]
const x = Math.max(d, t);
// <-- unlike-terms

// ==== Comparison (common practice) ====
const d = 2;  // [m]
const t = 3;  // [s]
if (d < t) throw new Error('too long');
// <-- unlike-terms

// ==== Heat flow through a wall (Incropera, ch. 3) ====
const k = 0.8;  // [W/(m K)]
const A = 10;  // [m^2]
const dT = 20;  // [K]
const L = 0.2;  // [m]
const q = k * A * dT / L;  // [W]
const r = k * A * dT * L;  // [W]
// <-- unlike-result

// ==== Ideal gas (Cengel and Boles, ch. 3) ====
const p = 101325;  // [Pa]
const R = 287;  // [J/(kg K)]
const T = 293;  // [K]
const rho = p / (R * T);  // [kg/m^3]
const bad = p * R / T;  // [kg/m^3]
// <-- unlike-result

// ==== Distance (ECMA-262, Math.hypot) ====
const x = 3;  // [m]
const y = 4;  // [s]
const d = Math.hypot(x, y);
// <-- unlike-terms

// ==== Arguments of a function (common practice) ====
/**
 * @param {number} m mass [kg]
 * @param {number} a acceleration [m/s^2]
 * @returns {number} force [N]
 */
function force(m, a) {
  return m * a;
}
const v = 3;  // [m/s]
const F = force(m0, v);
// <-- unlike-result

// ==== Constructor (common practice) ====
class Beam {
  /** @param {number} L - length [m] */
  constructor(L) {
    this.L = L;
  }
}
const t = 3;  // [s]
const beam = new Beam(t);
// <-- unlike-result

// ==== Options object by dotted names (JSDoc, @param) ====
/**
 * @param {Object} o - options
 * @param {number} o.L - length [m]
 * @param {number} o.t - time [s]
 */
function speed(o) {
  const v = o.L / o.t;  // [m/s]
  return o.L + o.t;
  // <-- unlike-terms
}

// ==== Spring (Shigley, ch. 10) ====
const k = 500;  // [N/m]
const x = 0.1;  // [m]
const F = k * x;  // [N]
const G = k / x;  // [N]
// <-- unlike-result

// ==== Switch (common practice) ====
let L = 1;  // [m]
switch (kind) {
  case 'a':
    L = 2;
    break;
  default: {
    const t = 3;  // [s]
    L = L + t;
    // <-- unlike-terms
  }
}

// ==== Function in a constant (common practice) ====
/** @param {number} d - diameter [m] */
const area = function (d) {
  const A = Math.PI / 4 * d ** 2;  // [m^2]
  return A + d;
  // <-- unlike-terms
};

// ==== Mean of samples (common practice) ====
const T = 3;  // [s]
const n = 4;  // [-]
const f = n / T;  // [Hz]
const h = n * T;  // [Hz]
// <-- unlike-result
