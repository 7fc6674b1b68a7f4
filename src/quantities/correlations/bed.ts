// Packed beds of spheres: drag, transfer to the particles, spreading, conduction through the packing. Speeds are superficial.

/** Coefficients of the drag law dp/L = A mu U (1 - e)^2/(d^2 e^3) + B rho U^2 (1 - e)/(d e^3). */
export interface BedDrag {
  readonly viscous: number;
  readonly inertial: number;
}

/** Constants of Ergun, Chem. Eng. Prog. 48 (1952) 89. */
export const ergunDrag: BedDrag = { viscous: 150, inertial: 1.75 };

/**
 * Drag constants of a bed of spheres with the wall counted: A = 154 A_w^2, B = A_w/B_w.
 *
 * @param bedRatio      bed over particle diameter
 * @param voidFraction  share of the volume that is empty
 * @returns             the two constants
 * @example             eisfeldDrag({ bedRatio: 10, voidFraction: 0.4 }).viscous // 190.123
 * @range               bed ratio 1.6 to 250, voids 0.33 to 0.88, particle Reynolds number 0.01 to 17 000
 * @scatter             20 %
 * @source              Eisfeld and Schnitzlein, Chem. Eng. Sci. 56 (2001) 4321
 */
export function eisfeldDrag({ bedRatio, voidFraction }: { bedRatio: number; voidFraction: number }): BedDrag {
  const wall = 1 + 2 / (3 * bedRatio * (1 - voidFraction));
  return { viscous: 154 * wall ** 2, inertial: wall / (1.15 * bedRatio ** -2 + 0.87) ** 2 };
}

/**
 * Pressure gradient of flow through a bed by a two-term drag law.
 *
 * @param drag              the two constants
 * @param voidFraction      share of the volume that is empty
 * @param particleDiameter  [m]
 * @param viscosity         [Pa s]
 * @param density           [kg/m^3]
 * @param speed             superficial [m/s]
 * @returns                 pressure fall per length [Pa/m]
 * @example                 bedGradient({ drag: { viscous: 150, inertial: 1.75 }, voidFraction: 0.4, particleDiameter: 0.003, viscosity: 18.1e-6, density: 1.2, speed: 0.5 }) // 2489.06
 * @scatter                 20 % for spheres, 50 % for other grains
 * @source                  Ergun, Chem. Eng. Prog. 48 (1952) 89
 */
export function bedGradient({ drag, voidFraction: e, particleDiameter: d, viscosity, density, speed }: { drag: BedDrag; voidFraction: number; particleDiameter: number; viscosity: number; density: number; speed: number }): number {
  return (drag.viscous * viscosity * speed * (1 - e) ** 2) / (d ** 2 * e ** 3) + (drag.inertial * density * speed ** 2 * (1 - e)) / (d * e ** 3);
}

/**
 * Pressure gradient through spheres at high Reynolds numbers, psi (1 - e) rho U^2/(2 e^3 d), psi = 320/X + 6/X^0.1.
 *
 * @param voidFraction      share of the volume that is empty
 * @param particleDiameter  [m]
 * @param viscosity         [Pa s]
 * @param density           [kg/m^3]
 * @param speed             superficial [m/s]
 * @returns                 pressure fall per length [Pa/m]
 * @example                 ktaGradient({ voidFraction: 0.4, particleDiameter: 0.003, viscosity: 18.1e-6, density: 1.2, speed: 0.5 }) // 2592.13
 * @range                   Re_p/(1 - e) 1 to 1e5, voids 0.36 to 0.42
 * @scatter                 15 %
 * @source                  KTA 3102.3 (1981), Reactor core design, loss of pressure through friction in pebble beds
 */
export function ktaGradient({ voidFraction: e, particleDiameter: d, viscosity, density, speed }: { voidFraction: number; particleDiameter: number; viscosity: number; density: number; speed: number }): number {
  const x = (density * speed * d) / (viscosity * (1 - e));
  return ((320 / x + 6 / x ** 0.1) * (1 - e) * density * speed ** 2) / (2 * e ** 3 * d);
}

/**
 * Transfer between particles and fluid in a bed, Nu = 2 + 1.1 Re_p^0.6 Pr^(1/3).
 *
 * @param reynolds  on particle diameter and superficial speed
 * @param prandtl   of the fluid (Schmidt number for mass)
 * @returns         Nusselt number on the particle diameter
 * @example         wakao({ reynolds: 100, prandtl: 0.7 }) // 17.4796
 * @range           reynolds 15 to 8500
 * @scatter         50 % at 20, 10 % at 5000 against Gnielinski's form
 * @source          Wakao, Kaguei and Funazkri, Chem. Eng. Sci. 34 (1979) 325
 */
export function wakao({ reynolds, prandtl }: { reynolds: number; prandtl: number }): number {
  return 2 + 1.1 * reynolds ** 0.6 * prandtl ** (1 / 3);
}

/**
 * Transfer between particles and fluid in a bed from the single sphere, times 1 + 1.5 (1 - e).
 *
 * @param reynolds      on particle diameter and superficial speed
 * @param prandtl       of the fluid
 * @param voidFraction  share of the volume that is empty
 * @returns             Nusselt number on the particle diameter
 * @example             gnielinskiBed({ reynolds: 100, prandtl: 0.7, voidFraction: 0.4 }) // 22.4388
 * @range               Re/e to 2e4, prandtl 0.7 to 1e4, voids 0.26 to 0.935
 * @scatter             20 %
 * @source              Gnielinski, Chem.-Ing.-Tech. 52 (1980) 228; Heat Exchanger Design Handbook (1982)
 */
export function gnielinskiBed({ reynolds, prandtl, voidFraction }: { reynolds: number; prandtl: number; voidFraction: number }): number {
  const re = reynolds / voidFraction;
  const laminar = 0.664 * Math.sqrt(re) * prandtl ** (1 / 3);
  const turbulent = (0.037 * re ** 0.8 * prandtl) / (1 + 2.443 * re ** -0.1 * (prandtl ** (2 / 3) - 1));
  return (1 + 1.5 * (1 - voidFraction)) * (2 + Math.hypot(laminar, turbulent));
}

/**
 * Conductivity of a bed at rest over that of its fluid.
 *
 * @param voidFraction       share of the volume that is empty
 * @param conductivityRatio  fluid over solid
 * @returns                  effective over fluid conductivity
 * @example                  zehnerSchluender({ voidFraction: 0.4, conductivityRatio: 0.1 }) // 3.64273
 * @range                    spheres, no radiation, no contact
 * @scatter                  30 %
 * @source                   Zehner and Schluender, Chem.-Ing.-Tech. 42 (1970) 933
 */
export function zehnerSchluender({ voidFraction, conductivityRatio: k }: { voidFraction: number; conductivityRatio: number }): number {
  const s = Math.sqrt(1 - voidFraction);
  if (Math.abs(k - 1) < 1e-9) return 1;
  const b = 1.25 * ((1 - voidFraction) / voidFraction) ** (10 / 9);
  const n = 1 - k * b;
  return 1 - s + ((2 * s) / n) * ((((1 - k) * b) / n ** 2) * Math.log(1 / (k * b)) - (b + 1) / 2 - (b - 1) / n);
}

/**
 * Particle Reynolds number at which an upward flow lifts the bed, sqrt(33.7^2 + 0.0408 Ar) - 33.7.
 *
 * @param archimedes  g rho (rho_s - rho) d^3/mu^2
 * @returns           Reynolds number on particle diameter and superficial speed
 * @example           wenYu({ archimedes: 2e4 }) // 10.4779
 * @scatter           30 %
 * @source            Wen and Yu, AIChE J. 12 (1966) 610
 */
export function wenYu({ archimedes }: { archimedes: number }): number {
  return Math.sqrt(33.7 ** 2 + 0.0408 * archimedes) - 33.7;
}
