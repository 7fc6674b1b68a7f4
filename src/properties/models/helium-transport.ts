import type { Point } from './point.ts';
import { sumOfPowers, type Rows } from './rows.ts';

export interface HeliumViscosityConstants {
  /** Rows [a, e] in x = ln T of the dilute part and of the factors of rho, rho^2, rho^3 (g/cm^3). */
  readonly dilute: Rows;
  readonly dense: readonly Rows[];
  /** Above 100 K: factor, exponent of T, then rows [a, e] of the exponent. */
  readonly warm: readonly number[];
  readonly warmTerms: Rows;
}

/**
 * Viscosity of helium, normal fluid.
 *
 * @param c  constants as printed, for micropoise and g/cm^3
 * @returns  viscosity [Pa s] as a function of T [K] and rho [kg/m^3]
 * @source   Arp, McCarty and Friend, NIST Technical Note 1334 (1998)
 */
export function heliumViscosity(c: HeliumViscosityConstants): (T: number, rho: number) => number {
  const [factor, exponent] = c.warm as [number, number];
  return (T, rho) => {
    const x = Math.log(Math.min(T, 300));
    const thin = sumOfPowers(c.dilute, x);
    let dense = 0;
    for (let i = c.dense.length - 1; i >= 0; i--) dense = (dense + sumOfPowers(c.dense[i] as Rows, x)) * (rho / 1000);
    const plain = Math.exp(thin + dense);
    return 1e-7 * (T <= 100 ? plain : plain + factor * T ** exponent * Math.exp(sumOfPowers(c.warmTerms, T)) - Math.exp(thin));
  };
}

export interface HeliumConductivityConstants {
  readonly dilute: readonly number[];
  readonly diluteTerms: Rows;
  /** Rows [c, e] in T, factors of rho, of rho^3 and of rho^2 ln(rho/density). */
  readonly linear: Rows;
  readonly cubic: Rows;
  readonly logarithmic: Rows;
  readonly density: number;
}

/**
 * Thermal conductivity of helium, normal fluid, with its critical enhancement.
 *
 * @param c          constants as printed
 * @param viscosity  [Pa s] at the point
 * @returns          conductivity [W/(m K)] at a point of the equation of state
 * @source           Hands and Arp, Cryogenics 21 (1981) 697; the amplitude of the enhancement as carried by programs, since the printed one does not give the tabulated values
 */
export const heliumConductivity = (c: HeliumConductivityConstants, viscosity: () => number) => (at: Point): number => {
  const { temperature: T, density: rho } = at;
  const [factor, exponent] = c.dilute as [number, number];
  const thin = factor * T ** exponent * Math.exp(sumOfPowers(c.diluteTerms, T));
  const dense = sumOfPowers(c.linear, T) * rho + sumOfPowers(c.cubic, T) * rho ** 3 + sumOfPowers(c.logarithmic, T) * rho * rho * Math.log(rho / c.density);
  return thin + dense + (T > 3.5 && T < 12 ? enhancement(at, viscosity()) : 0);
};

/** Scaled equation of state of helium in the critical region, which takes over from the compressibility inside W = 1. */
function enhancement(at: Point, viscosity: number): number {
  const [Tc, pc, rhoc] = [5.18992, 2.2746e5, 69.158];
  const dT = Math.abs(1 - at.temperature / Tc);
  const dRho = Math.max(1e-9, Math.abs(1 - at.density / rhoc));
  const W = (dT / 0.2) ** 2 + (dRho / 0.25) ** 2;
  let compressibility = at.compressibility;
  if (W <= 1) {
    const [x0, E1, E2, beta, gamma, delta] = [0.392, 2.8461, 0.27156, 0.3554, 1.1743, 4.304];
    const x = (dT / dRho) ** (1 / beta);
    const u = 1 + x / x0;
    const v = 1 + E2 * u ** (2 / beta);
    const power = (gamma - 1) / (2 * beta);
    const h = E1 * u * v ** power;
    const slope = (E1 / x0) * (v ** power + u * power * v ** (power - 1) * ((2 * E2) / beta) * u ** (2 / beta - 1));
    const scaled = 1 / (dRho ** (delta - 1) * (delta * h - (x / beta) * slope) * (at.density / rhoc) ** 2 * pc);
    compressibility = W * compressibility + (1 - W) * scaled;
  }
  const rise = at.thermalExpansion / at.compressibility;
  return (3.4685233e-17 * 3.726229668 * Math.sqrt(compressibility) * at.temperature ** 2 * rise * rise * Math.exp(-18.66 * dT * dT - 4.25 * dRho ** 4)) / (at.density * viscosity);
}
