import { describe, expect, it } from 'vitest';
import { comparedPage } from './compared-page.ts';
import { heldValues, ofFluids, tableRows, type Held } from './held.ts';
import { differs, literatureDiffers } from './literature-differs.ts';

// Other programs and works; the checks that records name and the values of authors have tests of their own, with their own limits.
const all = heldValues();
const pureFluids = new Set(ofFluids().map(({ material }) => material));
const groups = new Map<string, Held[]>();
for (const one of all) {
  if (one.by === 'record') continue;
  const key = `${one.material}, ${one.property}`;
  groups.set(key, [...(groups.get(key) ?? []), one]);
}

describe.each([...groups])('%s', (_, mine) => {
  it('is within its declared uncertainty', () => {
    const misses = mine.filter((one) => !(one.off <= one.allowed) && differs(one) === undefined);
    expect(misses.map((one) => `${one.components ?? ''} ${one.reference} ${one.T} K ${one.p} Pa ${one.share ?? ''} ${one.phase}: ${one.value} against ${one.expected}, off ${(100 * one.off).toPrecision(3)} %, allowed ${(100 * one.allowed).toPrecision(3)} %`)).toEqual([]);
  });
});

it('every state of the tables lies in the range of its record', () => {
  const covered = new Set(all.map((one) => [one.material, one.components, one.property, one.reference, one.T, one.p, one.share].join()));
  const lost = tableRows().filter(({ material, components, property, reference, state }) => !covered.has([material, components, property, reference, state.temperature, state.pressure, state.composition ?? state.humidity].join()));
  expect(lost.map(({ material, property, reference, state }) => `${material} ${property} ${reference} ${state.temperature} K ${state.composition ?? ''}`)).toEqual([]);
});

it('every compared property of a pure fluid is compared at thirty states or more', () => {
  const few = [...groups].filter(([key, mine]) => pureFluids.has(key.slice(0, key.lastIndexOf(', '))) && mine.length < 30).map(([key, mine]) => `${key}: ${mine.length}`);
  expect(few).toEqual([]);
});

it('of all states 99.5 % are inside', () => {
  expect(all.filter((one) => one.off <= one.allowed).length / all.length).toBeGreaterThan(0.995);
});

it('of all states 99.5 % are inside the declared uncertainty alone', () => {
  expect(all.filter((one) => one.off <= one.declared).length / all.length).toBeGreaterThan(0.995);
});

it('what differs in the literature still does', () => {
  // A reason that no value needs any more is to be taken out.
  const apart = all.filter((one) => !(one.off <= one.allowed)).flatMap((one) => differs(one) ?? []);
  expect(literatureDiffers.map(([, , , , reason]) => reason).filter((reason) => !apart.includes(reason))).toEqual([]);
});

it('the page says what was compared', async () => {
  await expect(comparedPage(all)).toMatchFileSnapshot('../../materials/compared.md');
});
