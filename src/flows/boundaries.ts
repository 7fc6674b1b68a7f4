import type { When } from '../workings/index.ts';
import type { Boundary, Condition, Conditions } from './define.ts';

/** Boundaries that many flows share. A flow lists them with its names and adds its own. */
type Part = Partial<Omit<Boundary, 'name'>>;

const arriving: Conditions = [
  { says: 'value: k {turbulentKineticEnergy}, with epsilon {dissipationRate} or omega {specificDissipationRate}' },
  { says: 'value of the stream that arrives' },
];
const small = 'no slope where it leaves; a low value, far below that of the layer, where it enters';

/** Where a given stream enters a passage. */
export function inlet(name = 'inlet', more: Part = {}): Boundary {
  return {
    name, is: 'inlet',
    velocity: [
      { says: 'follows from inside, along the normal: the fall of {drive.pressureDrop} drives it' },
      { says: 'value: developed profile with mean {speed}', when: { inletProfile: 'developed' } },
      { says: 'value: the given profile with mean {speed}', when: { inletProfile: ['power', 'log', 'table'] } },
      { says: 'value: even, {speed}; the profile develops inside, over {entranceLength}' },
      { says: 'value: even, {speed}' },
    ],
    pressure: [{ says: 'total pressure, {drive.pressureDrop} above the outlet' }, { says: 'no slope' }],
    temperature: [
      { says: 'total flux: what is carried less what is conducted equals the stream at {inletTemperature}', kept: 'axial-conduction' },
      { says: 'value {inletTemperature}' },
    ],
    turbulence: arriving,
    species: [
      { says: 'total flux of the stream that enters', kept: 'dispersion' },
      { says: 'total flux: what is carried less what diffuses equals the stream, mass share {massFractionInlet}', kept: 'axial-conduction' },
      { says: 'value: the mass shares of each species', when: { 'has.severalSpecies': 'yes' } },
      { says: 'value, mass share {massFractionInlet}' },
      { says: 'value of the stream that enters' },
    ],
    ...more,
  };
}

/** Where the stream of a passage leaves. */
export function outlet(name = 'outlet', more: Part = {}): Boundary {
  return {
    name, is: 'outlet',
    velocity: 'leaves freely',
    pressure: [{ says: 'value {outletPressure}, as mean over the section' }, { says: 'value {pressure}, as mean over the section' }],
    temperature: [{ says: 'no slope; returns at {outletTemperature}', kept: 'buoyancy' }, { says: 'no slope' }],
    turbulence: 'no slope',
    species: 'no slope; returns at the mean of the section',
    ...more,
  };
}

/** The undisturbed stream of a body. */
export function stream(name = 'inlet', more: Part = {}): Boundary {
  return inlet(name, { velocity: 'value {speed}, even', pressure: 'no slope', temperature: 'value {farTemperature}', ...more });
}

/**
 * A wall.
 *
 * @param name   its name in the table
 * @param place  place of its quantities, such as `walls.left`
 * @param more   what differs
 * @returns      row with slip, roughness, thermal kind and wall treatment as the case has them
 */
export function wall(name: string, place = 'wall', more: Part = {}): Boundary {
  return {
    name, is: 'wall', place,
    velocity: [
      { says: `sticks to the moving wall: {${place}.speed} along it` },
      { says: 'slips by the jump law on its own gradient, with a mean free path of {meanFreePath}', kept: 'rarefaction' },
      { says: `sticks; rough, sand grain {sandGrain@${place}}`, kept: 'roughness' },
      { says: 'sticks' },
    ],
    pressure: 'no slope',
    temperature: thermal(place),
    turbulence: [
      { says: 'by the law of the rough wall, first node above the grain', when: { 'choice.near-wall-treatment': 'rough-law' } },
      { says: 'by the law of the wall: k no slope, epsilon or omega in the first cell from the law', when: { 'choice.near-wall-treatment': 'law-of-the-wall' } },
      { says: 'k = 0, omega or epsilon by the blended wall value', when: { 'choice.near-wall-treatment': 'blended' } },
      { says: 'k = 0, omega or epsilon by their values at the wall' },
    ],
    species: [
      { says: 'flux equal to the rate of the reaction at the surface', when: { 'has.surfaceReaction': 'yes' }, kept: 'surface-reaction' },
      { says: 'value: the mass share of each species that passes; the others tight', when: { 'has.speciesWall': 'yes', 'has.severalSpecies': 'yes' } },
      { says: 'value, mass share {massFractionWall}; the speed across the wall that its flux makes', when: { 'has.speciesWall': 'yes' }, kept: 'stefan-flow' },
      { says: 'value, mass share {massFractionWall}', when: { 'has.speciesWall': 'yes' } },
      { says: 'tight' },
    ],
    ...more,
  };
}

/** Thermal condition of a wall by what the case gives for it: never temperature and flux at once. */
function thermal(place: string): Condition[] {
  const kind = (word: string, face?: string): When => ({ [`wallKind@${place}`]: word, ...(face === undefined ? {} : { [`wallFace@${place}`]: face }) });
  return [
    { says: `same temperature and heat flux as the solid behind it; outer face at {outerTemperature@${place}}`, when: kind('temperature', 'outer'), kept: 'conjugate' },
    { says: `same temperature and heat flux as the solid behind it; outside {outerCoefficient@${place}} to {surroundingsTemperature}`, when: kind('coefficient'), kept: 'conjugate' },
    { says: 'same temperature and heat flux as the solid behind it; the outer face has the given flux', when: kind('flux'), kept: 'conjugate' },
    { says: `outer face at {outerTemperature@${place}} through a resistance of {wallResistance@${place}}`, when: kind('temperature', 'outer') },
    { says: `value {wallTemperature@${place}}`, when: kind('temperature') },
    { says: `flux {wallHeatFlux@${place}} into the fluid`, when: kind('flux') },
    { says: `film: {outerCoefficient@${place}} to {surroundingsTemperature} through a wall of {wallResistance@${place}}`, when: kind('coefficient') },
    { says: `film: {outerCoefficient@${place}} to {surroundingsTemperature}`, when: kind('coefficient') },
    { says: 'adiabatic' },
  ];
}

/** A far side through which still fluid is drawn in. */
export function entraining(name: string, more: Part = {}): Boundary {
  return {
    name, is: 'open',
    velocity: 'enters along the normal, drawn by the flow; leaves freely',
    pressure: 'total pressure of the surroundings where it enters, their static pressure where it leaves; without the hydrostatic part',
    temperature: 'enters at {farTemperature}, else no slope',
    turbulence: small,
    species: 'enters as the surroundings, else no slope',
    ...more,
  };
}

/** A far side at which the pressure of the surroundings stands and fluid may pass both ways. */
export function open(name: string, more: Part = {}): Boundary {
  return {
    name, is: 'open',
    velocity: 'leaves freely',
    pressure: 'value {pressure}, the level of the undisturbed fluid',
    temperature: 'no slope; returns at {farTemperature}',
    turbulence: 'no slope; returns at the value of the inlet',
    species: 'no slope; returns as the surroundings',
    ...more,
  };
}

/** A plane without a condition of the fluid's own: slips, nothing passes. */
export function slipping(name: string, more: Part = {}): Boundary {
  return { name, is: 'mirror', velocity: 'slips', pressure: 'no slope', temperature: 'no slope', turbulence: 'no slope', species: 'no slope', ...more };
}

/** The point that fixes the level of pressure in a closed region. */
export function level(name = 'one point', more: Part = {}): Boundary {
  return { name, is: 'point', velocity: 'no condition', pressure: 'reference: the solved pressure is 0 there, {pressure} absolute', temperature: 'no condition', turbulence: 'no condition', species: 'no condition', ...more };
}
