import { places, reference } from './define.ts';
import { conductivity } from './inputs.ts';

export const shellSphere = reference('shell-sphere', {
  title: 'Steady conduction through a spherical shell',
  kind: 'exact',
  assumes: ['steady', 'constant conductivity', 'no heat source', 'uniform surface temperatures'],
  verifies: ['conduction in curved coordinates', 'wall heat flux'],
  source: 'Fourier 1822',
  uncertainty: 0,
  order: 2,
  passLimit: 0.01,
  ifMissed: 'domain at least 50 diameters for an endless medium; cells graded towards the inner surface',
  flows: ['solid', 'sphere'],
  needs: [
    { id: 'innerRadius', unit: 'm', name: 'inner radius' }, { id: 'outerRadius', unit: 'm', name: 'outer radius' },
    { id: 'temperatureDifference', unit: 'K', name: 'inner minus outer surface temperature', sign: 'any' }, conductivity,
  ],
  values: [
    { id: 'heatFactor', name: 'heat times (1/r1 - 1/r2), over k dT', unit: '1', formula: 'Q (1/r1 - 1/r2)/(k dT) = 4 pi', value: () => 4 * Math.PI },
    { id: 'nusselt', name: 'Nusselt number on the diameter of a sphere in an endless medium at rest', unit: '1', formula: 'Nu = 2', value: () => 2 },
    { id: 'heatRate', name: 'heat through the shell', unit: 'W', formula: '4 pi k dT/(1/r1 - 1/r2)', value: (g) => (4 * Math.PI * g.thermalConductivity * g.temperatureDifference) / (1 / g.innerRadius - 1 / g.outerRadius) },
  ],
  tables: [
    {
      id: 'temperatureShape',
      title: 'Share of the temperature difference lost up to a radius',
      columns: [{ id: 'radius', name: 'r', unit: 'm' }, { id: 'temperature', name: '(T_inner - T)/(T_inner - T_outer)', unit: '1' }],
      rows: (g) => places(1, g.outerRadius / g.innerRadius, 10).map((r) => [r * g.innerRadius, (1 - 1 / r) / (1 - g.innerRadius / g.outerRadius)]),
    },
  ],
});
