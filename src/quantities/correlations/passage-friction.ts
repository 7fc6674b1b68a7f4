import { between, type Table } from './table.ts';

// Friction of developed flow in passages other than round, on the hydraulic diameter. `aspect` is short side over long side.

// Both from 2-D quadrature of the exact series for the velocity; at 0 and 1 they are the 0.686 and 1.5515, 1.5 and 2.0962 of the literature.
const lossTable: Table = [
  [0, 0.68571], [0.05, 0.76138], [0.1, 0.83926], [0.2, 0.99798], [0.3, 1.15039], [0.4, 1.28151],
  [0.5, 1.38292], [0.6, 1.45519], [0.7, 1.50316], [0.8, 1.53228], [0.9, 1.5472], [1, 1.55152],
];
const peakTable: Table = [
  [0, 1.5], [0.05, 1.54881], [0.1, 1.6009], [0.2, 1.71497], [0.3, 1.8294], [0.4, 1.92358],
  [0.5, 1.9918], [0.6, 2.03788], [0.7, 2.06737], [0.8, 2.08486], [0.9, 2.09371], [1, 2.09626],
];

/**
 * Laminar friction of a rectangular duct, Darcy f Re as a polynomial in the aspect.
 *
 * @param aspect  short side over long side, 0 (parallel plates) to 1 (square)
 * @returns       Darcy friction factor times Reynolds number
 * @example       ductFrictionReynolds({ aspect: 1 }) // 56.9184
 * @range         aspect 0 to 1, within 0.07 % of the exact series
 * @source        Shah and London, Laminar Flow Forced Convection in Ducts (1978), eq. 341
 */
export function ductFrictionReynolds({ aspect: a }: { aspect: number }): number {
  return 96 * (1 - 1.3553 * a + 1.9467 * a ** 2 - 1.7012 * a ** 3 + 0.9564 * a ** 4 - 0.2537 * a ** 5);
}

/**
 * Laminar friction of a rectangular duct by the exact series, f Re = 96/((1 + a)^2 (1 - (192 a/pi^5) sum tanh(n pi/2a)/n^5)), n odd.
 *
 * @param aspect  short side over long side, above 0
 * @returns       Darcy friction factor times Reynolds number
 * @example       ductFrictionSeries({ aspect: 0.3 }) // 70.0484
 * @source        Shah and London, Laminar Flow Forced Convection in Ducts (1978), chapter VII
 */
export function ductFrictionSeries({ aspect }: { aspect: number }): number {
  let sum = 0;
  for (let n = 1; n < 400; n += 2) sum += Math.tanh((n * Math.PI) / (2 * aspect)) / n ** 5;
  return 96 / ((1 + aspect) ** 2 * (1 - ((192 * aspect) / Math.PI ** 5) * sum));
}

/**
 * Diameter that a rectangular duct puts into the circular friction law, over its hydraulic diameter: 2/3 + (11/24) a (2 - a).
 *
 * @param aspect  short side over long side
 * @returns       laminar equivalent diameter over hydraulic diameter
 * @example       jonesDiameterRatio({ aspect: 1 }) // 1.125
 * @range         aspect 0 to 1
 * @scatter       5 % of the friction factor
 * @source        Jones, J. Fluids Eng. 98 (1976) 173
 */
export function jonesDiameterRatio({ aspect }: { aspect: number }): number {
  return 2 / 3 + (11 / 24) * aspect * (2 - aspect);
}

/**
 * Turbulent friction between parallel plates, c_f = 0.073 Re_b^(-1/4), as Darcy factor.
 *
 * @param reynoldsGap  mean speed times gap over kinematic viscosity
 * @returns            Darcy friction factor
 * @example            deanChannelFriction({ reynoldsGap: 1e4 }) // 0.0292
 * @range              reynoldsGap 6e3 to 6e5
 * @scatter            5 %: +4 to -5 % against direct simulations at friction Reynolds numbers 180 to 5200
 * @source             Dean, J. Fluids Eng. 100 (1978) 215
 */
export function deanChannelFriction({ reynoldsGap }: { reynoldsGap: number }): number {
  return 4 * 0.073 * reynoldsGap ** -0.25;
}

/**
 * Entrance excess of the pressure drop of laminar flow between parallel plates or in a rectangular duct, on the dynamic pressure of the mean speed.
 *
 * @param aspect  short side over long side, 0 for parallel plates
 * @returns       loss number far downstream
 * @example       ductEntryLoss({ aspect: 1 }) // 1.55152
 * @range         aspect 0 to 1, reynolds above about 100
 * @scatter       10 %: boundary-layer solutions lie up to this below
 * @source        twice the energy factor less the momentum factor of the developed profile: Lundgren, Sparrow and Starr, J. Basic Eng. 86 (1964) 620; factors from the exact series
 */
export function ductEntryLoss({ aspect }: { aspect: number }): number {
  return between(aspect, lossTable);
}

/**
 * Largest over mean speed of developed laminar flow in a rectangular duct.
 *
 * @param aspect  short side over long side, 0 for parallel plates
 * @returns       peak over mean
 * @example       ductPeakOverMean({ aspect: 0.5 }) // 1.992
 * @range         aspect 0 to 1
 * @source        exact series of the developed profile, as Shah and London (1978), chapter VII
 */
export function ductPeakOverMean({ aspect }: { aspect: number }): number {
  return between(aspect, peakTable);
}
