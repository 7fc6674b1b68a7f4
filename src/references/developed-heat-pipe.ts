import { reference } from './define.ts';
import { pipeLambda } from './graetz-constants.ts';
import { at } from './kernels/index.ts';

const besselZero = 2.404825557695773; // first zero of J0

export const developedHeatPipe = reference('developed-heat-pipe', {
  title: 'Developed laminar heat transfer in a round pipe',
  kind: 'exact',
  assumes: ['laminar', 'velocity and temperature developed', 'constant properties', 'no axial conduction', 'no heat from friction'],
  verifies: ['wall heat flux', 'advection and diffusion of heat', 'bulk temperature'],
  source: 'Graetz 1883; Shah and London, Laminar Flow Forced Convection in Ducts (1978), chapter V',
  uncertainty: 0,
  order: 2,
  passLimit: 0.005,
  ifMissed: 'bulk temperature is weighted with the flow, not with the area; compare behind the thermal entrance',
  flows: ['pipe'],
  needs: [],
  values: [
    { id: 'nusselt', name: 'Nusselt number, wall temperature uniform', unit: '1', formula: 'Nu = lambda_0^2/2', value: () => at(pipeLambda, 0) ** 2 / 2 },
    { id: 'nusseltUniformFlux', name: 'Nusselt number, wall flux uniform', unit: '1', formula: 'Nu = 48/11', value: () => 48 / 11 },
    { id: 'nusseltPlugTemperature', name: 'Nusselt number of plug flow, wall temperature uniform', unit: '1', formula: 'Nu = j_01^2', value: () => besselZero ** 2 },
    { id: 'nusseltPlugFlux', name: 'Nusselt number of plug flow, wall flux uniform', unit: '1', formula: 'Nu = 8', value: () => 8 },
  ],
});
