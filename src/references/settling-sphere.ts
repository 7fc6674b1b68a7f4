import { reference } from './define.ts';
import { density, length } from './inputs.ts';
import { brent } from './kernels/index.ts';
import { sphereDragStandard } from './sphere-drag.ts';

export const settlingSphere = reference('settling-sphere', {
  title: 'Steady fall of a sphere',
  kind: 'measured',
  assumes: ['smooth rigid sphere', 'fluid at rest and unbounded', 'steady fall'],
  verifies: ['drag against weight', 'coupling of a particle to the fluid'],
  source: 'balance of weight and drag with the standard curve: Clift, Grace and Weber, Bubbles, Drops, and Particles (1978), table 5.2',
  uncertainty: 0.03,
  passLimit: 0.05,
  ifMissed: 'weight less buoyancy; distance of the walls; drag law and its Reynolds number',
  flows: ['sphere', 'drop', 'bubble'],
  needs: [
    { ...length, name: 'diameter' },
    { id: 'particleDensity', unit: 'kg/m^3', name: 'density of the sphere' },
    { ...density, name: 'density of the fluid' },
    { id: 'viscosity', unit: 'Pa s', name: 'dynamic viscosity of the fluid' },
    { id: 'gravity', unit: 'm/s^2', name: 'acceleration of gravity', default: 9.80665 },
  ],
  values: [
    {
      id: 'terminalSpeed',
      name: 'speed of steady fall or rise',
      unit: 'm/s',
      formula: '(4/3) |d rho|/rho g d = C_D v^2',
      value: (g) => {
        const best = ((4 / 3) * Math.abs(g.particleDensity - g.density) * g.density * g.gravity * g.length ** 3) / g.viscosity ** 2;
        if (best === 0) return 0;
        const miss = (log: number): number => Math.log(sphereDragStandard(Math.exp(log))) + 2 * log - Math.log(best);
        return (Math.exp(brent(miss, Math.log(best) - 12 - Math.log(24), Math.log(best) + 12)) * g.viscosity) / (g.density * g.length);
      },
    },
  ],
});
