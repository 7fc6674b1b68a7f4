import { expect, it } from 'vitest';
import { planOf } from './harness.ts';

const polymer = (rheology: string): string => `format: 1
title: Polymer solution dosing line
targets: [{ quantity: pressureDrop, within: 10 % }]
flow: pipe
sizes: { diameter: 20 mm, length: 5 m }
fluid: { medium: liquid, density: 1020 kg/m^3, specificHeatCapacity: 4.0 kJ/(kg K), thermalConductivity: 0.6 W/(m K), pressure: 3 bar abs }
inlet: { speed: 0.3 m/s, temperature: 20 degC }
rheology: { ${rheology} }
`;
const carreau = 'law: carreau, zeroShearViscosity: 5 Pa s, infiniteShearViscosity: 5 mPa s, timeConstant: 1 s, index: 0.4';

it('the price of a constant viscosity says which one: that at zero shear where the case gives it', async () => {
  const p = await planOf(polymer(carreau));
  const effect = p.effects.find((e) => e.id === 'non-newtonian');
  // tau = mu_0 8 U/D = 5 x 120 = 600 Pa with the zero-shear viscosity; 39.3 kPa x 20 mm/(4 x 5 m) = 39.3 Pa with the law,
  // 0.4 % of it from the entrance: 600/39.15 - 1 = +1432 %.
  expect(effect?.price?.relative).toBeCloseTo(600 / 39.15 - 1, 1);
  // The other price stands beside it: mu(120/s) x 120/s against 39.15 Pa.
  const at = 0.005 + 4.995 * (1 + 120 ** 2) ** -0.3;
  expect(effect?.prices?.map((one) => one.relative ?? 0).sort((a, b) => a - b)[0]).toBeCloseTo((at * 120) / 39.15 - 1, 2);
  expect(effect?.because).toContain('zero-shear viscosity');
});

it.each([carreau, 'law: bingham, yieldStress: 10 Pa, plasticViscosity: 50 mPa s'])('an inelastic law leaves viscoelasticity out, and says once that elasticity is unknown: %s', async (rheology) => {
  const p = await planOf(polymer(rheology));
  expect(p.effects.find((e) => e.id === 'viscoelasticity')).toMatchObject({ verdict: 'leave-out', judged: true });
  expect(p.sections.cautions.lines.filter((l) => l.text.includes('Elasticity is unknown'))).toHaveLength(1);
  expect(p.sections.cautions.lines.map((l) => l.text).join(' ')).not.toContain('Not in these numbers');
});
