import { readFileSync } from 'node:fs';
import { beforeAll, describe, expect, it } from 'vitest';
import { planOf } from './harness.ts';
import type { Plan } from '../../src/plan/index.ts';

// The rinse line by hand. Water by the Helmholtz equation and R12-08 of an independent program (CoolProp 8): d ln mu/dT is -0.01747 1/K at 319.51 K and
// -0.02442 1/K at 293.36 K, d ln beta/dT 0.01094 1/K at 338.15 K. Uncertainty of the records: viscosity and conductivity 1 %, heat capacity 0.3 %.
describe('spreads of numbers that rest on the wall temperature, by local derivatives', () => {
  let p: Plan;
  beforeAll(async () => { p = await planOf(readFileSync(new URL('../../examples/rinse-line.case.yaml', import.meta.url), 'utf8')); });
  const half = (id: string): number => { const q = p.quantities[id]; return ((q?.high as number) - (q?.low as number)) / 2; };
  const share = (id: string): number => half(id) / (p.quantities[id]?.value as number);
  const near = (got: number, wanted: number, rel: number): void => expect(Math.abs(got / wanted - 1), `${got} for ${wanted}`).toBeLessThan(rel);

  it('outlet: 45 K e^-N N times the half-width of N, 10.5 % by the law of heat transfer and 1 % by the speed', () => {
    // N = 2258 W/(m^2 K) 0.6283 m^2/(0.1925 kg/s 4179 J/(kg K)) = 1.764; N goes with U^-0.2 at Nu ~ Re^0.8.
    const n = 1.764;
    near(half('outletTemperature'), 45 * Math.exp(-n) * n * Math.hypot(0.105, 0.01), 0.05);
    near(half('bulkTemperature'), half('outletTemperature') / 2, 0.01);
  });
  it('wetted wall: the 0.21 K over the copper go with h (T_b - T_o): 7.9 % by the law, 4.3 % by the speed, 3 % by the copper', () => near(half('wallTemperature'), 0.2098 * Math.hypot(0.079, 0.043, 0.03), 0.05));
  it('mu_b/mu_w: one factor of the viscosity cancels; both temperatures move with h', () => near(share('viscosityBulkOverWall'), 0.01747 * half('bulkTemperature') + 0.02442 * half('wallTemperature'), 0.05));
  it('eps_beta = |d ln beta/dT| dT goes with dT alone: the wall against a given inlet', () => {
    near(p.quantities['expansionChange']?.value as number, 0.01094 * 44.79, 0.01);
    near(share('expansionChange'), half('wallTemperature') / 44.79, 0.02);
  });
  it('y+ = Pr_w^(-1/3): a third of what viscosity, conductivity and heat capacity leave; the wall temperature adds nothing to be seen', () => near(share('yPlusTarget'), Math.hypot(0.01, 0.01, 0.003, 0.0273 * half('wallTemperature')) / 3, 0.02));
});
