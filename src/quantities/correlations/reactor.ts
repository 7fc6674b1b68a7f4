// Conversion of ideal reactors and the share of a porous catalyst that works, reactions of first order unless said.

import { segregatedConversion } from '../../references/index.ts';

/**
 * Conversion in plug flow, X = 1 - e^(-Da), of order n X = 1 - [1 + (n - 1) Da]^(1/(1 - n)).
 *
 * @param damkohler  k c_0^(n-1) L/U
 * @param order      of the reaction
 * @returns          share converted; 1 where an order below 1 has run to its end
 * @example          plugFlowConversion({ damkohler: 1, order: 1 }) // 0.63212
 * @source           Levenspiel, Chemical Reaction Engineering, 3rd ed. (1999), ch. 5
 */
export function plugFlowConversion({ damkohler, order }: { damkohler: number; order: number }): number {
  if (Math.abs(order - 1) < 1e-9) return -Math.expm1(-damkohler);
  const left = 1 + (order - 1) * damkohler;
  return left <= 0 ? 1 : 1 - left ** (1 / (1 - order));
}

/**
 * Conversion of developed laminar flow in a tube with diffusion across, between the segregated and the plug flow.
 *
 * @param damkohler  k L/U
 * @param fourier    D_m L/(U R^2)
 * @returns          share converted
 * @example          laminarConversion({ damkohler: 1.052, fourier: 0.03968 }) // 0.59547
 * @range            damkohler 0.1 to 5
 * @scatter          2 % of the conversion
 * @source           straight in Fo/(Fo + 0.095 Da^0.9), fitted to the equation of convection, radial diffusion and reaction solved by finite volumes
 */
export function laminarConversion({ damkohler, fourier }: { damkohler: number; fourier: number }): number {
  if (damkohler === 0) return 0;
  const segregated = segregatedConversion({ damkohler });
  return segregated + (-Math.expm1(-damkohler) - segregated) * (fourier / (fourier + 0.095 * damkohler ** 0.9));
}

/**
 * Effectiveness of a porous catalyst, the rate it gives over that without resistance to diffusion inside.
 *
 * @param thiele  (V/S) sqrt(k/D_e), on volume over surface
 * @param shape   slab, long cylinder or sphere
 * @returns       effectiveness factor
 * @example       effectiveness({ thiele: 1, shape: 'sphere' }) // 0.671636
 * @source        Thiele, Ind. Eng. Chem. 31 (1939) 916; Aris, Chem. Eng. Sci. 6 (1957) 262
 */
export function effectiveness({ thiele, shape }: { thiele: number; shape: 'slab' | 'cylinder' | 'sphere' }): number {
  if (thiele < 1e-4) return 1;
  if (shape === 'slab') return Math.tanh(thiele) / thiele;
  if (shape === 'sphere') return (1 / Math.tanh(3 * thiele) - 1 / (3 * thiele)) / thiele;
  return besselRatio(2 * thiele) / thiele;
}

/** I_1(x)/I_0(x) by its continued fraction. */
function besselRatio(x: number): number {
  let tail = 0;
  for (let n = Math.ceil(30 + x); n >= 1; n--) tail = 1 / ((2 * n) / x + tail);
  return tail;
}
