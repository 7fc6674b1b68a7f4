interface Constants { readonly kappa?: number; readonly intercept?: number }

/**
 * Distance from the wall as a function of the speed, one law from the wall to the logarithmic layer.
 *
 * @param speed  u+ [1]
 * @param kappa      von Karman constant, 0.40 unless given [1]
 * @param intercept  5.5 unless given [1]
 * @returns      y+ [1]
 * @example  spaldingDistance({ speed: 16.8089 }) // 100.0
 * @source       Spalding, J. Appl. Mech. 28 (1961) 455
 */
export function spaldingDistance({ speed, kappa = 0.4, intercept = 5.5 }: Constants & { speed: number }): number {
  const k = kappa * speed;
  return speed + Math.exp(-kappa * intercept) * (Math.exp(k) - 1 - k - k ** 2 / 2 - k ** 3 / 6);
}

/**
 * Speed at a distance from the wall by Spalding's law, found by Newton's method from the smaller of the linear and the logarithmic law.
 *
 * @param distance  y+ [1], at least 0
 * @param kappa      von Karman constant [1]
 * @param intercept  intercept [1]
 * @returns         u+ [1]
 * @example  spaldingSpeed({ distance: 100 }) // 16.8089
 * @source          Spalding, J. Appl. Mech. 28 (1961) 455
 */
export function spaldingSpeed({ distance, kappa = 0.4, intercept = 5.5 }: Constants & { distance: number }): number {
  let u = distance < 12 ? distance : logLaw({ distance, kappa, intercept });
  for (let pass = 0; pass < 50; pass++) {
    const k = kappa * u;
    const slope = 1 + kappa * Math.exp(-kappa * intercept) * (Math.exp(k) - 1 - k - k ** 2 / 2);
    const step = (spaldingDistance({ speed: u, kappa, intercept }) - distance) / slope;
    u -= step;
    if (Math.abs(step) <= 1e-12 * Math.max(1, u)) break;
  }
  return u;
}

/**
 * Speed in the logarithmic layer.
 *
 * @param distance  y+ [1], above 30
 * @param kappa      von Karman constant [1]
 * @param intercept  intercept [1]
 * @returns         u+ [1]
 * @example  logLaw({ distance: 100 }) // 16.2321
 * @source          von Karman 1930; Prandtl 1932
 */
export function logLaw({ distance, kappa = 0.41, intercept = 5 }: Constants & { distance: number }): number {
  return Math.log(distance) / kappa + intercept;
}

/**
 * Speed from the wall through the logarithmic layer, explicit.
 *
 * @param distance  y+ [1]
 * @returns         u+ [1]
 * @example  reichardtSpeed({ distance: 30 }) // 13.5448
 * @source          Reichardt, ZAMM 31 (1951) 208, with 0.40 inside and 0.41 outside as usually printed
 */
export function reichardtSpeed({ distance }: { distance: number }): number {
  return Math.log(1 + 0.4 * distance) / 0.41 + 7.8 * (1 - Math.exp(-distance / 11) - (distance / 11) * Math.exp(-0.33 * distance));
}

/**
 * Speed by a mixing length damped at the wall, integrated by Simpson's rule.
 *
 * @param distance  y+ [1]
 * @returns         u+ [1]
 * @example  vanDriestSpeed({ distance: 30 }) // 13.1863
 * @source          van Driest, J. Aero. Sci. 23 (1956) 1007; kappa 0.41, A+ 26
 */
export function vanDriestSpeed({ distance }: { distance: number }): number {
  const slope = (y: number): number => 2 / (1 + Math.sqrt(1 + 4 * (0.41 * y * (1 - Math.exp(-y / 26))) ** 2));
  const n = 2 * Math.max(50, Math.ceil(4 * distance));
  const h = distance / n;
  let sum = slope(0) + slope(distance);
  for (let i = 1; i < n; i++) sum += (i % 2 === 1 ? 4 : 2) * slope(i * h);
  return (sum * h) / 3;
}

/**
 * Distance at which the linear and the logarithmic law meet: where a two-part law of the wall switches.
 *
 * @param kappa      von Karman constant [1]
 * @param roughness  E of u+ = ln(E y+)/kappa [1]
 * @returns          y+ [1]
 * @example  lawsMeet({ kappa: 0.4187, roughness: 9.793 }) // 11.225
 * @source           Launder and Spalding, Comput. Methods Appl. Mech. Eng. 3 (1974) 269
 */
export function lawsMeet({ kappa, roughness }: { kappa: number; roughness: number }): number {
  let y = 11;
  for (let pass = 0; pass < 60; pass++) y = Math.log(roughness * y) / kappa;
  return y;
}

/**
 * Resistance of the sublayer to heat, in the law of the wall for temperature.
 *
 * @param ratio  Pr/Pr_t [1]
 * @returns      P [1]
 * @example  jayatilleke({ ratio: 8.23529411764706 }) // 45.1097
 * @source       Jayatilleke, Prog. Heat Mass Transfer 1 (1969) 193
 */
export function jayatilleke({ ratio }: { ratio: number }): number {
  return 9.24 * (ratio ** 0.75 - 1) * (1 + 0.28 * Math.exp(-0.007 * ratio));
}

/**
 * Temperature from the wall through the logarithmic layer.
 *
 * @param distance  y+ [1]
 * @param prandtl   Pr [1]
 * @returns         T+ [1]
 * @example  kaderTemperature({ distance: 1, prandtl: 0.7 }) // 0.70
 * @source          Kader, Int. J. Heat Mass Transfer 24 (1981) 1541
 */
export function kaderTemperature({ distance, prandtl }: { distance: number; prandtl: number }): number {
  const beta = (3.85 * Math.cbrt(prandtl) - 1.3) ** 2 + 2.12 * Math.log(prandtl);
  const gamma = (0.01 * (prandtl * distance) ** 4) / (1 + 5 * prandtl ** 3 * distance);
  return prandtl * distance * Math.exp(-gamma) + (2.12 * Math.log(1 + distance) + beta) * Math.exp(-1 / gamma);
}
