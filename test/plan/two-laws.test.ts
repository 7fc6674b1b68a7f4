import { describe, expect, it } from 'vitest';
import { linesOf, planOf } from './harness.ts';

const plate = (speed: string, length: string): string => `format: 1
title: Air along a long panel
targets: [{ quantity: dragCoefficient, within: 10 % }]
flow: plate
sizes: { length: ${length}, width: 1 m }
fluid: { material: air, pressure: 1 atm }
inlet: { speed: ${speed}, temperature: 20 degC, turbulence: { intensity: 5 % } }
`;

// Local skin friction: White 0.455/ln^2(0.06 Re), Schultz-Grunow 0.370 (log10 Re)^-2.584. By hand at Re 6.6e6: 0.002739 and 0.002593, ratio 0.947; at 6.6e8 0.897.
describe('where the literature disagrees both laws are shown, and the spread holds them', () => {
  it.each([['50 m/s', '2 m'], ['100 m/s', '100 m']])('a plate in %s over %s', async (speed, length) => {
    const p = await planOf(plate(speed, length));
    const re = p.quantities['reynolds']?.value as number;
    const white = 0.455 / Math.log(0.06 * re) ** 2;
    const schultzGrunow = 0.37 * Math.log10(re) ** -2.584;
    const [first, second, ratio] = ['plateFrictionEnd', 'plateFrictionSecond', 'plateFrictionDisagreement'].map((id) => p.quantities[id]);
    expect(first?.value).toBeCloseTo(white, 6);
    expect(second?.value).toBeCloseTo(schultzGrunow, 6);
    expect(ratio?.value).toBeCloseTo(schultzGrunow / white, 4);
    expect(first?.low).toBeLessThan(schultzGrunow);
    expect(linesOf(p, 'physics')).toContainEqual(expect.stringMatching(/^Two laws of skin friction apply: \{plateFrictionEnd\} \(White.*\{plateFrictionSecond\} \(Schultz-Grunow.*holds the second\.$/));
    expect(linesOf(p, 'physics')).toContainEqual(expect.stringMatching(/^Two laws of drag apply: .*holds the second\.$/));
  });
});
