import { reference } from './define.ts';
import { ductNusseltFlux } from './duct-series.ts';
import { ductNusselt } from './duct-table.ts';
import { pchip } from './kernels/index.ts';

let curve: ((aspect: number) => number) | undefined;

function atTemperature(aspect: number): number {
  curve ??= pchip(ductNusselt.map(([a]) => a), ductNusselt.map(([, nusselt]) => nusselt));
  return curve(aspect);
}

export const developedHeatDuct = reference('developed-heat-duct', {
  title: 'Developed laminar heat transfer in a rectangular duct',
  kind: 'exact',
  assumes: ['laminar', 'velocity and temperature developed', 'constant properties', 'no axial conduction', 'all four walls heated alike'],
  verifies: ['wall heat flux', 'advection and diffusion of heat', 'bulk temperature'],
  source: 'Shah and London, Laminar Flow Forced Convection in Ducts (1978), chapter VII; series and collocation',
  uncertainty: 0,
  order: 2,
  passLimit: 0.01,
  ifMissed: 'mean round the wall, corners included; bulk temperature weighted with the flow; all four walls heated alike',
  flows: ['duct'],
  needs: [{ id: 'aspectRatio', unit: '1', name: 'short side over long side', range: [1e-6, 1] }],
  values: [
    { id: 'nusselt', name: 'Nusselt number on the hydraulic diameter, wall temperature uniform', unit: '1', formula: 'eigenvalue, tabulated over a', value: (g) => atTemperature(g.aspectRatio), uncertainty: 1e-4 },
    { id: 'nusseltUniformFlux', name: 'Nusselt number on the hydraulic diameter, flux uniform along and temperature uniform round the duct (H1)', unit: '1', formula: 'Nu = u_m D_h^2/(4 theta_b), sine series', value: (g) => ductNusseltFlux(g.aspectRatio) },
  ],
});
