import type { Point } from './point.ts';
import { polynomialOfTwo } from './power-sum.ts';

export interface WaterViscosityConstants {
  /** Dilute gas, four coefficients. */
  readonly H0: readonly number[];
  /** Rows [i, j, n]. */
  readonly H1: readonly (readonly number[])[];
  /** Five rows of six: reduced compressibility at 1.5 T_c per range of density (IAPWS R15-11, eq. 25), for the critical factor. */
  readonly A: readonly (readonly number[])[];
}

export interface WaterConductivityConstants {
  readonly L0: readonly number[];
  readonly L1: readonly (readonly number[])[];
  /** Five rows of six: reduced compressibility at 1.5 T_c per range of density. */
  readonly A: readonly (readonly number[])[];
}

/** Reducing constants shared by both releases: T [K], rho [kg/m^3], p [Pa]. */
const Tc = 647.096;
const rhoc = 322;
const pc = 22.064e6;

/** Correlation length [nm] from the reduced compressibility at T and at the reference temperature 1.5 T_c. */
function correlationLength(T: number, delta: number, zeta: number, reference: number): number {
  const excess = delta * (zeta - (reference * 1.5 * Tc) / T);
  return excess > 0 ? 0.13 * (excess / 0.06) ** (0.63 / 1.239) : 0;
}

/** Reduced compressibility at 1.5 T_c as the release fits it over density. */
function referenceCompressibility(A: readonly (readonly number[])[], delta: number): number {
  const row = A[delta <= 0.310559006 ? 0 : delta <= 0.776397516 ? 1 : delta <= 1.242236025 ? 2 : delta <= 1.863354037 ? 3 : 4] as readonly number[];
  let sum = 0;
  for (let i = row.length - 1; i >= 0; i--) sum = sum * delta + (row[i] as number);
  return 1 / sum;
}

/**
 * Viscosity of water and steam without the critical factor: the release recommends this outside the near-critical region.
 *
 * @param c  coefficients as printed
 * @returns  viscosity [Pa s] as a function of T [K] and rho [kg/m^3]
 * @source   IAPWS R12-08, eqs. (10) to (12), tables 1 and 2
 */
export function waterViscosity(c: WaterViscosityConstants): (T: number, rho: number) => number {
  const dense = polynomialOfTwo(c.H1);
  return (T, rho) => {
    const t = T / Tc;
    const tau = 1 / t;
    const delta = rho / rhoc;
    let sum = 0;
    for (let i = c.H0.length - 1; i >= 0; i--) sum = sum * tau + (c.H0[i] as number);
    return ((1e-4 * Math.sqrt(t)) / sum) * Math.exp(delta * dense(tau - 1, delta - 1));
  };
}

/**
 * Factor by which the viscosity grows near the critical point.
 *
 * @param given  temperature [K], density [kg/m^3], compressibility (1/rho)(d rho/d p) [1/Pa], coefficients A of the reference compressibility
 * @returns      factor, 1 away from the critical point
 * @source       IAPWS R12-08, eqs. (14) to (21), table 3
 */
export function waterCriticalFactor(given: { temperature: number; density: number; compressibility: number; A: readonly (readonly number[])[] }): number {
  const delta = given.density / rhoc;
  const zeta = delta * given.compressibility * pc;
  const xi = correlationLength(given.temperature, delta, zeta, referenceCompressibility(given.A, delta));
  const qc = xi / 1.9;
  const qd = xi / 1.1;
  if (qd === 0) return 1;
  let Y: number;
  if (xi <= 0.3817016416) Y = 0.2 * qc * qd ** 5 * (1 - qc + qc * qc - (765 / 504) * qd * qd);
  else {
    const psi = Math.acos(1 / Math.sqrt(1 + qd * qd));
    const w = Math.sqrt(Math.abs((qc - 1) / (qc + 1))) * Math.tan(psi / 2);
    const L = qc > 1 ? Math.log((1 + w) / (1 - w)) : 2 * Math.atan(Math.abs(w));
    Y = Math.sin(3 * psi) / 12 - Math.sin(2 * psi) / (4 * qc) + (1 - 1.25 * qc * qc) * (Math.sin(psi) / (qc * qc)) - ((1 - 1.5 * qc * qc) * psi - Math.abs(qc * qc - 1) ** 1.5 * L) / qc ** 3;
  }
  return Math.exp(0.068 * Y);
}

/**
 * Thermal conductivity of water and steam with the critical enhancement, its reference compressibility taken from the release's fit.
 *
 * @param c          coefficients as printed
 * @param viscosity  viscosity [Pa s] without critical factor
 * @returns          conductivity [W/(m K)] at a point of the equation of state
 * @source           IAPWS R15-11, eqs. (15) to (26), tables 1, 2, 3 and 6
 */
export function waterConductivity(c: WaterConductivityConstants, viscosity: (T: number, rho: number) => number): (at: Point, gasConstant: number) => number {
  const dense = polynomialOfTwo(c.L1);
  return (at, gasConstant) => {
    const T = at.temperature;
    const t = T / Tc;
    const tau = 1 / t;
    const delta = at.density / rhoc;
    let sum = 0;
    for (let i = c.L0.length - 1; i >= 0; i--) sum = sum * tau + (c.L0[i] as number);
    const plain = (Math.sqrt(t) / sum) * Math.exp(delta * dense(tau - 1, delta - 1));
    const zeta = delta * at.compressibility * pc;
    const xi = correlationLength(T, delta, zeta, referenceCompressibility(c.A, delta));
    const y = xi / 0.4;
    if (y < 1.2e-7) return 1e-3 * plain;
    const kappa = at.specificHeatCapacity / at.isochoricHeatCapacity;
    const Z = (2 / (Math.PI * y)) * ((1 - 1 / kappa) * Math.atan(y) + y / kappa - (1 - Math.exp(-1 / (1 / y + (y * y) / (3 * delta * delta)))));
    return 1e-3 * (plain + ((177.8514 * delta * (at.specificHeatCapacity / gasConstant) * t) / (viscosity(T, at.density) * 1e6)) * Z);
  };
}
