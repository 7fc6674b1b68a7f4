import { reference } from './define.ts';

export const hiemenzStagnation = reference('hiemenz-stagnation', {
  title: 'Plane stagnation point',
  kind: 'exact',
  assumes: ['steady', 'laminar', 'constant properties', 'stream speed a x along the wall'],
  verifies: ['wall shear', 'flow at a stagnation point'],
  source: "Hiemenz 1911: f''' + f f'' - f'^2 + 1 = 0",
  uncertainty: 1e-7,
  order: 2,
  passLimit: 0.01,
  ifMissed: 'rate a from the pressure outside the layer; cells inside sqrt(nu/a)',
  flows: ['cylinder', 'impinging-jet'],
  needs: [{ id: 'strainReynolds', unit: '1', name: 'a x^2/nu' }],
  values: [
    { id: 'wallShearSimilar', name: "wall shear of the similar solution, f''(0)", unit: '1', formula: "f''' + f f'' - f'^2 + 1 = 0", value: () => 1.23258765682 },
    { id: 'skinFrictionCoefficient', name: 'local skin friction coefficient on the stream speed', unit: '1', formula: "c_f = 2 f''(0)/sqrt(a x^2/nu)", value: (g) => (2 * 1.23258765682) / Math.sqrt(g.strainReynolds) },
  ],
});
