import { describe, expect, it } from 'vitest';
import { loadMaterial, mixtureOf, parseState, propertyAt, stateOf, takeState, type Material } from '../../src/properties/index.ts';
import { mixedTransport, type GasMixture } from '../../src/properties/models/gas-mixture.ts';
import { codeOf } from './harness.ts';

const any = loadMaterial('gas mixture');
const made = (parts: string): Material => mixtureOf(any, parseState(parts).components ?? []);

describe('mixtures of gases by composition', () => {
  it('reads components in both orders, and salinity as the share of salt', () => {
    expect(parseState('20 degC, 1 atm, oxygen 21 % mol, 79 % mol nitrogen').components).toEqual([{ name: 'oxygen', share: 0.21, basis: 'mol' }, { name: 'nitrogen', share: 0.79, basis: 'mol' }]);
    expect(parseState('20 degC, 1 atm, carbon dioxide 400 ppm').components?.[0]).toMatchObject({ name: 'carbon dioxide', share: 4e-4 });
    expect(parseState('20 degC, 1 atm, salinity 35 g/kg').composition).toBeCloseTo(0.035, 12);
  });

  it('mixes viscosities by the rule of Wilke', () => {
    // Bird, Stewart and Lightfoot, Transport Phenomena, 2nd ed., example 1.4-2: 17.14 uPa s predicted, 17.93 uPa s measured
    const gas = (share: number, molarMass: number, viscosity: number) => ({ share, molarMass, viscosity, value: viscosity });
    expect(mixedTransport([gas(0.133, 44.01, 1.462e-5), gas(0.039, 32, 2.031e-5), gas(0.828, 28.02, 1.754e-5)])).toBeCloseTo(1.714e-5, 8);
  });

  it('dry air from its components is dry air', () => {
    const made = mixtureOf(any, [{ name: 'N2', share: 0.7812 }, { name: 'oxygen', share: 0.2096 }, { name: 'argon', share: 0.0092 }]);
    for (const T of [280, 400, 700, 1200]) {
      for (const [id, within] of [['density', 0.001], ['specificHeatCapacity', 0.004], ['viscosity', 0.01], ['thermalConductivity', 0.02], ['speedOfSound', 0.003]] as const) {
        const [ours, air] = [made, loadMaterial('air')].map((one) => propertyAt(one, id, { temperature: T, pressure: 1e5 })?.value ?? Number.NaN) as [number, number];
        expect(Math.abs(ours / air - 1), `${id} at ${T} K`).toBeLessThan(within);
      }
    }
  });

  it('turns mass into moles, and makes the sum 1', () => {
    // 23.2 % of oxygen by mass is 20.95 % by mole (air)
    const byMass = mixtureOf(any, [{ name: 'oxygen', share: 0.2314, basis: 'mass' }, { name: 'nitrogen', share: 0.7686, basis: 'mass' }]);
    const byMole = mixtureOf(any, [{ name: 'oxygen', share: 0.2086 }, { name: 'nitrogen', share: 0.7914 }]);
    expect(byMass.molarMass).toBeCloseTo(byMole.molarMass ?? 0, 5);
  });

  it('the water of a flue gas condenses where its partial pressure says', () => {
    // 17.2 % of 101 325 Pa is 17 428 Pa, the saturation pressure at 330.262 K (IAPWS R6-95, another library); the other gases draw 0.4 % more of it out of the liquid.
    const flue = loadMaterial('flue gas');
    expect(propertyAt(flue, 'saturationTemperature', { temperature: 450, pressure: 101325 })?.value).toBeCloseTo(330.2, 1);
    expect(takeState(flue, { temperature: 310, pressure: 101325 }).flags.join()).toContain('below its dew point');
    expect(takeState(flue, { temperature: 350, pressure: 101325 }).flags).toEqual([]);
  });

  // Dew points of the multi-fluid equation of CoolProp 8.0.0 (GERG-2008 of Kunz and Wagner 2012).
  it.each([
    ['nitrogen 80 % mol, propane 20 % mol', 1e6, 244.7], ['nitrogen 80 % mol, propane 20 % mol', 4e6, 278.46],
    ['methane 60 % mol, ethane 25 % mol, propane 15 % mol', 1e6, 243.35], ['methane 60 % mol, ethane 25 % mol, propane 15 % mol', 4e6, 278.18],
    ['methane 90 % mol, n-butane 10 % mol', 1e6, 268.6], ['methane 90 % mol, n-butane 10 % mol', 5e6, 302.24],
    ['methane 50 % mol, hydrogen sulphide 50 % mol', 2e6, 268.97], ['nitrogen 10 % mol, carbon dioxide 90 % mol', 2e6, 249.37], ['nitrogen 10 % mol, carbon dioxide 90 % mol', 5e6, 280.32],
  ] as const)('%s at %d Pa is a gas from %d K on', (parts, p, dew) => {
    const material = made(parts);
    const equation = material.engine.equation as GasMixture;
    expect(equation.condensing(dew + 4, p)).toBeUndefined();
    expect(equation.condensing(dew - 4, p)).toBeDefined();
  });

  it('a trace that condenses is a flag, more is refused', () => {
    expect(takeState(made('methane 90 % mol, n-butane 10 % mol'), { temperature: 290, pressure: 4e6 }).flags.join()).toContain('below the dew point');
    expect(codeOf(() => takeState(made('nitrogen 10 % mol, carbon dioxide 90 % mol'), { temperature: 250, pressure: 5e6 }))).toBe('condenses');
    // Propane of 8.4 bar at 20 degC (its own record).
    expect(codeOf(() => takeState(made('propane 100 % mol'), { temperature: 293.15, pressure: 8e5 }))).toBe('none');
    for (const pressure of [9e5, 20e5, 90e5]) expect(codeOf(() => takeState(made('propane 100 % mol'), { temperature: 293.15, pressure }))).toBe('condenses');
  });

  it('components that react are flagged, inert ones are not', () => {
    const flagsOf = (parts: string): string => takeState(made(parts), { temperature: 400, pressure: 1e5 }).flags.join();
    expect(flagsOf('methane 10 % mol, oxygen 19 % mol, nitrogen 71 % mol')).toContain('can burn with each other');
    expect(flagsOf('ammonia 5 % mol, hydrogen chloride 5 % mol, nitrogen 90 % mol')).toContain('ammonium chloride');
    expect(flagsOf('carbon monoxide 0.1 % mol, oxygen 10 % mol, nitrogen 89.9 % mol')).toBe('');
    expect(flagsOf('methane 60 % mol, carbon dioxide 40 % mol')).toBe('');
  });

  it('a mixture near its pseudo-critical point is flagged', () => {
    // By Kay's rule 0.9 * 304.13 K + 0.1 * 126.19 K = 286.3 K and about 70 bar.
    expect(takeState(made('carbon dioxide 90 % mol, nitrogen 10 % mol'), { temperature: 300, pressure: 7e6 }).flags.join()).toContain('near the critical point');
    expect(takeState(made('carbon dioxide 90 % mol, nitrogen 10 % mol'), { temperature: 400, pressure: 7e6 }).flags).toEqual([]);
  });

  it('transport is told to be carried beyond the records of the components', () => {
    const within = (parts: string, temperature: number): boolean | undefined => propertyAt(made(parts), 'thermalConductivity', { temperature, pressure: 1e5 })?.withinRange;
    expect(within('propane 30 % mol, nitrogen 70 % mol', 700)).toBe(true);
    expect(within('propane 30 % mol, nitrogen 70 % mol', 1000)).toBe(false); // multicomponent theory reads 20 % less there
    expect(within('oxygen 21 % mol, nitrogen 79 % mol', 1400)).toBe(true);
  });

  it('a mixture within a mixture is its components', () => {
    const both = made('biogas 50 % mol, nitrogen 50 % mol');
    expect(both.molarMass).toBeCloseTo(((loadMaterial('biogas').molarMass ?? 0) + 0.02801348) / 2, 5);
    expect(made('air 50 % mol, carbon dioxide 50 % mol').molarMass).toBeCloseTo((0.02896546 + 0.0440098) / 2, 5);
  });

  it.each([
    ['missing-composition', () => takeState(any, stateOf(any, parseState('20 degC, 1 bar')))],
    ['wrong-composition', () => mixtureOf(any, [{ name: 'oxygen', share: 0.5 }])],
    ['wrong-composition', () => mixtureOf(any, [{ name: 'oxygen', share: 0.5, basis: 'mass' }, { name: 'nitrogen', share: 0.5, basis: 'mol' }])],
    ['wrong-composition', () => mixtureOf(any, [{ name: 'copper', share: 0.5 }, { name: 'nitrogen', share: 0.5 }])],
    ['wrong-composition', () => mixtureOf(any, [{ name: 'nitric oxide', share: 0.5 }, { name: 'nitrogen', share: 0.5 }])],
    ['unknown-material', () => mixtureOf(any, [{ name: 'unobtainium', share: 1 }])],
    ['no-mixture', () => mixtureOf(loadMaterial('water'), [{ name: 'oxygen', share: 1 }])],
    ['unreadable-state', () => parseState('20 degC, 1 bar, oxygen 20 .. 30 % mol')],
  ] as const)('%s', (code, task) => expect(codeOf(task)).toBe(code));
});

describe('strong solutions', () => {
  const lye = (share: number): number => propertyAt(loadMaterial('caustic soda'), 'thermalExpansion', { temperature: 293.15, pressure: 101325, composition: share })?.value ?? Number.NaN;
  // From the handbook's densities at 0 and 40 degC, printed in the record.
  it('caustic soda expands by the fall of its density', () => {
    expect(lye(0.2) / ((1229.6 - 1207.9) / (40 * 1218.8))).toBeCloseTo(1, 1);
    expect(lye(0.5) / ((1540.0 - 1510.9) / (40 * 1525.5))).toBeCloseTo(1, 1);
  });
  it('a conductivity that its rule carries through zero is no value', () => {
    expect(propertyAt(loadMaterial('phosphoric acid'), 'thermalConductivity', { temperature: 298.15, pressure: 101325, composition: 0.8 })).toBeUndefined();
  });
});
