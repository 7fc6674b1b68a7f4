import { angle, count, length, list, map, number, pressure, quantity, share, speed, temperature, text, turning, word } from './vocabulary-define.ts';

const axes = { length: 'along the flow', width: 'across, level', height: 'across, upright', depth: 'the third direction' };

export const species = list('substances carried by the fluid', '[{ name: salt, diffusivity: 1.5e-9 m^2/s, inlet: 1 % mass }]', {
  name: text('name of the substance', 'salt'),
  diffusivity: quantity('diffusivity in the fluid', 'm^2/s', '1.5e-9 m^2/s', { name: 'diffusivity', above: 0, gives: ['diffusivity@'] }),
  inlet: share('share at the inlet', '1 % mass', { gives: ['inletShare@'] }),
  wall: share('share at the wall', '2 % mass', { gives: ['wallShare@'] }),
  molarMass: quantity('molar mass', 'kg/mol', '58.4 g/mol', { name: 'molar mass', above: 0, gives: ['speciesMolarMass@'] }),
  densityChange: quantity('relative change of density per unit of concentration', '1', '0.7', { name: 'plain number', gives: ['solutalSlope@'] }),
}, { names: 'required' });

export const reactions = list('chemical reactions', '[{ of: feed, where: fluid, order: 1, rateConstant: 2 1/s, rateAt: 350 degC }]', {
  of: text('the substance that reacts', 'feed'),
  where: word('where it reacts', 'fluid', { fluid: 'in the fluid', wall: 'on the wall', catalyst: 'within a catalyst', interface: 'where two fluids meet' }),
  order: number('order of the reaction', '1', { atLeast: 0, atMost: 5, gives: ['reactionOrder@'] }),
  rateConstant: quantity('rate constant, in the unit of its order and place', '1/s', '2 1/s', { orUnits: ['m/s', 'm^3/(mol s)', 'mol/(m^3 s)', 'mol/(m^2 s)', 'm^6/(mol^2 s)', 'm^3/(kg s)', 'mol/(kg s)'], name: 'rate constant', above: 0, gives: ['rateConstantGiven@'] }),
  rateAt: temperature('temperature at which the rate constant holds', '350 degC', { gives: ['rateTemperature@'] }),
  activationEnergy: quantity('activation energy', 'J/mol', '110 kJ/mol', { name: 'activation energy', atLeast: 0, gives: ['activationEnergy@'] }),
  enthalpy: quantity('enthalpy of reaction, negative where heat is released', 'J/mol', '-1300 kJ/mol', { name: 'enthalpy of reaction', orUnits: ['J/kg'] }),
});

export const particles = list('solid particles or drops carried along, by size class', '[{ diameter: 200 um, density: 2650 kg/m^3, volumeFraction: 5e-5 }]', {
  name: text('name of the class', 'coarse'),
  material: text('name of a material that the program knows', 'water'),
  density: quantity('density, in place of a material', 'kg/m^3', '2650 kg/m^3', { name: 'density', above: 0 }),
  diameter: length('diameter', '200 um', { required: true }),
  volumeFraction: share('share of the volume', '5e-5'),
  speed: speed('speed at which they arrive', '1 m/s'),
  temperature: temperature('temperature at which they arrive', '20 degC'),
}, { names: 'optional' });

export const rheology = map('viscosity that depends on the shear', '{ law: power-law, consistency: 0.8 Pa s^n, index: 0.55 }', {
  law: word('law', 'power-law', { 'power-law': 'consistency, index', carreau: 'zero and infinite shear viscosity, time constant, index', cross: 'zero and infinite shear viscosity, time constant, index', bingham: 'yield stress, plastic viscosity', 'herschel-bulkley': 'yield stress, consistency, index', casson: 'yield stress, plastic viscosity' }, { required: true }),
  consistency: quantity('consistency; n is the index', 'Pa s^n', '0.8 Pa s^n', { name: 'consistency', above: 0, exponentFrom: 'index' }),
  index: number('index n of the law', '0.55'),
  yieldStress: quantity('yield stress', 'Pa', '5 Pa', { name: 'stress', is: 'plain', atLeast: 0 }),
  plasticViscosity: quantity('plastic viscosity', 'Pa s', '3.5 mPa s', { name: 'dynamic viscosity', above: 0 }),
  zeroShearViscosity: quantity('viscosity at rest', 'Pa s', '56 mPa s', { name: 'dynamic viscosity', above: 0 }),
  infiniteShearViscosity: quantity('viscosity at large shear', 'Pa s', '3.5 mPa s', { name: 'dynamic viscosity', atLeast: 0 }),
  timeConstant: quantity('time constant of the law', 's', '3.3 s', { name: 'time', above: 0 }),
  activationEnergy: quantity('activation energy of the viscosity', 'J/mol', '30 kJ/mol', { name: 'activation energy' }),
  temperatureFactor: quantity('relative fall of the viscosity per kelvin', '1/K', '0.02 1/K', { name: 'factor per kelvin' }),
});

export const porous = map('porous matter that the fluid passes', '{ permeability: 1e-9 m^2, voidFraction: 0.4 }', {
  permeability: quantity('permeability', 'm^2', '1e-9 m^2', { name: 'permeability', above: 0 }),
  voidFraction: share('share of the volume left to the fluid', '0.4', { above: 0 }),
});

export const packing = map('packing of a bed', '{ voidFraction: 0.4, solid: alumina }', {
  voidFraction: share('share of the volume left to the fluid', '0.4', { above: 0 }),
  solid: text('material of the particles', 'alumina'),
}, { flows: ['packed-bed'] });

export const ground = map('ground under the wind', '{ roughnessLength: 0.1 m }', { roughnessLength: length('roughness length of the ground', '0.1 m') }, { flows: ['building', 'bluff-body', 'plume'] });

export const impeller = map('impeller of a stirred tank', '{ powerNumber: 5, blades: 6, baffles: 4 }', {
  powerNumber: number('power over rho N^3 D^5', '5'),
  blades: count('number of blades', '6'),
  baffles: count('number of baffles', '4', { atLeast: 0 }),
}, { flows: ['stirred-tank'] });

export const burning = map('a premixed flame', '{ fuel: methane, equivalenceRatio: 0.9, flameSpeed: 0.34 m/s }', {
  fuel: text('fuel', 'methane'),
  equivalenceRatio: number('fuel over air, against the complete ratio', '0.9'),
  flameSpeed: speed('speed of the plane laminar flame', '0.34 m/s', { above: 0 }),
  burntTemperature: temperature('temperature of the burnt gas', '2130 K'),
}, { flows: ['flame'] });

export const magneticField = map('magnetic field across the flow', '{ fluxDensity: 0.5 T, along: width }', {
  fluxDensity: quantity('magnetic flux density', 'T', '0.5 T', { name: 'magnetic flux density', atLeast: 0 }),
  along: word('direction of the field', 'width', axes),
});

const startKeys = {
  temperature: temperature('temperature at the start', '20 degC'),
  pressure: pressure('pressure at the start', '1 bar abs'),
  speed: speed('speed at the start', '0 m/s'),
  state: word('state of matter at the start', 'solid', { solid: 'frozen', liquid: 'molten', gas: 'vapour' }),
};

export const initial = map('the start', '{ temperature: 20 degC }', {
  ...startKeys,
  left: map('left half', '{ pressure: 1 bar abs, temperature: 75 degC }', startKeys, { flows: ['shock-tube'] }),
  right: map('right half', '{ pressure: 0.1 bar abs, temperature: 5 degC }', startKeys, { flows: ['shock-tube'] }),
});

export const sources = list('sources of heat or of a substance within the flow', '[{ name: people, heat: 900 W }]', {
  name: text('name of the source', 'people'),
  heat: quantity('heat released', 'W', '900 W', { name: 'heat rate', orUnits: ['W/m^3'] }),
  of: text('the substance released', 'CO2'),
  amount: quantity('how much of it', 'kg/s', '50 mg/s', { name: 'mass flow', orUnits: ['mol/s', 'm^3/s'] }),
  size: length('width of the source', '3 m'),
}, { names: 'optional' });

export const motion = map('a container that is shaken', '{ acceleration: 3 m/s^2, period: 4 s }', {
  acceleration: quantity('acceleration', 'm/s^2', '3 m/s^2', { name: 'acceleration' }),
  amplitude: length('amplitude of a swinging motion', '50 mm', { orUnits: ['rad'], above: 0 }),
  period: quantity('period of a swinging motion', 's', '4 s', { name: 'time', above: 0 }),
  angle: angle('direction of the motion above level', '0 deg'),
}, { flows: ['sloshing-tank', 'column-collapse', 'storage-tank', 'general'] });

export const frame = map('a frame that turns with the flow', '{ rotation: 60 rpm }', { rotation: turning('speed of the frame', '60 rpm') });

export const time = map('how the problem goes in time', '{ character: transient, duration: 20 min }', {
  character: word('nature of the problem', 'steady', { unknown: 'not known yet', steady: 'comes to rest in time', periodic: 'repeats', transient: 'runs its course' }),
  period: quantity('period of what repeats', 's', '0.9 s', { name: 'time', above: 0 }),
  ramp: quantity('time in which a change is made', 's', '0.8 s', { name: 'time', above: 0 }),
  duration: quantity('how long it is looked at', 's', '20 min', { name: 'time', above: 0 }),
});

export const computing = map('the machine and the time there is', '{ cores: 16, memory: 64 GB, deadline: 12 h }', {
  cores: count('number of cores', '16'),
  memory: quantity('memory', 'B', '64 GB', { name: 'memory', above: 0 }),
  deadline: quantity('time by which the answer is wanted', 's', '12 h', { name: 'time', above: 0 }),
  cellUpdateRate: quantity('cells that one core carries one step further in a second', '1/s', '2e5 1/s', { name: 'rate', above: 0 }),
});
