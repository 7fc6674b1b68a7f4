import { reference } from './define.ts';

const gammaFourThirds = 0.8929795115692493;
const local = (4 / 3) ** (1 / 3) / gammaFourThirds;

/** The next term of the expansion bounds what the limit leaves out. */
const uncertainty = ({ graetz }: { readonly graetz: number }): number => 0.2 * graetz ** (-1 / 3);

export const levequeChannel = reference('leveque-channel', {
  title: 'Thin concentration or thermal layer in developed laminar flow between parallel plates',
  kind: 'exact',
  assumes: ['laminar', 'velocity developed and linear across the layer', 'layer thin against the section', 'wall value uniform', 'no axial diffusion'],
  verifies: ['advection in a thin layer', 'wall flux at high Schmidt or Prandtl number'],
  source: 'Leveque 1928',
  uncertainty: 0,
  passLimit: 0.01,
  ifMissed: 'local against mean, 3/2 of it; cells inside the layer; the limit itself is within 1 % from Gz 1e4',
  notes: ['It is the limit of the entry series for large Graetz numbers; graetz-channel holds at any. A wall heat or mass rate answers with the mean.'],
  flows: ['channel'],
  needs: [{ id: 'graetz', unit: '1', name: 'Graetz number Re Pr D_h/L, or Re Sc D_h/L', range: [1e4, 1e12] }],
  values: [
    { id: 'sherwood', name: 'Sherwood number, mean over the length', unit: '1', formula: 'Sh = (3/2) (4/3)^(1/3)/Gamma(4/3) Gz^(1/3)', value: ({ graetz }) => 1.5 * local * graetz ** (1 / 3), uncertainty },
    { id: 'sherwoodLocal', name: 'Sherwood number at the end of the length', unit: '1', formula: 'Sh = (4/3)^(1/3)/Gamma(4/3) Gz^(1/3)', value: ({ graetz }) => local * graetz ** (1 / 3), uncertainty },
    { id: 'nusselt', name: 'Nusselt number, mean over the length', unit: '1', formula: 'Nu = (3/2) (4/3)^(1/3)/Gamma(4/3) Gz^(1/3)', value: ({ graetz }) => 1.5 * local * graetz ** (1 / 3), uncertainty },
  ],
});
