import { at } from './at.ts';

/**
 * Monotone piecewise cubic through given points: no overshoot, continuous slope. Outside the points it keeps the end value.
 *
 * @param xs  abscissae, rising, at least two
 * @param ys  ordinates
 * @returns   the interpolating function
 * @source    Fritsch and Butland, SIAM J. Sci. Stat. Comput. 5 (1984) 300-304; end slopes by the three-point rule with its limits
 */
export function pchip(xs: readonly number[], ys: readonly number[]): (x: number) => number {
  const n = xs.length;
  const h = Array.from({ length: n - 1 }, (_, i) => at(xs, i + 1) - at(xs, i));
  const slope = h.map((step, i) => (at(ys, i + 1) - at(ys, i)) / step);
  const d = slopes(h, slope);
  return (x) => {
    if (x <= at(xs, 0)) return at(ys, 0);
    if (x >= at(xs, n - 1)) return at(ys, n - 1);
    let low = 0, high = n - 1;
    while (high - low > 1) {
      const middle = (low + high) >> 1;
      if (at(xs, middle) <= x) low = middle;
      else high = middle;
    }
    const step = at(h, low), t = (x - at(xs, low)) / step;
    const cubic = (at(d, low) + at(d, low + 1) - 2 * at(slope, low)) * t ** 2 + (3 * at(slope, low) - 2 * at(d, low) - at(d, low + 1)) * t + at(d, low);
    return at(ys, low) + t * step * cubic;
  };
}

function slopes(h: readonly number[], slope: readonly number[]): number[] {
  const m = slope.length;
  if (m === 1) return [at(slope, 0), at(slope, 0)];
  const inner = slope.slice(1).map((right, i) => {
    const left = at(slope, i);
    if (left * right <= 0) return 0;
    const w1 = 2 * at(h, i + 1) + at(h, i), w2 = at(h, i + 1) + 2 * at(h, i);
    return (w1 + w2) / (w1 / left + w2 / right);
  });
  return [end(at(h, 0), at(h, 1), at(slope, 0), at(slope, 1)), ...inner, end(at(h, m - 1), at(h, m - 2), at(slope, m - 1), at(slope, m - 2))];
}

function end(h0: number, h1: number, s0: number, s1: number): number {
  const d = ((2 * h0 + h1) * s0 - h0 * s1) / (h0 + h1);
  if (d * s0 <= 0) return 0;
  return s0 * s1 < 0 && Math.abs(d) > 3 * Math.abs(s0) ? 3 * s0 : d;
}
