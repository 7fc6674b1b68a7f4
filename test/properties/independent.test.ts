import { describe, expect, it } from 'vitest';
import { loadMaterial, propertyAt, type PropertyId } from '../../src/properties/index.ts';
import { ofIndependent, stateOf } from './held.ts';

// Made by independent.py beside this file: two other libraries, reference equations named there.
const { rows } = ofIndependent();

const names = [...new Set(rows.map((row) => row.material))];

describe.each(names)('%s against independent libraries', (name) => {
  const mine = rows.filter((row) => row.material === name);
  const properties = [...new Set(mine.flatMap((row) => Object.keys(row.values)))];

  it.each(properties)('%s is within its declared uncertainty', (property) => {
    const misses: string[] = [];
    let count = 0;
    for (const row of mine) {
      const expected = row.values[property];
      if (expected === undefined) continue;
      const found = propertyAt(loadMaterial(name), property as PropertyId, stateOf(row));
      if (found === undefined || !found.withinRange) continue;
      count++;
      const off = Math.abs(found.value / expected - 1);
      // A rounding of the ninth digit is allowed beside the uncertainty, which is zero nowhere.
      if (!(off <= found.uncertainty + 1e-8)) misses.push(`${row.library} ${row.T} K ${row.p} Pa ${row.humidity ?? row.composition ?? ''} ${found.phase}: ${found.value} against ${expected}, off ${(off * 100).toPrecision(3)} %, declared ${(found.uncertainty * 100).toPrecision(3)} %`);
    }
    expect(misses).toEqual([]);
    expect(count).toBeGreaterThanOrEqual(name === 'humid air' || name.includes('glycol') ? 15 : 17);
  });
});
