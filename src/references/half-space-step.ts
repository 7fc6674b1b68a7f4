import { places, reference } from './define.ts';
import { conductivity, diffusivity, time, transfer } from './inputs.ts';
import { erfc, erfcScaled } from './kernels/index.ts';

export const halfSpaceStep = reference('half-space-step', {
  title: 'Half-space whose surface temperature is changed at once',
  kind: 'exact',
  assumes: ['one-dimensional', 'constant properties', 'uniform start temperature', 'body deep against sqrt(alpha t)'],
  verifies: ['conduction', 'time accuracy', 'wall heat flux of a sudden change'],
  source: 'Carslaw and Jaeger, Conduction of Heat in Solids, 2nd ed. (1959), chapter II',
  uncertainty: 0,
  order: 2,
  passLimit: 0.005,
  ifMissed: 'first steps small against the square of the first cell over alpha; depth of the domain at least 4 sqrt(alpha t)',
  flows: ['solid', 'plate'],
  needs: [
    { id: 'startTemperature', unit: 'K', name: 'start temperature' }, { id: 'wallTemperature', unit: 'K', name: 'temperature of the surface, or of the fluid at it' },
    diffusivity, conductivity, time, { id: 'depth', unit: 'm', name: 'depth below the surface', sign: 'not-negative' }, transfer,
  ],
  values: [
    { id: 'penetrationFactor', name: 'depth that 1 % of the change has reached, over sqrt(alpha t)', unit: '1', formula: 'erfc(x/2) = 0.01', value: () => 3.6427727, uncertainty: 1e-7 },
    { id: 'temperatureRatio', name: 'share of the surface change that has arrived at the depth', unit: '1', formula: 'erfc(x/(2 sqrt(alpha t)))', value: (g) => erfc(g.depth / (2 * Math.sqrt(g.thermalDiffusivity * g.time))) },
    { id: 'temperature', name: 'temperature at the depth', unit: 'K', formula: 'T = T_i + (T_w - T_i) erfc(x/(2 sqrt(alpha t)))', value: (g) => g.startTemperature + (g.wallTemperature - g.startTemperature) * erfc(g.depth / (2 * Math.sqrt(g.thermalDiffusivity * g.time))) },
    { id: 'wallHeatFlux', name: 'heat flux into the body at the surface', unit: 'W/m^2', formula: 'q = k (T_w - T_i)/sqrt(pi alpha t)', value: (g) => (g.thermalConductivity * (g.wallTemperature - g.startTemperature)) / Math.sqrt(Math.PI * g.thermalDiffusivity * g.time) },
    {
      id: 'temperatureRatioTransfer',
      name: 'share that has arrived at the depth where the surface meets a fluid',
      unit: '1',
      formula: 'erfc(n) - exp(h x/k + h^2 alpha t/k^2) erfc(n + h sqrt(alpha t)/k), n = x/(2 sqrt(alpha t))',
      value: (g) => {
        const root = Math.sqrt(g.thermalDiffusivity * g.time), n = g.depth / (2 * root), b = (g.heatTransferCoefficient * root) / g.thermalConductivity;
        return erfc(n) - Math.exp(-n * n) * erfcScaled(n + b);
      },
    },
    { id: 'penetrationDepth', name: 'depth that 1 % of the change has reached', unit: 'm', formula: '3.642773 sqrt(alpha t)', value: (g) => 3.6427727 * Math.sqrt(g.thermalDiffusivity * g.time), uncertainty: 1e-7 },
  ],
  tables: [
    {
      id: 'temperatureShape',
      title: 'Share of the surface change over the depth',
      columns: [{ id: 'depth', name: 'x/(2 sqrt(alpha t))', unit: '1' }, { id: 'temperature', name: '(T - T_i)/(T_w - T_i)', unit: '1' }],
      rows: () => places(0, 2.5, 20).map((x) => [x, erfc(x)]),
    },
    {
      id: 'temperature',
      title: 'Temperature over the depth',
      columns: [{ id: 'depth', name: 'x', unit: 'm' }, { id: 'temperature', name: 'T', unit: 'K' }],
      rows: (g) => places(0, 2.5, 20).map((x) => [2 * x * Math.sqrt(g.thermalDiffusivity * g.time), g.startTemperature + (g.wallTemperature - g.startTemperature) * erfc(x)]),
    },
  ],
});
