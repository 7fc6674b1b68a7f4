import { describe, expect, it } from 'vitest';
import { planOf } from './harness.ts';

const roomAir = `format: 1
title: Cold panel in a humid room
targets: [{ quantity: heatRate, within: 10 % }]
flow: plate
sizes: { length: 1.5 m, width: 1 m }
inclination: upward
fluid: { material: humid air, pressure: 1 atm, temperature: 26 degC, humidity: 60 % }
wall: { temperature: 14 degC, emissivity: 0.9 }
surroundings: { temperature: 26 degC }
`;

describe('humid air', () => {
  it('has its own departure from the ideal gas, so that nothing is asked for', async () => {
    const p = await planOf(roomAir);
    // CIPM-2007, Picard et al., Metrologia 45 (2008) 149, at the mean of 20 degC and x_v 0.0200: Z = 0.99962, by hand.
    expect(p.quantities['compressibilityFactor']?.value).toBeCloseTo(0.9996, 4);
    const effect = p.effects.find((e) => e.id === 'real-gas');
    expect(effect).toMatchObject({ verdict: 'leave-out' });
    expect(effect?.deciding?.margin).toBeGreaterThan(40); // 0.02 over 0.0004
  });
});
