import { frictionTheory, type FrictionConstants } from './friction-theory.ts';
import type { Point } from './point.ts';
import { sumOfPowers, sumOfProducts, type Rows } from './rows.ts';

/** Viscosity of the dilute gas [Pa s]; `epsilon` in K, `sigma` in nm, molar mass in kg/mol. */
export type DiluteViscosity =
  /** factor sqrt(1000 M T)/(sigma^2 exp(sum a (ln T/epsilon)^t)) */
  | { readonly form: 'collision-integral'; readonly factor: number; readonly molarMass: number; readonly epsilon: number; readonly sigma: number; readonly terms: Rows }
  /** As above with the collision integral of Neufeld, Janzen and Aziz. */
  | { readonly form: 'kinetic-theory'; readonly molarMass: number; readonly epsilon: number; readonly sigma: number }
  /** sum a (T/temperature)^t */
  | { readonly form: 'powers'; readonly temperature: number; readonly terms: Rows }
  /** factor sqrt(T)/sum a (T/temperature)^t */
  | { readonly form: 'reciprocal-powers'; readonly factor: number; readonly temperature: number; readonly terms: Rows }
  /** factor sqrt(T)/exp(sum a T^t) */
  | { readonly form: 'cross-section'; readonly factor: number; readonly terms: Rows };

/** First correction for density. */
type InitialViscosity =
  /** dilute viscosity times Avogadro sigma^3 sum b (T/epsilon)^t times the molar density */
  | { readonly form: 'rainwater-friend'; readonly molarMass: number; readonly epsilon: number; readonly sigma: number; readonly terms: Rows }
  /** sum n (rho/density)^d (temperature/T)^t [Pa s] */
  | { readonly form: 'powers'; readonly temperature: number; readonly density: number; readonly terms: Rows };

/** Viscosity of the dense fluid beyond both [Pa s]. */
type DenseViscosity =
  /** sum a delta^d tau^t exp(gamma delta^l), and a free-volume part: sum f delta^d tau^t (1/(delta0 - delta) - 1/delta0) with delta0 = sum g tau^h / sum p tau^q */
  | { readonly form: 'batschinski-hildebrand'; readonly temperature: number; readonly density: number; readonly terms: Rows; readonly free?: Rows; readonly closest?: Rows; readonly closestUnder?: Rows }
  /** lead[0] delta^lead[1] Tr^lead[2] times a sum of ratios of polynomials with rows [c, d, t]: c delta^d Tr^t */
  | { readonly form: 'ratios'; readonly temperature: number; readonly density: number; readonly lead: readonly number[]; readonly ratios: readonly { readonly over: Rows; readonly under?: Rows }[] }
  | ({ readonly form: 'friction-theory' } & FrictionConstants)
  /** c1 delta^2 exp(c2 Tr + c3/Tr + c4 delta^2/(c5 + Tr) + c6 delta^6) */
  | { readonly form: 'exponent'; readonly temperature: number; readonly density: number; readonly terms: readonly number[] };

export interface ViscosityOfDensityConstants {
  readonly dilute: DiluteViscosity;
  readonly initial?: InitialViscosity;
  readonly dense?: DenseViscosity;
}

const avogadro = 6.02214129e23;

/**
 * Viscosity of a dilute gas.
 *
 * @param c  form and constants as printed
 * @returns  viscosity [Pa s] at T [K]
 * @source   the forms of the correlations in J. Phys. Chem. Ref. Data since Vogel, Kuechenmeister, Bich and Laesecke 27 (1998) 947; Neufeld, Janzen and Aziz, J. Chem. Phys. 57 (1972) 1100
 */
export function diluteViscosity(c: DiluteViscosity): (T: number) => number {
  switch (c.form) {
    case 'collision-integral':
      return (T) => (c.factor * Math.sqrt(1000 * c.molarMass * T)) / (c.sigma * c.sigma * Math.exp(sumOfPowers(c.terms, Math.log(T / c.epsilon))));
    case 'kinetic-theory':
      return (T) => {
        const star = T / c.epsilon;
        const omega = 1.16145 * star ** -0.14874 + 0.52487 * Math.exp(-0.7732 * star) + 2.16178 * Math.exp(-2.43787 * star);
        return (26.692e-9 * Math.sqrt(1000 * c.molarMass * T)) / (c.sigma * c.sigma * omega);
      };
    case 'powers':
      return (T) => sumOfPowers(c.terms, T / c.temperature);
    case 'reciprocal-powers':
      return (T) => (c.factor * Math.sqrt(T)) / sumOfPowers(c.terms, T / c.temperature);
    default:
      return (T) => (c.factor * Math.sqrt(T)) / Math.exp(sumOfPowers(c.terms, T));
  }
}

function initialPart(c: InitialViscosity): (T: number, rho: number, dilute: number) => number {
  if (c.form === 'powers') return (T, rho) => sumOfProducts(c.terms, rho / c.density, c.temperature / T);
  const volume = avogadro * (c.sigma * 1e-9) ** 3;
  return (T, rho, dilute) => dilute * volume * sumOfPowers(c.terms, T / c.epsilon) * (rho / c.molarMass);
}

function densePart(c: DenseViscosity): (at: Point, gasConstant: number) => number {
  switch (c.form) {
    case 'friction-theory':
      return frictionTheory(c);
    case 'exponent': {
      const [c1, c2, c3, c4, c5, c6] = c.terms as [number, number, number, number, number, number];
      return (at) => {
        const Tr = at.temperature / c.temperature;
        const square = (at.density / c.density) ** 2;
        return c1 * square * Math.exp(c2 * Tr + c3 / Tr + (c4 * square) / (c5 + Tr) + c6 * square ** 3);
      };
    }
    case 'ratios': {
      const [factor, d, t] = c.lead as [number, number, number];
      return (at) => {
        const Tr = at.temperature / c.temperature;
        const delta = at.density / c.density;
        let sum = 0;
        for (const { over, under } of c.ratios) sum += sumOfProducts(over, delta, Tr) / (under === undefined ? 1 : sumOfProducts(under, delta, Tr));
        return factor * delta ** d * Tr ** t * sum;
      };
    }
    default:
      return (at) => {
        const tau = c.temperature / at.temperature;
        const delta = at.density / c.density;
        let sum = 0;
        for (const [a, d, t, gamma, l] of c.terms as readonly [number, number, number, number, number][]) sum += a * delta ** d * tau ** t * (gamma === 0 ? 1 : Math.exp(gamma * delta ** l));
        if (c.free === undefined || c.closest === undefined) return sum;
        const delta0 = sumOfPowers(c.closest, tau) / (c.closestUnder === undefined ? 1 : sumOfPowers(c.closestUnder, tau));
        return sum + sumOfProducts(c.free, delta, tau) * (1 / (delta0 - delta) - 1 / delta0);
      };
  }
}

/**
 * Viscosity of a fluid as a sum of dilute gas, initial density dependence and dense fluid.
 *
 * @param c  constants as printed; the critical enhancement, below a few per cent within a kelvin of the critical point, is left out
 * @returns  viscosity [Pa s] at a point of the equation of state with its specific gas constant [J/(kg K)]
 * @source   forms as for `diluteViscosity`; the source of the constants stands in the record
 */
export function viscosityOfDensity(c: ViscosityOfDensityConstants): (at: Point, gasConstant: number) => number {
  const thin = diluteViscosity(c.dilute);
  const initial = c.initial && initialPart(c.initial);
  const dense = c.dense && densePart(c.dense);
  return (at, gasConstant) => {
    const dilute = thin(at.temperature);
    return dilute + (initial === undefined ? 0 : initial(at.temperature, at.density, dilute)) + (dense === undefined ? 0 : dense(at, gasConstant));
  };
}
