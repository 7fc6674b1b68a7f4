import { readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { planned, type Planned } from './expert.ts';

const cases = ['../../examples', '.'].flatMap((folder) => readdirSync(new URL(folder === '.' ? '.' : folder, import.meta.url)).filter((f) => f.endsWith('.case.yaml')).map((f) => [f.replace('.case.yaml', ''), folder] as const));
const laws = ['law-of-the-wall', 'rough-law'];
const textOf = (on: Planned): string => on.plan.sections.mesh.lines.map((l) => l.text).join(' ');

// What a stack of layers must be whatever the flow: no cell at a wall above the cells it grows to, no stack beyond the middle of its gap.
describe.each(cases)('layers of %s', (name, folder) => {
  it('grow from a first cell no taller than the core to the core, and fit', async () => {
    const on = await planned(name, [], folder);
    if (on.plan.quantities['layerCount'] === undefined) return expect(on.plan.quantities['firstCellHeight']).toBeUndefined();
    const [first, core, last, growth, stack, flowClass] = [on.n('firstCellHeight'), on.n('coreCellSize'), on.n('lastLayerHeight'), on.n('growthRatio'), on.n('layerStackHeight'), on.word('flowClass')];
    const byLaw = laws.includes(on.plan.choices.find((c) => c.id === 'near-wall-treatment')?.chosen ?? '');
    if (byLaw) expect(first > core * 1.001).toBe(textOf(on).includes('is taller than the core cells'));
    else expect(first).toBeLessThanOrEqual(core * 1.000001);
    expect(last).toBeLessThanOrEqual(Math.max(first, core * growth) * 1.000001);
    if (flowClass === 'internal' || flowClass === 'enclosure') expect(stack).toBeLessThanOrEqual((on.n('gap') / 2) * 1.000001);
    for (const r of on.regions) expect(on.n(`cellsAcross@${r}`) * on.n(`regionSizeAcross@${r}`)).toBeGreaterThanOrEqual(on.n(`regionAcross@${r}`) * 0.999999);
  });
});

it('a gap of 16 mm over 80 cells has cells of 0.2 mm from wall to wall: equal cells do', async () => {
  const on = await planned('argon-glazing');
  expect(on.n('firstCellHeight')).toBeCloseTo(16e-3 / 80, 9);
  expect(on.n('layerCount')).toBe(1);
  expect(on.n('cellsAcross@box')).toBe(80);
  expect(textOf(on)).toContain('Equal cells do at the wall');
});

it('a box of 80 mm over 40 cells has no cell above 2 mm at its wall', async () => {
  const on = await planned('slurry-box');
  expect(on.n('firstCellHeight')).toBeCloseTo(80e-3 / 40, 9);
  expect(on.n('layerStackHeight')).toBeLessThanOrEqual(80e-3 / 2);
});
