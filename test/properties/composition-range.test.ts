import { describe, expect, it } from 'vitest';
import { Problem } from '../../src/problems/index.ts';
import { laws, loadMaterial, materialRecords, parseState, propertyAt, propertySheet, stateOf, takeState, type PropertyId } from '../../src/properties/index.ts';
import { codeOf } from './harness.ts';

const at = (name: string, text: string) => {
  const material = loadMaterial(name);
  return { material, state: stateOf(material, parseState(text)) };
};
const messageOf = (what: () => unknown): string => {
  try {
    what();
  } catch (error) {
    if (error instanceof Problem) return error.list.map(({ message, expected }) => `${message} ${expected ?? ''}`).join();
    throw error;
  }
  return '';
};

// Printed values, from memory. Of the acid, densities, heat capacities and the conductivity stand in the tables that the record is fitted to (Perry's Chemical Engineers' Handbook, 8th ed.):
// they hold the fit and its temperature slope, not the tables. The viscosities of syrup are of another work (NBS Circular 440, 1942) than the record.
const strong: readonly (readonly [string, string, PropertyId, number])[] = [
  ['sulphuric acid', '25 degC, 1 bar, composition 98 % mass', 'density', 1831],
  ['sulphuric acid', '20 degC, 1 bar, composition 93 % mass', 'density', 1827.9],
  ['sulphuric acid', '60 degC, 1 bar, composition 90 % mass', 'density', 1772.9],
  ['sulphuric acid', '25 degC, 1 bar, composition 98 % mass', 'viscosity', 0.023],
  ['sulphuric acid', '20 degC, 1 bar, composition 95 % mass', 'viscosity', 0.0235],
  ['sulphuric acid', '25 degC, 1 bar, composition 98 % mass', 'specificHeatCapacity', 1422],
  ['sulphuric acid', '20 degC, 1 bar, composition 91.8 % mass', 'specificHeatCapacity', 1586],
  ['sulphuric acid', '30 degC, 1 bar, composition 90 % mass', 'thermalConductivity', 0.363],
  ['sucrose solution', '20 degC, 1 bar, composition 60 % mass', 'density', 1286.46],
  ['sucrose solution', '20 degC, 1 bar, composition 75 % mass', 'density', 1378.97],
  ['sucrose solution', '20 degC, 1 bar, composition 60 % mass', 'viscosity', 0.05849],
  ['sucrose solution', '20 degC, 1 bar, composition 65 % mass', 'viscosity', 0.1472],
  ['sucrose solution', '20 degC, 1 bar, composition 70 % mass', 'viscosity', 0.4816],
  ['sucrose solution', '20 degC, 1 bar, composition 75 % mass', 'viscosity', 2.328],
];

describe('strong acid and syrup', () => {
  it.each(strong)('%s at %s: %s', (name, text, property, expected) => {
    const { material, state } = at(name, text);
    const found = propertyAt(material, property, state);
    expect(found?.withinRange).toBe(true);
    expect(Math.abs((found?.value ?? Number.NaN) / expected - 1)).toBeLessThanOrEqual(found?.uncertainty ?? 0);
  });
});

describe('a share beyond the data', () => {
  it.each([
    ['sodium chloride brine', '25 degC, 1 bar, composition 30 %', 'beyond-saturation', 'saturated with it at 26.4 %'],
    ['potassium chloride brine', '20 degC, 1 bar, composition 30 %', 'beyond-saturation', 'saturated'],
    ['sucrose solution', '20 degC, 1 bar, composition 85 %', 'beyond-composition', 'from 0 % to 75 %'],
    ['ethylene glycol-water', '20 degC, 1 bar, composition 90 %', 'beyond-composition', 'from 0 % to 60 %'],
    ['sea water', '20 degC, 1 bar, composition 20 %', 'beyond-composition', 'from 0 % to 12 %'],
  ])('%s at %s is refused: %s', (name, text, code, says) => {
    const { material, state } = at(name, text);
    expect(codeOf(() => takeState(material, state))).toBe(code);
    expect(messageOf(() => takeState(material, state))).toContain(says);
  });

  it('refuses the one property whose data end, and says so', () => {
    const { material, state } = at('glycerol-water', '20 degC, 1 bar, composition 80 %');
    const sheet = propertySheet(material, state);
    expect(sheet.properties.map(({ id }) => id)).toContain('viscosity');
    for (const id of ['density', 'thermalConductivity', 'specificHeatCapacity', 'kinematicViscosity', 'thermalExpansion']) expect(sheet.properties.map((one) => one.id as string)).not.toContain(id);
    expect(sheet.flags.join()).toContain('density of glycerol-water is refused: its data go from 0 % to 60 %, not to 80 %');
    expect(laws(material, state).law('density')).toBeUndefined();
    expect(laws(material, state).law('kinematicViscosity')).toBeUndefined();
    expect(laws(material, state).law('viscosity')?.(300)).toBeGreaterThan(0.01);
  });

  it('carries a property a little way on, flagged and twice as unsure', () => {
    const { material, state } = at('glycerol-water', '20 degC, 1 bar, composition 62 %');
    const found = propertyAt(material, 'density', state);
    expect(found?.withinRange).toBe(false);
    expect(found?.uncertainty).toBeCloseTo(0.01, 9);
  });

  it('the cure for a missing composition is a state that holds', () => {
    for (const record of materialRecords().filter(({ takes }) => takes.includes('composition'))) {
      const material = loadMaterial(record.name);
      const cure = /composition [\d.]+ % mass/.exec(messageOf(() => takeState(material, stateOf(material, parseState('25 degC, 1 bar')))))?.[0];
      expect(cure, record.name).toBeDefined();
      const sheet = propertySheet(material, stateOf(material, parseState(`25 degC, 1 bar, ${cure}`)));
      expect(sheet.properties.filter(({ value }) => !value.withinRange && value.of === undefined).map(({ id }) => id), record.name).toEqual([]);
    }
    expect(messageOf(() => takeState(loadMaterial('brine'), { temperature: 293.15, pressure: 1e5 }))).toContain('composition 20 % mass');
  });
});
