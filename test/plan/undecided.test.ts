import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { plan } from '../../src/plan/index.ts';
import { planOf } from './harness.ts';

const fluids = ['{ material: air, pressure: 1 atm, temperature: 20 degC }', '{ material: water, pressure: 2 bar abs, temperature: 20 degC }', '{ density: 1000 kg/m^3, viscosity: 1 mPa s }'];
const walls = ['{ heatFlux: 500 W/m^2 }', '{ heat: 50 W }', '{ heatTransferCoefficient: 20 W/(m^2 K), temperature: 50 degC }', '{ heatFlux: 500 W/m^2, layers: [{ material: copper, thickness: 2 mm }] }'];
const confinements = ['inside', 'outside', 'free'];
const inlets = ['', 'inlet: { speed: 1 m/s, temperature: 20 degC }\n', 'inlet: { volumeFlow: 1 L/s, temperature: 20 degC }\n'];
const cases = fluids.flatMap((fluid) => walls.flatMap((wall) => confinements.flatMap((confinement) => inlets.map((inlet) => `format: 1
title: A part of no named shape
targets: [{ quantity: heatRate }]
flow: general
sizes: { length: 0.2 m }
fluid: ${fluid}
${inlet}wall: ${wall}
confinement: ${confinement}
`))));

describe('undecided names what is missing', () => {
  it('a general flow with wall heat: an input, or a flow that has the law', async () => {
    const bare: string[] = [];
    // Every fifth of all combinations: each fluid, wall, confinement and inlet stands among them.
    for (const text of cases.filter((_, k) => k % 5 === 0)) {
      const { effects } = await plan(readCase(text, 'test.case.yaml', vocabulary), { version: 'test', sections: [] });
      for (const e of effects) if (e.judged && e.verdict === 'undecided' && (e.missing ?? []).length === 0) bare.push(`${e.id}: ${e.because}\n${text}`);
    }
    expect(cases.length).toBe(108);
    expect(bare).toEqual([]);
  });
  it('what no input of the flow gives is told with the reason', async () => {
    const { effects } = await planOf(cases[0] as string);
    const open = effects.filter((e) => e.missing?.[0] === 'flow');
    expect(open.map((e) => e.id)).toContain('three-dimensionality');
    for (const e of open) expect(e.because).toContain('a flow named more closely would');
  });
  it('a flux into still air closes by the layer on an upright plate: 500 W/m^2 over 0.2 m', async () => {
    // Film near 75 degC: nu 2.04e-5, alpha 2.9e-5 m^2/s, k 0.0297 W/(m K), beta 1/348: dT = 76 K gives Ra 2.9e7, Nu 45, h 6.6 W/(m^2 K), and 500/6.6 = 76 K.
    const text = (cases.find((c) => c.includes('air') && c.includes('outside') && !c.includes('inlet:') && c.includes('heatFlux: 500 W/m^2 }')) as string);
    const { quantities } = await planOf(text);
    const rise = (quantities['wallTemperature']?.value as number) - 293.15;
    expect(rise).toBeGreaterThan(65);
    expect(rise).toBeLessThan(90);
  });
});
