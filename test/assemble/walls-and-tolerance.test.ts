import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/index.ts';
import { readCase } from '../../src/case/index.ts';
import type { Problem } from '../../src/problems/index.ts';
import { settleCase } from '../../src/plan/index.ts';

const duct = (more: string) => settleCase(readCase(`format: 1\ntitle: t\n${more}flow: duct\nsizes: { width: 20 mm, height: 10 mm, length: 1 m }\nfluid: { material: water, pressure: 2 bar abs }\ninlet: { speed: 1 m/s, temperature: 20 degC }\n`, 't.case.yaml', vocabulary)).assembled.workings;

describe('walls named as a group', () => {
  it('layers of the group count for each member: 2 mm over 40 W/(m K) is 5e-5 m^2 K/W', () => {
    const w = duct('walls: [{ name: sides, temperature: 60 degC, layers: [{ thermalConductivity: 40 W/(m K), thickness: 2 mm }] }]\n');
    expect(w.get('outerTemperature@walls.left')).toBeCloseTo(333.15, 9);
    expect(w.get('outerTemperature@walls.right')).toBeCloseTo(333.15, 9);
    expect(w.get('wallResistance@walls.left')).toBeCloseTo(5e-5, 9);
    expect(w.get('wallResistance@walls.right')).toBeCloseTo(5e-5, 9);
  });
  it('a wall overrides its group', () => {
    const w = duct('walls: [{ name: left, heatFlux: 3 kW/m^2 }, { name: sides, heatFlux: 1 kW/m^2 }]\n');
    expect(w.get('wallHeatFlux@walls.left')).toBe(3000);
    expect(w.get('wallHeatFlux@walls.right')).toBe(1000);
  });
});

describe('a surface by name', () => {
  it('gives sand grain and emissivity from the tables, and what the case gives wins', () => {
    const w = duct('wall: { temperature: 60 degC, surface: commercial steel }\n');
    expect(w.get('sandGrain@walls.left')).toBeCloseTo(46e-6, 9); // Moody 1944: 0.00015 ft
    expect(w.word('has.roughness')).toBe('yes');
    expect(duct('wall: { temperature: 60 degC, surface: commercial steel, sandGrain: 10 um }\n').get('sandGrain@walls.left')).toBe(1e-5);
    expect(duct('wall: { temperature: 60 degC, surface: black paint }\n').word('has.roughness')).toBe('no');
  });
  it('one that no table knows is a problem at its place', () => {
    expect(() => duct('wall: { temperature: 60 degC, surface: comercial steel }\n')).toThrow(expect.objectContaining({ list: [expect.objectContaining({ code: 'unknown-surface', nearest: 'commercial steel', file: 't.case.yaml', line: 3 })] }) as Problem);
  });
});

describe('the share of a solution in a case', () => {
  const glycol = (fluid: string): number | undefined => settleCase(readCase(`format: 1\ntitle: t\nflow: pipe\nsizes: { diameter: 20 mm, length: 1 m }\nfluid: { ${fluid}, pressure: 2 bar abs }\ninlet: { speed: 1 m/s, temperature: 20 degC }\n`, 't.case.yaml', vocabulary)).assembled.workings.get('density');
  it('one share, the name of the solute, and solute with water say the same', () => {
    const alone = glycol('material: propylene glycol-water, composition: 40 %');
    expect(alone).toBeGreaterThan(1020);
    expect(glycol('material: propylene glycol-water, composition: 40 % mass')).toBe(alone);
    expect(glycol('material: propylene glycol-water, composition: { propylene glycol: 40 % mass }')).toBe(alone);
    expect(glycol('material: propylene glycol-water, composition: { propylene glycol: 40 % mass, water: 60 % mass }')).toBe(alone);
  });
  it('what is missing or does not fit is told in the form that works', () => {
    expect(() => glycol('material: propylene glycol-water')).toThrow(expect.objectContaining({ list: [expect.objectContaining({ expected: expect.stringMatching(/^composition: \d+ % mass/) as string })] }) as Problem);
    expect(() => glycol('material: propylene glycol-water, composition: 40 % mol')).toThrow('by mass');
    expect(() => glycol('material: gas mixture, composition: 40 %')).toThrow(expect.objectContaining({ list: [expect.objectContaining({ line: 5, expected: 'composition: { oxygen: 21 % mol, nitrogen: 79 % mol }' })] }) as Problem);
    expect(() => glycol('density: 1000 kg/m^3, composition: 40 %')).toThrow('without a material');
  });
});

describe('mixtures of gases in a case', () => {
  it('takes the components of the composition', () => {
    const w = settleCase(readCase('format: 1\ntitle: t\nflow: pipe\nsizes: { diameter: 0.3 m, length: 5 m }\nfluid: { material: flue gas, pressure: 1 bar abs, composition: { carbon dioxide: 13.3 % mol, oxygen: 3.9 % mol, nitrogen: 82.8 % mol } }\ninlet: { speed: 5 m/s, temperature: 20 degC }\n', 't.case.yaml', vocabulary)).assembled.workings;
    expect(w.get('viscosity')).toBeCloseTo(1.714e-5, 6); // Bird, Stewart and Lightfoot, example 1.4-2, predicted at 20 degC
  });
});

describe('roughness by a stylus', () => {
  it('of 1.6 um is a sand grain between 3 and 6 times as high, and no number is missing', () => {
    const w = duct('wall: { temperature: 60 degC, Ra: 1.6 um }\n');
    expect(w.get('sandGrain@walls.top')).toBeCloseTo(1.6e-6 * Math.sqrt(3 * 6), 8);
    expect(w.get('roughnessReynolds')).toBeGreaterThan(0);
  });
  it('gives way to a sand grain of the wall itself', () => {
    const w = duct('walls: [{ name: top, sandGrain: 10 um }]\nwall: { temperature: 60 degC, Ra: 1.6 um }\n');
    expect(w.get('sandGrain@walls.top')).toBe(1e-5);
  });
});

describe('the temperature that matters', () => {
  it.each([
    ['the first accuracy in kelvins', 'targets: [{ quantity: pressureDrop, within: 5 % }, { quantity: outletTemperature, within: 0.4 K }, { quantity: wallTemperature, within: 3 K }]\n', 0.4],
    ['1 K where none is stated in kelvins', 'targets: [{ quantity: pressureDrop, within: 5 % }]\n', 1],
    ['1 K where a share of the change is asked', 'targets: [{ quantity: outletTemperature, within: 5 % of change }]\n', 1],
  ])('is %s', (_, targets, kelvins) => expect(duct(`${targets}wall: { temperature: 60 degC }\n`).get('temperatureTolerance')).toBe(kelvins));
});
