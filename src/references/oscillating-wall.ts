import { reference } from './define.ts';
import { density, kinematicViscosity } from './inputs.ts';

const layer = (g: { readonly kinematicViscosity: number; readonly frequency: number }): number => Math.sqrt(g.kinematicViscosity / (Math.PI * g.frequency));

export const oscillatingWall = reference('oscillating-wall', {
  title: 'Fluid over a wall that swings in its own plane',
  kind: 'exact',
  assumes: ['laminar', 'constant properties', 'endless wall', 'periodic state'],
  verifies: ['time accuracy', 'momentum diffusion'],
  source: 'Stokes 1851, second problem',
  uncertainty: 0,
  order: 2,
  passLimit: 0.005,
  ifMissed: 'several periods until the state repeats; steps a period; cells inside the layer sqrt(2 nu/omega)',
  flows: ['plate', 'pipe', 'channel'],
  needs: [{ id: 'speed', unit: 'm/s', name: 'amplitude of the wall speed' }, { id: 'frequency', unit: 'Hz', name: 'frequency' }, kinematicViscosity, density, { id: 'height', unit: 'm', name: 'distance from the wall', sign: 'not-negative' }],
  values: [
    { id: 'layerThickness', name: 'thickness of the swinging layer', unit: 'm', formula: 'delta = sqrt(2 nu/omega)', value: layer },
    { id: 'amplitudeRatio', name: 'amplitude of the speed over that of the wall', unit: '1', formula: 'exp(-y/delta)', value: (g) => Math.exp(-g.height / layer(g)) },
    { id: 'wallShear', name: 'amplitude of the wall shear stress', unit: 'Pa', formula: 'tau_w = rho U sqrt(nu omega)', value: (g) => g.density * g.speed * Math.sqrt(2 * Math.PI * g.frequency * g.kinematicViscosity) },
    { id: 'wallShearLead', name: 'angle by which the wall shear leads the wall speed', unit: 'rad', formula: 'pi/4', value: () => Math.PI / 4 },
  ],
});
