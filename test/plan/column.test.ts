import { describe, expect, it } from 'vitest';
import { planOf } from './harness.ts';

const riser = (inclination: string, inlet = '60 degC', more = ''): string => `format: 1
title: Water in a pipe
targets: [{ quantity: pressureDrop, within: 10 % }]
flow: pipe
sizes: { diameter: 50 mm, length: 8 m }
inclination: ${inclination}
fluid: { material: water, pressure: 1.1 bar abs }
inlet: { speed: 1 m/s, temperature: ${inlet}, profile: developed }
${more}`;

// Water at 60 degC: 983.2 kg/m^3 (IAPWS-95); 983.2 x 9.80665 x 8 = 77 140 Pa.
describe('the weight of the column counts in the lowest pressure', () => {
  it.each([['upward', 77140], ['downward', 0], ['horizontal', 0], ['30 deg', 38570]])('%s', async (inclination, head) => {
    const { quantities: q } = await planOf(riser(inclination));
    const drop = q['pressureDropPlain']?.value as number;
    const lowest = inclination === 'downward' ? 110000 : 110000 - drop - head;
    expect((q['lowestPressure']?.value as number) / lowest).toBeCloseTo(1, 3);
    const falls = inclination === 'downward' ? -77140 : head;
    expect((q['outletPressure']?.value as number) / (110000 - drop - falls)).toBeCloseTo(1, 3);
  });
  it('water that stays liquid on the level boils at the top of a riser', async () => {
    // Saturation pressure at 75 degC is 38.6 kPa (IAPWS-IF97); 110 kPa less 76.5 kPa of column leave 32 kPa.
    const of = async (inclination: string): Promise<string | undefined> => (await planOf(riser(inclination, '75 degC', 'wall: { temperature: 80 degC }\n'))).effects.find((e) => e.id === 'boiling')?.verdict;
    expect([await of('horizontal'), await of('upward')]).toEqual(['leave-out', 'include']);
  });
  it('freezing is told in one scale: a difference in K, a temperature in degC', async () => {
    const p = await planOf(riser('horizontal', '12 degC', 'wall: { temperature: -3 degC }\n'));
    const said = p.effects.find((e) => e.id === 'freezing')?.because ?? '';
    expect(said).toMatch(/stands -3\S* K above the melting point -?0\S* degC/);
  });
});
