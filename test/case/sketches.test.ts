import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/vocabulary.ts';
import { readCase } from '../../src/case/index.ts';

const sketches = readFileSync(new URL('sketches.yaml', import.meta.url), 'utf8').split(/^---$/m).slice(1);
const sketch = (number: number) => readCase(sketches[number - 1] as string, `${number}.yaml`, vocabulary);

describe('problems of many kinds fit the format', () => {
  it.each(sketches.map((text, i) => ({ text, name: /title: (.*)/.exec(text)?.[1] ?? String(i) })))('$name', ({ text }) => {
    const read = readCase(text, 'sketch.yaml', vocabulary);
    expect(read.targets).not.toHaveLength(0);
    expect(read.entries.size).toBeGreaterThan(8);
    expect(read.warnings).toEqual([]);
  });

  it('there are 24 of them', () => expect(sketches).toHaveLength(24));

  // Values worked out by hand from the text and the definitions of the units.
  it.each([
    { number: 1, path: 'sizes.diameter', value: 0.025, unit: 'm' },
    { number: 1, path: 'fluid.pressure', value: 2e5, unit: 'Pa' },
    { number: 1, path: 'inlet.temperature', value: 338.15, unit: 'K' },
    { number: 1, path: 'wall.layers.0.thickness', value: 0.0015, unit: 'm' },
    { number: 1, path: 'inclination', value: 0, unit: 'rad' },
    { number: 1, path: 'computing.memory', value: 64e9, unit: 'B' },
    { number: 1, path: 'computing.deadline', value: 43200, unit: 's' },
    { number: 2, path: 'wall.heatTransferCoefficient', value: 9, unit: 'W/(m^2 K)' },
    { number: 3, path: 'inclination', value: Math.PI / 2, unit: 'rad' },
    { number: 3, path: 'walls.inner.heat', value: 2000, unit: 'W' },
    { number: 3, path: 'inlet.volumeFlow', value: 5e-3 / 60, unit: 'm^3/s' },
    { number: 4, path: 'inlets.branch.speed', value: 4, unit: 'm/s' },
    { number: 5, path: 'fluid.pressure', value: 101325 + 100 * 133.322387415, unit: 'Pa' },
    { number: 6, path: 'species.CO2.inlet', value: 420e-6, unit: '1' },
    { number: 6, path: 'sources.people.amount', value: 50e-6, unit: 'kg/s' },
    { number: 8, path: 'parallel', value: 21, unit: '1' },
    { number: 11, path: 'initial.right.pressure', value: 1e4, unit: 'Pa' },
    { number: 13, path: 'drive.rotation', value: 6 * Math.PI, unit: 'rad/s' },
    { number: 13, path: 'rheology.consistency', value: 0.8, unit: 'Pa s^0.55' },
    { number: 14, path: 'reactions.0.enthalpy', value: -1.3e6, unit: 'J/mol' },
    { number: 14, path: 'species.feed.inlet', value: 0.009, unit: '1' },
    { number: 16, path: 'particles.1.diameter', value: 200e-6, unit: 'm' },
    { number: 24, path: 'incidence', value: (7 * Math.PI) / 180, unit: 'rad' },
    { number: 24, path: 'choices.domain.upstream', value: 20, unit: 'm' },
  ])('$number $path', ({ number, path, value, unit }) => {
    const entry = sketch(number).get(path);
    expect(entry?.value).toBeCloseTo(value, 12);
    expect(entry?.unit).toBe(unit);
  });

  it('reads words, lists, ranges, bases, infinite sizes', () => {
    expect(sketch(1).word('inclination')).toBe('horizontal');
    expect(sketch(9).word('sizes.depth')).toBe('infinite');
    expect(sketch(9).number('sizes.depth')).toBeUndefined();
    expect(sketch(14).get('species.feed.inlet')?.basis).toBe('mol');
    expect(sketch(2).get('surroundings.temperature')?.range).toEqual({ from: 278.15, to: 298.15, bounds: false });
    expect(sketch(24).get('choices.cuts')?.value).toEqual(['two-dimensional']);
    expect(sketch(8).list('walls')).toEqual(['bottom', 'sides', 'top']);
    expect(sketch(16).list('particles')).toEqual(['0', '1', '2']);
    expect(sketch(3).get('walls.outer.adiabatic')?.value).toBe(true);
    expect(sketch(18).word('initial.state')).toBe('solid');
  });

  it('targets keep place, mean and tolerance', () => {
    expect(sketch(1).targets[0]).toMatchObject({ quantity: 'outletTemperature', place: 'outlet', mean: 'mass-flow', within: { absolute: 1, unit: 'K' } });
    expect(sketch(2).targets[0]?.within).toMatchObject({ relative: 0.1 });
    expect(sketch(6).targets[0]?.quantity).toBe('concentration of CO2');
    expect(sketch(8).targets).toHaveLength(2);
  });

  it('says which quantity a value gives, with its place', () => {
    expect(sketch(1).get('wall.temperature')?.gives).toEqual(['wallTemperature@wall', 'outerTemperature@wall']);
    expect(sketch(21).get('walls.right.temperature')?.gives).toContain('wallTemperature@walls.right');
    expect(sketch(1).get('inlet.temperature')?.gives).toEqual(['inletTemperature']);
    expect(sketch(4).get('inlets.main.temperature')?.gives).toEqual(['inletTemperature@inlets.main']);
    expect(sketch(9).get('fluid.density')?.gives).toEqual(['density']);
    expect(sketch(24).get('choices.yPlus')?.gives).toEqual(['yPlusTarget']);
  });
});
