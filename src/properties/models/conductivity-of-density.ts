import { criticalEnhancement } from './gas-transport.ts';
import type { EquationOfState, Point } from './point.ts';
import { sumOfPowers, sumOfProducts, type Rows } from './rows.ts';
import { diluteViscosity, type DiluteViscosity } from './viscosity-of-density.ts';

/** Conductivity of the dilute gas [W/(m K)]. */
type DiluteConductivity =
  /** sum A (T/temperature)^n / sum B (T/temperature)^m */
  | { readonly form: 'ratio'; readonly temperature: number; readonly over: Rows; readonly under?: Rows }
  /** factor times the dilute viscosity in uPa s times 3.75 - f (1.5 - c_v/R) with f = sum a (T/temperature)^t, c_v of the ideal gas */
  | { readonly form: 'eucken'; readonly factor: number; readonly temperature: number; readonly terms: Rows; readonly viscosity: DiluteViscosity };

export interface ConductivityOfDensityConstants {
  readonly dilute: DiluteConductivity;
  /** Rows [B, d, t]: B (rho/density)^d (temperature/T)^t [W/(m K)]. */
  readonly dense: { readonly temperature: number; readonly density: number; readonly terms: Rows };
  /** As for `criticalEnhancement`. */
  readonly critical?: readonly number[];
  /** The fluid whose own form of the enhancement is taken. */
  readonly criticalOf?: string;
}

/**
 * Thermal conductivity of a dilute gas.
 *
 * @param c         form and constants as printed
 * @param equation  equation of state, for the heat capacity of the ideal gas
 * @returns         conductivity [W/(m K)] at T [K]
 * @source          forms as in the correlations of Assael, Huber, Perkins and others, J. Phys. Chem. Ref. Data since 2011; Friend, Ingham and Ely, J. Phys. Chem. Ref. Data 20 (1991) 275 for the Eucken form
 */
export function diluteConductivity(c: DiluteConductivity, equation: EquationOfState): (T: number) => number {
  if (c.form === 'ratio') return (T) => sumOfPowers(c.over, T / c.temperature) / (c.under === undefined ? 1 : sumOfPowers(c.under, T / c.temperature));
  const viscosity = diluteViscosity(c.viscosity);
  return (T) => {
    const inner = equation.of(T, 1e-8).isochoricHeatCapacity / equation.gasConstant;
    return c.factor * 1e6 * viscosity(T) * (3.75 - sumOfPowers(c.terms, T / c.temperature) * (1.5 - inner));
  };
}

/**
 * Thermal conductivity as a sum of dilute gas, dense fluid and critical enhancement.
 *
 * @param c      constants as printed
 * @param given  viscosity [Pa s] at the point, equation of state
 * @returns      conductivity [W/(m K)] at a point of the equation of state
 * @source       forms as for `diluteConductivity`; the source of the constants stands in the record
 */
export function conductivityOfDensity(c: ConductivityOfDensityConstants, given: { viscosity: () => number; equation: EquationOfState }): (at: Point) => number {
  const thin = diluteConductivity(c.dilute, given.equation);
  return (at) => {
    const dense = sumOfProducts(c.dense.terms, at.density / c.dense.density, c.dense.temperature / at.temperature);
    const critical = c.critical === undefined ? 0 : criticalEnhancement({ constants: c.critical, at, viscosity: given.viscosity, equation: given.equation });
    return thin(at.temperature) + dense + critical + (c.criticalOf === 'ammonia' ? ammoniaEnhancement(at.temperature, at.density) : 0);
  };
}

/**
 * Growth of the conductivity of ammonia near its critical point.
 *
 * @param T    temperature [K]
 * @param rho  [kg/m^3]
 * @returns    what is added [W/(m K)]
 * @source     Tufeu, Ivanov, Garrabos and Le Neindre, Ber. Bunsenges. Phys. Chem. 88 (1984) 422
 */
function ammoniaEnhancement(T: number, rho: number): number {
  const [Tc, rhoc] = [405.4, 235];
  // At the critical temperature itself the law has no value: step aside by less than it resolves.
  const t = Math.max(1e-6, Math.abs(T / Tc - 1));
  const viscosity = (2.6 + 1.6 * t) * 1e-5;
  const slope = (2.18 - 0.12 / Math.exp(17.8 * t)) * 1e5;
  const width = 0.61 * rhoc + 16.5 * Math.log(t);
  const length = 1.34e-10 * t ** -0.63 * (1 + Math.sqrt(t));
  const isochore = ((1.2 * 1.3806504e-23 * T * T) / (6 * Math.PI * viscosity * length)) * slope * slope * 0.423e-8 * t ** -1.24 * (1 + Math.sqrt(t) / 0.7) * Math.exp(-36 * t * t);
  const bell = (density: number): number => (isochore * width * width) / (width * width + (density - 0.96 * rhoc) ** 2);
  return rho < 0.6 * rhoc ? bell(0.6 * rhoc) * (rho / (0.6 * rhoc)) ** 2 : bell(rho);
}
