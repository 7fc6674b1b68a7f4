/**
 * Ratio of neighbouring cells on an edge whose first cell, length and count are given.
 *
 * @param of  height of the first cell [m], length of the edge [m], number of cells [1]
 * @returns   g [1] of h_1 (g^N - 1)/(g - 1) = S; 1 where equal cells fit; NaN for less than two cells or a first cell beyond the edge
 * @source    geometric series; upper bound (S/(N h_1))^(2/(N - 1)) from the mean inequality, bisection and Newton steps
 */
export function geometricRatio(of: { readonly first: number; readonly length: number; readonly cells: number }): number {
  const { first, length, cells } = of;
  const ratio = length / first;
  if (!(cells >= 2) || !(ratio > 1)) return Number.NaN;
  if (Math.abs(ratio - cells) < 1e-9 * cells) return 1;
  const excess = (g: number): number => (Math.abs(g - 1) < 1e-9 ? cells : Math.expm1(cells * Math.log(g)) / (g - 1)) - ratio;
  let [low, high] = ratio > cells ? [1, (ratio / cells) ** (2 / (cells - 1))] : [1e-6, 1];
  for (let pass = 0; pass < 200 && high - low > 1e-14 * high; pass++) {
    const middle = (low + high) / 2;
    if (excess(middle) > 0) high = middle;
    else low = middle;
  }
  return (low + high) / 2;
}

/**
 * Count and ratio of a geometric edge between two given end cells.
 *
 * @param of  first and last cell [m], length of the edge [m]
 * @returns   ratio [1] and count before rounding [1]
 * @source    g = (S - h_1)/(S - h_N), N = 1 + ln(h_N/h_1)/ln g, exact
 */
export function geometricBetween(of: { readonly first: number; readonly last: number; readonly length: number }): { readonly ratio: number; readonly cells: number } {
  const ratio = (of.length - of.first) / (of.length - of.last);
  return { ratio, cells: 1 + Math.log(of.last / of.first) / Math.log(ratio) };
}

/**
 * Stretching of the one-sided hyperbolic tangent, exact for the first cell.
 *
 * @param of  first cell [m], length of the edge [m], number of cells [1]
 * @returns   delta [1] of y/S = 1 + tanh(delta (i/N - 1))/tanh(delta)
 * @source    Vinokur, J. Comput. Phys. 50 (1983) 215
 */
export function tanhStretching(of: { readonly first: number; readonly length: number; readonly cells: number }): number {
  const first = (delta: number): number => 1 + Math.tanh(delta * (1 / of.cells - 1)) / Math.tanh(delta);
  let [low, high] = [1e-6, 50];
  for (let pass = 0; pass < 200; pass++) {
    const middle = (low + high) / 2;
    if (first(middle) > of.first / of.length) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/**
 * Inverse of sinh(delta)/delta = B, for edges clustered at both ends.
 *
 * @param value  B [1], at least 1, to 1000
 * @returns      delta [1], within 0.05 %
 * @source       Vinokur, J. Comput. Phys. 50 (1983) 215
 */
export function inverseSinhc(value: number): number {
  if (value < 2.7829681) {
    const z = value - 1;
    return Math.sqrt(6 * z) * (1 - 0.15 * z + 0.057321429 * z ** 2 - 0.024907295 * z ** 3 + 0.0077424461 * z ** 4 - 0.0010794123 * z ** 5);
  }
  const v = Math.log(value);
  const w = 1 / value - 0.028527431;
  return v + (1 + 1 / v) * Math.log(2 * v) - 0.02041793 + 0.24902722 * w + 1.9496443 * w ** 2 - 2.6294547 * w ** 3 + 8.56795911 * w ** 4;
}
