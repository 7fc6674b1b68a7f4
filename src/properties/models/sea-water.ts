import type { Engine } from '../sample.ts';
import { mixturePolynomial } from './laws.ts';
import type { EquationOfState, Point } from './point.ts';

type Fit = Parameters<typeof mixturePolynomial>[0];

export interface SeaWaterConstants {
  /** Rows [j, k, g] of the pure-water part: temperature and pressure exponents, coefficient [J/kg]. */
  readonly water: readonly (readonly number[])[];
  /** Rows [i, j, k, g] of the saline part: exponents of the salinity root, temperature, pressure, coefficient [J/kg]. */
  readonly saline: readonly (readonly number[])[];
  /** Fits at one atmosphere for warm and strong brines. */
  readonly density: Fit;
  readonly heatCapacity: Fit;
}

/** Reduced variables of both parts: 40 K, 100 MPa from 0 degC and one atmosphere; salinity scale S_u = (40/35) 35.16504 g/kg. */
const [kelvins, pascals, salinityScale] = [40, 1e8, 0.03516504 * (40 / 35)];

/** The Gibbs energy is made for the sea: up to this temperature [K] and salinity. Beyond them it misses densities by percents. */
const [warm, salty] = [313.15, 0.042];

/** Derivatives of the Gibbs energy with temperature and pressure. */
interface Gibbs {
  g: number;
  T: number;
  p: number;
  TT: number;
  Tp: number;
  pp: number;
}

function add(to: Gibbs, c: number, j: number, k: number, y: readonly number[], z: readonly number[]): void {
  const at = (list: readonly number[], n: number): number => (n < 0 ? 0 : (list[n] as number));
  const [yj, zk] = [at(y, j), at(z, k)];
  to.g += c * yj * zk;
  to.T += c * j * at(y, j - 1) * zk;
  to.p += c * yj * k * at(z, k - 1);
  to.TT += c * j * (j - 1) * at(y, j - 2) * zk;
  to.Tp += c * j * at(y, j - 1) * k * at(z, k - 1);
  to.pp += c * yj * k * (k - 1) * at(z, k - 2);
}

const powersOf = (x: number, n: number): number[] => {
  const out = [1];
  for (let i = 1; i <= n; i++) out.push((out[i - 1] as number) * x);
  return out;
};

/**
 * Sea water of the composition of the Reference Salt: its Gibbs energy as pure water plus a saline part.
 *
 * @param c         both coefficient tables
 * @param partners  water, for the compressibility of warm brine
 * @param salinity  share of salt by mass of the state being asked for (absolute salinity), 0 to 0.12
 * @returns         the equation of state; it has no vapour side
 * @source          IAPWS R13-08, saline part, and IAPWS SR7-09, liquid water; together the International Thermodynamic Equation of Seawater, IOC Manuals and Guides 56 (2010); Sharqawy, Lienhard and Zubair, Desalin. Water Treat. 16 (2010) 354 beyond the sea
 */
export function seaWater(c: SeaWaterConstants, partners: readonly Engine[], salinity: () => number): EquationOfState {
  const [water] = partners as [Engine];
  const inTheSea = (T: number, pressure: number, S: number): Point => {
    const y = powersOf((T - 273.15) / kelvins, 7);
    const z = powersOf((pressure - 101325) / pascals, 6);
    const sum: Gibbs = { g: 0, T: 0, p: 0, TT: 0, Tp: 0, pp: 0 };
    for (const [j, k, g] of c.water as readonly [number, number, number][]) add(sum, g, j, k, y, z);
    if (S > 0) {
      const x = Math.sqrt(S / salinityScale);
      const xs = powersOf(x, 7);
      for (const [i, j, k, g] of c.saline as readonly [number, number, number, number][]) add(sum, g * (i === 1 ? x * x * Math.log(x) : (xs[i] as number)), j, k, y, z);
    }
    const [gp, gTT, gTp, gpp] = [sum.p / pascals, sum.TT / kelvins ** 2, sum.Tp / (kelvins * pascals), sum.pp / pascals ** 2];
    return {
      temperature: T,
      pressure,
      density: 1 / gp,
      specificHeatCapacity: -T * gTT,
      isochoricHeatCapacity: -T * (gTT - (gTp * gTp) / gpp),
      speedOfSound: gp * Math.sqrt(gTT / (gTp * gTp - gTT * gpp)),
      thermalExpansion: gTp / gp,
      compressibility: -gpp / gp,
      enthalpy: sum.g - (T * sum.T) / kelvins,
    };
  };
  const density = mixturePolynomial(c.density);
  const heatCapacity = mixturePolynomial(c.heatCapacity);
  /** Warm or strong brine: fits of density and heat capacity, compressed as water is; salt makes it stiffer. */
  const warmBrine = (T: number, pressure: number, S: number): Point => {
    const compressibility = water.point({ T, p: Math.max(pressure, 2e6), side: 'liquid', x: 0 }).compressibility * (1 - 1.9 * S);
    const [above, below, here] = [density(T + 0.5, S), density(T - 0.5, S), density(T, S)];
    const rho = here * Math.exp(compressibility * (pressure - 101325));
    const expansion = (below - above) / here;
    const cp = heatCapacity(T, S);
    const cv = cp - (T * expansion * expansion) / (rho * compressibility);
    return { temperature: T, pressure, density: rho, specificHeatCapacity: cp, isochoricHeatCapacity: cv, speedOfSound: Math.sqrt(cp / (cv * rho * compressibility)), thermalExpansion: expansion, compressibility, enthalpy: inTheSea(warm, 101325, Math.min(S, salty)).enthalpy + cp * (T - warm) };
  };
  const at = (T: number, pressure: number): Point => {
    const S = salinity();
    return T <= warm && S <= salty ? inTheSea(T, pressure, S) : warmBrine(T, pressure, S);
  };
  return {
    gasConstant: 461.51805,
    at,
    of: () => {
      throw new Error('sea water is asked by temperature and pressure');
    },
  };
}
