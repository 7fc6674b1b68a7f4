import { reference } from './define.ts';
import { wedgeShear } from './similarity.ts';

export const falknerSkanWedge = reference('falkner-skan-wedge', {
  title: 'Laminar boundary layer under a stream that grows with a power of the distance',
  kind: 'exact',
  assumes: ['steady', 'laminar', 'constant properties', 'stream speed proportional to x^m', 'boundary-layer equations'],
  verifies: ['wall shear under a pressure gradient'],
  source: 'Falkner and Skan 1931; Hartree 1937, in whose scaling the numbers are',
  uncertainty: 0,
  order: 2,
  passLimit: 0.01,
  ifMissed: 'the stream speed at the edge of the layer follows x^m over the whole length',
  flows: ['aerofoil'],
  needs: [{ id: 'wedgeParameter', unit: '1', name: 'beta = 2 m/(m + 1)', range: [-0.198, 2], sign: 'any' }],
  values: [
    { id: 'wallShearSimilar', name: "wall shear of the similar solution, f''(0)", unit: '1', formula: "f''' + f f'' + beta (1 - f'^2) = 0", value: (g) => wedgeShear(g.wedgeParameter) },
    { id: 'skinFrictionFactor', name: 'local skin friction coefficient times sqrt(Re_x)', unit: '1', formula: "c_f sqrt(Re_x) = sqrt(2 (m + 1)) f''(0), m = beta/(2 - beta)", value: (g) => Math.sqrt(4 / (2 - g.wedgeParameter)) * wedgeShear(g.wedgeParameter) },
    { id: 'separationParameter', name: 'wedge parameter at which the wall shear is zero', unit: '1', formula: "f''(0) = 0", value: () => -0.1988376 },
  ],
});
