import { describe, expect, it } from 'vitest';
import { planOf } from './harness.ts';

const plate = (speed: string): string => `format: 1
title: Air along a panel
targets: [{ quantity: dragCoefficient, within: 10 % }]
flow: plate
sizes: { length: 1 m, width: 1 m }
fluid: { material: air, pressure: 1 atm }
inlet: { speed: ${speed}, temperature: 20 degC, turbulence: { intensity: 3 % } }
`;

// F = 1 - (1614/Re)/(0.455/(log10 Re)^2.58), Schlichting and Gersten: 0.643 at 1e6, so 1/F - 1 = +56 %; it crosses zero near 2.7e5 and means nothing below 5e5.
describe('no price outside the range of its law', () => {
  it('transition of a layer at Re 1e6 is priced', async () => {
    const e = (await planOf(plate('15.1 m/s'))).effects.find((one) => one.id === 'transition');
    expect(e?.price?.relative).toBeCloseTo(0.56, 1);
    expect(e?.because).not.toContain('not priced');
  });
  it.each(['6.5 m/s', '4 m/s', '3.2 m/s'])('at %s it is not, and the range is told', async (speed) => {
    const p = await planOf(plate(speed));
    const e = p.effects.find((one) => one.id === 'transition');
    expect(p.quantities['reynolds']?.value).toBeLessThan(5e5);
    expect(e?.applies).not.toBe(false);
    expect(e?.prices ?? []).toEqual([]);
    expect(e?.because).toMatch(/not priced: reynolds is \d+ where the law of transitionFactorFriction holds from 500000 to 1000000000/);
  });
});
