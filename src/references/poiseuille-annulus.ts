import { places, reference } from './define.ts';
import { reynolds } from './inputs.ts';

const friction = (s: number): number => (64 * (1 - s) ** 2) / (1 + s * s + (1 - s * s) / Math.log(s));

function speed(s: number, r: number): number {
  const log = Math.log(s);
  return (2 * (1 - r * r - ((1 - s * s) / log) * Math.log(r))) / (1 + s * s + (1 - s * s) / log);
}

export const poiseuilleAnnulus = reference('poiseuille-annulus', {
  title: 'Developed laminar flow in a concentric annulus',
  kind: 'exact',
  assumes: ['steady', 'laminar', 'fully developed', 'constant density and viscosity', 'no slip', 'concentric'],
  verifies: ['momentum diffusion', 'wall shear', 'pressure gradient'],
  source: 'Lamb 1879; Shah and London, Laminar Flow Forced Convection in Ducts (1978), chapter XII',
  uncertainty: 0,
  order: 2,
  passLimit: 0.005,
  ifMissed: 'hydraulic diameter is the difference of the diameters; eccentricity zero',
  flows: ['annulus'],
  needs: [{ id: 'radiusRatio', unit: '1', name: 'inner over outer radius', range: [1e-6, 0.999] }, { ...reynolds, name: 'Reynolds number on the hydraulic diameter', range: [1e-12, 2000] }],
  values: [
    { id: 'frictionTimesReynolds', name: 'Darcy friction factor times Reynolds number', unit: '1', formula: 'f Re = 64 (1 - s)^2/[1 + s^2 - (1 - s^2)/ln(1/s)]', value: (g) => friction(g.radiusRatio) },
    { id: 'frictionFactorDarcy', name: 'Darcy friction factor', unit: '1', formula: 'f = (f Re)/Re', value: (g) => friction(g.radiusRatio) / g.reynolds },
  ],
  tables: [
    {
      id: 'velocityShape',
      title: 'Speed over the mean across the gap',
      columns: [{ id: 'radius', name: 'r over the outer radius', unit: '1' }, { id: 'velocity', name: 'u/U', unit: '1' }],
      rows: (g) => places(g.radiusRatio, 1, 20).map((r) => [r, speed(g.radiusRatio, r)]),
    },
  ],
});
