import { expect, it } from 'vitest';
import { planned } from './expert.ts';

// Natural gas of 60 bar and 10 degC, 10 m/s in 200 mm: nu 2.41e-7 m^2/s, Re 8.3e6; sand grain of commercial steel 46 um, k_s/D 2.3e-4.
// Colebrook: f 0.01424 rough, 0.0083 smooth; u_tau = 10 sqrt(0.01424/8) = 0.422 m/s, smooth 0.323. k_s+ = 46e-6 x 0.422/2.41e-7 = 80.5.
it('k_s+ and y+ of a rough pipe stand on one friction velocity, and the first node above the grains', async () => {
  const on = await planned('gas-feed-line');
  const grain = on.n('sandGrain');
  expect(grain).toBeCloseTo(46e-6, 6);
  expect(Math.abs(on.n('roughnessReynolds') / 80.5 - 1)).toBeLessThan(0.03);
  expect(Math.abs(on.n('roughnessReynolds') / (grain / on.n('viscousLength')) - 1)).toBeLessThan(0.02);
  expect(on.n('firstNodeDistance')).toBeGreaterThanOrEqual(1.2 * grain * 0.999);
  expect(Math.abs(on.n('firstCellHeight') / 110e-6 - 1)).toBeLessThan(0.03);
});
