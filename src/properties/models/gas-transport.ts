import type { EquationOfState, Point } from './point.ts';
import { column, type Rows } from './rows.ts';

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

/** Sum of N tau^t delta^d exp(-delta^l); d and l are whole numbers. */
function residual(rows: Rows): (tau: number, delta: number) => number {
  const [n, t, d, l] = [column(rows, 0), column(rows, 1), column(rows, 2), column(rows, 3)];
  return (tau, delta) => {
    const log = Math.log(tau);
    let sum = 0;
    for (let i = 0; i < n.length; i++) {
      const decay = l[i] === 0 ? 0 : whole(delta, l[i] as number);
      sum += (n[i] as number) * whole(delta, d[i] as number) * Math.exp((t[i] as number) * log - decay);
    }
    return sum;
  };
}

function whole(x: number, exponent: number): number {
  let v = 1;
  for (let i = 0; i < exponent; i++) v *= x;
  return v;
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
export function lemmonJacobsenViscosity(c: GasViscosityConstants): (T: number, rho: number) => number {
  const dense = residual(c.terms);
  return (T, rho) => dilute(c, T) + 1e-6 * dense(c.temperature / T, rho / c.density);
}

/**
 * Thermal conductivity of air, nitrogen, oxygen or argon with the critical enhancement.
 *
 * @param c     constants as printed
 * @param given viscosity [Pa s] at the point, the equation of state
 * @returns     conductivity [W/(m K)] at a point of the equation of state
 * @source      Lemmon and Jacobsen, Int. J. Thermophys. 25 (2004) 21, eqs. (5) to (11), tables II and IV
 */
export function lemmonJacobsenConductivity(c: GasConductivityConstants, given: { viscosity: () => number; equation: EquationOfState }): (at: Point) => number {
  const dense = residual(c.terms);
  const [n1, n2, t2, n3, t3] = c.dilute as [number, number, number, number, number];
  return (at) => {
    const tau = c.temperature / at.temperature;
    const log = Math.log(tau);
    const plain = n1 * 1e6 * dilute(c, at.temperature) + n2 * Math.exp(t2 * log) + n3 * Math.exp(t3 * log);
    return 1e-3 * (plain + dense(tau, at.density / c.density)) + criticalEnhancement({ constants: c.critical, at, viscosity: given.viscosity, equation: given.equation });
  };
}

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
