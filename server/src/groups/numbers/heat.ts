import type { NumberFamily } from './entry.ts';

const iso = 'ISO 80000-11:2019, heat transfer';
const common = 'common practice, heat transfer';

/** Conduction, convection, radiation, boiling and melting. */
export const heat: NumberFamily = {
  field: 'heat transfer',
  numbers: [
    { names: ['Prandtl number'], symbol: 'Pr', expression: 'ν/α = μ c_p/k', forms: ['kinematic viscosity / thermal diffusivity'], standing: 1, source: 'ISO 80000-11:2019, constants of matter' },
    { names: ['Nusselt number'], symbol: 'Nu', expression: 'h l/k', forms: ['heat transfer coefficient * length / thermal conductivity of the fluid', 'heat flux * length / temperature difference / thermal conductivity of the fluid'], finds: ['heat transfer coefficient'], standing: 1, source: iso },
    { names: ['Biot number'], symbol: 'Bi', expression: 'h l/k of the solid', forms: ['heat transfer coefficient * length / thermal conductivity of the solid'], standing: 1, source: iso },
    { names: ['Fourier number'], symbol: 'Fo', expression: 'α t/l²', forms: ['thermal diffusivity * time / length^2'], standing: 1, source: iso },
    { names: ['Péclet number'], symbol: 'Pe', expression: 'v l/α', forms: ['velocity * length / thermal diffusivity'], standing: 2, source: iso },
    { names: ['Grashof number'], symbol: 'Gr', expression: 'g β ΔT l³/ν²', forms: ['acceleration of gravity * thermal expansion coefficient * temperature difference * length^3 / kinematic viscosity^2'], standing: 1, source: 'ISO 80000-11:2019, momentum transfer' },
    { names: ['Rayleigh number'], symbol: 'Ra', expression: 'g β ΔT l³/(ν α)', forms: ['acceleration of gravity * thermal expansion coefficient * temperature difference * length^3 / kinematic viscosity / thermal diffusivity'], standing: 1, source: iso },
    { names: ['modified Grashof number'], symbol: 'Gr*', expression: 'g β q l⁴/(k ν²)', forms: ['acceleration of gravity * thermal expansion coefficient * heat flux * length^4 / thermal conductivity / kinematic viscosity^2'], standing: 2, source: common },
    { names: ['modified Rayleigh number'], symbol: 'Ra*', expression: 'g β q l⁴/(k ν α)', forms: ['acceleration of gravity * thermal expansion coefficient * heat flux * length^4 / thermal conductivity / kinematic viscosity / thermal diffusivity'], standing: 3, source: common },
    { names: ['Darcy-Rayleigh number', 'porous-medium Rayleigh number'], symbol: 'Ra_D', expression: 'g β ΔT K l/(ν α)', forms: ['acceleration of gravity * thermal expansion coefficient * temperature difference * permeability * length / kinematic viscosity / thermal diffusivity'], standing: 2, source: 'common practice, porous media' },
    { names: ['Richardson number of mixed convection'], symbol: 'Ri', expression: 'g β ΔT l/v²', forms: ['acceleration of gravity * thermal expansion coefficient * temperature difference * length / velocity^2'], standing: 1, source: common },
    { names: ['Stanton number'], symbol: 'St', expression: 'h/(ρ v c_p)', forms: ['heat transfer coefficient / density / velocity / specific heat capacity', 'heat transfer coefficient / mass flux / specific heat capacity'], finds: ['heat transfer coefficient'], standing: 1, source: iso },
    { names: ['Colburn factor for heat transfer', 'j-factor'], symbol: 'j_H', expression: '(h/(ρ v c_p)) Pr^(2/3)', forms: ['heat transfer coefficient / density / velocity / specific heat capacity * kinematic viscosity^2/3 * thermal diffusivity^-2/3'], finds: ['heat transfer coefficient'], standing: 2, source: iso },
    { names: ['Graetz number'], symbol: 'Gz', expression: 'd² v/(α l)', forms: ['velocity * length^2 / thermal diffusivity / length', 'mass flow rate * specific heat capacity / thermal conductivity / length'], standing: 2, source: iso },
    { names: ['Eckert number'], symbol: 'Ec', expression: 'v²/(c_p ΔT)', forms: ['velocity^2 / specific heat capacity / temperature difference'], standing: 1, source: iso },
    { names: ['Brinkman number'], symbol: 'Br', expression: 'μ v²/(k ΔT)', forms: ['dynamic viscosity * velocity^2 / thermal conductivity / temperature difference'], standing: 1, source: iso },
    { names: ['Stefan number'], symbol: 'Ste', expression: 'c ΔT/L_f', forms: ['specific heat capacity * temperature difference / latent heat of fusion'], standing: 1, source: iso },
    { names: ['Jakob number'], symbol: 'Ja', expression: 'c_p ΔT/h_fg', forms: ['specific heat capacity * temperature difference / latent heat of vaporisation'], standing: 1, source: common },
    { names: ['Bejan number of heat transfer'], symbol: 'Be', expression: 'Δp l²/(μ α)', forms: ['pressure drop * length^2 / dynamic viscosity / thermal diffusivity'], standing: 2, source: iso },
    { names: ['Clausius number'], symbol: 'Cl', expression: 'ρ v³ l/(k ΔT)', forms: ['density * velocity^3 * length / thermal conductivity / temperature difference'], standing: 3, source: iso },
    { names: ['Carnot number'], symbol: 'Ca', expression: 'ΔT/T', forms: ['temperature difference / reference temperature'], standing: 3, source: iso },
    { names: ['heat Froude number'], symbol: 'Fo*', expression: 'g l³/α²', forms: ['acceleration of gravity * length^3 / thermal diffusivity^2'], standing: 3, source: iso },
    { names: ['Pomerantsev number'], symbol: 'Po', expression: 'q_v l²/(k ΔT)', forms: ['heat source density * length^2 / thermal conductivity / temperature difference'], standing: 2, source: iso },
    { names: ['Kirpichev number'], symbol: 'Ki', expression: 'q l/(k ΔT)', forms: ['heat flux * length / thermal conductivity of the solid / temperature difference'], standing: 3, source: 'common practice, drying and heating of solids' },
    { names: ['Boltzmann number', 'Thring number'], symbol: 'Bz', expression: 'ρ c_p v/(σ T³)', forms: ['density * specific heat capacity * velocity / Stefan-Boltzmann constant / temperature^3'], standing: 2, source: iso },
    { names: ['Stark number'], symbol: 'Sk', expression: 'σ T³ l/k', forms: ['Stefan-Boltzmann constant * temperature^3 * length / thermal conductivity'], standing: 2, source: iso },
    { names: ['conduction-radiation parameter', 'Planck number'], symbol: 'N', expression: 'k κ/(4 σ T³)', forms: ['1/4 * thermal conductivity * absorption coefficient / Stefan-Boltzmann constant / temperature^3'], standing: 2, source: 'common practice, radiative transfer' },
    { names: ['optical thickness'], symbol: 'τ', expression: 'κ l', forms: ['absorption coefficient * length'], standing: 1, source: 'common practice, radiative transfer' },
    { names: ['number of transfer units'], symbol: 'NTU', expression: 'U A/(ṁ c_p)', forms: ['heat transfer coefficient * area / mass flow rate / specific heat capacity', 'thermal conductance / mass flow rate / specific heat capacity', 'thermal conductance / heat capacity rate'], standing: 1, source: 'common practice, heat exchangers' },
    { names: ['fin parameter'], symbol: 'm l', expression: 'l √(h P/(k A))', forms: ['length * heat transfer coefficient^1/2 * length^1/2 * thermal conductivity of the solid^-1/2 * area^-1/2'], standing: 2, source: 'common practice, extended surfaces' },
    { names: ['boiling number'], symbol: 'Bo', expression: 'q/(G h_fg)', forms: ['heat flux / mass flux / latent heat of vaporisation'], finds: ['heat flux'], standing: 2, source: 'common practice, flow boiling' },
    { names: ['Kutateladze number of boiling crisis'], symbol: 'Ku', expression: 'q/(h_fg ρ_v^½ (σ g Δρ)^¼)', forms: ['heat flux / latent heat of vaporisation * density^-1/2 * surface tension^-1/4 * acceleration of gravity^-1/4 * density difference^-1/4', 'heat flux / latent heat of vaporisation * density^-3/4 * surface tension^-1/4 * acceleration of gravity^-1/4'], finds: ['heat flux'], standing: 3, source: 'common practice, pool boiling' },
    { names: ['Marangoni number'], symbol: 'Mg', expression: '(dσ/dT) ΔT l/(μ α)', forms: ['surface tension per temperature * temperature difference * length / dynamic viscosity / thermal diffusivity'], standing: 2, source: 'ISO 80000-11:2019, mass transfer' },
    { names: ['crispation number'], symbol: 'Cr', expression: 'μ α/(σ l)', forms: ['dynamic viscosity * thermal diffusivity / surface tension / length'], standing: 3, source: 'common practice, thermocapillary flow' },
    { names: ['heat capacity ratio', 'ratio of specific heats', 'isentropic exponent'], symbol: 'γ', expression: 'c_p/c_v', forms: ['specific heat capacity at constant pressure / specific heat capacity at constant volume'], standing: 1, source: 'ISO 80000-5, ratio of the specific heat capacities' },
  ],
};
