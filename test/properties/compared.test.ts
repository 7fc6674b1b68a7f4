import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { loadMaterial, propertyAt, type PropertyId } from '../../src/properties/index.ts';

// Made by compared.py beside this file, which names the references and what makes each independent of the record.
const rows = readFileSync(new URL('./compared.csv', import.meta.url), 'utf8').trim().split('\n').slice(1).map((line) => {
  const [material = '', property = '', T, p, share, value, reference = ''] = line.split(',');
  return { material, property: property as PropertyId, temperature: Number(T), pressure: Number(p), ...(share === '' ? {} : { composition: Number(share) }), value: Number(value), reference };
});
const groups = [...new Set(rows.map((row) => `${row.material}|${row.property}|${row.reference}`))].map((key) => key.split('|'));

describe('states of independent references', () => {
  it.each(groups)('%s, %s against %s', (material, property, reference) => {
    const misses: string[] = [];
    for (const row of rows) {
      if (row.material !== material || row.property !== property || row.reference !== reference) continue;
      const { value, temperature, pressure } = row;
      const found = propertyAt(loadMaterial(row.material), row.property, { temperature, pressure, ...('composition' in row ? { composition: row.composition } : {}) });
      const off = Math.abs((found?.value ?? Number.NaN) / value - 1);
      if (!(off <= (found?.uncertainty ?? 0)) || found?.withinRange !== true) misses.push(`${temperature} K ${pressure} Pa ${row.composition ?? ''}: ${found?.value} against ${value}, off ${(off * 100).toPrecision(3)} %, declared ${((found?.uncertainty ?? 0) * 100).toPrecision(3)} %`);
    }
    expect(misses).toEqual([]);
  });
});
