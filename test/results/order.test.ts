import { describe, expect, it } from 'vitest';
import { apparentOrder, extrapolate, indexHalfWidth, leastSquares, tripletKind, type Triplet } from '../../src/results/index.ts';

const celik = 'Celik et al., J. Fluids Eng. 130 (2008) 078001, table 1 (two-dimensional, 18 000 cells on the finest)';
const rows: { name: string; triplet: Triplet; order: number; orderWithin: number; extrapolated: number; extrapolatedWithin: number; index: number; indexWithin: number; source: string }[] = [
  { name: 'reattachment length', triplet: { fine: 6.063, medium: 5.972, coarse: 5.863, ratioFine: 1.5, ratioCoarse: 1.333 }, order: 1.53, orderWithin: 0.01, extrapolated: 6.1685, extrapolatedWithin: 5e-4, index: 0.022, indexWithin: 6e-4, source: celik },
  { name: 'velocity, p below 1', triplet: { fine: 10.788, medium: 10.725, coarse: 10.605, ratioFine: 2, ratioCoarse: 2.143 }, order: 0.75, orderWithin: 0.005, extrapolated: 10.8801, extrapolatedWithin: 5e-4, index: 0.011, indexWithin: 6e-4, source: celik },
  { name: 'velocity, oscillating', triplet: { fine: 6.0042, medium: 5.9624, coarse: 6.0909, ratioFine: 2, ratioCoarse: 2.143 }, order: 1.51, orderWithin: 0.005, extrapolated: 6.0269, extrapolatedWithin: 5e-5, index: 0.005, indexWithin: 6e-4, source: celik },
];

describe('apparent order, extrapolated value and index against published columns (tolerance: the digits printed)', () => {
  it.each(rows)('$name', ({ triplet, ...row }) => {
    const order = apparentOrder(triplet);
    expect(Math.abs(order - row.order)).toBeLessThanOrEqual(row.orderWithin);
    expect(Math.abs(extrapolate({ ...triplet, ratio: triplet.ratioFine, order }) - row.extrapolated)).toBeLessThanOrEqual(row.extrapolatedWithin);
    const index = indexHalfWidth({ ...triplet, ratio: triplet.ratioFine, order, safetyFactor: 1.25 }) / triplet.fine;
    expect(Math.abs(index - row.index)).toBeLessThanOrEqual(row.indexWithin);
  });
});

/** Values 1 + h^p on sizes 1, r21, r21 r32: the exact order is p, whatever the ratios. */
const powerData = (p: number, ratioFine: number, ratioCoarse: number): Triplet => ({ fine: 2, medium: 1 + ratioFine ** p, coarse: 1 + (ratioFine * ratioCoarse) ** p, ratioFine, ratioCoarse });

describe('exact power-law data give back their order (identity)', () => {
  it.each([[0.3, 2, 2], [1, 2, 1.3], [2, 2, 1.3], [2, 1.3, 2], [3.5, 1.5, 1.4], [1.4, 1.1, 3]])('p = %f at ratios %f and %f', (p, r21, r32) => {
    const triplet = powerData(p, r21, r32);
    expect(tripletKind(triplet, 0)).toBe('monotone');
    expect(apparentOrder(triplet)).toBeCloseTo(p, 8);
    expect(extrapolate({ ...triplet, ratio: r21, order: p })).toBeCloseTo(1, 10);
  });
});

describe('sorting of three meshes, each limit from both sides', () => {
  const sort = (growth: number, r21: number, r32: number, iteration = 0): string => tripletKind({ fine: 0, medium: 1, coarse: 1 + growth, ratioFine: r21, ratioCoarse: r32 }, iteration);
  const limit = Math.log(1.3) / Math.log(2);
  it('the limit of a steady approach is that of an order of zero: 0.3785 at ratios 2 and 1.3, 1 at equal ratios', () => {
    expect(limit).toBeCloseTo(0.3785, 4);
    expect(sort(limit * 0.999, 2, 1.3)).toBe('divergent');
    expect(sort(limit * 1.001, 2, 1.3)).toBe('monotone');
    expect(sort(0.999, 1.5, 1.5)).toBe('divergent');
    expect(sort(1, 1.5, 1.5)).toBe('divergent');
    expect(sort(1.001, 1.5, 1.5)).toBe('monotone');
  });
  it('data that diverge are told before an order is formed (0.3 at r = 1.5 would return 2.97)', () => expect(sort(0.3, 1.5, 1.5)).toBe('divergent'));
  it('an oscillation converges where it fades', () => {
    expect(sort(-0.999, 2, 2)).toBe('divergent');
    expect(sort(-1, 2, 2)).toBe('oscillatory');
    expect(sort(-3, 2, 2)).toBe('oscillatory');
  });
  it('differences inside the iteration error are no evidence', () => {
    expect(sort(4, 2, 2, 1)).toBe('converged');
    expect(sort(4, 2, 2, 0.99)).toBe('monotone');
    expect(sort(0, 2, 2)).toBe('divergent');
    expect(sort(1e8, 2, 2)).toBe('converged');
  });
});

const sizesOfFive = [1, 1.25, 1.6, 2, 2.5];

describe('four and more meshes by least squares', () => {
  const sizes = sizesOfFive;
  it.each([0.6, 1, 1.4, 2])('exact data of order %f: order, extrapolated value, safety factor', (p) => {
    const found = leastSquares(sizes, sizes.map((h) => 5 - 0.27 * h ** p));
    expect(found?.order).toBeCloseTo(p, 6);
    expect(found?.fit.atZero).toBeCloseTo(5, 6);
    expect(found?.safetyFactor).toBe(1.25);
    expect(found?.halfWidth).toBeCloseTo(1.25 * 0.27, 6);
  });
  it.each([[3.2, 'square'], [0.2, 'linear']])('order %f is not believed: safety factor 3', (p, form) => {
    const found = leastSquares(sizes, sizes.map((h) => 5 + 0.1 * h ** p));
    expect(found?.order).toBeCloseTo(p, 5);
    expect(found?.safetyFactor).toBe(3);
    expect(form === 'square' ? ['square', 'linear'] : ['linear', 'square', 'linear-and-square']).toContain(found?.fit.form);
  });
  it('equal values have no fit', () => expect(leastSquares(sizes, [1, 1, 1, 1, 1])).toBeUndefined());
  it('the band holds the truth in 95 of 100 noisy studies or more, as the procedure promises (noise 0.7 % of the error)', () => {
    let state = 12345; // minimal standard generator of Park and Miller, 1988
    const noise = (): number => {
      state = (16807 * state) % 2147483647;
      return state / 2147483647 - 0.5;
    };
    let held = 0;
    for (let k = 0; k < 400; k++) {
      const p = 1 + noise();
      const values = sizes.map((h) => 10 + 0.3 * h ** p + 0.004 * noise());
      if (Math.abs((values[0] as number) - 10) <= (leastSquares(sizes, values)?.halfWidth ?? 0)) held += 1;
    }
    expect(held).toBeGreaterThanOrEqual(380);
  });
});

// the same procedure written with numpy.linalg.lstsq and scipy.optimize.minimize_scalar, scipy 1.17.1
const byScipy = [
  { values: [10.318, 10.3618, 10.5006, 10.5974, 10.7551], order: 1.087676, atZero: 10.049582, factor: 1.25, halfWidth: 0.363186 },
  { values: [10.2905, 10.361, 10.4088, 10.4879, 10.5908], order: 0.985160, atZero: 10.099720, factor: 1.25, halfWidth: 0.258395 },
  { values: [10.2833, 10.3642, 10.4296, 10.4995, 10.5641], order: -0.193093, atZero: 9.949002, factor: 3, halfWidth: 1.01723 },
  { values: [10.2803, 10.3624, 10.4404, 10.5264, 10.601], order: 0.004878, atZero: 9.914856, factor: 3, halfWidth: 1.10522 },
  { values: [10.2889, 10.3476, 10.3984, 10.4752, 10.5374], order: 0.400463, atZero: 10.051155, factor: 3, halfWidth: 0.722966 },
  { values: [10.2511, 9.6035, 9.8341, 10.4612, 10.4864], order: 3.429337, atZero: 9.758322, factor: 3, halfWidth: 5.70482 },
];

describe('least squares against an independent computation (tolerance: that of its minimiser)', () => {
  it.each(byScipy)('order $order, factor $factor', ({ values, order, atZero, factor, halfWidth }) => {
    const found = leastSquares(sizesOfFive, values);
    expect(found?.order).toBeCloseTo(order, 4);
    expect(found?.fit.atZero).toBeCloseTo(atZero, 4);
    expect(found?.safetyFactor).toBe(factor);
    expect((found?.halfWidth ?? 0) / halfWidth).toBeCloseTo(1, 4);
  });
});
