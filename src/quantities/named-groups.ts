/** A dimensionless group by the units of what stands in it, so that it is found under whatever names the user gives. */
export interface NamedGroup {
  readonly name: string;
  /** Exponents by SI unit. */
  readonly of: Readonly<Record<string, number>>;
  /** It is formed only where no more common group serves. */
  readonly minor?: true;
}

const [density, speed, length, viscosity, diffusivity, gravity, tension] = ['kg/m^3', 'm/s', 'm', 'Pa s', 'm^2/s', 'm/s^2', 'N/m'] as const;
const [conductivity, heatCapacity, coefficient, temperature, expansion] = ['W/(m K)', 'J/(kg K)', 'W/(m^2 K)', 'K', '1/K'] as const;

/** Named groups in the order in which they are preferred; constants such as 1/2, 4/pi are left out. */
export const namedGroups: readonly NamedGroup[] = [
  { name: 'Reynolds number', of: { [density]: 1, [speed]: 1, [length]: 1, [viscosity]: -1 } },
  { name: 'Reynolds number (or Peclet number, with a diffusivity)', of: { [speed]: 1, [length]: 1, [diffusivity]: -1 } },
  { name: 'Prandtl number', of: { [viscosity]: 1, [heatCapacity]: 1, [conductivity]: -1 } },
  { name: 'Nusselt number (or Biot number, with the conductivity of a solid)', of: { [coefficient]: 1, [length]: 1, [conductivity]: -1 } },
  { name: 'Grashof number (or Rayleigh number, with two diffusivities)', of: { [gravity]: 1, [expansion]: 1, [temperature]: 1, [length]: 3, [diffusivity]: -2 } },
  { name: 'Grashof number', of: { [density]: 2, [gravity]: 1, [expansion]: 1, [temperature]: 1, [length]: 3, [viscosity]: -2 } },
  { name: 'Froude number squared', of: { [speed]: 2, [gravity]: -1, [length]: -1 } },
  { name: 'Euler number', of: { Pa: 1, [density]: -1, [speed]: -2 } },
  { name: 'force coefficient (drag, lift) over 2', of: { N: 1, [density]: -1, [speed]: -2, [length]: -2 } },
  { name: 'force coefficient (drag, lift) over 2', of: { N: 1, [density]: -1, [speed]: -2, 'm^2': -1 } },
  { name: 'rotating Reynolds number', of: { [density]: 1, '1/s': 1, [length]: 2, [viscosity]: -1 } },
  { name: 'rotating Reynolds number (or Womersley number squared)', of: { '1/s': 1, [length]: 2, [diffusivity]: -1 } },
  { name: 'power number', of: { W: 1, [density]: -1, '1/s': -3, [length]: -5 } },
  { name: 'Froude number of a rotor', of: { '1/s': 2, [length]: 1, [gravity]: -1 } },
  { name: 'Weber number', of: { [density]: 1, [speed]: 2, [length]: 1, [tension]: -1 } },
  { name: 'Strouhal number (or Damkohler number, with a rate of reaction)', of: { '1/s': 1, [length]: 1, [speed]: -1 } },
  { name: 'Fourier number', of: { [diffusivity]: 1, s: 1, [length]: -2 } },
  { name: 'Eckert number', of: { [speed]: 2, [heatCapacity]: -1, [temperature]: -1 } },
  { name: 'Eotvos (Bond) number', of: { [density]: 1, [gravity]: 1, [length]: 2, [tension]: -1 } },
  { name: 'flow Reynolds number times pi/4', of: { 'kg/s': 1, [length]: -1, [viscosity]: -1 } },
  { name: 'relative change by temperature', of: { [expansion]: 1, [temperature]: 1 }, minor: true },
  { name: 'capillary number', of: { [viscosity]: 1, [speed]: 1, [tension]: -1 }, minor: true },
  { name: 'Stanton number', of: { [coefficient]: 1, [density]: -1, [speed]: -1, [heatCapacity]: -1 }, minor: true },
  { name: 'Richardson number', of: { [gravity]: 1, [expansion]: 1, [temperature]: 1, [length]: 1, [speed]: -2 }, minor: true },
  { name: 'Brinkman number', of: { [viscosity]: 1, [speed]: 2, [conductivity]: -1, [temperature]: -1 }, minor: true },
  { name: 'flow-through times', of: { [speed]: 1, s: 1, [length]: -1 }, minor: true },
  { name: 'Galilei number', of: { [gravity]: 1, [length]: 3, [diffusivity]: -2 }, minor: true },
  { name: 'Galilei number', of: { [density]: 2, [gravity]: 1, [length]: 3, [viscosity]: -2 }, minor: true },
  { name: 'Ohnesorge number squared', of: { [viscosity]: 2, [density]: -1, [tension]: -1, [length]: -1 }, minor: true },
  { name: 'Bingham number, with a yield stress', of: { Pa: 1, [length]: 1, [viscosity]: -1, [speed]: -1 }, minor: true },
];

/** What the quotient of two quantities of one unit is called. */
export const ratios: Readonly<Record<string, string>> = { [length]: 'ratio of lengths', [speed]: 'ratio of speeds (Mach number, with the speed of sound)', [diffusivity]: 'ratio of diffusivities (Prandtl, Schmidt or Lewis number)', [density]: 'density ratio', [viscosity]: 'viscosity ratio', Pa: 'pressure ratio', [temperature]: 'temperature ratio', [conductivity]: 'ratio of conductivities', [heatCapacity]: 'ratio of heat capacities', 'm^2': 'ratio of areas' };
