import type { Rung } from './define.ts';

const standing = { plateSetting: ['upright', 'inclined'] };
const level = { plateSetting: ['unstable', 'stable'] };
const layers = { regime: ['transitional', 'turbulent'] };

/** From the Blasius layer to the heated turbulent plate; in still fluid from conduction to the buoyant layer. */
export const plateLadder: Rung[] = [
  { reference: 'blasius-plate', changes: 'laminar at Re 1e5, one temperature, two-dimensional', compares: 'displacementFactor', with: {}, when: { plateSetting: 'stream' }, limit: 0.01, order: 2, ifMissed: 'leave out the first 5 %; slip ahead of the edge; height of the domain; cells in the layer' },
  { reference: 'blasius-plate', changes: 'the same, skin friction of the laminar layer at the Reynolds number of the case', compares: 'skinFrictionCoefficient', with: { reynolds: 'reynolds' }, when: { plateSetting: 'stream', regime: 'laminar' }, limit: 0.01, order: 2, ifMissed: 'wall gradient one-sided; displacement of the stream by the layer' },
  { reference: 'pohlhausen-plate', changes: 'heat as a passenger, wall temperature uniform', compares: 'heatSimilar', with: { prandtl: 'prandtlFilm' }, when: { plateSetting: 'stream', energySolved: 'yes' }, limit: 0.01, order: 2, ifMissed: 'properties at the film temperature; cells in the thermal layer' },
  { reference: 'stefan-tube', changes: 'the species crosses a layer at rest, with the wind it makes', compares: 'fluxFactor', with: { massFractionWall: 'massFractionWall', massFractionFar: 'massFractionInlet' }, when: { 'has.species': 'yes', 'has.speciesWall': 'yes' }, limit: 0.01, order: 2, ifMissed: 'speed away from the wall by the diffusive flux; shares by mass, not by moles' },
  { reference: 'pohlhausen-plate', changes: 'the species as a passenger, one share along the wall: Sc in place of Pr, Nu reads Sh', compares: 'heatSimilar', with: { prandtl: 'schmidtFilm' }, when: { 'has.species': 'yes', 'has.speciesWall': 'yes', plateSetting: 'stream' }, limit: 0.01, order: 2, ifMissed: 'cells in the layer of the species; share at the wall by mass, not by moles' },
  { reference: 'turbulent-plate', changes: 'turbulent from the edge at the Reynolds number of the case, one temperature', compares: 'skinFrictionCoefficientSecond', with: { reynolds: 'reynolds' }, when: { plateSetting: 'stream', ...layers }, limit: 0.05, ifMissed: 'y+ against the wall treatment; closure; turbulence of the stream; White lies up to 6 % above averaged closures' },
  { reference: 'half-space-step', changes: 'conduction into fluid at rest until the layer of the case is reached', compares: 'penetrationDepth', with: { thermalDiffusivity: 'thermalDiffusivity', time: 'plateConductionTime' }, when: { plateSetting: ['upright', 'inclined', 'unstable', 'stable'] }, limit: 0.005, order: 2, ifMissed: 'time step of the first instants; cells at the wall' },
  { reference: 'upright-plate-similarity', changes: 'laminar layer at Gr 1e6, linear density law', compares: 'heatSimilar', with: { prandtl: 'prandtl' }, when: standing, limit: 0.01, order: 2, ifMissed: 'open boundaries: total pressure in, static out; width ten layers; first 5 % left out' },
  { reference: 'upright-plate-similarity', changes: 'the same, wall shear', compares: 'wallShearSimilar', with: { prandtl: 'prandtl' }, when: { ...standing, regime: 'laminar' }, limit: 0.01, order: 2, ifMissed: 'first point at 0.04 f\'\'(0) in eta: the shear bends far faster than the heat flux' },
  { reference: 'rayleigh-benard-onset', changes: 'growth and decay either side of the onset in a layer heated from below', compares: 'criticalRayleigh', with: {}, when: level, limit: 0.01, ifMissed: 'sign of gravity against the density law; damping of the scheme' },
];
