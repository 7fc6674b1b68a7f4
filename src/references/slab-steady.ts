import { places, reference } from './define.ts';

interface Slab { readonly faceTemperature1: number; readonly faceTemperature2: number; readonly thickness: number; readonly thermalConductivity: number; readonly conductivitySlope: number; readonly conductivityAt: number }

/** Integral of the conductivity from the reference temperature, k = k0 [1 + b (T - T0)]. */
const potential = (g: Slab, temperature: number): number => {
  const above = temperature - g.conductivityAt;
  return g.thermalConductivity * above * (1 + (g.conductivitySlope * above) / 2);
};

function temperatureAt(g: Slab, share: number): number {
  const wanted = (1 - share) * potential(g, g.faceTemperature1) + share * potential(g, g.faceTemperature2);
  const b = g.conductivitySlope, x = wanted / g.thermalConductivity;
  return g.conductivityAt + (2 * x) / (1 + Math.sqrt(1 + 2 * b * x));
}

export const slabSteady = reference('slab-steady', {
  title: 'Steady conduction through a plane wall',
  kind: 'exact',
  assumes: ['steady', 'one-dimensional', 'no heat source', 'conductivity constant or linear in temperature'],
  verifies: ['conduction', 'wall conditions of each kind', 'continuity of flux'],
  source: 'Fourier 1822; Kirchhoff transformation for variable conductivity',
  uncertainty: 0,
  order: 2,
  passLimit: 0.005,
  ifMissed: 'conductivity of the solid and not of the fluid; face or cell centre; surface coefficients on the right side',
  flows: ['solid', 'side-heated-cavity'],
  needs: [
    { id: 'faceTemperature1', unit: 'K', name: 'temperature of the first face' }, { id: 'faceTemperature2', unit: 'K', name: 'temperature of the second face' },
    { id: 'fluidTemperature1', unit: 'K', name: 'temperature of the fluid at the first face' }, { id: 'fluidTemperature2', unit: 'K', name: 'temperature of the fluid at the second face' },
    { id: 'transfer1', unit: 'W/(m^2 K)', name: 'heat transfer coefficient at the first face' }, { id: 'transfer2', unit: 'W/(m^2 K)', name: 'heat transfer coefficient at the second face' },
    { id: 'thickness', unit: 'm', name: 'thickness' }, { id: 'thermalConductivity', unit: 'W/(m K)', name: 'thermal conductivity' },
    { id: 'conductivitySlope', unit: '1/K', name: 'relative slope of the conductivity', default: 0, sign: 'any' }, { id: 'conductivityAt', unit: 'K', name: 'temperature at which the conductivity is given', default: 293.15 },
  ],
  values: [
    { id: 'nusselt', name: 'Nusselt number of a layer at rest on its thickness', unit: '1', formula: 'Nu = 1', value: () => 1 },
    { id: 'wallHeatFlux', name: 'heat flux between the faces', unit: 'W/m^2', formula: 'q = (k0/L)[dT + b ((T1 - T0)^2 - (T2 - T0)^2)/2]', value: (g) => (potential(g, g.faceTemperature1) - potential(g, g.faceTemperature2)) / g.thickness },
    { id: 'wallHeatFluxBetweenFluids', name: 'heat flux between the fluids', unit: 'W/m^2', formula: 'q = (T1 - T2)/(1/h1 + L/k + 1/h2)', value: (g) => (g.fluidTemperature1 - g.fluidTemperature2) / (1 / g.transfer1 + g.thickness / g.thermalConductivity + 1 / g.transfer2) },
  ],
  tables: [
    {
      id: 'temperature',
      title: 'Temperature through the wall',
      columns: [{ id: 'distance', name: 'x from the first face', unit: 'm' }, { id: 'temperature', name: 'T', unit: 'K' }],
      rows: (g) => places(0, 1, 10).map((share) => [share * g.thickness, temperatureAt(g, share)]),
    },
  ],
});
