import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import { settleCase } from '../../src/plan/index.ts';
import { limitIn } from '../../src/assemble/target-definitions.ts';

describe('the limit that a purpose names', () => {
  it.each([
    ['Does the water leave the jacketed line below 50 degC?', 'K', 323.15],
    ['The drop must stay under 2 kPa, whatever happens', 'Pa', 2000],
    ['Is the heat at least 1.5 kW.', 'W', 1500],
    ['Keep it above 40 degC', 'K', 313.15],
  ])('%s', (purpose, unit, value) => {
    expect(limitIn(purpose, unit)?.value).toBeCloseTo(value, 9);
  });

  it.each([
    ['What pressure drop does the line take?', 'Pa'],
    ['Does the water leave below 50 degC?', 'Pa'],
    ['Is it below the limit of 50 degC?', 'K'],
    [`Is it below ${'1'.repeat(5000)}`, 'K'],
    ['', 'K'],
  ])('none in: %s', (purpose, unit) => {
    expect(limitIn(purpose, unit)).toBeUndefined();
  });
});

const boundTo = (target: string) => settleCase(readCase(`format: 1\ntitle: t\ntargets: [{ quantity: ${target} }]\nflow: cylinder\nsizes: { diameter: 20 mm }\nfluid: { material: air, pressure: 1 atm }\ninlet: { speed: 5 m/s, temperature: 20 degC }\nwall: { temperature: 60 degC }\n`, 't.case.yaml', vocabulary)).assembled.targets[0];

describe('a target in words', () => {
  it.each([['drag force', 'dragForce'], ['drag', 'dragForce'], ['Nusselt number', 'nusselt'], ['Strouhal number', 'strouhal'], ['wall heat flux', 'wallHeatFlux'], ['heat-transfer coefficient', 'heatTransferCoefficient'], ['dragForce', 'dragForce']])('%s is the quantity %s', (words, id) => {
    expect(boundTo(words)).toMatchObject({ quantity: id, computed: true });
  });
  it.each([['heatFlux', 'wallHeatFlux'], ['drag on the rod', 'dragForce'], ['heat flux of the wall', 'wallHeatFlux']])('%s names none, and %s is near', (words, id) => {
    const found = boundTo(words);
    expect(found).toMatchObject({ quantity: words, computed: false });
    expect(found?.nearest).toContain(id);
  });
  it('is not near to a quantity for one word of several', () => expect(boundTo('pressure loss of the grille')?.nearest).not.toContain('pressure'));
  it('that names nothing stays as it is written', () => expect(boundTo('colour of the rod')).toMatchObject({ quantity: 'colour of the rod', computed: false, nearest: [] }));
});
