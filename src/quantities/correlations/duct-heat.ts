// Nusselt numbers of developed flow in passages, on the hydraulic diameter, properties at the bulk temperature.

/** Developed laminar values, wall temperature or wall flux uniform: exact, from the eigenvalue problem of Graetz. */
export const laminarNusselt = {
  pipe: { temperature: 3.656793, flux: 48 / 11 },
  plates: { temperature: 7.5407, flux: 140 / 17 },
  /** One plate heated, the other adiabatic. */
  oneSided: { temperature: 4.8608, flux: 70 / 13 },
} as const;

/**
 * Turbulent heat transfer in a pipe, Nu = (f/8)(Re - 1000) Pr/(1 + 12.7 sqrt(f/8)(Pr^(2/3) - 1)), without entrance factor.
 *
 * @param reynolds  on the (hydraulic) diameter
 * @param prandtl   at the bulk temperature
 * @param friction  Darcy factor of the smooth pipe, Petukhov's unless another is wanted
 * @returns         Nusselt number of developed flow
 * @example         gnielinski({ reynolds: 24915, prandtl: 7.0092, friction: 0.024743 }) // 179.98
 * @range           reynolds 3e3 to 5e6, prandtl 0.5 to 2000
 * @scatter         10 %; nine tenths of the data within 20 %
 * @source          Gnielinski, Int. Chem. Eng. 16 (1976) 359
 */
export function gnielinski({ reynolds, prandtl, friction }: { reynolds: number; prandtl: number; friction: number }): number {
  return ((friction / 8) * (reynolds - 1000) * prandtl) / (1 + 12.7 * Math.sqrt(friction / 8) * (prandtl ** (2 / 3) - 1));
}

/**
 * Power law of turbulent heat transfer, Nu = 0.023 Re^0.8 Pr^n, n = 0.4 when the fluid is heated and 0.3 when it is cooled.
 *
 * @param reynolds  on the diameter
 * @param prandtl   at the bulk temperature
 * @param exponent  0.4 or 0.3
 * @returns         Nusselt number of developed flow
 * @example         dittusBoelter({ reynolds: 1e5, prandtl: 5, exponent: 0.4 }) // 437.84
 * @range           reynolds 1e4 to 1.2e5, prandtl 0.7 to 160; at reynolds 1e6 and prandtl 7 it is 29 % below Gnielinski
 * @scatter         25 %
 * @source          Dittus and Boelter, Univ. Calif. Publ. Eng. 2 (1930) 443, constants as McAdams 1942
 */
export function dittusBoelter({ reynolds, prandtl, exponent }: { reynolds: number; prandtl: number; exponent: number }): number {
  return 0.023 * reynolds ** 0.8 * prandtl ** exponent;
}

/**
 * Turbulent heat transfer of viscous liquids, Nu = 0.027 Re^0.8 Pr^(1/3) (mu/mu_w)^0.14.
 *
 * @param reynolds        on the diameter
 * @param prandtl         at the bulk temperature
 * @param viscosityRatio  bulk over wall viscosity
 * @returns               Nusselt number of developed flow
 * @example               siederTateTurbulent({ reynolds: 15000, prandtl: 30, viscosityRatio: 0.5 }) // 166.904
 * @range                 reynolds above 1e4, prandtl 0.7 to 16 700
 * @scatter               20 %
 * @source                Sieder and Tate, Ind. Eng. Chem. 28 (1936) 1429
 */
export function siederTateTurbulent({ reynolds, prandtl, viscosityRatio }: { reynolds: number; prandtl: number; viscosityRatio: number }): number {
  return 0.027 * reynolds ** 0.8 * prandtl ** (1 / 3) * viscosityRatio ** 0.14;
}

/**
 * Turbulent heat transfer of liquid metals: 4.8 + 0.0156 Re^0.85 Pr^0.93 at uniform wall temperature, 6.3 + 0.0167 Re^0.85 Pr^0.93 at uniform flux.
 *
 * @param reynolds  on the diameter
 * @param prandtl   at the bulk temperature
 * @param wall      kind of wall condition
 * @returns         Nusselt number of developed flow
 * @example         notterSleicher({ reynolds: 1e5, prandtl: 0.01, wall: 'flux' }) // 10.3994
 * @range           reynolds 1e4 to 1e6, prandtl 0.004 to 0.1
 * @scatter         20 %
 * @source          Notter and Sleicher, Chem. Eng. Sci. 27 (1972) 2073
 */
export function notterSleicher({ reynolds, prandtl, wall }: { reynolds: number; prandtl: number; wall: 'temperature' | 'flux' }): number {
  const flow = reynolds ** 0.85 * prandtl ** 0.93;
  return wall === 'flux' ? 6.3 + 0.0167 * flow : 4.8 + 0.0156 * flow;
}

/**
 * Developed laminar heat transfer in a rectangular duct with the same temperature on all sides.
 *
 * @param aspect  short side over long side, 0 to 1
 * @returns       Nusselt number on the hydraulic diameter
 * @example       ductNusseltTemperature({ aspect: 0.5 }) // 3.38874
 * @range         aspect 0 to 1, within 0.2 %
 * @source        Shah and London, Laminar Flow Forced Convection in Ducts (1978), eq. 343
 */
export function ductNusseltTemperature({ aspect: a }: { aspect: number }): number {
  return 7.541 * (1 - 2.61 * a + 4.97 * a ** 2 - 5.119 * a ** 3 + 2.702 * a ** 4 - 0.548 * a ** 5);
}

/**
 * Developed laminar heat transfer in a rectangular duct, flux even along the flow and temperature even round the section.
 *
 * @param aspect  short side over long side, 0 to 1
 * @returns       Nusselt number on the hydraulic diameter
 * @example       ductNusseltFlux({ aspect: 0.5 }) // 4.12581
 * @range         aspect 0 to 1, within 0.2 %
 * @source        Shah and London, Laminar Flow Forced Convection in Ducts (1978), eq. 344
 */
export function ductNusseltFlux({ aspect: a }: { aspect: number }): number {
  return 8.235 * (1 - 2.0421 * a + 3.0853 * a ** 2 - 2.4765 * a ** 3 + 1.0578 * a ** 4 - 0.1861 * a ** 5);
}

/**
 * Turbulent mass transfer at high Schmidt numbers, Sh = 0.0165 Re^0.86 Sc^(1/3).
 *
 * @param reynolds  on the diameter
 * @param schmidt   kinematic viscosity over diffusivity
 * @returns         Sherwood number of developed flow
 * @example         bergerHau({ reynolds: 2e4, schmidt: 1500 }) // 944.206
 * @range           reynolds 8e3 to 2e5, schmidt 1e3 to 6e3
 * @scatter         10 %
 * @source          Berger and Hau, Int. J. Heat Mass Transfer 20 (1977) 1185
 */
export function bergerHau({ reynolds, schmidt }: { reynolds: number; schmidt: number }): number {
  return 0.0165 * reynolds ** 0.86 * schmidt ** (1 / 3);
}

/**
 * Log-mean of two temperature differences; their own value where they are equal.
 *
 * @param first   difference at one end [K]
 * @param second  difference at the other end [K], same sign
 * @returns       log-mean difference [K]
 * @example       logMean({ first: 85, second: 43 }) // 61.63
 * @source        energy balance with a constant transfer coefficient
 */
export function logMean({ first, second }: { first: number; second: number }): number {
  return Math.abs(first - second) < 1e-9 * Math.abs(first) ? first : (first - second) / Math.log(first / second);
}
