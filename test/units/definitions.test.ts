import { describe, expect, it } from 'vitest';
import { atoms } from '../../src/units/atoms.ts';
import { definitions } from '../../src/units/definitions.ts';
import { unit } from '../../src/units/index.ts';

const names = [...atoms, ...definitions.map((one) => [one.names] as const)].flatMap(([text]) => text.split(' '));

describe('the table of units', () => {
  it('has every name once', () => expect(names.filter((name, i) => names.indexOf(name) !== i)).toEqual([]));

  it('gives each definition a source and a usable factor', () => {
    expect(definitions.filter(({ source, factor }) => source.length < 8 || !(factor > 0 && Number.isFinite(factor)))).toEqual([]);
  });

  it('reads every name of a single word', () => {
    expect(names.filter((name) => !name.includes('(') && !(unit(name).factor > 0))).toEqual([]);
  });

  // exact by definition; source beside each in src/units/definitions.ts
  it.each([
    ['in', 0.0254],
    ['lb', 0.45359237],
    ['US gal', 0.003785411784],
    ['UK gal', 0.00454609],
    ['Btu', 1055.05585262],
    ['psi', 6894.757293168361],
    ['hp (metric)', 735.49875],
    ['acre', 4046.8564224],
    ['knot', 1852 / 3600],
  ])('%s', (name, factor) => expect(Math.abs(unit(name).factor / factor - 1)).toBeLessThan(4e-16));
});
