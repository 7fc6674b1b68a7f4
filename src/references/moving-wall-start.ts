import { places, reference } from './define.ts';
import { density, kinematicViscosity, time } from './inputs.ts';
import { erfc } from './kernels/index.ts';

export const movingWallStart = reference('moving-wall-start', {
  title: 'Fluid over a wall that starts to move at once',
  kind: 'exact',
  assumes: ['laminar', 'constant properties', 'endless wall', 'fluid deep against sqrt(nu t)'],
  verifies: ['time accuracy', 'momentum diffusion', 'wall shear of a sudden start'],
  source: 'Stokes 1851, first problem; Rayleigh 1911',
  uncertainty: 0,
  order: 2,
  passLimit: 0.005,
  ifMissed: 'first steps small against the square of the first cell over nu; depth at least 4 sqrt(nu t)',
  flows: ['plate', 'channel'],
  needs: [{ id: 'speed', unit: 'm/s', name: 'speed of the wall', sign: 'any' }, kinematicViscosity, density, time],
  values: [
    { id: 'wallShear', name: 'wall shear stress', unit: 'Pa', formula: 'tau_w = rho U sqrt(nu/(pi t))', value: (g) => g.density * g.speed * Math.sqrt(g.kinematicViscosity / (Math.PI * g.time)) },
    { id: 'penetrationDepth', name: 'distance where u is 1 % of the wall speed', unit: 'm', formula: '3.642773 sqrt(nu t)', value: (g) => 3.6427727 * Math.sqrt(g.kinematicViscosity * g.time), uncertainty: 1e-7 },
  ],
  tables: [
    {
      id: 'velocityShape',
      title: 'Speed over that of the wall',
      columns: [{ id: 'height', name: 'y/(2 sqrt(nu t))', unit: '1' }, { id: 'velocity', name: 'u/U', unit: '1' }],
      rows: () => places(0, 2.5, 20).map((y) => [y, erfc(y)]),
    },
  ],
});
