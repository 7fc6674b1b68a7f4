import { sumOfPowers, type Rows } from './rows.ts';

export interface MethanolViscosityConstants {
  readonly molarMass: number;
  /** Critical temperature [K] and density [kg/m^3] that the dense part is reduced by. */
  readonly temperature: number;
  readonly density: number;
  readonly epsilon: number;
  /** [nm]: of the dilute gas and of the hard spheres. */
  readonly sigma: number;
  readonly sigmaDense: number;
  /** Polar parameter of the collision integral, and its 13 constants. */
  readonly polar: number;
  readonly omega: readonly number[];
  /** Second and third viscosity virial coefficients. */
  readonly second: Rows;
  readonly third: readonly number[];
  /** Diameter of the hard spheres: powers of 1/Tr from 0, powers of the reduced density from 1. */
  readonly ofTemperature: readonly number[];
  readonly ofDensity: readonly number[];
}

const avogadro = 6.02214129e23;

/**
 * Viscosity of methanol: virial expansion for the gas, hard spheres for the dense fluid, blended at the critical density.
 *
 * @param c  constants as printed
 * @returns  viscosity [Pa s] as a function of T [K] and rho [kg/m^3]
 * @source   Xiang, Laesecke and Huber, J. Phys. Chem. Ref. Data 35 (2006) 1597
 */
export function methanolViscosity(c: MethanolViscosityConstants): (T: number, rho: number) => number {
  const a = c.omega as readonly [number, number, number, number, number, number, number, number, number, number, number, number, number];
  const volume = avogadro * (c.sigma * 1e-9) ** 3;
  const [c1, c2] = c.third as [number, number];
  return (T, rho) => {
    const star = T / c.epsilon;
    const molar = rho / c.molarMass;
    const delta = rho / c.density;
    const gas = 1 + volume * sumOfPowers(c.second, star) * molar + volume * volume * c1 * star ** 3 * Math.exp(c2 / Math.sqrt(star)) * molar * molar;
    const plain = a[0] * star ** a[1] + a[2] * Math.exp(a[3] * star) + a[4] * Math.exp(a[5] * star);
    const polar = a[7] * star ** a[8] + a[9] * Math.exp(a[10] * star) + a[11] * Math.exp(a[12] * star);
    const omega = plain * (1 + ((c.polar * c.polar) / (1 + a[6] * c.polar ** 6)) * polar);
    const thin = (2.66957e-26 * Math.sqrt(1000 * c.molarMass * T)) / ((c.sigma * 1e-9) ** 2 * omega);
    let diameter = 0;
    c.ofTemperature.forEach((d, i) => (diameter += d * (c.temperature / T) ** i));
    c.ofDensity.forEach((e, i) => (diameter += e * delta ** (i + 1)));
    const b = (2 * Math.PI * avogadro * (diameter * c.sigmaDense * 1e-9) ** 3) / 3;
    const zeta = (b * molar) / 4;
    const contact = (1 - 0.5 * zeta) / (1 - zeta) ** 3;
    const dense = 1 / contact + 0.8 * b * molar + 0.761 * contact * (b * molar) ** 2;
    const share = 1 / (1 + Math.exp(5 * (delta - 1)));
    return thin * (share * gas + (1 - share) * dense);
  };
}
