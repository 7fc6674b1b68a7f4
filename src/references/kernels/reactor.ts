// Conversion of ideal reactors, reactions of first order.

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
function exponentialIntegral({ x }: { x: number }): number {
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
