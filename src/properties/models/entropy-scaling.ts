import { diluteViscosity, type DiluteViscosity } from './viscosity-of-density.ts';

export interface EntropyScalingConstants {
  readonly dilute: DiluteViscosity;
  /** Residual entropy per volume at the critical point [J/(m^3 K)], negative, which x is counted in. */
  readonly scale: number;
  readonly factor: number;
  /** Polynomials of ln of the reduced viscosity in x, below and above the crossover. */
  readonly vapour: readonly number[];
  readonly liquid: readonly number[];
  readonly crossover: number;
}

/**
 * Viscosity of a refrigerant from its residual entropy.
 *
 * @param c                constants as printed
 * @param residualEntropy  entropy less that of the ideal gas, divided by R, at T [K] and rho [kg/m^3]
 * @param gasConstant      [J/(kg K)]
 * @returns                viscosity [Pa s] as a function of T [K] and rho [kg/m^3]
 * @source                 Bell, Purdue Refrigeration Conference 2016, paper 2106
 */
export function entropyScaledViscosity(c: EntropyScalingConstants, residualEntropy: (T: number, rho: number) => number, gasConstant: number): (T: number, rho: number) => number {
  const thin = diluteViscosity(c.dilute);
  const polynomial = (terms: readonly number[], x: number): number => terms.reduceRight((sum, term) => sum * x + term, 0);
  return (T, rho) => {
    const x = (rho * gasConstant * residualEntropy(T, rho)) / c.scale;
    const liquid = 1 / (1 + Math.exp(-100 * (x - c.crossover)));
    const reduced = Math.exp(liquid * polynomial(c.liquid, x) + (1 - liquid) * polynomial(c.vapour, x));
    return thin(T) * (1 + c.factor * (reduced - 1));
  };
}
