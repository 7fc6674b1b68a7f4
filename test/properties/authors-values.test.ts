import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { loadMaterial, type PropertyId } from '../../src/properties/index.ts';

type Row = readonly [material: string, property: PropertyId, T: number, density: number, value: number, within: number];
const { rows } = JSON.parse(readFileSync(new URL('./authors-values.json', import.meta.url), 'utf8')) as { rows: Row[] };

describe('values that the authors of transport correlations print', () => {
  it.each(rows)('%s %s at %d K and %d kg/m^3', (material, property, T, density, value, within) => {
    const { engine } = loadMaterial(material);
    const sample = { T, p: Number.NaN, side: density > 0.6 * (loadMaterial(material).critical?.density ?? 0) && T < (loadMaterial(material).critical?.temperature ?? 0) ? ('liquid' as const) : ('vapour' as const), x: 0, density };
    expect(Math.abs(engine.value(property, sample) / value - 1)).toBeLessThanOrEqual(within);
  });
});
