import { describe, expect, it } from 'vitest';
import { evaluateReference, findReference } from '../../src/references/index.ts';

const ref = findReference('generalized-newtonian-pipe');
const of = (given: Record<string, number>): Record<string, number> => {
  if (ref === undefined) throw new Error('no such reference');
  return Object.fromEntries(evaluateReference(ref, { flowLength: 5, ...given }).values.map(({ id, value }) => [id, value]));
};

describe('a pipe of a fluid of other rheology', () => {
  // Closed form of the power law: dp/L = (4 K/D)((3n + 1)/(4n) 8U/D)^n, u_max/U = (3n + 1)/(n + 1).
  it.each([0.3, 0.5, 1, 1.4])('the power law, n = %d', (index) => {
    const out = of({ speed: 0.3, length: 0.02, consistency: 2, index });
    const gradient = ((4 * 2) / 0.02) * (((3 * index + 1) / (4 * index)) * (8 * 0.3) / 0.02) ** index;
    expect((out['pressureGradient'] as number) / gradient).toBeCloseTo(1, 6);
    expect(out['pressureDrop'] as number).toBeCloseTo(5 * gradient, 0);
    expect(out['peakOverMean'] as number).toBeCloseTo((3 * index + 1) / (index + 1), 5);
  });

  // Buckingham and Reiner: 8U/D = (tau_w/mu_p)(1 - 4 phi/3 + phi^4/3); plug of the profile: u_max = (R tau_w/(2 mu_p))(1 - phi)^2.
  it.each([1, 10, 200])('the Bingham fluid, tau_y = %d Pa', (yieldStress) => {
    const out = of({ speed: 0.3, length: 0.02, consistency: 0.05, yieldStress });
    const [wall, phi] = [out['wallShear'] as number, yieldStress / (out['wallShear'] as number)];
    expect((wall / 0.05) * (1 - (4 * phi) / 3 + phi ** 4 / 3)).toBeCloseTo(120, 4);
    expect(out['plugShare']).toBeCloseTo(phi, 12);
    expect(out['peakOverMean'] as number).toBeCloseTo((((0.01 * wall) / (2 * 0.05)) * (1 - phi) ** 2) / 0.3, 4);
  });

  // Herschel and Bulkley, closed form: 8U/D = 4n (tau_w/K)^(1/n) (1 - phi)^((n + 1)/n) ((1 - phi)^2/(3n + 1) + 2 phi (1 - phi)/(2n + 1) + phi^2/(n + 1)).
  it('the Herschel-Bulkley fluid', () => {
    const n = 0.5;
    const out = of({ speed: 0.3, length: 0.02, consistency: 2, index: n, yieldStress: 10 });
    const wall = out['wallShear'] as number;
    const phi = 10 / wall;
    expect(4 * n * (wall / 2) ** (1 / n) * (1 - phi) ** ((n + 1) / n) * ((1 - phi) ** 2 / (3 * n + 1) + (2 * phi * (1 - phi)) / (2 * n + 1) + phi ** 2 / (n + 1))).toBeCloseTo(120, 3);
  });
});
