import { expect, it } from 'vitest';
import { planned } from './expert.ts';

// A tube of 25 mm, span 1 m = 40 D, at Re 2400: the resolved wake needs 2 pi D = 157 mm of it (six to seven times fewer cells), ends repeating.
it('a long cylinder in a turbulent wake is meshed as a slice of 2 pi D, in mesh, boundaries and text', async () => {
  const on = await planned('brine-tube');
  expect(on.plan.choices.find((c) => c.id === 'dimension-and-cuts')?.chosen).toBe('periodic-along-span');
  expect(on.n('regionSpan@near')).toBeCloseTo(2 * Math.PI * 0.025, 6);
  const cells = on.n('cellCount');
  expect(on.plan.sections.boundaries.tables.flatMap((t) => t.rows.map((r) => r.filter((cell) => typeof cell === 'string').join(' '))).join('\n')).toMatch(/front and back.*repeats/);
  const whole = await planned('brine-tube', [['span: 1 m', 'span: 400 mm']]);
  expect(whole.plan.choices.find((c) => c.id === 'dimension-and-cuts')?.chosen).toBe('three-dimensional');
  expect(whole.n('cellCount') / cells).toBeGreaterThan(2.2);
  expect(whole.n('regionSpan@near')).toBeCloseTo(0.4, 6);
  // Forces and heat are those of the whole span all the same.
  expect(on.n('wallArea')).toBeCloseTo(Math.PI * 0.025 * 1, 6);
});
