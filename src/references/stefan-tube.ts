import { reference } from './define.ts';

export const stefanTube = reference('stefan-tube', {
  title: 'Evaporation through a layer of gas at rest',
  kind: 'exact',
  assumes: ['steady', 'one-dimensional', 'constant density and diffusivity', 'the gas itself does not pass the surface'],
  verifies: ['diffusion of a species', 'speed away from the wall that diffusion makes'],
  source: 'Stefan 1874; Bird, Stewart and Lightfoot, Transport Phenomena, 2nd ed. (2002), section 18.2',
  uncertainty: 0,
  passLimit: 0.01,
  ifMissed: 'the speed away from the wall, v_w = J_w/(rho (1 - Y_w)), is missing or counted twice; shares by mass against moles',
  flows: ['plate'],
  needs: [{ id: 'massFractionWall', unit: '1', name: 'mass share at the surface', sign: 'not-negative' }, { id: 'massFractionFar', unit: '1', name: 'mass share at the end of the layer', sign: 'not-negative', default: 0 }],
  values: [
    { id: 'fluxFactor', name: 'mass flux over rho D_m (Y_w - Y_L)/L', unit: '1', formula: 'ln(1 + B)/(Y_w - Y_L), B = (Y_w - Y_L)/(1 - Y_w)', value: (g) => (g.massFractionWall >= 1 || g.massFractionWall === g.massFractionFar ? undefined : Math.log((1 - g.massFractionFar) / (1 - g.massFractionWall)) / (g.massFractionWall - g.massFractionFar)) },
  ],
  tables: [
    {
      id: 'share',
      title: 'Mass share over the layer',
      columns: [{ id: 'height', name: 'y/L', unit: '1' }, { id: 'share', name: 'Y', unit: '1' }],
      rows: (g) => (g.massFractionWall >= 1 ? [] : Array.from({ length: 21 }, (_, k) => [k / 20, 1 - (1 - g.massFractionWall) * ((1 - g.massFractionFar) / (1 - g.massFractionWall)) ** (k / 20)])),
    },
  ],
});
