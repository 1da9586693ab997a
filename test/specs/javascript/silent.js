// Idioms of the language that say nothing of units.

// ==== Texts joined with numbers ====
const T = 20;  // [degC]
const p = 3;  // [bar]
console.log('T = ' + T + p + ' bar');
// ==== A text built up ====
const T = 20;  // [K]
const L = 2;  // [m]
function label() {
  let s = '';
  s += T;
  s += L;
  return s;
}
// ==== Templates ====
const T = 20;  // [K]
const L = 2;  // [m]
const s = `${T} ${L}` + L;
// ==== Dates ====
const now = new Date();
const dt = now - start;  // [ms]
// ==== Elements of a page ====
const w = document.body.clientWidth + 20;
el.style.width = w + 'px';
// ==== Regular expressions ====
const unit = /[m/s]/;
const ok = unit.test(text) && /\[kg\]/.exec(text);
// ==== Bits ====
const flags = a | b;
const n = (x >> 2) + (y & 3);
// ==== Callbacks ====
const L = 2;  // [m]
let sum = 0;
xs.forEach((x) => { sum += x; });
const y = sum + L;
// ==== Reduce ====
const total = xs.reduce((a, b) => a + b, 0);
// ==== Promises ====
const r = await fetch(url);
const v = (await r.json()).value + 2;
// ==== Optional values ====
const L = opts?.L ?? 2;  // [m]
const W = opts.W || 3;  // [m]
const A = L * W;  // [m^2]
// ==== Counting ====
let i = 0;
i++;
for (let k = 0; k < 10; k += 2) i += k;
// ==== Type tags ====
/** @type {number[]} */
const xs = [];
/** @param {string} name - the name [kg] */
function f(name) { return name + 2; }
// ==== Brackets that are lists ====
/**
 * @param {number} [n=2] - how many
 * @returns {Array<[string, number]>} pairs [name, value]
 */
function pairs(n) { return []; }
// ==== Exchange ====
let a = 2;  // [m]
let b = 3;  // [m]
[a, b] = [b, a];
// ==== Unlike things in an array ====
const p = 3;  // [Pa]
const T = 300;  // [K]
const state = [p, T];
const [p1, T1] = state;
const rho = p1 / (287 * T1);
// ==== Spread ====
const base = { L: 2 };
const more = { ...base, L: t0 };
const x = more.L + 2;
// ==== Namespaced exports ====
module.exports = { f, g: h };
exports.k = 2;
// ==== Labels and breaks ====
outer: for (const a of as) { for (const b of a) { if (b > 2) break outer; } }
// ==== Generators ====
function* times(dt) { let t = 0; while (true) { yield t; t += dt; } }
// ==== Getter and setter ====
class Box { #w = 2; get w() { return this.#w; } set w(v) { this.#w = v; } }
// ==== Comma ====
for (let a = 0, b = 9; a < b; a++, b--) swap(a, b);
// ==== Immediately called ====
(function () { 'use strict'; const x = 2; return x; })();
// ==== Old constructors ====
function Maker() { this.f = function (x) { return x + 1; }; }
Maker.prototype.g = function (y) { return y + this.z; };
// ==== Links and citations ====
/** See {@link #ref_1|[1]} and [2]; arr[i] is of [n x 3]. */
function cite(x) { return x; }
// ==== Several declarators ====
let a = 2, b = 3;  // [m]
const c = a + b;
