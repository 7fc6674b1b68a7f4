import { reference } from './define.ts';
import { density, kinematicViscosity, length, reynolds, speed } from './inputs.ts';
import { blasiusDisplacement, blasiusEdge, blasiusLayer, blasiusMomentum, blasiusShear } from './similarity.ts';

export const blasiusPlate = reference('blasius-plate', {
  title: 'Laminar boundary layer on a flat plate',
  kind: 'exact',
  assumes: ['steady', 'laminar', 'constant properties', 'uniform stream without pressure gradient', 'boundary-layer equations: high Reynolds number, away from the leading edge'],
  verifies: ['wall shear', 'growth of a boundary layer', 'advection against diffusion of momentum'],
  source: 'Blasius 1908; constants: Boyd, Exp. Math. 8 (1999) 381-394',
  uncertainty: 0,
  order: 2,
  passLimit: 0.01,
  ifMissed: 'leave out the first 5 % of the plate; slip ahead of the leading edge; height of the domain at least ten layers; cells inside the layer',
  notes: ['The full equations differ from the boundary-layer solution by the order of 1/sqrt(Re_x): compare where Re_x is above 1e4.'],
  flows: ['plate', 'aerofoil', 'general'],
  needs: [{ ...reynolds, name: 'Reynolds number on the length from the leading edge', range: [1e4, 3e6] }, { ...length, name: 'length from the leading edge' }, { ...speed, name: 'speed of the stream' }, density, kinematicViscosity],
  values: [
    { id: 'wallShearSimilar', name: "wall shear of the similar solution, f''(0)", unit: '1', formula: "f''' + f f''/2 = 0", value: () => blasiusShear },
    { id: 'shapeFactor', name: 'displacement over momentum thickness', unit: '1', formula: 'H = delta*/theta', value: () => blasiusDisplacement / blasiusMomentum },
    { id: 'skinFrictionCoefficient', name: 'local skin friction coefficient at the length', unit: '1', formula: 'c_f = 0.664115 Re^(-1/2)', value: ({ reynolds }) => (2 * blasiusShear) / Math.sqrt(reynolds) },
    { id: 'dragCoefficient', name: 'friction drag coefficient of one side, mean over the length', unit: '1', formula: 'C_F = 1.328229 Re^(-1/2)', value: ({ reynolds }) => (4 * blasiusShear) / Math.sqrt(reynolds) },
    { id: 'boundaryLayerThickness', name: 'thickness where u is 99 % of the stream', unit: 'm', formula: 'delta = 4.90999 x Re^(-1/2)', value: ({ reynolds, length }) => (blasiusEdge * length) / Math.sqrt(reynolds) },
    { id: 'displacementThickness', name: 'displacement thickness', unit: 'm', formula: 'delta* = 1.720788 x Re^(-1/2)', value: ({ reynolds, length }) => (blasiusDisplacement * length) / Math.sqrt(reynolds) },
    { id: 'momentumThickness', name: 'momentum thickness', unit: 'm', formula: 'theta = 0.664115 x Re^(-1/2)', value: ({ reynolds, length }) => (blasiusMomentum * length) / Math.sqrt(reynolds) },
    { id: 'displacementFactor', name: 'displacement thickness times sqrt(Re_x)/x', unit: '1', formula: 'similar solution', value: () => blasiusDisplacement },
    { id: 'momentumFactor', name: 'momentum thickness times sqrt(Re_x)/x', unit: '1', formula: 'similar solution', value: () => blasiusMomentum },
    { id: 'wallShear', name: 'wall shear stress at the length', unit: 'Pa', formula: 'tau_w = c_f rho U^2/2', value: ({ reynolds, density, speed }) => (blasiusShear * density * speed ** 2) / Math.sqrt(reynolds) },
  ],
  tables: [
    {
      id: 'velocityShape',
      title: 'Speed over that of the stream across the layer',
      columns: [{ id: 'height', name: 'y sqrt(U/(nu x))', unit: '1' }, { id: 'velocity', name: 'u/U', unit: '1' }],
      rows: () => blasiusLayer().filter((_, i) => i % 25 === 0 && i <= 800).map((row) => [row.eta, row.speed]),
    },
    {
      id: 'velocity',
      title: 'Speed across the layer at the length',
      columns: [{ id: 'height', name: 'y', unit: 'm' }, { id: 'velocity', name: 'u', unit: 'm/s' }],
      rows: ({ length, speed, kinematicViscosity }) => {
        const scale = Math.sqrt((kinematicViscosity * length) / speed);
        return blasiusLayer().filter((_, i) => i % 25 === 0 && i <= 800).map((row) => [row.eta * scale, row.speed * speed]);
      },
    },
  ],
});
