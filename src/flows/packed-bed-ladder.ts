import type { Rung } from './define.ts';

/** A bed taken as a continuum: drag first, then transfer. */
export const packedBedLadder: Rung[] = [
  { reference: 'darcy-layer', changes: 'viscous drag alone, slow flow through the bed', compares: 'speed', with: { permeability: 'packedBedPermeability', viscosity: 'viscosityBulk', pressureGradient: 'packedBedGradientViscous' }, limit: 0.005, ifMissed: 'resistance entered per direction; superficial and not pore speed in the drag' },
  { reference: 'ergun-bed', changes: 'inertia of the pores added, own speed', compares: 'pressureGradient', with: { voidFraction: 'packedBedVoidFraction', length: 'sizes.particleDiameter', speed: 'speed', density: 'density', viscosity: 'viscosity' }, limit: 0.2, ifMissed: 'void fraction cubed in the drag; wall layer below 20 particles across' },
  { reference: 'sphere-drag', changes: 'one particle alone, resolved, where particles are resolved', compares: 'dragCoefficient', with: { reynolds: 'reynolds' }, limit: 0.05, ifMissed: 'domain at least 20 particles wide; cells in the layer' },
  { reference: 'dispersed-reactor', changes: 'the reaction along the bed with spreading, one temperature', compares: 'conversion', with: { damkohler: 'damkohler', bodenstein: 'bodenstein' }, when: { 'has.reactions': 'yes', orderKind: 'first' }, limit: 0.01, ifMissed: 'total flux at the inlet; numerical diffusion against the spreading of the bed' },
];
