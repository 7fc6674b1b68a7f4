import { diluteConductivity } from './conductivity-of-density.ts';
import type { EquationOfState, Point } from './point.ts';
import { sumOfProducts, type Rows } from './rows.ts';
import { viscosityOfDensity, type ViscosityOfDensityConstants } from './viscosity-of-density.ts';

export interface MethaneConductivityConstants {
  /** Reducing temperature [K] and density [kg/m^3]. */
  readonly temperature: number;
  readonly density: number;
  /** The authors' own viscosity, which the dilute part and the enhancement are formed with. */
  readonly viscosity: ViscosityOfDensityConstants;
  readonly eucken: { readonly factor: number; readonly temperature: number; readonly terms: Rows };
  /** Rows [j, d, t] and the factor of delta^2 over the reduced density of the saturated vapour. */
  readonly dense: Rows;
  readonly saturated: number;
  readonly factor: number;
  /** Density of the saturated vapour over the critical one: rows [n, e] in 1 - T/Tc of its logarithm times T/Tc. */
  readonly vapour: { readonly temperature: number; readonly density: number; readonly terms: Rows };
}

/**
 * Thermal conductivity of methane with its critical enhancement.
 *
 * @param c      constants as printed
 * @param given  equation of state
 * @returns      conductivity [W/(m K)] at a point of the equation of state
 * @source       Friend, Ely and Ingham, J. Phys. Chem. Ref. Data 18 (1989) 583; the correlation length inside 3 % of the critical point is taken from the equation of state
 */
export function methaneConductivity(c: MethaneConductivityConstants, given: { equation: EquationOfState }): (at: Point) => number {
  const { equation } = given;
  const viscosity = viscosityOfDensity(c.viscosity);
  const thin = diluteConductivity({ form: 'eucken', ...c.eucken, viscosity: c.viscosity.dilute }, equation);
  return (at) => {
    const { temperature: T, density: rho } = at;
    const tau = c.temperature / T;
    const delta = rho / c.density;
    const below = T < c.vapour.temperature && rho < c.vapour.density;
    const theta = 1 - T / c.vapour.temperature;
    let log = 0;
    if (below) for (const [n, e] of c.vapour.terms as readonly [number, number][]) log += n * theta ** e;
    const dense = c.factor * (sumOfProducts(c.dense, delta, tau) + c.saturated * delta * delta / (below ? Math.exp((log * c.vapour.temperature) / T) : 1));
    const off = 1 - 1 / tau;
    const offDensity = 1 - delta;
    const damping = Math.exp(-2.646 * Math.sqrt(Math.abs(off)) - 2.678 * offDensity * offDensity + 0.637 * offDensity);
    const gas = rho * equation.gasConstant;
    const susceptibility = 0.28631 * delta * tau * at.compressibility * gas * T;
    const rise = at.thermalExpansion / at.compressibility / gas;
    const critical = (91.855 / (1e6 * viscosity(at, equation.gasConstant) * tau * tau)) * rise * rise * susceptibility ** 0.4681 * damping;
    return thin(T) + 1e-3 * (dense + critical);
  };
}
