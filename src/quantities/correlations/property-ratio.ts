// Factors for fluid properties that vary from the bulk to the wall. They act on values with all properties at the bulk state.

type Regime = 'laminar' | 'turbulent';

/**
 * Nusselt number of a liquid in a passage with variable viscosity over that with constant viscosity.
 *
 * @param ratio   viscosity at the bulk over viscosity at the wall, above 1 where a liquid is heated
 * @param regime  laminar or turbulent
 * @returns       factor
 * @example       liquidNusseltFactor({ ratio: 2, regime: 'laminar' }) // 1.1019
 * @range         ratio 0.0044 to 9.75 laminar, 0.025 to 12.5 turbulent
 * @scatter       5 %
 * @source        laminar Sieder and Tate, Ind. Eng. Chem. 28 (1936) 1429; turbulent Petukhov, Adv. Heat Transfer 6 (1970) 503
 */
export function liquidNusseltFactor({ ratio, regime }: { ratio: number; regime: Regime }): number {
  if (regime === 'laminar') return ratio ** 0.14;
  return ratio >= 1 ? ratio ** 0.11 : ratio ** 0.25;
}

/**
 * Friction factor of a liquid in a passage with variable viscosity over that with constant viscosity.
 *
 * @param ratio   viscosity at the bulk over viscosity at the wall, above 1 where a liquid is heated
 * @param regime  laminar or turbulent
 * @returns       factor
 * @example       liquidFrictionFactor({ ratio: 2, regime: 'turbulent' }) // 0.83333
 * @range         ratio 0.2 to 5 laminar, 0.5 to 2.86 turbulent; beyond 2.86 a power that meets the line at 0.69, an extrapolation
 * @scatter       3 % laminar, 5 % turbulent
 * @source        laminar exponent 0.55 from the developed profile with viscosity exponential in temperature and uniform flux; turbulent Petukhov, Adv. Heat Transfer 6 (1970) 503
 */
export function liquidFrictionFactor({ ratio, regime }: { ratio: number; regime: Regime }): number {
  if (regime === 'laminar') return ratio ** -0.55;
  if (ratio > 2.86) return 0.69 * (ratio / 2.86) ** -0.353; // the straight line would reach zero at 7
  return ratio >= 1 ? (7 - ratio) / 6 : ratio ** -0.24;
}

/**
 * Nusselt number of a gas in a passage with variable properties over that with constant ones.
 *
 * @param ratio   absolute temperature at the bulk over that at the wall, below 1 where a gas is heated
 * @param regime  laminar or turbulent
 * @returns       factor
 * @example       gasNusseltFactor({ ratio: 0.7, regime: 'turbulent' }) // 0.85171
 * @range         ratio 0.5 to 2
 * @scatter       5 %
 * @source        Gnielinski, Int. Chem. Eng. 16 (1976) 359, exponent 0.45 for heated gases
 */
export function gasNusseltFactor({ ratio, regime }: { ratio: number; regime: Regime }): number {
  return regime === 'turbulent' && ratio < 1 ? ratio ** 0.45 : 1;
}

/**
 * Friction factor of a gas in a passage with variable properties over that with constant ones.
 *
 * @param ratio   absolute temperature at the bulk over that at the wall, below 1 where a gas is heated
 * @param regime  laminar or turbulent
 * @returns       factor
 * @example       gasFrictionFactor({ ratio: 0.5, regime: 'laminar' }) // 2
 * @range         ratio 0.33 to 2
 * @scatter       10 %
 * @source        Kays and Crawford, Convective Heat and Mass Transfer, exponents 1.0 and 0.81 laminar, -0.1 turbulent; from memory
 */
export function gasFrictionFactor({ ratio, regime }: { ratio: number; regime: Regime }): number {
  if (regime === 'turbulent') return ratio ** 0.1;
  return ratio < 1 ? 1 / ratio : ratio ** -0.81;
}
