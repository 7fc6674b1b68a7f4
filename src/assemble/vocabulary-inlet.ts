import type { Fields, QuantityField } from '../case/index.ts';
import { angle, length, list, map, number, pressure, quantity, share, speed, temperature, text, word } from './vocabulary-define.ts';
import { composition } from './vocabulary-fluid.ts';

const profiles = { uniform: 'the same speed everywhere', developed: 'as far down a long passage', power: 'a power of the wall distance, exponent', log: 'logarithm of the height over rough ground', table: 'measured, brought as a table' };

/** Keys of an inlet. The lone inlet gives plain ids, several give theirs with the place. */
function inletKeys(at: '' | '@'): Fields {
  const mean: Partial<QuantityField> = { gives: [`inletTemperature${at}`] };
  return {
    speed: speed('mean speed', '0.4 m/s', { atLeast: 0 }),
    volumeFlow: quantity('volume flow at the state of the inlet; of a gas also normal (0 degC, 1 atm) or standard (15 degC, 1 atm) where said so', 'm^3/s', '12 L/min', { is: 'volumeFlow', atLeast: 0 }),
    massFlow: quantity('mass flow', 'kg/s', '0.2 kg/s', { name: 'mass flow', atLeast: 0 }),
    totalPressure: pressure('pressure of the gas brought to rest', '8 bar abs'),
    totalTemperature: temperature('temperature of the gas brought to rest', '20 degC'),
    temperature: temperature('temperature', '65 degC', mean),
    profile: word('shape of the speed profile', 'developed', profiles),
    exponent: number('exponent of a power profile', '0.16', { above: 0 }),
    turbulence: map('turbulence that arrives', '{ intensity: 5 %, length: 2 mm }', {
      intensity: share('rms of the fluctuation over the mean speed', '5 %', { above: 0 }),
      length: length('length of the large eddies', '2 mm'),
      viscosityRatio: number('eddy viscosity over molecular viscosity', '3'),
    }),
    swing: speed('amplitude of a pulsing speed', '0.1 m/s', { atLeast: 0 }),
    direction: angle('direction of the stream against the axis of the flow', '0 deg'),
    referenceHeight: length('height at which the speed holds', '10 m'),
    area: quantity('area of the opening', 'm^2', '0.05 m^2', { name: 'area', above: 0 }),
    boundaryLayerThickness: length('thickness of the layer that arrives', '10 mm'),
    composition,
  };
}

export const inlet = map('what flows in: one of speed, volumeFlow, massFlow, or totalPressure with totalTemperature', '{ speed: 0.4 m/s, temperature: 65 degC }', inletKeys(''));

export const inlets = list('several inlets, by name', '[{ name: main, speed: 2 m/s }, { name: branch, speed: 4 m/s }]', { name: text('name of the inlet', 'main'), ...inletKeys('@') }, { names: 'required', flows: ['mixing-tee', 'room', 'impinging-jet', 'stirred-tank', 'storage-tank', 'general'] });

export const outlet = map('where it leaves', '{ pressure: 1 bar abs }', {
  pressure: pressure('absolute pressure at the outlet', '1 bar abs', { gives: ['outletPressure'] }),
  massFlow: quantity('mass flow that is drawn off', 'kg/s', '0.2 kg/s', { name: 'mass flow', atLeast: 0 }),
});

export const drive = map('what drives the flow besides the inlet; buoyancy follows from heating and gravity', '{ pressureDrop: 500 Pa }', {
  pressureDrop: quantity('pressure drop along the flow', 'Pa', '500 Pa', { is: 'pressureDifference' }),
  rotation: quantity('speed of the part the flow is named for: disk, impeller', 'rad/s', '180 rpm', { name: 'speed of rotation' }),
  heatRelease: quantity('heat that a source releases', 'W', '10 kW', { name: 'heat rate' }),
});
