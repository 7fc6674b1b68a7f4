import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { convert } from '../../src/units/index.ts';

interface Entry {
  id: string;
  inputs: { value: { value: number; unit: string } };
  expected: number;
  unit: string;
  tolerance: { rel?: number; abs?: number };
  source: string;
}
const { entries } = JSON.parse(readFileSync(new URL('values/B01_units.json', import.meta.url), 'utf8')) as { entries: Entry[] };

/** Two units are given with a remark in their text; the unit without it. */
const without: Record<string, string> = { '12000 Btu/h (ton of refrigeration)': 'Btu/h', 'reyn (lbf s/in2)': 'reyn' };

describe('published conversions', () => {
  it('are all there', () => expect(entries.length).toBe(56));

  it.each(entries)('$id', ({ inputs, expected, unit, tolerance }) => {
    const { value, unit: from } = inputs.value;
    const got = convert(`${value} ${without[from] ?? from}`, unit).value;
    expect(Math.abs(got - expected)).toBeLessThanOrEqual(Math.max((tolerance.rel ?? 0) * Math.abs(expected), tolerance.abs ?? 0));
  });
});
