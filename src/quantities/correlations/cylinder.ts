import { between, type Table } from './table.ts';

// Circular cylinder across a stream: drag, shedding, wake. Reynolds number on the diameter and the speed of the stream.

const anchors: Table = [[Math.log(20), 2.05], [Math.log(40), 1.52], [Math.log(100), 1.33], [Math.log(200), 1.32]];

/**
 * Drag coefficient of a circular cylinder: creeping expansion below 0.3, Sucker and Brauer's law, benchmarks between 20 and 200.
 *
 * @param reynolds  on the diameter
 * @returns         time mean, on the frontal area
 * @example         cylinderDrag({ reynolds: 100 }) // 1.33
 * @range           reynolds 1e-4 to 2e5, smooth cylinder, quiet stream, no walls
 * @scatter         10 %
 * @source          Kaplun 1957; Sucker and Brauer, Waerme- und Stoffuebertrag. 8 (1975) 149; Dennis and Chang, J. Fluid Mech. 42 (1970) 471; benchmarks at 40, 100, 200
 */
export function cylinderDrag({ reynolds }: { reynolds: number }): number {
  if (reynolds < 0.3) {
    const s = 1 / Math.log(7.406 / reynolds);
    return ((8 * Math.PI) / reynolds) * (s - 0.87 * s ** 3);
  }
  if (reynolds >= 20 && reynolds <= 200) return between(Math.log(reynolds), anchors);
  return 1.18 + 6.8 * reynolds ** -0.89 + 1.96 / Math.sqrt(reynolds) - (0.0004 * reynolds) / (1 + 3.64e-7 * reynolds ** 2);
}

/**
 * Drag coefficient of a circular cylinder in short form, C_D = 1 + 10 Re^(-2/3).
 *
 * @param reynolds  on the diameter
 * @returns         time mean, on the frontal area
 * @example         whiteCylinderDrag({ reynolds: 1000 }) // 1.1
 * @range           reynolds 1 to 2e5
 * @scatter         20 %
 * @source          White, Viscous Fluid Flow, 3rd ed. (2006)
 */
export function whiteCylinderDrag({ reynolds }: { reynolds: number }): number {
  return 1 + 10 * reynolds ** (-2 / 3);
}

/**
 * Strouhal number of vortex shedding behind a circular cylinder, piecewise a + b/sqrt(Re), with a straight line through the change of wake between 230 and 360.
 *
 * @param reynolds  on the diameter
 * @returns         frequency times diameter over speed
 * @example         cylinderStrouhal({ reynolds: 100 }) // 0.16484
 * @range           reynolds 47 to 2e5; joins within 0.1 %, but a real drop of 6 % at 180
 * @scatter         2 %, beyond 1e3 5 %
 * @source          Fey, Koenig and Eckelmann, Phys. Fluids 10 (1998) 1547
 */
export function cylinderStrouhal({ reynolds }: { reynolds: number }): number {
  const law = (a: number, b: number, at = reynolds): number => a + b / Math.sqrt(at);
  if (reynolds < 180) return law(0.2684, -1.0356);
  if (reynolds < 230) return law(0.2437, -0.8607);
  if (reynolds < 360) {
    const [from, to] = [law(0.2437, -0.8607, 230), law(0.2257, -0.4402, 360)];
    return from + ((to - from) * (reynolds - 230)) / 130;
  }
  if (reynolds < 1300) return law(0.2257, -0.4402);
  return reynolds < 5000 ? law(0.204, 0.3364) : law(0.1776, 2.2023);
}

/**
 * Strouhal number of laminar shedding by two further fits.
 *
 * @param reynolds  on the diameter
 * @returns         williamson: -3.3265/Re + 0.1816 + 1.6e-4 Re; williamsonBrown: 0.2731 - 1.1129/sqrt(Re) + 0.4821/Re
 * @example         laminarStrouhal({ reynolds: 60 }).williamsonBrown // 0.13746
 * @range           reynolds 50 to 180; they agree within 2 % from 60 on
 * @source          Williamson, Phys. Fluids 31 (1988) 2742; Williamson and Brown, J. Fluids Struct. 12 (1998) 1073
 */
export function laminarStrouhal({ reynolds }: { reynolds: number }): { williamson: number; williamsonBrown: number } {
  return { williamson: -3.3265 / reynolds + 0.1816 + 1.6e-4 * reynolds, williamsonBrown: 0.2731 - 1.1129 / Math.sqrt(reynolds) + 0.4821 / reynolds };
}

/**
 * Length of the closed steady wake over the diameter: 0.068 (Re - 6.3) to 20, 0.060 (Re - 4.5) beyond.
 *
 * @param reynolds  on the diameter
 * @returns         from the rear of the cylinder to the end of the bubble, 0 where the flow stays attached
 * @example         cylinderBubble({ reynolds: 40 }) // 2.13
 * @range           reynolds 7 to 45, measured; computed lengths at 40 are 2.2 to 2.3
 * @scatter         7 %
 * @source          Coutanceau and Bouard, J. Fluid Mech. 79 (1977) 231
 */
export function cylinderBubble({ reynolds }: { reynolds: number }): number {
  return Math.max(0, reynolds < 20 ? 0.068 * (reynolds - 6.3) : 0.06 * (reynolds - 4.5));
}

/**
 * Speed that a body between walls meets over the speed of the stream, 1 + C_D (D/H)/4 + 0.82 (D/H)^2.
 *
 * @param drag   drag coefficient without walls
 * @param ratio  diameter over distance of the walls
 * @returns      speed ratio
 * @example      planeBlockage({ drag: 1.2, ratio: 0.05 }) // 1.01705
 * @range        plane flow, ratio up to about 0.3
 * @source       Allen and Vincenti, NACA Report 782 (1944)
 */
export function planeBlockage({ drag, ratio }: { drag: number; ratio: number }): number {
  return 1 + (drag * ratio) / 4 + 0.82 * ratio ** 2;
}

const onset: Table = [[0, 47], [0.1, 51], [0.2, 69], [0.3, 94], [0.5, 124]];

/**
 * Reynolds number on the peak speed at which a cylinder midway between walls starts to shed.
 *
 * @param ratio  diameter over distance of the walls
 * @returns      onset; 47 without walls
 * @example      confinedOnset({ ratio: 0.2 }) // 69
 * @range        ratio 0 to 0.5
 * @scatter      5 %
 * @source       Chen, Pritchard and Tavener, J. Fluid Mech. 284 (1995) 23; Sahin and Owens, Phys. Fluids 16 (2004) 1305; from memory of these works
 */
export function confinedOnset({ ratio }: { ratio: number }): number {
  return between(ratio, onset);
}
