import { places, reference } from './define.ts';

const speed = (y: number, ratio: number): number => 6 * y * (1 - y) - (ratio / 12) * y * (1 - y) * (1 - 2 * y);

export const mixedConvectionChannel = reference('mixed-convection-channel', {
  title: 'Developed upward flow between plates at two temperatures',
  kind: 'exact',
  assumes: ['laminar', 'developed', 'upward flow', 'density linear in temperature and only in the weight', 'other properties constant'],
  verifies: ['buoyancy in a forced flow', 'wall shear'],
  source: 'Aung and Worku, J. Heat Transfer 108 (1986) 485-488',
  uncertainty: 0,
  order: 2,
  passLimit: 0.01,
  ifMissed: 'weight without the hydrostatic part; reference temperature in the middle; developed length',
  flows: ['channel'],
  needs: [{ id: 'grashofOverReynolds', unit: '1', name: 'Grashof number on the gap and the difference of the walls over the Reynolds number on gap and mean speed', sign: 'not-negative' }],
  values: [
    { id: 'reversalGrashofOverReynolds', name: 'ratio at which the flow turns back at the cold wall', unit: '1', formula: 'Gr_H/Re_H = 72', value: () => 72 },
    { id: 'hotWallSlope', name: 'slope of u/U at the hot wall over y/H', unit: '1', formula: '6 + G/12', value: (g) => 6 + g.grashofOverReynolds / 12 },
    { id: 'coldWallSlope', name: 'slope of u/U at the cold wall over y/H', unit: '1', formula: '6 - G/12', value: (g) => 6 - g.grashofOverReynolds / 12 },
  ],
  tables: [
    {
      id: 'velocityShape',
      title: 'Speed over the mean from the cold wall to the hot wall',
      columns: [{ id: 'height', name: 'y/H from the cold wall', unit: '1' }, { id: 'velocity', name: 'u/U', unit: '1' }],
      rows: (g) => places(0, 1, 20).map((y) => [y, speed(y, g.grashofOverReynolds)]),
    },
  ],
});
