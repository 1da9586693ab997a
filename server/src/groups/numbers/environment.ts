import type { NumberFamily } from './entry.ts';

const waves = 'common practice, coastal engineering';
const atmosphere = 'common practice, meteorology and oceanography';
const rivers = 'common practice, sediment transport';

/** Rotating and stratified flow, water waves, sediment. */
export const environment: NumberFamily = {
  field: 'environmental flow',
  numbers: [
    { names: ['Rossby number'], symbol: 'Ro', expression: 'v/(2 l Ω sin φ)', forms: ['velocity / length / Coriolis parameter', '1/2 * velocity / length / planetary rotation'], standing: 1, source: 'ISO 80000-11:2019, momentum transfer' },
    { names: ['Ekman number'], symbol: 'Ek', expression: 'ν/(2 l² Ω sin φ)', forms: ['kinematic viscosity / length^2 / Coriolis parameter', '1/2 * kinematic viscosity / length^2 / planetary rotation'], standing: 1, source: 'ISO 80000-11:2019, momentum transfer' },
    { names: ['Richardson number'], symbol: 'Ri', expression: 'g l Δρ/(ρ v²)', forms: ['acceleration of gravity * length * density difference / density / velocity^2'], standing: 1, source: 'ISO 80000-11:2019, momentum transfer' },
    { names: ['gradient Richardson number'], symbol: 'Ri_g', expression: 'N²/S²', forms: ['buoyancy frequency^2 / shear rate^2'], standing: 2, source: atmosphere },
    { names: ['internal Froude number'], symbol: 'Fr_i', expression: 'v/(N l)', forms: ['velocity / buoyancy frequency / length'], standing: 1, source: atmosphere },
    { names: ['Burger number'], symbol: 'Bu', expression: 'N h/(f l)', forms: ['buoyancy frequency * height / Coriolis parameter / length'], standing: 2, source: atmosphere },
    { names: ['stability parameter'], symbol: 'z/L', expression: 'z/L', forms: ['height / Obukhov length'], standing: 2, source: atmosphere },
    { names: ['Ursell number'], symbol: 'U', expression: 'H λ²/h³', forms: ['wave height * wavelength^2 / height^3'], standing: 2, source: waves },
    { names: ['wave steepness'], symbol: 's', expression: 'H/λ', forms: ['wave height / wavelength'], standing: 1, source: waves },
    { names: ['relative depth'], symbol: 'h/λ', expression: 'h/λ', forms: ['height / wavelength'], standing: 1, source: waves },
    { names: ['wave dispersion number'], symbol: 'ω² h/g', expression: 'ω² h/g', forms: ['angular frequency^2 * height / acceleration of gravity'], standing: 2, source: waves },
    { names: ['reduced wave speed'], symbol: 'c/√(g h)', expression: 'c/√(g h)', forms: ['wave speed * acceleration of gravity^-1/2 * height^-1/2'], finds: ['wave speed'], standing: 2, source: waves },
    { names: ['Keulegan-Carpenter number'], symbol: 'KC', expression: 'v t/d', forms: ['velocity * period / length'], standing: 1, source: waves },
    { names: ['Shields parameter'], symbol: 'θ', expression: 'τ/(Δρ g d)', forms: ['shear stress / density difference / acceleration of gravity / particle diameter'], finds: ['shear stress'], standing: 1, source: rivers },
    { names: ['Rouse number'], symbol: 'P', expression: 'w_s/(κ u*), κ = 0.4', forms: ['5/2 * settling velocity / friction velocity'], standing: 2, source: rivers },
    { names: ['Einstein transport parameter'], symbol: 'q*', expression: 'q/√(g d³ Δρ/ρ)', forms: ['volume flow rate per width * acceleration of gravity^-1/2 * particle diameter^-3/2 * density^1/2 * density difference^-1/2'], finds: ['volume flow rate per width'], standing: 3, source: rivers },
    { names: ['particle Reynolds number of shear'], symbol: 'Re*', expression: 'u* d/ν', forms: ['friction velocity * particle diameter / kinematic viscosity'], standing: 2, source: rivers },
  ],
};
