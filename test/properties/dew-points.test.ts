import { describe, expect, it } from 'vitest';
import { loadMaterial, mixtureOf, parseState, propertyAt, propertySheet, stateOf, tableOver, parseRange } from '../../src/properties/index.ts';
import { iceSublimation } from '../../src/properties/models/ice.ts';

const sheet = (said: string): ReturnType<typeof propertySheet> => propertySheet(loadMaterial('humid air'), stateOf(loadMaterial('humid air'), parseState(said)));

describe('dew and frost points', () => {
  it('the pressure over ice is that of the release', () => {
    // IAPWS R14-08(2011), table 3: 8.94735 Pa at 230 K
    expect(iceSublimation(230)).toBeCloseTo(8.94735, 5);
    expect(iceSublimation(273.16)).toBeCloseTo(611.657, 3);
  });

  // HAPropsSI of CoolProp 8.0.0 (ASHRAE RP-1485)
  it.each([['5 degC, 1 atm, humidity 50 %', 269.117], ['20 degC, 1 atm, humidity 10 %', 261.968], ['20 degC, 1 atm, humidity 25 %', 272.616], ['20 degC, 8 bar, humidity 20 %', 269.878]] as const)('%s has a frost point, said to be one', (said, expected) => {
    const found = sheet(said).properties.find(({ id }) => id === 'saturationTemperature')?.value;
    expect(found?.value).toBeCloseTo(expected, 2);
    expect(found?.notes).toContain('frost point');
  });

  // The same of CoolProp at 450 K; the water of a mixture of gases by the cubic equation.
  it.each([[1e5, 0.001, 252.76], [8e5, 0.0005, 267.73]] as const)('so has a mixture of gases at %d Pa with %d of water', (pressure, water, expected) => {
    const gas = mixtureOf(loadMaterial('gas mixture'), [{ name: 'nitrogen', share: 0.7812 }, { name: 'oxygen', share: 0.2096 }, { name: 'argon', share: 0.0092 }, { name: 'water', share: water }]);
    const found = propertyAt(gas, 'saturationTemperature', { temperature: 300, pressure });
    expect(found?.value).toBeCloseTo(expected, 0);
    expect(found?.notes).toContain('frost point');
  });

  it('dry air has none: the other properties stay and the reason is given', () => {
    const dry = sheet('20 degC, 1 atm, humidity 0 %');
    const ids = dry.properties.map(({ id }) => id);
    expect(ids).not.toContain('saturationTemperature');
    expect(ids).toContain('density');
    expect(dry.flags.join()).toContain('has no dew point');
    const humid = loadMaterial('humid air');
    const table = tableOver(humid, parseRange('20 degC .. 40 degC, 1 atm, humidity 0 %'), 3);
    expect([table.rows.length, table.properties.includes('saturationTemperature')]).toEqual([3, false]);
    expect(table.notes.join()).toContain('has no dew point');
  });
});
