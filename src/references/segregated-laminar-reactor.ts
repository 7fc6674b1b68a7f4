import { reference } from './define.ts';
import { segregatedConversion } from './kernels/index.ts';

export const segregatedLaminarReactor = reference('segregated-laminar-reactor', {
  title: 'First-order reaction in developed laminar flow without diffusion',
  kind: 'exact',
  assumes: ['steady', 'laminar', 'developed', 'one temperature', 'first order', 'no diffusion across or along'],
  verifies: ['source of a reaction', 'advection of a species by a profile', 'numerical diffusion across the flow'],
  source: 'Cleland and Wilhelm, AIChE J. 2 (1956) 489',
  uncertainty: 0,
  passLimit: 0.01,
  ifMissed: 'mean at the outlet by flow, not by area; cells at the wall, where the fluid stays longest; numerical diffusion acts like diffusion and raises the conversion',
  flows: ['pipe'],
  needs: [{ id: 'damkohler', unit: '1', name: 'Damkohler number k L/U', sign: 'not-negative' }],
  values: [{ id: 'conversion', name: 'share converted, mean by flow', unit: '1', formula: '1 - (1 - y) e^-y - y^2 E_1(y), y = Da/2', value: (g) => segregatedConversion({ damkohler: g.damkohler }) }],
  tables: [
    {
      id: 'shareAcross',
      title: 'Share left at the outlet over the radius',
      columns: [{ id: 'radius', name: 'r/R', unit: '1' }, { id: 'share', name: 'c/c_0', unit: '1' }],
      rows: (g) => Array.from({ length: 20 }, (_, k) => [k / 20, Math.exp(-g.damkohler / (2 * (1 - (k / 20) ** 2)))]),
    },
  ],
});
