import type { NumberFamily } from './entry.ts';

const iso = 'ISO 80000-11:2019, mass transfer';
const reactors = 'common practice, reaction engineering';

/** Diffusion, mass transfer, chemical reaction, combustion. */
export const mass: NumberFamily = {
  field: 'mass transfer and reaction',
  numbers: [
    { names: ['Schmidt number'], symbol: 'Sc', expression: 'ν/D', forms: ['kinematic viscosity / diffusion coefficient'], standing: 1, source: 'ISO 80000-11:2019, constants of matter' },
    { names: ['Lewis number'], symbol: 'Le', expression: 'α/D', forms: ['thermal diffusivity / diffusion coefficient'], standing: 1, source: 'ISO 80000-11:2019, constants of matter' },
    { names: ['Sherwood number', 'Nusselt number for mass transfer'], symbol: 'Sh', expression: 'k_c l/D', forms: ['mass transfer coefficient * length / diffusion coefficient'], finds: ['mass transfer coefficient'], standing: 1, source: iso },
    { names: ['Péclet number for mass transfer'], symbol: 'Pe_m', expression: 'v l/D', forms: ['velocity * length / diffusion coefficient'], standing: 2, source: iso },
    { names: ['Fourier number for mass transfer'], symbol: 'Fo_m', expression: 'D t/l²', forms: ['diffusion coefficient * time / length^2'], standing: 1, source: iso },
    { names: ['Stanton number for mass transfer'], symbol: 'St_m', expression: 'k_c/v', forms: ['mass transfer coefficient / velocity'], finds: ['mass transfer coefficient'], standing: 2, source: iso },
    { names: ['Colburn factor for mass transfer'], symbol: 'j_D', expression: '(k_c/v) Sc^(2/3)', forms: ['mass transfer coefficient / velocity * kinematic viscosity^2/3 * diffusion coefficient^-2/3'], finds: ['mass transfer coefficient'], standing: 2, source: iso },
    { names: ['Graetz number for mass transfer'], symbol: 'Gz_m', expression: 'd² v/(D l)', forms: ['velocity * length^2 / diffusion coefficient / length', 'volume flow rate / diffusion coefficient / length'], standing: 3, source: iso },
    { names: ['Bejan number of mass transfer'], symbol: 'Be_m', expression: 'Δp l²/(μ D)', forms: ['pressure drop * length^2 / dynamic viscosity / diffusion coefficient'], standing: 3, source: iso },
    { names: ['Bodenstein number'], symbol: 'Bd', expression: 'v l/D_ax', forms: ['velocity * length / axial dispersion coefficient'], standing: 2, source: 'ISO 80000-11:2019, momentum transfer' },
    { names: ['Rayleigh number for mass transfer'], symbol: 'Ra_m', expression: 'g l³ Δρ/(μ D)', forms: ['acceleration of gravity * length^3 * density difference / dynamic viscosity / diffusion coefficient'], standing: 2, source: 'common practice, double diffusion' },
    { names: ['Damköhler number, first'], symbol: 'Da', expression: 'k t', forms: ['rate constant * residence time', 'rate constant * length / velocity', 'reaction rate * residence time / amount concentration', 'reaction rate * length / velocity / amount concentration', 'second-order rate constant * amount concentration * residence time'], standing: 1, source: reactors },
    { names: ['Damköhler number, second'], symbol: 'Da_II', expression: 'k l²/D', forms: ['rate constant * length^2 / diffusion coefficient', 'reaction rate * length^2 / diffusion coefficient / amount concentration'], standing: 1, source: reactors },
    { names: ['Thiele modulus'], symbol: 'φ', expression: 'l √(k/D)', forms: ['length * rate constant^1/2 * diffusion coefficient^-1/2', 'particle diameter * rate constant^1/2 * diffusion coefficient^-1/2'], standing: 1, source: reactors },
    { names: ['Weisz-Prater number'], symbol: 'N_WP', expression: 'r l²/(D c)', forms: ['reaction rate * particle diameter^2 / diffusion coefficient / amount concentration'], standing: 3, source: reactors },
    { names: ['Hatta number'], symbol: 'Ha', expression: '√(k D)/k_L', forms: ['rate constant^1/2 * diffusion coefficient^1/2 / mass transfer coefficient', 'second-order rate constant^1/2 * amount concentration^1/2 * diffusion coefficient^1/2 / mass transfer coefficient'], standing: 1, source: reactors },
    { names: ['Arrhenius number'], symbol: 'γ', expression: 'E/(R T)', forms: ['molar energy / molar gas constant / temperature', 'energy of activation per particle / Boltzmann constant / temperature'], standing: 1, source: reactors },
    { names: ['Zeldovich number'], symbol: 'Ze', expression: 'E ΔT/(R T²)', forms: ['molar energy * temperature difference / molar gas constant / temperature^2'], standing: 2, source: 'common practice, combustion' },
    { names: ['Karlovitz number'], symbol: 'Ka', expression: 'γ̇ δ/s_L', forms: ['shear rate * thickness / flame speed'], standing: 3, source: 'common practice, combustion' },
    { names: ['Prater number'], symbol: 'β', expression: 'H D c/(k T)', forms: ['molar energy * diffusion coefficient * amount concentration / thermal conductivity / temperature'], standing: 2, source: reactors },
    { names: ['Damköhler number, third'], symbol: 'Da_III', expression: 'H r l/(ρ c_p v T)', forms: ['molar energy * reaction rate * length / density / specific heat capacity / velocity / temperature'], standing: 3, source: reactors },
    { names: ['Damköhler number, fourth'], symbol: 'Da_IV', expression: 'H r l²/(k T)', forms: ['molar energy * reaction rate * length^2 / thermal conductivity / temperature'], standing: 3, source: reactors },
    { names: ['compressibility factor'], symbol: 'Z', expression: 'p V/(n R T)', forms: ['pressure * volume / amount of substance / molar gas constant / temperature', 'pressure * molar mass / density / molar gas constant / temperature', 'pressure / density / specific gas constant / temperature'], standing: 1, source: 'ISO 80000-5, compressibility factor' },
    { names: ['molar Sherwood number'], symbol: 'Sh', expression: 'N l/(D c)', forms: ['molar flux * length / diffusion coefficient / amount concentration'], finds: ['molar flux'], standing: 2, source: 'common practice, mass transfer' },
  ],
};
