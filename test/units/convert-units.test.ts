import convertUnits from 'convert-units';
import { describe, expect, it } from 'vitest';
import { sameDimension, unit } from '../../src/units/index.ts';

type Name = Parameters<ReturnType<typeof convertUnits>['from']>[0];
const list = convertUnits().list() as { abbr: string; measure: string }[];

/** Measures that are not read here, and why. */
const notRead: Record<string, string> = {
  each: 'a count of pieces',
  digital: 'counts a kilobyte as 1024 bytes; ours are decimal, KiB for the others',
  reactivePower: 'no volt-ampere reactive in flow problems',
  reactiveEnergy: 'no volt-ampere reactive in flow problems',
};

/** The unit of ours that stands for the base of each measure; temperatures are compared by themselves below. */
const base: Record<string, string> = { length: 'm', area: 'm2', mass: 'kg', volume: 'm3', time: 's', partsPer: 'ppm', speed: 'm/s', pace: 's/m', pressure: 'Pa', current: 'A', voltage: 'V', power: 'W', apparentPower: 'VA', energy: 'J', volumeFlowRate: 'm3/s', illuminance: 'lx', frequency: 'Hz', angle: 'rad' };

/** Names that mean something else here: theirs against ours. */
const names: Record<string, string> = { t: 'short ton', mu: 'us', 'm/h': 'mile/h' };

/** Relative error of convert-units 2.3.4 against the definitions, to two digits; found by comparing, checked with exact fractions. */
const known: Record<string, number> = {
  in: 3.2e-8, yd: 3.2e-8, 'ft-us': 3.2e-8, ft: 3.2e-8, mi: 3.2e-8,
  in2: 9.7e-7, yd2: 9.7e-7, ft2: 9.7e-7, ac: 9.7e-7, mi2: 9.7e-7,
  oz: 8.2e-7, lb: 8.2e-7, t: 8.2e-7,
  tsp: 3.0e-9, Tbs: 3.0e-9, 'fl-oz': 3.0e-9, cup: 3.0e-9, pnt: 3.0e-9, qt: 3.0e-9, gal: 3.0e-9,
  in3: 4.6e-6, ft3: 5.1e-7, yd3: 9.6e-7,
  knot: 3.9e-7, 'ft/s': 2.7e-7, 'min/mi': 3.2e-6, psi: 3.9e-7, ksi: 3.9e-7, 'ft-cd': 3.9e-8,
  'tsp/s': 5.4e-11, 'Tbs/s': 5.4e-11, 'fl-oz/s': 5.4e-11, 'fl-oz/min': 5.4e-11, 'fl-oz/h': 5.4e-11, 'cup/s': 5.4e-11,
  'pnt/s': 5.4e-11, 'pnt/min': 5.4e-11, 'pnt/h': 5.4e-11, 'qt/s': 5.4e-11, 'gal/s': 5.4e-11, 'gal/min': 5.4e-11, 'gal/h': 5.4e-11,
  'in3/s': 4.6e-6, 'in3/min': 4.6e-6, 'in3/h': 4.6e-6,
  'ft3/s': 5.1e-7, 'ft3/min': 5.1e-7, 'ft3/h': 5.1e-7, 'yd3/s': 9.6e-7, 'yd3/min': 9.6e-7, 'yd3/h': 9.6e-7,
};

const rows = list.filter(({ measure }) => notRead[measure] === undefined && measure !== 'temperature');

describe('convert-units 2.3.4 against our units', () => {
  it('has the measures that were compared', () => {
    expect([...new Set(list.map(({ measure }) => measure))].sort()).toEqual([...Object.keys(base), ...Object.keys(notRead), 'temperature'].sort());
    expect(rows.length).toBeGreaterThan(140);
  });

  it.each(rows)('$abbr', ({ abbr, measure }) => {
    const ours = unit(names[abbr] ?? abbr);
    const to = unit(base[measure] as string);
    expect(sameDimension(ours.dimension, to.dimension)).toBe(true);
    const theirs = convertUnits(1).from(abbr as Name).to(base[measure] as Name);
    // rad/s, deg/s and rpm are frequencies there: turns per second
    const turn = measure === 'frequency' && ours.angle === 1 ? 2 * Math.PI : 1;
    const error = Math.abs((theirs * turn * to.factor) / ours.factor - 1);
    const expected = known[abbr];
    expect(error).toBeGreaterThanOrEqual(0.97 * (expected ?? 0)); // the list has two digits
    expect(error).toBeLessThan(1.03 * (expected ?? 1e-14));
  });

  it('lists no difference that is gone', () => {
    const names = new Set(list.map(({ abbr }) => abbr));
    expect(Object.keys(known).filter((name) => !names.has(name))).toEqual([]);
  });

  it.each([['C', 'degC'], ['K', 'K'], ['F', 'degF'], ['R', 'degR']] as const)('temperature %s', (theirs, ours) => {
    for (const value of [-30, 0, 25, 451]) {
      const { factor, offset } = unit(ours);
      expect(value * factor + offset).toBeCloseTo(convertUnits(value).from(theirs).to('K'), 9); // 2.3.4 rounds at 7e-14 K
    }
  });
});
