import { describe, expect, it } from 'vitest';
import { laws, loadMaterial, materialRecords, phaseAt, propertyAt, saturationOf, type Laws, type PropertyId, type Saturation } from '../../src/properties/index.ts';

// What must hold between properties, whatever the correlation: derivatives against differences, definitions, round trips.
const states = [
  ['water', 300, 1e5], ['water', 450, 5e6], ['water', 630, 25e6], ['water', 660, 23e6], ['water', 500, 1e5], ['water', 1500, 1e6], ['water', 300, 2e8],
  ['air', 300, 101325], ['air', 150, 5e6], ['nitrogen', 90, 1e6], ['carbon dioxide', 310, 9e6], ['carbon dioxide', 260, 5e6], ['oxygen', 200, 1e6], ['argon', 300, 1e7],
  ['methanol', 300, 1e5], ['methanol', 400, 1e5], ['ammonia', 300, 2e6], ['ammonia', 420, 1.5e7], ['helium', 4, 1e5], ['helium', 8, 2e6], ['parahydrogen', 21, 5e5], ['R-410A', 280, 2e6], ['n-heptane', 400, 1e5], ['R-1234yf', 300, 1e5], ['heavy water', 300, 1e5], ['propane', 380, 6e6],
] as const;

const of = (name: string, id: PropertyId, temperature: number, pressure: number): number => propertyAt(loadMaterial(name), id, { temperature, pressure })?.value ?? Number.NaN;

describe.each(states)('%s at %d K and %d Pa', (name, T, p) => {
  const h = 1e-3 * T ** 0.5;

  it('heat capacity is the slope of the enthalpy', () => {
    const slope = (of(name, 'enthalpy', T + h, p) - of(name, 'enthalpy', T - h, p)) / (2 * h);
    expect(of(name, 'specificHeatCapacity', T, p) / slope).toBeCloseTo(1, 4);
  });

  it('expansion is the slope of the density', () => {
    const slope = -(of(name, 'density', T + h, p) - of(name, 'density', T - h, p)) / (2 * h * of(name, 'density', T, p));
    // Liquid water near the atmosphere has its density scaled by up to 1.5e-5, which its expansion does not follow.
    const off = Math.abs(of(name, 'thermalExpansion', T, p) - slope);
    expect(off).toBeLessThan(Math.max(1e-4 * slope, name === 'water' && T < 390 ? 1.5e-6 : 0));
  });

  it('speed of sound follows from expansion, compressibility and heat capacity', () => {
    const step = 1e-4 * p;
    const rho = of(name, 'density', T, p);
    const slope = (of(name, 'density', T, p + step) - of(name, 'density', T, p - step)) / (2 * step);
    const beta = of(name, 'thermalExpansion', T, p);
    const square = 1 / (slope - (T * beta * beta) / of(name, 'specificHeatCapacity', T, p));
    expect(Math.abs(of(name, 'speedOfSound', T, p) / Math.sqrt(square) - 1)).toBeLessThan(rho > 100 && p < 1e6 ? 1e-3 : 1e-4);
  });

  it('derived properties keep their definitions', () => {
    expect(of(name, 'prandtl', T, p) / (of(name, 'kinematicViscosity', T, p) / of(name, 'thermalDiffusivity', T, p))).toBeCloseTo(1, 12);
    expect(of(name, 'kinematicViscosity', T, p) / (of(name, 'viscosity', T, p) / of(name, 'density', T, p))).toBeCloseTo(1, 12);
  });
});

describe('saturation', () => {
  const lineOf = (name: string): Saturation => {
    const line = saturationOf(loadMaterial(name));
    if (line === undefined) throw new Error(`${name} has no saturation line`);
    return line;
  };

  it.each(['water', 'nitrogen', 'oxygen', 'argon', 'carbon dioxide', 'sodium', 'mercury', 'acetone', 'ammonia', 'methanol', 'R-134a', 'R-410A', 'helium', 'glycerol'])('%s: boiling temperature and vapour pressure are each other\'s inverse', (name) => {
    const line = lineOf(name);
    for (const share of [0.05, 0.3, 0.6, 0.9, 0.97]) {
      const T = line.from + share * (line.to - line.from);
      expect(line.boiling(line.bubble(T)) / T).toBeCloseTo(1, 8);
    }
  });

  it('a gas at low pressure has beta = 1/T and Z = 1', () => {
    for (const name of ['air', 'nitrogen', 'argon']) {
      expect(of(name, 'thermalExpansion', 300, 10) * 300).toBeCloseTo(1, 5);
      expect(of(name, 'compressibilityFactor', 300, 10)).toBeCloseTo(1, 6);
    }
    expect(of('air', 'thermalExpansion', 250, 1e7) * 250).toBeGreaterThan(1.3); // not where it is dense
  });
});

const call = (found: Laws, id: PropertyId, T: number): number => found.law(id)?.(T) ?? Number.NaN;

describe('laws', () => {
  it('give what propertyAt gives, for every material', () => {
    for (const record of materialRecords()) {
      const material = loadMaterial(record.name);
      const melting = material.meltingTemperature;
      // A liquid alone is asked below its boiling line.
      const boils = material.phases.includes('vapour') ? undefined : record.properties['vapourPressure']?.[0]?.ranges[0]?.temperature?.[1];
      const temperature = Math.min(melting === undefined ? 310 : material.kind === 'solid' ? Math.min(310, melting - 5) : Math.max(310, melting + 20), (boils ?? Infinity) - 20);
      const state = { temperature, pressure: boils === undefined ? 101325 : 2e6, humidity: 0.4, composition: record.typical ?? 0.1 };
      if (record.name === 'gas mixture') continue; // it has no components of its own
      const found = laws(material, state);
      for (const id of material.properties) {
        const value = propertyAt(material, id, state)?.value;
        if (value === undefined || id === 'emissivity') continue;
        expect(call(found, id, temperature) / value, `${record.name} ${id}`).toBeCloseTo(1, 9);
      }
    }
  });

  it('carry the factor of a property to those formed from it', () => {
    const water = loadMaterial('water');
    const state = { temperature: 300, pressure: 1e5 };
    const plain = laws(water, state);
    const thick = laws(water, state, { viscosity: 1.1 });
    expect(call(thick, 'viscosity', 320) / call(plain, 'viscosity', 320)).toBeCloseTo(1.1, 12);
    expect(call(thick, 'prandtl', 320) / call(plain, 'prandtl', 320)).toBeCloseTo(1.1, 12);
    expect(call(thick, 'density', 320)).toBe(call(plain, 'density', 320));
  });

  it('keep the water of humid air, not its relative humidity', () => {
    // 50 % at 20 degC: p_s = 2339.2 Pa (IAPWS R7-97), enhancement 1.004; at 60 degC the same mole fraction as ideal gases, whose departure is below 0.05 %.
    const found = laws(loadMaterial('humid air'), { temperature: 293.15, pressure: 101325, humidity: 0.5 });
    const water = (0.5 * 1.004 * 2339.2) / 101325;
    const molarMass = (1 - water) * 0.0289655 + water * 0.0180153;
    expect(Math.abs(call(found, 'density', 333.15) / ((101325 * molarMass) / (8.314462618 * 333.15)) - 1)).toBeLessThan(1e-3);
    expect(call(found, 'saturationTemperature', 333.15)).toBeCloseTo(call(found, 'saturationTemperature', 293.15), 2);
    // At 60 % held, the water alone would exceed the pressure here; the air of a room warmed to it does not.
    const room = laws(loadMaterial('humid air'), { temperature: 303.15, pressure: 101325, humidity: 0.6 });
    expect(call(room, 'density', 393.15)).toBeGreaterThan(0.8);
  });

  it('stay in their phase beyond saturation and say so', () => {
    const water = loadMaterial('water');
    const found = laws(water, { temperature: 350, pressure: 1e5 });
    const density = (T: number): number => call(found, 'density', T);
    expect(density(360)).toBeGreaterThan(900);
    expect(found.flags()).toEqual([]);
    expect(phaseAt(water, 390, 1e5).phase).toBe('vapour');
    expect(density(390)).toBeGreaterThan(900);
    expect(found.flags().join()).toContain('beyond its saturation');
    expect(laws(loadMaterial('copper'), state()).law('viscosity')).toBeUndefined();
  });
});

const state = (): { temperature: number; pressure: number } => ({ temperature: 300, pressure: 1e5 });
