import { describe, expect, it } from 'vitest';
import { linesOf, planOf } from './harness.ts';

/** A smooth pipe, long enough for its entrance not to count. */
const pipe = (fluid: string, speed: string): string => `format: 1
title: exponents
flow: pipe
fluid: ${fluid}
sizes: { diameter: 20 mm, length: 40 m }
inlet: { speed: ${speed}, profile: developed }
wall: { sandGrain: 0 m }
targets:
  - { quantity: pressureDrop, within: 5 % }
`;
const water = '{ material: water, temperature: 20 degC, pressure: 5 bar }';
const numbers = '{ density: 998 kg/m^3, viscosity: 1e-3 Pa s }';

describe('exponents of a target in the properties', () => {
  // Colebrook at Re 1e5, smooth: f ~ Re^-0.21, so dp ~ rho^0.79 mu^0.21; laminar dp ~ mu. Source: centred differences on the named laws, methods 15.4.
  it.each([['by the laws of a material', water, '5.02 m/s'], ['by numbers given for the fluid', numbers, '5.01 m/s']])('turbulent pipe, %s', async (_, fluid, speed) => {
    const p = await planOf(pipe(fluid, speed));
    expect(p.quantities['reynolds']?.value).toBeCloseTo(1e5, -3);
    expect(p.quantities['targets.0.per.viscosity']?.value).toBeCloseTo(0.21, 2);
    expect(p.quantities['targets.0.per.density']?.value).toBeCloseTo(0.79, 2);
    expect(linesOf(p, 'properties').join(' ')).toContain('dynamic viscosity to the power {targets.0.per.viscosity}');
  });
  it('laminar pipe: the viscosity alone', async () => {
    const p = await planOf(pipe(water, '0.02 m/s'));
    expect(p.quantities['targets.0.per.viscosity']?.value).toBeCloseTo(1, 2);
    expect(p.quantities['targets.0.per.density']).toBeUndefined();
  });
});
