import { describe, expect, it } from 'vitest';
import { linesOf, planOf } from './harness.ts';

const cover = (speed: string): string => `format: 1
title: Air along a cover
targets: [{ quantity: heatRate, within: 10 % }]
flow: plate
sizes: { length: 0.9 m, width: 0.5 m }
inclination: horizontal
fluid: { material: air, pressure: 1 atm }
inlet: { speed: ${speed}, temperature: 25 degC, turbulence: { intensity: 1 %, viscosityRatio: 5 } }
wall: { temperature: 48 degC, emissivity: 0.05 }
surroundings: { temperature: 25 degC }
`;

// Film state of air at 36.5 degC: nu 1.666e-5 m^2/s, k 0.0271 W/(m K), Pr 0.706; 0.45 m^2 and 23 K. Incropera and DeWitt, ch. 7:
// laminar 0.664 Re^(1/2) Pr^(1/3), turbulent from the edge 0.037 Re^0.8 Pr^(1/3).
describe('laminar or turbulent is open', () => {
  it('the target is printed for both, and a line says that the spread does not hold it', async () => {
    const p = await planOf(cover('9 m/s'));
    const re = (9 * 0.9) / 1.666e-5;
    const perNusselt = (0.0271 / 0.9) * 0.45 * 23;
    const radiation = 0.05 * 5.67e-8 * 0.45 * (321.15 ** 4 - 298.15 ** 4);
    const laminar = 0.664 * Math.sqrt(re) * 0.706 ** (1 / 3) * perNusselt + radiation;
    const turbulent = 0.037 * re ** 0.8 * 0.706 ** (1 / 3) * perNusselt + radiation;
    expect((p.quantities['targets.0.ifLaminar']?.value as number) / laminar).toBeCloseTo(1, 1);
    expect((p.quantities['targets.0.ifTurbulent']?.value as number) / turbulent).toBeCloseTo(1, 1);
    expect(turbulent / laminar).toBeGreaterThan(2.5);
    expect(linesOf(p, 'cautions')[1]).toContain('Laminar or turbulent is open');
    expect(linesOf(p, 'cautions')).toContainEqual(expect.stringMatching(/^Laminar or turbulent is open: .*\{targets\.0\.ifLaminar\}.*\{targets\.0\.ifTurbulent\}.*does not hold that\./));
  });
  it('nothing is said where the regime is settled', async () => {
    const p = await planOf(cover('1 m/s'));
    expect(p.quantities['targets.0.ifTurbulent']).toBeUndefined();
    expect(linesOf(p, 'cautions').join(' ')).not.toContain('is open');
  });
  it('a stretched law that hardly moves the target is no support of it: buoyancy across a strong stream', async () => {
    const p = await planOf(cover('9 m/s'));
    expect(p.quantities['nusseltNatural']?.outside).toContain('nusseltNatural');
    expect(linesOf(p, 'cautions').join(' ')).not.toContain('{nusseltNatural}');
    // (1 + 0.25^3.5)^(1/3.5) = 1.0022: the sum cannot be less sure than what it adds.
    const f = p.quantities['buoyancyFactorNusselt'];
    expect((f?.high as number) / (f?.value as number)).toBeLessThan(1.03);
  });
  it('and one that moves it is: buoyancy across a slow stream', async () => {
    const p = await planOf(cover('0.5 m/s'));
    expect(linesOf(p, 'cautions').join(' ')).toContain('{nusseltNatural}');
  });
});
