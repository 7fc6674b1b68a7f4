import { criticalEnhancement } from './gas-transport.ts';
import type { EquationOfState, Point } from './point.ts';
import { sumOfPowers, sumOfProducts, type Rows } from './rows.ts';
import { diluteViscosity, viscosityOfDensity, type DiluteViscosity, type ViscosityOfDensityConstants } from './viscosity-of-density.ts';
import type { ConductivityOfDensityConstants } from './conductivity-of-density.ts';

/** What both transport properties need: the reference fluid, its shape, and the correction of its density. */
interface Shape {
  readonly molarMass: number;
  /** Critical temperature [K] and density [kg/m^3] of the fluid and of its reference: start of the search only. */
  readonly critical: readonly number[];
  readonly referenceCritical: readonly number[];
  readonly referenceMolarMass: number;
  /** Reducing density [kg/m^3] and rows [a, t] of the factor of the density at which the reference is asked. */
  readonly density: number;
  readonly factor: Rows;
  readonly dilute: DiluteViscosity;
}

export interface CorrespondingViscosityConstants extends Shape {
  readonly reference: string;
}

export interface CorrespondingConductivityConstants extends Shape {
  readonly reference: string;
  /** Rows [a, t] in T [K]: 1e3 times their sum multiplies the dilute viscosity [Pa s] and c_p0 - 5/2 R [J/(kg K)]. */
  readonly inner: Rows;
  /** As for `criticalEnhancement`. */
  readonly enhancement: readonly number[];
}

/** State of the reference fluid with the residual energy and compressibility factor of the fluid. */
function conformal(c: Shape, own: EquationOfState, reference: EquationOfState): (T: number, rho: number) => { T: number; rho: number } {
  const ask = (equation: EquationOfState, T: number, rho: number) => {
    const found = equation.residual?.(T, rho);
    if (found === undefined) throw new Error('corresponding states need equations of state that give the residual energy');
    return found;
  };
  const [Tc, rhoc] = c.critical as [number, number];
  const [Tc0, rhoc0] = c.referenceCritical as [number, number];
  return (T, rho) => {
    const { a, d, delta } = ask(own, T, rho);
    const wanted = { energy: a, factor: 1 + delta * d };
    let at = { T: (T * Tc0) / Tc, rho: (rho * rhoc0) / rhoc };
    const misses = (state: { T: number; rho: number }) => {
      const r = ask(reference, state.T, state.rho);
      return { r, energy: r.a - wanted.energy, factor: r.delta * r.d - (wanted.factor - 1) };
    };
    let miss = misses(at);
    let size = Math.hypot(miss.energy, miss.factor);
    for (let i = 0; i < 50 && size > 1e-9; i++) {
      const { r } = miss;
      // Derivatives by ln T and ln rho.
      const [et, ed] = [-r.tau * r.t, r.delta * r.d];
      const [zt, zd] = [-r.delta * r.tau * r.dt, r.delta * (r.delta * r.dd + r.d)];
      const determinant = et * zd - ed * zt;
      const dT = (-miss.energy * zd + miss.factor * ed) / determinant;
      const dRho = (-miss.factor * et + miss.energy * zt) / determinant;
      let step = Math.min(1, 0.3 / Math.max(Math.abs(dT), Math.abs(dRho), 1e-30));
      let next = at;
      for (; step > 1e-3; step /= 2) {
        next = { T: at.T * Math.exp(step * dT), rho: at.rho * Math.exp(step * dRho) };
        miss = misses(next);
        if (Math.hypot(miss.energy, miss.factor) < size) break;
      }
      at = next;
      size = Math.hypot(miss.energy, miss.factor);
      if (step <= 1e-3) break;
    }
    return at;
  };
}

/** Ratios of the reference's temperature and molar volume to those of the fluid. */
function ratios(c: Shape, T: number, rho: number, at: { T: number; rho: number }): { f: number; h: number; asked: number } {
  return { f: T / at.T, h: (at.rho / c.referenceMolarMass) / (rho / c.molarMass), asked: at.rho * sumOfPowers(c.factor, rho / c.density) };
}

/**
 * Viscosity of a fluid from that of a reference fluid at the corresponding state.
 *
 * @param c      constants as printed
 * @param given  equations of state of both, constants of the viscosity of the reference
 * @returns      viscosity [Pa s] as a function of T [K] and rho [kg/m^3]
 * @source       Huber, Laesecke and Perkins, Ind. Eng. Chem. Res. 42 (2003) 3163
 */
export function correspondingViscosity(c: CorrespondingViscosityConstants, given: { own: EquationOfState; reference: EquationOfState; constants: ViscosityOfDensityConstants }): (T: number, rho: number) => number {
  const state = conformal(c, given.own, given.reference);
  const thin = diluteViscosity(c.dilute);
  const thinReference = diluteViscosity(given.constants.dilute);
  const whole = viscosityOfDensity(given.constants);
  return (T, rho) => {
    const at = state(T, rho);
    const { f, h, asked } = ratios(c, T, rho, at);
    const dense = whole(given.reference.of(at.T, asked), given.reference.gasConstant) - thinReference(at.T);
    return thin(T) + dense * Math.sqrt((f * c.molarMass) / c.referenceMolarMass) * h ** (-2 / 3);
  };
}

/**
 * Thermal conductivity of a fluid from that of a reference fluid at the corresponding state, with its own dilute part and enhancement.
 *
 * @param c      constants as printed
 * @param given  equations of state of both, constants of the conductivity of the reference, viscosity [Pa s] at the point
 * @returns      conductivity [W/(m K)] at a point of the equation of state
 * @source       Huber, Laesecke and Perkins, Ind. Eng. Chem. Res. 42 (2003) 3163
 */
export function correspondingConductivity(c: CorrespondingConductivityConstants, given: { own: EquationOfState; reference: EquationOfState; constants: ConductivityOfDensityConstants; viscosity: () => number }): (at: Point) => number {
  const state = conformal(c, given.own, given.reference);
  const thin = diluteViscosity(c.dilute);
  const { dense } = given.constants;
  const R = given.own.gasConstant;
  return (point) => {
    const { temperature: T, density: rho } = point;
    const eta = thin(T);
    const heat = given.own.of(T, 1e-8).specificHeatCapacity;
    const dilute = 3.75 * R * eta + 1e3 * sumOfPowers(c.inner, T) * eta * (heat - 2.5 * R);
    const at = state(T, rho);
    const { f, h, asked } = ratios(c, T, rho, at);
    const background = sumOfProducts(dense.terms, asked / dense.density, dense.temperature / at.T);
    const scale = Math.sqrt((f * c.referenceMolarMass) / c.molarMass) * h ** (-2 / 3);
    return dilute + background * scale + criticalEnhancement({ constants: c.enhancement, at: point, viscosity: given.viscosity, equation: given.own });
  };
}
