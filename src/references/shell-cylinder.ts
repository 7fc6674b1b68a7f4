import { places, reference } from './define.ts';
import { conductivity } from './inputs.ts';

export const shellCylinder = reference('shell-cylinder', {
  title: 'Steady conduction through a cylindrical shell',
  kind: 'exact',
  assumes: ['steady', 'constant conductivity', 'no heat source', 'uniform surface temperatures'],
  verifies: ['conduction in curved coordinates', 'wall heat flux'],
  source: 'Fourier 1822',
  uncertainty: 0,
  order: 2,
  passLimit: 0.005,
  ifMissed: 'heat per length of the axis; cells graded towards the inner surface',
  flows: ['solid', 'cylinder'],
  needs: [
    { id: 'innerRadius', unit: 'm', name: 'inner radius' }, { id: 'outerRadius', unit: 'm', name: 'outer radius' },
    { id: 'temperatureDifference', unit: 'K', name: 'inner minus outer surface temperature', sign: 'any' }, conductivity,
  ],
  values: [
    { id: 'heatFactor', name: 'heat per length times ln(r2/r1), over k dT', unit: '1', formula: "Q' ln(r2/r1)/(k dT) = 2 pi", value: () => 2 * Math.PI },
    { id: 'heatPerLength', name: 'heat per length through the shell', unit: 'W/m', formula: '2 pi k dT/ln(r2/r1)', value: (g) => (2 * Math.PI * g.thermalConductivity * g.temperatureDifference) / Math.log(g.outerRadius / g.innerRadius) },
  ],
  tables: [
    {
      id: 'temperatureShape',
      title: 'Share of the temperature difference lost up to a radius',
      columns: [{ id: 'radius', name: 'r', unit: 'm' }, { id: 'temperature', name: '(T_inner - T)/(T_inner - T_outer)', unit: '1' }],
      rows: (g) => places(1, g.outerRadius / g.innerRadius, 10).map((r) => [r * g.innerRadius, Math.log(r) / Math.log(g.outerRadius / g.innerRadius)]),
    },
  ],
});
