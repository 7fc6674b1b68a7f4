import { describe, expect, it } from 'vitest';
import { flows, type Flow } from '../../src/flows/index.ts';
import { workingsOf } from '../flows/harness.ts';

const near = (value: number | undefined, expected: number, relative: number): void => expect(Math.abs((value ?? Number.NaN) / expected - 1)).toBeLessThanOrEqual(relative);
const pipe = flows['pipe'] as Flow;
const base = { density: 1000, viscosity: 1e-3, thermalConductivity: 0.6, specificHeatCapacity: 4180, 'sizes.diameter': 0.1, 'sizes.length': 1, 'inlet.speed': 1, inletTemperature: 300, pressure: 1e5, energySolved: 'no', 'has.otherFluid': 'no', 'has.period': 'no', storage: 'cell-centred', 'choice.run-character': 'transient', 'choice.turbulence-treatment': 'rans', 'choice.dimension-and-cuts': 'axisymmetric' };
const had = (given: Readonly<Record<string, number | string>>, id: string): number | undefined => workingsOf(pipe, { ...base, ...given }).get(id);

describe('limits of the step', () => {
  // Water and air at 0.1 mm: sqrt(999.4 (1e-4)^3/(4 pi 0.0728)) = 33.05 us; without the air 33.03 us.
  it('capillary', () => near(had({ density: 998.2, surfaceTension: 0.0728, coreCellSize: 1e-4, 'has.otherFluid': 'yes' }, 'timeStepCapillary'), 33.05e-6, 1e-3));
  it('convective: 2 mm at 4 m/s in 0.5 ms', () => near(had({ 'regionSizeAlong@entry': 2e-3, 'regionSizeAlong@run': 5e-3, peakSpeed: 4 }, 'timeStepConvective'), 5e-4, 1e-12));
  // Equal cells in two directions: h^2/(4 Gamma), the limit of forward Euler with central differences.
  it('diffusive: h^2/(4 nu) on square cells', () => near(had({ firstCellHeight: 1e-3, 'regionSizeAlong@entry': 1e-3, 'regionSizeAlong@run': 1e-3, coreCellSize: 1e-3 }, 'timeStepDiffusive'), 1e-6 / 4e-6, 1e-12));
  it('diffusive: h^2/(6 nu) on cubes', () => near(had({ 'choice.dimension-and-cuts': 'three-dimensional', firstCellHeight: 1e-3, 'regionSizeAlong@entry': 1e-3, 'regionSizeAlong@run': 1e-3, coreCellSize: 1e-3 }, 'timeStepDiffusive'), 1e-6 / 6e-6, 1e-12));
  it('the least of those that act binds, and is named', () => {
    const w = workingsOf(pipe, { ...base, timeStepConvective: 1e-3, timeStepPeriod: 1e-4, timeStepAcoustic: 1e-9 });
    near(w.get('timeStep'), 1e-4, 1e-12);
    expect(w.word('timeStepLimit')).toBe('period');
  });
  it('an explicit scheme is held by diffusion too', () => {
    const w = workingsOf(pipe, { ...base, timeStepConvective: 1e-3, timeStepDiffusive: 1e-5, 'choice.time-scheme': 'explicit-runge-kutta-3' });
    near(w.get('timeStep'), 1e-5, 1e-12);
    expect(w.word('timeStepLimit')).toBe('diffusive');
  });
});

describe('averaging', () => {
  const signal = { fluctuationShare: 0.2, integralTime: 1, leastWindow: 0, regime: 'turbulent' };
  // 2 (1.96)^2 T_int (s/(w phi))^2: 123 T_int for 5 % and 3080 T_int for 1 % at s/phi = 0.2 (Tennekes and Lumley form, by hand).
  it.each([[0.05, 123], [0.01, 3080]])('the mean within %d takes %d integral times', (statisticsTolerance, times) => near(had({ ...signal, statisticsTolerance }, 'averagingTime'), times, 2e-3));
  it('the error of that window is the tolerance', () => near(had({ ...signal, statisticsTolerance: 0.05 }, 'averagingError'), 0.05, 1e-9));
});

describe('start', () => {
  // First mode of impulsively started pipe flow: t_99 = 0.789 R^2/nu (series of Szymanski 1932).
  it('viscosity crosses a pipe in 0.79 R^2/nu', () => near(had({}, 'crossDiffusionTime'), 0.789 * 0.0025 / 1e-6, 2e-3));
  it('a run of given duration takes duration over step', () => near(had({ 'time.duration': 10, timeStep: 0.03 }, 'stepCount'), 334, 1e-12));
});
