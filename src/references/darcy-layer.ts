import { places, reference } from './define.ts';
import { viscosity } from './inputs.ts';

const shape = (root: number, y: number): number => 1 - (Math.exp(-(1 - y) / root) * (1 + Math.exp((-2 * y) / root))) / (1 + Math.exp(-2 / root));

export const darcyLayer = reference('darcy-layer', {
  title: 'Slow flow through a porous layer, and in a channel filled with it',
  kind: 'exact',
  assumes: ['slow flow, drag linear in speed', 'uniform permeability', 'effective viscosity equal to that of the fluid'],
  verifies: ['drag of a porous region', 'wall layer of a porous region'],
  source: 'Darcy 1856; Brinkman, Appl. Sci. Res. A1 (1949) 27-34',
  uncertainty: 0,
  order: 2,
  passLimit: 0.005,
  ifMissed: 'permeability against its reciprocal; superficial speed; wall cells inside the root of the permeability',
  flows: ['packed-bed', 'porous-layer'],
  needs: [{ id: 'permeability', unit: 'm^2', name: 'permeability' }, { id: 'pressureGradient', unit: 'Pa/m', name: 'pressure fall per length', sign: 'any' }, viscosity, { id: 'darcyNumber', unit: '1', name: 'permeability over the half height of the channel squared' }],
  values: [
    { id: 'speed', name: 'superficial speed', unit: 'm/s', formula: 'U = (K/mu)(-dp/dx)', value: (g) => (g.permeability / g.viscosity) * g.pressureGradient },
    { id: 'meanOverDarcy', name: 'mean speed in the filled channel over the speed without walls', unit: '1', formula: '1 - sqrt(Da) tanh(1/sqrt(Da))', value: (g) => 1 - Math.sqrt(g.darcyNumber) * Math.tanh(1 / Math.sqrt(g.darcyNumber)) },
  ],
  tables: [
    {
      id: 'velocityShape',
      title: 'Speed over that without walls, from the middle to the wall',
      columns: [{ id: 'height', name: 'y/h from the middle', unit: '1' }, { id: 'velocity', name: 'u/U', unit: '1' }],
      rows: (g) => places(0, 1, 20).map((y) => [y, shape(Math.sqrt(g.darcyNumber), y)]),
    },
  ],
});
