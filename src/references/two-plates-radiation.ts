import { reference } from './define.ts';

const stefanBoltzmann = 5.670374419e-8;

export const twoPlatesRadiation = reference('two-plates-radiation', {
  title: 'Radiation between two large plates, with shields',
  kind: 'exact',
  assumes: ['grey diffuse surfaces', 'plates large against their distance', 'transparent gas', 'shields alike, with one emissivity on both sides'],
  verifies: ['surface radiation', 'balance of a radiating wall'],
  source: 'network of surface and space resistances; Stefan-Boltzmann constant: CODATA 2018',
  uncertainty: 0,
  passLimit: 0.02,
  ifMissed: 'absolute temperatures; emissivities on the right faces; number of rays or of angles',
  flows: ['side-heated-cavity'],
  needs: [
    { id: 'hotTemperature', unit: 'K', name: 'temperature of the hot plate' }, { id: 'coldTemperature', unit: 'K', name: 'temperature of the cold plate' },
    { id: 'emissivity1', unit: '1', name: 'emissivity of the hot plate', range: [0, 1] }, { id: 'emissivity2', unit: '1', name: 'emissivity of the cold plate', range: [0, 1] },
    { id: 'shields', unit: '1', name: 'number of shields', default: 0, sign: 'not-negative' }, { id: 'shieldEmissivity', unit: '1', name: 'emissivity of the shields', default: 1, range: [0, 1] },
  ],
  values: [
    {
      id: 'wallHeatFlux',
      name: 'radiated heat flux from the hot to the cold plate',
      unit: 'W/m^2',
      formula: 'q = sigma (T1^4 - T2^4)/[1/e1 + 1/e2 - 1 + N (2/es - 1)]',
      value: (g) => (stefanBoltzmann * (g.hotTemperature ** 4 - g.coldTemperature ** 4)) / (1 / g.emissivity1 + 1 / g.emissivity2 - 1 + g.shields * (2 / g.shieldEmissivity - 1)),
    },
  ],
});
