import type { NumberFamily } from './entry.ts';

const common = 'common practice, turbomachinery';
const ships = 'common practice, propellers (ITTC usage)';

/** Pumps, turbines, propellers, stirrers. */
export const machines: NumberFamily = {
  field: 'fluid machinery',
  numbers: [
    { names: ['power number', 'Newton number of stirring'], symbol: 'Ne', expression: 'P/(ρ n³ d⁵)', forms: ['power / density / rotational frequency^3 / length^5', '8*pi^3 * power / density / angular velocity^3 / length^5'], finds: ['power'], standing: 1, source: 'ISO 80000-11:2019, momentum transfer' },
    { names: ['flow coefficient', 'pumping number', 'aeration number'], symbol: 'φ', expression: 'Q/(n d³)', forms: ['volume flow rate / rotational frequency / length^3', 'volume flow rate / angular velocity / length^3'], finds: ['volume flow rate'], standing: 1, source: common },
    { names: ['head coefficient'], symbol: 'ψ', expression: 'g H/(n² d²)', forms: ['acceleration of gravity * head / rotational frequency^2 / length^2', 'specific energy / rotational frequency^2 / length^2', 'specific energy / angular velocity^2 / length^2', 'pressure drop / density / rotational frequency^2 / length^2'], finds: ['specific energy', 'head'], standing: 1, source: common },
    { names: ['specific speed'], symbol: 'n_q', expression: 'n √Q/(g H)^(3/4)', forms: ['rotational frequency * volume flow rate^1/2 * specific energy^-3/4', 'angular velocity * volume flow rate^1/2 * specific energy^-3/4', 'rotational frequency * volume flow rate^1/2 * acceleration of gravity^-3/4 * head^-3/4'], standing: 1, source: common },
    { names: ['power specific speed'], symbol: 'n_s', expression: 'n √(P/ρ)/(g H)^(5/4)', forms: ['rotational frequency * power^1/2 * density^-1/2 * specific energy^-5/4', 'rotational frequency * power^1/2 * density^-1/2 * acceleration of gravity^-5/4 * head^-5/4'], standing: 2, source: common },
    { names: ['specific diameter'], symbol: 'd_s', expression: 'd (g H)^(1/4)/√Q', forms: ['length * specific energy^1/4 * volume flow rate^-1/2', 'length * acceleration of gravity^1/4 * head^1/4 * volume flow rate^-1/2'], standing: 2, source: common },
    { names: ['torque coefficient'], symbol: 'K_Q', expression: 'M/(ρ n² d⁵)', forms: ['moment of force / density / rotational frequency^2 / length^5', '4*pi^2 * moment of force / density / angular velocity^2 / length^5'], finds: ['moment of force'], standing: 1, source: ships },
    { names: ['thrust coefficient'], symbol: 'c_T', expression: 'F/(ρ n² d⁴)', forms: ['force / density / rotational frequency^2 / length^4', 'thrust / density / rotational frequency^2 / length^4'], finds: ['thrust'], standing: 1, source: 'ISO 80000-11:2019, momentum transfer' },
    { names: ['advance ratio'], symbol: 'J', expression: 'v/(n d)', forms: ['velocity / rotational frequency / length'], standing: 1, source: ships },
    { names: ['tip speed ratio'], symbol: 'λ', expression: 'ω r/v', forms: ['rotor angular velocity * length / velocity'], standing: 1, source: 'common practice, wind turbines' },
    { names: ['power coefficient'], symbol: 'C_P', expression: 'P/(½ ρ v³ A)', forms: ['2 * power / density / velocity^3 / area'], finds: ['power'], standing: 1, source: 'common practice, wind turbines' },
    { names: ['mixing number'], symbol: 'n t', expression: 'n t', forms: ['rotational frequency * mixing time'], finds: ['mixing time'], standing: 1, source: 'common practice, stirred tanks' },
    { names: ['rotational Mach number'], symbol: 'Ma_n', expression: 'n d/c', forms: ['rotational frequency * length / speed of sound'], standing: 2, source: common },
  ],
};
