// Conversion of ideal reactors and the share of a porous catalyst that works, reactions of first order unless said.

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
 * Conversion in a mixed vessel, X = Da/(1 + Da).
 *
 * @param damkohler  k V/Q
 * @returns          share converted
 * @example          mixedConversion({ damkohler: 1.2875 }) // 0.56284
 * @source           Levenspiel, Chemical Reaction Engineering, 3rd ed. (1999), ch. 5
 */
export function mixedConversion({ damkohler }: { damkohler: number }): number {
  return damkohler / (1 + damkohler);
}

/**
 * Conversion with axial dispersion between closed ends, 1 - 4 a e^(Pe/2)/[(1 + a)^2 e^(a Pe/2) - (1 - a)^2 e^(-a Pe/2)], a = sqrt(1 + 4 Da/Pe).
 *
 * @param damkohler   k L/U
 * @param bodenstein  U L/D_ax
 * @returns           share converted
 * @example           dispersedConversion({ damkohler: 1, bodenstein: 10 }) // 0.602733
 * @source            Danckwerts, Chem. Eng. Sci. 2 (1953) 1
 */
export function dispersedConversion({ damkohler, bodenstein }: { damkohler: number; bodenstein: number }): number {
  const a = Math.sqrt(1 + (4 * damkohler) / bodenstein);
  // Over e^(a Pe/2), which overflows in long vessels.
  return 1 - (4 * a * Math.exp((bodenstein / 2) * (1 - a))) / ((1 + a) ** 2 - (1 - a) ** 2 * Math.exp(-a * bodenstein));
}

/**
 * Exponential integral E_1(x).
 *
 * @param x  argument, above zero
 * @returns  integral of e^(-t)/t from x on
 * @example  exponentialIntegral({ x: 0.5 }) // 0.5597736
 * @source   Abramowitz and Stegun 5.1.11 and 5.1.22
 */
export function exponentialIntegral({ x }: { x: number }): number {
  if (x > 2) {
    let tail = 0;
    for (let k = 60; k >= 1; k--) tail = k / (1 + k / (x + tail));
    return Math.exp(-x) / (x + tail);
  }
  let sum = -0.5772156649015329 - Math.log(x);
  let term = -1;
  for (let k = 1; k < 60; k++) {
    term *= -x / k;
    sum += term / k;
  }
  return sum;
}

/**
 * Conversion of developed laminar flow in a tube in which nothing diffuses across, X = 1 - [(1 - y) e^(-y) + y^2 E_1(y)], y = Da/2.
 *
 * @param damkohler  k L/U
 * @returns          share converted
 * @example          segregatedConversion({ damkohler: 1.052 }) // 0.573405
 * @source           Cleland and Wilhelm, AIChE J. 2 (1956) 489
 */
export function segregatedConversion({ damkohler }: { damkohler: number }): number {
  const y = damkohler / 2;
  return y === 0 ? 0 : 1 - ((1 - y) * Math.exp(-y) + y * y * exponentialIntegral({ x: y }));
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
