import { reference } from './define.ts';

export const taylorAris = reference('taylor-aris', {
  title: 'Spreading of a solute in developed laminar flow',
  kind: 'exact',
  assumes: ['laminar', 'developed', 'long after the start, t above 0.5 R^2/D', 'constant diffusivity'],
  verifies: ['advection and diffusion of a species'],
  source: 'Taylor, Proc. R. Soc. A 219 (1953) 186-203; Aris, Proc. R. Soc. A 235 (1956) 67-77',
  uncertainty: 0,
  passLimit: 0.02,
  ifMissed: 'radius, not diameter, in the Peclet number; long enough for the spread to grow evenly; numerical diffusion along the flow',
  flows: ['pipe', 'channel'],
  needs: [{ id: 'pecletRadius', unit: '1', name: 'Peclet number U R/D on the radius', sign: 'not-negative' }, { id: 'pecletGap', unit: '1', name: 'Peclet number U H/D on the gap', sign: 'not-negative' }],
  values: [
    { id: 'spreadingPipe', name: 'spreading over molecular diffusivity in a pipe', unit: '1', formula: '1 + Pe^2/48, Pe = U R/D', value: (g) => 1 + g.pecletRadius ** 2 / 48 },
    { id: 'spreadingChannel', name: 'spreading over molecular diffusivity between plates', unit: '1', formula: '1 + Pe^2/210, Pe = U H/D', value: (g) => 1 + g.pecletGap ** 2 / 210 },
  ],
});
