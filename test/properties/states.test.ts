import { describe, expect, it } from 'vitest';
import { loadMaterial, parseRange, parseState, phaseAt, propertyAt, saturationOf, stateOf, tableOver, takeState } from '../../src/properties/index.ts';
import type { Problem } from '../../src/problems/index.ts';
import { codeOf } from './harness.ts';

const at = (name: string, text: string) => {
  const material = loadMaterial(name);
  return takeState(material, stateOf(material, parseState(text)));
};

describe('states from text', () => {
  it.each([
    ['60 degC, 2 bar', { temperature: 333.15, pressure: 2e5 }],
    ['2 bar, 60 degC', { temperature: 333.15, pressure: 2e5 }],
    ['1 bar gauge, 20 degC', { temperature: 293.15, pressure: 201325 }],
    ['60 degC, saturated liquid', { temperature: 333.15, saturated: 'liquid' }],
    ['2 bar, saturated vapour', { pressure: 2e5, saturated: 'vapour' }],
    ['20 degC, 1 atm, humidity 60 %', { temperature: 293.15, pressure: 101325, humidity: 0.6 }],
    ['20 degC, 1 bar, composition 30 % mass', { temperature: 293.15, pressure: 1e5, composition: 0.3 }],
    ['300 K, 1 bar, liquid', { temperature: 300, pressure: 1e5, phase: 'liquid' }],
  ])('%s', (text, state) => {
    const { assumed: _, ...rest } = parseState(text);
    const rounded = Object.fromEntries(Object.entries(rest).map(([key, value]) => [key, typeof value === 'number' ? Number(value.toPrecision(12)) : value]));
    expect(rounded).toEqual(state);
  });

  it.each([
    ['60 degC, 2 bar, 3 bar', 'said-twice'],
    ['60 degC, saturatd liquid', 'unreadable-state'],
    ['60 degC,, 2 bar', 'unreadable-state'],
    ['60 furlong, 2 bar', 'unknown-unit'],
    ['60 degC .. 80 degC, 2 bar', 'range-in-state'],
    ['60 degC, composition 30 % mol', 'wrong-basis'],
    ['60 C, 2 bar', 'ambiguous-unit'],
    ['60 +/- 1 degC, 2 bar', 'unreadable-state'],
  ])('%s is a problem', (text, code) => expect(codeOf(() => parseState(text))).toBe(code));

  it('places the problem in the text', () => {
    expect(() => parseState('60 degC, saturatd liquid')).toThrow(expect.objectContaining({ list: [expect.objectContaining({ at: 9, length: 15, nearest: 'saturated liquid' })] }) as Problem);
  });
});

describe('phases', () => {
  it.each([
    // Boiling at 2 bar: 120.21 degC; critical point 647.096 K, 22.064 MPa (IAPWS R2-83, R7-97)
    [333.15, 2e5, 'liquid'],
    [393.3, 2e5, 'liquid'],
    [393.4, 2e5, 'vapour'],
    [700, 1e5, 'gas'],
    [700, 25e6, 'supercritical'],
    [500, 25e6, 'liquid'],
    [263.15, 1e5, 'solid'],
  ])('water at %d K and %d Pa is %s', (T, p, phase) => expect(phaseAt(loadMaterial('water'), T, p).phase).toBe(phase));

  it('warns of an amorphous solid above its glass transition, of which it names no melting point', () => {
    const found = phaseAt(loadMaterial('polystyrene'), 380, 1e5); // glass transition 373 K, Brandrup, Polymer Handbook, 4th ed. (1999)
    expect(found.flags.join()).toContain('above the glass transition temperature of 373 K (99.85 degC), where it softens');
    expect(phaseAt(loadMaterial('polystyrene'), 370, 1e5).flags).toEqual([]);
    expect(loadMaterial('polystyrene').meltingTemperature).toBeUndefined();
  });

  it('gives saturation and warns near the critical point', () => {
    const found = phaseAt(loadMaterial('water'), 640, 21e6);
    expect(found.saturation?.pressure).toBeCloseTo(20.265e6, -4);
    expect(found.flags.join()).toContain('near the critical point');
    expect(phaseAt(loadMaterial('water'), 400, 1e6).flags).toEqual([]);
  });

  it.each([
    ['steam', '60 degC, 2 bar', 'no-such-phase'],
    ['water', '200 degC, 1 bar, liquid', 'no-such-phase'],
    ['water', '-5 degC, 1 bar', 'not-covered'],
    ['sodium', '1200 K, 1 bar', 'not-covered'],
    ['sodium', '300 K, 1 bar', 'not-covered'],
    ['humid air', '20 degC, 1 atm', 'missing-humidity'],
    ['humid air', '150 degC, 1 atm, humidity 50 %', 'impossible-humidity'],
    ['ethylene glycol-water', '20 degC, 1 bar', 'missing-composition'],
    ['ethylene glycol-water', '-30 degC, 1 bar, composition 30 %', 'not-covered'],
    ['engine oil', '2 bar, saturated vapour', 'no-saturation'],
    ['water', '400 degC, saturated liquid', 'no-saturation'],
    ['water', '2 bar, saturated vapour, 60 degC', 'incomplete-state'],
    ['water', '60 degC', 'incomplete-state'],
    ['LN2', '25 degC, 1 bar', 'no-such-phase'],
    ['liquid propane', '25 degC, 1 bar', 'no-such-phase'],
    ['propane vapour', '25 degC, 20 bar', 'no-such-phase'],
    ['benzene', '0 degC, 1 bar', 'not-covered'], // melts at 5.5 degC
    ['methane', '100 K, 800 bar', 'not-covered'], // melts at 110 K under this pressure
    ['1-propanol', '120 degC, 1 bar', 'not-covered'], // boils at 97 degC
    ['acetone', '329.22 K, saturated liquid, 1 bar', 'incomplete-state'],
    ['nitric oxide', '300 K, saturated liquid', 'no-saturation'],
  ])('%s at %s is refused', (name, text, code) =>
    expect(
      codeOf(() => {
        const taken = at(name, text);
        propertyAt(loadMaterial(name), 'density', { temperature: taken.sample.T, pressure: taken.sample.p, humidity: taken.sample.x, composition: taken.sample.x });
      }),
    ).toBe(code));

  // Normal boiling points of the CRC Handbook of Chemistry and Physics, 95th ed. [degC]
  it.each([
    ['acetone', 56.08], ['benzene', 80.09], ['methanol', 64.54], ['ethanol', 78.24], ['n-hexane', 68.72], ['ammonia', -33.33], ['propane', -42.11], ['n-butane', -0.5], ['methane', -161.48], ['R-134a', -26.09], ['R-22', -40.81], ['chlorine', -34.04], ['sulphur dioxide', -10.05], ['heavy water', 101.42], ['hydrogen', -252.76], ['helium', -268.93], ['krypton', -153.41], ['toluene', 110.63], ['cyclohexane', 80.71], ['chloroform', 61.17], ['acetic acid', 117.9], ['styrene', 145], ['1-propanol', 97.2], ['2-propanol', 82.3], ['carbon tetrachloride', 76.8], ['n-butanol', 117.66],
  ])('%s boils at %d degC', (name, boils) => {
    expect(Math.abs((saturationOf(loadMaterial(name))?.boiling(101325) ?? 0) - 273.15 - boils)).toBeLessThan(0.5);
  });

  // Boiling points of solutions at 1 atm [degC]: ASHRAE Handbook Fundamentals, tables of aqueous ethylene and propylene glycol; handbook tables of brines, glycerol and sugar; all from memory.
  it.each([
    ['ethylene glycol-water', 0.1, 101.1], ['ethylene glycol-water', 0.3, 104.4], ['ethylene glycol-water', 0.4, 105.6], ['ethylene glycol-water', 0.5, 107.2], ['ethylene glycol-water', 0.6, 110],
    ['propylene glycol-water', 0.2, 100.6], ['propylene glycol-water', 0.3, 102.2], ['propylene glycol-water', 0.4, 103.9], ['propylene glycol-water', 0.5, 105.6], ['propylene glycol-water', 0.6, 107.2],
    ['glycerol-water', 0.5, 106], ['glycerol-water', 0.6, 109], ['sodium chloride brine', 0.1, 101.9], ['sodium chloride brine', 0.2, 104.7], ['sucrose solution', 0.4, 101.4], ['sea water', 0.035, 100.55],
  ])('%s of %d boils at %d degC', (name, composition, boils) => {
    const material = loadMaterial(name);
    const found = propertyAt(material, 'saturationTemperature', { temperature: 293.15, pressure: 101325, composition });
    const pressure = propertyAt(material, 'vapourPressure', { temperature: 293.15, pressure: 101325, composition });
    expect(Math.abs((found?.value ?? 0) - 273.15 - boils)).toBeLessThan((found?.uncertainty ?? 0) * 373);
    expect(Math.abs((found?.value ?? 0) - 273.15 - boils)).toBeLessThan(1.9);
    expect(saturationOf(material, composition)?.bubble(found?.value ?? 0)).toBeCloseTo(101325, 0);
    expect(pressure?.value).toBeLessThan(2339.3); // water at 20 degC, IAPWS R7-97
  });

  it('the liquids of handbooks boil where their vapour pressure says', () => {
    // Acetic acid 117.9 degC, 1-propanol 97.2 degC (CRC Handbook of Chemistry and Physics, 95th ed.)
    for (const [name, boils] of [['acetic acid', 117.9], ['1-propanol', 97.2]] as const) expect((propertyAt(loadMaterial(name), 'saturationTemperature', { temperature: 300, pressure: 101325 })?.value ?? 0) - 273.15, name).toBeCloseTo(boils, 0);
    expect(propertyAt(loadMaterial('calcium chloride brine'), 'saturationTemperature', { temperature: 300, pressure: 101325, composition: 0.2 })).toBeUndefined();
  });

  // Melting points of the CRC Handbook of Chemistry and Physics, 95th ed. [degC]
  it.each([['acetone', -94.7], ['benzene', 5.49], ['ammonia', -77.65], ['cyclohexane', 6.59], ['heavy water', 3.82], ['n-dodecane', -9.57], ['p-xylene', 13.25], ['ethanol', -114.14]])('%s melts at %d degC', (name, melts) => {
    expect(Math.abs((loadMaterial(name).meltingTemperature ?? 0) - 273.15 - melts)).toBeLessThan(0.8);
  });

  it('a melting line rises with pressure', () => {
    // Cyclohexane melts near 305 K under 50 MPa: Penoncello, Jacobsen and Goodwin, Int. J. Thermophys. 16 (1995) 519.
    expect(phaseAt(loadMaterial('cyclohexane'), 300, 1e5).phase).toBe('liquid');
    expect(phaseAt(loadMaterial('cyclohexane'), 300, 9e7).phase).toBe('solid');
    expect(phaseAt(loadMaterial('methane'), 100, 1e6).phase).toBe('liquid');
  });

  it('takes the side that is asked for on the saturation line', () => {
    expect(at('water', '60 degC, saturated liquid').phase).toBe('liquid');
    expect(at('water', '60 degC, saturated vapour').phase).toBe('vapour');
    expect(at('steam', '6 bar, saturated vapour').phase).toBe('vapour');
    expect(codeOf(() => at('water', '100 degC, 101418 Pa'))).toBe('none');
    const water = loadMaterial('water');
    const p = phaseAt(water, 373.15, 1e5).saturation?.pressure ?? 0;
    expect(codeOf(() => takeState(water, { temperature: 373.15, pressure: p }))).toBe('between-phases');
  });

  it('refuses what no state can be', () => {
    for (const [temperature, pressure] of [[0, 1e5], [-1, 1e5], [300, 0], [Number.NaN, 1e5], [300, Infinity]] as const) {
      expect(codeOf(() => propertyAt(loadMaterial('water'), 'density', { temperature, pressure }))).toBe('impossible-state');
    }
  });
});

describe('ranges', () => {
  it('runs over a range and leaves out what cannot be', () => {
    const table = tableOver(loadMaterial('steam'), parseRange('100 degC .. 150 degC, 2 bar'), 6);
    expect(table.rows.length).toBe(3);
    expect(table.notes.join()).toContain('left out: water is a liquid');
    expect(codeOf(() => tableOver(loadMaterial('steam'), parseRange('10 degC .. 20 degC, 2 bar'), 6))).toBe('no-such-phase');
    expect(codeOf(() => tableOver(loadMaterial('water'), parseRange('10 degC, 2 bar')))).toBe('no-range');
  });

  it('beyond its range a value is kept, flagged, with its uncertainty doubled', () => {
    const oil = loadMaterial('light oil');
    const inside = propertyAt(oil, 'viscosity', { temperature: 300, pressure: 1e5 });
    const outside = propertyAt(oil, 'viscosity', { temperature: 450, pressure: 1e5 });
    expect([inside?.withinRange, outside?.withinRange]).toEqual([true, false]);
    expect(outside?.uncertainty).toBeCloseTo(2 * (inside?.uncertainty ?? 0), 12);
    expect(outside?.flags.join()).toContain('carried beyond its range 273 K to 423 K');
  });

  it('a property that a material does not have is undefined', () => {
    expect(propertyAt(loadMaterial('copper'), 'viscosity', { temperature: 300, pressure: 1e5 })).toBeUndefined();
    expect(propertyAt(loadMaterial('water'), 'surfaceTension', { temperature: 700, pressure: 1e5 })).toBeUndefined();
    expect(propertyAt(loadMaterial('water'), 'isentropicExponent', { temperature: 300, pressure: 1e5 })).toBeUndefined();
  });
});
