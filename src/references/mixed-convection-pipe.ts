import { reference } from './define.ts';
import { at } from './kernels/index.ts';

const terms = 40;

interface Fields { readonly u: readonly number[]; readonly theta: readonly number[] }

/** Power series in (r/R)^2 of speed and temperature for one choice of drive, speed on the axis and temperature on the axis. */
function fields(buoyancy: number, drive: number, speed: number, theta: number): Fields {
  const u = [speed], t = [theta];
  for (let k = 1; k < terms; k++) {
    u.push((-buoyancy * at(t, k - 1) - (k === 1 ? drive : 0)) / (4 * k * k));
    t.push((2 * at(u, k - 1)) / (4 * k * k));
  }
  return { u, theta: t };
}

const total = (series: readonly number[]): number => series.reduce((sum, a) => sum + a, 0);
const slope = (series: readonly number[]): number => series.reduce((sum, a, k) => sum + 2 * k * a, 0);

/**
 * Developed laminar flow in an upright pipe with uniform wall flux.
 *
 * @param ratio  Gr_q/Re on the diameter, Gr_q = g beta q D^4/(k nu^2); positive where heating helps an upward flow
 * @returns      Nusselt number on the diameter, wall shear over that without buoyancy, speed on the axis over the mean
 * @source       linear balance of momentum and heat; Hallman, Trans. ASME 78 (1956) 1831-1841
 */
function uprightPipe(ratio: number): { nusselt: number; shear: number; axis: number } {
  const buoyancy = ratio / 8;
  const parts = [fields(buoyancy, 1, 0, 0), fields(buoyancy, 0, 1, 0), fields(buoyancy, 0, 0, 1)];
  // Speed and temperature over that of the wall are zero at the wall; the wall slope of temperature there says that the mean speed is one.
  const rows = [parts.map((part) => total(part.u)), parts.map((part) => total(part.theta)), parts.map((part) => slope(part.theta))];
  const [drive, speed, theta] = solve(rows, [0, 0, 1]) as [number, number, number];
  const flow = fields(buoyancy, drive, speed, theta);
  const bulk = flow.u.reduce((sum, a, i) => sum + flow.theta.reduce((inner, t, j) => inner + (a * t) / (i + j + 1), 0), 0);
  return { nusselt: -2 / bulk, shear: -slope(flow.u) / 4, axis: speed };
}

/** Three linear equations by Cramer's rule. */
function solve(a: readonly (readonly number[])[], b: readonly number[]): number[] {
  const det = (m: readonly (readonly number[])[]): number => {
    const [p, q, r] = m as [number[], number[], number[]];
    return at(p, 0) * (at(q, 1) * at(r, 2) - at(q, 2) * at(r, 1)) - at(p, 1) * (at(q, 0) * at(r, 2) - at(q, 2) * at(r, 0)) + at(p, 2) * (at(q, 0) * at(r, 1) - at(q, 1) * at(r, 0));
  };
  return [0, 1, 2].map((j) => det(a.map((row, i) => row.map((value, k) => (k === j ? at(b, i) : value)))) / det(a));
}

export const mixedConvectionPipe = reference('mixed-convection-pipe', {
  title: 'Developed laminar flow in an upright pipe heated or cooled with uniform flux',
  kind: 'exact',
  assumes: ['laminar', 'developed', 'upright', 'wall flux uniform', 'density linear in temperature and only in the weight', 'other properties constant'],
  verifies: ['buoyancy in a forced flow', 'wall heat flux', 'wall shear'],
  source: 'linear balance of momentum and heat, Hallman, Trans. ASME 78 (1956) 1831-1841',
  uncertainty: 0,
  order: 2,
  passLimit: 0.02,
  ifMissed: 'weight without the hydrostatic part; developed length of both layers; sign of the flux against the flow',
  notes: ['The flow turns back at the wall below about -417 (opposing) and on the axis above about 2553 (aiding).'],
  flows: ['pipe'],
  needs: [{ id: 'grashofFluxOverReynolds', unit: '1', name: 'Gr_q/Re on the diameter, positive where buoyancy helps the flow', range: [-417, 2553], sign: 'any' }],
  values: [
    { id: 'nusselt', name: 'Nusselt number on the diameter', unit: '1', formula: 'linear system', value: (g) => uprightPipe(g.grashofFluxOverReynolds).nusselt },
    { id: 'nusseltFactor', name: 'Nusselt number over that without buoyancy', unit: '1', formula: 'Nu/(48/11)', value: (g) => (uprightPipe(g.grashofFluxOverReynolds).nusselt * 11) / 48 },
    { id: 'wallShearFactor', name: 'wall shear stress over that without buoyancy', unit: '1', formula: 'linear system', value: (g) => uprightPipe(g.grashofFluxOverReynolds).shear },
    { id: 'peakOverMean', name: 'speed on the axis over the mean', unit: '1', formula: 'linear system', value: (g) => uprightPipe(g.grashofFluxOverReynolds).axis },
  ],
});
