import { reference } from './define.ts';
import { channelLambda } from './graetz-constants.ts';
import { at } from './kernels/index.ts';

export const developedHeatChannel = reference('developed-heat-channel', {
  title: 'Developed laminar heat transfer between parallel plates',
  kind: 'exact',
  assumes: ['laminar', 'velocity and temperature developed', 'constant properties', 'no axial conduction', 'no heat from friction'],
  verifies: ['wall heat flux', 'advection and diffusion of heat', 'bulk temperature'],
  source: 'Shah and London, Laminar Flow Forced Convection in Ducts (1978), chapter VI',
  uncertainty: 0,
  order: 2,
  passLimit: 0.005,
  ifMissed: 'the length scale is twice the gap; bulk temperature weighted with the flow; compare behind the thermal entrance',
  flows: ['channel'],
  needs: [],
  values: [
    { id: 'nusselt', name: 'Nusselt number on twice the gap, both walls at one temperature', unit: '1', formula: 'Nu = (8/3) lambda_0^2', value: () => (8 / 3) * at(channelLambda, 0) ** 2 },
    { id: 'nusseltUniformFlux', name: 'Nusselt number on twice the gap, one flux through both walls', unit: '1', formula: 'Nu = 140/17', value: () => 140 / 17 },
    { id: 'nusseltOneSideTemperature', name: 'Nusselt number on twice the gap, one wall at a temperature, the other adiabatic', unit: '1', formula: 'eigenvalue', value: () => 4.860736778941 },
    { id: 'nusseltOneSideFlux', name: 'Nusselt number on twice the gap, flux through one wall, the other adiabatic', unit: '1', formula: 'Nu = 70/13', value: () => 70 / 13 },
  ],
});
