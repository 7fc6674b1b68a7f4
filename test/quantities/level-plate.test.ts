import { describe, expect, it } from 'vitest';
import { flows, type Flow } from '../../src/flows/index.ts';
import { workingsOf } from '../flows/harness.ts';
import { planned } from '../cases/expert.ts';

// Source: first-order solution of the laminar layer, level-plate.py beside this file; it has the exact f''(0) 0.33206 and, at Pr 0.7, 0.2927.
// Relative rise of local Nu and c_f for xi = Gr_x/Re_x^(5/2); at Pr 0.7 Chen, Sparrow and Mucoglu (1977) name 5 % of Nu near xi 0.05.
const rows = [
  { prandtl: 0.004, nusselt: 9.0913, shear: 72.66 },
  { prandtl: 0.0211, nusselt: 4.8054, shear: 31.46 },
  { prandtl: 0.1, nusselt: 2.6985, shear: 14.26 },
  { prandtl: 0.7, nusselt: 1.2185, shear: 5.188 },
  { prandtl: 7, nusselt: 0.3849, shear: 1.4346 },
];
const group = (grashof: number, reynolds: number, prandtl: number): number =>
  workingsOf(flows['plate'] as Flow, { imposedFlow: 'yes', energySolved: 'yes', axis: 'level', richardson: grashof / reynolds ** 2, reynolds, prandtl }).get('buoyancyLevelPlate') as number;

describe('weight on a level plate', () => {
  it.each(rows)('moves local Nu by 0.55 to 1.05 of the group, the shear by 3.8 to 4.7 of it, Pr $prandtl', ({ prandtl, nusselt, shear }) => {
    const reynolds = 1e5;
    const at = group(0.01 * reynolds ** 2.5, reynolds, prandtl);
    expect((0.01 * nusselt) / at).toBeGreaterThan(0.55);
    expect((0.01 * nusselt) / at).toBeLessThan(1.05);
    expect((0.01 * shear) / at).toBeGreaterThan(3.75);
    expect((0.01 * shear) / at).toBeLessThan(4.7);
  });
  // Gr/Re^2 = 0.273 at Re 8.41e5 and Pr 0.022: Gr/Re^(5/2) = 2.98e-4, over Pr^(1/2) 0.0020. By Gr/Re^2 alone it was borderline.
  it('is nothing for lead-bismuth at 0.3 m/s: leave-out, nothing driven', async () => {
    const on = await planned('lead-bismuth-plate', [['inlet:', 'inclination: horizontal\nfacing: up\ninlet:']], '../cases');
    expect(on.n('buoyancyLevelPlate')).toBeGreaterThan(0.0018);
    expect(on.n('buoyancyLevelPlate')).toBeLessThan(0.0022);
    for (const id of ['buoyancy', 'buoyancy-driven']) expect(on.plan.effects.find((e) => e.id === id)?.verdict).toBe('leave-out');
  });
});
