import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { flows, type Flow } from '../../src/flows/index.ts';
import { workingsOf } from './harness.ts';

interface Row {
  readonly wall: 'flux' | 'temperature';
  readonly walls: 1 | 2;
  readonly graetz: number;
  readonly mean: number;
}
const rows = JSON.parse(readFileSync(new URL('./channel-entrance.json', import.meta.url), 'utf8')) as readonly Row[];

// Source: finite volumes, channel-entrance.py beside this file. Tolerance 5 %: the declared scatter of the laws.
describe('mean Nusselt number of the laminar thermal entrance between plates', () => {
  it.each(rows)('$wall on $walls walls, Gz $graetz', ({ wall, walls, graetz, mean }) => {
    const on = workingsOf(flows['channel'] as Flow, {
      regime: 'laminar', energySolved: 'yes', graetz, wallKind: wall, 'wallKind@walls.bottom': wall, 'wallKind@walls.top': walls === 2 ? wall : 'adiabatic', reynolds: 500, reynoldsBulk: 500, prandtlBulk: 40,
    });
    const ours = (on.get('nusseltPlain') ?? 0) * (on.get('entranceFactorNusselt') ?? 0);
    expect(Math.abs(ours / mean - 1), `${ours} against ${mean}`).toBeLessThan(0.05);
  });
});
