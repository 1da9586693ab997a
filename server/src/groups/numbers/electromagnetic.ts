import type { NumberFamily } from './entry.ts';

const iso = 'ISO 80000-11:2019, magnetohydrodynamics';
const common = 'common practice, electrohydrodynamics';

/** Magnetohydrodynamics, plasmas, electrohydrodynamics, circuits. */
export const electromagnetic: NumberFamily = {
  field: 'electromagnetism',
  numbers: [
    { names: ['magnetic Reynolds number'], symbol: 'Rm', expression: 'v l μ σ', forms: ['velocity * length * permeability of free space * electric conductivity', 'velocity * length / magnetic diffusivity'], standing: 1, source: iso },
    { names: ['Hartmann number'], symbol: 'Ha', expression: 'B l √(σ/μ)', forms: ['magnetic flux density * length * electric conductivity^1/2 * dynamic viscosity^-1/2'], standing: 1, source: iso },
    { names: ['Stuart number', 'interaction parameter'], symbol: 'N', expression: 'B² l σ/(ρ v)', forms: ['magnetic flux density^2 * length * electric conductivity / density / velocity'], standing: 1, source: iso },
    { names: ['Chandrasekhar number'], symbol: 'Q', expression: 'B² l² σ/(ρ ν)', forms: ['magnetic flux density^2 * length^2 * electric conductivity / dynamic viscosity'], standing: 2, source: iso },
    { names: ['Cowling number'], symbol: 'Co', expression: 'B²/(μ ρ v²)', forms: ['magnetic flux density^2 / permeability of free space / density / velocity^2'], standing: 2, source: iso },
    { names: ['Alfvén number', 'magnetic Mach number'], symbol: 'Al', expression: 'v √(ρ μ)/B', forms: ['velocity * density^1/2 * permeability of free space^1/2 / magnetic flux density', 'velocity / Alfvén speed'], standing: 1, source: iso },
    { names: ['Naze number'], symbol: 'Na', expression: 'v_A/c', forms: ['Alfvén speed / speed of sound'], standing: 3, source: iso },
    { names: ['magnetic Prandtl number'], symbol: 'Pr_m', expression: 'ν σ μ', forms: ['kinematic viscosity * electric conductivity * permeability of free space', 'kinematic viscosity / magnetic diffusivity'], standing: 1, source: iso },
    { names: ['Roberts number'], symbol: 'Ro', expression: 'α σ μ', forms: ['thermal diffusivity * electric conductivity * permeability of free space', 'thermal diffusivity / magnetic diffusivity'], standing: 3, source: iso },
    { names: ['Lundquist number'], symbol: 'Lu', expression: 'B l σ √(μ/ρ)', forms: ['magnetic flux density * length * electric conductivity * permeability of free space^1/2 * density^-1/2', 'Alfvén speed * length / magnetic diffusivity'], standing: 2, source: iso },
    { names: ['magnetic pressure number'], symbol: 'N_mp', expression: 'p/(B²/(2 μ))', forms: ['2 * pressure * permeability of free space / magnetic flux density^2'], standing: 2, source: 'common practice, plasma physics (plasma beta)' },
    { names: ['electric field parameter'], symbol: 'Ef', expression: 'E/(v B)', forms: ['electric field strength / velocity / magnetic flux density'], standing: 2, source: iso },
    { names: ['Ampère number'], symbol: 'Am', expression: 'I/(l H)', forms: ['electric current / length / magnetic field strength'], standing: 3, source: iso },
    { names: ['Hall parameter'], symbol: 'β_e', expression: 'μ_e B', forms: ['electric mobility * magnetic flux density'], standing: 2, source: iso },
    { names: ['electric Weber number'], symbol: 'We_e', expression: 'ε E² l/σ', forms: ['permittivity * electric field strength^2 * length / surface tension'], standing: 2, source: common },
    { names: ['Masuda number', 'electric Rayleigh number'], symbol: 'Md', expression: 'ε E² l²/(ρ ν²)', forms: ['permittivity * electric field strength^2 * length^2 / density / kinematic viscosity^2'], standing: 3, source: common },
    { names: ['Mason number'], symbol: 'Mn', expression: 'μ γ̇/(ε E²)', forms: ['dynamic viscosity * shear rate / permittivity / electric field strength^2'], standing: 3, source: common },
    { names: ['charge relaxation number', 'electric Reynolds number'], symbol: 'Re_e', expression: 'ε v/(σ l)', forms: ['permittivity * velocity / electric conductivity / length'], standing: 2, source: iso },
    { names: ['Debye ratio'], symbol: 'κ l', expression: 'l/λ_D', forms: ['length / screening length'], standing: 2, source: 'common practice, colloids and plasmas' },
    { names: ['Rayleigh charge number'], symbol: 'X', expression: 'q²/(64 π² ε σ r³)', forms: ['1/64*pi^2 * electric charge^2 / permittivity / surface tension / length^3'], standing: 3, source: 'common practice, charged drops' },
    { names: ['relative skin depth'], symbol: 'δ/l', expression: 'δ/l', forms: ['skin depth / length'], standing: 2, source: 'common practice, electrical engineering' },
    { names: ['quality factor of a coil'], symbol: 'Q', expression: 'ω L/R', forms: ['angular velocity * inductance / resistance', 'angular frequency * inductance / resistance', '2*pi * frequency * inductance / resistance'], standing: 1, source: 'IEC 60050-151, quality factor' },
    { names: ['quality factor of a resonance'], symbol: 'Q', expression: 'f/Δf', forms: ['natural frequency / bandwidth'], standing: 2, source: 'IEC 60050-151, quality factor' },
    { names: ['reduced time of an RC circuit'], symbol: 't/(R C)', expression: 't/(R C)', forms: ['time / resistance / capacitance'], standing: 2, source: 'common practice, electrical engineering' },
    { names: ['reduced time of an RL circuit'], symbol: 't R/L', expression: 't R/L', forms: ['time * resistance / inductance'], standing: 2, source: 'common practice, electrical engineering' },
    { names: ['velocity relative to light'], symbol: 'β', expression: 'v/c', forms: ['velocity / speed of light'], standing: 2, source: 'common practice, relativity' },
  ],
};
