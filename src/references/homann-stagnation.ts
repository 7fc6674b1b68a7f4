import { reference } from './define.ts';

export const homannStagnation = reference('homann-stagnation', {
  title: 'Round stagnation point',
  kind: 'exact',
  assumes: ['steady', 'laminar', 'constant properties', 'stream speed a x along the wall'],
  verifies: ['wall shear', 'flow at a stagnation point'],
  source: "Homann 1936: f''' + 2 f f'' - f'^2 + 1 = 0",
  uncertainty: 1e-7,
  order: 2,
  passLimit: 0.01,
  ifMissed: 'rate a from the pressure outside the layer; cells inside sqrt(nu/a)',
  flows: ['sphere', 'impinging-jet'],
  needs: [{ id: 'strainReynolds', unit: '1', name: 'a x^2/nu' }],
  values: [
    { id: 'wallShearSimilar', name: "wall shear of the similar solution, f''(0)", unit: '1', formula: "f''' + 2 f f'' - f'^2 + 1 = 0", value: () => 1.31193769388 },
    { id: 'skinFrictionCoefficient', name: 'local skin friction coefficient on the stream speed', unit: '1', formula: "c_f = 2 f''(0)/sqrt(a x^2/nu)", value: (g) => (2 * 1.31193769388) / Math.sqrt(g.strainReynolds) },
  ],
});
