import type { EquationOfState, Point } from './point.ts';

export interface GasViscosityConstants {
  /** [kg/mol] */
  readonly molarMass: number;
  /** Energy parameter over Boltzmann's constant [K] and length parameter [nm]. */
  readonly epsilon: number;
  readonly sigma: number;
  /** Reducing temperature [K] and density [kg/m^3]. */
  readonly temperature: number;
  readonly density: number;
  /** Rows [N, t, d, l], in uPa s. */
  readonly terms: readonly (readonly number[])[];
}

export interface GasConductivityConstants {
  /** Of the dilute viscosity, as in `GasViscosityConstants`. */
  readonly molarMass: number;
  readonly epsilon: number;
  readonly sigma: number;
  readonly temperature: number;
  readonly density: number;
  /** N1, N2, t2, N3, t3: in mW/(m K), the first multiplies the dilute viscosity in uPa s. */
  readonly dilute: readonly number[];
  /** Rows [N, t, d, l], in mW/(m K). */
  readonly terms: readonly (readonly number[])[];
  /** Correlation length xi0 [nm], Gamma, cut-off [nm], reference temperature [K], critical pressure [Pa] and density [kg/m^3], amplitude R0 and exponent gamma where they differ. */
  readonly critical: readonly number[];
}

const boltzmann = 1.380658e-23;

/** Sum of N tau^t delta^d exp(-delta^l). */
function residual(rows: readonly (readonly number[])[], tau: number, delta: number): number {
  const log = Math.log(tau);
  let sum = 0;
  for (const [n, t, d, l] of rows as readonly [number, number, number, number][]) {
    let v = n * Math.exp(t * log);
    for (let i = 0; i < d; i++) v *= delta;
    sum += l === 0 ? v : v * Math.exp(-(delta ** l));
  }
  return sum;
}

/**
 * Viscosity of a dilute gas from the collision integral.
 *
 * @param c  molar mass [kg/mol], epsilon/k [K], sigma [nm]
 * @returns  viscosity [Pa s] at T [K]
 * @source   Lemmon and Jacobsen, Int. J. Thermophys. 25 (2004) 21, eqs. (2) and (3)
 */
function dilute(c: Pick<GasViscosityConstants, 'molarMass' | 'epsilon' | 'sigma'>, T: number): number {
  const x = Math.log(T / c.epsilon);
  const omega = Math.exp(0.431 + x * (-0.4623 + x * (0.08406 + x * (0.005341 - 0.00331 * x))));
  return (1e-6 * 0.0266958 * Math.sqrt(1000 * c.molarMass * T)) / (c.sigma * c.sigma * omega);
}

/**
 * Viscosity of air, nitrogen, oxygen or argon.
 *
 * @param c  constants as printed
 * @returns  viscosity [Pa s] as a function of T [K] and rho [kg/m^3]
 * @source   Lemmon and Jacobsen, Int. J. Thermophys. 25 (2004) 21, eqs. (1) to (4), tables I to III
 */
export const lemmonJacobsenViscosity = (c: GasViscosityConstants) => (T: number, rho: number): number =>
  dilute(c, T) + 1e-6 * residual(c.terms, c.temperature / T, rho / c.density);

/**
 * Thermal conductivity of air, nitrogen, oxygen or argon with the critical enhancement.
 *
 * @param c     constants as printed
 * @param given viscosity [Pa s] at the point, the equation of state
 * @returns     conductivity [W/(m K)] at a point of the equation of state
 * @source      Lemmon and Jacobsen, Int. J. Thermophys. 25 (2004) 21, eqs. (5) to (11), tables II and IV
 */
export const lemmonJacobsenConductivity = (c: GasConductivityConstants, given: { viscosity: () => number; equation: EquationOfState }) => (at: Point): number => {
  const tau = c.temperature / at.temperature;
  const delta = at.density / c.density;
  const [n1, n2, t2, n3, t3] = c.dilute as [number, number, number, number, number];
  const plain = n1 * 1e6 * dilute(c, at.temperature) + n2 * tau ** t2 + n3 * tau ** t3;
  return 1e-3 * (plain + residual(c.terms, tau, delta)) + criticalEnhancement({ constants: c.critical, at, viscosity: given.viscosity, equation: given.equation });
};

/**
 * Growth of the conductivity near the critical point, simplified crossover.
 *
 * @param given  constants, point, viscosity [Pa s] at the point, equation of state
 * @returns      what is added to the conductivity [W/(m K)]; zero above the reference temperature
 * @source       Olchowy and Sengers, Int. J. Thermophys. 10 (1989) 417; form as in Lemmon and Jacobsen 2004, eqs. (8) to (11)
 */
export function criticalEnhancement(given: { constants: readonly number[]; at: Point; viscosity: () => number; equation: EquationOfState }): number {
  const [xi0, gamma, qD, reference, pc, rhoc, R0 = 1.01, exponent = 1.2415] = given.constants as [number, number, number, number, number, number, number?, number?];
  const { at } = given;
  if (at.temperature >= reference) return 0;
  const chi = (slope: number): number => (pc * at.density * slope) / (rhoc * rhoc);
  const here = at.density * at.compressibility;
  const far = given.equation.of(reference, at.density);
  const excess = chi(here) - (chi(far.density * far.compressibility) * reference) / at.temperature;
  if (!(excess > 0)) return 0;
  const xi = xi0 * (excess / gamma) ** (0.63 / exponent);
  const y = xi / qD;
  const ratio = at.isochoricHeatCapacity / at.specificHeatCapacity;
  const omega = (2 / Math.PI) * ((1 - ratio) * Math.atan(y) + ratio * y);
  const omega0 = (2 / Math.PI) * (1 - Math.exp(-1 / (1 / y + ((y * rhoc) / at.density) ** 2 / 3)));
  return (at.density * at.specificHeatCapacity * boltzmann * R0 * at.temperature * (omega - omega0)) / (6 * Math.PI * xi * 1e-9 * given.viscosity());
}
