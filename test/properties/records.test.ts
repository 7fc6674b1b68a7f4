import { describe, expect, it } from 'vitest';
import { loadMaterial, materialRecords, propertyAt, type PropertyId } from '../../src/properties/index.ts';

// Every record names checks from another work; each is met. The folder is walked: a new material is tested by being there.
const rows = materialRecords().flatMap((record) => {
  const entries = [...(record.thermodynamics === undefined ? [] : [record.thermodynamics]), ...Object.values(record.properties).flat()];
  return entries.flatMap((entry) => entry.checks.map((check) => ({ material: record.name, phase: entry.phase, ...check })));
});

describe('checks of the material records', () => {
  it.each(rows)('$material $property: $source', (row) => {
    const material = loadMaterial(row.material);
    const found = propertyAt(material, row.property as PropertyId, { temperature: row.at.temperature ?? 300, pressure: row.at.pressure ?? 101325, ...(row.at.humidity === undefined ? {} : { humidity: row.at.humidity }), ...(row.at.composition === undefined ? {} : { composition: row.at.composition }) });
    expect(Math.abs((found?.value ?? Number.NaN) / row.expect - 1)).toBeLessThanOrEqual(row.within);
  });

  it('every entry states a source, an uncertainty and a range', () => {
    for (const record of materialRecords()) {
      for (const [id, entries] of Object.entries(record.properties)) {
        for (const entry of entries) {
          expect(entry.source.length, `${record.name} ${id}`).toBeGreaterThan(10);
          expect(entry.ranges.length, `${record.name} ${id}`).toBeGreaterThan(0);
          for (const band of entry.uncertainty) expect(band.value, `${record.name} ${id}`).toBeGreaterThan(0);
        }
      }
    }
  });
});
