import { describe, expect, it } from 'vitest';
import { comparedPage } from './compared-page.ts';
import { differs, heldValues, literatureDiffers } from './independent-fluids.ts';

const all = heldValues();
const groups = new Map<string, typeof all>();
for (const one of all) groups.set(`${one.material}, ${one.property}`, [...(groups.get(`${one.material}, ${one.property}`) ?? []), one]);

describe.each([...groups])('%s', (_, held) => {
  it('is within its declared uncertainty', () => {
    const misses = held.filter((one) => !(one.off <= one.allowed) && differs(one) === undefined);
    expect(misses.map((one) => `${one.reference} ${one.T} K ${one.p} Pa ${one.phase}: ${one.value} against ${one.expected}, off ${(100 * one.off).toPrecision(3)} %, allowed ${(100 * one.allowed).toPrecision(3)} %`)).toEqual([]);
  });
});

it('every property that is compared is compared at thirty states or more', () => {
  const few = [...groups].filter(([, held]) => held.length < 30).map(([name, held]) => `${name}: ${held.length}`);
  expect(few).toEqual([]);
});

it('what differs in the literature still does', () => {
  // A reason that no value needs any more is to be taken out.
  const apart = all.filter((one) => !(one.off <= one.allowed));
  expect(literatureDiffers.filter(([material, property, reference]) => !apart.some((one) => one.material === material && one.property === property && one.reference === reference))).toEqual([]);
});

it('the page says what was compared', async () => {
  await expect(comparedPage(all)).toMatchFileSnapshot('../../materials/compared-fluids.md');
});
