import { describe, expect, it } from 'vitest';
import { fixedPoint } from '../../src/workings/fixed-point.ts';

describe('fixedPoint', () => {
  it('finds the Dottie number, cos x = x', () => {
    const end = fixedPoint(Math.cos, 1, 1e-12);
    expect(end.found).toBe(true);
    expect(end.found && end.x).toBeCloseTo(0.7390851332151607, 12); // OEIS A003957
    expect(end.passes).toBeLessThan(12);
  });
  it('rests at a jump over the root', () => {
    const end = fixedPoint((x) => (x < 2 ? 3 : 1), 0, 1e-9);
    expect(end.found && end.x).toBeCloseTo(2, 6);
  });
  it('says where the law is lost and where it stays open', () => {
    expect(fixedPoint((x) => (x > 1 ? Number.NaN : x + 1), 1, 1e-9)).toMatchObject({ found: false, why: 'lost' });
    expect(fixedPoint((x) => x + 1, 1, 1e-9)).toMatchObject({ found: false, why: 'open' });
  });
});
