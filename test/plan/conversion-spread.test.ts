import { expect, it } from 'vitest';
import { planOf } from './harness.ts';

const wall = (rate: string): string => `format: 1
title: Trace gas that decays on a coated tube
targets: [{ quantity: conversion, place: outlet, within: 5 % }]
flow: pipe
sizes: { diameter: 10 mm, length: 2 m }
fluid: { material: air, pressure: 1 atm }
inlet: { speed: 0.5 m/s, temperature: 25 degC, profile: developed }
species: [{ name: trace, diffusivity: 1.8e-5 m2/s, molarMass: 48 g/mol, inlet: 10 ppm mass }]
reactions: [{ of: trace, where: wall, order: 1, rateConstant: ${rate} }]
`;
const bed = `format: 1
title: Catalyst bed
targets: [{ quantity: conversion, place: outlet, within: 5 % }]
flow: packed-bed
sizes: { bedDiameter: 100 mm, length: 0.5 m, particleDiameter: 4 mm }
packing: { voidFraction: 40 % }
fluid: { material: nitrogen, pressure: 2 bar abs }
inlet: { speed: 0.3 m/s, temperature: 300 degC }
wall: { temperature: 320 degC }
species: [{ name: feed, diffusivity: 5e-5 m2/s, molarMass: 60 g/mol, inlet: 2 % mass }]
reactions: [{ of: feed, where: catalyst, order: 1, rateConstant: 5 1/s, rateAt: 300 degC, activationEnergy: 90 kJ/mol }]
`;

// A law that is uncertain in its rate moves X = 1 - e^-N by N e^-N of that share: what is left cannot fall below nothing.
it.each([['a fast surface', wall('0.01 m/s')], ['a bed', bed]])('no more than all is converted: %s', async (_, text) => {
  const { value, low, high } = (await planOf(text)).quantities['conversion'] as { value: number; low: number; high: number };
  expect(value).toBeGreaterThan(0.97);
  expect(high).toBeLessThanOrEqual(1);
  expect(low).toBeLessThan(value);
});

it('a slow surface scatters by the law, 10 %, and by the transfer to it', async () => {
  const { quantities } = await planOf(wall('0.0001 m/s'));
  const { value, high } = quantities['conversion'] as { value: number; high: number };
  // By hand: Da = 4 k" L/(D U) = 0.16, Da_w = 0.015, N = 0.1576, d ln X/d ln N = N e^-N/(1 - e^-N) = 0.923.
  expect(value).toBeCloseTo(0.1458, 3);
  expect(high / value - 1).toBeCloseTo(0.0923, 3);
});
