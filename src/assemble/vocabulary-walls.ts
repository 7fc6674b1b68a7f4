import type { Fields, MapField } from '../case/index.ts';
import { angle, flag, length, list, map, quantity, share, speed, temperature, text, turning, word } from './vocabulary-define.ts';

/** One of a group decides: what holds the temperature, and what states the roughness. */
const alternatives = [['temperature', 'heatFlux', 'heat', 'heatTransferCoefficient', 'adiabatic'], ['sandGrain', 'Ra']] as const;

const wallKeys: Fields = {
  temperature: temperature('temperature of the face named by `at`', '20 degC', { gives: ['wallTemperature@', 'outerTemperature@'] }),
  heatFlux: quantity('heat per area into the fluid', 'W/m^2', '5 kW/m^2', { name: 'heat flux', gives: ['wallHeatFlux@'] }),
  heat: quantity('heat into the fluid over the whole wall', 'W', '2 kW', { name: 'heat rate', gives: ['wallHeat@'] }),
  heatTransferCoefficient: quantity('coefficient outside, to the surroundings', 'W/(m^2 K)', '8 W/(m^2 K)', { name: 'heat-transfer coefficient', atLeast: 0, gives: ['outerCoefficient@'] }),
  adiabatic: flag('no heat passes', 'true'),
  at: word('the face that the temperature belongs to', 'outer-face', { 'outer-face': 'away from the fluid; taken where layers are given', 'wetted-face': 'in touch with the fluid' }),
  layers: list('layers of the wall, from the fluid outwards', '[{ material: copper, thickness: 1.5 mm }]', {
    material: text('name of a solid that the program knows', 'copper'),
    thickness: length('thickness', '1.5 mm', { required: true }),
    thermalConductivity: quantity('thermal conductivity, in place of a material', 'W/(m K)', '0.04 W/(m K)', { name: 'thermal conductivity', above: 0 }),
    density: quantity('density, in place of a material', 'kg/m^3', '8000 kg/m^3', { name: 'density', above: 0 }),
    specificHeatCapacity: quantity('specific heat capacity, in place of a material', 'J/(kg K)', '500 J/(kg K)', { name: 'specific heat capacity', above: 0 }),
  }),
  emissivity: share('emissivity for heat radiation', '0.9', { gives: ['emissivity@'] }),
  sandGrain: length('height of the equivalent sand grain', '1.5 um', { atLeast: 0, gives: ['sandGrain@'] }),
  surface: text('kind of surface, from the tables: it gives sand grain and emissivity that are not given', 'drawn tubing'),
  Ra: length('mean roughness by a stylus, in place of the sand grain', '0.8 um', { atLeast: 0 }),
  speed: speed('speed of a wall that slides along itself', '0.1 m/s', { gives: ['wallSpeed@'] }),
  rotation: turning('speed of a wall that turns', '60 rpm', { gives: ['wallRotation@'] }),
  electrical: word('wall in a magnetic field', 'insulating', { insulating: 'no current passes', conducting: 'conducts far better than the fluid' }),
  contactAngle: angle('angle between liquid and wall, measured in the liquid', '70 deg', { atLeast: 0, atMost: Math.PI, gives: ['contactAngle@'] }),
};

export const wall: MapField = map('all walls; a wall nobody names is adiabatic, smooth and at rest', '{ temperature: 20 degC }', wallKeys, { alternatives });

export const walls = list('walls by name; each key overrides `wall`', '[{ name: left, temperature: 40 degC }, { name: right, temperature: 20 degC }]', { name: text('name of the wall, from the flow', 'left'), ...wallKeys }, { names: 'walls' });

export const surroundings = map('what lies around', '{ temperature: 20 degC }', {
  temperature: temperature('temperature around', '20 degC', { gives: ['surroundingsTemperature'] }),
  speed: speed('speed of the air or water around', '0.5 m/s', { atLeast: 0 }),
});
