import type { Vocabulary, WordField } from '../case/index.ts';
import { choices } from './vocabulary-choices.ts';
import { angle, count, list, meanings, quantity, text, word } from './vocabulary-define.ts';
import { burning, computing, frame, ground, impeller, initial, magneticField, motion, packing, particles, porous, reactions, rheology, sources, species, time } from './vocabulary-features.ts';
import { flows, wallGroups } from './vocabulary-flows.ts';
import { fluid, otherFluid } from './vocabulary-fluid.ts';
import { drive, inlet, inlets, outlet } from './vocabulary-inlet.ts';
import { surroundings, wall, walls } from './vocabulary-walls.ts';

const upright = Math.PI / 2;
const bodies = ['plate', 'cylinder', 'sphere', 'building', 'bluff-body', 'aerofoil'];

/** Targets of which a bare % has three readings. */
const temperatures = ['temperature', ...['outlet', 'inlet', 'wall', 'outer', 'wetted', 'bulk', 'film', 'hot', 'cold', 'highest', 'lowest', 'reference', 'surroundings', 'far', 'saturation', 'melting'].map((one) => `${one}Temperature`)];

const flow: WordField = word('the configuration', 'pipe', Object.fromEntries(Object.entries(flows).map(([id, one]) => [id, one.title])), { required: true });

const targets = list('what the simulation shall answer, and how well', '[{ quantity: outletTemperature, place: outlet, mean: mass-flow, within: 1 K }]', {
  quantity: text('id of a quantity, or words', 'outletTemperature', { required: true }),
  place: text('where', 'outlet'),
  mean: word('which mean', 'mass-flow', { time: 'mean in time', area: 'mean over the area', 'mass-flow': 'mean weighted by the mass flow', peak: 'largest value', rms: 'rms of the fluctuation', none: 'the value itself' }),
  within: { kind: 'tolerance', doc: 'how near the answer must come', example: '1 K', of: 'quantity', temperatures },
});

/** Every key of a case file: the one description behind the reader, the JSON Schema and the template. */
export const vocabulary: Vocabulary = {
  keys: {
    format: quantity('format of the file', '1', '1', { name: 'format', whole: true }),
    title: text('title of the plan', 'Rinse water cooled in a jacketed line'),
    purpose: text('the question the simulation shall answer', 'Does the water leave the jacketed line below 50 degC?'),
    ifWrong: word('what a wrong answer would do', 'low', { low: 'some hours lost', medium: 'money or time lost', high: 'people or a plant hurt' }),
    targets,
    flow,
    sizes: { kind: 'sizes', doc: 'sizes of the flow', example: '{ diameter: 25 mm, length: 8 m }', required: true },
    inclination: angle('main direction against level', 'horizontal', { words: meanings({ horizontal: { doc: 'level', value: 0 }, upward: { doc: 'against gravity', value: upright }, downward: { doc: 'with gravity', value: -upright } }), atLeast: -upright, atMost: upright, gives: ['inclination'] }),
    fluid,
    inlet,
    inlets,
    outlet,
    drive,
    wall,
    walls,
    surroundings,
    initial,
    gravity: quantity('acceleration of free fall; 0 m/s^2 in free fall', 'm/s^2', '9.81 m/s^2', { name: 'acceleration', atLeast: 0, gives: ['gravity'] }),
    sources,
    motion,
    frame,
    species,
    reactions,
    particles,
    otherFluid,
    rheology,
    porous,
    packing,
    ground,
    impeller,
    burning,
    magneticField,
    parallel: count('number of equal passages side by side', '21', { gives: ['parallelPassages'], flows: ['pipe', 'duct', 'annulus', 'channel', 'coil', 'packed-bed'] }),
    incidence: angle('angle of the body to the stream', '4 deg', { words: meanings({ upward: { doc: 'against gravity: 90 deg for a plate', value: upright } }), flows: bodies }),
    facing: word('side of a level plate that is heated or cooled', 'up', { up: 'the upper side', down: 'the lower side' }, { flows: ['plate'] }),
    confinement: word('what bounds the flow', 'inside', { inside: 'walls all around', outside: 'a body in a stream', free: 'no walls' }, { flows: ['general'] }),
    together: { kind: 'paths', doc: 'inputs whose spreads move together', example: '[[inlet.speed, inlet.temperature]]' },
    time,
    choices,
    computing,
  },
  flows,
  wallGroups,
};
