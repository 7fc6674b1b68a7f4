import { criticalEnhancement } from './gas-transport.ts';
import type { EquationOfState, Point } from './point.ts';

export interface CarbonDioxideViscosityConstants {
  /** a0 to a6 of the dilute gas. */
  readonly dilute: readonly number[];
  /** Rows [b, t] of the second viscosity virial coefficient, with epsilon/k [K] and sigma [nm]. */
  readonly virial: readonly (readonly number[])[];
  readonly epsilon: number;
  readonly sigma: number;
  /** c1, c2, gamma of the dense fluid. */
  readonly dense: readonly number[];
  /** Triple point: temperature [K], density of the liquid [kg/m^3]; molar mass [kg/mol]. */
  readonly triple: readonly number[];
  readonly molarMass: number;
}

export interface CarbonDioxideConductivityConstants {
  readonly dilute: readonly number[];
  /** Rows [B1, B2], times delta^i, in W/(m K). */
  readonly dense: readonly (readonly number[])[];
  readonly temperature: number;
  readonly density: number;
  readonly critical: readonly number[];
}

const avogadro = 6.02214076e23;
const gasConstant = 8.31446261815324;

/**
 * Viscosity of carbon dioxide.
 *
 * @param c  constants as printed
 * @returns  viscosity [Pa s] as a function of T [K] and rho [kg/m^3]
 * @source   Laesecke and Muzny, J. Phys. Chem. Ref. Data 46 (2017) 013107, eqs. (1), (4), (5), (8) and (9)
 */
export function carbonDioxideViscosity(c: CarbonDioxideViscosityConstants): (T: number, rho: number) => number {
  const [a0, a1, a2, a3, a4, a5, a6] = c.dilute as [number, number, number, number, number, number, number];
  const [c1, c2, gamma] = c.dense as [number, number, number];
  const [Tt, rhot] = c.triple as [number, number];
  const unitOfViscosity = (rhot ** (2 / 3) * Math.sqrt(gasConstant * Tt)) / (c.molarMass ** (1 / 6) * avogadro ** (1 / 3));
  const volume = avogadro * (c.sigma * 1e-9) ** 3;
  return (T, rho) => {
    const root = Math.cbrt(T);
    const thin = (1.0055e-3 * Math.sqrt(T)) / (a0 + a1 * Math.sqrt(root) + a2 * Math.exp(a3 * root) + (a4 + a5 * root) * Math.exp(-root) + a6 * Math.sqrt(T));
    const star = T / c.epsilon;
    let B = 0;
    for (const [b, t] of c.virial as readonly [number, number][]) B += b * star ** t;
    const Tr = T / Tt;
    const rr = rho / rhot;
    return thin * (1 + B * volume * (rho / c.molarMass)) + unitOfViscosity * (c1 * Tr * rr ** 3 + (rr * rr + rr ** gamma) / (Tr - c2));
  };
}

/**
 * Thermal conductivity of carbon dioxide with the critical enhancement.
 *
 * @param c      constants as printed
 * @param given  viscosity [Pa s] at the point, the equation of state
 * @returns      conductivity [W/(m K)] at a point of the equation of state
 * @source       Huber, Sykioti, Assael and Perkins, J. Phys. Chem. Ref. Data 45 (2016) 013102, eqs. (3) to (9)
 */
export const carbonDioxideConductivity = (c: CarbonDioxideConductivityConstants, given: { viscosity: () => number; equation: EquationOfState }) => (at: Point): number => {
  const t = at.temperature / c.temperature;
  const delta = at.density / c.density;
  let below = 0;
  for (let i = c.dilute.length - 1; i >= 0; i--) below = below / t + (c.dilute[i] as number);
  let dense = 0;
  for (const [b1, b2] of c.dense.toReversed() as [number, number][]) dense = (dense + b1 + b2 * t) * delta;
  return (1e-3 * Math.sqrt(t)) / below + dense + criticalEnhancement({ constants: c.critical, at, viscosity: given.viscosity, equation: given.equation });
};
