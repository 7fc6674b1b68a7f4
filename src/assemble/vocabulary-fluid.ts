import type { Field, Fields } from '../case/index.ts';
import { map, number, pressure, quantity, share, speed, temperature, text, word } from './vocabulary-define.ts';

const property = (doc: string, unit: string, example: string, id: string): Field => quantity(doc, unit, example, { name: doc, above: 0, gives: [id] });

/** Properties that may be given for the fluid in place of a material, or beside it. */
const properties: Fields = {
  density: property('density', 'kg/m^3', '998 kg/m^3', 'density'),
  viscosity: property('dynamic viscosity', 'Pa s', '1.0e-3 Pa s', 'viscosity'),
  kinematicViscosity: property('kinematic viscosity', 'm^2/s', '1.0e-6 m^2/s', 'kinematicViscosity'),
  thermalConductivity: property('thermal conductivity', 'W/(m K)', '0.6 W/(m K)', 'thermalConductivity'),
  specificHeatCapacity: property('specific heat capacity', 'J/(kg K)', '4.18 kJ/(kg K)', 'specificHeatCapacity'),
  thermalDiffusivity: property('thermal diffusivity', 'm^2/s', '1.4e-7 m^2/s', 'thermalDiffusivity'),
  prandtl: number('Prandtl number', '7', { gives: ['prandtl'] }),
  thermalExpansion: quantity('thermal expansion coefficient', '1/K', '2.1e-4 1/K', { name: 'thermal expansion coefficient', gives: ['thermalExpansion'] }),
  speedOfSound: property('speed of sound', 'm/s', '1480 m/s', 'speedOfSound'),
  isentropicExponent: number('ratio of the heat capacities of a gas', '1.4', { above: 1, gives: ['isentropicExponent'] }),
  molarMass: property('molar mass', 'kg/mol', '28.96 g/mol', 'molarMass'),
  gasConstant: property('specific gas constant', 'J/(kg K)', '287 J/(kg K)', 'gasConstant'),
  compressibilityFactor: number('compressibility factor of a gas', '0.98', { gives: ['compressibilityFactor'] }),
  meanFreePath: property('mean free path', 'm', '68 nm', 'meanFreePath'),
  electricalConductivity: property('electrical conductivity', 'S/m', '0.05 S/m', 'electricalConductivity'),
  surfaceTension: property('surface tension', 'N/m', '72 mN/m', 'surfaceTension'),
  vapourPressure: pressure('vapour pressure', '2.34 kPa abs', { gives: ['vapourPressure'] }),
  vapourDensity: property('density of the vapour', 'kg/m^3', '0.6 kg/m^3', 'vapourDensity'),
  latentHeat: property('latent heat', 'J/kg', '2257 kJ/kg', 'latentHeat'),
  saturationTemperature: temperature('saturation temperature', '100 degC', { gives: ['saturationTemperature'] }),
  meltingTemperature: temperature('melting temperature', '29.8 degC', { gives: ['meltingTemperature'] }),
  criticalTemperature: temperature('critical temperature', '374 degC', { gives: ['criticalTemperature'] }),
  criticalPressure: pressure('critical pressure', '221 bar abs', { gives: ['criticalPressure'] }),
  absorptionCoefficient: quantity('absorption coefficient for heat radiation', '1/m', '0.25 1/m', { atLeast: 0 }),
};

/** Shares of a mixture, by component. */
export const composition: Field = { kind: 'open-map', doc: 'shares of the components of a mixture; for a solution its one share, such as 30 % mass', example: '{ oxygen: 21 % mol, nitrogen: 79 % mol }', item: share('share of a component', '21 % mol'), alone: share('share of what is dissolved, for a solution', '30 % mass') };

export const fluid = map('what flows: a material by name, or its properties', '{ material: water, pressure: 2 bar abs }', {
  material: text('name of a material that the program knows', 'water'),
  pressure: pressure('absolute pressure, at the inlet where there is one; gauge where said so', '2 bar abs', { gives: ['pressure'] }),
  temperature: temperature('temperature where nothing flows in, or the inlet gives none', '20 degC'),
  humidity: share('relative humidity of humid air', '45 %'),
  composition,
  medium: word('state of matter, for a fluid without material', 'liquid', { gas: 'fills its space', liquid: 'keeps its volume', solid: 'does not flow' }),
  ...properties,
}, { required: true });

export const otherFluid = map('a second fluid that meets the first', '{ material: air, meets: bubbles, diameter: 4 mm }', {
  material: text('name of a material that the program knows', 'air'),
  density: quantity('density, in place of a material', 'kg/m^3', '1.2 kg/m^3', { above: 0 }),
  viscosity: quantity('dynamic viscosity, in place of a material', 'Pa s', '1.8e-5 Pa s', { name: 'dynamic viscosity', above: 0 }),
  meets: word('how the two meet', 'bubbles', { bubbles: 'gas bubbles in the liquid', drops: 'drops in the first fluid', film: 'a film on a wall', slugs: 'slugs that fill the passage', 'free-surface': 'one surface between the two' }),
  diameter: quantity('diameter of bubbles or drops', 'm', '4 mm', { name: 'length', above: 0 }),
  volumeFraction: share('share of the volume', '5 %'),
  volumeFlow: quantity('volume flow of the second fluid', 'm^3/s', '30 m^3/h', { is: 'volumeFlow', above: 0 }),
  speed: speed('speed of the second fluid', '0.2 m/s'),
  surfaceTension: quantity('surface tension between the two', 'N/m', '72 mN/m', { name: 'surface tension', atLeast: 0 }),
});
