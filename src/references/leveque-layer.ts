import { reference, type Reference } from './define.ts';

const gammaFourThirds = 0.8929795115692493;

/** A section: its layer is as thick as its velocity gradient at the wall lets it be. */
interface Section {
  readonly flow: string;
  readonly where: string;
  /** What stands under the cube root: the velocity gradient at the wall over 9 U/D_h, as a ratio of two integers. */
  readonly ratio: readonly [number, number];
  /** Factor of Gz^(-1/3) of the next term of the expansion, which bounds what the limit leaves out. */
  readonly next: number;
  /** Graetz number from which the limit holds. */
  readonly from: number;
  readonly limitIs: string;
}

/**
 * Limit of the thermal or species entry for large Graetz numbers.
 *
 * @param section  its numbers and words
 * @returns        the reference `leveque-<flow>`
 */
export function levequeLayer({ flow, where, ratio: [numerator, denominator], next, from, limitIs }: Section): Reference {
  const local = (numerator / denominator) ** (1 / 3) / gammaFourThirds;
  const uncertainty = ({ graetz }: { readonly graetz: number }): number => next * graetz ** (-1 / 3);
  return reference(`leveque-${flow}`, {
    title: `Thin concentration or thermal layer in developed laminar flow ${where}`,
    kind: 'exact',
    assumes: ['laminar', 'velocity developed and linear across the layer', 'layer thin against the section', 'wall value uniform', 'no axial diffusion'],
    verifies: ['advection in a thin layer', 'wall flux at high Schmidt or Prandtl number'],
    source: 'Leveque 1928',
    uncertainty: 0,
    passLimit: 0.01,
    ifMissed: `local against mean, 3/2 of it; cells inside the layer; the limit itself is ${limitIs}`,
    notes: [`It is the limit of the entry series for large Graetz numbers; graetz-${flow} holds at any. A wall heat or mass rate answers with the mean.`],
    flows: [flow],
    needs: [{ id: 'graetz', unit: '1', name: 'Graetz number Re Pr D_h/L, or Re Sc D_h/L', range: [from, 1e12] }],
    values: [
      { id: 'sherwood', name: 'Sherwood number, mean over the length', unit: '1', formula: `Sh = (3/2) (${numerator}/${denominator})^(1/3)/Gamma(4/3) Gz^(1/3)`, value: ({ graetz }) => 1.5 * local * graetz ** (1 / 3), uncertainty },
      { id: 'sherwoodLocal', name: 'Sherwood number at the end of the length', unit: '1', formula: `Sh = (${numerator}/${denominator})^(1/3)/Gamma(4/3) Gz^(1/3)`, value: ({ graetz }) => local * graetz ** (1 / 3), uncertainty },
      { id: 'nusselt', name: 'Nusselt number, mean over the length', unit: '1', formula: `Nu = (3/2) (${numerator}/${denominator})^(1/3)/Gamma(4/3) Gz^(1/3)`, value: ({ graetz }) => 1.5 * local * graetz ** (1 / 3), uncertainty },
    ],
  });
}
