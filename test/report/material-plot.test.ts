import { expect, it } from 'vitest';
import { plotSvg, plotText } from '../../src/report/index.ts';

const x = [300, 310, 320, 330];
const curves = [{ property: 'density', x, y: [4, 3, 2, 1] }, { property: 'viscosity', x, y: [1, 1, 1, 1] }] as const;

it('the drawing holds a line per property, its points inside the panel, and no markup of the title', () => {
  const svg = plotSvg('<script>', curves, 'temperature [K]');
  expect(svg).not.toContain('<script>');
  expect(svg.match(/<polyline/g)?.length).toBe(2);
  const points = [...svg.matchAll(/points="([^"]+)"/g)].flatMap(([, list = '']) => list.split(' ').map((pair) => pair.split(',').map(Number)));
  for (const [px, py] of points) expect([px, py].every((v) => v !== undefined && Number.isFinite(v) && v >= 0 && v <= 720)).toBe(true);
  // Four falling values: the last point lies lowest, and a quarter of the way is a third of the fall.
  const [first, second, , last] = points as [number, number][];
  expect((second?.[1] ?? 0) - (first?.[1] ?? 0)).toBeCloseTo(((last?.[1] ?? 0) - (first?.[1] ?? 0)) / 3, 0);
});

it('a constant is drawn in the middle, a fall from the upper left to the lower right', () => {
  const lines = plotText('t', [curves[0]], 'temperature [K]').split('\n');
  expect(lines[3]).toMatch(/^ +4 \|\*/);
  expect(lines[14]).toMatch(/^ +1 \| +\*+$/);
  expect(plotText('t', [curves[1]], 'x').split('\n').filter((line) => line.includes('*')).length).toBe(1);
});
