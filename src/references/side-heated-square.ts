import { reference } from './define.ts';
import { at } from './kernels/index.ts';

const rayleighs = [1e3, 1e4, 1e5, 1e6, 1e7, 1e8] as const;

/** Numbers by Rayleigh number; a dash of the source is undefined. */
const rows: Readonly<Record<string, readonly (number | undefined)[]>> = {
  nusselt: [1.118, 2.243, 4.519, 8.825, 16.523, 30.225],
  nusseltMax: [1.505, 3.528, 7.717, 17.536],
  nusseltMin: [0.692, 0.586, 0.729, 0.97946],
  streamMiddle: [1.174, 5.071, 9.111, 16.32, 29.361],
  speedLevel: [3.649, 16.178, 34.73, 64.63, 148.59],
  speedUp: [3.697, 19.617, 68.59, 219.36],
};
const published1983: Readonly<Record<string, readonly number[]>> = { nusselt: [1.118, 2.243, 4.519, 8.8], nusseltMax: [1.505, 3.528, 7.717, 17.925], nusseltMin: [0.692, 0.586, 0.729, 0.989] };

function held(row: string, rayleigh: number): number | undefined {
  const i = rayleighs.findIndex((anchor) => Math.abs(rayleigh / anchor - 1) <= 0.005);
  return at(rows[row] as readonly (number | undefined)[], i);
}

function scaled(row: string, rayleigh: number, scale: number): number | undefined {
  const number = held(row, rayleigh);
  return number === undefined ? undefined : number * scale;
}

const spread = ({ rayleigh }: { readonly rayleigh: number }): number => (rayleigh < 5e4 ? 0.003 : rayleigh < 5e5 ? 0.004 : rayleigh < 5e6 ? 0.006 : 0.01);

export const sideHeatedSquare = reference('side-heated-square', {
  title: 'Square cavity of air heated from one side',
  kind: 'benchmark',
  assumes: ['two-dimensional', 'steady', 'Pr 0.71', 'density linear in temperature and only in the weight', 'level walls adiabatic', 'side walls at two temperatures', 'no radiation'],
  verifies: ['buoyancy', 'wall heat flux', 'coupling of temperature and momentum'],
  source: 'de Vahl Davis, Int. J. Numer. Methods Fluids 3 (1983) 249-264 (Ra 1e3 to 1e5, speeds and stream function at 1e6); Le Quere, Comput. Fluids 20 (1991) 29-41 (Ra 1e6 to 1e8)',
  uncertainty: 0.003,
  order: 2,
  passLimit: 0.01,
  ifMissed: 'Pr 0.71, small temperature difference or the linear density law, adiabatic floor and lid, wall cells small enough for the peak of the wall flux, no radiation',
  notes: [
    'At Ra 1e6 the paper of 1983 prints 17.925 for the largest local Nusselt number, 2 % high, 0.989 for the smallest and 8.800 for the mean; the numbers of 1991 are held: 17.536, 0.97946 and 8.825.',
    'The flow is known at these Rayleigh numbers only; air turns unsteady at about 1.8e8.',
  ],
  flows: ['side-heated-cavity', 'open-cavity'],
  needs: [{ id: 'rayleigh', unit: '1', name: 'Rayleigh number on the side', anchors: rayleighs }, { id: 'thermalDiffusivity', unit: 'm^2/s', name: 'thermal diffusivity' }, { id: 'length', unit: 'm', name: 'side' }],
  values: [
    { id: 'nusselt', name: 'Nusselt number, mean over the hot wall', unit: '1', formula: 'table', value: (g) => held('nusselt', g.rayleigh), uncertainty: spread },
    { id: 'nusseltMax', name: 'largest local Nusselt number on the hot wall', unit: '1', formula: 'table', value: (g) => held('nusseltMax', g.rayleigh), uncertainty: spread },
    { id: 'nusseltMin', name: 'smallest local Nusselt number on the hot wall', unit: '1', formula: 'table', value: (g) => held('nusseltMin', g.rayleigh), uncertainty: spread },
    { id: 'streamMiddle', name: 'stream function in the middle over alpha', unit: '1', formula: 'table', value: (g) => held('streamMiddle', g.rayleigh), uncertainty: spread },
    { id: 'speedLevelScaled', name: 'largest level speed on the upright mid-line times L/alpha', unit: '1', formula: 'table', value: (g) => held('speedLevel', g.rayleigh), uncertainty: spread },
    { id: 'speedUpScaled', name: 'largest upward speed on the level mid-line times L/alpha', unit: '1', formula: 'table', value: (g) => held('speedUp', g.rayleigh), uncertainty: spread },
    { id: 'speedLevel', name: 'largest level speed on the upright mid-line', unit: 'm/s', formula: 'table times alpha/L', value: (g) => scaled('speedLevel', g.rayleigh, g.thermalDiffusivity / g.length), uncertainty: spread },
    { id: 'speedUp', name: 'largest upward speed on the level mid-line', unit: 'm/s', formula: 'table times alpha/L', value: (g) => scaled('speedUp', g.rayleigh, g.thermalDiffusivity / g.length), uncertainty: spread },
  ],
  tables: [
    {
      id: 'numbers',
      title: 'Numbers held, by Rayleigh number (speeds and stream function in units of alpha/L and alpha)',
      columns: [
        { id: 'rayleigh', name: 'Ra', unit: '1' }, { id: 'nusselt', name: 'Nu mean', unit: '1' }, { id: 'nusseltMax', name: 'Nu largest', unit: '1' },
        { id: 'nusseltMin', name: 'Nu smallest', unit: '1' }, { id: 'streamMiddle', name: 'psi/alpha', unit: '1' }, { id: 'speedLevelScaled', name: 'u L/alpha', unit: '1' }, { id: 'speedUpScaled', name: 'v L/alpha', unit: '1' },
      ],
      rows: () => rayleighs.slice(0, 4).map((rayleigh) => [rayleigh, ...['nusselt', 'nusseltMax', 'nusseltMin', 'streamMiddle', 'speedLevel', 'speedUp'].map((row) => held(row, rayleigh) as number)]),
    },
    {
      id: 'numbersOf1983',
      title: 'Nusselt numbers as the paper of 1983 prints them',
      columns: [{ id: 'rayleigh', name: 'Ra', unit: '1' }, { id: 'nusselt', name: 'Nu mean', unit: '1' }, { id: 'nusseltMax', name: 'Nu largest', unit: '1' }, { id: 'nusseltMin', name: 'Nu smallest', unit: '1' }],
      rows: () => rayleighs.slice(0, 4).map((rayleigh, i) => [rayleigh, ...['nusselt', 'nusseltMax', 'nusseltMin'].map((row) => at(published1983[row] as readonly number[], i))]),
      note: 'for comparison with older work: the largest local number at Ra 1e6 is 2 % high',
    },
  ],
});
