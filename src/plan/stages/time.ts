import { lines, table, type Ground, type StageResult } from '../ground.ts';
import { listed } from '../say.ts';
import type { Cell, Check, Line, Table } from '../types.ts';
import { numberTable } from './number-table.ts';

/** Limits of the step: the word of the limit, its id, what it says. */
const limits = [
  ['convective', 'timeStepConvective', 'stepRateConvective', 'the fastest fluid crosses one cell'],
  ['diffusive', 'timeStepDiffusive', 'stepRateDiffusive', 'diffusion at the wall cell'],
  ['acoustic', 'timeStepAcoustic', 'stepRateAcoustic', 'sound crosses the smallest cell'],
  ['capillary', 'timeStepCapillary', 'stepRateCapillary', 'ripples of surface tension'],
  ['reaction', 'timeStepReaction', 'stepRateReaction', 'the fastest reaction'],
  ['period', 'timeStepPeriod', 'stepRatePeriod', 'a hundredth of the period or ramp'],
  ['buoyancy', 'timeStepBuoyancy', 'stepRateBuoyancy', 'buoyant motion'],
  ['turbulence', 'timeStepTurbulence', 'stepRateTurbulence', 'the smallest eddies resolved'],
] as const;
const cures: Readonly<Record<string, string>> = {
  convective: 'Cells twice as long where the fluid is fastest would double it.',
  diffusive: 'Taking diffusion across the wall cells implicitly lifts it.',
  acoustic: 'A form without sound, or an implicit one, lifts it.',
  capillary: 'Only larger cells at the interface lift it: even implicit codes lag the surface tension.',
  period: 'It stands on accuracy: 50 steps a period are the least, at half the cost.',
  buoyancy: 'It stands on accuracy of the buoyant motion.',
  turbulence: 'It stands on the eddies: only a coarser treatment of turbulence lifts it.',
};

/** The step from all its limits, the length of the run, the study of the step, and what to do if a steady run does not settle. */
export function time(on: Ground): StageResult {
  const steady = on.choice('run-character').chosen === 'steady';
  return {
    lines: [...runLines(on), ...(steady ? settleLines(on) : [...stepLines(on), ...lengthLines(on), ...studyLines(on)])],
    tables: [...limitTable(on), ...numberTable(on, steady ? 'Times of the flow' : 'Run length', ['flowThroughTime', 'crossDiffusionTime', 'freeFallTime', 'discardTime', ...(steady ? [] : ['integralTime', 'fluctuationShare', 'averagingTime', 'averagingError', 'runTime', 'stepCount', 'stepsPerPeriod'])])],
    checklist: checks(on, steady),
  };
}

const limitTable = (on: Ground): Table[] => {
  const binding = bindingOf(on);
  const rows = limits.filter(([, id]) => on.has(id)).map(([word, id, rate, what]): Cell[] => [what, { id }, word === binding ? 'binds' : (on.number(rate) ?? 0) > 0 ? 'counts' : 'no limit for this scheme']);
  return rows.length === 0 ? [] : [table('Limits of the step', ['limit', 'step', 'here'], rows)];
};
const bindingOf = (on: Ground): string | undefined => on.word('timeStepLimit');

function runLines(on: Ground): Line[] {
  const run = on.choice('run-character');
  const scheme = on.choice('time-scheme');
  return lines(`The run is ${run.chosen === 'march' ? 'marched to rest' : run.chosen}: ${run.because}.`, scheme.applies === true && scheme.chosen !== 'none' && `Time scheme ${scheme.chosen}: ${scheme.because}.`);
}

function stepLines(on: Ground): Line[] {
  if (!on.has('timeStep')) return lines('No step follows from the numbers given: no speed, cell or period is known.');
  const binding = bindingOf(on) ?? '';
  const explicit = /^explicit|^adams/.test(on.choice('time-scheme').chosen);
  const lifted = limits.filter(([word, id, rate]) => on.has(id) && word !== binding && (on.number(rate) ?? 0) === 0).map(([, id, , what]) => `${what} ({${id}})`);
  return lines(
    binding === 'given' ? 'The step {timeStep} is as given: the fastest fluid crosses {courantNumber} cells in it.' : `The step is {timeStep}, ${explicit ? 'explicit' : 'implicit'}; the ${binding} limit binds it, and the fastest fluid at {peakSpeed} crosses {courantNumber} cells in a step. ${cures[binding] ?? ''}`,
    !explicit && lifted.length > 0 && `An explicit scheme would also be held by ${listed(lifted)}.`,
    on.has('stepsPerPeriod') && `One period takes {stepsPerPeriod} steps${(on.number('stepsPerPeriod') ?? 0) < 50 ? ', fewer than the 50 that its frequency needs: shorten the step' : ''}.`,
    on.choice('run-character').chosen === 'march' && 'On the way to rest each cell may take its own step; the state counts, not the way.',
    on.choice('run-character').chosen === 'transient' && 'Start with 10 to 20 steps of a tenth of it, damped, then let it grow by half every five steps.',
  );
}

function lengthLines(on: Ground): Line[] {
  if (!on.has('runTime')) return lines(on.has('flowThroughTime') && 'The stream passes the region in {flowThroughTime}; how long the case runs is not known: give time.duration, or a period.');
  return lines(
    on.assembled.case.has('time.duration') ? 'The run covers the {runTime} asked for in {stepCount} steps.' : `The run covers {runTime} in {stepCount} steps: {discardTime} thrown away at the start${on.has('averagingTime') ? ', then {averagingTime} averaged' : ''}; the stream passes the region in {flowThroughTime}.`,
    on.has('averagingError') && `That average leaves {averagingError} in the mean, 95 %, from a signal that swings by {fluctuationShare} of its mean with an integral time of {integralTime}: both are estimates to be replaced by a pilot of 30 integral times. Half the error takes four times the window.`,
    on.has('averagingTime') && !on.has('averagingError') && 'The flow repeats: take whole periods, and compare the mean of the second half of the window with that of the whole.',
  );
}

function studyLines(on: Ground): Line[] {
  if (!on.has('timeStepQuadruple')) return [];
  const order = on.choice('time-scheme').chosen === 'implicit-1' ? 'first' : /runge-kutta-3/.test(on.choice('time-scheme').chosen) ? 'third' : /runge-kutta-4/.test(on.choice('time-scheme').chosen) ? 'fourth' : 'second';
  return lines(`Step study on the medium mesh: {timeStep}, {timeStepDouble} and {timeStepQuadruple}, order to be seen: ${order}. The step may leave {stepTolerance} of the target; inside each step the change falls to {iterationTolerance} of its first.`);
}

function settleLines(on: Ground): Line[] {
  const near = on.has('unsteadyRatio') ? (on.number('unsteadyRatio') ?? 0) : undefined;
  return lines(
    on.has('timeStep') && 'The pseudo-step of a cell is about {timeStep}: the fluid crosses {courantNumber} cells in it; start at a tenth.',
    near === undefined ? 'If it does not settle: halve the relaxation. A swing that keeps its frequency in hertz is physical, one that keeps its count of passes is numerical.' : `The group stands at {unsteadyRatio} of the onset of unsteadiness ({unsteadyFrom}), so a swing of the target that does not die is ${near < 0.8 ? 'numerical first: limiter, relaxation, worst cells' : 'physical first: average three swings, and book the transient run'}. Halve the relaxation to tell: a physical swing keeps its frequency in hertz, a numerical one its count of passes.`,
    'A swing below {iterationTolerance} of the target is iteration error and may stay; above a third of {targetTolerance} the run becomes transient or the cause is found.',
  );
}

function checks(on: Ground, steady: boolean): Check[] {
  if (steady) return [{ id: 'time-settled', stage: 'time', text: 'the target swings by less than the iteration error over the last fifth of the passes', limit: 'iteration error of the tolerance chain', where: 'every target' }];
  return [
    ...(on.has('courantNumber') ? [{ id: 'time-courant', stage: 'time', text: 'largest Courant number in 99.9 % of the cells against the plan', limit: 'that of the plan', where: 'whole region' }] : []),
    { id: 'time-study', stage: 'time', text: 'three steps at a ratio of 2: change of the target and order seen', limit: 'step share of the accuracy', where: 'every target' },
    ...(on.has('averagingTime') ? [{ id: 'time-window', stage: 'time', text: 'mean of the second half of the window against that of the whole', limit: 'a third of the accuracy', where: 'every target' }] : []),
  ];
}
