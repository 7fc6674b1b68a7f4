import { places, reference } from './define.ts';
import { length, reynolds, run, speed, viscosity } from './inputs.ts';

const overMean = (r: number): number => 2 * (1 - r * r);

export const poiseuillePipe = reference('poiseuille-pipe', {
  title: 'Developed laminar flow in a round pipe',
  kind: 'exact',
  assumes: ['steady', 'laminar', 'fully developed', 'constant density and viscosity', 'no slip'],
  verifies: ['momentum diffusion', 'wall shear', 'pressure gradient', 'pressure-velocity coupling'],
  source: 'axial momentum balance in a round pipe (Hagen 1839, Poiseuille 1840)',
  uncertainty: 0,
  order: 2,
  passLimit: 0.005,
  ifMissed: 'developed inlet or enough length ahead of the stretch compared; the wall gradient is one-sided; friction is Darcy, four times Fanning',
  flows: ['pipe', 'coil', 'general'],
  needs: [{ ...reynolds, range: [1e-12, 2300] }, { ...speed, name: 'mean speed' }, { ...length, name: 'diameter' }, viscosity, run],
  values: [
    { id: 'frictionTimesReynolds', name: 'Darcy friction factor times Reynolds number', unit: '1', formula: 'f Re = 64', value: () => 64 },
    { id: 'peakOverMean', name: 'speed on the axis over the mean', unit: '1', formula: 'u_max/U = 2', value: () => 2 },
    { id: 'frictionFactorDarcy', name: 'Darcy friction factor', unit: '1', formula: 'f = 64/Re', value: ({ reynolds }) => 64 / reynolds },
    { id: 'skinFrictionCoefficient', name: 'skin friction coefficient (Fanning)', unit: '1', formula: 'c_f = 16/Re', value: ({ reynolds }) => 16 / reynolds },
    { id: 'peakSpeed', name: 'speed on the axis', unit: 'm/s', formula: 'u_max = 2 U', value: ({ speed }) => 2 * speed },
    { id: 'wallShear', name: 'wall shear stress', unit: 'Pa', formula: 'tau_w = 8 mu U/D', value: ({ viscosity, speed, length }) => (8 * viscosity * speed) / length },
    { id: 'pressureGradient', name: 'pressure fall per length', unit: 'Pa/m', formula: '-dp/dx = 32 mu U/D^2', value: ({ viscosity, speed, length }) => (32 * viscosity * speed) / length ** 2 },
    { id: 'pressureDrop', name: 'pressure drop of developed flow', unit: 'Pa', formula: 'dp = 32 mu U L/D^2', value: (g) => (32 * g.viscosity * g.speed * g.flowLength) / g.length ** 2 },
  ],
  tables: [
    {
      id: 'velocityShape',
      title: 'Axial speed over the mean, across the radius',
      columns: [{ id: 'radius', name: 'r/R', unit: '1' }, { id: 'velocity', name: 'u/U', unit: '1' }],
      rows: () => places(0, 1, 20).map((r) => [r, overMean(r)]),
    },
    {
      id: 'velocity',
      title: 'Axial speed across the radius',
      columns: [{ id: 'radius', name: 'r', unit: 'm' }, { id: 'velocity', name: 'u', unit: 'm/s' }],
      rows: ({ speed, length }) => places(0, 1, 20).map((r) => [(r * length) / 2, speed * overMean(r)]),
    },
  ],
});
