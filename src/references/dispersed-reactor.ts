import { reference } from './define.ts';
import { dispersedConversion } from './kernels/index.ts';

export const dispersedReactor = reference('dispersed-reactor', {
  title: 'First-order reaction with spreading along the flow between closed ends',
  kind: 'exact',
  assumes: ['steady', 'one-dimensional', 'one temperature', 'first order', 'nothing spreads over the ends'],
  verifies: ['source of a reaction', 'advection against diffusion along the flow', 'total flux at the inlet'],
  source: 'Danckwerts, Chem. Eng. Sci. 2 (1953) 1',
  uncertainty: 0,
  passLimit: 0.01,
  ifMissed: 'total flux at the inlet, no slope at the outlet; numerical diffusion U h/2 below a tenth of the spreading',
  flows: ['packed-bed'],
  needs: [{ id: 'damkohler', unit: '1', name: 'Damkohler number k L/U', sign: 'not-negative' }, { id: 'bodenstein', unit: '1', name: 'Bodenstein number U L/D_ax' }],
  values: [{ id: 'conversion', name: 'share converted', unit: '1', formula: '1 - 4 a e^(Bo/2)/[(1 + a)^2 e^(a Bo/2) - (1 - a)^2 e^(-a Bo/2)], a = sqrt(1 + 4 Da/Bo)', value: (g) => dispersedConversion({ damkohler: g.damkohler, bodenstein: g.bodenstein }) }],
});
