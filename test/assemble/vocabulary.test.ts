import { describe, expect, it } from 'vitest';
import { vocabulary } from '../../src/assemble/vocabulary.ts';
import { allPaths, fieldAt } from '../../src/case/index.ts';
import { flows } from '../../src/flows/index.ts';
import { generalDefinitions } from '../../src/quantities/index.ts';
import { dimensionOf, sameDimension } from '../../src/units/index.ts';

const built = Object.values(flows).map((flow) => ({ id: flow.id, flow }));

describe.each(built)('the vocabulary and the flow $id', ({ id, flow }) => {
  const words = vocabulary.flows[id];
  const fieldOf = (key: string) => fieldAt(vocabulary, id, `sizes.${key}`)?.field;

  it('have the same sizes', () => {
    const numbers = Object.keys(words?.sizes ?? {}).filter((key) => fieldOf(key)?.kind === 'quantity');
    // A body may stand in a channel or an array: sizes that the case file takes for all bodies, used or listed as unused.
    const around = 'channelHeight' in (words?.sizes ?? {}) ? ['channelHeight', 'channelWidth', 'pitchAlong', 'pitchAcross'] : [];
    const own = flow.sizes.map((size) => size.key);
    expect(numbers.filter((key) => !around.includes(key) || own.includes(key)).toSorted()).toEqual(own.toSorted());
    for (const size of flow.sizes) expect(fieldOf(size.key)).toMatchObject({ kind: 'quantity', unit: size.unit });
  });

  it('have the same walls', () => expect(words?.walls.toSorted()).toEqual(flow.walls.toSorted()));

  it('let the same sizes be infinite', () => {
    const endless = Object.entries(words?.sizes ?? {}).filter(([, field]) => field.kind === 'quantity' && field.words?.['infinite'] !== undefined).map(([key]) => key);
    expect(endless).toEqual(flow.sizes.filter((size) => size.infinite).map((size) => size.key));
  });
});

it('what a key gives has the unit of the quantity of that name', () => {
  const units = new Map(generalDefinitions.flatMap((one) => ('unit' in one ? [[one.id, one.unit] as const] : [])));
  const given = allPaths(vocabulary, 'pipe').flatMap((path) => {
    const field = fieldAt(vocabulary, 'pipe', path.replaceAll('*', 'x'))?.field;
    return field?.kind === 'quantity' ? (field.gives ?? []).map((id) => ({ path, id: id.replace(/@$/, ''), unit: field.unit })) : [];
  });
  const known = given.filter(({ id }) => units.has(id));
  expect(known.length).toBeGreaterThan(40);
  expect(known.filter(({ id, unit }) => !sameDimension(dimensionOf(unit), dimensionOf(units.get(id) as string)))).toEqual([]);
});
