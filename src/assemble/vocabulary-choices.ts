import type { WordsField } from '../case/index.ts';
import { count, length, map, meanings, number, quantity, word } from './vocabulary-define.ts';

const cuts: WordsField = {
  kind: 'words',
  doc: 'how the region is cut down',
  example: '[two-dimensional]',
  words: meanings({ 'two-dimensional': 'one plane', axisymmetric: 'one half plane turned about the axis', 'mirror-left-right': 'left and right alike', 'mirror-top-bottom': 'top and bottom alike', 'periodic-along-flow': 'one piece that repeats along the flow', 'periodic-along-span': 'a slice of the span repeats' }),
};

/** What has been decided already, in the option words of the plan. */
export const choices = map('what has been decided already; where the advice differs the plan says so', '{ turbulence: rans, yPlus: 1 }', {
  turbulence: word('treatment of turbulence', 'rans', { none: 'no model', rans: 'averaged equations with a closure', hybrid: 'averaged near walls, large eddies resolved away from them', 'wall-modelled-les': 'large eddies resolved, the wall modelled', les: 'large eddies resolved down to the wall', dns: 'all eddies resolved' }),
  closure: word('turbulence closure', 'sst', { none: 'no closure', 'k-epsilon': 'standard form with a law of the wall', 'k-epsilon-variant': 'realizable or renormalised form', 'k-epsilon-low-re': 'damped down to the wall', 'k-omega': 'k and specific dissipation rate', sst: 'k-omega at walls, k-epsilon away from them', 'one-equation': 'one equation for the eddy viscosity', 'reynolds-stress': 'equations for the stresses', transition: 'with equations for the onset of turbulence' }),
  wallTreatment: word('treatment of the near-wall layer', 'resolved', { none: 'no wall layer', resolved: 'cells down to the viscous layer', blended: 'any wall distance', 'law-of-the-wall': 'first cell in the logarithmic layer', 'rough-law': 'law of the wall over roughness' }),
  densityVariesWith: word('density law', 'constant', { constant: 'one density', boussinesq: 'constant but for its weight', 'extended-boussinesq': 'the same with further terms', temperature: 'temperature alone', 'temperature-and-pressure': 'an equation of state' }),
  gasLaw: word('equation of state of a gas', 'ideal', { ideal: 'p = rho R T', real: 'with a compressibility factor' }),
  run: word('how the run proceeds', 'steady', { steady: 'one steady state', march: 'in time towards a steady state', transient: 'accurate in time' }),
  timeScheme: word('time scheme', 'backward-2', { none: 'no time step', 'implicit-1': 'first order, implicit', 'crank-nicolson': 'second order, trapezoidal', 'backward-2': 'second order, three levels', 'implicit-runge-kutta-2': 'second order, implicit stages', 'explicit-runge-kutta-3': 'third order, explicit stages', 'explicit-runge-kutta-4': 'fourth order, explicit stages', 'adams-bashforth-2': 'second order, explicit, two levels' }),
  precision: word('arithmetic', 'double', { single: '7 digits', mixed: 'single with double where sums are formed', double: '16 digits' }),
  yPlus: number('wall distance of the first node in viscous lengths', '1', { gives: ['yPlusTarget'] }),
  cuts,
  convection: map('convection scheme', '{ order: 2, character: upwind-biased }', {
    order: count('order of accuracy', '2', { atMost: 20 }),
    character: word('character of the scheme', 'upwind-biased', { 'upwind-biased': 'leans against the stream', central: 'both sides alike', blended: 'between the two' }),
  }),
  cellSize: length('cell size away from walls', '2 mm', { gives: ['coreCellSize'] }),
  firstCell: length('full height of the cell at the wall', '20 um', { gives: ['firstCellHeight'] }),
  layers: count('number of cells in the layers at the wall', '20', { atLeast: 0, gives: ['layerCount'] }),
  growth: number('height of a layer over that of the one below', '1.2', { atLeast: 1, gives: ['growthRatio'] }),
  cells: count('number of cells', '2e6', { gives: ['cellCount'] }),
  timeStep: quantity('time step', 's', '0.2 ms', { name: 'time', above: 0, gives: ['timeStep'] }),
  domain: map('distances to the ends of the region', '{ upstream: 5 m, downstream: 15 m }', {
    upstream: length('before the body or feature', '5 m', { gives: ['domainUpstream'] }),
    sides: length('to each side', '5 m', { gives: ['domainSides'] }),
    above: length('above', '5 m', { gives: ['domainAbove'] }),
    downstream: length('behind the body or feature', '15 m', { gives: ['domainDownstream'] }),
  }),
  turbulentPrandtl: number('turbulent Prandtl number, or the choice about it', '0.85', { words: meanings({ none: 'not used', constant: 'one number', sweep: 'run at two numbers', variable: 'by a law' }), gives: ['turbulentPrandtl'] }),
});
