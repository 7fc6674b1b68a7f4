/** Constants of one gas in water. */
export interface HenryConstants {
  readonly A: number;
  readonly B: number;
  readonly C: number;
  /** Critical temperature of the water [K]. */
  readonly critical: number;
}

/**
 * Henry's constant of a gas in water, partial pressure over mole fraction in the liquid at vanishing concentration:
 * ln(k_H/p_s) = A/T_r + B (1 - T_r)^0.355/T_r + C T_r^-0.41 exp(1 - T_r).
 *
 * @param c           A, B, C, critical temperature
 * @param saturation  vapour pressure of water [Pa] at T [K]
 * @returns           Henry's constant [Pa] as a function of T [K]
 * @source            IAPWS G7-04, Guideline on the Henry's Constant and Vapor-Liquid Distribution Constant for Gases in H2O and D2O
 *                    at High Temperatures; Fernandez-Prini, Alvarez and Harvey, J. Phys. Chem. Ref. Data 32 (2003) 903
 */
export const henry = (c: HenryConstants, saturation: (T: number) => number) => (T: number): number => {
  const r = T / c.critical;
  return saturation(T) * Math.exp(c.A / r + (c.B * (1 - r) ** 0.355) / r + c.C * r ** -0.41 * Math.exp(1 - r));
};
