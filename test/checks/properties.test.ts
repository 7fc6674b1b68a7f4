import { describe, expect, it } from 'vitest';
import { entriesOf, wanted } from './properties-entries.ts';
import { bindings, notComputed } from './properties-map.ts';

const topics = ['A01_water_thermodynamics', 'A02_water_transport', 'A03_dry_air', 'A04_humid_air', 'A06_gases_liquids', 'A07_solids', 'A08_liquid_metals_salts', 'A09_aqueous_and_viscous', 'A10_refrigerants_process_gases', 'A12_saturation_latent'];

describe.each(topics)('published values of %s', (topic) => {
  const entries = entriesOf(topic);
  const left = entries.filter(({ id }) => notComputed.some(([pattern]) => pattern.test(id)) && !(/^A12-nbp-/.test(id)));
  const computed = entries.filter((entry) => !left.includes(entry));

  it.each(computed)('$id: $source', (entry) => {
    const bound = bindings.find(([pattern]) => pattern.test(entry.id));
    expect(bound, 'an entry is bound to a call or named among those not computed').toBeDefined();
    const value = bound![1](entry, bound![0].exec(entry.id)!);
    const { value: expected, tolerance } = wanted(entry);
    expect(Math.abs(value - expected), `${value} against ${expected} within ${tolerance}`).toBeLessThanOrEqual(tolerance);
  });
});

it('the entries that are not computed are counted', () => {
  const all = topics.flatMap(entriesOf);
  const left = all.filter(({ id }) => notComputed.some(([pattern]) => pattern.test(id)) && !/^A12-nbp-/.test(id));
  expect({ all: all.length, notComputed: left.length }).toMatchInlineSnapshot(`
    {
      "all": 474,
      "notComputed": 133,
    }
  `);
});
