import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { effectiveness, laminarConversion, moleculeOf } from '../../src/quantities/index.ts';

const { source, rows } = JSON.parse(readFileSync(new URL('radial-reaction.json', import.meta.url), 'utf8')) as { source: string; rows: { damkohler: number; fourier: number; conversion: number }[] };

describe(`a reaction in laminar flow with diffusion across, by ${source}`, () => {
  // The law states a scatter of 2 %.
  it.each(rows)('Da $damkohler, Fo $fourier', (row) => expect(Math.abs(laminarConversion(row) / row.conversion - 1)).toBeLessThanOrEqual(0.02));
  it('lies between the segregated and the plug flow', () => {
    expect(laminarConversion({ damkohler: 1, fourier: 1e9 })).toBeCloseTo(1 - Math.exp(-1), 6);
    expect(laminarConversion({ damkohler: 0, fourier: 1 })).toBe(0);
  });
});

describe('a porous catalyst', () => {
  it.each(['slab', 'cylinder', 'sphere'] as const)('a %s loses nothing when slow and works as 1/phi when fast', (shape) => {
    expect(effectiveness({ thiele: 1e-3, shape })).toBeCloseTo(1, 5);
    expect(effectiveness({ thiele: 200, shape }) * 200).toBeCloseTo(1, 2);
  });
});

describe('molecules', () => {
  // Molar masses: IUPAC; diffusion volumes as Fuller, Schettler and Giddings sum them.
  it.each([['CO2', 44.009, 26.9], ['carbon dioxide', 44.009, 26.9], ['ethanol', 46.069, 2 * 15.9 + 6 * 2.31 + 6.11], ['C2H5OH', 46.069, 51.77], ['benzene', 78.114, 6 * 15.9 + 6 * 2.31 - 18.3], ['H2O', 18.015, 13.1], ['air', 28.965, 19.7]] as const)('%s', (name, mass, volume) => {
    expect((moleculeOf(name)?.molarMass ?? 0) * 1e3).toBeCloseTo(mass, 2);
    expect(moleculeOf(name)?.diffusionVolume).toBeCloseTo(volume, 6);
  });
  it.each(['feed', 'salt', 'Acid', 'Xx2', ''])('%s is no molecule', (name) => expect(moleculeOf(name)).toBeUndefined());
});
