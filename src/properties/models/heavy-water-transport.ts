import { sumOfProducts, type Rows } from './rows.ts';

export interface HeavyWaterConstants {
  readonly temperature: number;
  readonly density: number;
  /** Powers of 1/T (viscosity) or of T (conductivity), reduced, from 0. */
  readonly dilute: readonly number[];
  /** Rows [b, j, i] in rho - 1 and 1/T - 1 (viscosity), or the five powers of rho (conductivity). */
  readonly dense: Rows;
  /** Unit [Pa s] or [W/(m K)] of the reduced value. */
  readonly unit: number;
}

/**
 * Viscosity of heavy water.
 *
 * @param c  constants as printed
 * @returns  viscosity [Pa s] as a function of T [K] and rho [kg/m^3]
 * @source   IAPWS R4-84(2007), eqs. (A1) to (A4)
 */
export function heavyWaterViscosity(c: HeavyWaterConstants): (T: number, rho: number) => number {
  return (T, rho) => {
    const Tr = T / c.temperature;
    const delta = rho / c.density;
    let below = 0;
    for (let i = c.dilute.length - 1; i >= 0; i--) below = below / Tr + (c.dilute[i] as number);
    return (c.unit * Math.sqrt(Tr) * Math.exp(delta * sumOfProducts(c.dense, delta - 1, 1 / Tr - 1))) / below;
  };
}

/**
 * Thermal conductivity of heavy water with its critical enhancement.
 *
 * @param c  constants as printed
 * @returns  conductivity [W/(m K)] as a function of T [K] and rho [kg/m^3]
 * @source   IAPWS R4-84(2007), eqs. (B1) to (B11)
 */
export function heavyWaterConductivity(c: HeavyWaterConstants): (T: number, rho: number) => number {
  const [b0, b1, b2, b3, b4] = c.dense[0] as [number, number, number, number, number];
  return (T, rho) => {
    const Tr = T / c.temperature;
    const delta = rho / c.density;
    const thin = c.dilute.reduceRight((sum, a) => sum * Tr + a, 0);
    const dense = b0 * (1 - Math.exp(-2.506 * delta)) + delta * (b1 + delta * (b2 + delta * (b3 + delta * b4)));
    const f1 = Math.exp(0.144847 * Tr - 5.64493 * Tr * Tr);
    const f2 = Math.exp(-2.8 * (delta - 1) ** 2) - 0.080738543 * Math.exp(-17.943 * (delta - 0.125698) ** 2);
    const tau = Tr / (Math.abs(Tr - 1.1) + 1.1);
    const f3 = 1 + Math.exp(60 * (tau - 1) + 20);
    const f4 = 1 + Math.exp(100 * (tau - 1) + 15);
    const critical = 35429.6 * f1 * f2 * (1 + f2 * f2 * ((5e9 * f1 ** 4) / f3 + (3.5 * f2) / f4));
    const far = -741.112 * f1 ** 1.2 * (1 - Math.exp(-((delta / 2.5) ** 10)));
    return c.unit * (thin + dense + critical + far);
  };
}
