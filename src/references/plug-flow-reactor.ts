import { reference } from './define.ts';

export const plugFlowReactor = reference('plug-flow-reactor', {
  title: 'First-order reaction in plug flow and in a mixed vessel',
  kind: 'exact',
  assumes: ['steady', 'one temperature', 'first order', 'no spreading along the flow, or mixed throughout'],
  verifies: ['source of a reaction', 'advection of a species'],
  source: 'Levenspiel, Chemical Reaction Engineering, 3rd ed. (1999), ch. 5',
  uncertainty: 0,
  passLimit: 0.005,
  ifMissed: 'slip walls and an even inlet for plug flow; the rate constant in its unit; numerical diffusion along the flow; steps of a split solution',
  flows: ['pipe'],
  needs: [{ id: 'damkohler', unit: '1', name: 'Damkohler number k L/U, or k V/Q', sign: 'not-negative' }],
  values: [
    { id: 'conversion', name: 'share converted in plug flow', unit: '1', formula: '1 - e^-Da', value: (g) => -Math.expm1(-g.damkohler) },
    { id: 'conversionMixed', name: 'share converted in a mixed vessel', unit: '1', formula: 'Da/(1 + Da)', value: (g) => g.damkohler / (1 + g.damkohler) },
  ],
  tables: [
    {
      id: 'shareAlong',
      title: 'Share left along plug flow',
      columns: [{ id: 'distance', name: 'x/L', unit: '1' }, { id: 'share', name: 'c/c_0', unit: '1' }],
      rows: (g) => Array.from({ length: 21 }, (_, k) => [k / 20, Math.exp((-g.damkohler * k) / 20)]),
    },
  ],
});
