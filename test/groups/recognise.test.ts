import { describe, expect, it } from 'vitest';
import { compositeText, recognitionText } from '../../server/src/groups/names.ts';
import { recogniseProduct } from '../../server/src/groups/product.ts';
import { parseUnit } from '../../server/src/quantities/parse-unit.ts';
import { product } from './checks.ts';
import { relation } from './relations.ts';

/** Names of a product among symbols; `none` where it has no name, `not dimensionless` where it is none. */
function names(source: string, symbols: string): string {
  const found = recogniseProduct(product(source), relation(symbols).symbols);
  if (!found) return 'not dimensionless';
  return found.recognised.map(recognitionText).join('; ') || 'none';
}

const flow = 'rho density; V speed; D length; mu viscosity; g acceleration; dp pressure pressure drop; L length pipe length; F force drag force; A area';

// Definitions: ISO 80000-11:2019 and common practice, from memory.
describe('by kinds of quantity', () => {
  it.each([
    ['rho V D / mu', flow, 'Reynolds number'],
    ['mu / rho V D', flow, 'reciprocal of Reynolds number'],
    ['rho^2 V^2 D^2 / mu^2', flow, 'Reynolds number squared'],
    ['V / g^1/2 D^1/2', flow, 'Froude number'],
    ['V^2 / g D', flow, 'Froude number squared'],
    ['dp / rho V^2', flow, 'Euler number; 1/2 of pressure coefficient'],
    ['F / rho V^2 A', flow, '1/2 of drag coefficient'],
    ['F / rho V^2 D^2', flow, '1/2 of drag coefficient'],
    ['dp D / L rho V^2', flow, '1/2 of Darcy friction factor; 2 times Fanning friction factor'],
    ['rho g^1/2', flow, 'not dimensionless'],
    ['L / D', flow, 'none'],
    ['m / D mu', 'm massflow; D length; mu viscosity', 'pi/4 times Reynolds number'],
    ['a b / c', 'a density; b viscosity; c viscosity', 'not dimensionless'],
    // The letters of the Reynolds number without its kinds of quantity.
    ['rho V D / mu', 'rho number; V length; D length; mu area', 'none'],
    // Its kinds of quantity without its letters.
    ['q w e / r', 'q density; w speed; e length; r viscosity', 'Reynolds number'],
    ['F / rho V^2 b h', 'F force lift; rho density; V speed; b length span; h length chord', '1/2 of lift coefficient'],
    ['I Vp / e', 'I current; Vp voltage; e power', 'none'],
  ])('%s of %s: %s', (source, symbols, expected) => {
    expect(names(source, symbols)).toBe(expected);
  });
});

describe('where dimensions cannot tell', () => {
  it.each([
    ['V L / x', 'V speed; L length; x diffusivity kinematic viscosity', 'Reynolds number'],
    ['V L / x', 'V speed; L length; x diffusivity thermal diffusivity', 'Péclet number'],
    ['V L / x', 'V speed; L length; x diffusivity diffusion coefficient of the salt', 'Péclet number for mass transfer'],
    ['V L / x', 'V speed; L length; x diffusivity magnetic diffusivity', 'magnetic Reynolds number'],
    ['V L / nu', 'V speed; L length; nu diffusivity', 'Reynolds number'],
    ['V L / alpha', 'V speed; L length; alpha diffusivity', 'Péclet number'],
    ['V L / D_AB', 'V speed; L length; D_AB diffusivity', 'Péclet number for mass transfer'],
    ['V L / x', 'V speed; L length; x diffusivity', 'Reynolds number; Péclet number; Péclet number for mass transfer'],
    // Words outweigh letters.
    ['V L / nu', 'V speed; L length; nu diffusivity thermal diffusivity', 'Péclet number'],
    ['h L / k', 'h film; L length; k conductivity', 'Nusselt number; Biot number'],
    ['h L / k', 'h film; L length; k conductivity conductivity of the wall', 'Biot number'],
    ['h L / k', 'h film; L length; k conductivity conductivity of air', 'Nusselt number'],
    ['V / c', 'V speed; c speed', 'none'],
    ['V / c', 'V speed; c speed speed of sound', 'Mach number'],
    ['V / speed_of_sound', 'V speed; speed_of_sound speed', 'Mach number'],
    ['l / D', 'l length; D length', 'none'],
    ['l / D', 'l length mean free path; D length', 'Knudsen number'],
    ['p / rho V^2', 'p pressure wall shear stress; rho density; V speed', '1/8 of Darcy friction factor; 1/2 of Fanning friction factor'],
    ['rho V^2 / E', 'rho density; V speed; E pressure bulk modulus', 'Cauchy number'],
    ['f L / V', 'f rate shedding frequency; L length; V speed', 'Strouhal number'],
    ['V / n D', 'n rate propeller speed; D length; V speed', 'advance ratio'],
    ['omega R / V', 'omega rate angular velocity of the turbine; R length; V speed', 'tip speed ratio'],
    ['dT c / L', 'dT temperature; c heat; L specific latent heat of melting', 'Stefan number'],
    ['dT c / L', 'dT temperature; c heat; L specific heat of vaporisation', 'Jakob number'],
  ])('%s of %s: %s', (source, symbols, expected) => {
    expect(names(source, symbols)).toBe(expected);
  });
});

describe('the unit as evidence', () => {
  const rotating = (unitText: string) => {
    const read = parseUnit(unitText);
    if (!read.ok) throw new Error(unitText);
    const symbols = relation('rho density; x rate; D length; P power; eta viscosity; V speed').symbols;
    return symbols.map((symbol) => (symbol.name === 'x' ? { ...symbol, unit: read.unit } : symbol));
  };
  const named = (source: string, unitText: string) => recogniseProduct(product(source), rotating(unitText))?.recognised.map(recognitionText).join('; ');

  it.each([
    ['P / rho x^3 D^5', 'rev/s', 'power number'],
    ['P / rho x^3 D^5', 'rad/s', '1/(8*pi^3) times power number'],
    ['x D / V', 'Hz', 'Strouhal number'],
    ['x D / V', 'rev/s', 'reciprocal of advance ratio'],
    ['rho x D^2 / eta', 'rad/s', 'Reynolds number'],
  ])('%s with x in %s: %s', (source, unitText, expected) => {
    expect(named(source, unitText)).toBe(expected);
  });
});

describe('composites', () => {
  const composite = (source: string, symbols: string) => (recogniseProduct(product(source), relation(symbols).symbols)?.composites ?? []).map(compositeText);
  const convection = 'rho density; V speed; L length; mu viscosity; cp heat; k conductivity of the fluid; h film; g acceleration; beta expansion; dT temperature';

  it.each([
    ['rho V L cp / k', 'Re·Pr'],
    ['rho^2 g beta dT L^3 cp / mu k', 'Gr·Pr'],
  ] as const)('%s is %s', (source, expected) => {
    expect(composite(source, convection)).toContain(expected);
  });

  it('does not explain a number by larger ones', () => {
    expect(composite('rho V L / mu', convection)).toEqual([]);
  });
});
