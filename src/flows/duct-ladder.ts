import type { Rung } from './define.ts';

const behind = 'compare behind the entrance; shear taken round the whole wall; corners resolved';

/** Rectangular duct: exact series first, then the turbulent laws. */
export const ductLadder: Rung[] = [
  { reference: 'poiseuille-duct', changes: 'laminar at Re 100 in the own section, one temperature', compares: 'frictionTimesReynolds', with: { aspectRatio: 'ductAspectRatio' }, limit: 0.005, order: 2, ifMissed: behind },
  { reference: 'developed-heat-duct', changes: 'heat as a passenger, all sides at one temperature', compares: 'nusselt', with: { aspectRatio: 'ductAspectRatio' }, when: { energySolved: 'yes', wallKind: ['temperature', 'coefficient', 'adiabatic'] }, limit: 0.01, ifMissed: behind },
  { reference: 'developed-heat-duct', changes: 'heat as a passenger, one flux along and one temperature round', compares: 'nusseltUniformFlux', with: { aspectRatio: 'ductAspectRatio' }, when: { energySolved: 'yes', wallKind: 'flux' }, limit: 0.01, ifMissed: behind },
  { reference: 'slip-channel', changes: 'slip at the wall of a small gas passage', compares: 'flowOverNoSlip', with: { knudsen: 'knudsen' }, when: { passageScale: ['small', 'tiny'], medium: 'gas' }, limit: 0.01, ifMissed: 'slip law on the wall gradient; mean free path at the local pressure' },
  { reference: 'turbulent-pipe', changes: 'turbulent at the Reynolds number of the case on the laminar equivalent diameter, smooth', compares: 'frictionFactorDarcy', with: { reynolds: 'ductReynoldsEquivalent', prandtl: 'prandtlBulk' }, when: { regime: ['transitional', 'turbulent'] }, limit: 0.07, ifMissed: 'corner flow (closure), y+ against the wall treatment, developed length' },
  { reference: 'turbulent-pipe', changes: 'heat as a passenger of the turbulent flow', compares: 'nusselt', with: { reynolds: 'reynoldsBulk', prandtl: 'prandtlBulk' }, when: { regime: ['transitional', 'turbulent'], energySolved: 'yes' }, limit: 0.15, ifMissed: 'first point within the thermal sublayer; turbulent Prandtl number; corner flow' },
  { reference: 'turbulent-pipe', changes: 'the species as a passenger of the turbulent flow: Sc in place of Pr, Nu reads Sh', compares: 'nusselt', with: { reynolds: 'reynoldsBulk', prandtl: 'schmidtBulk' }, when: { 'has.species': 'yes', 'has.speciesWall': 'yes', regime: ['transitional', 'turbulent'] }, limit: 0.15, ifMissed: 'first point within the sublayer of the species; turbulent Schmidt number' },
];
