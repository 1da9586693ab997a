import type { NumberFamily } from './entry.ts';

const structures = 'common practice, structural mechanics';
const tribology = 'common practice, tribology';
const soil = 'common practice, soil mechanics';

/** Elasticity, vibration, fracture, bearings, wear, soils. */
export const solids: NumberFamily = {
  field: 'solid mechanics',
  numbers: [
    { names: ['Cauchy number'], symbol: 'Cy', expression: 'ρ v²/K', forms: ['density * velocity^2 / bulk modulus'], standing: 1, source: 'ISO 80000-11:2019, constants of matter' },
    { names: ['Hooke number'], symbol: 'Ho', expression: 'ρ v²/E', forms: ['density * velocity^2 / elastic modulus'], standing: 2, source: 'ISO 80000-11:2019, constants of matter' },
    { names: ['damage number'], symbol: 'Dn', expression: 'ρ v²/σ_y', forms: ['density * velocity^2 / yield stress'], standing: 2, source: 'common practice, impact' },
    { names: ['buckling load factor'], symbol: 'P l²/(E I)', expression: 'P l²/(E I)', forms: ['force * length^2 / elastic modulus / second moment of area', 'force * length^2 / flexural rigidity'], standing: 2, source: structures },
    { names: ['slenderness ratio'], symbol: 'λ', expression: 'l/i', forms: ['length / radius of gyration'], standing: 1, source: structures },
    { names: ['relative deflection'], symbol: 'w/l', expression: 'w/l', forms: ['deflection / length'], finds: ['deflection'], standing: 2, source: structures },
    { names: ['damping ratio'], symbol: 'ζ', expression: 'c/(2 √(k m))', forms: ['1/2 * damping coefficient * stiffness^-1/2 * mass^-1/2'], standing: 1, source: 'ISO 2041, damping ratio' },
    { names: ['frequency ratio'], symbol: 'r', expression: 'f/f_n', forms: ['frequency / natural frequency', 'angular frequency / natural frequency'], standing: 1, source: 'common practice, vibration' },
    { names: ['reduced natural frequency'], symbol: 'ω √(m/k)', expression: 'ω √(m/k)', forms: ['angular velocity * mass^1/2 * stiffness^-1/2', 'frequency * mass^1/2 * stiffness^-1/2', 'natural frequency * mass^1/2 * stiffness^-1/2'], standing: 2, source: 'common practice, vibration' },
    { names: ['mass ratio'], symbol: 'm*', expression: 'm/(ρ d²)', forms: ['mass per length / density / length^2'], standing: 2, source: 'common practice, flow-induced vibration' },
    { names: ['brittleness number'], symbol: 's', expression: 'K_Ic/(σ √l)', forms: ['fracture toughness / stress * length^-1/2', 'fracture toughness / yield stress * length^-1/2'], standing: 2, source: 'common practice, fracture mechanics' },
    { names: ['Sommerfeld number'], symbol: 'So', expression: 'μ n r²/(p c²)', forms: ['dynamic viscosity * rotational frequency * length^2 / pressure / clearance^2'], standing: 1, source: 'ISO 80000-11:2019, momentum transfer' },
    { names: ['Hersey number'], symbol: 'H', expression: 'μ n/p', forms: ['dynamic viscosity * rotational frequency / pressure'], standing: 2, source: tribology },
    { names: ['coefficient of friction'], symbol: 'μ', expression: 'F/N', forms: ['friction force / normal force'], finds: ['friction force'], standing: 1, source: 'ISO 80000-4, coefficient of friction' },
    { names: ['Archard wear coefficient'], symbol: 'k', expression: 'V H/(F s)', forms: ['wear volume * hardness / normal force / sliding distance'], finds: ['wear volume'], standing: 1, source: tribology },
    { names: ['load parameter of a lubricated contact'], symbol: 'W', expression: 'F/(E r²)', forms: ['normal force / elastic modulus / length^2'], standing: 2, source: tribology },
    { names: ['speed parameter of a lubricated contact'], symbol: 'U', expression: 'μ v/(E r)', forms: ['dynamic viscosity * velocity / elastic modulus / length'], standing: 2, source: tribology },
    { names: ['stability number'], symbol: 'N', expression: 'c/(γ h)', forms: ['cohesion / unit weight / height'], standing: 1, source: soil },
    { names: ['time factor of consolidation'], symbol: 'T_v', expression: 'c_v t/h²', forms: ['consolidation coefficient * time / length^2'], standing: 1, source: soil },
    { names: ['elastocapillary number'], symbol: 'γ/(E l)', expression: 'γ/(E l)', forms: ['surface tension / elastic modulus / length'], standing: 3, source: 'common practice, soft matter' },
    { names: ['reduced period of a pendulum'], symbol: 't √(g/l)', expression: 't √(g/l)', forms: ['period * acceleration of gravity^1/2 * length^-1/2'], finds: ['period'], standing: 2, source: 'common practice, mechanics' },
  ],
};
