import { reference } from './define.ts';

export const slipPipe = reference('slip-pipe', {
  title: 'Slip flow of a gas in a fine pipe',
  kind: 'exact',
  assumes: ['laminar', 'developed', 'constant density over the stretch', 'full accommodation of tangential momentum', 'first-order slip'],
  verifies: ['slip condition', 'pressure gradient'],
  source: 'Maxwell 1879; quadrature of the momentum balance with the slip speed lambda du/dn at the wall',
  uncertainty: 0,
  order: 2,
  passLimit: 0.01,
  ifMissed: 'Knudsen number on the diameter; mean free path at the local pressure; slip on every wall',
  flows: ['pipe'],
  needs: [{ id: 'knudsen', unit: '1', name: 'Knudsen number, mean free path over the diameter', range: [0, 0.1], sign: 'not-negative' }],
  values: [
    { id: 'flowOverNoSlip', name: 'flow over that without slip at the same pressure gradient', unit: '1', formula: '1 + 8 Kn, Kn = lambda/D', value: (g) => 1 + 8 * g.knudsen },
    { id: 'frictionTimesReynolds', name: 'Darcy friction factor times Reynolds number', unit: '1', formula: 'f Re = 64/(1 + 8 Kn)', value: (g) => 64 / (1 + 8 * g.knudsen) },
  ],
});
