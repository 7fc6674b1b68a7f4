import { places, reference } from './define.ts';

const lambda = (re: number): number => (-4 * Math.PI ** 2) / (re / 2 + Math.sqrt((re * re) / 4 + 4 * Math.PI ** 2));

export const kovasznay = reference('kovasznay', {
  title: 'Laminar wake of a row of cylinders',
  kind: 'exact',
  assumes: ['two-dimensional', 'steady', 'laminar', 'constant properties', 'lengths over the pitch of the row, speeds over the mean'],
  verifies: ['advection against diffusion of momentum', 'pressure-velocity coupling'],
  source: 'Kovasznay, Proc. Camb. Phil. Soc. 44 (1948) 58-62',
  uncertainty: 0,
  order: 2,
  passLimit: 0.005,
  ifMissed: 'exact values on all boundaries; pressure fixed at one point',
  flows: ['general'],
  needs: [{ id: 'reynolds', unit: '1', name: 'Reynolds number on pitch and mean speed', default: 40 }],
  values: [{ id: 'decay', name: 'decay of the wake along the flow', unit: '1', formula: 'lambda = Re/2 - sqrt(Re^2/4 + 4 pi^2)', value: (g) => lambda(g.reynolds) }],
  tables: [
    {
      id: 'velocity',
      title: 'Speed along the flow and across it at x = 0.5, over the pitch',
      columns: [{ id: 'height', name: 'y', unit: '1' }, { id: 'velocity', name: 'u', unit: '1' }, { id: 'velocityAcross', name: 'v', unit: '1' }],
      rows: (g) => places(-0.5, 0.5, 20).map((y) => {
        const l = lambda(g.reynolds), fade = Math.exp(l / 2);
        return [y, 1 - fade * Math.cos(2 * Math.PI * y), (l / (2 * Math.PI)) * fade * Math.sin(2 * Math.PI * y)];
      }),
    },
  ],
});
