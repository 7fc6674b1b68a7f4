import type { Need } from './define.ts';

// Inputs that several references share. Lengths and speeds are the scales of the flow (diameter of a pipe, twice the gap of a channel).
export const reynolds = { id: 'reynolds', unit: '1', name: 'Reynolds number' } as const satisfies Need;
export const prandtl = { id: 'prandtl', unit: '1', name: 'Prandtl number' } as const satisfies Need;
export const speed = { id: 'speed', unit: 'm/s', name: 'speed scale', sign: 'any' } as const satisfies Need;
export const length = { id: 'length', unit: 'm', name: 'length scale' } as const satisfies Need;
export const run = { id: 'flowLength', unit: 'm', name: 'length along the flow' } as const satisfies Need;
export const density = { id: 'density', unit: 'kg/m^3', name: 'density' } as const satisfies Need;
export const viscosity = { id: 'viscosity', unit: 'Pa s', name: 'dynamic viscosity' } as const satisfies Need;
export const kinematicViscosity = { id: 'kinematicViscosity', unit: 'm^2/s', name: 'kinematic viscosity' } as const satisfies Need;
export const conductivity = { id: 'thermalConductivity', unit: 'W/(m K)', name: 'thermal conductivity' } as const satisfies Need;
export const diffusivity = { id: 'thermalDiffusivity', unit: 'm^2/s', name: 'thermal diffusivity' } as const satisfies Need;
export const transfer = { id: 'heatTransferCoefficient', unit: 'W/(m^2 K)', name: 'heat transfer coefficient' } as const satisfies Need;
export const time = { id: 'time', unit: 's', name: 'time since the start' } as const satisfies Need;
