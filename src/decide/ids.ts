/** Effects in the order in which a plan lists them. */
export const effectIds: readonly string[] = [
  'turbulence', 'transition', 'buoyancy', 'buoyancy-driven', 'variable-density', 'nonlinear-density', 'turbulence-buoyancy', 'compressibility',
  'closed-gas-pressure', 'tall-column', 'acoustics', 'real-gas', 'variable-viscosity', 'variable-conductivity', 'variable-heat-capacity',
  'viscous-heating', 'pressure-work', 'radiation', 'participating-radiation', 'turbulence-radiation', 'conjugate', 'wall-axial-conduction',
  'axial-conduction', 'entrance-effects', 'unsteadiness', 'imposed-unsteadiness', 'three-dimensionality', 'secondary-flow', 'swirl', 'rotation',
  'roughness', 'blockage', 'species', 'stefan-flow', 'soret', 'dufour', 'double-diffusion', 'dispersion', 'reaction', 'heat-of-reaction',
  'turbulence-chemistry', 'surface-reaction', 'pore-diffusion', 'film-reaction', 'non-newtonian', 'viscoelasticity', 'particle-inertia',
  'particle-coupling', 'settling', 'drop-breakup', 'free-surface', 'surface-tension', 'marangoni', 'cavitation', 'boiling', 'condensation',
  'evaporation', 'freezing', 'rarefaction', 'electrokinetics', 'magnetic', 'porous-inertia', 'porous-two-temperature',
];

/** Read before all others in each pass, in this order; the rest follow in the order of the list. */
const readFirst: readonly string[] = ['turbulence', 'transition', 'buoyancy', 'buoyancy-driven', 'variable-density', 'nonlinear-density', 'variable-viscosity', 'radiation'];

/** Option words of the choices, in the order in which a plan lists the choices. */
const optionWords: Readonly<Record<string, readonly string[]>> = {
  closure: ['none', 'k-epsilon', 'k-epsilon-variant', 'k-epsilon-low-re', 'k-omega', 'sst', 'one-equation', 'reynolds-stress', 'transition'],
  'second-closure': ['none', 'k-epsilon', 'k-epsilon-variant', 'k-epsilon-low-re', 'k-omega', 'sst', 'one-equation', 'reynolds-stress', 'transition'],
  'turbulence-treatment': ['none', 'rans', 'hybrid', 'wall-modelled-les', 'les', 'dns'],
  'near-wall-treatment': ['none', 'resolved', 'blended', 'law-of-the-wall', 'rough-law'],
  'turbulent-prandtl': ['none', 'constant', 'sweep', 'variable'],
  'inlet-turbulence': ['none', 'default', 'sweep', 'given'],
  'density-law': ['none', 'constant', 'boussinesq', 'extended-boussinesq', 'temperature', 'temperature-and-pressure'],
  'dimension-and-cuts': cutWords(),
  'run-character': ['none', 'steady', 'march', 'transient'],
  'mesh-topology': ['none', 'structured', 'block-structured', 'unstructured', 'hybrid', 'cut-cell', 'overlapping'],
  'solution-order': ['none', 'chain', 'segregated', 'block', 'monolithic'],
  'convection-scheme': ['none', 'upwind-1', 'upwind-2', 'upwind-3', 'central-2', 'central-4', 'blended', 'limited', 'shock-capturing'],
  'time-scheme': ['none', 'implicit-1', 'crank-nicolson', 'backward-2', 'implicit-runge-kutta-2', 'explicit-runge-kutta-3', 'explicit-runge-kutta-4', 'adams-bashforth-2'],
  precision: ['none', 'single', 'mixed', 'double'],
};
export const choiceIds: readonly string[] = Object.keys(optionWords);
/** The option words of a choice; undefined for one that a rule pack brings. */
export const optionsOf = (choice: string): readonly string[] | undefined => (choiceIds.includes(choice) ? optionWords[choice] : undefined);

/** A dimension, or any cuts joined by +, in the order in which a case lists them. */
function cutWords(): string[] {
  const cuts = ['two-dimensional', 'axisymmetric', 'mirror-left-right', 'mirror-top-bottom', 'periodic-along-flow', 'periodic-along-span'];
  const words = ['none', 'three-dimensional'];
  for (let set = 1; set < 2 ** cuts.length; set++) words.push(cuts.filter((_, k) => (set & (1 << k)) !== 0).join('+'));
  return words;
}

/** Choices are read so that each finds those it rests on decided; what is left is settled by a second reading. */
const choicesRead: readonly string[] = ['density-law', 'turbulence-treatment', 'closure', 'second-closure', 'near-wall-treatment', 'turbulent-prandtl', 'inlet-turbulence', 'dimension-and-cuts', 'run-character'];

/** The known ids, each once, then those of rule packs by name. */
export const inOrder = (ids: readonly string[], known: readonly string[]): string[] => [...known, ...ids.filter((id) => !known.includes(id)).sort()];
/** Ids in the order of reading. */
export const effectsInReadingOrder = (ids: readonly string[]): string[] => inOrder(ids, [...readFirst, ...effectIds.filter((id) => !readFirst.includes(id))]);
export const choicesInReadingOrder = (ids: readonly string[]): string[] => inOrder(ids, [...choicesRead, ...choiceIds.filter((id) => !choicesRead.includes(id))]);

/** A title for a decision that no rule file names: its id in words. */
export const titleOf = (id: string): string => `${id.charAt(0).toUpperCase()}${id.slice(1).replaceAll('-', ' ')}`;
