import { places, reference } from './define.ts';

/** (exp(Pe x) - 1)/(exp(Pe) - 1) without overflow. */
function share(peclet: number, x: number): number {
  if (Math.abs(peclet) < 1e-12) return x;
  return peclet > 0 ? Math.exp(-peclet * (1 - x)) * (Math.expm1(-peclet * x) / Math.expm1(-peclet)) : Math.expm1(peclet * x) / Math.expm1(peclet);
}

export const advectionDiffusionLine = reference('advection-diffusion-line', {
  title: 'Advection and diffusion along a line between two held values',
  kind: 'exact',
  assumes: ['steady', 'one-dimensional', 'uniform speed and diffusivity'],
  verifies: ['convection scheme', 'cell Peclet number'],
  source: 'balance of advection and diffusion',
  uncertainty: 0,
  order: 2,
  passLimit: 0.005,
  ifMissed: 'cell Peclet number below 2 near the end, or a scheme that bears more; first-order convection',
  flows: ['general'],
  needs: [{ id: 'peclet', unit: '1', name: 'Peclet number U L/diffusivity, of either sign', sign: 'any' }, { id: 'place', unit: '1', name: 'x/L', range: [0, 1], sign: 'not-negative' }],
  values: [{ id: 'share', name: 'share of the difference at the place', unit: '1', formula: '(exp(Pe x/L) - 1)/(exp(Pe) - 1)', value: (g) => share(g.peclet, g.place) }],
  tables: [
    {
      id: 'profile',
      title: 'Share of the difference along the line',
      columns: [{ id: 'distance', name: 'x/L', unit: '1' }, { id: 'share', name: 'share', unit: '1' }],
      rows: (g) => places(0, 1, 20).map((x) => [x, share(g.peclet, x)]),
    },
  ],
});
