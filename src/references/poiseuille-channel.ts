import { places, reference } from './define.ts';
import { length, reynolds, run, speed, viscosity } from './inputs.ts';

const overMean = (y: number): number => 1.5 * (1 - y * y);

export const poiseuilleChannel = reference('poiseuille-channel', {
  title: 'Developed laminar flow between parallel plates',
  kind: 'exact',
  assumes: ['steady', 'laminar', 'fully developed', 'constant density and viscosity', 'no slip', 'endless in the third direction'],
  verifies: ['momentum diffusion', 'wall shear', 'pressure gradient', 'pressure-velocity coupling'],
  source: 'momentum balance between parallel plates; limit of linear stability: Orszag, J. Fluid Mech. 50 (1971) 689-703',
  uncertainty: 0,
  order: 2,
  passLimit: 0.005,
  ifMissed: 'the length scale is twice the gap; developed inlet; wall gradient one-sided',
  notes: ['A second-order scheme on equal cells gives this profile without error: use graded cells to see its order.'],
  flows: ['channel', 'backward-step', 'duct'],
  needs: [{ ...reynolds, name: 'Reynolds number on twice the gap', range: [1e-12, 2300] }, { ...speed, name: 'mean speed' }, { ...length, name: 'twice the gap' }, viscosity, run],
  values: [
    { id: 'frictionTimesReynolds', name: 'Darcy friction factor times Reynolds number', unit: '1', formula: 'f Re = 96', value: () => 96 },
    { id: 'peakOverMean', name: 'speed in the middle over the mean', unit: '1', formula: 'u_max/U = 3/2', value: () => 1.5 },
    { id: 'criticalReynoldsHalfGap', name: 'limit of linear stability, on peak speed and half the gap', unit: '1', formula: 'Orr-Sommerfeld eigenvalue', value: () => 5772.22, uncertainty: 1e-6 },
    { id: 'criticalWavenumberHalfGap', name: 'wavenumber of the first unstable wave times half the gap', unit: '1', formula: 'Orr-Sommerfeld eigenvalue', value: () => 1.02056, uncertainty: 1e-5 },
    { id: 'frictionFactorDarcy', name: 'Darcy friction factor', unit: '1', formula: 'f = 96/Re', value: ({ reynolds }) => 96 / reynolds },
    { id: 'skinFrictionCoefficient', name: 'skin friction coefficient (Fanning)', unit: '1', formula: 'c_f = 24/Re', value: ({ reynolds }) => 24 / reynolds },
    { id: 'peakSpeed', name: 'speed in the middle', unit: 'm/s', formula: 'u_max = 1.5 U', value: ({ speed }) => 1.5 * speed },
    { id: 'wallShear', name: 'wall shear stress', unit: 'Pa', formula: 'tau_w = 12 mu U/L, L twice the gap', value: ({ viscosity, speed, length }) => (12 * viscosity * speed) / length },
    { id: 'pressureGradient', name: 'pressure fall per length', unit: 'Pa/m', formula: '-dp/dx = 48 mu U/L^2, L twice the gap', value: ({ viscosity, speed, length }) => (48 * viscosity * speed) / length ** 2 },
    { id: 'pressureDrop', name: 'pressure drop of developed flow', unit: 'Pa', formula: 'dp = 48 mu U l/L^2', value: (g) => (48 * g.viscosity * g.speed * g.flowLength) / g.length ** 2 },
  ],
  tables: [
    {
      id: 'velocityShape',
      title: 'Speed over the mean, from the middle to the wall',
      columns: [{ id: 'height', name: 'y/h from the middle', unit: '1' }, { id: 'velocity', name: 'u/U', unit: '1' }],
      rows: () => places(0, 1, 20).map((y) => [y, overMean(y)]),
    },
    {
      id: 'velocity',
      title: 'Speed from the middle to the wall',
      columns: [{ id: 'height', name: 'y from the middle', unit: 'm' }, { id: 'velocity', name: 'u', unit: 'm/s' }],
      rows: ({ speed, length }) => places(0, 1, 20).map((y) => [(y * length) / 4, speed * overMean(y)]),
    },
  ],
});
