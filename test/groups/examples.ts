/**
 * Worked examples of published texts: the quantities they list and the groups they arrive at. Sources are cited from memory; where only
 * the subject is sure, the source says so. `named`: characteristic numbers that the default choice must name.
 */
export interface Example {
  readonly source: string;
  /** The dependent symbol first; see relations.ts. */
  readonly relation: string;
  readonly rank: number;
  readonly groups: readonly string[];
  readonly named?: readonly string[];
  readonly unmatched?: readonly string[];
}

const white = 'White, Fluid Mechanics, McGraw-Hill, 8th ed., ch. 5 (from memory)';
const munson = 'Munson, Okiishi et al., Fundamentals of Fluid Mechanics, Wiley, 7th ed., ch. 7 (from memory)';
const bridgman = 'Bridgman, Dimensional Analysis, Yale University Press, 1922 (from memory)';
const langhaar = 'Langhaar, Dimensional Analysis and Theory of Models, Wiley, 1951 (from memory)';
const barenblatt = 'Barenblatt, Scaling, Self-similarity, and Intermediate Asymptotics, Cambridge, 1996, ch. 1 (from memory)';
const zlokarnik = 'Zlokarnik, Scale-up in Chemical Engineering, Wiley-VCH, 2nd ed., 2006 (from memory)';
const incropera = 'Incropera, DeWitt et al., Fundamentals of Heat and Mass Transfer, Wiley, 7th ed. (from memory)';
const bird = 'Bird, Stewart, Lightfoot, Transport Phenomena, Wiley, 2nd ed. (from memory)';
const practice = 'from memory, common practice';

export const fluidExamples: readonly Example[] = [
  { source: `${white}: drag of a body`, relation: 'F force drag force; L length; V speed; rho density; mu viscosity', rank: 3, groups: ['F / rho V^2 L^2', 'rho V L / mu'], named: ['drag coefficient', 'Reynolds number'] },
  { source: `${white}: pressure drop in a rough pipe`, relation: 'dp pressure pressure drop; rho density; V speed; mu viscosity; d length diameter; L length pipe length; e length roughness height', rank: 3, groups: ['dp / rho V^2', 'rho V d / mu', 'L / d', 'e / d'], named: ['Euler number', 'Reynolds number', 'relative roughness'] },
  { source: `${white}: power of a centrifugal pump`, relation: 'P power shaft power; Q flow; D length impeller diameter; rho density; n rate shaft speed; mu viscosity', rank: 3, groups: ['P / rho n^3 D^5', 'Q / n D^3', 'rho n D^2 / mu'], named: ['power number', 'flow coefficient', 'Reynolds number'] },
  { source: `${white}: head of a pump`, relation: 'gH specific head times gravity; Q flow; D length; n rate rotational speed; rho density; mu viscosity', rank: 3, groups: ['gH / n^2 D^2', 'Q / n D^3', 'rho n D^2 / mu'], named: ['head coefficient', 'flow coefficient'] },
  { source: `${white}: capillary rise`, relation: 'h length; g acceleration; R length; rho density; Y tension; theta number contact angle', rank: 3, groups: ['h / R', 'rho g R^2 / Y', 'theta'], named: ['Bond number'] },
  { source: `${munson}: drag of a plate across a stream`, relation: 'D force drag; w length width; h length height; mu viscosity; rho density; V speed', rank: 3, groups: ['D / w^2 rho V^2', 'w / h', 'rho V w / mu'], named: ['drag coefficient', 'Reynolds number'] },
  { source: `${munson}: pressure drop per length of a smooth pipe`, relation: 'dpl gradient pressure gradient; D length; rho density; mu viscosity; V speed', rank: 3, groups: ['D dpl / rho V^2', 'rho V D / mu'], named: ['Darcy friction factor', 'Reynolds number'] },
  { source: `${munson}: vortex shedding behind a cylinder`, relation: 'f rate shedding frequency; D length; V speed; rho density; mu viscosity', rank: 3, groups: ['f D / V', 'rho V D / mu'], named: ['Strouhal number', 'Reynolds number'] },
  { source: `${munson}: rise of pressure in a bubble or drop`, relation: 'dp pressure; R length; sigma tension', rank: 2, groups: ['dp R / sigma'] },
  { source: `${munson}: wall of a tank, deflection under load of the liquid`, relation: 'delta length deflection; D length; h length; d length wall thickness; gamma gradient specific weight; E pressure modulus of elasticity', rank: 2, groups: ['delta / D', 'h / D', 'd / D', 'E / D gamma'] },
  { source: `${munson}: flow over a spillway or weir`, relation: 'Q flow; H length height over the crest; b length crest width; g acceleration; rho density; mu viscosity; sigma tension', rank: 3, groups: ['Q^2 / g H^5', 'b / H', 'rho^2 g H^3 / mu^2', 'rho g H^2 / sigma'] },
  { source: 'Buckingham, Physical Review 4 (1914) 345: thrust of a screw propeller (from memory)', relation: 'F force thrust; D length diameter; V speed; n rate rotational speed; rho density; nu diffusivity kinematic viscosity; g acceleration', rank: 3, groups: ['F / rho V^2 D^2', 'D n / V', 'V D / nu', 'V^2 / g D'], named: ['advance ratio'] },
  { source: 'Rayleigh, Nature 95 (1915) 66: drop frequency under surface tension (from memory)', relation: 'f rate oscillation frequency; rho density; a length radius; T tension surface tension', rank: 3, groups: ['f^2 rho a^3 / T'] },
  { source: 'Taylor, Proc. R. Soc. A 201 (1950) 159: radius of a blast wave (from memory)', relation: 'R length; E energy; rho density; t time', rank: 3, groups: ['R^5 rho / E t^2'] },
  { source: `${barenblatt}: shock radius with the counterpressure kept`, relation: 'R length; E energy; rho density; t time; p pressure', rank: 3, groups: ['R^5 rho / E t^2', 'p^5 t^6 / E^2 rho^3'] },
  { source: `${barenblatt}: speed of a rowing boat and its drag`, relation: 'F force drag; V speed; l length; rho density; nu diffusivity kinematic viscosity; g acceleration', rank: 3, groups: ['F / rho V^2 l^2', 'V l / nu', 'V^2 / g l'], named: ['drag coefficient', 'Reynolds number', 'Froude number squared'] },
  { source: 'Stokes settling, Clift, Grace, Weber, Bubbles, Drops, and Particles, 1978 (from memory)', relation: 'V speed terminal velocity; d length particle diameter; g acceleration; drho density density difference; rho density; mu viscosity', rank: 3, groups: ['rho V d / mu', 'g d^3 rho drho / mu^2', 'drho / rho'], named: ['Archimedes number', 'Reynolds number'] },
  { source: 'Clift, Grace, Weber, Bubbles, Drops, and Particles, 1978: rise of a bubble (from memory)', relation: 'U speed; d length; g acceleration; rho density; mu viscosity; sigma tension', rank: 3, groups: ['rho U d / mu', 'rho g d^2 / sigma', 'g mu^4 / rho sigma^3'], named: ['Reynolds number', 'Bond number'] },
  { source: `${practice}: thin film coating`, relation: 'h length film thickness; U speed; mu viscosity; sigma tension; rho density; g acceleration', rank: 3, groups: ['h rho U / mu', 'mu U / sigma', 'g mu^4 / rho sigma^3'] },
  { source: `${practice}: cavitation on a hydrofoil`, relation: 'L force lift; V speed; c length chord; rho density; mu viscosity; pm pressure margin above vapour pressure; alpha number angle of attack', rank: 3, groups: ['L / rho V^2 c^2', 'rho V c / mu', 'pm / rho V^2', 'alpha'], named: ['lift coefficient', 'Reynolds number', 'cavitation number'] },
  { source: `${practice}: lift of a wing at high speed`, relation: 'L force lift; V speed; c length chord; a speed speed of sound; rho density; mu viscosity; alpha number', rank: 3, groups: ['L / rho V^2 c^2', 'V / a', 'rho V c / mu', 'alpha'], named: ['lift coefficient', 'Mach number', 'Reynolds number'] },
  { source: `${practice}: Bingham plastic in a pipe`, relation: 'dp pressure pressure drop; V speed; D length; L length; rho density; mu viscosity plastic viscosity; tau pressure yield stress', rank: 3, groups: ['dp / rho V^2', 'rho V D / mu', 'tau D / mu V', 'L / D'], named: ['Bingham number', 'Reynolds number'] },
  { source: `${practice}: mean pressure gradient of steady laminar flow`, relation: 'G gradient; V speed; D length; mu viscosity', rank: 3, groups: ['G D^2 / mu V'], named: ['Poiseuille number'] },
  { source: `${practice}: speed of long waves`, relation: 'c speed wave speed; h length depth; g acceleration; rho density', rank: 3, groups: ['c^2 / g h'], unmatched: ['rho'] },
  { source: `${practice}: waves on deep water with surface tension`, relation: 'c speed wave speed; lambda length wavelength; g acceleration; rho density; sigma tension', rank: 3, groups: ['c^2 / g lambda', 'rho g lambda^2 / sigma'] },
  { source: 'Shields 1936, in: Graf, Hydraulics of Sediment Transport, McGraw-Hill, 1971 (from memory)', relation: 'tau pressure bed shear stress; g acceleration; drho density submerged density difference; d length grain diameter; rho density; mu viscosity', rank: 3, groups: ['tau / drho g d', 'g d^3 drho rho / mu^2', 'drho / rho'], named: ['Shields parameter', 'Archimedes number'] },
  { source: `${practice}: wind turbine`, relation: 'P power; v speed; R length; omega rate rotor angular velocity; rho density; mu viscosity', rank: 3, groups: ['P / rho v^3 R^2', 'omega R / v', 'rho v R / mu'], named: ['power coefficient', 'tip speed ratio', 'Reynolds number'] },
];

export const processExamples: readonly Example[] = [
  { source: `${zlokarnik}: power of a stirrer`, relation: 'P power stirrer power; d length stirrer diameter; n rate stirrer speed; rho density; nu diffusivity kinematic viscosity', rank: 3, groups: ['P / rho n^3 d^5', 'n d^2 / nu'], named: ['power number', 'Reynolds number'] },
  { source: `${zlokarnik}: power of a stirrer with a vortex`, relation: 'P power; d length; D length vessel diameter; n rate stirrer speed; rho density; mu viscosity; g acceleration', rank: 3, groups: ['P / rho n^3 d^5', 'rho n d^2 / mu', 'n^2 d / g', 'D / d'], named: ['power number', 'Reynolds number', 'Froude number of rotation'] },
  { source: `${zlokarnik}: mixing time`, relation: 't time mixing time; d length; n rate stirrer speed; rho density; mu viscosity', rank: 3, groups: ['n t', 'rho n d^2 / mu'], named: ['mixing number', 'Reynolds number'] },
  { source: `${zlokarnik}: throughput of a self-aspirating hollow stirrer`, relation: 'q flow gas throughput; d length; n rate stirrer speed; rho density; mu viscosity; g acceleration; h length depth; D length vessel', rank: 3, groups: ['q / n d^3', 'n^2 d / g', 'rho n d^2 / mu', 'h / d', 'D / d'], named: ['flow coefficient'] },
  { source: `${incropera}, ch. 6: forced convection`, relation: 'h film; V speed; L length; rho density; mu viscosity; cp heat; k conductivity of the fluid', rank: 4, groups: ['h L / k', 'rho V L / mu', 'mu cp / k'], named: ['Nusselt number', 'Reynolds number', 'Prandtl number'] },
  { source: `${incropera}, ch. 9: free convection`, relation: 'h film; L length; gb [L T^-2 Θ^-1] gravity times expansion coefficient; dT temperature; nu diffusivity kinematic viscosity; alpha diffusivity thermal diffusivity; k conductivity of the air', rank: 4, groups: ['h L / k', 'gb dT L^3 / nu^2', 'nu / alpha'], named: ['Nusselt number', 'Prandtl number'] },
  { source: `${incropera}, ch. 5: lumped and transient conduction`, relation: 'T temperature difference from the surroundings; T0 temperature initial difference; h film; L length; k conductivity of the solid; alpha diffusivity thermal diffusivity; t time', rank: 4, groups: ['T / T0', 'h L / k', 'alpha t / L^2'], named: ['Biot number', 'Fourier number'] },
  { source: `${incropera}, ch. 10: nucleate boiling`, relation: 'h film; dT temperature superheat; gdr [M L^-2 T^-2] buoyancy per volume; hfg specific latent heat of vaporization; sigma tension surface tension; L length; rho density; cp heat; k conductivity of the liquid; mu viscosity', rank: 4, groups: ['h L / k', 'rho gdr L^3 / mu^2', 'cp dT / hfg', 'mu cp / k', 'gdr L^2 / sigma', 'hfg rho^2 L^2 / mu^2'], named: ['Nusselt number', 'Prandtl number', 'Jakob number'] },
  { source: `${incropera}, ch. 6: mass transfer to a surface`, relation: 'hm speed mass transfer coefficient; L length; V speed; rho density; mu viscosity; D_AB diffusivity diffusion coefficient', rank: 3, groups: ['hm L / D_AB', 'rho V L / mu', 'mu / rho D_AB'], named: ['Sherwood number', 'Reynolds number'] },
  { source: `${bird}, ch. 10: viscous heating`, relation: 'T temperature temperature rise; T0 temperature temperature difference; mu viscosity; v speed; k conductivity', rank: 3, groups: ['T / T0', 'mu v^2 / k T0'], named: ['Brinkman number'] },
  { source: `${bird}, ch. 14: heat transfer in a tube with its length kept`, relation: 'h film; D length diameter; L length tube length; v speed; rho density; mu viscosity; cp heat; k conductivity of the fluid', rank: 4, groups: ['h D / k', 'rho v D / mu', 'mu cp / k', 'L / D'], named: ['Nusselt number', 'Reynolds number', 'Prandtl number'] },
  { source: 'Levenspiel, Chemical Reaction Engineering, Wiley, 3rd ed., ch. 13: dispersion in a tubular reactor (from memory)', relation: 'c concentration; c0 concentration; k rate reaction rate constant; L length; u speed; D diffusivity axial dispersion', rank: 3, groups: ['c / c0', 'k L / u', 'u L / D'], named: ['Damköhler number, first', 'Bodenstein number'] },
  { source: 'Levenspiel, Chemical Reaction Engineering, Wiley, 3rd ed., ch. 18: diffusion in a porous catalyst (from memory)', relation: 'c concentration; cs concentration; k rate reaction rate constant; D diffusivity effective diffusion coefficient; L length', rank: 3, groups: ['c / cs', 'k L^2 / D'], named: ['Damköhler number, second'] },
  { source: 'Rayleigh, Nature 95 (1915) 66, and Riabouchinsky: heat lost by a body in a stream (from memory)', relation: 'h [M L^2 T^-3] heat loss; a length; v speed; theta temperature temperature difference; c [M L^-1 T^-2 Θ^-1] heat capacity per volume; k conductivity', rank: 4, groups: ['h / k a theta', 'a v c / k'] },
  { source: `${practice}: heat exchanger`, relation: 'T temperature outlet temperature difference; Ti temperature inlet temperature difference; U film; A area; m massflow; cp heat', rank: 4, groups: ['T / Ti', 'U A / m cp'], named: ['number of transfer units'] },
  { source: `${practice}: drop size in an emulsifier`, relation: 'd length drop diameter; D length rotor diameter; n rate rotational speed; rho density; mu viscosity; sigma tension', rank: 3, groups: ['d / D', 'rho n D^2 / mu', 'rho n^2 D^3 / sigma'], named: ['Weber number', 'Reynolds number'] },
];

export const solidExamples: readonly Example[] = [
  { source: `${bridgman}: period of a pendulum with its mass`, relation: 't time period; l length; g acceleration; m mass', rank: 3, groups: ['t^2 g / l'], unmatched: ['m'] },
  { source: `${bridgman}: pendulum with amplitude`, relation: 't time; l length; g acceleration; m mass; theta number amplitude', rank: 3, groups: ['t^2 g / l', 'theta'], unmatched: ['m'] },
  { source: `${langhaar}: deflection of a beam (rank 2)`, relation: 'w length deflection; P force; l length; E pressure elastic modulus; I secondmoment', rank: 2, groups: ['w / l', 'P / E l^2', 'I / l^4'] },
  { source: `${langhaar}: deflection with the bending stiffness in one symbol`, relation: 'w length deflection; P force; l length; EI [M L^3 T^-2] flexural rigidity', rank: 2, groups: ['w / l', 'P l^2 / EI'], named: ['buckling load factor'] },
  { source: `${practice}: buckling of a column`, relation: 'P force; l length; E pressure; I secondmoment', rank: 2, groups: ['P / E l^2', 'I / l^4'] },
  { source: `${practice}: natural frequency of a mass on a spring`, relation: 'f rate; m mass; k stiffness; g acceleration', rank: 3, groups: ['f^2 m / k'], unmatched: ['g'] },
  { source: `${practice}: damped oscillator`, relation: 'x length; x0 length; t time; m mass; k stiffness spring stiffness; c massflow damping coefficient', rank: 3, groups: ['x / x0', 't^2 k / m', 'c^2 / k m'], named: ['damping ratio squared'] },
  { source: `${practice}: vibrating string`, relation: 'f rate frequency; l length; T force tension; rhol [M L^-1] linear mass density', rank: 3, groups: ['f^2 l^2 rhol / T'] },
  { source: `${practice}: journal bearing`, relation: 'F force friction force; W force load; mu viscosity; n rate rotational speed; D length; c length radial clearance; L length', rank: 3, groups: ['F / W', 'mu n D^2 / W', 'c / D', 'L / D'] },
  { source: `${practice}: critical height of a slope`, relation: 'H length height; c pressure cohesion; gamma gradient unit weight; phi number friction angle', rank: 2, groups: ['c / gamma H', 'phi'], named: ['reciprocal of stability number'] },
  { source: `${practice}: consolidation of a layer`, relation: 's length settlement; s1 length final settlement; cv diffusivity consolidation coefficient; t time; d length drainage path', rank: 2, groups: ['s / s1', 'cv t / d^2', 's1 / d'], named: ['time factor of consolidation'] },
  { source: `${practice}: strength of a notched plate`, relation: 'sigma pressure stress at failure; K [M L^-1/2 T^-2] fracture toughness; a length', rank: 2, groups: ['sigma^2 a / K^2'] },
  { source: `${practice}: orbit period (the third law of Kepler)`, relation: 't time; a length; G [M^-1 L^3 T^-2]; M mass; m mass', rank: 3, groups: ['t^2 G M / a^3', 'm / M'] },
  { source: `${practice}: discharge of a capacitor`, relation: 'U voltage; U0 voltage; t time; R resistance; C capacitance', rank: 3, groups: ['U / U0', 't / R C'], named: ['reduced time of an RC circuit'], },
  { source: 'Shercliff, A Textbook of Magnetohydrodynamics, Pergamon, 1965: duct flow (from memory)', relation: 'G gradient pressure gradient; B field; L length; sigma sigma; mu viscosity; rho density; v speed', rank: 4, groups: ['G L^2 / mu v', 'B^2 L^2 sigma / mu', 'rho v L / mu'], named: ['Reynolds number'] },
];
