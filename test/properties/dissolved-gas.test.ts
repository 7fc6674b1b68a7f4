import { describe, expect, it } from 'vitest';
import { loadMaterial, propertyAt, shippedMaterials } from '../../src/properties/index.ts';

const water = loadMaterial('water', shippedMaterials());
const at = (property: 'henryOxygen' | 'henryCarbonDioxide' | 'density' | 'vapourPressure', temperature: number): number => propertyAt(water, property, { temperature, pressure: 101325 })?.value ?? Number.NaN;

describe('gases dissolved in water', () => {
  // Values of the guideline's equation by an independent program, iapws 1.5.5 (its saturation line differs by up to 3e-4).
  it.each([
    ['henryOxygen', 283.15, 3291.3656], ['henryOxygen', 298.15, 4364.1282], ['henryOxygen', 313.15, 5347.4517], ['henryOxygen', 353.15, 6904.5337],
    ['henryCarbonDioxide', 283.15, 107.42115], ['henryCarbonDioxide', 298.15, 165.64459], ['henryCarbonDioxide', 313.15, 234.16634], ['henryCarbonDioxide', 353.15, 427.75537],
  ] as const)('%s at %f K: %f MPa', (property, T, expected) => expect(at(property, T) / (expected * 1e6)).toBeCloseTo(1, 3));

  // Dissolved oxygen against moist air at 1 atm [mg/L]: Benson and Krause, Limnol. Oceanogr. 29 (1984) 620, the table of the water trade.
  it.each([[5, 12.77], [10, 11.29], [15, 10.08], [20, 9.09], [25, 8.26], [30, 7.56]])('oxygen in water against moist air at %f degC', (celsius, expected) => {
    const T = celsius + 273.15;
    const partial = 0.20946 * (101325 - at('vapourPressure', T));
    const milligrams = ((partial / at('henryOxygen', T)) * at('density', T) * 31.9988 * 1000) / 18.015268;
    expect(milligrams / expected).toBeCloseTo(1, 1);
    expect(Math.abs(milligrams / expected - 1)).toBeLessThan(0.02);
  });
  it('no steam has them', () => expect(propertyAt(loadMaterial('steam', shippedMaterials()), 'henryOxygen', { temperature: 400, pressure: 101325 })).toBeUndefined());
});
