import { describe, expect, it } from 'vitest';
import { liquidFrictionFactor } from '../../src/quantities/index.ts';

describe('friction of a heated liquid in turbulent flow', () => {
  // Petukhov 1970: (7 - mu_b/mu_w)/6 up to mu_w/mu_b = 0.35
  it.each([[1, 1], [2, 5 / 6], [2.86, 4.14 / 6]] as const)('ratio %f: %f', (ratio, factor) => expect(liquidFrictionFactor({ ratio, regime: 'turbulent' })).toBeCloseTo(factor, 6));
  it('stays positive and falls on beyond its range, without a step', () => {
    expect(liquidFrictionFactor({ ratio: 2.8601, regime: 'turbulent' })).toBeCloseTo(0.69, 4);
    expect(liquidFrictionFactor({ ratio: 8, regime: 'turbulent' })).toBeGreaterThan(0.3);
    expect(liquidFrictionFactor({ ratio: 8, regime: 'turbulent' })).toBeLessThan(liquidFrictionFactor({ ratio: 4, regime: 'turbulent' }));
  });
});
