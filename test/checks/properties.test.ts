import { describe, expect, it } from 'vitest';
import { entriesOf, wanted, type CheckEntry } from './properties-entries.ts';
import { bindings, notComputed } from './properties-map.ts';

const topics = ['A01_water_thermodynamics', 'A02_water_transport', 'A03_dry_air', 'A04_humid_air', 'A05_seawater', 'A06_gases_liquids', 'A07_solids', 'A08_liquid_metals_salts', 'A09_aqueous_and_viscous', 'A10_refrigerants_process_gases', 'A12_saturation_latent'];

/** Whether nothing computes an entry; the boiling points by given constants are computed for every fluid. */
const isLeft = ({ id }: CheckEntry): boolean => !id.startsWith('A12-nbp-') && notComputed.some(([pattern]) => pattern.test(id));

describe.each(topics)('published values of %s', (topic) => {
  const entries = entriesOf(topic);
  const computed = entries.filter((entry) => !isLeft(entry));

  it.each(computed)('$id: $source', (entry) => {
    // An entry is bound to a call or named among those not computed.
    const value = bindings.map(([pattern, call]) => [pattern.exec(entry.id), call] as const).flatMap(([match, call]) => (match === null ? [] : [() => call(entry, match)]))[0]?.() ?? Number.NaN;
    const { value: expected, tolerance } = wanted(entry);
    expect(Math.abs(value - expected), `${value} against ${expected} within ${tolerance}`).toBeLessThanOrEqual(tolerance);
  });
});

it('the entries that are not computed are counted', () => {
  const all = topics.flatMap(entriesOf);
  const left = all.filter(isLeft);
  expect({ all: all.length, notComputed: left.length }).toMatchInlineSnapshot(`
    {
      "all": 504,
      "notComputed": 26,
    }
  `);
});
